import { mkdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { openGallery, SCENES, SIZES, type Gallery, type Look } from './gallery/open-gallery';

let gallery: Gallery;
beforeAll(async () => {
	gallery = await openGallery();
	await gallery.page.evaluate(readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8'));
}, 120_000);
afterAll(() => gallery.close());

const LOOKS: readonly Look[] = ['day', 'night', 'glare'];
const sizes = Object.keys(SIZES) as (keyof typeof SIZES)[];
/** Pictures of every scene are written where this names a folder. */
const PICTURES = process.env.GALLERY_PICTURES;

/** What is wrong with the scene that is shown, as sentences. */
const faults = (): Promise<readonly string[]> =>
	gallery.page.evaluate(() => {
		const found: string[] = [];
		const root = document.documentElement;
		if (root.scrollWidth > root.clientWidth) found.push(`it is ${root.scrollWidth - root.clientWidth} px too wide`);
		const inks = ['--ink', '--ink2', '--onblue', '--paper'].map((name) => {
			const probe = document.createElement('i');
			probe.style.color = `var(${name})`;
			document.body.append(probe);
			const { color } = getComputedStyle(probe);
			probe.remove();
			return color;
		});
		const seen = (element: Element): boolean => {
			const { width, height } = element.getBoundingClientRect();
			return width > 1 && height > 1 && element.closest('.unseen') === null;
		};
		for (const element of document.querySelectorAll(
			'button, a[href], [role=button], select, summary, label.word, label.do',
		)) {
			const { width, height } = element.getBoundingClientRect();
			const name = element.getAttribute('aria-label') ?? element.textContent.trim();
			// A hairline may share half a pixel between two rows.
			if (seen(element) && (width < 45.5 || height < 47)) found.push(`"${name}" is ${width} x ${height}`);
		}
		const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
		for (let node = walker.nextNode(); node !== null; node = walker.nextNode()) {
			const element = node.parentElement;
			const text = node.textContent?.trim() ?? '';
			if (text === '' || element === null || !seen(element)) continue;
			const style = getComputedStyle(element);
			const size = Number.parseFloat(style.fontSize);
			if (size < 16 && element.closest('figure, sub, svg') === null) found.push(`"${text}" is ${size} px`);
			const colour = element.closest('svg') === null ? style.color : style.fill;
			if (!inks.includes(colour)) found.push(`"${text}" is ${colour}`);
		}
		return [...new Set(found)];
	});

describe.each(SCENES)('the scene "%s"', (scene) => {
	test.each(sizes)('fits a %s: nothing too wide, targets for a glove, words large enough and in ink', async (size) => {
		for (const look of size === 'tablet' ? LOOKS : (['day'] as const)) {
			await gallery.show(scene, size, look);
			expect(await faults()).toEqual([]);
			if (PICTURES === undefined) continue;
			mkdirSync(PICTURES, { recursive: true });
			const path = join(PICTURES, `${scene.replaceAll(' ', '-')}.${size}.${look}.png`);
			await gallery.page.screenshot({ path, fullPage: true });
		}
		expect(gallery.errors).toEqual([]);
	});

	test('is clean for who cannot see it', async () => {
		for (const look of LOOKS) {
			await gallery.show(scene, 'tablet', look);
			const violations = await gallery.page.evaluate(async () => {
				const { axe } = globalThis as unknown as {
					axe: { run: () => Promise<{ violations: { id: string; nodes: { html: string }[] }[] }> };
				};
				return (await axe.run()).violations.map(
					({ id, nodes }) =>
						`${id}: ${nodes
							.map(({ html }) => html)
							.join(' ')
							.slice(0, 300)}`,
				);
			});
			expect(violations).toEqual([]);
		}
	});
});
