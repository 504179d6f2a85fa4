import { GAS_CONSTANT, NORMAL_PRESSURE, NORMAL_TEMPERATURE } from '../quantity';

/** Names this set of constants in every result. A changed constant is a new set, and old results keep theirs. */
export const CONSTANTS = 'constants@1';

// CODATA 2018, exact: 8.314 462 618 153 24 J/(mol K).
export const R = GAS_CONSTANT;

// DIN 1343 (from memory, verify): the normal state, which "m3(n)" refers to. Other standards call other states "standard".
export const T_N = NORMAL_TEMPERATURE;
export const P_N = NORMAL_PRESSURE;
/** Molar volume of an ideal gas in the normal state [m3/mol]: 22.413 969 5 L/mol. */
export const V_M = (R * T_N) / P_N;

/** 20 degC [K], at which workshop dimensions are stated (ISO 1). */
export const T_20 = 293.15;

/** Oxygen in dry air by volume. The accepted value is 20.946 %; 20.9 and 21 occur in standards. */
export const OXYGEN_IN_AIR = 0.2095;

// Standard atomic weights of IUPAC: molar masses [kg/mol].
export const MOLAR_MASS = {
	N2: 28.0134e-3,
	O2: 31.9988e-3,
	CO2: 44.0095e-3,
	CO: 28.0101e-3,
	H2O: 18.015_28e-3,
	Ar: 39.948e-3,
} as const;

export type Gas = keyof typeof MOLAR_MASS;

// CoolProp 8.0.0, PropsSI('D','T',273.15,'P',101325,fluid): real density in the normal state [kg/m3]. An ideal CO2 would
// be 1.96344, 0.7 % lighter.
export const NORMAL_DENSITY = {
	N2: 1.250386,
	O2: 1.429033,
	Ar: 1.783956,
	CO: 1.250501,
	CO2: 1.976813,
	air: 1.293066,
} as const;

/** Linear thermal expansion of plain carbon steel [1/K]: common practice, from memory, verify; a drawing overrides it. */
export const STEEL_EXPANSION = 1.2e-5;

/** Limits of a 4-20 mA signal that is a measurement [A]. NAMUR NE 43, from memory, verify: outside it is a fault. */
export const LIVE_SIGNAL = { min: 3.8e-3, max: 20.5e-3 } as const;
