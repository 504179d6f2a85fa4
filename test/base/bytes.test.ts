import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { concat, fromBase64, fromHex, fromUtf8, sameBytes, toBase64, toHex, utf8 } from '../../src/lib/base';

describe('RFC 4648', () => {
	// Source: RFC 4648, section 10, "Test Vectors", BASE64 and BASE16.
	const section10 = [
		['', '', ''],
		['f', 'Zg==', '66'],
		['fo', 'Zm8=', '666F'],
		['foo', 'Zm9v', '666F6F'],
		['foob', 'Zm9vYg==', '666F6F62'],
		['fooba', 'Zm9vYmE=', '666F6F6261'],
		['foobar', 'Zm9vYmFy', '666F6F626172'],
	] as const;
	test.each(section10)('section 10: "%s" is "%s" in base64 and "%s" in base16', (text, base64, base16) => {
		expect(toBase64(utf8(text))).toBe(base64);
		expect(fromBase64(base64)).toEqual(utf8(text));
		expect(toHex(utf8(text))).toBe(base16.toLowerCase());
		expect(fromHex(base16)).toEqual(utf8(text));
	});

	test.each(['Z', 'Zg', 'Zg=', 'Zg===', 'Zm9v\n', 'Zm 9v', 'Zm-v', 'Zg==Zg=='])('"%s" is no base64', (text) => {
		expect(fromBase64(text)).toBeUndefined();
	});

	test.each(['6', '6g', '0x66', ' 66', '66 '])('"%s" is no base16', (text) => {
		expect(fromHex(text)).toBeUndefined();
	});
});

describe('UTF-8', () => {
	test('a byte order mark survives, so that a file keeps its hash', () => {
		const bytes = Uint8Array.of(0xef, 0xbb, 0xbf, 0x7b, 0x7d);
		expect(utf8(fromUtf8(bytes))).toEqual(bytes);
	});

	test.each([
		['a byte that begins nothing', [0xff]],
		['a character cut off', [0xe2, 0x82]],
		['an overlong slash', [0xc0, 0xaf]],
		['half a character', [0xed, 0xa0, 0x80]],
	])('%s is refused', (_what, bytes) => {
		expect(() => fromUtf8(Uint8Array.from(bytes))).toThrow(TypeError);
	});
});

describe('laws', () => {
	const bytes = fc.uint8Array({ maxLength: 200 });

	test('bytes come back from base64, from hexadecimal and, where they are text, from UTF-8', () => {
		fc.assert(
			fc.property(bytes, fc.string({ unit: 'binary' }), (some, text) => {
				expect(fromBase64(toBase64(some))).toEqual(new Uint8Array(some));
				expect(fromHex(toHex(some))).toEqual(new Uint8Array(some));
				expect(fromUtf8(utf8(text))).toBe(text);
			}),
		);
	});

	test('a photo of some megabytes is written in base64 without running out of stack', () => {
		expect(toBase64(new Uint8Array(6_000_000)).length).toBe(8_000_000);
	});

	test('parts put together are as long as their sum, and are the same bytes only as themselves', () => {
		fc.assert(
			fc.property(bytes, bytes, (a, b) => {
				const whole = concat(a, b);
				expect(whole.length).toBe(a.length + b.length);
				expect(sameBytes(whole.subarray(0, a.length), a)).toBe(true);
				expect(sameBytes(whole, concat(a, b, Uint8Array.of(0)))).toBe(false);
				if (a.length > 0) expect(sameBytes(a, a.with(0, a[0]! ^ 1))).toBe(false);
			}),
		);
	});
});
