import type { Bounds } from './decay-fit';

/**
 * Everything that the two purge calculators say, as data with its facts; the wording room makes the sentences.
 * Oxygen is a fraction [1], times are seconds, flows m³(n)/s, volumes m³(n), all as in the calculators' outputs.
 */
export type PurgeNote = PurgeReason | PurgeWarning | PurgeRemark;

/** Which of the conditions (a) to (g) of an adequate purge is not met; `floor` stands beside them. */
export type Criterion = 'a' | 'b' | 'c' | 'd' | 'e' | 'f' | 'g' | 'floor';

type Reason<C extends Criterion, K extends string, Facts = unknown> = {
	readonly level: 'reason';
	readonly criterion: C;
	readonly kind: K;
} & Facts;
type Warning<K extends string, Facts = unknown> = { readonly level: 'warning'; readonly kind: K } & Facts;
type Remark<K extends string, Facts = unknown> = { readonly level: 'remark'; readonly kind: K } & Facts;

type OfVolume = { readonly volume: string; readonly title: string };
type OfPlace = { readonly place: string };
type From = { readonly from: number; readonly to: number };
type Limited = { readonly oxygen: number; readonly accept: number };

export type PurgeReason =
	// (a) coverage: cannot be shown
	| Reason<'a', 'not-covered', OfVolume & { readonly deadLeg: boolean }>
	| Reason<'a', 'covered-by-unknown-place', OfVolume & OfPlace>
	| Reason<'a', 'place-reads-another-volume', OfVolume & OfPlace & { readonly reads: string }>
	| Reason<'a', 'place-at-inert-inlet', OfVolume & OfPlace>
	| Reason<'a', 'outlet-not-read', OfVolume>
	| Reason<'a', 'outlet-read-outside-purge', OfVolume & { readonly t: number }>
	| Reason<'a', 'outlet-above-line', OfVolume & Limited>
	| Reason<'a', 'not-said-what-inerts-it', OfVolume>
	| Reason<'a', 'shut-off-above-line', OfVolume & Limited>
	// (b) readings of the hold window: not yet
	| Reason<'b', 'above-line', OfPlace & Limited & { readonly t: number; readonly count: number }>
	| Reason<'b', 'too-few-readings', OfPlace & { readonly count: number; readonly least: number }>
	| Reason<'b', 'gap-in-readings', OfPlace & From & { readonly longest: number }>
	| Reason<'b', 'rising', OfPlace & { readonly slope: number; readonly low: number }>
	// (c) hold: not yet
	| Reason<'c', 'hold-too-short', HoldFacts & { readonly held: number; readonly since: number; readonly from: string }>
	| Reason<'c', 'fan-below-next-gate', { readonly tag: string; readonly flow: number; readonly least: number }>
	| Reason<'c', 'cleaning-not-running'>
	| Reason<'c', 'damper-not-stroked', { readonly tag: string }>
	// (d) inert gas admitted: not yet
	| Reason<
			'd',
			'too-little-inert-gas',
			{ readonly admitted: number; readonly needed: number; readonly changes: number }
	  >
	// (e) unbroken flow: cannot be shown
	| Reason<'e', 'fan-broken', Break>
	| Reason<'e', 'inert-flow-broken', Break>
	| Reason<'e', 'outlet-broken', Break>
	// (f) live analysers: cannot be shown
	| Reason<'f', 'check-does-not-stand', OfPlace & { readonly state: string }>
	| Reason<'f', 'not-measuring', OfPlace & { readonly mode: string }>
	| Reason<'f', 'air-not-read', OfPlace & { readonly read: number | null }>
	| Reason<'f', 'has-not-moved', OfPlace & { readonly moved: number; readonly least: number }>
	| Reason<'f', 'no-valid-samples', OfPlace>
	// (g) unburnt gas: cannot be shown
	| Reason<'g', 'unburnt-gas-not-known', OfPlace>
	| Reason<'g', 'unburnt-gas', OfPlace & { readonly fraction: number; readonly most: number }>
	// the floor: cannot be shown
	| Reason<'floor', 'floor-above-limit', OfPlace & { readonly floor: number; readonly limit: number }>;

/** `record`: the tag or name whose trend has the gap. */
type Break = From & { readonly record: string; readonly why: 'no data' | 'stopped' };
/** Which of the four rules asks for the longest hold. */
export type HoldRule =
	'least hold' | 'response of the analysers' | 'filter cleaning cycle' | 'turns of the circuit gas';
type HoldFacts = { readonly needed: number; readonly rule: HoldRule };

export type PurgeWarning =
	| Warning<'mixing-assumed-good', { readonly mixing: number }>
	| Warning<'mixing-above-one', OfPlace & { readonly mixing: number }>
	| Warning<
			'above-allowed-oxygen',
			{ readonly target: number; readonly allowed: number; readonly limitingOxygen: number }
	  >
	| Warning<'limit-not-from-a-test-of-this-fuel', { readonly source: string }>
	| Warning<'floor-close-to-line', { readonly floor: number; readonly accept: number; readonly place: string | null }>
	| Warning<
			'floor-may-exceed-line',
			OfPlace & { readonly floor: number; readonly high: number; readonly accept: number }
	  >
	| Warning<'residuals-in-runs', OfPlace & { readonly z: number }>
	| Warning<'inert-flow-varied', { readonly least: number; readonly most: number }>
	| Warning<'unburnt-gas-limit-applies', { readonly place: string | null; readonly fraction: number }>
	| Warning<'carbon-dioxide-discharge'>
	| Warning<'leak-without-suction'>
	| Warning<'leak-scaled-with-suction', { readonly found: number; readonly now: number; readonly leak: number }>
	| Warning<'leak-asks-for-sensor-check', { readonly leak: number; readonly low: number | null }>
	| Warning<'no-dead-leg-named'>
	| Warning<'stock-too-small', StockFacts>
	| Warning<'stock-without-repeat', StockFacts>
	| Warning<'stated-not-recorded', { readonly record: string; readonly by: string }>;

type StockFacts = { readonly usable: number; readonly purge: number; readonly ratio: number };

export type PurgeRemark =
	| Remark<'unreachable', { readonly floor: number; readonly target: number; readonly leastInertFlow: number | null }>
	| Remark<'least-volume-changes-decide', { readonly byMixing: number; readonly least: number }>
	| Remark<
			'samples-excluded',
			OfPlace & { readonly why: string; readonly count: number; readonly times: readonly number[] }
	  >
	| Remark<
			'compared-as-read',
			OfPlace & { readonly basis: string; readonly limitBasis: string; readonly waterVapour: number }
	  >
	| Remark<
			'fit-window',
			OfPlace & From & { readonly samples: number; readonly deadTime: number; readonly apart: number }
	  >
	| Remark<'fit-refused', OfPlace & { readonly because: string }>
	| Remark<'forecast', OfPlace & Forecast & { readonly by: 'fit' | 'planning twin' }>
	| Remark<'covered-without-analyser', { readonly volumes: readonly string[]; readonly answer: string }>
	| Remark<'flow-broken-before-hold', Break>
	| Remark<'meter-gap-not-counted', From & { readonly meter: string }>
	| Remark<
			'in-leakage',
			{ readonly leak: number; readonly bounds: Bounds; readonly place: string; readonly suction: readonly Suction[] }
	  >
	| Remark<'slowest-place', OfPlace>;

/** First and last time of neighbouring samples [s]. */
export type Range = readonly [number, number];
type Suction = { readonly tag: string; readonly at: string; readonly pressure: number };
/** rough: below two exchanges, or without a fit. latest: with the slowest rate and the highest floor the samples allow. */
type Forecast = {
	readonly seconds: number | null;
	readonly latest: number | null;
	readonly gas: number | null;
	readonly rough: boolean;
};
