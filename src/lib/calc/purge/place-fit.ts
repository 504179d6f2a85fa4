import { fail, ok, type Result } from '../../base';
import { decayFit, type DecayFit, type DecayRefusal, type DecaySample } from './decay-fit';

/** Fewer points than this say nothing about a plant, whatever the routine can do with them. */
const FEWEST = 8;
/** From this part of the analyser's own rate on, the curve is the analyser's answer and not the plant's (common practice). */
const TOO_CLOSE_TO_ANALYSER = 0.5;

export type PlaceFit = {
	readonly fit: DecayFit;
	/** Seconds of the samples used, as sampled; and the distance that they were thinned to. */
	readonly from: number;
	readonly to: number;
	readonly apart: number;
	/** λ t: how many exchanges the samples span. Below two, floor and forecast are rough. */
	readonly exchanges: number;
	/** The curve at a time as sampled, lag included, and its standard error. */
	readonly curve: (t: number) => number;
	readonly curveError: (t: number) => number;
};

export type PlaceFitRefusal = DecayRefusal | { readonly kind: 'rate-of-the-analyser'; readonly lambdaTau: number };

/**
 * Fit of one place's purge. The gas of a moment is read a transport lag later, and is not fully shown before T90; samples
 * closer than three time constants of the analyser repeat each other. An analyser that answers as slowly as the plant is
 * exchanged would be fitted instead of the plant.
 *
 *     t' = t − begin − lag;  used from t' ≥ T90, at least 3 τ apart, τ = T90/ln 10;  refused where λτ ≥ 1/2
 *
 * @param samples t [s] and C [1], valid, on the basis of the limit
 * @param place begins [s], lag [s], T90 [s]
 * @returns the fit with its window [s], or why there is none
 *
 * Source: IEC 61207-1, T90 of a first-order analyser (from memory, verify); thinning: common practice.
 * Checked against: decays with known lag and response (test/calc/purge/place-fit.test.ts).
 */
export function placeFit(
	samples: readonly DecaySample[],
	place: { readonly begins: number; readonly lag: number; readonly T90: number },
): Result<PlaceFit, PlaceFitRefusal> {
	const tau = place.T90 / Math.LN10;
	const zero = place.begins + place.lag;
	const used = thinned(
		samples.filter(({ t }) => t - zero >= place.T90).map(({ t, C }) => ({ t: t - zero, C })),
		3 * tau,
	);
	if (used.length < FEWEST) return fail({ kind: 'too-few-samples', samples: used.length, least: FEWEST });
	const fit = decayFit(used, { neighbours: 'alike' });
	if (!fit.ok) return fit;
	const { lambda, Cf, C0, curveError } = fit.value;
	// Carried back to the begin it would be more than all of the gas: over before the second sample.
	if (C0 > 1) return fail({ kind: 'too-coarse' });
	if (lambda * tau >= TOO_CLOSE_TO_ANALYSER) return fail({ kind: 'rate-of-the-analyser', lambdaTau: lambda * tau });
	const last = used.at(-1)?.t ?? 0;
	return ok({
		...{ fit: fit.value, from: (used[0]?.t ?? 0) + zero, to: last + zero, apart: 3 * tau, exchanges: lambda * last },
		curve: (t) => Cf + (C0 - Cf) * Math.exp(-lambda * (t - zero)),
		curveError: (t) => curveError(t - zero),
	});
}

/** The first sample, and each next one that is far enough from the one before. */
export function thinned(samples: readonly DecaySample[], apart: number): readonly DecaySample[] {
	const kept: DecaySample[] = [];
	for (const sample of samples) {
		if (sample.t - (kept.at(-1)?.t ?? -Infinity) >= apart) kept.push(sample);
	}
	return kept;
}
