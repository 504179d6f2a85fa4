/**
 * Expansibility factor of a Venturi tube: the gas expands on its way into the throat, so less of it passes than of a
 * liquid of the same density.
 *
 *     ε = √{ [κ τ^(2/κ) / (κ−1)] · [(1−β⁴) / (1−β⁴ τ^(2/κ))] · [(1−τ^((κ−1)/κ)) / (1−τ)] },   τ = 1 − Δp/p₁
 *
 * The factors with κ−1 and with 1−τ are taken together, so that κ = 1 and Δp = 0, where the printed form is 0/0, are
 * ordinary values: (1−τ^a)/a → −ln τ for a = (κ−1)/κ → 0.
 *
 * @param dp Δp, difference pressure [Pa], 0 ≤ Δp ≤ 0.25 p₁
 * @param p1 p₁, pressure at the upstream tapping [Pa absolute]
 * @param beta β = d/D, diameter ratio [1], 0 < β < 1
 * @param kappa κ, isentropic exponent [1], κ ≥ 1
 * @returns ε [1], 0 < ε ≤ 1
 *
 * Source: ISO 5167-4:2003, 5.6, Eq. (4), valid for p₂/p₁ ≥ 0.75 (clause from memory, verify).
 * Checked against: fluids 1.0.22, nozzle_expansibility (test/calc/flow/expansibility.test.ts).
 */
export function expansibility({ dp, p1, beta, kappa }: Expansion): number {
	if (dp === 0) return 1;
	const lnTau = Math.log1p(-dp / p1);
	const a = (kappa - 1) / kappa;
	const work = a === 0 ? -lnTau : -Math.expm1(a * lnTau) / a;
	const tau2k = Math.exp((2 / kappa) * lnTau);
	const beta4 = beta ** 4;
	return Math.sqrt(((tau2k * (1 - beta4)) / (1 - beta4 * tau2k)) * (work / (dp / p1)));
}

/**
 * Expanded relative uncertainty of the expansibility factor.
 *
 *     U(ε)/ε = (4 + 100 β⁸) Δp/p₁ %
 *
 * @param dp Δp, difference pressure [Pa]
 * @param p1 p₁, pressure at the upstream tapping [Pa absolute]
 * @param beta β = d/D, diameter ratio [1]
 * @returns U(ε)/ε [1], k = 2
 *
 * Source: ISO 5167-4:2003, 5.7 (from memory, verify).
 * Checked against: worked by hand (test/calc/flow/expansibility.test.ts).
 */
export const expansibilityUncertainty = ({ dp, p1, beta }: Omit<Expansion, 'kappa'>): number =>
	((4 + 100 * beta ** 8) / 100) * (dp / p1);

/** Below this p2/p1 the equation is not valid. */
export const TAU_MIN = 0.75;

type Expansion = { readonly dp: number; readonly p1: number; readonly beta: number; readonly kappa: number };
