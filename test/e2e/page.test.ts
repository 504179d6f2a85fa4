import { createRequire } from 'node:module';
import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { COMMANDS } from '../../src/cli/commands';
import { withChromium } from '../support/chromium.mjs';
import { served } from '../support/served';

const axe = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

const SIZES = [
	{ width: 1280, height: 800 },
	{ width: 800, height: 1280 },
	{ width: 390, height: 844 },
];

test('the page asks no other machine, is free of faults that a program can see, and fits every screen in every look', async () => {
	await served((address) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			const asked: string[] = [];
			const complaints: string[] = [];
			browser.on('request', (request) => asked.push(new URL(request.url()).origin));
			page.on('console', (message) => complaints.push(message.text()));
			page.on('pageerror', (error) => complaints.push(String(error)));

			for (const size of SIZES) {
				await page.setViewportSize(size);
				await page.goto(`${address}/about`);
				for (const look of ['Day', 'Night', 'Glare']) {
					await page.getByRole('button', { name: look }).click();
					expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(size.width);
					expect({ look, size, faults: await faultsSeenByAxe(page.evaluate.bind(page)) }).toEqual({
						look,
						size,
						faults: [],
					});
				}
			}
			expect(await page.title()).toBe('Gatehold: about');
			expect(await page.evaluate(() => document.fonts.check('700 18px "Sofia Sans"'))).toBe(true);
			expect(new Set(asked)).toEqual(new Set([address]));
			expect(complaints).toEqual([]);
		}),
	);
});

test('the look that was chosen is still there after a reload', async () => {
	await served((address) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			await page.goto(`${address}/about`);
			await page.getByRole('button', { name: 'Night' }).click();
			await page.reload();
			await page.getByRole('button', { name: 'Night', pressed: true }).waitFor();
			expect(await page.evaluate(() => document.documentElement.dataset.look)).toBe('night');
		}),
	);
});

test('the page tells the commands that there are, and no others', async () => {
	await served((address) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			await page.goto(`${address}/about`);
			await page.locator('dt').first().waitFor();
			const told = await page.locator('dt').allTextContents();
			expect(told.map((usage) => usage.split(' ')[0]).sort()).toEqual(Object.keys(COMMANDS).sort());
		}),
	);
});

test('an address where there is nothing says so', async () => {
	await served((address) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			expect((await page.goto(`${address}/nothing`))?.status()).toBe(404);
			await page.getByRole('heading', { name: 'There is nothing at this address' }).waitFor();
		}),
	);
});

type Evaluate = (script: string) => Promise<unknown>;

async function faultsSeenByAxe(evaluate: Evaluate): Promise<unknown> {
	await evaluate(axe);
	return evaluate('axe.run().then(({ violations }) => violations.map(({ id, nodes }) => [id, nodes[0].html]))');
}
