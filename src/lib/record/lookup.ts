import * as v from 'valibot';
import type { CalcResult } from '../calc';
import type { BoundReading, BoundSeries, Lookup } from '../procedure';
import type { Standing } from './answer';
import { trendKey } from './compose-series';
import { allOf, type EventOf, type RecordEvent } from './event';
import { millis, type Millis } from './instants';
import type { Trend } from './trend';

/** What a calculation step may ask of the record: the values that stand, as they were typed, at one instant. */
export function lookupIn(record: {
	readonly events: readonly RecordEvent[];
	readonly standing: Standing;
	/** Trend files already read, by `trendKey`. */
	readonly trends: ReadonlyMap<string, Trend>;
	/** Values typed into the calculation itself, by the path of its input. */
	readonly typed: { readonly [input: string]: unknown };
}): Lookup {
	const byId = new Map(record.events.map((event) => [event.id, event]));
	const entries = allOf(record.events, 'entry');
	/** The entry that counts; for a table the newest one that holds rows. */
	const entryOf = (step: string): EventOf<'entry'> | undefined => {
		const id = record.standing.steps.find((one) => one.step === step)?.entry;
		return entries.find((entry) => entry.id === id);
	};
	return {
		now: millis(record.standing.at),
		reading: (step, field) => {
			const entry = entryOf(step);
			const value = entry?.body.values?.find((one) => one.field === field);
			return entry === undefined || value === undefined ? undefined : readingOf(value, entry);
		},
		series: (step) => {
			const ids = entryOf(step)?.body.series ?? [];
			const attached = ids.map((id) => byId.get(id)).find((event) => event?.kind === 'series attached');
			if (attached?.kind !== 'series attached') return undefined;
			const trend = record.trends.get(trendKey(attached.body));
			return trend && seriesOf(attached, trend);
		},
		rows: (step) => {
			const entry = entryOf(step);
			return entry?.body.rows?.map(({ row, found, reading }) => ({
				row,
				found,
				...(reading === undefined ? {} : { reading: readingOf(reading, entry) }),
			}));
		},
		result: (step) => storedResult(entryOf(step)?.body.calculation),
		observed: (step) => entryOf(step)?.observedAt,
		person: (step) => entryOf(step)?.person,
		standing: (step) => {
			const state = record.standing.steps.find((one) => one.step === step)?.state;
			return state === undefined ? 'not known' : state === 'stands' ? 'stands' : 'does not stand';
		},
		typed: (input) => record.typed[input],
	};
}

/** A result as it was stored, which anybody can have written; what is none gives nothing. */
function storedResult(stored: unknown): CalcResult | undefined {
	return v.is(StoredResult, stored) ? (stored as unknown as CalcResult) : undefined;
}

const StoredResult = v.looseObject({
	values: v.record(v.string(), v.looseObject({ value: v.nullable(v.number()), unit: v.string() })),
});

type Reading = NonNullable<EventOf<'entry'>['body']['values']>[number];

function readingOf(value: Reading, entry: EventOf<'entry'>): BoundReading {
	const tag = value.point ?? value.instrument;
	return {
		typed: value.typed,
		unit: value.unit,
		at: value.observed === undefined ? entry.observedAt : millis(value.observed),
		...(value.basis === undefined ? {} : { basis: value.basis }),
		...(tag === undefined ? {} : { tag }),
		...(value.analyserMode === undefined ? {} : { mode: value.analyserMode }),
	};
}

/** Samples without a value are left out: a gap stays a gap. */
function seriesOf(attached: EventOf<'series attached'>, trend: Trend): BoundSeries | undefined {
	const zeroAt: Millis | undefined = trend.times[0];
	if (zeroAt === undefined) return undefined;
	const byTag = attached.body.points.flatMap(({ point, column, unit }) => {
		const values = trend.columns.find(({ name }) => name === (column ?? point))?.values;
		if (values === undefined) return [];
		const samples = trend.times.flatMap((time, i) => {
			const value = values[i];
			return value === undefined ? [] : [{ t: (time - zeroAt) / 1000, value }];
		});
		return [[point, { unit, t: samples.map(({ t }) => t), values: samples.map(({ value }) => value) }] as const];
	});
	return { zero: attached.body.from, zeroAt, byTag: Object.fromEntries(byTag) };
}
