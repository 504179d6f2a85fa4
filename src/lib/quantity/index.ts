/**
 * quantity: what a number means on the plant, its unit, and how it is typed, converted and printed.
 * Pure. The only place numbers change unit; what is ambiguous or of another kind is refused, never guessed.
 * May import: base.
 */
export { isQuantityName, QUANTITIES, type QuantityName } from './names';
export {
	kelvin,
	kelvinDifference,
	pascalAbsolute,
	pascalDifference,
	pascalGauge,
	si,
	type Kelvin,
	type KelvinDifference,
	type PascalAbsolute,
	type PascalDifference,
	type PascalGauge,
	type Si,
} from './brands';
export { GAS_CONSTANT, NORMAL_PRESSURE, NORMAL_TEMPERATURE } from './normal-state';
export { parseNumber, type NumberError, type NumberStyle } from './parse-number';
export { quantitiesIn, shownUnit, unitsFor } from './units';
export { absolutePressure, fromSi, toSi, type InSi, type Measure, type QuantityError } from './convert';
export { carbonMonoxideByMass, carbonMonoxideByVolume, molarVolume, STATES, type GasState } from './concentration';
export { print } from './print';
