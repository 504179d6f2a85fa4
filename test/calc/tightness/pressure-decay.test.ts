import { expect, test } from 'vitest';
import { runCalculator } from '../../../src/lib/calc';
import { agreesWithin } from '../../support/printed';
import cases from '../../vectors/tightness/pressure-decay.json';

const pascal = (value: number, U?: number) => ({ value, unit: 'Pa(a)', ...(U === undefined ? {} : { U }) });
const kelvin = (value: number, U?: number) => ({ value, unit: 'K', ...(U === undefined ? {} : { U }) });
const TEST = {
	pressureStart: pascal(103_300, 10),
	pressureEnd: pascal(102_770, 10),
	temperatureStart: kelvin(293.15, 0.1),
	temperatureEnd: kelvin(293.55, 0.1),
	volume: { value: 500, unit: 'm3', U: 15 },
	duration: { value: 1, unit: 'h' },
};
const run = (inputs: object) => {
	const result = runCalculator('pressure-decay@1', inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
};
const refusals = (inputs: object) => {
	const result = runCalculator('pressure-decay@1', inputs);
	return result.ok ? [] : result.error;
};

// Independent: Python's exact fractions, as a difference of amounts (test/vectors/tightness/pressure-decay.json).
test.each(cases)('$V m3 from $p1 Pa at $T1 K to $p2 Pa at $T2 K in $t s lose $leak m3(n)/s', (each) => {
	const { values } = run({
		pressureStart: pascal(each.p1),
		pressureEnd: pascal(each.p2),
		temperatureStart: kelvin(each.T1),
		temperatureEnd: kelvin(each.T2),
		volume: { value: each.V, unit: 'm3' },
		duration: { value: each.t, unit: 's' },
	});
	for (const name of ['correctedDrop', 'lost', 'hourlyRate', 'leak'] as const)
		expect(agreesWithin(values[name]!.value!, each[name], 1e-9), name).toBe(true);
});

test('a gauge pressure with the barometer of each moment gives what the absolute pressures give', () => {
	const { pressureStart: _a, pressureEnd: _b, ...rest } = TEST;
	const gauge = run({
		...rest,
		gaugeStart: { value: 1975, unit: 'Pa(g)' },
		barometerStart: pascal(101_325),
		gaugeEnd: { value: 1545, unit: 'Pa(g)' },
		barometerEnd: pascal(101_225),
	});
	expect(gauge.values.leak?.value).toBeCloseTo(run(TEST).values.leak!.value!, 12);
	const alone = { ...rest, gaugeStart: { value: 1975, unit: 'Pa(g)' }, pressureEnd: pascal(102_770) };
	expect(refusals(alone)).toEqual([{ kind: 'gauge-without-barometer', input: 'gaugeStart', needs: 'barometer' }]);
});

// By hand: dp_c = p1 - p2 T1/T2; 0.1 K at 293 K are 103300/293.15 x 0.1 = 35 Pa of either temperature.
test('a tenth of a degree of each temperature makes most of the uncertainty of the drop', () => {
	const { values, budget } = run(TEST);
	expect(values.correctedDrop!.U!).toBeGreaterThan(49);
	expect(values.correctedDrop!.U!).toBeLessThan(53);
	expect(budget?.filter(({ input }) => input.startsWith('temperature')).every(({ share }) => share > 0.1)).toBe(true);
});

test('a leak is within what is allowed only together with its uncertainty', () => {
	const leak = run(TEST).values.leak!;
	const judged = (allowed: number) => run({ ...TEST, allowedLeak: { value: allowed, unit: 'm3(n)/s' } }).verdict;
	expect(judged((leak.value! + leak.U!) * 1.001)?.word).toBe('adequate');
	expect(judged(leak.value! + leak.U! / 2)).toMatchObject({
		word: 'not yet',
		reasons: [{ kind: 'leak-inside-guard' }],
	});
	expect(judged(leak.value! / 2)).toMatchObject({ word: 'not yet', reasons: [{ kind: 'leak-beyond' }] });
	const bare = { ...TEST, volume: { value: 500, unit: 'm3' }, allowedLeak: { value: 1, unit: 'm3(n)/s' } };
	expect(run(bare).verdict).toMatchObject({ word: 'cannot be shown', reasons: [{ kind: 'leak-without-uncertainty' }] });
});

test('a pressure that rises beyond its uncertainty, or a temperature that moved by more than 1 K, makes the test void', () => {
	expect(refusals({ ...TEST, pressureEnd: pascal(103_900, 10) })).toMatchObject([{ kind: 'pressure-rose' }]);
	expect(refusals({ ...TEST, temperatureEnd: kelvin(295, 0.1) })).toMatchObject([
		{ kind: 'temperature-swing', most: 1 },
	]);
});

test('walls that give way and a drop of more than a tenth prove nothing', () => {
	expect(run({ ...TEST, walls: 'flexible' })).toMatchObject({
		scope: 'outside scope',
		notes: [{ kind: 'walls-flexible' }],
	});
	expect(run({ ...TEST, pressureEnd: pascal(90_000, 10) }).notes).toMatchObject([{ kind: 'pressure-changed-much' }]);
});
