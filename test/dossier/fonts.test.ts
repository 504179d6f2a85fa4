import { readFileSync } from 'node:fs';
import { inflateSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { FACES } from '../../src/lib/dossier/fonts/faces';
import { srgbProfile } from '../../src/lib/dossier/pdf/icc';
import { pdfDate } from '../../src/lib/dossier/pdf/metadata';
import { FACES as SOURCES, makeFace } from '../support/make-pdf-fonts.mjs';

type FaceFile = keyof typeof SOURCES;

describe.each(Object.keys(SOURCES) as FaceFile[])('%s', (file) => {
	const committed = readFileSync(new URL(`../../src/lib/dossier/fonts/${file}.ts`, import.meta.url), 'utf8');

	test('is what its open source makes today', async () => {
		// Another zlib may pack the same font otherwise, so the packed bytes are compared unpacked.
		const unpacked = (module: string) => inflateSync(Buffer.from(/deflated:\s*'([^']*)'/.exec(module)![1]!, 'base64'));
		const made = await makeFace(file);
		const rest = (module: string) => module.replace(/deflated:\s*'[^']*'/, '');
		expect(rest(made)).toBe(rest(committed));
		expect(unpacked(made).equals(unpacked(committed))).toBe(true);
	});

	test('says as many bytes as the font has', () => {
		const [, packed = ''] = /deflated:\s*'([^']*)'/.exec(committed) ?? [];
		const [, bytes = ''] = /bytes: (\d+)/.exec(committed) ?? [];
		expect(inflateSync(Buffer.from(packed, 'base64')).length).toBe(Number(bytes));
	});
});

test('letters of the five languages, Greek and the signs of the trade are in every face', () => {
	const needed =
		'ABCabc äöüßÄÖÜ ñáéíóú¿¡ àâçèêëîïôùûœæ ąćęłńóśźż αβγδεηκλμρτφΔΣΩ 0123456789 ≤≥±×·−°²³₂√→ µ €%‰ „“”‘’–…';
	for (const [name, face] of Object.entries(FACES)) expect([name, face.set(needed).ok]).toEqual([name, true]);
});

test('pairs of letters are kerned: AV stands closer than A and V apart', () => {
	const { Text } = FACES;
	expect(Text.measure('AV')).toBeLessThan(Text.measure('A') + Text.measure('V'));
});

test('the licence of each font lies beside it', () => {
	for (const name of ['sofia-sans', 'literata'])
		expect(readFileSync(new URL(`../../src/lib/dossier/fonts/OFL-${name}.txt`, import.meta.url), 'utf8')).toContain(
			'SIL Open Font License',
		);
});

// ICC.1:2001-04, clause 6.1: size at 0, version at 8, class at 12, colour space at 16, signature at 36. From memory, verify;
// veraPDF reads the whole profile in build-dossier.test.ts.
test('the colour profile says its own length, and that it is an RGB display profile', () => {
	const profile = srgbProfile();
	const text = (from: number, to: number) => String.fromCharCode(...profile.subarray(from, to));
	const view = new DataView(profile.buffer);
	expect([view.getUint32(0), view.getUint8(8), text(12, 20), text(36, 40)]).toEqual([
		profile.length,
		2,
		'mntrRGB ',
		'acsp',
	]);
});

// ISO 32000-1, 7.9.4, example "D:199812231952-08'00'" (with seconds and a closing apostrophe as 7.9.4 asks).
test.each([
	['1998-12-23T19:52:00-08:00', "D:19981223195200-08'00'"],
	['2026-05-14T17:44:03Z', "D:20260514174403+00'00'"],
	['2026-05-14T17:44+02:00', "D:20260514174400+02'00'"],
])('the instant %s is %s in a PDF', (instant, date) => {
	expect(pdfDate(instant)).toBe(date);
});
