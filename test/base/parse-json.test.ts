import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { MAX_DEPTH, fromUtf8, parseJson, type Json, type JsonError } from '../../src/lib/base';

const nested = (depth: number, open = '[', close = ']'): string => open.repeat(depth) + close.repeat(depth);

describe('a hostile file is refused, and the place is named', () => {
	const refused: readonly (readonly [string, string, JsonError])[] = [
		['one level too deep', nested(65), { kind: 'too-deep', at: 64, limit: MAX_DEPTH }],
		['5 000 levels', nested(5000), { kind: 'too-deep', at: 64, limit: MAX_DEPTH }],
		['a million levels', nested(1_000_000), { kind: 'too-deep', at: 64, limit: MAX_DEPTH }],
		[
			'a million levels of objects',
			nested(1_000_000, '{"a":', '}'),
			{ kind: 'too-deep', at: 64 * 5, limit: MAX_DEPTH },
		],
		['a prototype', '{"__proto__":{"admin":true}}', { kind: 'forbidden-name', at: 1, name: '__proto__' }],
		[
			'a prototype in disguise',
			String.raw`{"a":[{"\u005f_proto__":1}]}`,
			{ kind: 'forbidden-name', at: 7, name: '__proto__' },
		],
		['a constructor', '{"constructor":1}', { kind: 'forbidden-name', at: 1, name: 'constructor' }],
		['a name given twice', '{"limit":8,"limit":80}', { kind: 'duplicate-name', at: 11, name: 'limit' }],
		[
			'a name given twice, once escaped',
			String.raw`{"limit":8,"l\u0069mit":80}`,
			{ kind: 'duplicate-name', at: 11, name: 'limit' },
		],
		['a number beyond a double', '{"o2":1e400}', { kind: 'number-too-large', at: 6, number: '1e400' }],
		['a number far below', '[-1e400]', { kind: 'number-too-large', at: 1, number: '-1e400' }],
		['half a character', String.raw`["\ud800"]`, { kind: 'lone-surrogate', at: 1 }],
		['half a character, not escaped', '["\udfff"]', { kind: 'lone-surrogate', at: 1 }],
		['halves in the wrong order', String.raw`["\udc00\ud800"]`, { kind: 'lone-surrogate', at: 1 }],
		['half a character as a name', String.raw`{"\ud800":1}`, { kind: 'lone-surrogate', at: 1 }],
		['a byte order mark', '\ufeff{}', { kind: 'not-json', at: 0, expected: 'a value' }],
		['UTF-16 read as bytes', '{\0}\0', { kind: 'not-json', at: 1, expected: 'a name in double quotes' }],
	];
	test.each(refused)('%s', (_what, text, error) => {
		expect(parseJson(text)).toEqual({ ok: false, error });
	});

	test('bytes that are not UTF-8 are no text', () => {
		expect(() => fromUtf8(Uint8Array.of(0x7b, 0xff, 0x7d))).toThrow(TypeError);
	});

	test('a refused prototype reaches no object', () => {
		parseJson('{"__proto__":{"admin":true}}');
		expect(({} as { admin?: boolean }).admin).toBeUndefined();
	});

	test('a million names and a text of 16 million characters are read without running out of stack', () => {
		const names = Array.from({ length: 1_000_000 }, (_, i) => `"k${i}":0`).join(',');
		const photo = 'A'.repeat(16_000_000);
		expect(parseJson(`{${names}}`).ok).toBe(true);
		expect(parseJson(`["${photo}"]`)).toEqual({ ok: true, value: [photo] });
	});
});

describe('what is no JSON is refused where it goes wrong', () => {
	const broken: readonly (readonly [string, number, string])[] = [
		['', 0, 'a value'],
		[' \n', 2, 'a value'],
		['{"a":1,}', 7, 'a name in double quotes'],
		['[1,]', 3, 'a value'],
		['[1 2]', 3, '"," or "]"'],
		['{"a" 1}', 5, '":"'],
		['{"a":1 "b":2}', 7, '"," or "}"'],
		["{'a':1}", 1, 'a name in double quotes'],
		['{"a":1}x', 7, 'the end of the text'],
		['tru', 0, 'true'],
		['[nul]', 1, 'null'],
		['[NaN]', 1, 'a value'],
		['[.5]', 1, 'a value'],
		['[+5]', 1, 'a value'],
		['[05]', 2, '"," or "]"'],
		['[5.]', 2, '"," or "]"'],
		['"open', 0, 'the closing quote of this text'],
		['"a\nb"', 2, 'an escape instead of a control character'],
		[String.raw`"\x41"`, 0, 'a text with the escapes of JSON'],
		['// note\n1', 0, 'a value'],
		['\u00a01', 0, 'a value'],
	];
	test.each(broken)('%j at %i: expected %s', (text, at, expected) => {
		expect(parseJson(text)).toEqual({ ok: false, error: { kind: 'not-json', at, expected } });
	});
});

describe('what is allowed', () => {
	test('64 levels are read', () => {
		expect(parseJson(nested(64)).ok).toBe(true);
		expect(parseJson(nested(64, '{"a":', '}').replace('{"a":}', '{"a":1}')).ok).toBe(true);
	});

	test('names that only look like those of an object are ordinary names', () => {
		expect(parseJson('{"toString":1,"hasOwnProperty":2,"":3}')).toEqual({
			ok: true,
			value: { toString: 1, hasOwnProperty: 2, '': 3 },
		});
	});

	test('minus zero is read as it is written', () => {
		const read = parseJson('-0');
		expect(read.ok && Object.is(read.value, -0)).toBe(true);
	});

	test('a number too small for a double is read as zero, as JSON.parse does', () => {
		expect(parseJson('1e-400')).toEqual({ ok: true, value: 0 });
	});
});

describe('laws, beside JSON.parse', () => {
	test('a sound text gives the same value', () => {
		const json = fc.json({ stringUnit: 'binary' }).filter((text) => !/__proto__|constructor|prototype/.test(text));
		fc.assert(
			fc.property(json, (text) => {
				expect(parseJson(text)).toEqual({ ok: true, value: JSON.parse(text) as Json });
			}),
		);
	});

	test('a text with one character changed is accepted by both with the same value, or refused by us too', () => {
		const change = fc.tuple(fc.json(), fc.nat(), fc.constantFrom(...Array.from('{}[]",:\\0123eE+-.tfn x\u0000\u20ac')));
		fc.assert(
			fc.property(change, ([text, place, char]) => {
				const at = place % text.length;
				const changed = text.slice(0, at) + char + text.slice(at + 1);
				const ours = parseJson(changed);
				const theirs = parsedByTheEngine(changed);
				if (ours.ok) expect(ours.value).toEqual(theirs);
				else if (ours.error.kind === 'not-json') expect(theirs).toBe(REFUSED);
			}),
			{ numRuns: 2000 },
		);
	});
});

const REFUSED = Symbol('refused');

function parsedByTheEngine(text: string): unknown {
	try {
		return JSON.parse(text);
	} catch {
		return REFUSED;
	}
}
