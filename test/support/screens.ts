import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { withChromium } from './chromium.mjs';
import { served } from './served';
import { tour } from './tour';

export const SIZES = {
	tablet: { width: 1280, height: 800 },
	upright: { width: 800, height: 1280 },
	phone: { width: 390, height: 844 },
} as const;

export const LOOKS = ['day', 'night', 'glare'] as const;

export type Size = keyof typeof SIZES;
export type Look = (typeof LOOKS)[number];

type Wanted = {
	readonly folder: string;
	readonly sizes: readonly Size[];
	readonly looks: readonly Look[];
	/** Stops whose name holds this; absent: all. */
	readonly only?: string | undefined;
};

/** Takes a picture of every stop of the tour in every size and look, and one page that shows them all. */
export async function takeScreens({ folder, sizes, looks, only = '' }: Wanted): Promise<void> {
	mkdirSync(folder, { recursive: true });
	const taken: string[] = [];
	await served((address) =>
		withChromium(
			async (browser) => {
				const page = await browser.newPage();
				await tour(page, address, async (stop) => {
					if (!stop.includes(only)) return;
					taken.push(stop);
					for (const size of sizes) {
						await page.setViewportSize(SIZES[size]);
						await page.setViewportSize({ ...SIZES[size], height: await wholeHeight(page) });
						for (const look of looks) {
							await wear(page, look);
							await page.screenshot({ path: join(folder, fileOf(stop, size, look)) });
						}
					}
					await page.setViewportSize(SIZES.tablet);
					await wear(page, 'day');
				});
			},
			{ viewport: SIZES.tablet },
		),
	);
	writeFileSync(join(folder, 'index.html'), contactSheet(taken, sizes, looks));
}

/** The look by its attribute, as the app puts it on; the drawing follows in the next frame. */
export async function wear(page: Page, look: Look): Promise<void> {
	await page.evaluate(async (nth) => {
		// Without a pointer, so that what has the focus and what is typed stay as they are.
		document.querySelectorAll<HTMLButtonElement>('header [role="group"] button')[nth]?.click();
		scrollTo(0, 0);
		await document.fonts.ready;
		await new Promise((resolve) => requestAnimationFrame(() => requestAnimationFrame(resolve)));
	}, LOOKS.indexOf(look));
	await page.locator(`html[data-look="${look}"]`).waitFor();
}

/** A screen as long as the page: a picture of a part would show bars that stick to its edge in the middle. */
const wholeHeight = (page: Page): Promise<number> =>
	page.evaluate(() => Math.max(innerHeight, document.documentElement.scrollHeight));

const fileOf = (stop: string, size: Size, look: Look): string => `${stop.replaceAll(/[ .]/g, '-')}.${size}.${look}.png`;

function contactSheet(stops: readonly string[], sizes: readonly Size[], looks: readonly Look[]): string {
	const picture = (stop: string, size: Size, look: Look): string =>
		`<a href="${fileOf(stop, size, look)}"><img loading="lazy" alt="${stop}, ${size}, ${look}" src="${fileOf(stop, size, look)}"></a>`;
	const row = (stop: string): string =>
		`<h2>${stop}</h2><p>${sizes.flatMap((size) => looks.map((look) => picture(stop, size, look))).join('\n')}</p>`;
	return `<!doctype html><meta charset="utf-8"><title>Screens</title>
<style>body{font:16px sans-serif;margin:16px}img{height:260px;margin:0 6px 6px 0;vertical-align:top;border:1px solid #999}</style>
<h1>${stops.length} screens, ${new Date().toISOString()}</h1>
${stops.map(row).join('\n')}
`;
}
