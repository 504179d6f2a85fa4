import fc from 'fast-check';
import { expect, test } from 'vitest';
import { propagate } from '../../src/lib/calc/uncertainty';

const model = ({ a = 0, b = 0, c = 0 }) => ({ sum: a + b, product: a * b, other: c });

// By hand: U(a + b) = sqrt(3^2 + 4^2) = 5; U(ab) = sqrt((20 x 3)^2 + (10 x 4)^2) = 72.1110.
test('a sum and a product of two readings, worked by hand', () => {
	const { U, budget, unstated } = propagate(model, [
		{ name: 'a', value: 10, U: 3, unit: '1' },
		{ name: 'b', symbol: 'B', value: 20, U: 4, unit: '1' },
	]);
	expect(U.sum).toBeCloseTo(5, 9);
	expect(U.product).toBeCloseTo(72.111, 3);
	expect(unstated).toEqual([]);
	const [a, b] = budget.filter((row) => row.output === 'sum');
	expect(a).toMatchObject({ input: 'a', U: 3, unit: '1' });
	expect(b).toMatchObject({ input: 'b', symbol: 'B', U: 4 });
	expect([a?.sensitivity, a?.share, b?.share].map((each) => each?.toFixed(6))).toEqual([
		'1.000000',
		'0.360000',
		'0.640000',
	]);
});

test('a result with an input of unknown uncertainty gets no U; a result that does not depend on it keeps its own', () => {
	const { U, unstated } = propagate(model, [
		{ name: 'a', value: 10, U: 3, unit: '1' },
		{ name: 'b', value: 20, unit: '1' },
		{ name: 'c', value: 5, U: 1, unit: '1' },
	]);
	expect(Object.keys(U)).toEqual(['other']);
	expect(U.other).toBeCloseTo(1, 9);
	expect(unstated).toEqual(['b']);
});

test('an input that is known exactly contributes nothing and stands in no budget', () => {
	const { U, budget } = propagate(model, [
		{ name: 'a', value: 10, U: 0, unit: '1' },
		{ name: 'b', value: 20, U: 4, unit: '1' },
	]);
	expect(U.sum).toBeCloseTo(4, 9);
	expect(budget.map((row) => row.input)).toEqual(['b', 'b']);
});

test('however small the uncertainty beside its value, the slope is not lost in the last digits', () => {
	fc.assert(
		fc.property(fc.double({ min: 1e-300, max: 1e-3, noNaN: true }), (U) => {
			const found = propagate(model, [
				{ name: 'a', value: 1e5, U, unit: '1' },
				{ name: 'b', value: 1, U: 0, unit: '1' },
			]);
			expect((found.U.sum ?? NaN) / U).toBeCloseTo(1, 6);
		}),
	);
});
