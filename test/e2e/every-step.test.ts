import { expect, test } from 'vitest';
import { LIBRARY } from '../../src/lib/procedure';
import { beginShift, demonstration, toStep } from '../support/app-hands';
import { withChromium } from '../support/chromium.mjs';
import { served } from '../support/served';

/** What a person touches or types into to do a step: each kind of body has one of these. */
const TO_DO = '[role=checkbox], [role=radio], input.hero, .do, label.even, .choices button, .drop label, .pick button';

test('every step of the procedure opens on a sheet on which it can be entered', async () => {
	const steps = LIBRARY['inert-start-up']?.steps ?? [];
	expect(steps.length).toBeGreaterThan(90);
	await served((address) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			page.setDefaultTimeout(12_000);
			const complaints: string[] = [];
			page.on('pageerror', (error) => complaints.push(String(error)));
			await demonstration(page, address);
			await toStep(page, steps[0]?.id ?? '');
			await beginShift(page);
			const without: string[] = [];
			for (const { id, kind, title } of steps) {
				await toStep(page, id);
				const sheet = page.getByRole('article', { name: `Step ${id}: ${title}` });
				const found = await sheet.locator(TO_DO).count();
				if (found === 0) without.push(`${id} ${kind}`);
			}
			expect(without).toEqual([]);
			expect(complaints).toEqual([]);
		}),
	);
}, 240_000);
