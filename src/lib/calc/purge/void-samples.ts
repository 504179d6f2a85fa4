import type { DecaySample } from './decay-fit';
import type { Range } from './notes';
import type { FLAGS, Point, Series } from './series-input';
import { OXYGEN_RANGE } from './shared-inputs';

export type VoidReason = (typeof FLAGS)[number] | 'out of range' | 'frozen';
/** Samples that do not count, and why. `ranges` are first and last times of neighbours. */
export type Excluded = { readonly why: VoidReason; readonly count: number; readonly ranges: readonly Range[] };

/**
 * Parts the samples that count from those that do not: flagged by the analyser, outside what it or any gas can read, or
 * so many equal values in a row that it has stopped measuring. Void samples are listed, and change nothing else.
 */
export function voidSamples(
	points: readonly Point[],
	rules: {
		readonly flagged: Series['flagged'];
		readonly range: { readonly from: number; readonly to: number };
		readonly identicalMost: number;
	},
): { readonly valid: readonly DecaySample[]; readonly excluded: readonly Excluded[] } {
	const low = Math.max(OXYGEN_RANGE.min, rules.range.from);
	const high = Math.min(OXYGEN_RANGE.max, rules.range.to);
	const judged = points.map(({ t, value }) => {
		const flag = rules.flagged?.find(({ from, to }) => t >= from && t <= to)?.flag;
		return { t, C: value, why: flag ?? (value >= low && value <= high ? undefined : ('out of range' as const)) };
	});
	const live = judged.filter(({ why }) => why === undefined);
	const frozen = new Set(runs(live).flatMap((run) => (run.length > rules.identicalMost ? run : [])));
	const all = judged.map((sample) => (frozen.has(sample) ? { ...sample, why: 'frozen' as const } : sample));
	return {
		valid: all.filter(({ why }) => why === undefined).map(({ t, C }) => ({ t, C })),
		excluded: excludedOf(all),
	};
}

/** Neighbours of equal value. */
function runs<S extends { readonly C: number }>(samples: readonly S[]): readonly (readonly S[])[] {
	const found: S[][] = [];
	for (const sample of samples) {
		const last = found.at(-1);
		if (last?.[0]?.C === sample.C) last.push(sample);
		else found.push([sample]);
	}
	return found;
}

function excludedOf(
	samples: readonly { readonly t: number; readonly why: VoidReason | undefined }[],
): readonly Excluded[] {
	const found = new Map<VoidReason, { count: number; ranges: [number, number][] }>();
	samples.forEach(({ t, why }, i) => {
		if (why === undefined) return;
		const entry = found.get(why) ?? { count: 0, ranges: [] };
		found.set(why, entry);
		entry.count += 1;
		const last = entry.ranges.at(-1);
		if (last !== undefined && samples[i - 1]?.why === why) last[1] = t;
		else entry.ranges.push([t, t]);
	});
	return [...found].map(([why, { count, ranges }]) => ({ why, count, ranges }));
}
