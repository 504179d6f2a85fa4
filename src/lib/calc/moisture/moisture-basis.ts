import { MOLAR_MASS } from '../constants';

/**
 * Moisture as mole of water per mole of wet gas, from mole of water per mole of dry gas.
 *
 *     x_w = w / (1 + w)
 *
 * @param waterVapourDry w, mole of water per mole of dry gas [1], w ≥ 0
 * @returns x_w [1]
 *
 * Source: definition.
 * Checked against: worked by hand (test/calc/moisture/moisture-basis.test.ts).
 */
export const wetFromDryBasis = (waterVapourDry: number): number => waterVapourDry / (1 + waterVapourDry);

/**
 * Moisture as mole of water per mole of wet gas, from the humidity ratio of the gas.
 *
 *     x_w = Y / (Y + M_w/M_dry)
 *
 * The familiar 0.622 is M_w/M_dry of air; for 80 % carbon dioxide in nitrogen it is 0.44.
 *
 * @param humidityRatio Y, kilogram of water per kilogram of dry gas [kg/kg], Y ≥ 0
 * @param dryMolarMass M_dry, molar mass of the dry gas [kg/mol]
 * @returns x_w [1]
 *
 * Source: definition.
 * Checked against: psychrolib 2.5.0 for air (test/calc/moisture/moisture-basis.test.ts).
 */
export const wetFromHumidityRatio = (humidityRatio: number, dryMolarMass: number): number =>
	humidityRatio / (humidityRatio + MOLAR_MASS.H2O / dryMolarMass);

/**
 * A dry reading as the fraction in the wet gas, which is what an oxygen limit is about.
 *
 *     C_wet = C_dry (1 − x_w)
 *
 * @param dry C_dry, mole fraction in the dry gas [1]
 * @param waterVapour x_w, mole of water per mole of wet gas [1], 0 ≤ x_w < 1
 * @returns C_wet [1]
 *
 * Source: definition.
 * Checked against: worked by hand (test/calc/moisture/moisture-basis.test.ts).
 */
export const wetFromDry = (dry: number, waterVapour: number): number => dry * (1 - waterVapour);

/**
 * What an analyser behind a sample cooler shows, as the fraction in the truly dry gas: the cooler leaves some moisture.
 *
 *     C_dry = C_read / (1 − p_s(t_c)/p)
 *
 * @param read C_read, as shown [1]
 * @param saturation p_s(t_c), saturation pressure at the cooler's temperature [Pa absolute]
 * @param pressure p, pressure in the cell [Pa absolute], p > p_s
 * @returns C_dry [1]
 *
 * Source: Dalton's law; the sample leaves the cooler saturated.
 * Checked against: worked by hand with IAPWS R7-97 (test/calc/moisture/moisture-basis.test.ts).
 */
export const dryFromCooled = (read: number, saturation: number, pressure: number): number =>
	read / (1 - saturation / pressure);
