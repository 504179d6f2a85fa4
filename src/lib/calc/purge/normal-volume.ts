import type { Kelvin, PascalAbsolute } from '../../quantity';
import { P_N, T_N } from '../constants';

/**
 * Amount of gas in a circuit as volume in the normal state: what an inert gas meter has to replace. A hot circuit holds
 * less gas than its size says.
 *
 *     V_n = V (p/p_n) (T_n/T)
 *
 * @param V free volume [m³]
 * @param state pressure p [Pa absolute], temperature T [K] of the gas in it
 * @returns V_n [m³(n)]
 *
 * Source: ideal gas law; normal state of DIN 1343 (from memory, verify).
 * Checked against: 600 m³ at 80 °C hold 464.080 m³(n) (test/calc/purge/normal-volume.test.ts).
 */
export const normalVolume = (V: number, { pressure, temperature }: LoopState): number =>
	V * (pressure / P_N) * (T_N / temperature);

export type LoopState = { readonly pressure: PascalAbsolute; readonly temperature: Kelvin };
