import { R } from '../constants';

/**
 * Density of a gas: how heavy a cubic metre is in the duct, hot, moist and under suction as it flows.
 *
 *     ρ = p M / (Z R T)
 *
 * @param pressure p, static pressure [Pa absolute], p > 0
 * @param temperature T [K], T > 0
 * @param molarMass M of the moist gas [kg/mol]
 * @param compressibility Z [1]; 1 is good to 0.1 % for gases of the circuit near atmospheric pressure
 * @returns ρ, density [kg/m³]
 *
 * Source: equation of state of a gas with compressibility factor Z.
 * Checked against: CoolProp 8.0.0 for air at 20 °C (test/calc/gas/gas-density.test.ts).
 */
export const gasDensity = (gas: {
	readonly pressure: number;
	readonly temperature: number;
	readonly molarMass: number;
	readonly compressibility: number;
}): number => (gas.pressure * gas.molarMass) / (gas.compressibility * R * gas.temperature);
