import type { AdequacyInputs } from './adequacy-inputs';
import type { Circuit } from './circuit';
import type { Bounds } from './decay-fit';
import { EXCHANGES_FOR_FORECAST } from './forecast';
import { inLeakage } from './in-leakage';
import { mixingFactor } from './mixing-factor';
import type { PurgeNote } from './notes';
import type { PlaceJudgement } from './place-judgement';
import type { PlaceFit } from './place-fit';

export type LeakEstimate = { readonly leak: number; readonly bounds: Bounds; readonly place: string };

/** What the fit of a place says about the circuit, with the inert flow of the time that it covers. */
export type CircuitByFit = {
	readonly leak: number | null;
	readonly bounds: Bounds;
	readonly mixing: number;
	readonly inertFlow: number;
};

/**
 * The leak behind a floor: all air that must enter, less the air that is listed (conveying, feeder, seal air); gas that
 * is listed as inert dilutes beside the metered one.
 */
export function circuitByFit(
	{ fit, from, to }: PlaceFit,
	{ given, circuit, lag }: { readonly given: AdequacyInputs; readonly circuit: Circuit; readonly lag: number },
): CircuitByFit | undefined {
	const metered = circuit.meanInert({ from: from - lag, to: to - lag });
	if (metered === null) return undefined;
	const listed = (medium: 'air' | 'inert gas'): number =>
		(given.listedFlows ?? []).reduce((sum, each) => (each.medium === medium ? sum + each.flow : sum), 0);
	const Q_I = metered + listed('inert gas');
	const leakAt = (Cf: number | null): number | null => {
		const air = Cf === null ? null : inLeakage(Cf, { Q_I, Ci: given.inertGas.oxygen });
		return air === null ? null : air - listed('air');
	};
	const leak = leakAt(fit.Cf);
	const air = Math.max(0, (leak ?? 0) + listed('air'));
	return {
		leak,
		bounds: { low: leakAt(fit.bounds.Cf.low), high: leakAt(fit.bounds.Cf.high) },
		mixing: mixingFactor(fit.lambda, { V: circuit.gas, Q_I, Q_L: air }),
		inertFlow: metered,
	};
}

/** One leak for the circuit: that of the place with the highest floor, among those whose samples span two exchanges. */
export function leakEstimate(
	fits: readonly { readonly place: PlaceJudgement; readonly byFit: CircuitByFit | undefined }[],
): LeakEstimate | undefined {
	const found = fits.flatMap(({ place: { place, fitted }, byFit }): LeakEstimate[] => {
		if (!fitted.ok || fitted.value.exchanges < EXCHANGES_FOR_FORECAST || byFit === undefined) return [];
		return byFit.leak === null ? [] : [{ leak: byFit.leak, bounds: byFit.bounds, place: place.tag }];
	});
	return found.reduce<LeakEstimate | undefined>(
		(most, each) => (most === undefined || each.leak > most.leak ? each : most),
		undefined,
	);
}

export function leakNotes(estimate: LeakEstimate | undefined, { suction = [] }: AdequacyInputs): readonly PurgeNote[] {
	if (estimate === undefined) return [];
	const { leak, bounds, place } = estimate;
	const notes: PurgeNote[] = [{ level: 'remark', kind: 'in-leakage', ...estimate, suction }];
	if (suction.length === 0) notes.push({ level: 'warning', kind: 'leak-without-suction' });
	if (!(leak > 0) || (bounds.low !== null && bounds.low <= 0)) {
		notes.push({ level: 'warning', kind: 'leak-asks-for-sensor-check', place, leak, low: bounds.low });
	}
	return notes;
}
