import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { demonstration, shiftIfAsked, startUpOf, toStep } from '../support/app-hands';
import { seeded } from '../support/seeded';
import { served } from '../support/served';
import { withProfile } from '../support/tablet-page';

const KILLS = 20;
/** Another run at the same moments: `KILLED_AT=12345 npm run test:fast -- test/faults/app-killed`. */
const SEED = Number(process.env.KILLED_AT ?? Math.floor(Math.random() * 1e9));

/** What was typed so long ago is kept; the letter under the finger may go. */
const KEPT_AFTER = 400;

/** What the person at the tablet knows. */
type Known = {
	/** Readings of entries after which the screen went on. */
	readonly acknowledged: Set<string>;
	/** The reading typed last, a moment ago; it is not entered yet. */
	typed: string | undefined;
};

test(`the app, killed ${KILLS} times while readings are entered (KILLED_AT=${SEED}), loses none that it acknowledged`, async () => {
	const random = seeded(SEED);
	await served((address) =>
		withProfile(async (start) => {
			const known: Known = { acknowledged: new Set(), typed: undefined };
			let step = '';
			for (let kill = 0; kill <= KILLS; kill++) {
				const browser = await start();
				const page = await browser.context.newPage();
				page.setDefaultTimeout(20_000);
				if (step === '') {
					await demonstration(page, address);
					step = `${address}${startUpOf(page)}/step/2.26`;
				} else {
					await page.goto(step);
					await whole(page, known, kill);
				}
				if (kill === KILLS) break;
				const moment = 100 + random() * 2400;
				const work = enterReadings(page, known, kill).catch((error: unknown) => error);
				await new Promise((resolve) => setTimeout(resolve, moment));
				await browser.kill();
				await work;
			}
			expect(known.acknowledged.size).toBeGreaterThan(KILLS / 4);
		}),
	);
}, 400_000);

/** What lies on the page after it was opened again is what the person knows: every entry, and the half-typed reading. */
async function whole(page: Page, known: Known, kill: number): Promise<void> {
	await page.getByText('Step 2.26', { exact: true }).first().waitFor();
	const kept = await page.evaluate(
		() =>
			new Promise<readonly string[]>((resolve, reject) => {
				const asked = indexedDB.open('gatehold');
				asked.onerror = () => reject(new Error('no database'));
				asked.onsuccess = () => {
					const rows = asked.result.transaction('events').objectStore('events').getAll();
					rows.onsuccess = () => {
						asked.result.close();
						resolve((rows.result as { text: string }[]).map(({ text }) => text));
					};
				};
			}),
	);
	const lost = [...known.acknowledged].filter((reading) => !kept.some((text) => text.includes(`"typed":"${reading}"`)));
	expect({ kill, lost }).toEqual({ kill, lost: [] });
	const { typed } = known;
	if (typed === undefined) return;
	// It was entered after all, or it is there again.
	const isEntered = kept.some((text) => text.includes(`"typed":"${typed}"`));
	if (!isEntered) await page.getByRole('article').getByText(typed).first().waitFor();
	known.typed = undefined;
}

/** Readings that are never the same twice, one entry after the other, until the browser dies. */
async function enterReadings(page: Page, known: Known, kill: number): Promise<void> {
	await shiftIfAsked(page);
	for (let entry = 0; ; entry++) {
		await toStep(page, '2.26');
		await page.getByRole('button', { name: 'Unbroken' }).click();
		const reading = `3,${String(kill + 1).padStart(2, '0')}${String(entry).padStart(2, '0')}`;
		const article = page.getByRole('article');
		for (const [tag, text] of Object.entries({
			'AT-211': reading,
			'AT-212': '3,1',
			'AT-213': '3,1',
			'AT-214': '3,1',
		})) {
			await article.getByRole('button', { name: tag }).click();
			await article.getByRole('textbox').first().fill(text);
			if (text !== reading) continue;
			await new Promise((resolve) => setTimeout(resolve, KEPT_AFTER));
			known.typed = reading;
		}
		await article.getByRole('textbox').first().press('Enter');
		await page.waitForURL((url) => !url.pathname.endsWith('/step/2.26'));
		known.acknowledged.add(reading);
		known.typed = undefined;
	}
}
