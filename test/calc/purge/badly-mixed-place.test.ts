import { describe, expect, test } from 'vitest';
import { kinds, purgeInputs, reasons, run, value, word } from './purge-scene';

/** The whole way of a purge with a hopper that hardly mixes, judged again and again as an operator would. */
describe('a filter hopper that the purge hardly reaches', () => {
	const scene = { hopperExchange: 120, leak: 60, noise: 0.04 };
	const after = (minutes: number) => run({ ...purgeInputs({ ...scene, minutes }), mixing: 0.5 });

	test('holds the purge up long after the other places are done, and is named', () => {
		const result = after(55);
		expect(word(result)).toBe('not yet');
		for (const tag of ['AT-211', 'AT-212', 'AT-214']) expect(value(result, `${tag}.margin`)).toBeGreaterThan(0);
		expect(value(result, 'AT-213.margin')).toBeLessThan(0);
		expect(result.notes).toContainEqual({ level: 'remark', kind: 'slowest-place', place: 'AT-213' });
		expect(result.verdict!.reasons.map(({ place }) => place)).toContain('AT-213');
		expect(reasons(result)).toEqual(['b above-line', 'c hold-too-short']);
	});

	test('does not follow one exponential: first there is no curve, later its residuals say so', () => {
		expect(after(55).values['AT-213.floor']).toEqual({ value: null, unit: '1', because: 'no-curvature' });
		expect(after(55).notes).toContainEqual(expect.objectContaining({ kind: 'fit-refused', place: 'AT-213' }));
		expect(after(110).notes).toContainEqual(expect.objectContaining({ kind: 'residuals-in-runs', place: 'AT-213' }));
	});

	test('has a rough forecast, and a mean over the places that would have passed it', () => {
		const result = after(55);
		expect(result.notes).toContainEqual(expect.objectContaining({ kind: 'forecast', place: 'AT-213', rough: true }));
		const last = ['AT-211', 'AT-212', 'AT-213', 'AT-214'].map((tag) => value(result, `${tag}.last`)!);
		expect(last.reduce((sum, each) => sum + each, 0) / 4).toBeLessThan(0.08);
	});

	test('is adequate in the end, since its own last reading above the line', () => {
		const inputs = purgeInputs({ ...scene, minutes: 110 });
		const result = run(inputs);
		expect(word(result)).toBe('adequate');
		const { t, values } = inputs.series['AT-213']!;
		const lastAbove = values.findLastIndex((C) => C > 7.7);
		expect(value(result, 'adequateSince')).toBe(t[lastAbove + 1]);
		expect(value(result, 'adequateSince')! - value(result, 'AT-211.adequateSince')!).toBeGreaterThan(900);
	});

	test('is no worse for the verdict when its analyser fails: without it nothing can be shown', () => {
		const inputs = purgeInputs({ ...scene, minutes: 110 });
		inputs.places.find(({ tag }) => tag === 'AT-213')!.mode = 'fault';
		expect(word(run(inputs))).toBe('cannot be shown');
		expect(kinds(run(inputs))).toContain('slowest-place');
	});

	test('one judged a quarter of an hour too early never passes on the way', () => {
		const words = [20, 35, 50, 65].map((minutes) => word(after(minutes)));
		expect(words).toEqual(['not yet', 'not yet', 'not yet', 'not yet']);
	});
});
