/**
 * Oxygen of a swept zone after a time.
 *
 *     C(t) = C_ss + (C0 − C_ss) e^(−λt)
 *
 * @param t time since the sweep began [s] ≥ 0
 * @param sweep C0 start [1], floor C_ss [1], rate λ [1/s]
 * @returns C [1]
 *
 * Source: solution of the oxygen balance of one mixed zone (derived).
 * Checked against: engineering check values A4 (test/calc/purge/one-zone.test.ts).
 */
export const oxygenAfter = (t: number, { C0, floor, rate }: Sweep): number =>
	floor + (C0 - floor) * Math.exp(-rate * t);

export type Sweep = { readonly C0: number; readonly floor: number; readonly rate: number };
