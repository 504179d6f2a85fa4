import { describe, expect, test } from 'vitest';
import { readableCode } from '../../src/lib/base';

// printf abc | sha256sum
const hash = 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad';

describe('a code to be read aloud', () => {
	// No published value. Independent: base32 of GNU coreutils, its letters exchanged for those of Crockford's base 32:
	// printf abc | sha256sum | cut -c1-64 | xxd -r -p | base32 -w0 | tr 'A-Z2-7' '0-9A-HJKMNP-TV-Z' | cut -c1-16
	const independent = 'Q9W1DFWF077YMGA1';

	test('names a statement in four groups of four', () => {
		expect(readableCode(hash, 16).replaceAll('-', '')).toBe(independent);
		expect(readableCode(hash, 16)).toBe('Q9W1-DFWF-077Y-MGA1');
	});

	test('is read by voice in two groups', () => {
		expect(readableCode(hash, 8)).toBe('Q9W1-DFWF');
	});

	test('is one group of six as a head code', () => {
		expect(readableCode(hash, 6)).toBe(independent.slice(0, 6));
	});

	test('holds no letter that is taken for a digit', () => {
		const codes = Array.from({ length: 256 }, (_, i) => readableCode(i.toString(16).padStart(2, '0').repeat(32), 16));
		expect(codes.join('')).not.toMatch(/[ILOU]/);
	});

	test('is made of a hash and of nothing else', () => {
		expect(() => readableCode('no hash', 8)).toThrow(new TypeError('no hash: no hash'));
		expect(() => readableCode('ba78', 8)).toThrow(new TypeError('no hash: ba78'));
	});
});
