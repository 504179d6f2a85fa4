import { MOLAR_MASS } from '../constants';
import { mixed, type Composition } from './composition';

/**
 * Molar mass of a gas mixture: moisture makes it lighter, carbon dioxide heavier.
 *
 *     M = Σ xᵢ Mᵢ
 *
 * @param x xᵢ, mole fractions of the gas as it flows, moisture included [1], Σ xᵢ = 1
 * @returns M, molar mass [kg/mol]
 *
 * Source: definition; molar masses of constants@1 from the standard atomic weights of IUPAC.
 * Checked against: engineering handbook values of dry air and a published mixture (test/calc/gas/molar-mass.test.ts).
 */
export const molarMass = (x: Composition): number => mixed(x, (gas) => MOLAR_MASS[gas]);
