import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { canonicalJson, parseJson, toHex, utf8, type Json } from '../../src/lib/base';

const read = (text: string): Json => {
	const json = parseJson(text);
	if (!json.ok) throw new Error(json.error.kind);
	return json.value;
};

describe('RFC 8785', () => {
	// Source: RFC 8785, section 3.2.2 (input) and section 3.2.4 (the UTF-8 bytes of the result).
	test('section 3.2.4: numbers, escapes and literals have one byte form', () => {
		const input = String.raw`{
			"numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
			"string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
			"literals": [null, true, false]
		}`;
		const printed = `
			7b 22 6c 69 74 65 72 61 6c 73 22 3a 5b 6e 75 6c 6c 2c 74 72 75 65 2c 66 61 6c 73 65 5d 2c 22 6e
			75 6d 62 65 72 73 22 3a 5b 33 33 33 33 33 33 33 33 33 2e 33 33 33 33 33 33 33 2c 31 65 2b 33 30
			2c 34 2e 35 2c 30 2e 30 30 32 2c 31 65 2d 32 37 5d 2c 22 73 74 72 69 6e 67 22 3a 22 e2 82 ac 24
			5c 75 30 30 30 66 5c 6e 41 27 42 5c 22 5c 5c 5c 5c 5c 22 2f 22 7d`;
		expect(toHex(utf8(canonicalJson(read(input))))).toBe(printed.replace(/\s/g, ''));
	});

	// Source: RFC 8785, section 3.2.3, "sorting": UTF-16 code units decide, so the emoji stands before the Hebrew letter.
	test('section 3.2.3: names are ordered by their UTF-16 code units', () => {
		const input = String.raw`{
			"\u20ac": "Euro Sign",
			"\r": "Carriage Return",
			"\ufb33": "Hebrew Letter Dalet With Dagesh",
			"1": "One",
			"\ud83d\ude00": "Emoji: Grinning Face",
			"\u0080": "Control",
			"\u00f6": "Latin Small Letter O With Diaeresis"
		}`;
		expect([...canonicalJson(read(input)).matchAll(/:"(.*?)"/g)].map(([, value]) => value)).toEqual([
			'Carriage Return',
			'One',
			'Control',
			'Latin Small Letter O With Diaeresis',
			'Euro Sign',
			'Emoji: Grinning Face',
			'Hebrew Letter Dalet With Dagesh',
		]);
	});

	// Source: RFC 8785, Appendix B, "Number Serialization Samples": the 64 bits of the double, and its JSON form.
	const appendixB = [
		['0000000000000000', '0'],
		['8000000000000000', '0'],
		['0000000000000001', '5e-324'],
		['8000000000000001', '-5e-324'],
		['7fefffffffffffff', '1.7976931348623157e+308'],
		['ffefffffffffffff', '-1.7976931348623157e+308'],
		['4340000000000000', '9007199254740992'],
		['c340000000000000', '-9007199254740992'],
		['4430000000000000', '295147905179352830000'],
		['44b52d02c7e14af5', '9.999999999999997e+22'],
		['44b52d02c7e14af6', '1e+23'],
		['44b52d02c7e14af7', '1.0000000000000001e+23'],
		['444b1ae4d6e2ef4e', '999999999999999700000'],
		['444b1ae4d6e2ef4f', '999999999999999900000'],
		['444b1ae4d6e2ef50', '1e+21'],
		['3eb0c6f7a0b5ed8c', '9.999999999999997e-7'],
		['3eb0c6f7a0b5ed8d', '0.000001'],
		['41b3de4355555553', '333333333.3333332'],
		['41b3de4355555554', '333333333.33333325'],
		['41b3de4355555555', '333333333.3333333'],
		['41b3de4355555556', '333333333.3333334'],
		['41b3de4355555557', '333333333.33333343'],
		['becbf647612f3696', '-0.0000033333333333333333'],
		['43143ff3c1cb0959', '1424953923781206.2'],
	] as const;
	test.each(appendixB)('Appendix B: the double %s is written %s', (bits, printed) => {
		expect(canonicalJson(doubleOf(bits))).toBe(printed);
	});

	test.each(['7fffffffffffffff', '7ff0000000000000', 'fff0000000000000'])(
		'Appendix B: the double %s has no JSON form',
		(bits) => {
			expect(() => canonicalJson(doubleOf(bits))).toThrow(new TypeError(`value: ${doubleOf(bits)} has no JSON form`));
		},
	);
});

describe('what JSON cannot carry is refused, and its place is named', () => {
	class Reading {
		oxygen = 8;
	}
	const cases: readonly (readonly [string, unknown, string])[] = [
		['undefined', undefined, 'value: undefined has no JSON form'],
		['a value left undefined', { limit: { oxygen: undefined } }, '.limit.oxygen: undefined has no JSON form'],
		['NaN in a list', [1, Number.NaN], '[1]: NaN has no JSON form'],
		['infinity', { flow: Infinity }, '.flow: Infinity has no JSON form'],
		['a large integer of its own kind', 1n, 'value: bigint has no JSON form'],
		['a function', { at: () => 0 }, '.at: function has no JSON form'],
		['a symbol', Symbol('o2'), 'value: symbol has no JSON form'],
		['half a character', 'a\ud800', 'value: a lone surrogate has no JSON form'],
		['half a character in a name', { '\udc00': 1 }, 'value: a lone surrogate in a name has no JSON form'],
		['a date', new Date(0), 'value: an object of a class has no JSON form'],
		['an object of a class', [new Reading()], '[0]: an object of a class has no JSON form'],
		// eslint-disable-next-line no-sparse-arrays
		['a hole in a list', [1, , 3], '[1]: undefined has no JSON form'],
	];
	test.each(cases)('%s', (_what, value, says) => {
		expect(() => canonicalJson(value as Json)).toThrow(new TypeError(says));
	});
});

const json = fc.jsonValue({ stringUnit: 'binary' }).filter(hasAllowedNames) as fc.Arbitrary<Json>;

describe('laws', () => {
	test('reading the canonical form gives the same value back', () => {
		fc.assert(
			fc.property(json, (value) => {
				expect(read(canonicalJson(value))).toEqual(withoutNegativeZero(value));
			}),
		);
	});

	test('the canonical form of what was read is the text itself', () => {
		fc.assert(
			fc.property(json, (value) => {
				const text = canonicalJson(value);
				expect(canonicalJson(read(text))).toBe(text);
			}),
		);
	});

	test('the order in which names were written does not matter', () => {
		fc.assert(
			fc.property(fc.dictionary(fc.string({ unit: 'binary' }), json), (object) => {
				if (!hasAllowedNames(object)) return;
				const reversed = Object.fromEntries(Object.entries(object).reverse());
				expect(canonicalJson(reversed)).toBe(canonicalJson(object));
			}),
		);
	});
});

function doubleOf(bits: string): number {
	const view = new DataView(new ArrayBuffer(8));
	view.setBigUint64(0, BigInt(`0x${bits}`));
	return view.getFloat64(0);
}

function hasAllowedNames(value: unknown): boolean {
	return !/"(?:__proto__|constructor|prototype)":/.test(JSON.stringify(value));
}

/** JSON can write -0, the canonical form writes 0 (RFC 8785, Appendix B, second row). */
function withoutNegativeZero(value: Json): Json {
	return JSON.parse(JSON.stringify(value)) as Json;
}
