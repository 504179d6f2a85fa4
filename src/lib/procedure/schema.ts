import * as v from 'valibot';
import type { DeepReadonly } from '../base';
import { BasisSchema } from '../plant';
import { StepSchema, type LimitUseSchema } from './step';
import { GateNumber, type LapsedBySchema, type ValiditySchema } from './validity';

const Id = v.pipe(v.string(), v.regex(/^[A-Za-z0-9][A-Za-z0-9._-]{0,63}$/));
const Text = v.pipe(v.string(), v.minLength(1), v.maxLength(2000));
const Minutes = v.pipe(v.number(), v.minValue(0));

/** Who must sign a gate, and with which meaning. It is released when the last signature is there. */
const GateSignature = v.strictObject({
	roles: v.pipe(v.array(v.string()), v.minLength(1)),
	meaning: v.picklist(['released', 'accepted', 'reviewed', 'witnessed']),
});

export const GateSchema = v.strictObject({
	number: GateNumber,
	title: Text,
	/** What the hold point lets happen, in words: "the release of fuel feed". */
	holdPoint: Text,
	signatures: v.pipe(v.array(GateSignature), v.minLength(1)),
	/** Roles that may refuse; absent: every releasing role of the procedure. */
	refusers: v.exactOptional(v.array(v.string())),
	/** Whether an absent signatory may release by voice. Never by default. */
	voice: v.exactOptional(v.boolean()),
	permissives: v.exactOptional(v.array(Id)),
});

/** A named condition over readings and facts, in the Common Expression Language. Unknown is never TRUE. */
export const PermissiveSchema = v.strictObject({
	id: Id,
	title: Text,
	condition: v.pipe(v.string(), v.maxLength(2000)),
	/** Names used in the condition and what they read: newest value of a measuring point, in the stated unit. */
	readings: v.record(
		v.pipe(v.string(), v.regex(/^[a-z][a-z0-9_]*$/)),
		v.strictObject({
			point: Id,
			quantity: v.string(),
			unit: v.string(),
			basis: v.exactOptional(BasisSchema),
			notOlderThanMinutes: Minutes,
		}),
	),
	/** Names that are TRUE while a step stands, or while a plant event is not going on. */
	facts: v.exactOptional(
		v.record(
			v.pipe(v.string(), v.regex(/^[a-z][a-z0-9_]*$/)),
			v.union([v.strictObject({ stepStands: Id }), v.strictObject({ notGoingOn: Id })]),
		),
	),
});

/** Something that can happen to the plant. What it lapses stands in the steps that name it. */
export const PlantEventKindSchema = v.strictObject({
	id: Id,
	title: Text,
	/** At most so long: it counts as `countsAs` instead (a short fan stop asks for a new watch reading only). */
	short: v.exactOptional(v.strictObject({ upToMinutes: Minutes, countsAs: Id })),
	/** Longer than this: it counts as `countsAlsoAs` besides (a long feed stop lapses the feed release too). */
	long: v.exactOptional(v.strictObject({ overMinutes: Minutes, countsAlsoAs: Id })),
	/** What the plant needs now, shown before anything is asked. */
	showsFirst: v.exactOptional(v.array(Text)),
	/** Only counted under this name, never entered by hand. */
	derived: v.exactOptional(v.boolean()),
});

export const StartTypeSchema = v.strictObject({
	id: Id,
	title: Text,
	/** Steps that this type asks for: all, or all but some. */
	without: v.array(Id),
	/** A lighter type needs a releasing role, and is refused when the record holds one of these plant events. */
	needsReleasingRole: v.boolean(),
	excludedBy: v.array(Id),
});

export const ProcedureSchema = v.strictObject({
	format: v.literal('gatehold-procedure/1'),
	id: Id,
	revision: v.pipe(v.number(), v.integer(), v.minValue(1)),
	title: Text,
	language: v.string(),
	demonstration: v.exactOptional(v.boolean()),
	/** Tolerance after a plant event before a proof may be observed again (ST2). Default 2. */
	toleranceMinutes: v.exactOptional(Minutes),
	/** Entered later than this after it was observed: flagged late. Default 10. */
	lateMinutes: v.exactOptional(Minutes),
	gates: v.pipe(v.array(GateSchema), v.minLength(1)),
	steps: v.array(StepSchema),
	permissives: v.exactOptional(v.array(PermissiveSchema)),
	plantEvents: v.array(PlantEventKindSchema),
	startTypes: v.pipe(v.array(StartTypeSchema), v.minLength(1)),
});

export type Procedure = DeepReadonly<v.InferOutput<typeof ProcedureSchema>>;
export type Gate = DeepReadonly<v.InferOutput<typeof GateSchema>>;
export type Step = DeepReadonly<v.InferOutput<typeof StepSchema>>;
export type StepKind = Step['kind'];
export type Validity = DeepReadonly<v.InferOutput<typeof ValiditySchema>>;
export type LapsedBy = DeepReadonly<v.InferOutput<typeof LapsedBySchema>>;
export type Permissive = DeepReadonly<v.InferOutput<typeof PermissiveSchema>>;
export type PlantEventKind = DeepReadonly<v.InferOutput<typeof PlantEventKindSchema>>;
export type StartType = DeepReadonly<v.InferOutput<typeof StartTypeSchema>>;
export type LimitUse = DeepReadonly<v.InferOutput<typeof LimitUseSchema>>;
