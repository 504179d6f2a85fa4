import * as v from 'valibot';

/**
 * A start-up told as data: who did what, when, on which tablet. Played through the same rooms as on a tablet: outcomes are
 * computed from values and limits, calculations run, acts are judged, everything is signed.
 */
const Text = v.pipe(v.string(), v.minLength(1));
/** Plant local time: "2026-03-14T17:12:00". */
const Local = v.pipe(v.string(), v.regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d$/));

const Value = v.union([
	/** As typed; unit, basis, point and instrument come from the procedure and the plant description. */
	v.string(),
	v.strictObject({
		typed: v.string(),
		instrument: v.exactOptional(Text),
		readBy: v.exactOptional(Text),
		where: v.exactOptional(v.picklist(['at the plant', 'screen', 'portable'])),
		mode: v.exactOptional(v.picklist(['measuring', 'hold', 'back-purge', 'calibration', 'fault'])),
		observed: v.exactOptional(Local),
	}),
]);

const Row = v.union([
	v.string(),
	v.strictObject({
		found: v.string(),
		note: v.exactOptional(Text),
		/** For a swept volume: what was read at its outlet, and with what. */
		reading: v.exactOptional(
			v.strictObject({
				tag: Text,
				typed: v.string(),
				unit: Text,
				basis: v.exactOptional(v.picklist(['wet', 'dry'])),
				observed: v.exactOptional(Local),
			}),
		),
	}),
]);

const act = <const D extends string, E extends v.ObjectEntries>(does: D, entries: E) =>
	v.strictObject({
		at: Local,
		by: Text,
		/** The tablet; absent: the first of the file. */
		on: v.exactOptional(Text),
		do: v.literal(does),
		...entries,
	});

/** `photo`: a picture beside this file. */
const evidence = {
	photo: v.exactOptional(Text),
	observed: v.exactOptional(Local),
	note: v.exactOptional(Text),
	from: v.exactOptional(Local),
};

export const ActSchema = v.variant('do', [
	act('open', {
		startType: Text,
		title: Text,
		present: v.array(Text),
		inertGas: Text,
		controlSystem: Text,
		setPoints: Text,
		weather: v.exactOptional(Text),
	}),
	/** The shift's entry key, delegated by the gate key. */
	act('start shift', {}),
	act('enter', {
		step: Text,
		/** Only for what no limit decides: cannot do, not applicable. */
		outcome: v.exactOptional(v.picklist(['cannot do', 'not applicable', 'fail'])),
		reason: v.exactOptional(Text),
		values: v.exactOptional(v.record(v.string(), Value)),
		rows: v.exactOptional(v.record(v.string(), Row)),
		/** Ids of what was confirmed; absent: all. */
		confirmed: v.exactOptional(v.array(Text)),
		choice: v.exactOptional(Text),
		flow: v.exactOptional(v.picklist(['unbroken', 'broken', 'not looked at'])),
		...evidence,
	}),
	act('calculate', { step: Text, typed: v.exactOptional(v.record(v.string(), v.unknown())), ...evidence }),
	/** A trend file, attached by its hash, and the series step it proves. */
	act('attach', { step: Text, file: Text, ...evidence }),
	act('agree not applicable', { step: Text, reason: v.exactOptional(Text) }),
	act('event', {
		what: Text,
		item: v.exactOptional(Text),
		begin: Local,
		end: v.exactOptional(Local),
		seenBy: v.exactOptional(Text),
		note: v.exactOptional(Text),
	}),
	/** Ends the newest event of this kind that is still going on. */
	act('event ended', { what: Text, end: Local }),
	/** Tries to withdraw the newest event of this kind. */
	act('withdraw event', { what: Text, reason: Text, evidence: v.exactOptional(Text) }),
	act('fact', { what: Text, begin: v.exactOptional(Local), end: v.exactOptional(Local) }),
	act('raise', {
		deviation: Text,
		title: Text,
		blocks: v.union([v.number(), v.literal('hand-over'), v.literal('nothing')]),
		step: v.exactOptional(Text),
		owner: v.exactOptional(Text),
	}),
	act('dispose', {
		deviation: Text,
		disposition: v.picklist(['repaired', 'use as is', 'not a deviation']),
		reason: v.exactOptional(Text),
	}),
	act('find', {
		instrument: Text,
		error: Text,
		unit: Text,
		tolerance: Text,
		observed: v.exactOptional(Local),
		note: v.exactOptional(Text),
	}),
	act('release', {
		gate: v.number(),
		meaning: v.exactOptional(v.picklist(['released', 'accepted'])),
		copySkipped: v.exactOptional(Text),
	}),
	act('refuse', { gate: v.number(), reason: Text, names: v.array(Text) }),
	act('answer', { gate: v.number(), words: Text }),
	act('hand over', { from: v.array(Text), to: v.array(Text), confirmed: v.boolean(), summary: Text }),
	/** Everything on one tablet reaches another; both note it. */
	act('copy', { to: Text, way: v.picklist(['QR', 'file', 'USB']) }),
	act('note', { text: Text, step: v.exactOptional(Text) }),
	act('seal', {}),
	/** Closes the PDF with a PAdES signature. */
	act('sign', { meaning: v.picklist(['performed', 'reviewed', 'accepted']) }),
]);

export const PlayFileSchema = v.strictObject({
	format: v.literal('gatehold-play/1'),
	demonstration: v.literal(true),
	startUp: Text,
	/** Id of a procedure of the library, or a file beside this one. */
	procedure: Text,
	plant: Text,
	people: Text,
	tablets: v.pipe(v.array(Text), v.minLength(1)),
	acts: v.array(ActSchema),
});

export type PlayFile = v.InferOutput<typeof PlayFileSchema>;
export type Act = v.InferOutput<typeof ActSchema>;
