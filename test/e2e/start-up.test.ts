import { expect, test } from 'vitest';
import {
	beginShift,
	declareWithoutCopy,
	demonstration,
	go,
	release,
	saved,
	startUpOf,
	takeTablet,
	toStep,
	typeAll,
} from '../support/app-hands';
import { withChromium } from '../support/chromium.mjs';
import { served } from '../support/served';
import { finishGate2 } from '../support/tour';

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
			await saved(page, '2.26');
			await page.reload();
			await toStep(page, '2.26');
			await page.getByText(/next reading in/).waitFor();
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
		await demonstration(page, new URL(page.url()).origin);
		await finishGate2(page);
		await takeTablet(page, 'Imre Castellvor');
		await go(page, `${startUpOf(page)}/gate/2`);
		await declareWithoutCopy(page, 'no second place in reach');
		await release(page, 2, '11223345');
		await page.getByText('That PIN is wrong. 9 tries are left. Nothing was signed.').waitFor();
		await release(page, 2);
		await page
			.getByRole('heading', { name: /Gate 3/ })
			.first()
			.waitFor();
		expect(complaints).toEqual([]);
	});
}, 240_000);
