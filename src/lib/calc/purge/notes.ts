import type { Bounds } from './decay-fit';

/**
 * Everything that the two purge calculators say, as data with its facts; the wording room makes the sentences.
 * Oxygen, uncertainty and bounds are fractions, times seconds, flows m³(n)/s, volumes m³(n), as in the outputs.
 * `place` and `tag` are tags of the plant description, `volume` an id of it.
 */
export type PurgeNote = PurgeReason | PurgeWarning | PurgeRemark;

/** A condition (a) to (g) of an adequate purge that is not met; the floor of the fit stands beside them. */
export type PurgeReason = {
	[C in Criterion]: {
		[K in keyof Reasons[C]]: Said<'reason', K, Reasons[C][K] & { readonly criterion: C }>;
	}[keyof Reasons[C]];
}[Criterion];
export type PurgeWarning = { [K in keyof Warnings]: Said<'warning', K, Warnings[K]> }[keyof Warnings];
export type PurgeRemark = { [K in keyof Remarks]: Said<'remark', K, Remarks[K]> }[keyof Remarks];

export type Criterion = keyof Reasons;

type Said<Level, Kind, Facts> = { readonly level: Level; readonly kind: Kind } & Facts;

type Reasons = {
	/** Coverage. Unmet: cannot be shown. */
	a: {
		'not-covered': OfVolume & { readonly deadLeg: boolean };
		'covered-by-unknown-place': OfVolume & OfPlace;
		'place-reads-another-volume': OfVolume & OfPlace & { readonly reads: string };
		'place-at-inert-inlet': OfVolume & OfPlace;
		'outlet-not-read': OfVolume;
		'outlet-read-outside-purge': OfVolume & { readonly t: number };
		'outlet-above-line': OfVolume & AgainstLine;
		'not-said-what-inerts-it': OfVolume;
		'shut-off-above-line': OfVolume & AgainstLine;
	};
	/** Readings of the hold window. Unmet: not yet. */
	b: {
		/** The worst reading of the window, the last one, and how many lie above the line. */
		'above-line': OfPlace & AgainstLine & { readonly t: number; readonly last: number; readonly count: number };
		'too-few-readings': OfPlace & { readonly count: number; readonly least: number };
		'gap-in-readings': OfPlace & Stretch & { readonly longest: number };
		/** Slope and its lower bound [1/s]. */
		rising: OfPlace & { readonly slope: number; readonly low: number };
	};
	/** Hold. Unmet: not yet. */
	c: {
		/** What the hold is counted from; null while a place is above its line. */
		'hold-too-short': {
			readonly needed: number;
			readonly rule: HoldRule;
			readonly held: number;
			readonly since: number | null;
			readonly by: HoldStartKind | null;
			readonly tag: string | null;
		};
		/** Actual flow [m³/s]. */
		'fan-below-next-gate': { readonly tag: string; readonly flow: number; readonly least: number };
		'cleaning-not-running': unknown;
		'damper-not-stroked': { readonly tag: string };
	};
	/** Inert gas admitted by its own meter, less its U. Unmet: not yet. */
	d: {
		'too-little-inert-gas': {
			readonly admitted: number;
			readonly U: number;
			readonly needed: number;
			readonly volumeChanges: number;
		};
	};
	/** Flow without a gap in the hold window. Unmet: cannot be shown. */
	e: { 'fan-broken': Gap; 'inert-flow-broken': Gap; 'outlet-broken': Gap };
	/** Live analysers. Unmet: cannot be shown. */
	f: {
		'check-does-not-stand': OfPlace & { readonly state: string };
		'not-measuring': OfPlace & { readonly mode: string };
		'air-not-read': OfPlace & { readonly read: number | null };
		'has-not-moved': OfPlace & { readonly moved: number; readonly least: number };
		'no-valid-samples': OfPlace;
	};
	/** No unburnt gas where a zirconia cell measures. Unmet: cannot be shown. */
	g: {
		'unburnt-gas-not-known': OfPlace;
		'unburnt-gas': OfPlace & { readonly fraction: number; readonly most: number };
	};
	/** The fitted floor. At or above the limit: cannot be shown. */
	floor: { 'floor-above-limit': OfPlace & { readonly floor: number; readonly limit: number } };
};

type Warnings = {
	'mixing-assumed-good': { readonly mixing: number };
	'mixing-above-one': OfPlace & { readonly mixing: number };
	'above-allowed-oxygen': { readonly target: number; readonly allowed: number; readonly limitingOxygen: number };
	'limit-not-from-a-test-of-this-fuel': { readonly source: string };
	/** The floor lies within 1 % of the line; `place` is null in a plan. */
	'floor-close-to-line': { readonly floor: number; readonly accept: number; readonly place: string | null };
	'floor-may-exceed-line': OfPlace & { readonly floor: number; readonly high: number; readonly accept: number };
	/** The curve does not describe the end: look at the flows, or choose a later begin for the fit. */
	'floor-above-readings': OfPlace & { readonly floor: number; readonly last: number };
	'residuals-in-runs': OfPlace & { readonly z: number };
	'inert-flow-varied': { readonly least: number; readonly most: number };
	'unburnt-gas-limit-applies': { readonly place: string | null; readonly fraction: number };
	'carbon-dioxide-discharge': unknown;
	'leak-without-suction': unknown;
	/** Suctions [Pa]; the leak that the plan uses. */
	'leak-scaled-with-suction': { readonly found: number; readonly now: number; readonly leak: number };
	/** Negative, or not different from nothing: never "gas-tight". */
	'leak-asks-for-sensor-check': OfPlace & { readonly leak: number; readonly low: number | null };
	'no-dead-leg-named': unknown;
	'stock-too-small': Stock;
	'stock-without-repeat': Stock;
	/** Inputs without a stated uncertainty: what rests on them has none. */
	'uncertainty-not-stated': { readonly inputs: readonly string[] };
	/** A person vouches for what no recorder shows. */
	'seen-not-recorded': Stretch & { readonly record: string; readonly by: string };
};

type Remarks = {
	unreachable: { readonly floor: number; readonly target: number; readonly leastInertFlow: number | null };
	'least-volume-changes-decide': { readonly byMixing: number; readonly least: number };
	'samples-excluded': OfPlace & { readonly why: string; readonly count: number; readonly ranges: readonly Range[] };
	/** Water vapour credited to a dry reading, or charged to a wet one. */
	'basis-differs': OfPlace & {
		readonly basis: string;
		readonly limitBasis: string;
		readonly credited: number;
		readonly charged: number;
	};
	/** What the fit used: from, to as sampled; the dead time taken off; the least distance of samples; λt. */
	'fit-window': OfPlace &
		Stretch & {
			readonly samples: number;
			readonly deadTime: number;
			readonly apart: number;
			readonly exchanges: number;
		};
	'fit-refused': OfPlace & { readonly because: string };
	/** seconds is null where the line is unreachable; latest: slowest rate and highest floor that the samples allow. */
	forecast: OfPlace & {
		readonly seconds: number | null;
		readonly latest: number | null;
		readonly gas: number | null;
		readonly inertFlow: number | null;
		readonly rough: boolean;
		readonly by: 'fit' | 'planning twin';
	};
	'covered-without-analyser': { readonly volumes: readonly string[]; readonly answer: string };
	'flow-broken-before-hold': Gap;
	'meter-gap-not-counted': Stretch & { readonly meter: string };
	'in-leakage': OfPlace & { readonly leak: number; readonly bounds: Bounds; readonly suction: readonly Suction[] };
	'slowest-place': OfPlace;
};

/** Which of the four rules asks for the longest hold. */
export type HoldRule =
	'least hold' | 'response of the analysers' | 'filter cleaning cycle' | 'turns of the circuit gas';
export type HoldStartKind =
	'purge begun' | 'readings' | 'damper moved' | 'fan started' | 'flow raised' | 'flow restored' | 'cleaning started';
/** First and last time of neighbouring samples [s]. */
export type Range = readonly [number, number];
export type Stretch = { readonly from: number; readonly to: number };
/** `record`: the tag or name of the trend that does not show it. */
export type Gap = Stretch & { readonly record: string; readonly why: 'no data' | 'stopped' };
/** A gauge pressure [Pa] somewhere in the circuit. */
export type Suction = { readonly tag: string; readonly at: string; readonly pressure: number };

type OfVolume = { readonly volume: string; readonly title: string };
type OfPlace = { readonly place: string };
type AgainstLine = { readonly oxygen: number; readonly accept: number };
type Stock = { readonly usable: number; readonly purge: number; readonly ratio: number };
