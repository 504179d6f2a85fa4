import * as v from 'valibot';
import type { DeepReadonly } from '../base';
import { EventId, InstantSchema } from './envelope';

const Id = v.string();

/** What broke or holds back a proof: always a fact of the record, so that "why not yet?" ends at something that happened. */
export const CauseSchema = v.variant('kind', [
	v.strictObject({
		kind: v.literal('plant event'),
		event: EventId,
		what: Id,
		item: v.exactOptional(Id),
		begin: InstantSchema,
		end: v.nullable(InstantSchema),
	}),
	v.strictObject({ kind: v.literal('age'), minutes: v.number(), since: InstantSchema }),
	/** The age was spent on a released gate and counts again, because that gate lapsed or a new proof relies on this one. */
	v.strictObject({ kind: v.literal('age counts again'), minutes: v.number(), since: InstantSchema, gate: v.number() }),
	v.strictObject({ kind: v.literal('watch gap'), minutes: v.number(), since: InstantSchema }),
	/** The reading that would close a watch gap does not say that the flow trend was unbroken. */
	v.strictObject({ kind: v.literal('flow not shown'), entry: EventId }),
	v.strictObject({ kind: v.literal('relies on'), step: Id }),
	v.strictObject({
		kind: v.literal('instrument finding'),
		event: EventId,
		instrument: Id,
		lastGood: v.nullable(InstantSchema),
	}),
	v.strictObject({ kind: v.literal('measuring point changed'), event: EventId, point: Id }),
	v.strictObject({ kind: v.literal('outcome'), entry: EventId, outcome: v.string() }),
	v.strictObject({ kind: v.literal('rows missing'), rows: v.array(Id) }),
	v.strictObject({ kind: v.literal('condition'), permissive: Id, value: v.string() }),
	v.strictObject({ kind: v.literal('not agreed'), entry: EventId }),
	v.strictObject({ kind: v.literal('not proved') }),
]);

export const StepStandingSchema = v.strictObject({
	step: Id,
	gate: v.number(),
	state: v.picklist(['not yet', 'stands', 'failed', 'lapsed', 'waits', 'not applicable']),
	/** Since when the state holds: observation, failure or lapse. */
	since: v.exactOptional(InstantSchema),
	/** When the proof will lapse by age, as things are known; "unknown" while the clock is not agreed. */
	until: v.exactOptional(v.union([InstantSchema, v.literal('unknown')])),
	/** The entry that counts: newest by observed time. */
	entry: v.exactOptional(EventId),
	/** Its observed time. */
	observed: v.exactOptional(InstantSchema),
	performedBy: v.exactOptional(v.array(Id)),
	why: v.array(CauseSchema),
	waitsFor: v.array(Id),
	/** Rows of a table that must be looked at again, when not all of them. */
	rows: v.exactOptional(v.array(Id)),
	tries: v.number(),
	/** Proved under a gate whose lower gate is not released: kept, counts, and is marked. */
	aheadOfRelease: v.exactOptional(v.literal(true)),
});

export const PermissiveStandingSchema = v.strictObject({
	permissive: Id,
	value: v.picklist(['TRUE', 'FALSE', 'unknown']),
	because: v.array(v.string()),
	readings: v.array(
		v.strictObject({
			name: Id,
			point: Id,
			typed: v.exactOptional(v.string()),
			unit: v.string(),
			observed: v.exactOptional(InstantSchema),
			entry: v.exactOptional(EventId),
		}),
	),
});

export const GateStandingSchema = v.strictObject({
	gate: v.number(),
	state: v.picklist(['not ready', 'ready', 'released', 'lapsed', 'held', 'refused']),
	/** The acts that released it last, whether or not that still holds. */
	acts: v.array(EventId),
	releasedAt: v.exactOptional(InstantSchema),
	/** Signatures that are still missing, by the roles that may give them. */
	missing: v.array(v.array(Id)),
	why: v.array(
		v.variant('kind', [
			v.strictObject({ kind: v.literal('step'), step: Id, state: v.string() }),
			v.strictObject({ kind: v.literal('lower gate'), gate: v.number(), state: v.string() }),
			v.strictObject({ kind: v.literal('deviation'), deviation: Id, event: EventId }),
			v.strictObject({
				kind: v.literal('refusal'),
				event: EventId,
				reason: v.string(),
				answered: v.boolean(),
				unchanged: v.array(Id),
			}),
			v.strictObject({ kind: v.literal('permissive'), permissive: Id, value: v.string() }),
			/** Items of the plant description whose values are still those of the unit that it was copied from. */
			v.strictObject({ kind: v.literal('values to replace'), from: v.string(), items: v.array(Id) }),
			v.strictObject({ kind: v.literal('needs release again'), since: InstantSchema }),
		]),
	),
});

/** A gate act, judged against what its tablet knew then and what is known now (ST3). */
export const ActJudgedSchema = v.strictObject({
	event: EventId,
	act: v.picklist(['released', 'refused']),
	gate: v.number(),
	person: Id,
	device: Id,
	at: InstantSchema,
	/** Whether the rules allowed it, by what its tablet knew; an act that was not allowed changes nothing. */
	counted: v.boolean(),
	notCountedBecause: v.array(v.string()),
	/** Steps under the gate that, as known now, did not stand at the time of the act. */
	didNotStand: v.array(v.strictObject({ step: Id, why: v.array(CauseSchema) })),
});

export const ReproofItemSchema = v.strictObject({
	step: Id,
	gate: v.number(),
	title: v.string(),
	minutes: v.number(),
	/** "not yet" only for a step that was never proved and that a lapsed one relies on. */
	state: v.picklist(['failed', 'lapsed', 'not yet']),
	why: v.array(CauseSchema),
	rows: v.exactOptional(v.array(Id)),
	/** Minutes from now at which it can begin and end, for the people present. */
	begins: v.number(),
	ends: v.number(),
});

export const AnswerSchema = v.strictObject({
	format: v.literal('gatehold-standing/1'),
	startUp: Id,
	procedure: v.strictObject({ id: Id, revision: v.number() }),
	at: InstantSchema,
	/** The tablet whose knowledge this is; absent: everything in the file. */
	knownTo: v.exactOptional(Id),
	/** Always false: what stands is one question, whether signatures hold is another, and verify answers it. */
	checksSignatures: v.literal(false),
	startType: v.exactOptional(Id),
	steps: v.array(StepStandingSchema),
	permissives: v.array(PermissiveStandingSchema),
	gates: v.array(GateStandingSchema),
	reproof: v.strictObject({
		/** Ids in the order of the procedure. */
		steps: v.array(Id),
		/** Sum of expected work. */
		minutes: v.number(),
		/** Upstream first, short-lived steps last. */
		inWorkingOrder: v.array(ReproofItemSchema),
		/** Longest path over relies-on and gate order, for the people present. */
		earliestFinishMinutes: v.number(),
	}),
	deviations: v.array(
		v.strictObject({
			deviation: Id,
			state: v.picklist(['open', 'dispositioned']),
			blocks: v.union([v.number(), v.literal('hand-over'), v.literal('nothing')]),
			raised: InstantSchema,
			closed: v.exactOptional(InstantSchema),
		}),
	),
	plantEvents: v.array(
		v.strictObject({
			event: EventId,
			what: Id,
			/** The names it counts under, given how long it lasted. */
			countsAs: v.array(Id),
			item: v.exactOptional(Id),
			begin: InstantSchema,
			end: v.nullable(InstantSchema),
			entered: InstantSchema,
			late: v.boolean(),
			withdrawn: v.exactOptional(v.literal(true)),
		}),
	),
	/** Facts entered later than the site allows after they were observed. */
	late: v.array(v.strictObject({ event: EventId, minutes: v.number() })),
	watchGaps: v.array(v.strictObject({ step: Id, from: InstantSchema, to: v.nullable(InstantSchema) })),
	tries: v.array(v.strictObject({ step: Id, event: EventId, observed: InstantSchema })),
	refusedActs: v.array(EventId),
	acts: v.array(ActJudgedSchema),
	/** Corrections and withdrawals that the rules do not allow: kept, without effect. */
	withoutEffect: v.array(v.strictObject({ event: EventId, because: v.string() })),
	sealed: v.exactOptional(v.strictObject({ event: EventId, at: InstantSchema })),
	/** Events that are not inside the seal: shown, they need an addendum. */
	afterSeal: v.array(EventId),
	clock: v.strictObject({ state: v.picklist(['agreed', 'not agreed']), skewMinutes: v.number() }),
});

export type Cause = DeepReadonly<v.InferOutput<typeof CauseSchema>>;
export type StepStanding = DeepReadonly<v.InferOutput<typeof StepStandingSchema>>;
export type GateStanding = DeepReadonly<v.InferOutput<typeof GateStandingSchema>>;
export type PermissiveStanding = DeepReadonly<v.InferOutput<typeof PermissiveStandingSchema>>;
export type ActJudged = DeepReadonly<v.InferOutput<typeof ActJudgedSchema>>;
export type ReproofItem = DeepReadonly<v.InferOutput<typeof ReproofItemSchema>>;
/** What `standing` answers: published as a JSON Schema. */
export type Standing = DeepReadonly<v.InferOutput<typeof AnswerSchema>>;
