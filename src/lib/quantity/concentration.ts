import { si, type Kelvin, type PascalAbsolute, type Si } from './brands';
import { GAS_CONSTANT, NORMAL_PRESSURE, NORMAL_TEMPERATURE } from './normal-state';

/** A concentration by mass means nothing without the state of the gas that the cubic metre was taken of. */
export type GasState = { readonly temperature: Kelvin; readonly pressure: PascalAbsolute };

/** "mg/m3(n)", and the two states in which workplace limits are printed. */
export const STATES = {
	normal: { temperature: si('temperature', NORMAL_TEMPERATURE), pressure: si('pressure-absolute', NORMAL_PRESSURE) },
	'20 degC': { temperature: si('temperature', 293.15), pressure: si('pressure-absolute', 101_325) },
	'25 degC': { temperature: si('temperature', 298.15), pressure: si('pressure-absolute', 101_325) },
} as const satisfies { readonly [name: string]: GasState };

/** V_m = R T / p [m3/mol], ideal gas. */
export const molarVolume = ({ temperature, pressure }: GasState): number => (GAS_CONSTANT * temperature) / pressure;

/** Carbon monoxide by volume (wet or dry, as its own quantity says) to mass per cubic metre of that gas in this state. */
export const carbonMonoxideByMass = (
	byVolume: Si<'carbon-monoxide-wet'> | Si<'carbon-monoxide-dry'>,
	state: GasState,
): number => (byVolume * CARBON_MONOXIDE) / molarVolume(state);

/** The way back: kg/m3 of this state to a volume fraction. The caller names the basis, which mass alone does not tell. */
export const carbonMonoxideByVolume = <Q extends 'carbon-monoxide-wet' | 'carbon-monoxide-dry'>(
	basis: Q,
	byMass: number,
	state: GasState,
): Si<Q> => si(basis, (byMass * molarVolume(state)) / CARBON_MONOXIDE);

// Molar mass of CO [kg/mol] from the IUPAC standard atomic weights C 12.0107, O 15.9994 (2009 and before).
const CARBON_MONOXIDE = 28.0101e-3;
