import { expect, test } from 'vitest';
import { runCalculator } from '../../../src/lib/calc';
import { agreesWith } from '../../support/printed';

const percent = (value: number, U?: number) => ({ value, unit: '%', ...(U === undefined ? {} : { U }) });
const pressure = (value: number, unit: string) => ({ value, unit });
const VESSEL = {
	swing: 'held',
	startOxygen: percent(21),
	inertOxygen: percent(0),
	target: percent(1),
	volume: { value: 1, unit: 'm3' },
	temperature: { value: 273.15, unit: 'K' },
	lowPressure: pressure(101_325, 'Pa(a)'),
	highPressure: pressure(506_625, 'Pa(a)'),
};
const run = (inputs: object) => {
	const result = runCalculator('swing-purge@1', inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};
const refusals = (inputs: object) => {
	const result = runCalculator('swing-purge@1', inputs);
	return result.ok ? [] : result.error;
};

// Source: Branan, Rules of Thumb for Chemical Engineers, purging (second-hand): pressure swing 1 to 5 atm, 21 % to 1 %:
// 2 swings, 0.84 % after them, 8 volumes; vacuum swing 0.5 to 1 atm: 4.4, that is 5 swings; 6 mmHg to 1 atm, to 5 ppm: 2.20, 3.
test('Branan: from 1 to 5 atm two swings bring 21 % to 0.84 % with eight volumes of inert gas', () => {
	const { values } = run(VESSEL);
	expect(values.swings?.value).toBe(2);
	expect(agreesWith(values.oxygenAfter!.value! * 100, '0.84')).toBe(true);
	expect(values.inertGas?.value).toBeCloseTo(8, 9);
});

test.each([
	[{ lowPressure: pressure(50_662.5, 'Pa(a)'), highPressure: pressure(101_325, 'Pa(a)') }, '4.4', 5],
	[
		{ lowPressure: pressure(6, 'mmHg(a)'), highPressure: pressure(760, 'mmHg(a)'), target: { value: 5, unit: 'ppm' } },
		'2.20',
		3,
	],
])('Branan: vacuum swings by the formula, rounded up', (change, printed, whole) => {
	const { values } = run({ ...VESSEL, ...change });
	expect(agreesWith(values.exactSwings!.value!, printed)).toBe(true);
	expect(values.swings?.value).toBe(whole);
});

// By hand: 1.40 x 1.8917 = 2.648, 1.30 x 1.8917 = 2.459.
test('a fast swing asks for more swings, by the isentropic exponent of the gas', () => {
	const fast = run({ ...VESSEL, swing: 'fast' }).values;
	expect(agreesWith(fast.exactSwings!.value!, '2.648')).toBe(true);
	expect(fast.swings?.value).toBe(3);
	const dioxide = run({ ...VESSEL, swing: 'fast', gas: 'carbon dioxide' });
	expect(agreesWith(dioxide.values.exactSwings!.value!, '2.459')).toBe(true);
	expect(dioxide.notes.map(({ kind }) => kind)).toContain('carbon-dioxide-discharge');
});

test('a whole number of swings is not rounded up by the last digit of the processor', () => {
	const { values } = run({ ...VESSEL, target: percent(21 / 25) });
	expect(values.swings?.value).toBe(2);
});

test('an uncertainty that reaches over the line asks for one swing more', () => {
	const uncertain = { ...VESSEL, inertOxygen: percent(0.1, 0.3), target: percent(1) };
	expect(run(uncertain).notes.map(({ kind }) => kind)).toContain('uncertainty-not-stated');
	const stated = {
		...uncertain,
		lowPressure: { ...VESSEL.lowPressure, U: 300 },
		highPressure: { ...VESSEL.highPressure, U: 2000 },
	};
	expect(run(stated).notes.map(({ kind }) => kind)).toContain('one-swing-more');
});

test('no swing, a line that the inert gas itself does not reach, and a line above the start are refused', () => {
	expect(refusals({ ...VESSEL, highPressure: VESSEL.lowPressure })).toMatchObject([{ kind: 'no-swing' }]);
	expect(refusals({ ...VESSEL, inertOxygen: percent(2) })).toMatchObject([{ kind: 'inert-gas-above-target' }]);
	expect(refusals({ ...VESSEL, startOxygen: percent(0.5) })).toMatchObject([{ kind: 'target-not-below-start' }]);
	expect(refusals({ ...VESSEL, guard: percent(1) })).toMatchObject([
		{ kind: 'guard-leaves-nothing' },
		{ kind: 'inert-gas-above-target' },
	]);
});
