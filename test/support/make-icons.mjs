/** Draws the icons that a browser wants as pictures from `static/icon.svg`: `npm run icons`. */
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { withChromium } from './chromium.mjs';

const STATIC = join(import.meta.dirname, '../../static');
const svg = readFileSync(join(STATIC, 'icon.svg'), 'utf8');
/** A home screen may cut an icon to a circle of four fifths: what matters stays inside, the ground goes on outside. */
const inCircle = svg
	.replace('viewBox="0 0 48 48"', 'viewBox="-8 -8 64 64"')
	.replace('<rect width="48" height="48"', '<rect x="-8" y="-8" width="64" height="64"');

await withChromium(async (context) => {
	const page = await context.newPage();
	for (const { name, size, picture } of [
		{ name: 'icon-192.png', size: 192, picture: svg },
		{ name: 'icon-512.png', size: 512, picture: svg },
		{ name: 'icon-maskable-512.png', size: 512, picture: inCircle },
	]) {
		await page.setViewportSize({ width: size, height: size });
		await page.setContent(`<style>*{margin:0}svg{display:block;width:100vw;height:100vh}</style>${picture}`);
		writeFileSync(join(STATIC, name), await page.screenshot());
	}
});
