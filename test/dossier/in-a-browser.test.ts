import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from 'vite';
import { expect, test } from 'vitest';
import { fromBase64, sha256Hex, toBase64 } from '../../src/lib/base';
import { buildDossier, type DossierInput } from '../../src/lib/dossier';
import { withChromium } from '../support/chromium.mjs';
import { nightInput } from '../support/night-dossier';
import { value } from '../support/test-site';

/** The dossier room as a script of its own: what a page or a worker would load. */
async function bundled(): Promise<string> {
	const folder = mkdtempSync(join(tmpdir(), 'dossier-browser-'));
	const entry = join(folder, 'entry.ts');
	const room = new URL('../../src/lib/dossier/index.ts', import.meta.url).pathname;
	writeFileSync(
		entry,
		`import { buildDossier } from ${JSON.stringify(room)};\nObject.assign(globalThis, { buildDossier });\n`,
	);
	const built = await build({
		configFile: false,
		logLevel: 'error',
		build: { write: false, minify: false, lib: { entry, formats: ['iife'], name: 'room' } },
	});
	// Only a build that watches answers with something else.
	if (!Array.isArray(built)) throw new Error('nothing was built');
	return built[0]!.output[0].code;
}

/** Bytes travel as text, in both directions. */
const packed = (input: DossierInput) =>
	JSON.stringify(input, (_, each: unknown) => (each instanceof Uint8Array ? { base64: toBase64(each) } : each));

test('[D1] a browser writes the same bytes as Node', async () => {
	const input = await nightInput();
	const here = value(await buildDossier(input));
	const there = await withChromium(async (context) => {
		const page = await context.newPage();
		await page.addScriptTag({ content: await bundled() });
		return page.evaluate(async (text: string) => {
			const bytesOf = (base64: string) => Uint8Array.from(atob(base64), (letter) => letter.charCodeAt(0));
			const revived: unknown = JSON.parse(text, (_, each: unknown) =>
				typeof each === 'object' && each !== null && 'base64' in each ? bytesOf(String(each.base64)) : each,
			);
			type Build = (input: unknown) => Promise<{ ok: boolean; value: Uint8Array }>;
			const { value: bytes } = await (globalThis as unknown as { buildDossier: Build }).buildDossier(revived);
			let binary = '';
			for (let i = 0; i < bytes.length; i += 0x8000) binary += String.fromCharCode(...bytes.subarray(i, i + 0x8000));
			return btoa(binary);
		}, packed(input));
	});
	expect(sha256Hex(fromBase64(there)!)).toBe(sha256Hex(here));
}, 180_000);
