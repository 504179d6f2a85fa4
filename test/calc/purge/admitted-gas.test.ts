import { expect, test } from 'vitest';
import { admittedGas, flowOfTotaliser } from '../../../src/lib/calc/purge/admitted-gas';

const meter = (reads: 'flow' | 'totaliser', points: [number, number][], U = 0) => ({
	...{ tag: 'FT-241', medium: 'inert gas', reads, U },
	points: points.map(([t, value]) => ({ t, value })),
});

// By hand: trapezoids of 60 s at 0.2 to 0.3 and 0.3 to 0.3 m³(n)/s.
test('a flow meter is integrated with trapezoids', () => {
	const flow = meter('flow', [[0, 0.2], [60, 0.3], [120, 0.3]]); // prettier-ignore
	expect(admittedGas([flow], { from: 0, to: 120, longestGap: 60 }).value).toBeCloseTo(15 + 18, 12);
});

test('only gas inside the purge counts: steps are cut at its begin and at the judgement', () => {
	const flow = meter('flow', [[0, 0.2], [60, 0.2], [120, 0.2]]); // prettier-ignore
	expect(admittedGas([flow], { from: 30, to: 100, longestGap: 60 }).value).toBeCloseTo(0.2 * 70, 12);
});

test('a step longer than a gap admits nothing and is named', () => {
	const flow = meter('flow', [[0, 0.2], [60, 0.2], [300, 0.2], [360, 0.2]]); // prettier-ignore
	const admitted = admittedGas([flow], { from: 0, to: 360, longestGap: 60 });
	expect(admitted.value).toBeCloseTo(24, 12);
	expect(admitted.gaps).toEqual([{ meter: 'FT-241', from: 60, to: 300 }]);
});

test('a totaliser counts from its first to its last reading inside the purge, whatever lies between', () => {
	const counter = meter('totaliser', [[-60, 900], [30, 1000], [1800, 1400], [2000, 1500]]); // prettier-ignore
	expect(admittedGas([counter], { from: 0, to: 1900, longestGap: 60 }).value).toBe(400);
	expect(admittedGas([counter], { from: 0, to: 10, longestGap: 60 }).value).toBe(0);
});

test('several meters add up, and their uncertainties add in squares', () => {
	const window = { from: 0, to: 100, longestGap: 200 };
	const two = [meter('flow', [[0, 1], [100, 1]], 0.03), meter('totaliser', [[0, 0], [100, 40]], 0.1)]; // prettier-ignore
	expect(admittedGas(two, window)).toEqual({ value: 140, U: 5, gaps: [] });
});

test('a totaliser shows the flow between two of its readings', () => {
	expect(
		flowOfTotaliser(
			meter('totaliser', [
				[0, 0],
				[60, 12],
				[60, 12],
				[120, 18],
			]).points,
		),
	).toEqual([
		// prettier-ignore
		{ t: 0, value: 0.2 },
		{ t: 60, value: 0.2 },
		{ t: 60, value: 0.1 },
		{ t: 120, value: 0.1 },
	]);
});
