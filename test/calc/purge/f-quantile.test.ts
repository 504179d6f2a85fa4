import { expect, test } from 'vitest';
import { fQuantile, tQuantile } from '../../../src/lib/calc/purge/f-quantile';
import quantiles from '../../vectors/purge/quantiles.json';

// Source: scipy 1.17.1, scipy.stats.t.ppf and scipy.stats.f.ppf (test/reference/purge/make-vectors.py).
test.each(quantiles.t as [number, number, number][])('t at p = %d with %d degrees of freedom is %d', (p, nu, t) => {
	expect(Math.abs(tQuantile(p, nu) / t - 1)).toBeLessThan(1e-9);
});

test.each(quantiles.f as [number, number, number, number][])(
	'F at p = %d with %d and %d degrees is %d',
	(p, d1, d2, F) => {
		expect(Math.abs(fQuantile(p, d1, d2) / F - 1)).toBeLessThan(1e-9);
	},
);

test('the middle of the t distribution is zero', () => {
	expect(tQuantile(0.5, 7)).toBe(0);
});

test.each([0, 1, Number.NaN])('a probability of %d is a mistake of the program', (p) => {
	expect(() => fQuantile(p, 1, 5)).toThrow(RangeError);
});
