import { expect, test } from 'vitest';
import { runCalculator } from '../../../src/lib/calc';
import { agreesWithin } from '../../support/printed';
import cases from '../../vectors/tightness/false-air.json';

const read = (value: number, U?: number) => ({ value, unit: '%', ...(U === undefined ? {} : { U }) });
const run = (inputs: object) => {
	const result = runCalculator('false-air@1', inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};
const refusals = (inputs: object) => {
	const result = runCalculator('false-air@1', inputs);
	return result.ok ? [] : result.error;
};

// Independent: scipy 1.17.1, brentq on the mixing of air; uncertainties 3.2.3 (test/vectors/tightness/false-air.json).
test.each(cases)('from $before % to $after % the false air is $falseAir of the gas before', (each) => {
	const { values } = run({ oxygenBefore: read(each.before, each.U), oxygenAfter: read(each.after, each.U) });
	expect(agreesWithin(values.falseAir!.value!, each.falseAir, 1e-9)).toBe(true);
	expect(agreesWithin(values.falseAirOfOutlet!.value!, each.ofOutlet, 1e-9)).toBe(true);
	expect(agreesWithin(values.falseAir!.U!, each.UFalseAir, 1e-4)).toBe(true);
	expect(values.leak).toEqual({ value: null, unit: 'm3(n)/s', because: 'no flow stated' });
});

test('with the flow before, air and oxygen of both points balance', () => {
	const q1 = 26_000 / 3600;
	const { values } = run({
		oxygenBefore: read(6, 0.2),
		oxygenAfter: read(7, 0.2),
		flowBefore: { value: 26_000, unit: 'm3(n)/h', U: 600 },
	});
	const [leak, after] = [values.leak!.value!, values.flowAfter!.value!];
	expect(after).toBeCloseTo(q1 + leak, 12);
	expect(after * 0.07).toBeCloseTo(q1 * 0.06 + leak * 0.2095, 12);
});

test('oxygen that falls along the way proves nothing, and a rise inside its uncertainty is no tightness', () => {
	const falling = run({ oxygenBefore: read(7, 0.1), oxygenAfter: read(6.8, 0.1) });
	expect(falling.scope).toBe('outside scope');
	expect(falling.notes.map(({ kind }) => kind)).toEqual(['oxygen-falls-along']);
	const level = run({ oxygenBefore: read(7, 0.2), oxygenAfter: read(7.1, 0.2) });
	expect(level.scope).toBe('in scope');
	expect(level.notes.map(({ kind }) => kind)).toEqual(['leak-not-told-from-zero']);
});

test('gas with as much oxygen as the air is refused, and so is a moist reading beside a dry one', () => {
	expect(refusals({ oxygenBefore: read(6), oxygenAfter: read(20.95) })).toEqual([
		{ kind: 'oxygen-not-below-air', input: 'oxygenAfter', oxygen: 0.2095, air: 0.2095 },
	]);
	expect(refusals({ oxygenBefore: read(6), oxygenAfter: read(7), basis: 'wet' })).toEqual([
		{ kind: 'unknown-input', input: 'basis' },
	]);
});
