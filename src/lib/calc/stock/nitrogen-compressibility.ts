import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';

/**
 * Compressibility of nitrogen in a bundle: at 300 bar an ideal gas would promise a seventh more than there is.
 *
 *     Z = 1 + Σᵢ Σⱼ aᵢⱼ xⁱ yʲ,   x = p/10 MPa, y = 300 K/T, i = 1 to 5, j = 0 to 3
 *
 * @param pressure p [Pa absolute], 0 < p ≤ 31 MPa
 * @param temperature T [K], 253.15 to 323.15
 * @returns Z [1], p V = Z n R T; a refusal outside the range of the fit
 *
 * Source: fitted to CoolProp 8.0.0, nitrogen (Span et al. 2000), largest deviation 0.02 %.
 * Checked against: CoolProp 8.0.0 at other points (test/calc/stock/nitrogen-compressibility.test.ts).
 */
export function nitrogenCompressibility(pressure: number, temperature: number): Result<number, Refusal> {
	if (!(temperature >= T_MIN && temperature <= T_MAX))
		return fail({ kind: 'out-of-range', input: 'temperature', value: temperature, min: T_MIN, max: T_MAX, unit: 'K' });
	if (!(pressure > 0 && pressure <= P_MAX))
		return fail({ kind: 'out-of-range', input: 'pressure', value: pressure, min: 0, max: P_MAX, unit: 'Pa(a)' });
	const x = pressure / 1e7;
	const y = 300 / temperature;
	return ok(
		COEFFICIENTS.reduce(
			(sum, [a0, a1, a2, a3], i) => sum + x ** (i + 1) * (a0 + a1 * y + a2 * y ** 2 + a3 * y ** 3),
			1,
		),
	);
}

const T_MIN = 253.15;
const T_MAX = 323.15;
const P_MAX = 3.1e7;

// Least squares over 29 temperatures and 63 pressures of CoolProp 8.0.0: a row per power of x, a column per power of y.
const COEFFICIENTS: readonly (readonly [number, number, number, number])[] = [
	[-0.052728, 0.334476, -0.318234, 0.018486],
	[0.294, -0.95601, 1.055772, -0.372693],
	[-0.309856, 0.99695, -1.089693, 0.406107],
	[0.108477, -0.345764, 0.373393, -0.137606],
	[-0.01243, 0.039288, -0.041967, 0.01525],
];
