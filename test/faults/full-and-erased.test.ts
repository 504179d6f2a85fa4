import { expect, test } from 'vitest';
import { withChromium } from '../support/chromium.mjs';
import { openTab, servedTablet } from '../support/tablet-page';

test('when storage is full a photo is refused whole, readings are still saved, and space lets photos in again', async () => {
	await servedTablet(async ({ address, saved }) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			await page.goto(address.replace('localhost', '127.0.0.1'));
			const cdp = await browser.newCDPSession(page);
			const origin = new URL(address).origin;
			// Chromium heeds the limit only if it stands before the first write.
			await cdp.send('Storage.overrideQuotaForOrigin', { origin, quotaSize: 400 * 1024 });
			const tab = await openTab(browser, address);
			expect(await tab.ask('photo', 1000)).toEqual({ kind: 'storage-full' });
			expect(await tab.ask('photos')).toBe(0);
			expect(await tab.ask('write', 'technician', 5)).toBe('written');
			expect((await tab.ask('look')).ids).toEqual([...saved]);

			// Entries fill what is left: the one that does not fit is refused whole as well.
			expect(await tab.ask('write', 'wordy', 1000, 3500)).toEqual({ kind: 'storage-full' });
			const full = await tab.ask('look');
			expect([full.ids.length, full.damaged, full.findings]).toEqual([saved.size, [], []]);

			await cdp.send('Storage.overrideQuotaForOrigin', { origin });
			expect(await tab.ask('photo', 1000)).toBe('saved');
			expect(await tab.ask('write', 'technician', 5)).toBe('written');
		}),
	);
});

test('when photos have filled a tablet, the entries of a whole night still fit into the room set aside', async () => {
	await servedTablet(async ({ address }) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			await page.goto(address.replace('localhost', '127.0.0.1'));
			const cdp = await browser.newCDPSession(page);
			const origin = new URL(address).origin;
			await cdp.send('Storage.overrideQuotaForOrigin', { origin, quotaSize: 20_000_000 });
			const tab = await openTab(browser, address);
			expect(await tab.ask('keepReserve')).toBe('kept');
			for (const kilobytes of [1000, 100, 10]) {
				let said: unknown = 'saved';
				while (said === 'saved') said = await tab.ask('photo', kilobytes);
				expect(said).toEqual({ kind: 'storage-full' });
			}
			expect(await tab.ask('reserveIsSpent')).toBe(false);
			// The demonstration's night has 130 events.
			expect(await tab.ask('write', 'technician', 130, 1000)).toBe('written');
			expect(await tab.ask('reserveIsSpent')).toBe(true);
			expect((await tab.ask('look')).ids).toHaveLength(130);
		}),
	);
});

test('a database that the browser erases under the app is noticed at once, and told after the next start', async () => {
	await servedTablet(async ({ address }) =>
		withChromium(async (browser) => {
			const tab = await openTab(browser, address);
			expect(await tab.ask('open')).toEqual({});
			expect(await tab.ask('write', 'technician', 3)).toBe('written');
			const cdp = await browser.newCDPSession(tab.page);
			await cdp.send('Storage.clearDataForOrigin', { origin: new URL(address).origin, storageTypes: 'indexeddb' });
			await expect.poll(() => tab.ask('closed'), { timeout: 10_000 }).toBe(1);
			await expect(tab.ask('write', 'unknowing', 1)).rejects.toThrow('storage-closed');

			await tab.page.reload();
			expect(await tab.ask('open')).toEqual({ erased: '2026-05-04T12:00:00+02:00' });
			expect((await tab.ask('look')).ids).toEqual([]);
		}),
	);
});

test('the tablet shows whether the browser has promised to keep its data', async () => {
	await servedTablet(async ({ address }) =>
		withChromium(async (browser) => {
			const tab = await openTab(browser, address);
			expect(await tab.ask('askToPersist')).toBe(false);
			expect(await tab.ask('health')).toMatchObject({ ok: true, value: { persisted: false } });
			const cdp = await browser.newCDPSession(tab.page);
			const origin = new URL(address).origin;
			await cdp.send('Browser.grantPermissions', { origin, permissions: ['durableStorage'] });
			expect(await tab.ask('askToPersist')).toBe(true);
			expect(await tab.ask('health')).toMatchObject({ ok: true, value: { persisted: true } });
		}),
	);
});
