import { OXYGEN_IN_AIR } from '../constants';

/**
 * Least inert flow that keeps the floor at a target in spite of the air that leaks in.
 *
 *     Q_I ≥ Q_L (x_air − Ct) / (Ct − Ci)
 *
 * @param Ct target for the floor [1]
 * @param entering Q_L air that leaks in [m³(n)/s] ≥ 0, Ci oxygen in the inert gas [1]
 * @returns Q_I [m³(n)/s]; null when the inert gas itself holds as much oxygen as the target: no flow is enough
 *
 * Source: the floor of one mixed zone, solved for Q_I (derived).
 * Checked against: engineering check values A4 (test/calc/purge/one-zone.test.ts).
 */
export const leastInertFlow = (Ct: number, { Q_L, Ci }: { Q_L: number; Ci: number }): number | null =>
	Ct > Ci ? (Q_L * (OXYGEN_IN_AIR - Ct)) / (Ct - Ci) : null;
