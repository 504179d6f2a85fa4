/**
 * Exchange rate: how often per second the gas of the circuit is renewed, with the part that really mixes.
 *
 *     λ = K (Q_I + Q_L) / V
 *
 * @param zone V free gas volume [m³(n)] > 0, K mixing factor [1] 0 < K ≤ 1, Q_I inert gas and Q_L air [m³(n)/s]
 * @returns λ [1/s]
 *
 * Source: oxygen balance of one mixed zone; K as in the annexes of NFPA 69 and CEN/TR 15281 (from memory, verify).
 * Checked against: engineering check values A1 and A4 (test/calc/purge/one-zone.test.ts).
 */
export const exchangeRate = ({ V, K, Q_I, Q_L }: Zone): number => (K * (Q_I + Q_L)) / V;

export type Zone = { readonly V: number; readonly K: number; readonly Q_I: number; readonly Q_L: number };
