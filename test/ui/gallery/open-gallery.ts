import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { svelte, vitePreprocess } from '@sveltejs/vite-plugin-svelte';
import type { BrowserContext, Page } from 'playwright-core';
import { build, preview } from 'vite';
import { withChromium } from '../../support/chromium.mjs';
import { freePort } from '../../support/served';
import type { GalleryPage } from './main';
import { galleryData } from './moments-of-the-night';

export const SCENES = [
	'today',
	'start-up places',
	'moving ladder',
	'start-up',
	'line-up ladder',
	'refused ladder',
	'stopped ladder',
	'ended ladder',
	'outline',
	'now',
	'now stale',
	'reading',
	'confirm',
	'line-up',
	'quick sheet',
	'series',
	'series unreadable',
	'calculation',
	'coverage',
	'choice',
	'photo',
	'timed hold',
	'watch',
	'witness',
	'review',
	'earlier entries',
	'sign',
	'sign not ready',
	'lapsed',
	'happened',
	'purge',
	'purge not yet',
	'refusal',
	'deviation',
	'deviations',
	'log',
	'people',
	'person switch',
	'verify',
	'calculators',
	'calculator',
	'calculator refused',
	'calculator with a table',
	'calculator with surfaces',
	'calculator of data',
	'archive',
	'archive files',
	'seal',
	'seal open',
	'dossier',
	'storage',
	'sketch',
] as const;

export type Scene = (typeof SCENES)[number];
export type Look = 'day' | 'night' | 'glare';

export const SIZES = {
	tablet: { width: 1280, height: 800 },
	upright: { width: 800, height: 1280 },
	phone: { width: 390, height: 844 },
} as const;

export type Gallery = {
	readonly page: Page;
	/** Errors of the page so far. */
	readonly errors: readonly string[];
	readonly show: (scene: Scene, size: keyof typeof SIZES, look?: Look) => Promise<void>;
	/** What the components told whoever holds them. */
	readonly told: () => Promise<readonly string[]>;
	readonly close: () => Promise<void>;
};

/** The gallery in a real browser, with the demonstration's data, until it is closed. */
export async function openGallery(): Promise<Gallery> {
	const outDir = mkdtempSync(join(tmpdir(), 'gatehold-gallery-'));
	const shared = { root: import.meta.dirname, configFile: false as const, logLevel: 'error' as const };
	const plugins = [svelte({ preprocess: vitePreprocess(), configFile: false })];
	const publicDir = join(import.meta.dirname, '../../../static');
	await build({ ...shared, plugins, publicDir, build: { outDir, emptyOutDir: true } });
	const port = await freePort();
	const server = await preview({ ...shared, build: { outDir }, preview: { port, host: '127.0.0.1' } });
	const data = await galleryData();
	const { context, stop } = await heldChromium();
	const page = await context.newPage();
	const errors: string[] = [];
	page.on('pageerror', (error) => errors.push(error.message));
	page.on('console', (message) => message.type() === 'error' && errors.push(message.text()));
	await page.goto(`http://127.0.0.1:${port}/`);
	await page.evaluate((given) => Object.assign(globalThis, { given }), data as never);
	return {
		page,
		errors,
		async show(scene, size, look = 'day') {
			await page.setViewportSize(SIZES[size]);
			await page.evaluate(
				([name, worn]) => {
					const { gallery, given } = globalThis as unknown as { gallery: GalleryPage; given: never };
					gallery.show(given, name, worn);
					scrollTo(0, 0);
				},
				[scene, look] as const,
			);
			await page.evaluate(() => document.fonts.ready);
			await page.evaluate(() => new Promise(requestAnimationFrame));
		},
		async told() {
			const text = await page.locator('main').getAttribute('data-told');
			return (text ?? '').split('|').filter((each) => each !== '');
		},
		async close() {
			await stop();
			await server.close();
			rmSync(outDir, { recursive: true, force: true });
		},
	};
}

/** A browser that lives until it is told to stop. */
async function heldChromium(): Promise<{ readonly context: BrowserContext; readonly stop: () => Promise<void> }> {
	let release: () => void = () => undefined;
	const held = new Promise<void>((resolve) => (release = resolve));
	return new Promise((resolve, reject) => {
		const ended = withChromium(async (context) => {
			resolve({
				context,
				stop: async () => {
					release();
					await ended;
				},
			});
			await held;
		});
		ended.catch(reject);
	});
}
