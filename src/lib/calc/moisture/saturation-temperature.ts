import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';
import { n1, n10, n2, n3, n4, n5, n6, n7, n8, n9 } from './saturation-pressure';

/**
 * Saturation temperature of water: the temperature at which vapour of this partial pressure begins to condense.
 *
 *     T_s = ½ [n₁₀ + D − √((n₁₀ + D)² − 4 (n₉ + n₁₀ D))],   D = 2G / (−F − √(F² − 4EG))
 *     β = (p/10⁶)^¼,  E = β² + n₃β + n₆,  F = n₁β² + n₄β + n₇,  G = n₂β² + n₅β + n₈
 *
 * @param p partial pressure of the vapour [Pa absolute], 611.213 ≤ p ≤ 22.064·10⁶
 * @returns T_s, saturation temperature [K]; a refusal outside the range
 *
 * Source: IAPWS R7-97(2012), Eq. (31) and the coefficients of Table 34.
 * Checked against: the same release, Table 36 (test/calc/moisture/saturation-temperature.test.ts).
 */
export function saturationTemperature(p: number): Result<number, Refusal> {
	if (!(p >= P_MIN && p <= P_MAX)) {
		return fail({ kind: 'out-of-range', input: 'pressure', value: p, min: P_MIN, max: P_MAX, unit: 'Pa(a)' });
	}
	const beta = (p / 1e6) ** 0.25;
	const E = beta ** 2 + n3 * beta + n6;
	const F = n1 * beta ** 2 + n4 * beta + n7;
	const G = n2 * beta ** 2 + n5 * beta + n8;
	const D = (2 * G) / (-F - Math.sqrt(F ** 2 - 4 * E * G));
	return ok((n10 + D - Math.sqrt((n10 + D) ** 2 - 4 * (n9 + n10 * D))) / 2);
}

// IAPWS R7-97(2012), 8.2: saturation pressures at 273.15 K and at the critical point [Pa].
const P_MIN = 611.213;
const P_MAX = 22.064e6;
