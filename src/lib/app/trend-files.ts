import { allOf, parseTrend, trendKey, type RecordEvent, type Trend } from '../record';
import type { Store } from '../store';

/** Trends already read, by `trendKey`. */
export type Trends = ReadonlyMap<string, Trend>;

export const NO_TRENDS: Trends = new Map();

/** The trends that a record names, those read before and those that the tablet holds by now. */
export async function trendsOf(
	events: readonly RecordEvent[],
	known: Trends,
	around: { readonly store: Store; readonly utcOffsetMinutes: number },
): Promise<Trends> {
	const missing = allOf(events, 'series attached')
		.map(({ body }) => body)
		.filter((body) => !known.has(trendKey(body)));
	if (missing.length === 0) return known;
	const trends = new Map(known);
	for (const body of missing) {
		const kept = await around.store.attachments.read(body.attachment.hash);
		if (!kept.ok || kept.value === undefined) continue;
		const trend = parseTrend(await kept.value.blob.text(), around.utcOffsetMinutes, body.reading);
		if (trend.ok) trends.set(trendKey(body), trend.value);
	}
	return trends;
}
