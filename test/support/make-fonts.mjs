/**
 * Makes the fonts of the screen (static/fonts) from the open fonts in node_modules: the letters of the app's languages,
 * Greek for formulas, and the signs of the trade, which fonts split by script leave out. `npm run fonts` writes them.
 */
import { copyFileSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import subsetFont from 'subset-font';

const HOUSE = join(import.meta.dirname, '../..');
const OUT = join(HOUSE, 'static/fonts');
const SOURCES = join(HOUSE, 'node_modules');

/** Written file: source file, relative to SOURCES. */
export const FONTS = {
	'sofia-sans-400.woff2': '@expo-google-fonts/sofia-sans/400Regular/SofiaSans_400Regular.ttf',
	'sofia-sans-600.woff2': '@expo-google-fonts/sofia-sans/600SemiBold/SofiaSans_600SemiBold.ttf',
	'sofia-sans-700.woff2': '@expo-google-fonts/sofia-sans/700Bold/SofiaSans_700Bold.ttf',
	'sofia-sans-800.woff2': '@expo-google-fonts/sofia-sans/800ExtraBold/SofiaSans_800ExtraBold.ttf',
	'sofia-sans-condensed-400.woff2':
		'@fontsource/sofia-sans-condensed/files/sofia-sans-condensed-latin-400-normal.woff2',
	'sofia-sans-condensed-700.woff2':
		'@fontsource/sofia-sans-condensed/files/sofia-sans-condensed-latin-700-normal.woff2',
	'literata-500.woff2': '@expo-google-fonts/literata/500Medium/Literata_500Medium.ttf',
};

const RANGES = [
	[0x20, 0x7e],
	[0xa0, 0x17f],
	[0x370, 0x3ff],
	[0x2070, 0x209c],
];
const SIGNS = '\u2009\u202f–—‘’‚“”„…′″‰€→←↑↓−×·±≤≥≠≈√∞∂∑∅℃';

const TEXT =
	RANGES.flatMap(([first = 0, last = 0]) =>
		Array.from({ length: last - first + 1 }, (_, i) => String.fromCodePoint(first + i)),
	).join('') + SIGNS;

/** @param {keyof typeof FONTS} name */
export const makeFont = (name) => subsetFont(readFileSync(join(SOURCES, FONTS[name])), TEXT, { targetFormat: 'woff2' });

if (process.argv[1] === fileURLToPath(import.meta.url)) {
	mkdirSync(OUT, { recursive: true });
	for (const name of /** @type {(keyof typeof FONTS)[]} */ (Object.keys(FONTS)))
		writeFileSync(join(OUT, name), await makeFont(name));
	copyFileSync(join(SOURCES, '@expo-google-fonts/sofia-sans/LICENSE_FONT'), join(OUT, 'OFL-sofia-sans.txt'));
	copyFileSync(join(SOURCES, '@expo-google-fonts/literata/LICENSE_FONT'), join(OUT, 'OFL-literata.txt'));
}
