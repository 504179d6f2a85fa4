import fc from 'fast-check';
import { expect, test } from 'vitest';
import { expansibility, expansibilityUncertainty } from '../../../src/lib/calc/flow/expansibility';
import { agreesWith, agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Source: documentation of fluids, example of nozzle_expansibility, printed cut off as 0.994570234456.
test('the printed example: 1 kPa over a throat of 22.2 mm in 73.9 mm', () => {
	const epsilon = expansibility({ dp: 1e3, p1: 1e5, beta: 0.0222 / 0.0739, kappa: 1.4 });
	expect(String(epsilon).slice(0, 14)).toBe('0.994570234456');
});

// Independent: fluids 1.0.22, nozzle_expansibility (test/vectors/venturi/expansibility.json).
type Case = { beta: number; tau: number; kappa: number; epsilon: number };
test.each(vector('venturi/expansibility.json') as Case[])(
	'beta $beta, p2/p1 $tau, kappa $kappa: $epsilon',
	({ beta, tau, kappa, epsilon }) => {
		expect(agreesWithin(expansibility({ dp: 1e5 - tau * 1e5, p1: 1e5, beta, kappa }), epsilon, 1e-11)).toBe(true);
	},
);

test('no difference pressure is no expansion, and a tiny one nearly none: 0/0 is never formed', () => {
	expect(expansibility({ dp: 0, p1: 1e5, beta: 0.6, kappa: 1.4 })).toBe(1);
	const tiny = expansibility({ dp: 1e-9, p1: 1e5, beta: 0.6, kappa: 1.4 });
	expect(1 - tiny).toBeGreaterThan(0);
	expect(1 - tiny).toBeLessThan(1e-13);
});

test('kappa passes through one without a jump', () => {
	const at = (kappa: number) => expansibility({ dp: 1e4, p1: 1e5, beta: 0.6, kappa });
	for (const step of [1e-6, 1e-9, 1e-12]) expect(Math.abs(at(1 + step) - at(1))).toBeLessThan(step);
});

test('a liquid, an exponent without end, does not expand', () => {
	expect(agreesWithin(expansibility({ dp: 2e4, p1: 3e5, beta: 0.5, kappa: 1e9 }), 1, 1e-9)).toBe(true);
});

test('more difference pressure always means more expansion', () => {
	fc.assert(
		fc.property(
			fc.double({ min: 0.2, max: 0.8, noNaN: true }),
			fc.double({ min: 1, max: 1.7, noNaN: true }),
			fc.double({ min: 0.001, max: 0.24, noNaN: true }),
			(beta, kappa, part) => {
				const less = expansibility({ dp: part * 1e5, p1: 1e5, beta, kappa });
				const more = expansibility({ dp: (part + 0.005) * 1e5, p1: 1e5, beta, kappa });
				expect(more).toBeLessThan(less);
				expect(more).toBeGreaterThan(0);
			},
		),
	);
});

// By hand, (4 + 100 beta^8) dp/p1 %: beta 0.75 gives 4 + 10.0113; 1 kPa of 100 kPa is 1 %.
test('its uncertainty at beta 0.75 and 1 % of the pressure is 0.140 %', () => {
	expect(agreesWith(expansibilityUncertainty({ dp: 1e3, p1: 1e5, beta: 0.75 }) * 100, '0.140')).toBe(true);
});
