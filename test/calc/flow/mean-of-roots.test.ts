import { expect, test } from 'vitest';
import { meanOfRoots } from '../../../src/lib/calc/flow/mean-of-roots';
import { agreesWith } from '../../support/printed';

// By hand, a flow q = q0 (1 + a sin wt): root of the mean over mean of the roots is sqrt(1 + a^2/2).
test.each([
	[0.05, '0.0625'],
	[0.1, '0.2497'],
	[0.2, '0.9950'],
	[0.3, '2.2252'],
	[0.5, '6.0660'],
])('a flow swinging by %d reads %s %% too much when the difference pressure is averaged first', (a, printed) => {
	const n = 1000;
	const series = Array.from({ length: n }, (_, i) => (100 * (1 + a * Math.sin((2 * Math.PI * i) / n))) ** 2);
	expect(agreesWith(meanOfRoots(series).overread * 100, printed)).toBe(true);
	expect(Math.sqrt(meanOfRoots(series).dp)).toBeCloseTo(100, 9);
});

// By hand: root of the mean 22.360680, mean of the roots 22.255103, +0.4744 %.
test('ten readings: the mean of their roots is 22.255103, not 22.360680', () => {
	const { dp, overread } = meanOfRoots([400, 520, 610, 480, 350, 700, 560, 430, 500, 450]);
	expect(agreesWith(Math.sqrt(dp), '22.255103')).toBe(true);
	expect(agreesWith(overread * 100, '0.4744')).toBe(true);
});

// By hand: 90 and 110 about 100 are 10 % off.
test('the pulsation is the root mean square of the fluctuation over the mean', () => {
	expect(meanOfRoots([90, 110]).pulsation).toBeCloseTo(0.1, 12);
	expect(meanOfRoots([100, 100, 100]).pulsation).toBe(0);
	expect(meanOfRoots([0, 0])).toEqual({ dp: 0, pulsation: 0, overread: 0 });
});
