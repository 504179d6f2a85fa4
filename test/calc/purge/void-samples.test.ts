import { describe, expect, test } from 'vitest';
import { voidSamples } from '../../../src/lib/calc/purge/void-samples';

const points = (values: readonly number[]) => values.map((value, i) => ({ t: 10 * i, value }));
const rules = { flagged: undefined, range: { from: 0, to: 0.25 }, identicalMost: 3 };

test('samples that are none of it stay as they are', () => {
	const { valid, excluded } = voidSamples(points([0.2, 0.19, 0.18]), rules);
	expect(valid.map(({ C }) => C)).toEqual([0.2, 0.19, 0.18]);
	expect(excluded).toEqual([]);
});

describe('void are', () => {
	test('samples of a flagged stretch, its ends included', () => {
		const flagged = [{ from: 10, to: 20, flag: 'back-purge' as const }];
		const { valid, excluded } = voidSamples(points([0.2, 0.21, 0.21, 0.18]), { ...rules, flagged });
		expect(valid.map(({ t }) => t)).toEqual([0, 30]);
		expect(excluded).toEqual([{ why: 'back-purge', count: 2, ranges: [[10, 20]] }]);
	});

	test('samples outside 0 to 25 %, and outside the range of the instrument', () => {
		const narrow = { ...rules, range: { from: 0, to: 0.1 } };
		expect(voidSamples(points([0.26, -0.01, 0.2, 0.05]), rules).valid.map(({ C }) => C)).toEqual([0.2, 0.05]);
		expect(voidSamples(points([0.26, -0.01, 0.2, 0.05]), narrow).valid.map(({ C }) => C)).toEqual([0.05]);
	});

	test('all of a row of more than N identical values, and none of a row of N', () => {
		const { valid, excluded } = voidSamples(points([0.2, 0.05, 0.05, 0.05, 0.05, 0.04, 0.04, 0.04]), rules);
		expect(valid.map(({ C }) => C)).toEqual([0.2, 0.04, 0.04, 0.04]);
		expect(excluded).toEqual([{ why: 'frozen', count: 4, ranges: [[10, 40]] }]);
	});

	test('identical values with a void one among them: it does not wake a frozen analyser', () => {
		const { valid } = voidSamples(points([0.05, 0.05, 0.3, 0.05, 0.05]), rules);
		expect(valid).toEqual([]);
	});
});

test('stretches are told apart, so that they can be printed', () => {
	const { excluded } = voidSamples(points([0.3, 0.31, 0.2, 0.29]), rules);
	expect(excluded).toEqual([
		{
			why: 'out of range',
			count: 3,
			ranges: [
				[0, 10],
				[30, 30],
			],
		},
	]);
});
