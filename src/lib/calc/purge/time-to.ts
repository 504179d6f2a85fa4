import type { Sweep } from './oxygen-after';

/**
 * Time until a swept zone is down to a target.
 *
 *     t = ln((C0 − C_ss)/(Ct − C_ss)) / λ
 *
 * @param Ct target [1]
 * @param sweep C0 oxygen now [1], floor C_ss [1], rate λ [1/s] > 0
 * @returns t [s]; 0 when the oxygen is there already; null when the floor is at or above the target: it is never reached
 *
 * Source: the solution of the oxygen balance of one mixed zone, solved for t (derived).
 * Checked against: Branan, Rules of Thumb for Chemical Engineers, purging chart; engineering check values A1, A4
 * (test/calc/purge/one-zone.test.ts).
 */
export function timeTo(Ct: number, { C0, floor, rate }: Sweep): number | null {
	if (C0 <= Ct) return 0;
	if (!(Ct > floor)) return null;
	return Math.log((C0 - floor) / (Ct - floor)) / rate;
}
