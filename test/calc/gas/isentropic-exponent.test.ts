import { expect, test } from 'vitest';
import { isentropicExponent } from '../../../src/lib/calc/gas/isentropic-exponent';
import { agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

const R = 8.31446261815324;
// Largest deviation that each fit states in its source.
const DEVIATION: Record<string, number> = { N2: 0.03, O2: 0.3, CO2: 0.2, CO: 0.1, H2O: 0.31, Ar: 0.01 };

// Independent: CoolProp 8.0.0 (test/vectors/gas/pure.json).
test.each(vector('gas/pure.json') as { gas: string; T: number; cp0: number }[])(
	'heat capacity of $gas at $T K is that of CoolProp within the deviation its fit states',
	({ gas, T, cp0 }) => {
		const kappa = isentropicExponent({ [gas]: 1 }, T);
		// kappa = cp/(cp - R), so cp = R kappa/(kappa - 1).
		const found = kappa.ok ? (R * kappa.value) / (kappa.value - 1) : Number.NaN;
		expect(agreesWithin(found, cp0, (DEVIATION[gas] ?? 0) / 100)).toBe(true);
	},
);

type Mixture = { name: string; x: Record<string, number>; T: number; kappa: number };
test.each(vector('gas/mixture.json') as Mixture[])('kappa of "$name" at $T K is $kappa to 0.1 %', ({ x, T, kappa }) => {
	const found = isentropicExponent(x, T);
	expect(found.ok && agreesWithin(found.value, kappa, 1e-3)).toBe(true);
});

test('outside 273 to 623 K the fit is not extrapolated but refused', () => {
	for (const T of [272, 624, Number.NaN]) {
		expect(isentropicExponent({ N2: 1 }, T)).toMatchObject({
			ok: false,
			error: { kind: 'out-of-range', min: 273, max: 623 },
		});
	}
});
