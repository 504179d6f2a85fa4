import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';
import { measured, optional, shaped, typedMeasure, withDefault, type Given } from '../read-inputs';
import { cleaning, dampers, disturbances, fan, inertGas, listedFlows, outlet, suction } from './circuit-input';
import { coverageField } from './coverage-input';
import { placesField, type Basis } from './place-input';
import { readParts } from './read-parts';
import { seriesSchema } from './series-input';
import { OXYGEN_RANGE, volumesField } from './shared-inputs';

export type Limit = {
	readonly oxygen: number;
	readonly basis: Basis;
	readonly source: { readonly kind: string; readonly text: string };
};

const limit = shaped(
	v.strictObject({
		oxygen: typedMeasure,
		basis: v.picklist(['wet', 'dry']),
		source: v.object({ kind: v.string(), text: v.string() }),
	}),
	{ quantity: 'limit', means: 'oxygen limit with its basis and source', from: 'procedure' },
	(typed, at): Result<Limit, readonly Refusal[]> => {
		const quantity = typed.basis === 'wet' ? 'oxygen-wet' : 'oxygen-dry';
		const read = readParts(at, { oxygen: { typed: typed.oxygen, quantity, ...OXYGEN_RANGE } });
		if (!read.ok) return read;
		if (typed.source.text.trim() === '') return fail([{ kind: 'limit-without-source', input: `${at}.source` }]);
		return ok({ ...typed, oxygen: read.value.oxygen });
	},
);

/** Water vapour as proved, not as hoped: the lower bound may be credited, the upper bound is what it may cost. */
export type Moisture = { readonly low: number; readonly high: number | undefined; readonly source: string };

const moisture = shaped(
	v.strictObject({ low: typedMeasure, high: v.optional(typedMeasure), source: v.string() }),
	{ quantity: 'bounds of water vapour', symbol: 'x_w', means: 'proved bounds of the water vapour', from: 'reading' },
	(typed, at): Result<Moisture, readonly Refusal[]> => {
		const bounds = { quantity: 'water-vapour', min: 0, max: 0.9 } as const;
		const read = readParts(at, { low: { typed: typed.low, ...bounds }, high: { typed: typed.high, ...bounds } });
		if (!read.ok) return read;
		const { low, high } = read.value;
		if (high !== undefined && high < low) return fail([{ kind: 'bounds-crossed', input: at, low, high }]);
		return ok({ low, high, source: typed.source });
	},
);

/** Inputs of the adequacy. Times are seconds since the zero of this purge; series carry their own unit. */
export const adequacyFields = {
	zero: optional(
		shaped(v.string(), { quantity: 'instant', means: 'the instant of t = 0, for people and paper', from: 'series' }),
	),
	begins: measured({
		quantity: 'time',
		means: 'when inert gas, fan and outlet were on: the purge began',
		from: 'reading',
	}),
	judgedAt: optional(
		measured({
			quantity: 'time',
			means: 'when the purge is judged; left out: at the last valid sample',
			from: 'typed',
		}),
	),
	fitFrom: optional(
		measured({
			quantity: 'time',
			means: 'a later begin for the curves, after an interruption or another flow; it prints',
			from: 'typed',
		}),
	),
	limit,
	guard: measured({
		...{ quantity: 'fraction', from: 'procedure', ...OXYGEN_RANGE },
		means: 'kept between readings and the limit; an analyser with a larger U keeps more',
	}),
	moisture: optional(moisture),
	places: placesField,
	series: shaped(v.record(v.string(), seriesSchema), {
		...{ quantity: 'series by tag', from: 'series' },
		means: 'readings of every place, of the inert gas meters, the fan and the outlet',
	}),
	volumes: volumesField('every enclosed volume of the plant description, dead legs too'),
	coverage: coverageField,
	temperature: measured({
		...{ quantity: 'temperature', symbol: 'T', from: 'reading' },
		means: 'lowest temperature of the gas in the circuit during the purge',
	}),
	pressure: measured({
		...{ quantity: 'pressure-absolute', symbol: 'p', from: 'reading', min: 1 },
		means: 'highest pressure of the gas in the circuit during the purge',
	}),
	inertGas,
	fan,
	outlet,
	cleaning,
	dampers,
	disturbances: optional(disturbances),
	minimumVolumeChanges: optional(
		measured({ quantity: 'number', means: 'least volume changes of all connected volume', from: 'site', min: 0 }),
	),
	suction: optional(suction),
	listedFlows: optional(listedFlows),
	mixing: withDefault(
		measured({
			...{ quantity: 'fraction', symbol: 'K', from: 'site', min: 0.01, max: 1 },
			means: 'mixing factor of a rough forecast, used only while no fit carries one',
		}),
		0.5,
	),
	longestGap: withDefault(
		measured({
			quantity: 'time',
			means: 'longest time between two readings that still is no gap',
			from: 'site',
			min: 1,
			max: 600,
		}),
		120,
	),
	identicalMost: withDefault(
		measured({ quantity: 'count', means: 'more identical values in a row are void: frozen', from: 'site', min: 2 }),
		30,
	),
	leastHold: withDefault(measured({ quantity: 'time', means: 'shortest hold', from: 'site', min: 300 }), 300),
	flowRise: withDefault(
		measured({
			...{ quantity: 'fraction', from: 'site', min: 0.01, max: 1 },
			means: 'rise of the fan flow that asks for a new hold',
		}),
		0.1,
	),
};

export type AdequacyInputs = Given<typeof adequacyFields>;
