import fc from 'fast-check';
import { expect, test } from 'vitest';
import { placeFit, thinned } from '../../../src/lib/calc/purge/place-fit';

/** A decay read through a transport lag and a first-order answer, solved in closed form; air until the gas arrives. */
const readThrough = (of: { rate: number; floor: number; lag: number; tau: number; begins: number }) => (t: number) => {
	const s = t - of.begins - of.lag;
	if (s <= 0) return 0.2095;
	const k = 1 / of.tau;
	const slow = ((0.2095 - of.floor) * k) / (k - of.rate);
	return of.floor + slow * Math.exp(-of.rate * s) + (0.2095 - of.floor - slow) * Math.exp(-k * s);
};

const sampled = (curve: (t: number) => number, step: number, from: number, to: number) =>
	Array.from({ length: Math.floor((to - from) / step) + 1 }, (_, i) => {
		const t = from + i * step;
		return { t, C: curve(t) };
	});

test('lag and answer of the analyser do not change rate and floor', () => {
	fc.assert(
		fc.property(
			fc.record({
				rate: fc.double({ min: 3e-4, max: 1.5e-3, noNaN: true }),
				floor: fc.double({ min: 0, max: 0.06, noNaN: true }),
				lag: fc.integer({ min: 0, max: 120 }),
				tau: fc.double({ min: 2, max: 20, noNaN: true }),
				begins: fc.integer({ min: -500, max: 5000 }),
			}),
			(of) => {
				const samples = sampled(readThrough(of), 20, of.begins - 300, of.begins + 3 / of.rate);
				const fit = placeFit(samples, { begins: of.begins, lag: of.lag, T90: of.tau * Math.LN10 });
				if (!fit.ok) throw new Error(fit.error.kind);
				// What is left of the answer after T90 is a tenth, and gone soon after.
				expect(Math.abs(fit.value.fit.lambda / of.rate - 1)).toBeLessThan(0.01);
				expect(Math.abs(fit.value.fit.Cf - of.floor)).toBeLessThan(0.002);
				expect(fit.value.from).toBeGreaterThanOrEqual(of.begins + of.lag + of.tau * Math.LN10);
			},
		),
	);
});

test('samples before the gas arrives, and in the first T90, are not used', () => {
	const samples = sampled(readThrough({ rate: 1e-3, floor: 0.04, lag: 60, tau: 13, begins: 100 }), 10, 0, 4000);
	const fit = placeFit(samples, { begins: 100, lag: 60, T90: 30 });
	expect(fit.ok && fit.value.from).toBe(190);
});

test('fewer than eight thinned samples are refused', () => {
	const samples = sampled(readThrough({ rate: 1e-3, floor: 0.04, lag: 0, tau: 10, begins: 0 }), 1, 0, 200);
	const fit = placeFit(samples, { begins: 0, lag: 0, T90: 23 });
	expect(fit.ok ? undefined : fit.error).toMatchObject({ kind: 'too-few-samples', samples: 6, least: 8 });
});

test('a curve that is the answer of the analyser itself is refused', () => {
	// The gas is exchanged at once; what is seen is the analyser, tau = 200 s.
	const samples = sampled((t) => 0.04 + 0.17 * Math.exp(-t / 200), 10, 0, 8000);
	const fit = placeFit(samples, { begins: 0, lag: 0, T90: 200 * Math.LN10 });
	expect(fit.ok ? undefined : fit.error).toMatchObject({ kind: 'rate-of-the-analyser' });
});

test('thinning keeps the first sample and each next that is far enough', () => {
	const samples = [0, 4, 9, 10, 19, 25].map((t) => ({ t, C: 0 }));
	expect(thinned(samples, 10).map(({ t }) => t)).toEqual([0, 10, 25]);
	expect(thinned(samples, 0)).toEqual(samples);
});
