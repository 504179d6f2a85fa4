import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { DEMONSTRATION_PIN } from '../../src/lib/app';
import { withChromium } from '../support/chromium.mjs';
import { served } from '../support/served';

test('without a pointer: the demonstration, a reading, a fan stop, and the first step of the way back', async () => {
	await served((address) =>
		withChromium(
			async (browser) => {
				const page = await browser.newPage();
				page.setDefaultTimeout(20_000);
				const { keyboard } = page;
				await page.goto(address);
				await page.getByRole('button', { name: 'Show the demonstration' }).waitFor();
				await tabTo(page, /^Show the demonstration$/);
				await keyboard.press('Enter');
				await page.getByRole('heading', { name: /stops at/ }).waitFor({ timeout: 120_000 });

				await tabTo(page, /Oxygen watch/);
				await keyboard.press('Enter');
				await page.waitForURL(/\/step\/2\.26$/);
				await tabTo(page, /^PIN$/);
				await keyboard.type(DEMONSTRATION_PIN);
				await keyboard.press('Enter');
				await page.getByRole('button', { name: 'Begin shift' }).waitFor({ state: 'detached' });
				await tabTo(page, /^Unbroken$/);
				await keyboard.press('Space');
				await tabTo(page, /, %, moist$/);
				for (const reading of ['3,1', '3,3', '6,3', '3,8']) {
					await keyboard.type(reading);
					await keyboard.press('Enter');
				}
				await page.waitForURL((url) => !url.pathname.endsWith('/step/2.26'));
				await page.getByText(/^Saved on this tablet/).waitFor();

				await tabTo(page, /^Something happened$/);
				await keyboard.press('Enter');
				await tabTo(page, /^Process-gas fan stopped$/);
				await keyboard.press('Enter');
				await tabTo(page, /^Record/);
				await keyboard.press('Enter');
				await page.getByRole('heading', { level: 1, name: /do not stand|has lapsed/ }).waitFor();
				await tabTo(page, /^Start with/);
				await keyboard.press('Enter');
				await page.waitForURL(/\/step\//);
				expect(await page.getByRole('heading', { level: 1 }).count()).toBe(1);
			},
			{ viewport: { width: 1280, height: 800 } },
		),
	);
}, 240_000);

/** Goes on with the tabulator until what has the focus is called like this, and can be seen to have it. */
async function tabTo(page: Page, name: RegExp): Promise<void> {
	const passed: string[] = [];
	for (let stops = 0; stops < 250; stops++) {
		await page.keyboard.press('Tab');
		const { called, isShown } = await page.evaluate(() => {
			const element = document.activeElement as HTMLInputElement;
			const label = element.getAttribute('aria-label') ?? element.labels?.[0]?.innerText ?? element.textContent;
			const { outlineStyle, outlineWidth, caretColor } = getComputedStyle(element);
			// Where text is typed the caret shows it.
			const hasCaret = element.matches('input, textarea') && !/, 0\)$|transparent/.test(caretColor);
			return {
				called: label.replaceAll(/\s+/g, ' ').trim(),
				isShown: hasCaret || (outlineStyle !== 'none' && outlineWidth !== '0px'),
			};
		});
		if (!name.test(called)) {
			passed.push(called);
			continue;
		}
		if (!isShown) throw new Error(`"${called}" has the focus and does not show it`);
		return;
	}
	throw new Error(`the tabulator never came to ${String(name)}: ${passed.join(' | ')}`);
}
