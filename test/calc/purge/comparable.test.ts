import { expect, test } from 'vitest';
import { comparable } from '../../../src/lib/calc/purge/comparable';

const waterVapour = { low: 0.1, high: 0.14 };

// Expected: C_w = C_d (1 − x_w), by hand.
test.each([
	{ what: 'dry under a dry limit stays', read: 'dry', limit: 'dry', expected: 0.08 },
	{ what: 'wet under a wet limit stays', read: 'wet', limit: 'wet', expected: 0.08 },
	{ what: 'dry under a wet limit is credited with the least moisture', read: 'dry', limit: 'wet', expected: 0.072 },
	{ what: 'wet under a dry limit is charged with the most', read: 'wet', limit: 'dry', expected: 0.08 / 0.86 },
] as const)('$what', ({ read, limit, expected }) => {
	expect(comparable(0.08, { read, limit, waterVapour })).toBeCloseTo(expected, 15);
});

test('without proof nothing is credited, and what would have to be charged is not known', () => {
	expect(comparable(0.08, { read: 'dry', limit: 'wet', waterVapour: { low: 0 } })).toBe(0.08);
	expect(comparable(0.08, { read: 'wet', limit: 'dry', waterVapour: { low: 0 } })).toBeNull();
});
