import type { AdequacyInputs } from './adequacy-inputs';
import type { Admitted } from './admitted-gas';
import type { Circuit } from './circuit';
import { coverageNotes, coverageReasons, leastVolumeChanges } from './coverage';
import { forecast, type Forecast } from './forecast';
import { findHold, flowReasons, holdReasons, type Hold } from './hold';
import { circuitByFit, leakEstimate, leakNotes, type CircuitByFit, type LeakEstimate } from './leak-estimate';
import type { PurgeNote, PurgeReason } from './notes';
import {
	fitNotes,
	judgePlace,
	placeNotes,
	placeReasons,
	type PlaceJudgement,
	type PlaceReadings,
} from './place-judgement';
import { onLimitBasis } from './place-readings';

/** Everything that was found out about a purge, before it becomes values, sentences and pictures. */
export type PurgeJudgement = {
	readonly given: AdequacyInputs;
	readonly circuit: Circuit;
	readonly begins: number;
	readonly judgedAt: number;
	readonly places: readonly JudgedPlace[];
	readonly slowest: JudgedPlace | undefined;
	readonly hold: Hold;
	readonly admitted: Admitted;
	readonly needed: { readonly volumeChanges: number; readonly gas: number };
	/** Mean over the hold window. */
	readonly inertFlow: number | null;
	readonly leak: LeakEstimate | undefined;
	readonly reasons: readonly PurgeReason[];
	readonly notes: readonly PurgeNote[];
};
export type JudgedPlace = PlaceJudgement & {
	readonly byFit: CircuitByFit | undefined;
	readonly forecast: Forecast | undefined;
};

export function judgePurge(
	given: AdequacyInputs,
	read: { readonly places: readonly PlaceReadings[]; readonly circuit: Circuit; readonly judgedAt: number },
): PurgeJudgement {
	const { circuit, judgedAt } = read;
	const at = { begins: given.begins.value, judgedAt, longestGap: given.longestGap.value };
	const fitFrom = Math.max(at.begins, given.fitFrom?.value ?? at.begins);
	const judged = read.places.map((place) => judgePlace(place, { ...at, fitFrom }));
	const hold = findHold(given, circuit, { judged, ...at });
	const inertFlow = circuit.meanInert(hold.window);
	const fitted = judged.map((place) => {
		const fit = place.fitted.ok ? place.fitted.value : undefined;
		return { place, byFit: fit && circuitByFit(fit, { given, circuit, lag: place.place.lag }) };
	});
	const leak = leakEstimate(fitted);
	const places = fitted.map(({ place, byFit }): JudgedPlace => {
		return { ...place, byFit, forecast: forecastOf(place, { given, circuit, judgedAt, inertFlow, leak }) };
	});
	const volumeChanges = leastVolumeChanges(given);
	const found = {
		...{ given, circuit, begins: at.begins, judgedAt, places, hold, inertFlow, leak },
		slowest: slowestOf(places),
		admitted: circuit.admitted({ from: at.begins, to: judgedAt }),
		needed: { volumeChanges, gas: volumeChanges * circuit.gas },
	};
	return { ...found, reasons: reasonsOf(found), notes: notesOf(found) };
}

type Found = Omit<PurgeJudgement, 'reasons' | 'notes'>;

/** Every condition that is not met, in the order (a) to (g); the floor last. */
function reasonsOf(found: Found): readonly PurgeReason[] {
	const { given, circuit, places, hold, begins, judgedAt } = found;
	const at = { hold: hold.window, begins, longestGap: given.longestGap.value };
	const coverage = coverageReasons(given, {
		...{ places: given.places, begins, judgedAt, accept: given.limit.oxygen - given.guard.value },
		compared: ({ oxygen, basis }) => onLimitBasis(oxygen, basis, given),
	});
	const reasons = [
		...coverage,
		...places.flatMap((place) => placeReasons(place, at)),
		...holdReasons(given, circuit, hold, { begins, judgedAt }),
		...gasReasons(found),
		...flowReasons(hold),
		...places.flatMap((place) => fitNotes(place, given.limit.oxygen).reasons),
	];
	return reasons.toSorted((one, other) => ORDER.indexOf(one.criterion) - ORDER.indexOf(other.criterion));
}

/** (d): what the meter counted, less its U and that of the volume, is at least the volume changes asked for. */
function gasReasons({ admitted, needed, circuit }: Found): readonly PurgeReason[] {
	const U = Math.hypot(admitted.U, needed.volumeChanges * circuit.gasU);
	if (admitted.value - U >= needed.gas) return [];
	const facts = { admitted: admitted.value, U, needed: needed.gas, volumeChanges: needed.volumeChanges };
	return [{ level: 'reason', criterion: 'd', kind: 'too-little-inert-gas', ...facts }];
}

function notesOf(found: Found): readonly PurgeNote[] {
	const { given, places, hold, admitted, slowest, leak, inertFlow } = found;
	const notes: PurgeNote[] = [
		...limitNotes(given),
		...coverageNotes(given),
		...places.flatMap((place) => [...placeNotes(place, given), ...fitNotes(place, given.limit.oxygen).notes]),
		...places.flatMap(({ place, byFit }): PurgeNote[] =>
			byFit !== undefined && byFit.mixing > 1
				? [{ level: 'warning', kind: 'mixing-above-one', place: place.tag, mixing: byFit.mixing }]
				: [],
		),
		...admitted.gaps.map((gap): PurgeNote => ({ level: 'remark', kind: 'meter-gap-not-counted', ...gap })),
		...hold.earlier.map((gap): PurgeNote => ({ level: 'remark', kind: 'flow-broken-before-hold', ...gap })),
		...seenNotes(found),
		...varied(found),
		...leakNotes(leak, given),
	];
	for (const { place, forecast } of places) {
		if (forecast === undefined || forecast.seconds === 0) continue;
		const gas = forecast.seconds === null || inertFlow === null ? null : forecast.seconds * inertFlow;
		notes.push({ level: 'remark', kind: 'forecast', place: place.tag, ...forecast, gas, inertFlow });
	}
	if (slowest !== undefined) notes.push({ level: 'remark', kind: 'slowest-place', place: slowest.place.tag });
	return notes;
}

/** A limit holds for one fuel, one fineness, one inert gas and one igniter: a table's value is marked. */
function limitNotes({ limit: { source } }: AdequacyInputs): readonly PurgeNote[] {
	if (['report', 'supplier', 'site', 'demonstration'].includes(source.kind)) return [];
	return [{ level: 'warning', kind: 'limit-not-from-a-test-of-this-fuel', source: source.text }];
}

const seenNotes = ({ circuit }: Found): readonly PurgeNote[] =>
	[circuit.fan, circuit.inert, circuit.outlet].flatMap(({ record, seen }): PurgeNote[] =>
		seen === undefined ? [] : [{ level: 'warning', kind: 'seen-not-recorded', record, ...seen }],
	);

/** One curve through two inert flows is a curve through neither. */
function varied({ circuit: { inert }, begins, judgedAt }: Found): readonly PurgeNote[] {
	const flows = inert.points.filter(({ t }) => t >= begins && t <= judgedAt).map(({ value }) => value);
	if (flows.length === 0) return [];
	const [least, most] = [Math.min(...flows), Math.max(...flows)];
	return most > 1.25 * least ? [{ level: 'warning', kind: 'inert-flow-varied', least, most }] : [];
}

function forecastOf(
	{ last, accept, fitted }: PlaceJudgement,
	by: Pick<Found, 'given' | 'circuit' | 'judgedAt' | 'inertFlow' | 'leak'>,
): Forecast | undefined {
	if (last === undefined) return undefined;
	const twin =
		by.inertFlow === null
			? undefined
			: {
					...{ V: by.circuit.gas, K: by.given.mixing.value, Q_I: by.inertFlow },
					...{ Q_L: Math.max(0, by.leak?.leak ?? 0), Ci: by.given.inertGas.oxygen },
				};
	return forecast({ t: by.judgedAt, last: last.C, accept }, { fit: fitted.ok ? fitted.value : undefined, twin });
}

/** The place that holds up the purge: above its line by forecast and reading, else the last that came below it. */
function slowestOf(places: readonly JudgedPlace[]): JudgedPlace | undefined {
	const lateness = ({ adequateSince, forecast, last, accept }: JudgedPlace): readonly number[] => [
		adequateSince === null ? 1 : 0,
		adequateSince ?? (forecast === undefined ? Infinity : (forecast.seconds ?? Infinity)),
		(last?.C ?? 1) - accept,
	];
	return places.reduce<JudgedPlace | undefined>(
		(slowest, each) => (slowest === undefined || isLater(lateness(each), lateness(slowest)) ? each : slowest),
		undefined,
	);
}

const isLater = (one: readonly number[], other: readonly number[]): boolean => {
	const first = one.findIndex((value, i) => value !== other[i]);
	return first >= 0 && (one[first] ?? 0) > (other[first] ?? 0);
};

const ORDER: readonly PurgeReason['criterion'][] = ['a', 'b', 'c', 'd', 'e', 'f', 'g', 'floor'];
