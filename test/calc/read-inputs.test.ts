import { toJsonSchema } from '@valibot/to-json-schema';
import * as v from 'valibot';
import { expect, test } from 'vitest';
import {
	choice,
	inputSchema,
	inputSpecs,
	measured,
	measuredList,
	optional,
	readInputs,
	shaped,
	withDefault,
} from '../../src/lib/calc/read-inputs';

const FIELDS = {
	dp: measured({ quantity: 'pressure-difference', means: 'difference pressure', from: 'reading', min: 0, max: 1e5 }),
	wall: optional(measured({ quantity: 'temperature', means: 'wall temperature', from: 'reading' })),
	margin: withDefault(measured({ quantity: 'temperature-difference', means: 'margin', from: 'site' }), 15),
	series: optional(
		measuredList({ quantity: 'pressure-difference', means: 'series', from: 'series' }, { min: 2, max: 5 }),
	),
	type: choice(['as_cast', 'machined'], { means: 'type', from: 'plant' }),
	composition: optional(
		shaped(v.record(v.string(), v.number()), { quantity: 'composition', means: 'gas', from: 'plant' }),
	),
};

test('a measure is converted with its uncertainty, a bare number is read in the SI unit, the typed form is kept', () => {
	const raw = { dp: { value: '8,0', unit: 'mbar', U: '0.1' }, type: 'machined', wall: 350 };
	const read = readInputs(FIELDS, raw);
	expect(read).toEqual({
		ok: true,
		value: {
			given: {
				dp: { value: 800, U: 10 },
				wall: { value: 350 },
				margin: { value: 15 },
				series: undefined,
				type: 'machined',
				composition: undefined,
			},
			typed: raw,
		},
	});
});

test('every refusal is reported at once, each naming its input', () => {
	const raw = {
		dp: -3,
		wall: { value: 20, unit: 'bar(g)' },
		type: 'machined',
		series: [1, { value: 'x', unit: 'Pa' }],
	};
	expect(readInputs(FIELDS, raw)).toMatchObject({
		ok: false,
		error: [
			{ kind: 'out-of-range', input: 'dp', value: -3, min: 0, max: 1e5, unit: 'Pa' },
			{ kind: 'wrong-quantity', input: 'wall', unit: 'bar(g)', quantity: 'temperature', isFor: ['pressure-gauge'] },
			{ kind: 'not-a-number', input: 'series[1]', text: 'x', at: 0 },
		],
	});
});

test('a missing input, a misspelt one and one of the wrong shape are three different refusals', () => {
	expect(readInputs(FIELDS, { type: 'machined', dP: 5 })).toEqual({
		ok: false,
		error: [
			{ kind: 'missing-input', input: 'dp' },
			{ kind: 'unknown-input', input: 'dP' },
		],
	});
	expect(readInputs(FIELDS, { dp: 5, type: 'rusty' })).toMatchObject({
		ok: false,
		error: [{ kind: 'bad-input', input: 'type', found: '"rusty"' }],
	});
	expect(readInputs(FIELDS, 'dp=5')).toMatchObject({ ok: false, error: [{ kind: 'bad-input', input: '' }] });
});

test('a measure without unit is refused by the name of its missing part', () => {
	expect(readInputs(FIELDS, { dp: { value: 5 }, type: 'machined' })).toEqual({
		ok: false,
		error: [{ kind: 'missing-input', input: 'dp.unit' }],
	});
});

test('NaN and infinities are refused wherever they stand', () => {
	for (const bad of [Number.NaN, Number.POSITIVE_INFINITY, { value: Number.NaN, unit: 'Pa' }]) {
		const read = readInputs(FIELDS, { dp: bad, type: 'machined' });
		expect(read.ok).toBe(false);
		expect(!read.ok && read.error.every((refusal) => refusal.input?.startsWith('dp'))).toBe(true);
	}
});

test('the published schema and the described inputs come from one place', () => {
	const schema = toJsonSchema(inputSchema(FIELDS));
	expect(Object.keys(schema.properties ?? {})).toEqual(inputSpecs(FIELDS).map((spec) => spec.name));
	expect(schema.required).toEqual(['dp', 'type']);
	expect(inputSpecs(FIELDS).find((spec) => spec.name === 'margin')).toEqual({
		name: 'margin',
		quantity: 'temperature-difference',
		unit: 'K',
		means: 'margin',
		from: 'site',
		optional: true,
		default: 15,
	});
});
