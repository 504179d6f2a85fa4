import type { Result } from '../../base';
import type { Refusal } from '../calculator';
import { R, type Gas } from '../constants';
import { mixed, type Composition } from './composition';
import { insideFit } from './inside-fit';

/**
 * Isentropic exponent of a gas mixture: how it expands between the pipe and the throat of a Venturi tube.
 *
 *     κ = c_p⁰ / (c_p⁰ − R),   c_p⁰ = Σ xᵢ c_p,ᵢ⁰(T)
 *
 * @param x xᵢ, mole fractions of the moist gas [1], Σ xᵢ = 1
 * @param temperature T [K], 273 ≤ T ≤ 623
 * @returns κ, isentropic exponent [1]; a refusal outside the range of the fits
 *
 * Source: ideal-gas mixture; c_p⁰ fitted to CoolProp 8.0.0 (largest deviation: N2 0.03 %, O2 0.3 %, CO2 0.2 %,
 * CO 0.1 %, H2O 0.31 % at 274 K and below 0.13 % from 305 K up).
 * Checked against: CoolProp 8.0.0 for air and circuit gases (test/calc/gas/isentropic-exponent.test.ts).
 */
export function isentropicExponent(x: Composition, temperature: number): Result<number, Refusal> {
	return insideFit(temperature, (t) => {
		const heatCapacity = mixed(x, (gas) => HEAT_CAPACITY[gas](t));
		return heatCapacity / (heatCapacity - R);
	});
}

// Fits of CoolProp 8.0.0 ideal-gas heat capacities [J/(mol K)], t = T/1000 K, 273 to 623 K.
const HEAT_CAPACITY: { readonly [G in Gas]: (t: number) => number } = {
	N2: (t) => 29.9428 - 5.7354 * t + 10.0209 * t ** 2,
	O2: (t) => 27.9277 + 2.6282 * t + 7.2563 * t ** 2,
	CO2: (t) => 20.7984 + 65.4255 * t - 35.396 * t ** 2,
	CO: (t) => 29.8407 - 5.7125 * t + 11.1973 * t ** 2,
	H2O: (t) => 32.5149 + 0.526 * t + 9.7323 * t ** 2,
	Ar: () => 20.7863,
};
