import type { AdequacyInputs } from './adequacy-inputs';
import type { DecaySample } from './decay-fit';
import { EXCHANGES_FOR_FORECAST } from './forecast';
import { analyserReasons, analyserWarnings } from './live-analyser';
import type { PurgeNote, PurgeReason, Stretch } from './notes';
import { placeFit, thinned, type PlaceFit, type PlaceFitRefusal } from './place-fit';
import type { Place } from './place-input';
import { rise } from './rise';
import { runsTest } from './runs-test';
import type { Excluded } from './void-samples';

/** The readings of one place that count, on the basis of the limit. */
export type PlaceReadings = {
	readonly place: Place;
	readonly valid: readonly DecaySample[];
	/** The same as the analyser showed them. */
	readonly asRead: readonly DecaySample[];
	readonly excluded: readonly Excluded[];
	/** The larger of the guard of the procedure, the analyser's U and one step of its display. */
	readonly guard: number;
	/** Limit less guard. */
	readonly accept: number;
};

export type PlaceJudgement = PlaceReadings & {
	readonly last: DecaySample | undefined;
	/** Since when all valid readings lie at or below the line without a gap; null while the last one does not. */
	readonly adequateSince: number | null;
	readonly fitted:
		{ readonly ok: true; readonly value: PlaceFit } | { readonly ok: false; readonly error: PlaceFitRefusal };
};

/** Three readings are the fewest that can show a rise. */
const FEWEST_IN_HOLD = 3;
/** Two-sided 5 % of the runs test. */
const RUNS_Z = 1.96;

export function judgePlace(
	readings: PlaceReadings,
	at: { readonly fitFrom: number; readonly judgedAt: number; readonly longestGap: number },
): PlaceJudgement {
	const { place, valid, accept } = readings;
	const last = valid.at(-1);
	let adequateSince: number | null = null;
	let next = at.judgedAt;
	for (const { t, C } of valid.toReversed()) {
		if (C > accept || next - t > at.longestGap) break;
		adequateSince = t;
		next = t;
	}
	return {
		...readings,
		last,
		adequateSince,
		fitted: placeFit(valid, { begins: at.fitFrom, lag: place.lag, T90: place.T90 }),
	};
}

/** (b): all valid readings of the hold window at or below the line, without a gap, and no rise. (f), (g) come with them. */
export function placeReasons(
	{ place, valid, asRead, accept, guard, last }: PlaceJudgement,
	at: { readonly hold: Stretch; readonly begins: number; readonly longestGap: number },
): readonly PurgeReason[] {
	const b = { level: 'reason', criterion: 'b', place: place.tag } as const;
	const reasons: PurgeReason[] = [];
	const inHold = valid.filter(({ t }) => t >= at.hold.from && t <= at.hold.to);
	const above = inHold.filter(({ C }) => C > accept);
	const worst = above.reduce<DecaySample | undefined>(
		(most, each) => (each.C > (most?.C ?? 0) ? each : most),
		undefined,
	);
	if (worst !== undefined) {
		const facts = { oxygen: worst.C, t: worst.t, last: last?.C ?? worst.C };
		reasons.push({ ...b, kind: 'above-line', ...facts, accept, count: above.length });
	}
	if (inHold.length < FEWEST_IN_HOLD) {
		reasons.push({ ...b, kind: 'too-few-readings', count: inHold.length, least: FEWEST_IN_HOLD });
	}
	const gap = longestOf([at.hold.from, ...inHold.map(({ t }) => t), at.hold.to]);
	if (gap.to - gap.from > at.longestGap)
		reasons.push({ ...b, kind: 'gap-in-readings', ...gap, longest: at.longestGap });
	const slope = riseInHold(place, inHold);
	if (slope !== null && slope.low > 0) reasons.push({ ...b, kind: 'rising', ...slope });
	return [...reasons, ...analyserReasons(place, { asRead, begins: at.begins, guard })];
}

/** Samples closer than the analyser answers repeat each other; of fewer than three that are left, all are taken. */
export function riseInHold(place: Place, inHold: readonly DecaySample[]): ReturnType<typeof rise> {
	return rise(thinned(inHold, (3 * place.T90) / Math.LN10)) ?? rise(inHold);
}

/** What the fit has to say: it refuses a floor at the limit, and warns; it never makes a purge adequate. */
export function fitNotes(
	{ place, fitted, accept, guard, last }: PlaceJudgement,
	limit: number,
): { readonly reasons: readonly PurgeReason[]; readonly notes: readonly PurgeNote[] } {
	const of = { place: place.tag } as const;
	if (!fitted.ok) {
		return { reasons: [], notes: [{ level: 'remark', kind: 'fit-refused', ...of, because: fitted.error.kind }] };
	}
	const { fit, from, to, apart, exchanges } = fitted.value;
	const { Cf: floor, bounds, residuals, samples } = fit;
	const { high } = bounds.Cf;
	const notes: PurgeNote[] = [
		{ level: 'remark', kind: 'fit-window', ...of, from, to, samples, deadTime: place.lag, apart, exchanges },
	];
	const { z } = runsTest(residuals);
	if (z !== null && Math.abs(z) > RUNS_Z) notes.push({ level: 'warning', kind: 'residuals-in-runs', ...of, z });
	if (last !== undefined && floor > last.C + guard) {
		notes.push({ level: 'warning', kind: 'floor-above-readings', ...of, floor, last: last.C });
	}
	if (exchanges >= EXCHANGES_FOR_FORECAST && floor >= limit) {
		return {
			reasons: [{ level: 'reason', criterion: 'floor', kind: 'floor-above-limit', ...of, floor, limit }],
			notes,
		};
	}
	if (floor > 0.99 * accept) notes.push({ level: 'warning', kind: 'floor-close-to-line', floor, accept, ...of });
	else if (high !== null && high > accept) {
		notes.push({ level: 'warning', kind: 'floor-may-exceed-line', ...of, floor, high, accept });
	}
	return { reasons: [], notes };
}

export function placeNotes(
	{ place, excluded }: PlaceReadings,
	{ limit, moisture }: AdequacyInputs,
): readonly PurgeNote[] {
	const of = { level: 'remark', place: place.tag } as const;
	const excludedNotes = excluded.map((each): PurgeNote => ({ ...of, kind: 'samples-excluded', ...each }));
	if (place.basis === limit.basis) return [...excludedNotes, ...analyserWarnings(place)];
	const [credited, charged] = place.basis === 'dry' ? [moisture?.low ?? 0, 0] : [0, moisture?.high ?? 0];
	const bases = { basis: place.basis, limitBasis: limit.basis, credited, charged };
	return [...excludedNotes, { ...of, kind: 'basis-differs', ...bases }, ...analyserWarnings(place)];
}

function longestOf(times: readonly number[]): Stretch {
	const steps = times.slice(1).map((to, i) => ({ from: times[i] ?? to, to }));
	return steps.reduce((longest, each) => (each.to - each.from > longest.to - longest.from ? each : longest), {
		from: 0,
		to: 0,
	});
}
