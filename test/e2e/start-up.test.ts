import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { DEMONSTRATION_PIN } from '../../src/lib/app';
import { withChromium } from '../support/chromium.mjs';
import { served } from '../support/served';

const LOOKS_LONG = 60_000;

async function demonstration(page: Page, address: string): Promise<void> {
	await page.goto(address);
	await page.getByRole('button', { name: 'Show the demonstration' }).click();
	await page.getByRole('heading', { name: /stops at/ }).waitFor({ timeout: LOOKS_LONG });
}

async function takeTablet(page: Page, name: string): Promise<void> {
	await page.locator('header').getByRole('link', { name: 'People' }).click();
	const take = page.getByRole('button', { name: `Take the tablet: ${name}` });
	await take.click();
	// The offer is gone once that person holds it; "holds the tablet" alone could be said of the one before.
	await take.waitFor({ state: 'detached' });
}

async function beginShift(page: Page, pin = DEMONSTRATION_PIN): Promise<void> {
	await page.getByLabel('PIN').first().fill(pin);
	await page.getByRole('button', { name: 'Begin shift' }).click();
}

let stepShown = '';

async function toStep(page: Page, step: string): Promise<void> {
	stepShown = `/step/${step}`;
	await page.goto(`${new URL(page.url()).origin}${/\/start-ups\/[^/]+/.exec(page.url())?.[0] ?? ''}/step/${step}`);
	await page.getByText(`Step ${step}`, { exact: true }).waitFor();
}

test('an entry that the screen said was saved is there after a reload, and a wrong PIN signs nothing', async () => {
	await served((address) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			page.setDefaultTimeout(12_000);
			const complaints: string[] = [];
			page.on('pageerror', (error) => complaints.push(String(error)));
			await demonstration(page, address);

			await toStep(page, '2.26');
			await beginShift(page, '11223345');
			await page.getByText('That PIN is wrong. 9 tries are left. Nothing was signed.').waitFor();
			await beginShift(page);
			await page.getByRole('button', { name: 'Begin shift' }).waitFor({ state: 'detached' });
			await page.getByRole('button', { name: 'Unbroken' }).click();
			await typeAll(page, ['3,1', '3,3', '6,3', '3,8']);
			await saved(page);
			await page.reload();
			await toStep(page, '2.26');
			await page.getByText(/The next reading is due in/).waitFor();
			expect(complaints).toEqual([]);
		}),
	);
}, 120_000);

test('two people finish and release Gate 2 with the supplied trend, without a server after the first load', async () => {
	await withChromium(async (browser) => {
		const page = await browser.newPage();
		page.setDefaultTimeout(12_000);
		const complaints: string[] = [];
		page.on('pageerror', (error) => complaints.push(String(error)));
		await served(async (address) => {
			await page.goto(address);
			await page.getByText('it works without network').waitFor();
		});
		await page.reload();
		await page.getByRole('button', { name: 'Show the demonstration' }).click();
		await page.getByRole('heading', { name: /stops at/ }).waitFor({ timeout: LOOKS_LONG });

		await toStep(page, '2.22');
		await shiftAgain(page);
		await page.getByRole('button', { name: 'measuring' }).click();
		await typeAll(page, ['3,1', '3,3', '6,4', '3.8']);
		await saved(page);
		await toStep(page, '2.23');
		await shiftAgain(page);
		for (const box of await page.getByRole('checkbox', { checked: false }).all()) await box.click();
		await page.getByRole('button', { name: 'Save' }).click();
		await saved(page);
		await toStep(page, '2.21');
		await shiftAgain(page);
		await page.getByRole('button', { name: 'Use the trend supplied with the demonstration' }).click();
		await page.getByRole('button', { name: 'Keep this series' }).click();
		await saved(page);
		for (const calculation of ['2.25', '2.27']) {
			await toStep(page, calculation);
			await shiftAgain(page);
			await page.getByRole('button', { name: /Save/ }).click();
			await saved(page);
		}
		await toStep(page, '2.26');
		await shiftAgain(page);
		await page.getByRole('button', { name: 'Unbroken' }).click();
		await typeAll(page, ['3,1', '3,3', '6,3', '3,8']);
		await saved(page);

		await page.goto(page.url().replace(/(start-ups\/[^/]+).*/, '$1'));
		await page
			.getByRole('heading', { name: /Gate 2/ })
			.first()
			.waitFor();
		const line = page.url();
		await takeTablet(page, 'Imre Castellvor');
		await page.goto(`${line}/gate/2`);
		await page.getByRole('button', { name: 'Release without' }).click();
		await page.getByLabel('Why without a copy?').fill('no second place in reach');
		await page.getByRole('button', { name: 'Go on without a copy' }).click();
		await page.getByRole('checkbox').check();
		await page.getByLabel('PIN').fill('11223345');
		await page.getByRole('button', { name: 'Release Gate 2' }).click();
		await page.getByText('That PIN is wrong. 9 tries are left. Nothing was signed.').waitFor();
		await page.getByLabel('PIN').fill(DEMONSTRATION_PIN);
		await page.getByRole('button', { name: 'Release Gate 2' }).click();
		await page
			.getByRole('heading', { name: /Gate 3/ })
			.first()
			.waitFor();
		expect(complaints).toEqual([]);
	});
}, 240_000);

async function typeAll(page: Page, readings: readonly string[]): Promise<void> {
	for (const reading of readings) {
		await page.getByRole('article').getByRole('textbox').first().fill(reading);
		await page.keyboard.press('Enter');
	}
}

/** What was saved moves the screen on. */
async function saved(page: Page): Promise<void> {
	await page.waitForURL((url) => !url.pathname.endsWith(stepShown));
	await page.getByText(/^Saved on this tablet/).waitFor();
}

/** A page that is loaded anew knows no key of a shift any more. */
async function shiftAgain(page: Page): Promise<void> {
	const begin = page.getByRole('button', { name: 'Begin shift' });
	if (!(await begin.isVisible())) return;
	await beginShift(page);
	await begin.waitFor({ state: 'detached' });
}
