import { describe, expect, test } from 'vitest';
import { verdictWord } from '../../../src/lib/calc/purge/purge-adequacy';
import { ANALYSERS, changed, kinds, place, purgeInputs, reasons, refusals, run, value, word } from './purge-scene';

describe('a purge with every condition met', () => {
	const result = run(purgeInputs());

	test('is adequate, without a reason against it', () => {
		expect(result.verdict).toEqual({ word: 'adequate', reasons: [] });
	});

	test('is adequate since its slowest place came below limit less guard, not since its mean did', () => {
		const since = ANALYSERS.map(({ tag }) => value(result, `${tag}.adequateSince`)!);
		expect(value(result, 'adequateSince')).toBe(Math.max(...since));
		expect(result.notes).toContainEqual({ level: 'remark', kind: 'slowest-place', place: 'AT-213' });
	});

	test('names since when, by the readings themselves', () => {
		const { t, values } = purgeInputs().series['AT-213']!;
		const lastAbove = t.findLastIndex((_, i) => values[i]! > 7.7);
		expect(value(result, 'AT-213.adequateSince')).toBe(t[lastAbove + 1]);
	});

	test('finds the leak that was put in, and says at which suction', () => {
		// The scene leaks 100 m³(n)/h, and its hopper lags behind: within a tenth.
		expect(value(result, 'inLeakage')! * 3600).toBeGreaterThan(90);
		expect(value(result, 'inLeakage')! * 3600).toBeLessThan(110);
		const suction = [{ tag: 'PT-221', at: 'mill inlet', pressure: -300 }];
		expect(result.notes).toContainEqual(expect.objectContaining({ kind: 'in-leakage', suction }));
	});

	test('states floor, rate and leak with the farther of their bounds as uncertainty', () => {
		for (const name of ['AT-211.floor', 'AT-211.rate', 'inLeakage']) {
			const [at, low, high] = ['', 'Low', 'High'].map((side) => value(result, name + side)!) as [
				number,
				number,
				number,
			];
			expect(result.values[name]!.U).toBe(Math.max(high - at, at - low));
		}
	});

	test('counts the gas by its own meter: 75 minutes at 888 m³(n)/h', () => {
		expect(value(result, 'admitted')).toBeCloseTo(1110, 6);
		expect(result.values.admitted!.U).toBeCloseTo(22.2, 6);
	});

	test('is plain JSON, carries its inputs, and draws oxygen and inert gas', () => {
		expect(JSON.parse(JSON.stringify(result))).toEqual(result);
		expect(result).toMatchObject({ calc: 'purge-adequacy@1', constants: 'constants@1', scope: 'in scope' });
		expect(result.plots!.map(({ id }) => id)).toEqual(['oxygen', 'inert-flow']);
		const oxygen = result.plots![0]!;
		expect(oxygen.marks.map(({ kind, at }) => [kind, at])).toEqual([
			['limit', 0.08],
			['guard', 0.077],
			['window', 75 * 60 - 360],
			['event', value(result, 'adequateSince')],
		]);
		const decides = oxygen.curves.filter((curve) => curve.decides).map(({ id }) => id);
		expect(decides).toEqual(['AT-213', 'AT-213 fit']);
		for (const { x, y } of oxygen.curves) expect(x).toHaveLength(y.length);
	});

	test('stays small: four places, 1848 samples, below 150 kB with its inputs', () => {
		expect(JSON.stringify(result).length).toBeLessThan(150_000);
	});
});

describe('the floor', () => {
	test('at or above the limit cannot be shown, however long one waits', () => {
		const result = run(purgeInputs({ leak: 900, minutes: 90, hopperExchange: 6000 }));
		// 20.95 · 900/1788 = 10.5 %
		expect(word(result)).toBe('cannot be shown');
		expect(reasons(result)).toContain('floor floor-above-limit');
		expect(result.values.forecast).toEqual({ value: null, unit: 's', because: 'unreachable' });
		expect(value(result, 'AT-211.floor')).toBeCloseTo(0.105, 2);
	});

	test('of a curve below two exchanges refuses nothing: it may still be wrong', () => {
		const result = run(purgeInputs({ leak: 900, minutes: 30, hopperExchange: 6000 }));
		expect(value(result, 'AT-211.floor')).toBeGreaterThan(0.08);
		expect(value(result, 'AT-211.exchanges')).toBeLessThan(2);
		expect(word(result)).toBe('not yet');
	});

	test('between line and limit waits for ever, warns, and forecasts nothing', () => {
		// 20.95 · 520/1408 = 7.74 %: above 7.7, below 8.
		const result = run(purgeInputs({ leak: 520, minutes: 180, hopperExchange: 6000 }));
		expect(word(result)).toBe('not yet');
		expect(kinds(result)).toContain('floor-close-to-line');
		expect(result.values.forecast).toMatchObject({ value: null, because: 'unreachable' });
	});
});

describe('the forecast', () => {
	test('before two exchanges comes from the planning twin and is rough', () => {
		const result = run(purgeInputs({ minutes: 40 }));
		expect(word(result)).toBe('not yet');
		const rough = result.notes.filter(({ kind }) => kind === 'forecast');
		expect(rough.map((note) => [note.place, note.rough, note.by])).toEqual(
			ANALYSERS.map(({ tag }) => [tag, true, 'planning twin']),
		);
		expect(value(result, 'forecast')).toBe(Math.max(...rough.map(({ seconds }) => Number(seconds))));
		expect(value(result, 'forecastGas')).toBeCloseTo(value(result, 'forecast')! * (888 / 3600), 9);
	});

	test('after two exchanges comes from the fit, with the latest that the samples allow', () => {
		// A line at 3.9 %, which the places have not reached after 75 minutes.
		const inputs = changed((of) => (of.limit.oxygen = { value: 4.2, unit: '%' }), { hopperExchange: 6000 });
		const result = run(inputs);
		const slow = result.notes.find((note) => note.kind === 'forecast' && note.by === 'fit')!;
		expect(slow).toMatchObject({ rough: false });
		expect(Number(slow.latest)).toBeGreaterThan(Number(slow.seconds));
		// The same scene let run: the place does get there when it was said to.
		const later = run(
			changed((of) => (of.limit.oxygen = { value: 4.2, unit: '%' }), { hopperExchange: 6000, minutes: 110 }),
		);
		const there = value(later, `${slow.place as string}.adequateSince`)!;
		expect(there - 75 * 60).toBeGreaterThan(0.6 * Number(slow.seconds));
		expect(there - 75 * 60).toBeLessThan(1.6 * Number(slow.latest));
	});

	test('a span below two exchanges blocks neither verdict nor forecast', () => {
		const result = run(purgeInputs({ minutes: 55 }));
		expect(value(result, 'AT-211.exchanges')).toBeLessThan(2);
		expect(word(result)).toBe('adequate');
	});
});

describe('the verdict', () => {
	test.each([
		[[], 'adequate'],
		[['b'], 'not yet'],
		[['c'], 'not yet'],
		[['d'], 'not yet'],
		[['b', 'c', 'd'], 'not yet'],
		[['a'], 'cannot be shown'],
		[['e'], 'cannot be shown'],
		[['f'], 'cannot be shown'],
		[['g'], 'cannot be shown'],
		[['floor'], 'cannot be shown'],
		[['b', 'g'], 'cannot be shown'],
	] as const)('with %j unmet: %s', (criteria, expected) => {
		expect(verdictWord(criteria.map((criterion) => ({ criterion })))).toBe(expected);
	});

	test('names every unmet condition at once, in the order of the rule', () => {
		const inputs = changed((of) => {
			of.coverage[4] = { volume: 'bypass', answer: '' };
			of.cleaning.runningSince = null;
			Object.assign(place(of, 'AT-211'), { mode: 'hold' });
			Object.assign(place(of, 'AT-212'), { principle: 'zirconia' });
		});
		expect(reasons(run({ ...inputs, minimumVolumeChanges: 9 }))).toEqual([
			...['a not-covered', 'c cleaning-not-running', 'd too-little-inert-gas'],
			...['f not-measuring', 'g unburnt-gas-not-known'],
		]);
	});
});

test('a quick sheet by hand, eight rows a minute apart, is a series like any other', () => {
	const rows = (values: number[]): { unit: string; t: number[]; values: number[] } => ({
		unit: '%',
		t: values.map((_, i) => 4080 + 60 * i),
		values,
	});
	const inputs = changed((of) => {
		of.series['AT-211'] = rows([5.1, 5.1, 5.0, 5.0, 5.0, 4.9, 4.9, 4.9]);
		of.series['AT-212'] = rows([5.2, 5.2, 5.1, 5.1, 5.1, 5.0, 5.0, 5.0]);
		of.series['AT-213'] = rows([6.4, 6.3, 6.3, 6.2, 6.2, 6.1, 6.1, 6.0]);
		of.series['AT-214'] = rows([5.1, 5.0, 5.0, 5.0, 4.9, 4.9, 4.9, 4.8]);
	});
	const result = run(inputs);
	expect(reasons(result)).toEqual([]);
	// All of it lies beyond the curve: the fit may refuse or not, it decides nothing.
	expect(value(result, 'adequateSince')).toBe(4080);
	expect(refusals(inputs)).toEqual([]);
});
