import type { Locator, Page } from 'playwright-core';
import { DEMONSTRATION_PIN } from '../../src/lib/app';

/** What people do on the app's screens, for every test that plays it in a browser. */

const LOOKS_LONG = 120_000;

const touched = new WeakSet<Page>();

/** From now on this page is worked with a finger. */
export const byTouch = (page: Page): void => void touched.add(page);

/** One press of a button, with the mouse or with a finger. */
export const press = (button: Locator): Promise<void> => (touched.has(button.page()) ? button.tap() : button.click());

/** First open, one tap: the demonstration is played on this tablet and its line is shown. */
export async function demonstration(page: Page, address: string): Promise<void> {
	if (!page.url().startsWith(address)) await page.goto(address);
	await press(page.getByRole('button', { name: 'Show the demonstration' }));
	await page.getByRole('heading', { name: /stops at/ }).waitFor({ timeout: LOOKS_LONG });
}

/**
 * To another address of the app without loading it anew: shifts and what can be taken back live on, as for a person. A touch
 * that comes while the page is still changing hands is lost, and is made again.
 */
export async function go(page: Page, path: string, tries = 3): Promise<void> {
	await page.evaluate((href) => {
		const link = document.createElement('a');
		link.href = href;
		document.body.append(link);
		link.click();
		link.remove();
	}, path);
	const arrives = page.waitForURL((url) => url.pathname === path, { timeout: 4_000 });
	await (tries > 1 ? arrives.catch(() => go(page, path, tries - 1)) : arrives);
}

/** The address of the start-up that the page shows. */
export function startUpOf(page: Page): string {
	const [path] = /\/start-ups\/[^/]+/.exec(new URL(page.url()).pathname) ?? [];
	if (path === undefined) throw new Error(`no start-up is shown at ${page.url()}`);
	return path;
}

export async function toStep(page: Page, step: string): Promise<void> {
	await go(page, `${startUpOf(page)}/step/${step}`);
	await page.getByText(`Step ${step}`, { exact: true }).first().waitFor();
}

export const toLine = (page: Page): Promise<void> => go(page, startUpOf(page));

/** Two taps: the tablet changes hands, on whatever page. */
export async function takeTablet(page: Page, name: string): Promise<void> {
	const header = page.locator('header').first();
	const holder = header.locator('.person:visible, .owner button:visible');
	if ((await holder.count()) === 0) await press(header.getByRole('button', { name: 'Places' }));
	const holds = holder.filter({ hasText: name });
	if ((await holds.count()) > 0) return;
	await press(holder);
	const people = page.getByRole('region', { name: 'Who holds the tablet?' });
	await press(people.getByRole('button', { name }));
	await people.waitFor({ state: 'detached' });
}

export async function beginShift(page: Page, pin: string = DEMONSTRATION_PIN): Promise<void> {
	await page.getByLabel('PIN').first().fill(pin);
	await press(page.getByRole('button', { name: 'Begin shift' }));
}

/** Begins the shift of whoever holds the tablet, or goes on with it, where the page asks for it. */
export async function shiftIfAsked(page: Page): Promise<void> {
	const begin = page.getByRole('button', { name: /^(Begin shift|Go on)$/ });
	if (!(await begin.isVisible())) return;
	await page.getByLabel('PIN').first().fill(DEMONSTRATION_PIN);
	await press(begin);
	await begin.waitFor({ state: 'detached' });
}

/** Readings one after the other, each ended with Enter. */
export async function typeAll(page: Page, readings: readonly string[]): Promise<void> {
	for (const reading of readings) {
		await page.getByRole('article').getByRole('textbox').first().fill(reading);
		await page.keyboard.press('Enter');
	}
}

/** What was saved moves the screen on from its step. */
export async function saved(page: Page, step: string): Promise<void> {
	await page.waitForURL((url) => !url.pathname.endsWith(`/step/${step}`));
	await page.getByText(/^Saved on this tablet/).waitFor();
}

/** One step, entered: its page, a shift if there is none, what `types` does, and saved. */
export async function onStep(page: Page, step: string, types: () => Promise<unknown>): Promise<void> {
	await toStep(page, step);
	await shiftIfAsked(page);
	await types();
	await saved(page, step);
}

export const confirmAll = async (page: Page): Promise<void> => {
	const open = page.getByRole('checkbox', { checked: false });
	for (let left = await open.count(); left > 0; left--) await press(open.first());
	await pressSave(page);
};

/** The one filled act of a step's sheet; what can still be taken back has a "Save now" of its own. */
export const pressSave = (page: Page): Promise<void> =>
	press(page.getByRole('article').getByRole('button', { name: /^Save/ }));

/** The hold point's sheet, ready for a signature: without a copy, for a reason, and declared. */
export async function declareWithoutCopy(page: Page, reason: string): Promise<void> {
	await press(page.getByRole('button', { name: 'Release without' }));
	await page.getByLabel('Why without a copy?').fill(reason);
	await press(page.getByRole('button', { name: 'Go on without a copy' }));
	await page.getByRole('checkbox').check();
}

export async function release(page: Page, gate: number, pin: string = DEMONSTRATION_PIN): Promise<void> {
	await page.getByLabel('PIN').last().fill(pin);
	await press(page.getByRole('button', { name: `Release Gate ${gate}` }));
}
