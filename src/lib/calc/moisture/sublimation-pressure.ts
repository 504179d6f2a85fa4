import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';

/**
 * Sublimation pressure of ice: how much vapour a gas below freezing can hold before rime grows on cold metal.
 *
 *     ln(p/p_t) = (1/θ) Σ aᵢ θ^bᵢ,   θ = T/T_t
 *
 * @param T temperature [K], 50 ≤ T ≤ 273.16
 * @returns p, sublimation pressure [Pa absolute]; a refusal outside the range
 *
 * Source: IAPWS R14-08(2011), Eq. (6); W. Wagner et al., J. Phys. Chem. Ref. Data 40 (2011) 043103.
 * Checked against: the same release, Table 3 (test/calc/moisture/sublimation-pressure.test.ts).
 */
export function sublimationPressure(T: number): Result<number, Refusal> {
	if (!(T >= ICE_MIN && T <= T_TRIPLE)) {
		return fail({ kind: 'out-of-range', input: 'temperature', value: T, min: ICE_MIN, max: T_TRIPLE, unit: 'K' });
	}
	const theta = T / T_TRIPLE;
	const sum = a.reduce((total, ai, i) => total + ai * theta ** (b[i] ?? 0), 0);
	return ok(P_TRIPLE * Math.exp(sum / theta));
}

export const ICE_MIN = 50;
/** Triple point of water: 273.16 K and 611.657 Pa (IAPWS R14-08). */
export const T_TRIPLE = 273.16;
export const P_TRIPLE = 611.657;

// IAPWS R14-08(2011), Table 2, coefficients of Eq. (6).
const a = [-0.212144006e2, 0.273203819e2, -0.61059813e1];
const b = [0.333333333e-2, 0.120666667e1, 0.170333333e1];
