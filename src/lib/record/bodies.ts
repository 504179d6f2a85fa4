import * as v from 'valibot';
import { BasisSchema } from '../plant';
import { EventId, InstantSchema } from './envelope';

const Id = v.pipe(v.string(), v.minLength(1), v.maxLength(128));
const Text = v.pipe(v.string(), v.maxLength(4000));
const Words = v.pipe(v.string(), v.minLength(1), v.maxLength(4000));
const Gate = v.pipe(v.number(), v.integer(), v.minValue(0));
const Hash = EventId;
const Count = v.pipe(v.number(), v.integer(), v.minValue(0));

/** A reading as it was typed. SI values are derived, never stored. */
export const ReadingSchema = v.strictObject({
	field: v.exactOptional(Id),
	point: v.exactOptional(Id),
	typed: v.pipe(v.string(), v.maxLength(64)),
	unit: v.string(),
	basis: v.exactOptional(BasisSchema),
	instrument: v.exactOptional(Id),
	/** May differ from who entered it. */
	readBy: v.exactOptional(Id),
	where: v.exactOptional(v.picklist(['at the plant', 'screen', 'portable'])),
	analyserMode: v.exactOptional(v.picklist(['measuring', 'hold', 'back-purge', 'calibration', 'fault'])),
	/** The line of a paste or a display, kept as it came. */
	raw: v.exactOptional(Text),
	observed: v.exactOptional(InstantSchema),
});

/** One row of a line-up or coverage table. */
export const RowSchema = v.strictObject({
	row: Id,
	/** What was seen: a position, or how the volume is covered. */
	found: v.string(),
	passes: v.boolean(),
	lookedBy: v.exactOptional(Id),
	observed: v.exactOptional(InstantSchema),
	reading: v.exactOptional(ReadingSchema),
	note: v.exactOptional(Text),
});

const AttachmentSchema = v.strictObject({
	hash: Hash,
	name: v.pipe(v.string(), v.minLength(1), v.maxLength(200)),
	mediaType: v.string(),
	bytes: Count,
});

export const EntrySchema = v.strictObject({
	step: Id,
	/** try: a calculation that said not yet or cannot be shown. It is kept, counted and no failure. */
	outcome: v.picklist(['pass', 'fail', 'try', 'cannot do', 'not applicable']),
	/** The entry that this one corrects. */
	supersedes: v.exactOptional(EventId),
	values: v.exactOptional(v.array(ReadingSchema)),
	rows: v.exactOptional(v.array(RowSchema)),
	/** Ids of `series attached` events. */
	series: v.exactOptional(v.array(EventId)),
	/** The whole stored result: calculator, constants, inputs, values, verdict. */
	calculation: v.exactOptional(v.record(v.string(), v.unknown())),
	choice: v.exactOptional(Id),
	confirmed: v.exactOptional(v.array(Id)),
	/** Oldest needed reading, when it is older than the entry: first sample of the hold window, oldest row. */
	from: v.exactOptional(InstantSchema),
	/** Instruments the proof rests on; absent: those of the step. */
	instruments: v.exactOptional(v.array(Id)),
	/** For a watch: what the flow trend showed since the reading before. */
	flow: v.exactOptional(v.picklist(['unbroken', 'broken', 'not looked at'])),
	/** What was compared, kept in words: limit, guard, source. */
	limit: v.exactOptional(Text),
	reason: v.exactOptional(Text),
	note: v.exactOptional(Text),
	attachments: v.exactOptional(v.array(AttachmentSchema)),
});

const Pinned = v.strictObject({ id: Id, revision: v.exactOptional(Count), hash: v.exactOptional(Hash) });

export const OpenedSchema = v.strictObject({
	procedure: Pinned,
	plant: v.exactOptional(Pinned),
	fuel: v.exactOptional(Pinned),
	/** The documents themselves, so that the record needs nothing beside it. */
	documents: v.exactOptional(v.record(v.string(), v.unknown())),
	startType: v.exactOptional(Id),
	title: v.exactOptional(Text),
	/** Everyone who may act, with their roles. */
	people: v.array(v.strictObject({ person: Id, name: v.exactOptional(Text), roles: v.array(Id) })),
	present: v.exactOptional(v.array(Id)),
	inertGas: v.exactOptional(Text),
	controlSystem: v.exactOptional(Text),
	setPoints: v.exactOptional(Text),
	weather: v.exactOptional(Text),
	barometer: v.exactOptional(ReadingSchema),
	demonstration: v.exactOptional(v.boolean()),
	/** Heads of the site log that this start-up rests on, by device. */
	siteHeads: v.exactOptional(v.record(v.string(), EventId)),
});

/** Sentence by sentence what the signer saw, and what was known of the other tablets. Inside the signed bytes. */
export const StatementSchema = v.strictObject({
	text: Words,
	language: v.string(),
	textVersion: v.string(),
	build: v.string(),
	code: v.string(),
	list: v.array(
		v.strictObject({
			step: Id,
			proof: v.nullable(EventId),
			state: v.string(),
			value: v.exactOptional(Text),
			limit: v.exactOptional(Text),
			guard: v.exactOptional(Text),
			ageMinutes: v.exactOptional(v.number()),
			instruments: v.exactOptional(v.array(Id)),
		}),
	),
	counts: v.record(v.string(), Count),
	openDeviations: v.array(Id),
	lapsesSince: v.array(Text),
	late: v.array(EventId),
	others: v.array(
		v.strictObject({ device: Id, number: Count, head: v.nullable(v.string()), lastHeard: v.nullable(InstantSchema) }),
	),
	clock: v.picklist(['agreed', 'not agreed']),
	declaration: Words,
	/** For which moment the sheet was made; absent: for the moment of the act itself. */
	shownAt: v.exactOptional(InstantSchema),
	answersRefusal: v.exactOptional(Text),
	copy: v.exactOptional(v.union([v.strictObject({ made: EventId }), v.strictObject({ skipped: Words })])),
});

const GateAct = {
	gate: Gate,
	meaning: v.exactOptional(v.picklist(['released', 'accepted', 'reviewed', 'witnessed'])),
	statement: v.exactOptional(StatementSchema),
};

const Finding = v.strictObject({
	instrument: Id,
	/** As-found error with its sign: reading minus true value. Negative reads low. */
	asFound: v.exactOptional(
		v.strictObject({ error: v.string(), unit: v.string(), tolerance: v.exactOptional(v.string()) }),
	),
	/** Last good check; absent: the newest passing check before this finding. */
	lastGood: v.exactOptional(InstantSchema),
	note: v.exactOptional(Text),
});

const PlantEventBegun = v.strictObject({
	/** Kind of the procedure's list. */
	what: Id,
	/** Item it happened to: "AT-211", "door D-3". */
	item: v.exactOptional(Id),
	/** The earliest it can have been. */
	begin: InstantSchema,
	/** Absent while it is still going on. */
	end: v.exactOptional(InstantSchema),
	seenBy: v.exactOptional(Text),
	note: v.exactOptional(Text),
});

/** Every kind of event of a start-up's log, with the shape of its body. */
export const START_UP_BODIES = {
	'start-up opened': OpenedSchema,
	entry: EntrySchema,
	'entry withdrawn': v.strictObject({ entry: EventId, reason: Words }),
	'not applicable agreed': v.strictObject({ entry: EventId, reason: v.exactOptional(Text) }),
	'series attached': v.strictObject({
		points: v.array(
			v.strictObject({
				point: Id,
				column: v.exactOptional(Text),
				unit: v.string(),
				basis: v.exactOptional(BasisSchema),
			}),
		),
		from: InstantSchema,
		to: InstantSchema,
		samples: Count,
		attachment: AttachmentSchema,
		/** How the file is to be read, where a person corrected what would be found in it. */
		reading: v.exactOptional(
			v.strictObject({
				separator: v.exactOptional(v.picklist([';', ',', '\t'])),
				decimalMark: v.exactOptional(v.picklist([',', '.'])),
				timeColumn: v.exactOptional(Text),
				time: v.exactOptional(v.picklist(['year first', 'day first', 'month first'])),
			}),
		),
		note: v.exactOptional(Text),
	}),
	'deviation raised': v.strictObject({
		deviation: Id,
		title: Words,
		/** A gate's number, hand-over, or nothing. */
		blocks: v.union([Gate, v.literal('hand-over'), v.literal('nothing')]),
		step: v.exactOptional(Id),
		owner: v.exactOptional(Id),
		due: v.exactOptional(InstantSchema),
	}),
	'deviation progressed': v.strictObject({ deviation: Id, note: Words, owner: v.exactOptional(Id) }),
	'deviation dispositioned': v.strictObject({
		deviation: Id,
		disposition: v.picklist(['repaired', 'use as is', 'not a deviation']),
		reason: v.exactOptional(Text),
		expires: v.exactOptional(InstantSchema),
		evidence: v.exactOptional(v.array(EventId)),
	}),
	'plant event begun': PlantEventBegun,
	'plant event ended': v.strictObject({ event: EventId, end: InstantSchema, note: v.exactOptional(Text) }),
	'plant event corrected': v.strictObject({
		event: EventId,
		begin: v.exactOptional(InstantSchema),
		end: v.exactOptional(InstantSchema),
		withdrawn: v.exactOptional(v.literal(true)),
		reason: Words,
		evidence: v.exactOptional(Text),
	}),
	/** Something that happened and lapses nothing: a burner chamber purge with the damper seen shut. */
	fact: v.strictObject({ what: Words, begin: v.exactOptional(InstantSchema), end: v.exactOptional(InstantSchema) }),
	'instrument assigned': v.strictObject({ point: Id, instrument: Id, serial: v.exactOptional(Text) }),
	'gate released': v.strictObject(GateAct),
	'gate refused': v.strictObject({
		...GateAct,
		reason: Words,
		/** Steps and instruments that must change before the refusal can be answered. */
		names: v.exactOptional(v.array(Id)),
	}),
	'refusal answered': v.strictObject({ gate: Gate, refusal: v.exactOptional(EventId), words: Words }),
	'gate released by voice': v.strictObject({ ...GateAct, caller: Id, code: v.string(), callBack: Text }),
	'gate released on paper': v.strictObject({ ...GateAct, signatory: Id, photo: Hash }),
	'witness invited': v.strictObject({ step: Id, party: Words, due: InstantSchema }),
	'witness attended': v.strictObject({ step: Id, witness: Words }),
	'witness waived': v.strictObject({ step: Id, by: Words, reason: Words }),
	note: v.strictObject({
		text: Words,
		step: v.exactOptional(Id),
		attachments: v.exactOptional(v.array(AttachmentSchema)),
	}),
	'shift hand-over': v.strictObject({
		from: v.array(Id),
		to: v.array(Id),
		/** Temporary states were read and confirmed by those who come. Not confirmed counts as a plant event. */
		temporaryStatesConfirmed: v.boolean(),
		summary: v.exactOptional(Text),
	}),
	/** The state of the tablet's clock, when it is doubted or agreed again. */
	'clock noted': v.strictObject({
		state: v.picklist(['agreed', 'not agreed']),
		lastAgreed: v.exactOptional(InstantSchema),
		jumpMinutes: v.exactOptional(v.number()),
	}),
	'copy made': v.strictObject({
		to: Words,
		way: v.picklist(['QR', 'file', 'USB', 'hub']),
		heads: v.record(v.string(), v.strictObject({ number: Count, code: v.string() })),
		compared: v.exactOptional(v.boolean()),
	}),
	/** Events of another tablet arrived here. */
	'copy received': v.strictObject({
		from: Words,
		heads: v.exactOptional(v.record(v.string(), v.strictObject({ number: Count, code: v.string() }))),
	}),
	'refused act': v.strictObject({
		act: v.picklist(['release', 'refusal', 'answer', 'withdrawal', 'correction', 'disposition', 'entry', 'seal']),
		gate: v.exactOptional(Gate),
		event: v.exactOptional(EventId),
		because: Words,
		wayOut: v.exactOptional(Text),
	}),
	'shift key': v.strictObject({
		/** JSON Web Key (RFC 7517) of the entry key, P-256. */
		publicKey: v.record(v.string(), v.unknown()),
		notBefore: InstantSchema,
		notAfter: InstantSchema,
		entriesOnly: v.literal(true),
	}),
	'chain head': v.strictObject({
		/** The device countersigns its own chain's state, so that a cut tail is seen. */
		number: Count,
		head: EventId,
		why: v.picklist(['segment', 'hand-over', 'push', 'export', 'gate act', 'seal']),
		deviceSignature: v.exactOptional(v.string()),
	}),
	sealed: v.strictObject({
		statement: v.exactOptional(StatementSchema),
		/** Last number and id of every chain that is inside the seal. */
		heads: v.record(v.string(), v.strictObject({ number: Count, id: EventId })),
		lost: v.exactOptional(v.array(v.strictObject({ device: Id, number: Count, head: v.string(), note: Text }))),
	}),
	addendum: v.strictObject({ text: Words, attachments: v.exactOptional(v.array(AttachmentSchema)) }),
} as const;

/** Every kind of event of a site's log. */
export const SITE_BODIES = {
	'instrument registered': v.strictObject({
		instrument: Id,
		serial: Text,
		point: v.exactOptional(Id),
		due: v.exactOptional(v.string()),
	}),
	'instrument checked': v.strictObject({
		instrument: Id,
		passes: v.boolean(),
		asFound: v.exactOptional(Text),
		asLeft: v.exactOptional(Text),
	}),
	'instrument finding': Finding,
	/** An instrument engineer confirms that a value stays inside limit and guard with the error applied. */
	'value confirmed': v.strictObject({ finding: EventId, entry: EventId, reason: Words }),
	'person enrolled': v.strictObject({
		person: Id,
		name: Text,
		roles: v.array(Id),
		certificate: v.exactOptional(v.string()),
	}),
	'device enrolled': v.strictObject({ device: Id, certificate: v.exactOptional(v.string()) }),
	'training recorded': v.strictObject({ person: Id, training: Words, until: v.exactOptional(v.string()) }),
	'trust list issued': v.strictObject({ sequence: Count, list: v.record(v.string(), v.unknown()) }),
	/** A new plant description; proofs that read a changed point lapse. */
	'plant described': v.strictObject({ plant: Pinned, changedPoints: v.array(Id) }),
	'procedure approved': v.strictObject({ procedure: Pinned, roles: v.array(Id) }),
	'fuel data recorded': v.strictObject({ fuel: Text, hash: v.exactOptional(Hash) }),
	'temporary state': v.strictObject({
		state: Words,
		owner: v.exactOptional(Id),
		until: v.exactOptional(InstantSchema),
		ended: v.exactOptional(v.boolean()),
	}),
	'archive receipt': v.strictObject({
		dossier: Hash,
		heads: v.record(v.string(), EventId),
		archiveNumber: Count,
		previous: v.nullable(Hash),
	}),
} as const;

export type StartUpKind = keyof typeof START_UP_BODIES;
export type SiteKind = keyof typeof SITE_BODIES;
