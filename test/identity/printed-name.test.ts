import { expect, test } from 'vitest';
import { printedName } from '../../src/lib/identity';

test.each([
	'Ada Example',
	'Bo Example, jun.',
	'Åse Søgård-Ødegaard',
	"Siobhán O'Example",
	'Ελένη Παράδειγμα',
	'Ольга Пример',
	'山田 あきこ',
	'T-1',
])('%s is a name', (name) => {
	expect(printedName(name)).toEqual({ ok: true, value: name.normalize('NFC') });
});

test('a name is normalised: composed letters, single blanks, none at the ends', () => {
	expect(printedName('  A\u030Ase   Example ')).toEqual({ ok: true, value: 'Åse Example' });
});

test.each([
	['a letter that turns the direction of reading', 'Ada \u202EelpmaxE', 'U+202E'],
	['a joiner without width', 'Ada\u200DExample', 'U+200D'],
	['a soft hyphen', 'Ada\u00ADExample', 'U+00AD'],
	['a line break', 'Ada\nExample', 'U+000A'],
	['markup', 'Ada <b>', 'U+003C'],
	['a sign of the full width', 'Ada＠Example', 'U+FF20'],
	['a filler that looks like a blank', 'Ada\u3164Example', 'U+3164'],
])('%s is refused with its code point', (_, name, codePoint) => {
	expect(printedName(name)).toMatchObject({ ok: false, error: { kind: 'forbidden-character', codePoint } });
});

test('a Cyrillic letter in a Latin name is refused: it is another name that looks the same', () => {
	expect(printedName('Adа Example')).toEqual({
		ok: false,
		error: { kind: 'mixed-scripts', scripts: ['Latin', 'Cyrillic'] },
	});
});

test('no name, and a name longer than a certificate takes, are refused', () => {
	expect(printedName('   ')).toEqual({ ok: false, error: { kind: 'empty-name' } });
	expect(printedName('a'.repeat(64))).toMatchObject({ ok: true });
	expect(printedName('a'.repeat(65))).toEqual({ ok: false, error: { kind: 'name-too-long', length: 65, atMost: 64 } });
});
