import { expect, test } from 'vitest';
import { molarMass } from '../../../src/lib/calc/gas/molar-mass';
import { agreesWith, agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Source: U.S. Standard Atmosphere 1976, Table 3 and Eq. (20): composition of dry air, and M0 = 28.9644 kg/kmol.
// Its 24 ppm of neon, helium and other traces are counted as nitrogen here, which adds 0.0003.
test('dry air weighs 28.96 g/mol', () => {
	const air = { N2: 0.78084 + 0.0000241, O2: 0.209476, Ar: 0.00934, CO2: 0.000314 };
	expect(agreesWith(molarMass(air) * 1e3, '28.96')).toBe(true);
});

type Mixture = { name: string; x: Record<string, number>; M: number };
test.each(vector('gas/mixture.json') as Mixture[])(
	'the mixture "$name" has the molar mass of its parts',
	({ x, M }) => {
		expect(agreesWithin(molarMass(x), M, 1e-12)).toBe(true);
	},
);
