import { createRequire } from 'node:module';
import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { withChromium } from '../support/chromium.mjs';
import { patternOf, routePatterns } from '../support/routes';
import { LOOKS, SIZES, wear } from '../support/screens';
import { served } from '../support/served';
import { tour } from '../support/tour';

const axe = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

type Fault = { readonly stop: string; readonly worn: string; readonly fault: string };

test('every page fits three sizes in three looks, has one heading and a title of its own, and axe finds nothing', async () => {
	await served((address) =>
		withChromium(async (browser) => {
			const page = await browser.newPage();
			await page.setViewportSize(SIZES.tablet);
			const complaints: string[] = [];
			page.on('pageerror', (error) => complaints.push(String(error)));
			const faults: Fault[] = [];
			const titles = new Map<string, Set<string>>();
			const seen = new Set<string>();
			await tour(page, address, async (stop) => {
				const pattern = patternOf(new URL(page.url()).pathname) ?? page.url();
				seen.add(pattern);
				titles.set(await page.title(), (titles.get(await page.title()) ?? new Set()).add(pattern));
				await page.evaluate(axe);
				for (const [size, viewport] of Object.entries(SIZES)) {
					await page.setViewportSize(viewport);
					for (const look of LOOKS) {
						await wear(page, look);
						const found = [...(await faultsOfShape(page)), ...(await faultsSeenByAxe(page, size, look))];
						faults.push(...found.map((fault) => ({ stop, worn: `${size} ${look}`, fault })));
					}
				}
				await page.setViewportSize(SIZES.tablet);
				await wear(page, 'day');
			});
			expect(faults).toEqual([]);
			expect([...titles].filter(([, patterns]) => patterns.size > 1)).toEqual([]);
			expect([...routePatterns()].filter((pattern) => !seen.has(pattern))).toEqual([]);
			expect(complaints).toEqual([]);
		}),
	);
}, 400_000);

/** What a ruler finds: too wide, no single heading, targets too small for a glove. */
const faultsOfShape = (page: Page): Promise<readonly string[]> =>
	page.evaluate(() => {
		const found: string[] = [];
		const root = document.documentElement;
		if (root.scrollWidth > root.clientWidth) found.push(`it is ${root.scrollWidth - root.clientWidth} px too wide`);
		const isSeen = (element: Element): boolean => {
			const { width, height } = element.getBoundingClientRect();
			return width > 1 && height > 1 && element.closest('.unseen') === null && element.checkVisibility();
		};
		const headings = [...document.querySelectorAll('h1')].filter((heading) => heading.checkVisibility());
		if (headings.length !== 1) found.push(`it has ${headings.length} headings of the first level`);
		for (const element of document.querySelectorAll(
			'button, a[href], [role=button], select, summary, label.word, label.do, input:not([type=checkbox], [type=radio])',
		)) {
			const { width, height } = element.getBoundingClientRect();
			const name = element.getAttribute('aria-label') ?? element.textContent.trim();
			// A hairline may share half a pixel between two rows.
			if (isSeen(element) && (width < 45.5 || height < 47)) found.push(`"${name}" is ${width} x ${height}`);
		}
		return found;
	});

/** Names, roles and order can change with the size alone, ink with the look alone: nothing is asked twice. */
async function faultsSeenByAxe(page: Page, size: string, look: string): Promise<readonly string[]> {
	if (look !== 'day' && size !== 'tablet') return [];
	const options = look === 'day' ? {} : { runOnly: ['color-contrast'] };
	return page.evaluate(async (asked) => {
		const { axe } = globalThis as unknown as {
			axe: { run: (options: unknown) => Promise<{ violations: { id: string; nodes: { html: string }[] }[] }> };
		};
		const { violations } = await axe.run(asked);
		return violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 200)).join(' ')}`);
	}, options);
}
