import { allOf, parseTrend, type RecordEvent, type Trend } from '../record';
import type { Store } from '../store';

/** Trends already read, by the hash of their file. */
export type Trends = ReadonlyMap<string, Trend>;

export const NO_TRENDS: Trends = new Map();

/** The trends that a record names, those read before and those that the tablet holds by now. */
export async function trendsOf(
	events: readonly RecordEvent[],
	known: Trends,
	around: { readonly store: Store; readonly utcOffsetMinutes: number },
): Promise<Trends> {
	const missing = allOf(events, 'series attached')
		.map(({ body }) => body.attachment.hash)
		.filter((hash) => !known.has(hash));
	if (missing.length === 0) return known;
	const trends = new Map(known);
	for (const hash of missing) {
		const kept = await around.store.attachments.read(hash);
		if (!kept.ok || kept.value === undefined) continue;
		const trend = parseTrend(await kept.value.blob.text(), around.utcOffsetMinutes);
		if (trend.ok) trends.set(hash, trend.value);
	}
	return trends;
}
