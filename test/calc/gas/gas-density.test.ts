import { expect, test } from 'vitest';
import { gasDensity } from '../../../src/lib/calc/gas/gas-density';
import { agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Independent: CoolProp 8.0.0, air as a real gas (test/vectors/gas/density.json). Z of air at 20 degC is 0.99965.
test('an ideal gas is good to 0.1 % for air at 20 degC, and with its Z to 0.005 %', () => {
	const [air] = vector('gas/density.json') as { T: number; p: number; M: number; rho: number }[];
	if (air === undefined) throw new Error('no vector');
	const density = (compressibility: number) =>
		gasDensity({ pressure: air.p, temperature: air.T, molarMass: air.M, compressibility });
	expect(agreesWithin(density(1), air.rho, 1e-3)).toBe(true);
	expect(agreesWithin(density(0.99965), air.rho, 5e-5)).toBe(true);
});
