import type { Seen } from './circuit-input';
import type { Gap, Stretch } from './notes';
import type { Point } from './series-input';

/** A flow or a contact over time: what a recorder wrote, and what a person saw where it wrote nothing. */
export type Trend = { readonly record: string; readonly points: readonly Point[]; readonly seen: Seen | undefined };

/**
 * Where a trend does not show that something kept going: no reading for longer than the site allows, or a reading that
 * says it stood. A person can vouch for a time without readings, never against one.
 */
export function gapsIn(
	{ record, points, seen }: Trend,
	{ from, to }: Stretch,
	rules: { readonly longestGap: number; readonly stopped: number },
): readonly Gap[] {
	const before = points.findLast(({ t }) => t <= from);
	const inside = points.filter(({ t }) => t > from && t <= to);
	const after = points.find(({ t }) => t > to);
	const shown = [...(before === undefined ? [] : [before]), ...inside];
	const times = [before?.t ?? from, ...inside.map(({ t }) => t), after?.t ?? to];
	const silent = times.slice(1).flatMap((t, i): Gap[] => {
		const last = times[i] ?? from;
		const gap = { record, from: Math.max(last, from), to: Math.min(t, to), why: 'no data' } as const;
		const isLong = t - last > rules.longestGap || (shown.length === 0 && after === undefined);
		return isLong && gap.to > gap.from && !vouches(seen, gap) ? [gap] : [];
	});
	const stopped = shown.flatMap(({ t, value }, i): Gap[] => {
		if (value > rules.stopped || (i === 0 && before !== undefined && from - t > rules.longestGap)) return [];
		const until = Math.min(shown[i + 1]?.t ?? to, to);
		return until >= from ? [{ record, from: Math.max(t, from), to: until, why: 'stopped' }] : [];
	});
	return joined([...silent, ...stopped]);
}

const vouches = (seen: Seen | undefined, { from, to }: Stretch): boolean =>
	seen !== undefined && seen.from <= from && seen.to >= to;

/** Neighbouring gaps of one kind are one gap. */
function joined(gaps: readonly Gap[]): readonly Gap[] {
	const all: Gap[] = [];
	for (const gap of gaps) {
		const last = all.at(-1);
		if (last?.why === gap.why && last.to >= gap.from) all[all.length - 1] = { ...last, to: gap.to };
		else all.push(gap);
	}
	return all;
}

/** When a flow rose by more than a part of itself: each such rise stirs what the flow before did not reach. */
export function risesIn(points: readonly Point[], part: number): readonly number[] {
	const found: number[] = [];
	let level = Infinity;
	for (const { t, value } of points) {
		if (value > level * (1 + part) && level > 0) found.push(t);
		level = value > level * (1 + part) ? value : Math.min(level, value);
	}
	return found;
}

/** The value between two readings that are no gap apart; undefined where there is none. */
export function valueAt(points: readonly Point[], t: number, longestGap: number): number | undefined {
	const next = points.findIndex((point) => point.t >= t);
	const [a, b] = [points[next - 1], points[next]];
	if (b?.t === t) return b.value;
	if (a === undefined || b === undefined || b.t - a.t > longestGap) return undefined;
	return a.value + ((b.value - a.value) * (t - a.t)) / (b.t - a.t);
}
