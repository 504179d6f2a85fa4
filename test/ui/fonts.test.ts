import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { FONTS, makeFont } from '../support/make-fonts.mjs';

const FOLDER = join(import.meta.dirname, '../../static/fonts');
const names = Object.keys(FONTS) as (keyof typeof FONTS)[];

describe('the fonts of the screen', () => {
	test.each(names)('%s is what the open font and the script make', async (name) => {
		expect(Buffer.from(await makeFont(name)).equals(readFileSync(join(FOLDER, name)))).toBe(true);
	});

	test('stand beside their licences, and no other font does', () => {
		expect(readdirSync(FOLDER).sort()).toEqual(['OFL-literata.txt', 'OFL-sofia-sans.txt', ...names].sort());
	});

	test('are the ones that the tokens name', () => {
		const tokens = readFileSync(join(import.meta.dirname, '../../src/lib/ui/tokens.css'), 'utf8');
		expect([...tokens.matchAll(/\/fonts\/([^']+)/g)].map(([, name]) => name).sort()).toEqual([...names].sort());
	});
});
