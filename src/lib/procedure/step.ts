import * as v from 'valibot';
import { BasisSchema, MeasureSchema, SourceSchema } from '../plant';
import { BindingSchema } from './binding';
import { GateNumber, LapsedBySchema, ValiditySchema } from './validity';

const Id = v.pipe(v.string(), v.regex(/^[A-Za-z0-9][A-Za-z0-9._-]{0,63}$/));
const Text = v.pipe(v.string(), v.minLength(1), v.maxLength(2000));

/** A limit of the unit by its id, or one written in the procedure with its source. */
export const LimitUseSchema = v.union([
	v.strictObject({ limit: Id }),
	v.strictObject({
		atMost: v.exactOptional(MeasureSchema),
		atLeast: v.exactOptional(MeasureSchema),
		guard: v.exactOptional(MeasureSchema),
		source: SourceSchema,
	}),
]);

/** A number that is read and typed. The basis belongs to the measuring point; it stands here only for a field without one. */
export const FieldSchema = v.strictObject({
	id: Id,
	title: Text,
	point: v.exactOptional(Id),
	quantity: v.string(),
	unit: v.string(),
	basis: v.exactOptional(BasisSchema),
	limit: v.exactOptional(LimitUseSchema),
});

const shared = {
	id: Id,
	gate: GateNumber,
	/** One piece of equipment or one theme: one contact of the ladder. */
	group: Text,
	title: Text,
	/** Imperative, one action. */
	does: v.exactOptional(Text),
	why: v.exactOptional(Text),
	/** Where the demand or its time limit comes from, when no limit of a field says it. */
	source: v.exactOptional(SourceSchema),
	/** Tags and volumes of the plant description. */
	where: v.exactOptional(v.array(Id)),
	/** Expected work. */
	minutes: v.pipe(v.number(), v.minValue(0)),
	/** Roles that may perform it; absent: every role that may enter. */
	roles: v.exactOptional(v.array(v.string())),
	validity: ValiditySchema,
	lapsedBy: v.array(LapsedBySchema),
	/** Must be observed inside the unbroken standing of these. */
	redo: v.array(Id),
	/** Kept, but does not count while one of these is down. */
	waits: v.array(Id),
	/** Instruments a proof rests on when the entry names none. */
	instruments: v.array(Id),
	/** The instrument whose function check this step is: a finding on it lapses this step. */
	checks: v.exactOptional(Id),
	/** The site's sentence for "if this lapses with feed on". */
	withFeedOn: v.exactOptional(Text),
	cautions: v.exactOptional(
		v.array(
			v.picklist([
				'asphyxiation',
				'poisoning',
				'ignition',
				'hot surface',
				'moving parts',
				'pressure',
				'dust explosion',
				'no lone work',
			]),
		),
	),
	photo: v.exactOptional(v.picklist(['asked', 'needed'])),
};

const step = <const K extends string, E extends v.ObjectEntries>(kind: K, entries: E) =>
	v.strictObject({ ...shared, kind: v.literal(kind), ...entries });

export const StepSchema = v.variant('kind', [
	step('confirm', { confirms: v.array(v.strictObject({ id: Id, text: Text })) }),
	step('line-up', {
		rows: v.array(
			v.strictObject({ id: Id, element: v.exactOptional(Id), title: Text, required: Text, choices: v.array(Text) }),
		),
	}),
	step('reading', { fields: v.array(FieldSchema) }),
	/** All places on one page, with their limit. */
	step('quick sheet', { fields: v.array(FieldSchema) }),
	step('series', {
		points: v.array(Id),
		/** Points whose trend must be unbroken: fan flow, inert flow. */
		flows: v.array(Id),
		atLeastSamples: v.pipe(v.number(), v.integer(), v.minValue(1)),
	}),
	step('calculation', {
		calculator: v.pipe(v.string(), v.regex(/^[a-z0-9-]+@[0-9]+$/)),
		bind: v.record(v.string(), BindingSchema),
		/** What proves the step: the calculator's own verdict, or one output inside a limit. */
		proves: v.union([
			v.literal('verdict'),
			v.strictObject({ output: Id, quantity: v.string(), unit: v.string(), limit: LimitUseSchema }),
		]),
	}),
	/** One row for every enclosed volume: measured, swept with its outlet read, or shut off and inerted by itself. */
	step('coverage', {
		rows: v.array(
			v.strictObject({
				id: Id,
				volume: Id,
				answers: v.array(v.picklist(['measured', 'swept, outlet read', 'shut off, inerted by itself'])),
				/** The measuring point that reads the volume, when one does. */
				point: v.exactOptional(Id),
				/** What keeps it inerted by itself when it is shut off. */
				inertedBy: v.exactOptional(Text),
			}),
		),
	}),
	step('choice', { options: v.array(v.strictObject({ id: Id, title: Text, passes: v.boolean() })) }),
	step('photo', { shows: Text }),
	step('timed hold', { holdMinutes: v.pipe(v.number(), v.minValue(0)), fields: v.exactOptional(v.array(FieldSchema)) }),
	step('watch', { fields: v.array(FieldSchema) }),
	step('witness point', { party: Text, noticeMinutes: v.pipe(v.number(), v.minValue(0)) }),
	step('review point', { documents: v.array(Text) }),
]);
