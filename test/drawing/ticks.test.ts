import fc from 'fast-check';
import { expect, test } from 'vitest';
import { logarithmicTicks, tickLabel, ticks, timeStep } from '../../src/lib/drawing/ticks';

test.each([
	{ from: 0, to: 21, count: 8, at: [0, 5, 10, 15, 20] },
	{ from: 6.2, to: 8.9, count: 6, at: [6.5, 7, 7.5, 8, 8.5] },
	{ from: -4, to: -2, count: 4, at: [-4, -3.5, -3, -2.5, -2] },
])('$from to $to is stepped by a 1, a 2 or a 5', ({ from, to, count, at }) => {
	const found = ticks(from, to, count);
	expect(found.at.map((value) => Number(value.toFixed(6)))).toEqual(at);
});

test('steps lie inside the range, are 1, 2 or 5 times a power of ten apart, and are not too many', () => {
	const ranges = fc.tuple(
		fc.double({ min: -1e6, max: 1e6, noNaN: true }),
		fc.double({ min: 1e-6, max: 1e6, noNaN: true }),
	);
	fc.assert(
		fc.property(ranges, fc.integer({ min: 2, max: 12 }), ([from, span], count) => {
			const { at } = ticks(from, from + span, count);
			expect(at.every((value) => value >= from - span * 1e-6 && value <= from + span * (1 + 1e-6))).toBe(true);
			expect(at.length).toBeLessThanOrEqual(count + 1);
			if (at.length < 2 || span / Math.max(1, Math.abs(from)) < 1e-9) return;
			const step = at[1]! - at[0]!;
			const mantissa = step / 10 ** Math.floor(Math.log10(step * 1.0000001));
			expect([1, 2, 5].some((each) => Math.abs(mantissa - each) < 1e-4 * each)).toBe(true);
		}),
	);
});

test('a range that is none has no steps', () => {
	for (const [from, to] of [
		[1, 1],
		[2, 1],
		[NaN, 1],
		[0, Infinity],
	] as const)
		expect(ticks(from, to, 5).at).toEqual([]);
});

test('decades of a logarithmic axis have their twos and fives while there is room', () => {
	expect(logarithmicTicks(0.5, 20).map((value) => Number(value.toPrecision(3)))).toEqual([0.5, 1, 2, 5, 10, 20]);
	expect(logarithmicTicks(1e-6, 1e3).map((value) => Number(value.toPrecision(3)))).toEqual([
		1e-6, 1e-5, 1e-4, 1e-3, 0.01, 0.1, 1, 10, 100, 1000,
	]);
});

test('time is stepped as clocks are, and numbers have a true minus sign', () => {
	expect([timeStep(3600, 7), timeStep(19 * 3600, 14)]).toEqual([600, 7200]);
	expect([tickLabel(-3.1, 1), tickLabel(-0, 0)]).toEqual(['−3.1', '0']);
});
