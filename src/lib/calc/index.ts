/**
 * calc: engineering calculators, one per file, each with its equation, units, range and source.
 * Pure: same inputs, same answer; what cannot be calculated is refused as data, never clamped.
 * May import: base, quantity.
 */
export type {
	BudgetRow,
	CalcNote,
	CalcResult,
	Calculator,
	CalcValue,
	CalculatorPage,
	InputPart,
	InputSource,
	InputSpec,
	OutputSpec,
	Plot,
	PlotAxis,
	PlotCurve,
	PlotMark,
	Refusal,
	Verdict,
} from './calculator';
export { CATALOGUE, latest, runCalculator } from './catalogue';
export { CONSTANTS, OXYGEN_IN_AIR } from './constants';
export { differencePressureForFlow, throatForRange, type VenturiDuty } from './flow/venturi-inverse';
export { dewPoint, type DewPoint } from './moisture/dew-point';
export {
	inputsFrom,
	placeOf,
	rowsTyped,
	titleOf,
	typedFrom,
	usualUnit,
	type TypedField,
	type TypedInputs,
} from './typed-inputs';
export { wetFromDry } from './moisture/moisture-basis';
export { allowedOxygen } from './purge/allowed-oxygen';
