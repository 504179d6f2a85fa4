import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { canonicalJson, type Json } from '../../../src/lib/base';
import type { CalcResult } from '../../../src/lib/calc';
import { ANALYSERS, purgeInputs, reasons, run, word, type Inputs, type Scene } from './purge-scene';

/** Laws that hold for any purge: few, short scenes, sampled every half minute, so that many can be tried. */
const scene: fc.Arbitrary<Partial<Scene>> = fc.record({
	minutes: fc.integer({ min: 30, max: 80 }),
	leak: fc.integer({ min: 0, max: 700 }),
	hopperExchange: fc.integer({ min: 300, max: 4000 }),
	noise: fc.constantFrom(0.01, 0.05, 0.15),
	seed: fc.integer({ min: 1, max: 1_000_000 }),
});
const anyPurge = scene.map((change) => purgeInputs(change, 30));
const RANK = { 'cannot be shown': 0, 'not yet': 1, adequate: 2 } as const;
const rank = (result: CalcResult): number => RANK[word(result) as keyof typeof RANK];
const options = { numRuns: 25 };

test('a higher limit never makes the verdict worse', () => {
	fc.assert(
		fc.property(
			anyPurge,
			fc.double({ min: 4, max: 14, noNaN: true }),
			fc.double({ min: 0.01, max: 4, noNaN: true }),
			(inputs, limit, more) => {
				const at = (value: number): number =>
					rank(run({ ...inputs, limit: { ...inputs.limit, oxygen: { value, unit: '%' } } }));
				expect(at(limit + more)).toBeGreaterThanOrEqual(at(limit));
			},
		),
		options,
	);
});

test('a larger guard never makes the verdict better', () => {
	fc.assert(
		fc.property(
			anyPurge,
			fc.double({ min: 0, max: 2, noNaN: true }),
			fc.double({ min: 0, max: 2, noNaN: true }),
			(inputs, guard, more) => {
				const at = (value: number): number => rank(run({ ...inputs, guard: { value, unit: '%' } }));
				expect(at(guard + more)).toBeLessThanOrEqual(at(guard));
			},
		),
		options,
	);
});

/** Everything but the inputs, which differ on purpose, and the list of what was excluded. */
const judged = ({ inputs: _, notes, ...rest }: CalcResult) => ({
	...rest,
	notes: notes.filter(({ kind }) => kind !== 'samples-excluded'),
});

test('the order in which samples arrive changes nothing', () => {
	fc.assert(
		fc.property(anyPurge, fc.infiniteStream(fc.nat()), (inputs, stream) => {
			const shuffled = structuredClone(inputs);
			for (const series of Object.values(shuffled.series)) {
				const rows = series.t.map((t, i) => ({ t, value: series.values[i]!, key: stream.next().value as number }));
				rows.sort((a, b) => a.key - b.key);
				series.t = rows.map(({ t }) => t);
				series.values = rows.map(({ value }) => value);
			}
			expect(judged(run(shuffled))).toEqual(judged(run(inputs)));
		}),
		options,
	);
});

test('what is read after the judgement changes nothing', () => {
	fc.assert(
		fc.property(anyPurge, fc.integer({ min: 10, max: 30 }), (inputs, minutes) => {
			const judgedAt = minutes * 60;
			const cut = structuredClone(inputs);
			for (const series of Object.values(cut.series)) {
				const known = series.t.flatMap((t, i) => (t <= judgedAt ? [i] : []));
				series.values = known.map((i) => series.values[i]!);
				series.t = known.map((i) => series.t[i]!);
			}
			expect(judged(run({ ...inputs, judgedAt }))).toEqual(judged(run({ ...cut, judgedAt })));
		}),
		options,
	);
});

describe('a void sample changes nothing', () => {
	const added = (inputs: Inputs, tag: string, t: number, value: number): Inputs => {
		const changed = structuredClone(inputs);
		changed.series[tag]!.t.push(t);
		changed.series[tag]!.values.push(value);
		return changed;
	};

	test.each([
		['above 25 %', 25.01],
		['below zero', -0.2],
	])('when it is out of range: %s', (_, odd) => {
		fc.assert(
			fc.property(
				anyPurge,
				fc.constantFrom(...ANALYSERS),
				fc.integer({ min: -100, max: 6000 }),
				(inputs, { tag }, t) => {
					expect(judged(run(added(inputs, tag, t, odd)))).toEqual(judged(run(inputs)));
				},
			),
			options,
		);
	});

	test.each(['hold', 'back-purge', 'calibration', 'low sample flow', 'cooler alarm'])(
		'when it is flagged: %s',
		(flag) => {
			fc.assert(
				fc.property(
					anyPurge,
					fc.integer({ min: 1, max: 59 }),
					fc.double({ min: 0, max: 21, noNaN: true }),
					(inputs, t, C) => {
						// Half a minute lies between samples: a time in between is nobody else's.
						const at = 600 + (t % 30 === 0 ? t + 1 : t);
						const changed = added(inputs, 'AT-212', at, C);
						changed.series['AT-212']!.flagged = [{ from: at, to: at, flag }];
						const result = run(changed);
						expect(judged(result)).toEqual(judged(run(inputs)));
						expect(result.notes).toContainEqual({
							...{ level: 'remark', kind: 'samples-excluded', place: 'AT-212' },
							...{ why: flag, count: 1, ranges: [[at, at]] },
						});
					},
				),
				options,
			);
		},
	);
});

test('a blank coverage row cannot be shown, whatever the readings', () => {
	fc.assert(
		fc.property(anyPurge, fc.nat(5), (inputs, pick) => {
			const changed = structuredClone(inputs);
			changed.coverage[pick] = { volume: changed.coverage[pick]!.volume, answer: '' };
			expect(word(run(changed))).toBe('cannot be shown');
			expect(reasons(run(changed))).toContain('a not-covered');
		}),
		options,
	);
});

test('an adequate purge has no valid reading above the line in its hold window, at any place', () => {
	fc.assert(
		fc.property(anyPurge, (inputs) => {
			const result = run(inputs);
			if (word(result) !== 'adequate') return;
			const end = Math.max(...ANALYSERS.map(({ tag }) => inputs.series[tag]!.t.at(-1)!));
			for (const { tag } of ANALYSERS) {
				const { t, values } = inputs.series[tag]!;
				expect(values.filter((C, i) => t[i]! >= end - 360 && C > 7.7)).toEqual([]);
			}
		}),
		options,
	);
});

test('the same inputs give the same answer, and the inputs are left alone', () => {
	fc.assert(
		fc.property(anyPurge, (inputs) => {
			const before = structuredClone(inputs);
			expect(run(inputs)).toEqual(run(inputs));
			expect(inputs).toEqual(before);
		}),
		{ numRuns: 10 },
	);
});

test('whatever the analysers read, the answer is a verdict in plain JSON', () => {
	const odd = fc.array(fc.tuple(fc.integer({ min: -300, max: 3000 }), fc.integer({ min: -20, max: 260 })), {
		maxLength: 60,
	});
	fc.assert(
		fc.property(fc.tuple(odd, odd, odd, odd), fc.constantFrom(0, 20, 600), (series, T90) => {
			const inputs = purgeInputs({ minutes: 30 }, 60);
			ANALYSERS.forEach(({ tag }, i) => {
				const rows = series[i]!;
				inputs.series[tag] = { unit: '%', t: rows.map(([t]) => t), values: rows.map(([, C]) => C / 10) };
				inputs.places[i]!.T90 = T90;
			});
			const result = run(inputs);
			// Refuses NaN, infinities and undefined by throwing.
			expect(canonicalJson(result as unknown as Json)).toContain('"verdict"');
		}),
		{ numRuns: 100 },
	);
});

test('mass balance: what the circuit gave off, and what went in, is the oxygen that is left', () => {
	// The scene itself is checked here, since the other tests rest on it: dry oxygen in, oxygen out, oxygen kept.
	fc.assert(
		fc.property(scene, (change) => {
			const steady = purgeInputs({ ...change, minutes: 1200, noise: 0, hopperExchange: 4000 }, 600);
			const leak = change.leak ?? 100;
			const expected = (20.95 * leak) / (leak + 888);
			const last = steady.series['AT-214']!.values.at(-1)!;
			expect(Math.abs(last - expected)).toBeLessThan(0.02);
		}),
		{ numRuns: 5 },
	);
});
