import { describe, expect, test } from 'vitest';
import { runCalculator } from '../../../src/lib/calc';
import {
	ANALYSERS,
	changed,
	kinds,
	purgeInputs,
	reasons,
	refusals,
	run,
	value,
	word,
	type Inputs,
} from './purge-scene';

const mapped = (inputs: Inputs, tag: string, change: (value: number, t: number) => number): void => {
	const series = inputs.series[tag]!;
	series.values = series.values.map((each, i) => change(each, series.t[i]!));
};

/** The traps of sections A.6 and A.8 as far as they can catch the adequacy; the others stand in sweep-purge.test.ts. */
describe('traps', () => {
	test('trap 1: a hot circuit needs less inert gas for the same volume changes, and the meter is not turned into hot gas', () => {
		const hot = run({ ...purgeInputs(), temperature: { value: 80, unit: 'degC' } });
		expect(value(hot, 'normalVolume')).toBeCloseTo((592 * 1010 * 273.15) / (1013.25 * 353.15), 6);
		expect(value(hot, 'admitted')).toBe(value(run(purgeInputs()), 'admitted'));
	});

	test('trap 2: readings below 7.7 % after less than one volume change are not yet', () => {
		// One tenth of the gas, and readings that say it was enough: a region of plug flow was not exchanged once.
		const inputs = changed((of) => mapped(of, 'FT-241', (flow) => flow / 3));
		expect(word(run(inputs))).toBe('not yet');
		expect(reasons(run(inputs))).toEqual(['d too-little-inert-gas']);
	});

	test('trap 3: a floor above the line has no time, and nothing in the result is NaN or infinite', () => {
		const result = run(purgeInputs({ leak: 900, minutes: 90, hopperExchange: 6000 }));
		for (const { tag } of ANALYSERS) {
			expect(result.values[`${tag}.forecast`]).toEqual({ value: null, unit: 's', because: 'unreachable' });
		}
		const numbers = JSON.stringify(result, (_, each: unknown) => {
			if (typeof each === 'number' && !Number.isFinite(each)) throw new Error('not finite');
			return each;
		});
		expect(numbers).not.toContain('NaN');
	});

	test('trap 4: oxygen in the inert gas is taken off the leak, not called one', () => {
		const pure = run(purgeInputs());
		const made = run(changed((of) => (of.inertGas.oxygen = { value: 1, unit: '%' })));
		expect(value(made, 'inLeakage')!).toBeLessThan(0.7 * value(pure, 'inLeakage')!);
	});

	test('trap 5: a mixing factor above one is not believed: no number, and a warning', () => {
		const half = run(changed((of) => mapped(of, 'FT-241', (flow) => flow / 2)));
		expect(half.values['AT-211.mixing']).toEqual({ value: null, unit: '1', because: 'above-one' });
		expect(kinds(half)).toContain('mixing-above-one');
		expect(value(run(purgeInputs()), 'AT-211.mixing')).toBeGreaterThan(0.95);
	});

	test('trap 6: the worst place decides, not the mean; an analyser at the inert inlet measures nothing', () => {
		const inputs = changed((of) => mapped(of, 'AT-213', (C, t) => (t > 0 ? C + 4 * (1 - Math.exp(-t / 1000)) : C)));
		expect(word(run(inputs))).toBe('not yet');
		const last = ANALYSERS.map(({ tag }) => value(run(inputs), `${tag}.last`)!);
		expect(last.reduce((sum, each) => sum + each, 0) / 4).toBeLessThan(0.077);
		const inlet = changed((of) => (of.places[0]!.atInertInlet = true));
		expect(word(run(inlet))).toBe('cannot be shown');
	});

	test('trap 7: a gauge pressure is not taken for the absolute one of the circuit', () => {
		expect(refusals({ ...purgeInputs(), pressure: { value: -3, unit: 'mbar(g)' } })).toEqual([
			expect.objectContaining({ kind: 'wrong-quantity', input: 'pressure' }),
		]);
	});

	test('trap 8: dead time is taken off, the first T90 is not used, and both print', () => {
		const window = run(purgeInputs()).notes.find(({ kind, place }) => kind === 'fit-window' && place === 'AT-213');
		expect(window).toMatchObject({ from: 60, deadTime: 30 });
	});

	test('trap 8: an analyser that answers as slowly as the plant is exchanged gets no fit', () => {
		// T90 = 30 min: its time constant is 782 s, the plant's 2000 s.
		const inputs = changed((of) => Object.assign(of.places[1]!, { T90: 1800 }), { minutes: 240 });
		const result = run(inputs);
		expect(result.values['AT-212.rate']).toEqual({ value: null, unit: '1/s', because: 'too-few-samples' });
		const closer = run(changed((of) => Object.assign(of.places[1]!, { T90: 2400 }), { minutes: 800 }));
		expect(closer.values['AT-212.rate']).toEqual({ value: null, unit: '1/s', because: 'rate-of-the-analyser' });
		expect(closer.notes).toContainEqual({
			...{ level: 'remark', kind: 'fit-refused', place: 'AT-212', because: 'rate-of-the-analyser' },
		});
	});

	test('trap 9: samples every second are thinned to three time constants of the analyser', () => {
		const result = run(purgeInputs({ minutes: 60 }, 1));
		const window = result.notes.find(({ kind, place }) => kind === 'fit-window' && place === 'AT-211');
		expect(Number(window!.apart)).toBeCloseTo((3 * 20) / Math.LN10, 9);
		expect(Number(window!.samples)).toBeLessThan(3600 / 26);
	});

	test('trap 9: residuals that follow each other widen the bounds of the floor', () => {
		const width = (result: ReturnType<typeof run>): number =>
			value(result, 'AT-212.floorHigh')! - value(result, 'AT-212.floorLow')!;
		const swirl = changed((of) =>
			mapped(of, 'AT-212', (C, t) => Math.round(100 * (C + 0.1 * Math.sin(t / 120))) / 100),
		);
		expect(width(run(swirl))).toBeGreaterThan(3 * width(run(purgeInputs())));
		expect(kinds(run(swirl))).toContain('residuals-in-runs');
	});

	test('trap 10: a fan that starts after the purge stirs dead legs up: a new hold, and a rise is seen', () => {
		const end = 75 * 60;
		const restarted = changed((of) => mapped(of, 'FT-201', (flow, t) => (t > end - 900 && t < end - 240 ? 0 : flow)));
		expect(word(run(restarted))).toBe('cannot be shown');
		expect(reasons(run(restarted))).toEqual(['c hold-too-short', 'e fan-broken']);
		const raised = changed((of) => mapped(of, 'FT-201', (flow, t) => (t > end - 240 ? 1.2 * flow : flow)));
		expect(run(raised).verdict!.reasons).toEqual([
			expect.objectContaining({ kind: 'hold-too-short', by: 'flow raised', tag: 'FT-201', since: end - 210 }),
		]);
	});

	test('trap 11: no amount of gas counts but what the meter of the inert gas shows', () => {
		const inputs = changed(
			(of) => (of.inertGas.meters = [{ tag: 'WT-9', medium: 'bottles weighed', reads: 'totaliser' }]),
		);
		expect(refusals(inputs)).toEqual([
			{ kind: 'not-an-inert-gas-meter', input: 'inertGas.meters[0]', tag: 'WT-9', medium: 'bottles weighed' },
		]);
	});

	test('trap 12: a limit without source is refused, one out of a table is marked', () => {
		const without = changed((of) => (of.limit.source = { kind: 'report', text: ' ' }));
		expect(refusals(without)).toEqual([{ kind: 'limit-without-source', input: 'limit.source' }]);
		const table = changed((of) => (of.limit.source = { kind: 'from memory', text: 'table of lignite, 63 um' }));
		expect(kinds(run(table))).toContain('limit-not-from-a-test-of-this-fuel');
		expect(kinds(run(purgeInputs()))).not.toContain('limit-not-from-a-test-of-this-fuel');
	});

	test('trap 13: the flow that circulates is no inert gas, and without an outlet nothing was swept', () => {
		const meters = [{ tag: 'FT-201', medium: 'process gas', reads: 'flow' }];
		expect(refusals(changed((of) => (of.inertGas.meters = meters)))).toEqual([
			{ kind: 'not-an-inert-gas-meter', input: 'inertGas.meters[0]', tag: 'FT-201', medium: 'process gas' },
		]);
		expect(refusals(changed((of) => (of.outlet.name = '')))).toEqual([{ kind: 'no-outlet', input: 'outlet.name' }]);
	});

	test('seven readings fit a curve, but the calculator asks for eight of a place', () => {
		const keep = (count: number) => (of: Inputs) => {
			const rows = of.series['AT-211']!;
			const every = rows.t.flatMap((t, i) => (t >= 300 && t % 300 === 0 ? [i] : [])).slice(0, count);
			of.series['AT-211'] = { unit: '%', t: every.map((i) => rows.t[i]!), values: every.map((i) => rows.values[i]!) };
		};
		expect(run(changed(keep(7))).values['AT-211.floor']).toMatchObject({ value: null, because: 'too-few-samples' });
		expect(value(run(changed(keep(8))), 'AT-211.floor')).not.toBeNull();
	});
});

describe('direction of caution', () => {
	test('the oxygen limit is a most: the guard is taken off, and the larger of guard, U and resolution is taken', () => {
		const accept = (facts: Record<string, unknown>): number => {
			const result = run(changed((of) => Object.assign(of.places[0]!, facts)));
			return value(result, 'AT-211.margin')! + value(result, 'AT-211.last')!;
		};
		expect(accept({})).toBeCloseTo(0.077, 12);
		expect(accept({ U: { value: 0.45, unit: '%' } })).toBeCloseTo(0.0755, 12);
		expect(accept({ resolution: { value: 0.5, unit: '%' } })).toBeCloseTo(0.075, 12);
	});

	test('moisture is credited with its lower bound only when it is proved, and a dry reading is compared as it is', () => {
		const dry = value(run(purgeInputs()), 'AT-211.last')!;
		expect(dry * 100).toBeCloseTo(purgeInputs().series['AT-211']!.values.at(-1)!, 9);
		const moisture = {
			low: { value: 10, unit: '%' },
			high: { value: 14, unit: '%' },
			source: 'dew point 47 °C, lower bound',
		};
		expect(value(run({ ...purgeInputs(), moisture }), 'AT-211.last')).toBeCloseTo(dry * 0.9, 12);
	});

	test('a wet reading under a dry limit is charged with the upper bound of the moisture, and refused without one', () => {
		const wet = changed((of) => {
			of.limit.basis = 'dry';
			of.places[0]!.basis = 'wet';
		});
		expect(refusals(wet)).toEqual([
			{ kind: 'basis-needs-moisture', input: 'places[0].basis', tag: 'AT-211', basis: 'wet', limitBasis: 'dry' },
		]);
		const moisture = { low: { value: 10, unit: '%' }, high: { value: 14, unit: '%' }, source: 'dew point' };
		const charged = value(run({ ...wet, moisture }), 'AT-211.last')!;
		expect(charged).toBeCloseTo(purgeInputs().series['AT-211']!.values.at(-1)! / 100 / 0.86, 12);
	});

	test('the inert gas is a least: the U of the meter and of the volumes is taken off', () => {
		const sure = changed((of) => (of.inertGas.meters = [{ tag: 'FT-241', medium: 'inert gas', reads: 'flow' }]));
		expect(word(run({ ...sure, minimumVolumeChanges: 2 }))).toBe('adequate');
		const vague = {
			...sure,
			minimumVolumeChanges: 2,
			volumes: sure.volumes.map((each) => ({ ...each, volume: { ...each.volume, U: 20 } })),
		};
		expect(word(run(vague))).toBe('not yet');
	});

	test('a longer lag or slower answer never shortens the hold', () => {
		const needed = (facts: Record<string, unknown>): number =>
			value(run(changed((of) => Object.assign(of.places[0]!, facts))), 'holdNeeded')!;
		expect(needed({ lag: 300 })).toBe(960);
		expect(needed({ T90: 200 })).toBe(636);
		expect(needed({})).toBe(360);
	});

	test('while it falls, lag makes a place look worse than it is, and while it rises, better: the no-rise rule stands against that', () => {
		// The hopper gives back what it kept: the reading still lies well below the line when the rise is called.
		const rising = changed((of) =>
			mapped(of, 'AT-213', (C, t) => (t > 4150 ? Math.round(100 * (4.7 + (t - 4150) / 300)) / 100 : C)),
		);
		expect(value(run(rising), 'AT-213.margin')).toBeGreaterThan(0.015);
		expect(reasons(run(rising))).toEqual(['b rising']);
	});

	test('a leak estimate is that of the highest floor', () => {
		const inputs = changed((of) => mapped(of, 'AT-214', (C, t) => (t > 0 ? C + 1.5 * (1 - Math.exp(-t / 2000)) : C)));
		expect(run(inputs).notes).toContainEqual(expect.objectContaining({ kind: 'in-leakage', place: 'AT-214' }));
	});

	test('listed air is part of the floor and no leak; listed inert gas dilutes too', () => {
		const listed = (medium: string, flow: number) => ({
			name: 'conveying',
			medium,
			flow: { value: flow, unit: 'm3(n)/h' },
		});
		const leak = (flows: unknown[]): number => value(run({ ...purgeInputs(), listedFlows: flows }), 'inLeakage')!;
		expect(leak([listed('air', 60)]) * 3600).toBeCloseTo(leak([]) * 3600 - 60, 6);
		expect(leak([listed('inert gas', 88.8)])).toBeCloseTo(leak([]) * 1.1, 9);
	});

	test('a leak that is not different from nothing asks for a look at the sensor; it is never called tight', () => {
		const result = run(purgeInputs({ leak: 0, noise: 0.2 }));
		expect(kinds(result)).toContain('leak-asks-for-sensor-check');
	});

	test('a leak without its suction is marked', () => {
		expect(kinds(run({ ...purgeInputs(), suction: undefined }))).toContain('leak-without-suction');
	});
});

test('readings that dive below the floor of their own curve are said, and a later begin of the curve can be chosen: it prints', () => {
	// Settled at 10.5 % for most of the purge, and brought down only at the end: by more inert gas, for the moment.
	const settled = (t: number): number => 10.5 + 10.4 * Math.exp(-t / 500);
	const inputs = changed((of) => mapped(of, 'AT-213', (C, t) => (t > 0 && t < 4000 ? settled(t) : C)));
	const warnings = kinds(run(inputs));
	expect(warnings).toContain('floor-above-readings');
	expect(warnings).toContain('residuals-in-runs');
	const chosen = run({ ...inputs, fitFrom: 4000 });
	expect(kinds(chosen)).not.toContain('floor-above-readings');
	expect(chosen.notes).toContainEqual(expect.objectContaining({ kind: 'fit-window', place: 'AT-213', from: 4060 }));
});

test('an inert flow that changed under the curve is said', () => {
	const inputs = changed((of) => mapped(of, 'FT-241', (flow, t) => (t > 1800 ? 1.4 * flow : flow)));
	expect(kinds(run(inputs))).toContain('inert-flow-varied');
});

describe('what is refused', () => {
	test.each<[string, (of: Inputs) => unknown, string, string]>([
		['a volume of nothing', (of) => (of.volumes[0]!.volume.value = 0), 'not-positive', 'volumes[0].volume'],
		['a limit of 8 (800 %)', (of) => Object.assign(of.limit, { oxygen: 8 }), 'out-of-range', 'limit.oxygen'],
		['a limit of 26 %', (of) => (of.limit.oxygen.value = 26), 'out-of-range', 'limit.oxygen'],
		['a guard that leaves nothing', (of) => (of.guard.value = 8), 'guard-leaves-nothing', 'places[0]'],
		['a vacuum', (of) => (of.pressure.value = 0), 'out-of-range', 'pressure'],
		['a place named twice', (of) => (of.places[1]!.tag = 'AT-211'), 'named-twice', 'places[1]'],
		['a volume covered twice', (of) => of.coverage.push(of.coverage[0]!), 'named-twice', 'coverage[6]'],
		['a series of unequal lengths', (of) => of.series['AT-211']!.t.pop(), 'unequal-lengths', 'series.AT-211'],
		[
			'oxygen in a unit of pressure',
			(of) => (of.series['AT-211']!.unit = 'mbar'),
			'wrong-quantity',
			'series.AT-211.values[0]',
		],
		[
			'inert gas in actual cubic metres',
			(of) => (of.series['FT-241']!.unit = 'm3/h'),
			'wrong-quantity',
			'series.FT-241.values[0]',
		],
		['a fan without flow', (of) => (of.fan.least = 0), 'out-of-range', 'fan.least'],
		['a hold shorter than five minutes', (of) => Object.assign(of, { leastHold: 60 }), 'out-of-range', 'leastHold'],
		['a mixing factor above one', (of) => Object.assign(of, { mixing: 1.2 }), 'out-of-range', 'mixing'],
		[
			'a judgement before the purge',
			(of) => Object.assign(of, { judgedAt: -10 }),
			'judged-before-it-began',
			'judgedAt',
		],
		[
			'inert gas with 30 % of oxygen',
			(of) => (of.inertGas.oxygen = { value: 30, unit: '%' }),
			'out-of-range',
			'inertGas.oxygen',
		],
		[
			'crossed bounds of moisture',
			(of) => Object.assign(of, { moisture: { low: 0.2, high: 0.1, source: 'x' } }),
			'bounds-crossed',
			'moisture',
		],
		['no place at all', (of) => (of.places = []), 'bad-input', 'places'],
		[
			'a flag that nobody knows',
			(of) => (of.series['AT-211']!.flagged = [{ from: 0, to: 1, flag: 'odd' }]),
			'bad-input',
			'series.AT-211.flagged.0.flag',
		],
	])('%s', (_, change, kind, input) => {
		expect(refusals(changed(change))).toContainEqual(expect.objectContaining({ kind, input }));
	});

	test('a totaliser that ran backwards', () => {
		const inputs = changed((of) => {
			of.inertGas.meters = [{ tag: 'FQ-241', medium: 'inert gas', reads: 'totaliser' }];
			of.series['FQ-241'] = { unit: 'm3(n)', t: [0, 60, 120], values: [100, 115, 90] };
		});
		expect(refusals(inputs)).toEqual([
			{ kind: 'totaliser-ran-backwards', input: 'series.FQ-241', t: 120, before: 115, value: 90 },
		]);
	});

	test('whatever comes from outside is answered, never thrown at', () => {
		for (const odd of [null, 7, 'x', [], {}, { places: 3 }, { ...purgeInputs(), series: { 'AT-211': null } }]) {
			expect(runCalculator('purge-adequacy@1', odd).ok).toBe(false);
		}
	});
});
