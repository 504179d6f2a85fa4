import { expect, test } from 'vitest';
import { byTouch, demonstration } from '../support/app-hands';
import { withChromium } from '../support/chromium.mjs';
import { ROWS } from '../support/demonstration-rows';
import { served } from '../support/served';
import { beats, letPassUntil, perform, standingShown, TAKEN_UP } from '../support/story-hands';

const dated = (time: string): string => `2026-03-${time >= '16:00' ? '14' : '15'}T${time}:00`;

test('the night through the screens, without a server: at every row the gates and the list are the ones of the rules', async () => {
	await withChromium(
		async (browser) => {
			const page = await browser.newPage();
			page.setDefaultTimeout(10_000);
			byTouch(page);
			const complaints: string[] = [];
			page.on('pageerror', (error) => complaints.push(String(error)));
			await page.clock.install({ time: TAKEN_UP });
			const address = await served(async (served) => {
				await page.goto(served);
				await page.getByText('it works without network').waitFor();
				return served;
			});
			await page.reload();
			await demonstration(page, address);

			let from = '2026-03-14T21:31:00';
			for (const [time, gates, list, because] of ROWS.filter(
				([time]) => dated(time) > from && dated(time) <= dated('09:40'),
			)) {
				const until = dated(time).replace(/:00$/, ':59');
				for (const beat of beats(from, until)) await perform(page, beat);
				from = until;
				// People need some seconds of every minute; what lapses with it has lapsed near its end.
				await letPassUntil(page, dated(time).replace(/:00$/, ':40'));
				expect({ time, because, ...(await standingShown(page)) }).toEqual({
					time,
					because,
					gates,
					list: [...list].sort(),
				});
			}
			expect(complaints).toEqual([]);
		},
		{ viewport: { width: 1280, height: 800 }, timezoneId: 'Europe/Berlin', hasTouch: true },
	);
}, 400_000);
