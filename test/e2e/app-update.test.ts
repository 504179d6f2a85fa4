import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { BrowserContext, Page } from 'playwright-core';
import { describe, expect, test } from 'vitest';
import { withChromium } from '../support/chromium.mjs';
import { served } from '../support/served';

/** The built app behind a door that can be shut, and that can hand out a newer version of it. */
async function withDoor<T>(use: (door: Door) => Promise<T>): Promise<T> {
	return served(async (address) => {
		const { version } = (await (await fetch(`${address}/_app/version.json`)).json()) as { version: string };
		let handsOut = version;
		const server = createServer((request, response) => {
			void (async () => {
				const answer = await fetch(address + (request.url ?? '/'), { headers: { 'accept-encoding': 'identity' } });
				const bytes = Buffer.from(await answer.arrayBuffer());
				const isWorker = request.url === '/service-worker.js';
				for (const [name, value] of answer.headers)
					if (!['content-length', 'content-encoding', 'transfer-encoding', 'connection', 'etag'].includes(name))
						response.setHeader(name, value);
				response.statusCode = answer.status;
				response.end(isWorker ? bytes.toString('utf8').replaceAll(version, handsOut) : bytes);
			})().catch(() => response.destroy());
		});
		await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
		try {
			return await use({
				address: `http://localhost:${(server.address() as AddressInfo).port}`,
				shut: () => shut(server),
				handOut: (name) => (handsOut = name),
				version,
			});
		} finally {
			await shut(server);
		}
	});
}

type Door = {
	readonly address: string;
	readonly version: string;
	readonly shut: () => Promise<void>;
	readonly handOut: (version: string) => void;
};

const shut = (server: Server): Promise<void> =>
	new Promise((resolve) => {
		server.closeAllConnections();
		server.close(() => resolve());
	});

/** The demonstration, played in a tab whose app is kept on the tablet. */
async function demonstrationIn(context: BrowserContext, address: string): Promise<{ page: Page; startUp: string }> {
	const page = await context.newPage();
	await page.goto(address);
	await page.evaluate(() => navigator.serviceWorker.ready.then(() => undefined));
	await page.getByRole('button', { name: 'Show the demonstration' }).click();
	await page.waitForURL(/\/start-ups\/./, { timeout: 120_000 });
	return { page, startUp: new URL(page.url()).pathname };
}

const kept = (page: Page): Promise<readonly string[]> => page.evaluate(() => caches.keys());

describe('the app kept on the tablet', () => {
	test('opens every place of it where no server answers, whatever address was asked for', async () => {
		await withDoor(({ address, shut }) =>
			withChromium(async (context) => {
				const { page, startUp } = await demonstrationIn(context, address);
				await shut();
				const failed: string[] = [];
				page.on('requestfailed', (request) => failed.push(request.url()));
				const places = [
					...['/', '/start-ups', '/start-ups/new', '/plant', '/people', '/archive', '/settings', '/begin', '/about'],
					...['', '/now', '/lapsed', '/deviations', '/log', '/happened', '/gate/2', '/step/2.17'].map(
						(at) => startUp + at,
					),
				];
				const titles: (readonly [string, string])[] = [];
				for (const place of places) {
					await page.goto(address + place);
					titles.push([place, await page.locator('h1').first().innerText({ timeout: 20_000 })]);
				}
				expect(titles.filter(([, title]) => /nothing at this address|could not be shown/i.test(title))).toEqual([]);
				expect(titles.every(([, title]) => title.trim() !== '')).toBe(true);
				expect(failed).toEqual([]);
			}),
		);
	}, 400_000);

	test('changes to a new version by consent alone, and never while a start-up is open in any tab', async () => {
		await withDoor(({ address, handOut, version }) =>
			withChromium(async (context) => {
				const { page: atWork } = await demonstrationIn(context, address);
				const other = await context.newPage();
				await other.goto(`${address}/settings`);
				await other.locator('h1').waitFor();
				handOut(`${version}-next`);
				await other.evaluate(async () => (await navigator.serviceWorker.ready).update());
				const offer = other.getByRole('button', { name: 'Load it' });
				await offer.waitFor({ timeout: 60_000 });
				expect(await atWork.getByRole('button', { name: 'Load it' }).count()).toBe(0);
				for (const page of [atWork, other]) await page.evaluate(() => Object.assign(globalThis, { sinceBefore: true }));
				const isAsBefore = (page: Page) => page.evaluate(() => 'sinceBefore' in globalThis);

				await offer.click();
				await other.getByText('no tab shows a start-up').waitFor();
				expect([await isAsBefore(atWork), await isAsBefore(other)]).toEqual([true, true]);

				await atWork.getByRole('link', { name: 'Settings' }).click();
				await atWork.getByRole('heading', { name: 'Settings' }).waitFor();
				await offer.click();
				for (const page of [atWork, other]) await expect.poll(() => isAsBefore(page), { timeout: 20_000 }).toBe(false);
				await other.locator('h1').waitFor();
				expect(await kept(other)).toEqual([`gatehold ${version}-next`]);
				expect(await other.getByRole('button', { name: 'Load it' }).count()).toBe(0);
			}),
		);
	}, 400_000);

	test('can be installed: name, start and icons are what a browser asks for', async () => {
		await withDoor(({ address }) =>
			withChromium(async (context) => {
				const page = await context.newPage();
				await page.goto(address);
				const cdp = await context.newCDPSession(page);
				const manifest = await cdp.send('Page.getAppManifest');
				expect(manifest.errors).toEqual([]);
				const icons = (JSON.parse(manifest.data ?? '{}') as { icons: { src: string; sizes: string }[] }).icons;
				expect(icons.map(({ sizes }) => sizes).sort()).toEqual(['192x192', '512x512', '512x512', 'any']);
				for (const { src, sizes } of icons.filter(({ sizes: named }) => named !== 'any')) {
					const size = await page.evaluate(async (at) => {
						const bitmap = await createImageBitmap(await (await fetch(at)).blob());
						return `${bitmap.width}x${bitmap.height}`;
					}, src);
					expect(size).toBe(sizes);
				}
				await page.evaluate(() => navigator.serviceWorker.ready.then(() => undefined));
				const { installabilityErrors } = await cdp.send('Page.getInstallabilityErrors');
				expect(installabilityErrors.map(({ errorId }) => errorId).filter((id) => id !== 'in-incognito')).toEqual([]);
			}),
		);
	}, 120_000);
});
