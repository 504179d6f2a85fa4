import { expect, test } from 'vitest';
import { runCalculator } from '../../../src/lib/calc';
import { agreesWith } from '../../support/printed';

const run = (inputs: object) => {
	const result = runCalculator('acid-dew-points@1', inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};
const GAS = {
	sulphurTrioxide: { value: 10, unit: 'ppm', U: 5 },
	waterVapour: { value: 15, unit: '%', U: 1 },
	pressure: { value: 101_325, unit: 'Pa(a)', U: 300 },
};

// Source: a published worked example of Verhoff and Banchero: 93.44 mmHg of water and 0.0024917 mmHg of SO3 give 402 K.
test('the published example of Verhoff and Banchero is 402 K', () => {
	const { values } = run({
		...GAS,
		waterVapour: { value: 93.44 / 760, unit: '1' },
		sulphurTrioxide: { value: 0.0024917 / 760, unit: '1' },
	});
	expect(agreesWith(values.verhoff!.value!, '402')).toBe(true);
});

// Independent: the two correlations written again in Python (test/vectors/moisture/acid-dew-point.json, the same cases).
test.each([
	[15, 10, '141.420', '138.115'],
	[10, 1, '115.643', '115.507'],
	[20, 1, '123.547', '123.815'],
])('%d %% water and %d ppm of SO3: %s degC by one, %s degC by the other', (water, ppm, verhoff, okkes) => {
	const { values } = run({
		...GAS,
		waterVapour: { value: water, unit: '%' },
		sulphurTrioxide: { value: ppm, unit: 'ppm' },
	});
	expect(agreesWith(values.verhoff!.value! - 273.15, verhoff)).toBe(true);
	expect(agreesWith(values.okkes!.value! - 273.15, okkes)).toBe(true);
	expect(values.higher?.value).toBe(Math.max(values.verhoff!.value!, values.okkes!.value!));
});

test('metal below the higher acid dew point is named, and no result of this is a proof', () => {
	const { notes, values, verdict } = run({ ...GAS, wall: { value: 110, unit: 'degC', U: 2 } });
	expect(values.clearance!.value!).toBeLessThan(0);
	expect(notes.map(({ kind }) => kind)).toEqual([
		'acid-dew-point-no-proof',
		'acid-dew-point-above-wall',
		'sulphur-trioxide-estimated',
		'correlations-apart',
	]);
	expect(verdict).toBeUndefined();
});

test('too little SO3 for the second correlation leaves one, and says so', () => {
	const { values } = run({ ...GAS, sulphurTrioxide: { value: 0.005, unit: 'ppm' } });
	expect(values.okkes).toEqual({
		value: null,
		unit: 'K',
		because: 'less than 1e-8 atm of SO3: outside the correlation',
	});
	expect(values.higher?.value).toBe(values.verhoff?.value);
});

test('without a pressure nothing is calculated', () => {
	const { pressure: _pressure, ...rest } = GAS;
	const result = runCalculator('acid-dew-points@1', rest);
	expect(result).toMatchObject({ ok: false, error: [{ kind: 'one-of' }] });
});
