import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { sha256, sha256Hex, utf8 } from '../../src/lib/base';

// Source: RFC 6234, section 8.5, TEST1, TEST2_1, TEST3 and TEST4 for SHA-256 (the first two are also those of
// FIPS 180-4's example file); the empty text by the command.
const published = [
	// printf '' | sha256sum
	['nothing', '', 'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855'],
	// printf abc | sha256sum
	['abc', 'abc', 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'],
	// printf abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq | sha256sum
	[
		'two blocks',
		'abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq',
		'248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
	],
	// printf 'a%.0s' $(seq 1000000) | sha256sum
	['a million times a', 'a'.repeat(1_000_000), 'cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0'],
	// printf '0123456701234567012345670123456701234567012345670123456701234567%.0s' 1 2 3 4 5 6 7 8 9 10 | sha256sum
	[
		'ten whole blocks',
		'0123456701234567'.repeat(40),
		'594847328451bdfa85056225462cc1d867d877fb388df0ce35f25ab5562bfbb5',
	],
] as const;
test.each(published)('RFC 6234: the digest of %s', (_what, text, digest) => {
	expect(sha256Hex(text)).toBe(digest);
	expect(sha256Hex(utf8(text))).toBe(digest);
});

test('a text is hashed as UTF-8', () => {
	// printf '≤ 8 %% O₂' | sha256sum
	expect(sha256Hex('≤ 8 % O₂')).toBe('ecfc944fbfb7510219e85dfc0a35611a360602acc2bc6365fb393b74d7eeef2a');
});

test('any bytes hash as the engine hashes them', () => {
	fc.assert(
		fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
			expect(sha256(bytes)).toEqual(new Uint8Array(createHash('sha256').update(bytes).digest()));
		}),
	);
});
