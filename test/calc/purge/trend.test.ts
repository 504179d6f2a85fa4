import { describe, expect, test } from 'vitest';
import { gapsIn, risesIn, valueAt } from '../../../src/lib/calc/purge/trend';

const every = (step: number, values: readonly number[], from = 0) =>
	values.map((value, i) => ({ t: from + step * i, value }));
const rules = { longestGap: 60, stopped: 10 };
const hour = { from: 0, to: 300 };
const trend = (points: readonly { t: number; value: number }[], seen?: { from: number; to: number; by: string }) => ({
	...{ record: 'FT-201', points, seen },
});

describe('a trend without a gap', () => {
	test('has readings no further apart than the site allows, from before the stretch to its end', () => {
		expect(gapsIn(trend(every(60, [100, 100, 100, 100, 100, 100])), hour, rules)).toEqual([]);
		expect(gapsIn(trend(every(60, [100, 100, 100, 100, 100, 100], -30)), hour, rules)).toEqual([]);
	});
});

describe('a gap is', () => {
	test('a stretch without readings, cut to what is asked about', () => {
		const silent = every(60, [100, 100, 100, 100, 100, 100]).filter(({ t }) => t !== 120);
		expect(gapsIn(trend(silent), hour, rules)).toEqual([{ record: 'FT-201', from: 60, to: 180, why: 'no data' }]);
		expect(gapsIn(trend(silent), { from: 100, to: 150 }, rules)).toEqual([
			{ record: 'FT-201', from: 100, to: 150, why: 'no data' },
		]);
	});

	test('a beginning or an end that nobody recorded', () => {
		expect(gapsIn(trend(every(30, [100, 100, 100], 120)), hour, rules)).toEqual([
			{ record: 'FT-201', from: 0, to: 120, why: 'no data' },
			{ record: 'FT-201', from: 180, to: 300, why: 'no data' },
		]);
		expect(gapsIn(trend([]), hour, rules)).toEqual([{ record: 'FT-201', from: 0, to: 300, why: 'no data' }]);
	});

	test('a reading that says it stood, until the next that says it goes', () => {
		expect(gapsIn(trend(every(60, [100, 100, 3, 4, 100, 100])), hour, rules)).toEqual([
			{ record: 'FT-201', from: 120, to: 240, why: 'stopped' },
		]);
	});

	test('still there at the end when it stands at the end', () => {
		expect(gapsIn(trend(every(60, [100, 100, 100, 100, 100, 0])), hour, rules)).toEqual([
			{ record: 'FT-201', from: 300, to: 300, why: 'stopped' },
		]);
	});
});

test('a person vouches for silence, not against a record', () => {
	const seen = { from: -10, to: 400, by: 'TechA' };
	expect(gapsIn(trend([], seen), hour, rules)).toEqual([]);
	expect(gapsIn(trend([], { ...seen, to: 290 }), hour, rules)).toHaveLength(1);
	expect(gapsIn(trend(every(60, [100, 0, 100]), seen), hour, rules)).toEqual([
		{ record: 'FT-201', from: 60, to: 120, why: 'stopped' },
	]);
});

test('a rise is more than a tenth above the lowest since the last one', () => {
	expect(risesIn(every(1, [100, 105, 95, 104, 106, 106, 118, 116]), 0.1)).toEqual([4, 6]);
	expect(risesIn(every(1, [100, 95, 90, 85]), 0.1)).toEqual([]);
});

test('between two readings the value is on the line, beyond a gap there is none', () => {
	const points = [...every(60, [100, 160]), { t: 200, value: 50 }];
	expect(valueAt(points, 30, 60)).toBe(130);
	expect(valueAt(points, 200, 60)).toBe(50);
	expect(valueAt(points, 100, 60)).toBeUndefined();
	expect(valueAt(points, 300, 60)).toBeUndefined();
});
