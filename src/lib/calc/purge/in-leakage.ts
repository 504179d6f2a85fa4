import { OXYGEN_IN_AIR } from '../constants';

/**
 * In-leakage that a floor points to: the air that must enter beside a known inert flow.
 *
 *     Q_L = Q_I (Cf − Ci) / (x_air − Cf)
 *
 * @param Cf fitted floor [1]
 * @param inert Q_I flow [m³(n)/s], Ci its oxygen [1]
 * @returns Q_L [m³(n)/s], negative where the floor is below the inert gas: a sensor to check, not a tight plant;
 *          null where the floor is air
 *
 * Source: the floor of one mixed zone, solved for Q_L (derived).
 * Checked against: the way back from the floors of engineering check values A4 (test/calc/purge/in-leakage.test.ts).
 */
export const inLeakage = (Cf: number, { Q_I, Ci }: { Q_I: number; Ci: number }): number | null =>
	Cf < OXYGEN_IN_AIR ? (Q_I * (Cf - Ci)) / (OXYGEN_IN_AIR - Cf) : null;

/**
 * In-leakage at another suction: what leaks in belongs to the suction at which it was found.
 *
 *     Q₂ = Q₁ √(s₂/s₁)
 *
 * @param Q in-leakage found [m³(n)/s]
 * @param suction found s₁, now s₂, both below the atmosphere [Pa] > 0
 * @returns Q₂ [m³(n)/s], a lower bound: gaps may open wider
 *
 * Source: flow through an opening of fixed size, turbulent (common practice).
 * Checked against: 3 to 60 mbar is 4.5 times (test/calc/purge/in-leakage.test.ts).
 */
export const leakAtSuction = (Q: number, { found, now }: { found: number; now: number }): number =>
	Q * Math.sqrt(now / found);
