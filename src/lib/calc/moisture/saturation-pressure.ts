import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';

/**
 * Saturation pressure of water: how much vapour a gas at this temperature can hold before it starts to drip.
 *
 *     p_s = 10⁶ · [2C / (−B + √(B² − 4AC))]⁴
 *     θ = T + n₉/(T − n₁₀),  A = θ² + n₁θ + n₂,  B = n₃θ² + n₄θ + n₅,  C = n₆θ² + n₇θ + n₈
 *
 * @param T temperature [K], 273.15 ≤ T ≤ 647.096
 * @returns p_s, saturation pressure [Pa absolute]; a refusal outside the range, where ice or no liquid exists
 *
 * Source: IAPWS R7-97(2012), Eq. (30) and the coefficients printed with it.
 * Checked against: the same release, Table 35 (test/calc/moisture/saturation-pressure.test.ts).
 */
export function saturationPressure(T: number): Result<number, Refusal> {
	if (!(T >= T_MIN && T <= T_MAX)) {
		return fail({ kind: 'out-of-range', input: 'temperature', value: T, min: T_MIN, max: T_MAX, unit: 'K' });
	}
	const theta = T + n9 / (T - n10);
	const A = theta ** 2 + n1 * theta + n2;
	const B = n3 * theta ** 2 + n4 * theta + n5;
	const C = n6 * theta ** 2 + n7 * theta + n8;
	return ok(1e6 * ((2 * C) / (-B + Math.sqrt(B ** 2 - 4 * A * C))) ** 4);
}

/** Range of region 4 [K]: from 0 degC, a little below the triple point, to the critical point. */
export const T_MIN = 273.15;
export const T_MAX = 647.096;

// IAPWS R7-97(2012), Table 34, coefficients of Eqs. (29) to (31).
export const n1 = 0.11670521452767e4;
export const n2 = -0.72421316703206e6;
export const n3 = -0.17073846940092e2;
export const n4 = 0.1202082470247e5;
export const n5 = -0.32325550322333e7;
export const n6 = 0.1491510861353e2;
export const n7 = -0.48232657361591e4;
export const n8 = 0.40511340542057e6;
export const n9 = -0.23855557567849;
export const n10 = 0.65017534844798e3;
