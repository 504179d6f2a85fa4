import { V_M } from '../constants';

/**
 * Normal flow of a gas from its amount: the same number at every temperature and pressure of the duct.
 *
 *     q_n = q_m V_m / M
 *
 * @param massFlow q_m [kg/s]
 * @param molarMass M, of the moist gas [kg/mol]
 * @returns q_n, wet, at 0 °C and 101 325 Pa [m³(n)/s]
 *
 * Source: definition; V_m of an ideal gas.
 * Checked against: fluids cases with compositions, and worked by hand (test/calc/flow/normal-flow.test.ts).
 */
export const normalFlow = (massFlow: number, molarMass: number): number => (massFlow * V_M) / molarMass;

/**
 * Dry part of a normal flow.
 *
 *     q_n,dry = q_n (1 − x_w)
 *
 * @param wet q_n, wet [m³(n)/s]
 * @param waterVapour x_w, mole of water per mole of wet gas [1], 0 ≤ x_w < 1
 * @returns q_n,dry [m³(n)/s]
 *
 * Source: definition.
 * Checked against: worked by hand (test/calc/flow/normal-flow.test.ts).
 */
export const dryFlow = (wet: number, waterVapour: number): number => wet * (1 - waterVapour);
