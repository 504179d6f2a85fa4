import { expect, test } from 'vitest';
import {
	CONSTANTS,
	LIVE_SIGNAL,
	MOLAR_MASS,
	NORMAL_DENSITY,
	OXYGEN_IN_AIR,
	P_N,
	R,
	T_N,
	V_M,
} from '../../src/lib/calc/constants';
import { agreesWith, agreesWithin } from '../support/printed';

test('the set of constants has a name that every result carries', () => {
	expect(CONSTANTS).toBe('constants@1');
});

// Source: CODATA 2018, molar gas constant, exact: 8.314 462 618 153 24 J/(mol K).
test('the gas constant is the exact one', () => {
	expect(agreesWith(R, '8.31446261815324')).toBe(true);
});

// Source: DIN 1343 (from memory, verify): 273.15 K and 101.325 kPa; CODATA 2018: 22.413 969 5 L/mol.
test('the normal state is 0 degC and 101 325 Pa, and a mole takes 22.4139695 litres there', () => {
	expect([T_N, P_N]).toEqual([273.15, 101_325]);
	expect(agreesWith(V_M * 1e3, '22.4139695')).toBe(true);
});

// Source: IUPAC atomic weights C 12.0107, N 14.0067, O 15.9994, H 1.00794, Ar 39.948 (2009 and before).
test('molar masses are the sums of their atoms', () => {
	const [C, N, O, H] = [12.0107, 14.0067, 15.9994, 1.00794];
	const sums = { N2: 2 * N, O2: 2 * O, CO2: C + 2 * O, CO: C + O, H2O: 2 * H + O, Ar: 39.948 };
	for (const [gas, sum] of Object.entries(sums)) {
		expect(agreesWithin(MOLAR_MASS[gas as keyof typeof MOLAR_MASS] * 1e3, sum, 1e-9), gas).toBe(true);
	}
});

// Independent: CoolProp 8.0.0 gave the real densities; an ideal gas is lighter by less than 0.1 %, CO2 by 0.7 %.
test('real gases in the normal state are a little denser than ideal ones, carbon dioxide by 0.7 %', () => {
	const excess = (gas: 'N2' | 'O2' | 'CO' | 'Ar' | 'CO2') => NORMAL_DENSITY[gas] / (MOLAR_MASS[gas] / V_M) - 1;
	for (const gas of ['N2', 'O2', 'CO', 'Ar'] as const) {
		expect(excess(gas)).toBeGreaterThan(0);
		expect(excess(gas)).toBeLessThan(1e-3);
	}
	expect(agreesWith(excess('CO2') * 100, '0.7')).toBe(true);
});

test('oxygen in dry air is 20.95 %, and a live signal is 3.8 to 20.5 mA', () => {
	expect(OXYGEN_IN_AIR).toBe(0.2095);
	expect(LIVE_SIGNAL).toEqual({ min: 0.0038, max: 0.0205 });
});
