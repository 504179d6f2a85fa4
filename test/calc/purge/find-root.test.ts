import fc from 'fast-check';
import { expect, test } from 'vitest';
import { findRoot } from '../../../src/lib/calc/purge/find-root';

test('the root of a cubic is found to the last digits', () => {
	// x³ = 2: the cube root of two, from the definition.
	expect(findRoot((x) => x ** 3 - 2, 0, 2)).toBeCloseTo(Math.cbrt(2), 15);
});

test('any zero of a straight line or an exponential is found, wherever its ends lie', () => {
	const anyRoot = fc.double({ min: -50, max: 50, noNaN: true });
	fc.assert(
		fc.property(anyRoot, fc.double({ min: 0.1, max: 30, noNaN: true }), (root, reach) => {
			const line = findRoot((x) => 3 * (x - root), root - reach, root + reach / 3);
			const bent = findRoot((x) => Math.expm1(x - root), root - reach, root + reach);
			expect(Math.abs(line - root)).toBeLessThan(1e-12);
			expect(Math.abs(bent - root)).toBeLessThan(1e-12);
		}),
	);
});

test('a root at an end is that end', () => {
	expect(findRoot((x) => x, 0, 3)).toBe(0);
	expect(findRoot((x) => x - 3, 0, 3)).toBe(3);
});

test('values whose product is too small for the processor still have their signs', () => {
	expect(findRoot((x) => 1e-200 * (x - 0.25), 0, 1)).toBeCloseTo(0.25, 12);
});

test('two ends of equal sign are a mistake of the program', () => {
	expect(() => findRoot((x) => x * x + 1, -1, 1)).toThrow(RangeError);
});
