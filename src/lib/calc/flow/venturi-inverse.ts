import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';
import { findRoot } from '../purge/find-root';
import { expansibility, TAU_MIN } from './expansibility';
import { massFlow } from './mass-flow';

/** A Venturi tube and the gas in it; C is that of its type inside the Reynolds range. */
export type VenturiDuty = {
	readonly massFlow: number;
	readonly C: number;
	readonly D: number;
	readonly rho1: number;
	readonly p1: number;
	readonly kappa: number;
};

/**
 * Difference pressure that a flow makes: the range to order for a transmitter, or the value to expect at a set point.
 *
 *     q_m(Δp) = q_m,wanted,   0 < Δp ≤ 0.25 p₁
 *
 * @param duty wanted q_m [kg/s], C [1], D [m], ρ₁ [kg/m³], p₁ [Pa absolute], κ [1]
 * @param d throat diameter [m], 0 < d < D
 * @returns Δp [Pa]; a refusal where the flow would need a throat pressure below 0.75 p₁
 *
 * Source: the flow equation of ISO 5167-1, solved for Δp; ε changes with Δp, so not just the square of the flow.
 * Checked against: fluids 1.0.22 (test/calc/flow/venturi-inverse.test.ts).
 */
export function differencePressureForFlow(duty: VenturiDuty, d: number): Result<number, Refusal> {
	const most = (1 - TAU_MIN) * duty.p1;
	const excess = (dp: number) => flowThrough(duty, d, dp) - duty.massFlow;
	if (!(duty.massFlow > 0 && excess(most) >= 0)) {
		return fail({ kind: 'flow-beyond-meter', massFlow: duty.massFlow, most: flowThrough(duty, d, most) });
	}
	return ok(findRoot(excess, 0, most));
}

/**
 * Throat that makes a flow fill a range: sizing a tube for a transmitter at hand.
 *
 *     q_m(d) = q_m,wanted at Δp = range,   0.10 ≤ d/D ≤ 0.90
 *
 * @param duty wanted q_m [kg/s], C [1], D [m], ρ₁ [kg/m³], p₁ [Pa absolute], κ [1]
 * @param dp Δp at the wanted flow [Pa], 0 < Δp ≤ 0.25 p₁
 * @returns d [m]; a refusal where no throat between 0.10 D and 0.90 D gives that flow
 *
 * Source: the flow equation of ISO 5167-1, solved for d.
 * Checked against: fluids 1.0.22 (test/calc/flow/venturi-inverse.test.ts).
 */
export function throatForRange(duty: VenturiDuty, dp: number): Result<number, Refusal> {
	const tau = 1 - dp / duty.p1;
	if (!(tau >= TAU_MIN && tau < 1)) return fail({ kind: 'pressure-ratio-too-low', input: 'dp', tau, min: TAU_MIN });
	const excess = (d: number) => flowThrough(duty, d, dp) - duty.massFlow;
	const [least, most] = [0.1 * duty.D, 0.9 * duty.D];
	if (!(excess(least) <= 0 && excess(most) >= 0)) {
		const [slowest, fastest] = [flowThrough(duty, least, dp), flowThrough(duty, most, dp)];
		return fail({ kind: 'no-throat-fits', massFlow: duty.massFlow, least: slowest, most: fastest });
	}
	return ok(findRoot(excess, least, most));
}

function flowThrough(duty: VenturiDuty, d: number, dp: number): number {
	const epsilon = expansibility({ dp, p1: duty.p1, beta: d / duty.D, kappa: duty.kappa });
	return massFlow({ ...duty, epsilon, d, dp });
}
