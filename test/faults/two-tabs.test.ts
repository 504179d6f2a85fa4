import { expect, test } from 'vitest';
import { withChromium } from '../support/chromium.mjs';
import { openTab, servedTablet } from '../support/tablet-page';

test('two tabs that write 200 entries at once never fork the chain, and one goes on when the other crashes', async () => {
	await servedTablet(async ({ address, saved }) =>
		withChromium(async (browser) => {
			const [left, right] = [await openTab(browser, address), await openTab(browser, address)];
			const written = await Promise.all([left.ask('write', 'left', 100), right.ask('write', 'right', 100)]);
			expect(written).toEqual(['written', 'written']);
			const both = await right.ask('look');
			expect([both.ids.length, saved.size, both.findings]).toEqual([200, 200, []]);

			const crashes = await browser.newCDPSession(left.page);
			left.ask('write', 'crashing', 100_000).catch(() => undefined);
			await new Promise((resolve) => setTimeout(resolve, 200));
			// A page that crashes does not answer.
			crashes.send('Page.crash').catch(() => undefined);
			expect(await right.ask('write', 'survivor', 20)).toBe('written');
			const after = await right.ask('look');
			expect([[...saved].filter((id) => !after.ids.includes(id)), after.findings]).toEqual([[], []]);
		}),
	);
});

test('an entry waits for the medium: the browser itself says that the transaction is strict', async () => {
	await servedTablet(async ({ address }) =>
		withChromium(async (browser) => {
			const tab = await openTab(browser, address);
			expect(await tab.ask('write', 'technician', 1)).toBe('written');
			expect(await tab.ask('durability')).toEqual(['strict']);
		}),
	);
});
