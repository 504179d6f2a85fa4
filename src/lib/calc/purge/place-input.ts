import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';
import { all, shaped, typedMeasure } from '../read-inputs';
import { readParts } from './read-parts';
import { duplicates, OXYGEN_RANGE } from './shared-inputs';

export type Basis = 'wet' | 'dry';
/** A proof in the record: only what stands counts, and not knowing is not standing. */
export type Standing = 'stands' | 'does not stand' | 'not known';
export type Mode = 'measuring' | 'hold' | 'back-purge' | 'calibration' | 'fault' | 'not known';

/** One analyser at one place, with everything that decides whether its readings count. */
export type Place = {
	readonly tag: string;
	readonly title: string;
	/** Id of the volume that it reads. */
	readonly volume: string;
	readonly basis: Basis;
	readonly principle: string;
	readonly range: { readonly from: number; readonly to: number };
	readonly resolution: number | undefined;
	/** Transport lag of the sample line and time to 90 % of a step after it [s]. */
	readonly lag: number;
	readonly T90: number;
	/** Expanded uncertainty of a reading (k = 2) [1]. */
	readonly U: number | undefined;
	readonly check: Standing;
	readonly systemCheck: Standing;
	readonly airBefore: { readonly t: number; readonly oxygen: number } | undefined;
	readonly mode: Mode;
	readonly atInertInlet: boolean;
	readonly unburntGas: number | undefined;
};

const standing = v.picklist(['stands', 'does not stand', 'not known']);

const placeSchema = v.strictObject({
	tag: v.string(),
	title: v.string(),
	volume: v.string(),
	basis: v.picklist(['wet', 'dry']),
	principle: v.string(),
	range: v.strictObject({ from: typedMeasure, to: typedMeasure }),
	resolution: v.optional(typedMeasure),
	lag: typedMeasure,
	T90: typedMeasure,
	U: v.optional(typedMeasure),
	check: standing,
	systemCheck: v.optional(standing),
	airBefore: v.optional(v.strictObject({ t: v.number(), oxygen: typedMeasure })),
	mode: v.picklist(['measuring', 'hold', 'back-purge', 'calibration', 'fault', 'not known']),
	atInertInlet: v.optional(v.boolean()),
	unburntGas: v.optional(typedMeasure),
});

export const placesField = shaped(
	v.pipe(v.array(placeSchema), v.minLength(1)),
	{
		quantity: 'table of places',
		means: 'every place where oxygen is read, with its analyser: lag, response, checks, mode',
		from: 'instrument',
	},
	(rows, at): Result<readonly Place[], readonly Refusal[]> => {
		const twice = duplicates(
			rows.map(({ tag }) => tag),
			at,
		);
		return twice.length > 0 ? fail(twice) : all(rows.map((row, i) => readPlace(row, `${at}[${i}]`)));
	},
);

function readPlace(row: v.InferOutput<typeof placeSchema>, at: string): Result<Place, readonly Refusal[]> {
	const quantity = row.basis === 'wet' ? 'oxygen-wet' : 'oxygen-dry';
	const numbers = readParts(at, {
		resolution: { typed: row.resolution, quantity: 'fraction', min: 0, max: 0.05 },
		lag: { typed: row.lag, quantity: 'time', min: 0 },
		T90: { typed: row.T90, quantity: 'time', min: 0 },
		U: { typed: row.U, quantity: 'fraction', ...OXYGEN_RANGE },
		unburntGas: { typed: row.unburntGas, quantity: 'fraction', min: 0, max: 1 },
	});
	const range = readParts(`${at}.range`, {
		from: { typed: row.range.from, quantity, min: 0, max: 1 },
		to: { typed: row.range.to, quantity, min: 0, max: 1 },
	});
	const air = readParts(`${at}.airBefore`, { oxygen: { typed: row.airBefore?.oxygen, quantity, min: 0, max: 1 } });
	if (!(numbers.ok && range.ok && air.ok)) {
		return fail([numbers, range, air].flatMap((read) => (read.ok ? [] : read.error)));
	}
	return ok({
		...row,
		...numbers.value,
		range: range.value,
		systemCheck: row.systemCheck ?? 'not known',
		atInertInlet: row.atInertInlet ?? false,
		airBefore: row.airBefore && { t: row.airBefore.t, oxygen: air.value.oxygen ?? Number.NaN },
	});
}
