import type { Result } from '../../base';
import type { Refusal } from '../calculator';
import { MOLAR_MASS, type Gas } from '../constants';
import { mixed, type Composition } from './composition';
import { insideFit } from './inside-fit';

/**
 * Dynamic viscosity of a gas mixture: sets the Reynolds number, and with it whether a flow coefficient holds.
 *
 *     μ = Σᵢ xᵢ μᵢ / Σⱼ xⱼ φᵢⱼ
 *     φᵢⱼ = [1 + (μᵢ/μⱼ)^½ (Mⱼ/Mᵢ)^¼]² / √(8 (1 + Mᵢ/Mⱼ))
 *
 * @param x xᵢ, mole fractions of the moist gas [1], Σ xᵢ = 1
 * @param temperature T [K], 273 ≤ T ≤ 623
 * @returns μ, dynamic viscosity [Pa s]; a refusal outside the range of the fits
 *
 * Source: C. R. Wilke, J. Chem. Phys. 18 (1950) 517; pure gases fitted to CoolProp 8.0.0 (largest deviation: N2 0.28 %,
 * O2 0.26 %, CO2 0.04 %, Ar 0.23 %, H2O 2.4 % at 274 K and below 0.7 % from 305 K up; CO is taken as N2).
 * Checked against: chemicals 1.1.2, chemicals.viscosity.Wilke (test/calc/gas/gas-viscosity.test.ts).
 */
export function gasViscosity(x: Composition, temperature: number): Result<number, Refusal> {
	return insideFit(temperature, (t) => mixed(x, (i) => mu(i, t) / mixed(x, (j) => phi(i, j, t))));
}

const mu = (gas: Gas, t: number): number => VISCOSITY[gas](t) * 1e-6;

const phi = (i: Gas, j: Gas, t: number): number =>
	(1 + Math.sqrt(mu(i, t) / mu(j, t)) * (MOLAR_MASS[j] / MOLAR_MASS[i]) ** 0.25) ** 2 /
	Math.sqrt(8 * (1 + MOLAR_MASS[i] / MOLAR_MASS[j]));

// Fits of CoolProp 8.0.0 at 101 325 Pa [µPa s], t = T/1000 K, 273 to 623 K.
const NITROGEN = (t: number): number => 2.57699 + 57.15279 * t - 20.28759 * t ** 2;
const VISCOSITY: { readonly [G in Gas]: (t: number) => number } = {
	N2: NITROGEN,
	O2: (t) => 2.31248 + 68.31432 * t - 23.85331 * t ** 2,
	CO2: (t) => -0.91323 + 58.13948 * t - 16.9309 * t ** 2,
	CO: NITROGEN,
	H2O: (t) => -0.06727 + 29.16486 * t + 11.15322 * t ** 2,
	Ar: (t) => 1.78429 + 77.76306 * t - 26.27313 * t ** 2,
};
