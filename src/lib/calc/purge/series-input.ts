import * as v from 'valibot';
import { fail, ok, type Result } from '../../base';
import { toSi, type QuantityName } from '../../quantity';
import type { Refusal } from '../calculator';

/** What an analyser or its operator said about a stretch of its own readings. */
export const FLAGS = ['hold', 'back-purge', 'calibration', 'low sample flow', 'cooler alarm'] as const;

/**
 * Readings of one measuring point, as arrays: some hundreds of samples at four places stay small in a record.
 * Flags are stretches of time, so that they do not depend on the order in which samples arrive.
 */
export const seriesSchema = v.strictObject({
	unit: v.string(),
	/** Seconds since the zero of this purge. */
	t: v.array(v.number()),
	values: v.array(v.number()),
	flagged: v.optional(v.array(v.strictObject({ from: v.number(), to: v.number(), flag: v.picklist(FLAGS) }))),
});
export type Series = v.InferOutput<typeof seriesSchema>;
export type SeriesByTag = { readonly [tag: string]: Series };

export type Point = { readonly t: number; readonly value: number };

/** A series in SI units and in the order of time; at equal times the lower value first, whatever the order of arrival. */
export function readSeries(
	all: SeriesByTag,
	tag: string,
	quantity: QuantityName,
): Result<readonly Point[], readonly Refusal[]> {
	const series = Object.hasOwn(all, tag) ? all[tag] : undefined;
	if (series === undefined) return ok([]);
	const { t, values, unit } = series;
	const input = `series.${tag}`;
	if (t.length !== values.length) {
		return fail([{ kind: 'unequal-lengths', input, times: t.length, values: values.length }]);
	}
	const points: Point[] = [];
	for (const [i, typed] of values.entries()) {
		const time = t[i] ?? Number.NaN;
		if (!Number.isFinite(time)) return fail([{ kind: 'not-a-number', input: `${input}.t[${i}]` }]);
		const read = toSi({ value: typed, unit }, quantity);
		if (!read.ok) return fail([{ input: `${input}.values[${i}]`, ...read.error }]);
		points.push({ t: time, value: read.value.value });
	}
	return ok(points.sort((a, b) => a.t - b.t || a.value - b.value));
}
