import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { demonstration, onStep, shiftIfAsked, toStep, typeAll } from '../support/app-hands';
import { withChromium } from '../support/chromium.mjs';
import { served } from '../support/served';

type Scene = { readonly page: Page; readonly address: string; readonly complaints: readonly string[] };

/** The demonstration in a fresh browser. */
async function atTheDemonstration(use: (scene: Scene) => Promise<void>): Promise<void> {
	await served((address) =>
		withChromium(
			async (browser) => {
				const page = await browser.newPage();
				page.setDefaultTimeout(20_000);
				const complaints: string[] = [];
				page.on('pageerror', (error) => complaints.push(String(error)));
				await demonstration(page, address);
				await use({ page, address, complaints });
				expect(complaints).toEqual([]);
			},
			{ viewport: { width: 1280, height: 800 } },
		),
	);
}

test("a stranger's file is no trend: the sheet says why, and keeps the file that belongs to it", async () => {
	await atTheDemonstration(async ({ page }) => {
		await toStep(page, '2.21');
		await shiftIfAsked(page);
		const bring = (name: string, text: string): Promise<void> =>
			page
				.locator('input[type=file][accept*=csv]')
				.setInputFiles({ name, mimeType: 'text/csv', buffer: Buffer.from(text) });
		await bring('shopping.csv', 'bread;2\nmilk;1\n');
		await page.getByText('Cannot be read.').waitFor();
		await page.getByText(/milk/).first().waitFor();
		expect(await page.getByRole('button', { name: 'Keep this series' }).count()).toBe(0);
		await bring('another-plant.csv', `time,TI-9 [degC]\n${minutes(20, () => '41.5')}`);
		await page.getByText('another-plant.csv').waitFor();
		expect(await page.getByRole('button', { name: 'Keep this series' }).count()).toBe(0);
		expect(await page.locator('button.do:enabled').count()).toBe(0);
		await page.getByRole('button', { name: 'Trends supplied with the demonstration' }).click();
		await page.getByRole('button', { name: 'purge-1.csv' }).click();
		await page.getByRole('button', { name: 'Keep this series' }).click();
		await page.waitForURL((url) => !url.pathname.endsWith('/step/2.21'));
	});
}, 180_000);

test('two tabs of one tablet show the same record, and both go on writing it', async () => {
	await atTheDemonstration(async ({ page }) => {
		const other = await page.context().newPage();
		await other.goto(page.url());
		await onStep(page, '2.22', async () => {
			await page.getByRole('button', { name: 'measuring', exact: true }).click();
			await typeAll(page, ['3,1', '3,3', '6,4', '3.8']);
		});
		await page.getByRole('button', { name: 'Save now' }).click();
		await toStep(other, '2.26');
		await shiftIfAsked(other);
		await other.getByRole('button', { name: 'Unbroken' }).click();
		await typeAll(other, ['3,1', '3,3', '6,3', '3,8']);
		await other.waitForURL((url) => !url.pathname.endsWith('/step/2.26'));
		await other.getByRole('button', { name: 'Save now' }).click();
		for (const tab of [page, other]) {
			await toStep(tab, '2.22');
			await tab.getByText(/6,4/).first().waitFor();
			await toStep(tab, '2.26');
			await tab.getByText(/6,3/).first().waitFor();
		}
	});
}, 180_000);

test('storage that is erased under the app is told at once, what is typed stays on the screen, and the next start says so', async () => {
	await atTheDemonstration(async ({ page, address }) => {
		await toStep(page, '2.26');
		await shiftIfAsked(page);
		const field = page.getByRole('article').getByRole('textbox').first();
		await field.fill('3,17');
		const cdp = await page.context().newCDPSession(page);
		await cdp.send('Storage.clearDataForOrigin', { origin: new URL(address).origin, storageTypes: 'indexeddb' });
		await page.getByText('The storage was closed under this tab.').waitFor();
		expect(await field.inputValue()).toBe('3,17');
		await page.goto(address);
		await page.getByText('The browser erased what this tablet held').waitFor();
		await page.getByRole('button', { name: 'I have read this' }).click();
		await page.getByRole('button', { name: 'Show the demonstration' }).waitFor();
	});
}, 180_000);

/** Lines of a trend, one a minute, up to a minute ago. */
function minutes(count: number, values: (n: number) => string): string {
	const last = Date.now() - 60_000;
	return Array.from({ length: count }, (_, n) => {
		const at = new Date(last - (count - 1 - n) * 60_000).toISOString().replace(/\.\d+Z/, 'Z');
		return `${at},${values(n)}\n`;
	}).join('');
}
