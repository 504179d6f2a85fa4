import { OXYGEN_IN_AIR } from '../constants';
import { choice, measured, withDefault, type Given } from '../read-inputs';
import { output, OXYGEN_RANGE } from './shared-inputs';

const pressure = { quantity: 'pressure-absolute', from: 'procedure', min: 100, max: 1e7 } as const;

/** Everything `swing-purge@1` can be told. Pressures are absolute: a swing in gauge pressure is another swing. */
export const SWING_INPUTS = {
	lowPressure: measured({
		...pressure,
		symbol: 'p_low',
		label: 'Lower pressure',
		means: 'absolute pressure that the vessel is let down or evacuated to',
	}),
	highPressure: measured({
		...pressure,
		symbol: 'p_high',
		label: 'Upper pressure',
		means: 'absolute pressure that the vessel is filled to with inert gas',
	}),
	swing: withDefault(
		choice(['fast', 'held'], {
			label: 'Each swing is',
			means: 'fast, or held and topped up until its temperature has settled',
			from: 'procedure',
		}),
		'fast',
	),
	gas: withDefault(
		choice(['nitrogen', 'carbon dioxide'], { label: 'Inert gas', means: 'the inert gas', from: 'plant' }),
		'nitrogen',
	),
	startOxygen: withDefault(
		measured({
			...{ quantity: 'oxygen-wet', symbol: 'C0', from: 'reading', ...OXYGEN_RANGE },
			label: 'Oxygen at the start',
			means: 'oxygen in the vessel at the start',
		}),
		OXYGEN_IN_AIR,
	),
	inertOxygen: measured({
		...{ quantity: 'oxygen-wet', symbol: 'Ci', from: 'plant', ...OXYGEN_RANGE },
		label: 'Oxygen in the inert gas',
		means: 'oxygen in the inert gas; an inert gas generator is no pure nitrogen',
	}),
	target: measured({
		...{ quantity: 'oxygen-wet', symbol: 'Ct', from: 'procedure', ...OXYGEN_RANGE },
		label: 'Oxygen limit',
		means: 'limit that the vessel has to be below',
	}),
	guard: withDefault(
		measured({
			...{ quantity: 'fraction', from: 'procedure', typedIn: '%', ...OXYGEN_RANGE },
			label: 'Guard',
			means: 'kept between the oxygen and its limit',
		}),
		0,
	),
	volume: measured({
		...{ quantity: 'volume', symbol: 'V', from: 'plant', min: 1e-4 },
		label: 'Volume',
		means: 'free gas volume of the vessel with everything connected',
	}),
	temperature: measured({
		...{ quantity: 'temperature', symbol: 'T', from: 'reading', min: 200, max: 700 },
		label: 'Gas temperature',
		means: 'temperature of the gas once it has settled',
	}),
	branches: withDefault(
		choice(['none', 'present'], {
			label: 'Long branches',
			means: 'dead-ended pipes that the inert gas pushes their own gas into at every swing',
			from: 'plant',
		}),
		'none',
	),
};

export type SwingGiven = Given<typeof SWING_INPUTS>;

export const SWING_OUTPUTS = [
	output('swings', 'count', 'swings needed, whole', 'n'),
	output('exactSwings', 'number', 'swings by the formula'),
	output('oxygenAfter', 'oxygen-wet', 'oxygen after these swings', 'C_n'),
	output('inertGas', 'volume-normal', 'inert gas for all swings'),
] as const;
