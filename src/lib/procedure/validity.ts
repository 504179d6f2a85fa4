import * as v from 'valibot';

export const GateNumber = v.pipe(v.number(), v.integer(), v.minValue(0), v.maxValue(99));
const Minutes = v.pipe(v.number(), v.minValue(0));

/**
 * How long a proof stands (record/SPEC.md, ST4).
 * once: for good, or for an age that ends to count when gate `until` is released on it.
 * fresh at release: at most so old at every release and re-release of its own gate.
 * watch: a reading at every place at least so often, while needed (until gate `until` is released).
 * while: only while a permissive is TRUE.
 */
export const ValiditySchema = v.variant('kind', [
	v.strictObject({
		kind: v.literal('once'),
		ageMinutes: v.exactOptional(Minutes),
		until: v.exactOptional(GateNumber),
	}),
	v.strictObject({ kind: v.literal('fresh at release'), atMostMinutes: Minutes }),
	v.strictObject({
		kind: v.literal('watch'),
		everyMinutes: Minutes,
		until: v.exactOptional(GateNumber),
		/** A gap is closed only by an entry that says the flow trend is unbroken. */
		gapNeedsFlow: v.exactOptional(v.boolean()),
	}),
	v.strictObject({ kind: v.literal('while'), permissive: v.string() }),
]);

/**
 * A plant event that lapses this proof. With `item`, only the event on that item ("fault" of "AT-211").
 * With `rows: "item"`, only the row of the table that the event's item names lapses; an event without item lapses all.
 */
export const LapsedBySchema = v.union([
	v.string(),
	v.strictObject({
		event: v.string(),
		item: v.exactOptional(v.string()),
		rows: v.exactOptional(v.literal('item')),
	}),
]);
