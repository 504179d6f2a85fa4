import { QUANTITIES } from '../../quantity';
import type { OutputSpec } from '../calculator';
import { choice, measured, optional, withDefault, type Given } from '../read-inputs';

const gauge = { quantity: 'pressure-gauge', from: 'reading', min: 0, max: 3e7 } as const;
const normal = { quantity: 'volume-normal', min: 0 } as const;

/** Everything `inert-stock@1` can be told: nitrogen by pressure, carbon dioxide by weight. */
export const STOCK_INPUTS = {
	gas: withDefault(
		choice(['nitrogen', 'carbon dioxide'], { label: 'Inert gas', means: 'what is in the bottles', from: 'plant' }),
		'nitrogen',
	),
	bottles: withDefault(
		measured({
			...{ quantity: 'count', symbol: 'N', from: 'plant', min: 1, max: 1000 },
			label: 'Bottles',
			means: 'bottles that are open to the manifold, all at the same pressure',
		}),
		1,
	),
	waterVolume: optional(
		measured({
			...{ quantity: 'volume', symbol: 'V', from: 'plant', typedIn: 'L', min: 1e-4, max: 1000 },
			label: 'Size of one bottle',
			means: 'water volume of one bottle, as stamped on it',
		}),
	),
	pressure: optional(
		measured({
			...{ ...gauge, symbol: 'p', typedIn: 'bar(g)' },
			label: 'Pressure now',
			means: 'gauge pressure in the bottles, once they have come to rest',
		}),
	),
	leastPressure: withDefault(
		measured({
			...{ ...gauge, symbol: 'p_min', typedIn: 'bar(g)' },
			label: 'Pressure to stop at',
			means: 'gauge pressure below which the regulator no longer gives its flow',
		}),
		0,
	),
	barometer: withDefault(
		measured({
			...{ quantity: 'pressure-absolute', symbol: 'p_b', from: 'reading', min: 5e4, max: 1.1e5 },
			label: 'Barometer',
			means: 'absolute pressure of the air outside; it hardly matters here',
		}),
		101_325,
	),
	temperature: measured({
		...{ quantity: 'temperature', symbol: 'T', from: 'reading', min: 253.15, max: 323.15 },
		label: 'Temperature of the bottles',
		means: 'temperature of the gas in the bottles, once they have come to rest',
	}),
	mass: optional(
		measured({
			...{ quantity: 'mass', symbol: 'm', from: 'reading', min: 0 },
			label: 'Weight of the gas',
			means: 'net weight of the carbon dioxide in all bottles, by the scale',
		}),
	),
	purge: optional(
		measured({
			...{ ...normal, from: 'procedure' },
			label: 'Gas for one purge',
			means: 'inert gas that one purge takes, in the normal state',
		}),
	),
	reserve: withDefault(
		measured({ ...{ ...normal, from: 'site' }, label: 'Emergency reserve', means: 'kept back, and counted apart' }),
		0,
	),
	flow: optional(
		measured({
			...{ quantity: 'volume-flow-normal-dry', symbol: 'q', from: 'reading', min: 1e-9 },
			label: 'Use at present',
			means: 'normal flow of inert gas that is drawn at present',
		}),
	),
};

export type StockGiven = Given<typeof STOCK_INPUTS>;

const output = (name: string, means: string, quantity: keyof typeof QUANTITIES, symbol?: string): OutputSpec => ({
	...{ name, means, quantity, unit: QUANTITIES[quantity] },
	...(symbol === undefined ? {} : { symbol }),
});
export const STOCK_OUTPUTS: readonly OutputSpec[] = [
	output('usable', 'usable inert gas, down to the pressure to stop at', 'volume-normal', 'V_u'),
	output('content', 'all gas in the bottles', 'volume-normal', 'V_n'),
	output('ideal', 'what an ideal gas would promise', 'volume-normal'),
	output('compressibility', 'compressibility factor', 'number', 'Z'),
	output('contentMass', 'weight of the gas', 'mass', 'm'),
	output('left', 'usable gas less the reserve, this purge and one repeat', 'volume-normal'),
	output('lasts', 'how long it lasts at the present use, reserve kept', 'time'),
];
