import { expect, test } from 'vitest';
import { acidDewPoint, acidDewPointOkkes } from '../../../src/lib/calc/moisture/acid-dew-point';
import { agreesWith, agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

const MMHG = 133.322387415;
const ATM = 101325;

// Source: a public worked example of the correlation of Verhoff and Banchero: 93.44 mmHg of water and 0.0024917 mmHg of
// SO3 give 402 K.
test('the published example of 93.44 mmHg water and 0.0024917 mmHg acid gives 402 K', () => {
	const T = acidDewPoint(93.44 * MMHG, 0.0024917 * MMHG);
	expect(T.ok && agreesWith(T.value, '402')).toBe(true);
});

// No published values. Independent: both correlations in test/reference/moisture/moisture.py, the first in its atmosphere
// form, whose coefficients are rounded differently.
type Case = { water_atm: number; acid_atm: number; verhoff_banchero: number; okkes: number };
test.each(vector('moisture/acid-dew-point.json') as Case[])(
	'with $water_atm atm of water and $acid_atm atm of acid both correlations say what the other program says',
	({ water_atm, acid_atm, verhoff_banchero, okkes }) => {
		const first = acidDewPoint(water_atm * ATM, acid_atm * ATM);
		const second = acidDewPointOkkes(water_atm * ATM, acid_atm * ATM);
		expect(first.ok && Math.abs(first.value - verhoff_banchero)).toBeLessThan(0.05);
		expect(second.ok && agreesWithin(second.value, okkes, 1e-12)).toBe(true);
	},
);

test('atmospheres in the mmHg form would say 13 degC where 137 degC is right: pascals go in', () => {
	const T = acidDewPoint(0.1 * ATM, 10e-6 * ATM);
	expect(T.ok && agreesWith(T.value - 273.15, '137.3')).toBe(true);
	const wrong = acidDewPoint(0.1 * MMHG, 10e-6 * MMHG);
	expect(wrong.ok && agreesWith(wrong.value - 273.15, '12.9')).toBe(true);
});

test('the coefficient of the last term is 0.0062: with 0.0082, as one public sheet has it, the example would miss', () => {
	const T = acidDewPoint(93.44 * MMHG, 0.0024917 * MMHG);
	const cross = Math.log(93.44) * Math.log(0.0024917) * 0.002;
	const wrong = T.ok ? 1000 / (1000 / T.value + cross) : 0;
	expect(T.ok && Math.abs(wrong - T.value)).toBeGreaterThan(5);
});

test('acid without water, and so little acid that a negative number would be raised to a power, are refused', () => {
	expect(acidDewPoint(0, 1)).toMatchObject({ ok: false, error: { kind: 'acid-without-water' } });
	expect(acidDewPoint(1000, 0)).toMatchObject({ ok: false, error: { kind: 'out-of-range' } });
	expect(acidDewPointOkkes(0, 1)).toMatchObject({ ok: false, error: { kind: 'acid-without-water' } });
	expect(acidDewPointOkkes(1e4, 0.9e-8 * ATM)).toMatchObject({ ok: false, error: { kind: 'out-of-range' } });
});
