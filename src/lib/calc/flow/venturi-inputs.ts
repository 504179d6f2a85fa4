import { COMPOSITION_PARTS, compositionSchema, readComposition } from '../gas/composition';
import { pressureInputs } from '../gas/static-pressure';
import { choice, measured, measuredList, optional, shaped, withDefault, type Given } from '../read-inputs';

/** Everything `venturi-flow@1` can be told. What may be given in more than one way is optional here and checked after. */
export const VENTURI_INPUTS = {
	type: choice(['as_cast', 'machined', 'rough_welded'], {
		label: 'Convergent section',
		means: 'how the convergent section was made: as cast, machined, or rough-welded sheet iron (2022: fabricated)',
		from: 'plant',
	}),
	crossSection: withDefault(
		choice(['round', 'rectangular'], {
			label: 'Shape of the duct',
			means: 'shape of the duct; the standard knows round ones only',
			from: 'plant',
		}),
		'round',
	),
	pipeDiameter: measured({
		symbol: 'D',
		label: 'Pipe',
		means: 'inside diameter of the pipe at the upstream tapping',
		quantity: 'length',
		min: 0.01,
		max: 5,
		from: 'plant',
	}),
	throatDiameter: measured({
		symbol: 'd',
		label: 'Throat',
		means: 'diameter of the throat',
		quantity: 'length',
		min: 0.001,
		max: 5,
		from: 'plant',
	}),
	thermalExpansion: optional(
		measured({
			symbol: 'alpha',
			label: 'Thermal expansion',
			means: 'linear expansion of the tube, when D and d are those of the drawing at 20 degC; else they are as at work',
			quantity: 'thermal-expansion',
			min: 0,
			max: 5e-5,
			from: 'plant',
		}),
	),
	dp: optional(
		measured({
			symbol: 'dp',
			label: 'Difference pressure',
			means: 'difference pressure between the tappings, one reading',
			quantity: 'pressure-difference',
			from: 'reading',
		}),
	),
	dpSeries: optional(
		measuredList(
			{
				label: 'Difference pressure, series',
				means: 'difference pressure, a series; its mean is taken by roots',
				quantity: 'pressure-difference',
				from: 'series',
			},
			{ min: 2, max: 100_000 },
		),
	),
	signal: optional(
		measured({
			symbol: 'I',
			label: 'Signal of the transmitter',
			means: '4-20 mA signal of the transmitter',
			quantity: 'current',
			from: 'reading',
		}),
	),
	dpSpan: optional(
		measured({
			label: 'Difference pressure at 20 mA',
			means: 'difference pressure at 20 mA, the end of the range in use',
			quantity: 'pressure-difference',
			min: 1,
			from: 'instrument',
		}),
	),
	transmitter: withDefault(
		choice(['linear', 'root'], {
			label: 'Transmitter sends',
			means: 'what the transmitter sends: difference pressure, or its root',
			from: 'instrument',
		}),
		'linear',
	),
	controlSystem: withDefault(
		choice(['linear', 'root'], {
			label: 'Control system takes',
			means: 'whether the control system takes the root as well',
			from: 'plant',
		}),
		'linear',
	),
	lowFlowCutOff: withDefault(
		measured({
			label: 'Low-flow cut-off',
			means: 'part of the span below which the flow counts as zero; the root amplifies noise there',
			quantity: 'percent-of-span',
			min: 0,
			max: 0.05,
			from: 'instrument',
		}),
		0.01,
	),
	dpZero: optional(
		measured({
			label: 'Manifold equalised',
			means: 'what the transmitter reads with its manifold equalised: shows a plugged or wet impulse line',
			quantity: 'pressure-difference',
			from: 'reading',
		}),
	),
	...pressureInputs('at the upstream tapping'),
	temperature: measured({
		symbol: 'T',
		label: 'Temperature before',
		means: 'temperature of the gas at the upstream tapping',
		quantity: 'temperature',
		min: 200,
		max: 1500,
		from: 'reading',
	}),
	temperatureTaken: withDefault(
		choice(['upstream', 'downstream'], {
			label: 'Temperature is read',
			means: 'where the temperature is read',
			from: 'plant',
		}),
		'upstream',
	),
	composition: optional(
		shaped(
			compositionSchema,
			{
				symbol: 'x',
				label: 'Composition',
				means: 'mole fractions of N2, O2, CO2, CO, H2O, Ar; moist, or dry with the water below',
				quantity: 'composition',
				parts: COMPOSITION_PARTS,
				from: 'reading',
			},
			readComposition,
		),
	),
	waterVapour: optional(
		measured({
			symbol: 'x_w',
			label: 'Water',
			means: 'moisture as mole of water per mole of wet gas, when the composition is dry or unknown',
			quantity: 'water-vapour',
			min: 0,
			max: 0.99,
			from: 'reading',
		}),
	),
	compressibility: withDefault(
		measured({
			symbol: 'Z',
			label: 'Compressibility factor',
			means: 'compressibility factor',
			quantity: 'number',
			min: 0.2,
			max: 2,
			from: 'plant',
		}),
		1,
	),
	density: optional(
		measured({
			symbol: 'rho1',
			label: 'Density',
			means: 'density at the upstream tapping, when it is not to be calculated from the composition',
			quantity: 'density',
			min: 1e-3,
			max: 2e3,
			from: 'typed',
		}),
	),
	viscosity: optional(
		measured({
			symbol: 'mu1',
			label: 'Viscosity',
			means: 'dynamic viscosity, when it is not to be calculated from the composition',
			quantity: 'viscosity',
			min: 1e-6,
			max: 1,
			from: 'typed',
		}),
	),
	isentropicExponent: optional(
		measured({
			symbol: 'kappa',
			label: 'Isentropic exponent',
			means:
				'isentropic exponent, when it is not to be calculated from the composition; for a liquid a very large number',
			quantity: 'number',
			min: 1,
			from: 'typed',
		}),
	),
	dpCalibration: optional(
		choice(['valid', 'none'], {
			label: 'Certificate of the transmitter',
			means: 'calibration certificate of the transmitter',
			from: 'instrument',
		}),
	),
	dust: optional(
		choice(['none', 'present'], {
			label: 'Dust in the gas',
			means: 'whether the gas carries dust through the tube',
			from: 'plant',
		}),
	),
	flowCalibration: withDefault(
		choice(['none', 'in service'], {
			label: 'Calibrated with this gas',
			means: 'whether the tube was calibrated with the gas it meters',
			from: 'plant',
		}),
		'none',
	),
	throatCondition: optional(
		choice(['as drawn', 'worn or built up'], {
			label: 'Throat, last inspection',
			means: 'what the last inspection of the throat found',
			from: 'reading',
		}),
	),
	straightLength: optional(
		measured({
			label: 'Straight pipe before',
			means: 'straight pipe upstream of the tube',
			quantity: 'length',
			min: 0,
			from: 'plant',
		}),
	),
	straightLengthNeeded: optional(
		measured({
			label: 'Straight pipe asked for',
			means: 'straight pipe that the edition in force asks for at this fitting and beta, in pipe diameters',
			quantity: 'number',
			min: 0,
			from: 'site',
		}),
	),
	straightLengthReduced: optional(
		measured({
			label: 'Straight pipe, 0.5 % more',
			means:
				'straight pipe from which on 0.5 % is added to the uncertainty of C, in pipe diameters (in brackets in the table)',
			quantity: 'number',
			min: 0,
			from: 'site',
		}),
	),
	uncertaintyLimit: optional(
		measured({
			label: 'Largest uncertainty',
			typedIn: '%',
			means: 'largest relative expanded uncertainty of the mass flow that the site accepts',
			quantity: 'fraction',
			min: 0,
			max: 1,
			from: 'site',
		}),
	),
};

export type VenturiGiven = Given<typeof VENTURI_INPUTS>;
