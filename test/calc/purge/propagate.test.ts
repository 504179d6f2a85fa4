import { expect, test } from 'vitest';
import { propagate } from '../../../src/lib/calc/purge/propagate';

const input = (name: string, x: number, U?: number) => ({ input: name, symbol: name, unit: '1', x, U });

test('a product adds relative uncertainties in squares', () => {
	const { U, budget } = propagate(([a = 0, b = 0]) => ({ y: a * b }), [input('a', 3, 0.06), input('b', 5, 0.05)]);
	// By hand: U/y = √(0.02² + 0.01²).
	expect(U.y! / 15).toBeCloseTo(Math.hypot(0.02, 0.01), 9);
	expect(budget.map(({ share }) => share)).toEqual([expect.closeTo(0.8, 9), expect.closeTo(0.2, 9)]);
	expect(budget[0]).toMatchObject({ output: 'y', input: 'a', U: 0.06, sensitivity: expect.closeTo(5, 9) as number });
});

test('an input without uncertainty takes no part, and an output without number has none', () => {
	const { U, budget } = propagate(([a = 0]) => ({ y: a, none: null }), [input('a', 2, 0.1), input('b', 7)]);
	expect(U).toEqual({ y: expect.closeTo(0.1, 12) as number });
	expect(budget).toHaveLength(1);
});

test('no uncertainty is stated where the output ends within it', () => {
	const { U } = propagate(([a = 0]) => ({ y: a > 1 ? null : a }), [input('a', 1, 0.1)]);
	expect(U).toEqual({});
});
