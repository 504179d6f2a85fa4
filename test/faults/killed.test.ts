import { expect, test } from 'vitest';
import { openTab, servedTablet, withProfile } from '../support/tablet-page';

const CYCLES = 6;

test(`a browser killed ${CYCLES} times while entries are written loses none that it called saved, and tears none`, async () => {
	await servedTablet(async ({ address, saved, drafts }) =>
		withProfile(async (start) => {
			for (let cycle = 0; cycle <= CYCLES; cycle++) {
				const browser = await start();
				const tab = await openTab(browser.context, address);
				expect(await tab.ask('open')).toEqual({});
				const { ids, damaged, findings, drafts: kept } = await tab.ask('look');
				expect({ lost: [...saved].filter((id) => !ids.includes(id)), damaged, findings }).toEqual({
					lost: [],
					damaged: [],
					findings: [],
				});
				expect(Number(kept[0] ?? 0)).toBeGreaterThanOrEqual(drafts.at(-1) ?? 0);
				if (cycle === CYCLES) break;
				const before = saved.size;
				// Its end is the kill's doing.
				tab.ask('write', 'technician', 100_000, (cycle * 977) % 4000).catch(() => undefined);
				await expect.poll(() => saved.size, { timeout: 20_000, interval: 5 }).toBeGreaterThan(before);
				await new Promise((resolve) => setTimeout(resolve, 110 * cycle));
				await browser.kill();
			}
		}),
	);
}, 180_000);

test('a browser killed while it tries a wrong PIN has used that try up', async () => {
	await servedTablet(async ({ address, saved }) =>
		withProfile(async (start) => {
			for (const left of [10, 9, 8]) {
				const browser = await start();
				const tab = await openTab(browser.context, address);
				if (left === 10) await tab.ask('enrol');
				expect(await tab.ask('triesLeft')).toBe(left);
				saved.clear();
				tab.ask('guess').catch(() => undefined);
				await expect.poll(() => saved.size, { timeout: 20_000, interval: 1 }).toBe(1);
				await browser.kill();
			}
		}),
	);
}, 120_000);
