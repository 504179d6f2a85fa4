import fc from 'fast-check';
import { expect, test } from 'vitest';
import { dischargeCoefficient } from '../../../src/lib/calc/flow/discharge-coefficient';

// Source: ISO 5167-4:2003, 5.5.2 to 5.5.4 (read second-hand): C and its uncertainty. Also fluids 1.0.22, same constants.
test.each([
	['as_cast', 0.984, 0.007, 2e6],
	['machined', 0.995, 0.01, 1e6],
	['rough_welded', 0.985, 0.015, 2e6],
] as const)('%s: C is %d with %d from Re_D 2e5 to %d, ends included', (type, C, U, end) => {
	for (const reynolds of [2e5, 5e5, end]) {
		expect(dischargeCoefficient(type, reynolds)).toEqual({ C, U, from: 'standard' });
	}
	expect(dischargeCoefficient(type, end * 1.001)).toEqual({ C, from: 'above the limit' });
});

// Source: ISO 5167-4:2003, Annex B, indicative values (from memory, verify).
test.each([
	['as_cast', 6e4, 0.966, 0.025],
	['as_cast', 1.5e5, 0.982, 0.015],
	['machined', 5e4, 0.97, 0.03],
	['machined', 1e5, 0.977, 0.025],
	['rough_welded', 1e5, 0.98, 0.025],
] as const)('%s at Re_D %d: the indicative table says %d, good to %d', (type, reynolds, C, U) => {
	const found = dischargeCoefficient(type, reynolds);
	expect(found.from).toBe('indicative table');
	expect(found.C).toBeCloseTo(C, 12);
	// Between two points the larger of their uncertainties stands.
	expect(found.U).toBeGreaterThanOrEqual(U);
});

test('below the first point of the table there is no coefficient with an uncertainty', () => {
	expect(dischargeCoefficient('as_cast', 3.6e4)).toEqual({ C: 0.984, from: 'below the table' });
});

test('the formula of the Venturi nozzle is not used: the coefficient does not depend on beta', () => {
	// 0.9858 - 0.196 beta^4.5 at beta 0.7 would be 0.946.
	expect(dischargeCoefficient('machined', 5e5).C).toBe(0.995);
});

test('below 2e5 the coefficient only falls as the flow falls', () => {
	const types = fc.constantFrom('as_cast', 'machined', 'rough_welded');
	fc.assert(
		fc.property(types, fc.double({ min: 5.1e4, max: 1.99e5, noNaN: true }), (type, reynolds) => {
			const here = dischargeCoefficient(type, reynolds).C;
			expect(dischargeCoefficient(type, reynolds * 0.99).C).toBeLessThan(here);
			expect(here).toBeLessThan(dischargeCoefficient(type, 2e5).C);
		}),
	);
});
