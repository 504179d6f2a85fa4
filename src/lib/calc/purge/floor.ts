import { OXYGEN_IN_AIR } from '../constants';

/** Flows that enter a circuit, in the same state of gas, and the oxygen of the inert one. */
export type Entering = { readonly Q_I: number; readonly Q_L: number; readonly Ci: number };

/**
 * Floor: the oxygen that a sweep settles at and never falls below, because air leaks in beside the inert gas.
 *
 *     C_ss = (x_air Q_L + Ci Q_I) / (Q_L + Q_I)
 *
 * @param entering Q_I inert gas [m³(n)/s] > 0, Q_L air [m³(n)/s] ≥ 0, Ci oxygen in the inert gas [1]
 * @returns C_ss [1]
 *
 * Source: oxygen balance of one mixed zone in steady state (derived; no standard needed).
 * Checked against: scipy.integrate of the balance, engineering check values A4 (test/calc/purge/one-zone.test.ts).
 */
export const floor = ({ Q_I, Q_L, Ci }: Entering): number => (OXYGEN_IN_AIR * Q_L + Ci * Q_I) / (Q_L + Q_I);
