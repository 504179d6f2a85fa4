import { expect, test } from 'vitest';
import { agreesWith } from '../../support/printed';
import { CIRCUIT, factsOf, kindsOf, run } from './venturi-support';

const relativeU = (inputs: unknown): number => {
	const { value, U } = run(inputs).values.dischargeCoefficient ?? {};
	return ((U ?? NaN) / (value ?? NaN)) * 100;
};

// ISO 5167-4:2003 for one 90 degree bend at beta 0.6 asks for 10 D (from memory, verify); 3 D in brackets is of this test.
const needed = { straightLengthNeeded: 10, straightLengthReduced: 3 };

test('long enough: the coefficient is as good as its type', () => {
	expect(agreesWith(relativeU({ ...CIRCUIT, ...needed, straightLength: 12 }), '1.5')).toBe(true);
	expect(kindsOf({ ...CIRCUIT, ...needed, straightLength: 12 })).not.toContain('straight-length-short');
});

// By hand: 6 m of a 1.2 m pipe are 5 D, between 3 and 10: 1.5 % + 0.5 % = 2.0 %, not the root of the squares, 1.58 %.
test('in the bracketed range half a percent is added, arithmetically, and the result stays in scope', () => {
	const inputs = { ...CIRCUIT, ...needed, straightLength: 6 };
	expect(agreesWith(relativeU(inputs), '2.00')).toBe(true);
	expect(factsOf(inputs, 'straight-length-reduced')).toMatchObject({
		level: 'warning',
		has: 5,
		needs: 10,
		added: 0.005,
	});
	expect(run(inputs).scope).toBe('in scope');
});

test('shorter still, or without a bracketed length, the standard does not hold', () => {
	for (const inputs of [
		{ ...CIRCUIT, ...needed, straightLength: 3 },
		{ ...CIRCUIT, straightLengthNeeded: 10, straightLength: 6 },
	]) {
		expect(factsOf(inputs, 'straight-length-short').level).toBe('outside scope');
		expect(run(inputs).scope).toBe('outside scope');
	}
});
