import * as v from 'valibot';

/** RFC 3339 with an offset: "2026-05-04T16:00:00+02:00". Durations run on UTC; the offset says what the wall clock showed. */
export const InstantSchema = v.pipe(
	v.string(),
	v.regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d(:\d\d(\.\d{1,3})?)?(Z|[+-]\d\d:\d\d)$/),
	v.check((text) => !Number.isNaN(Date.parse(text)), 'no such day or time'),
);

export const EventId = v.pipe(v.string(), v.regex(/^[0-9a-f]{64}$/));

/**
 * What is hashed and signed, around every body. The id of an event is the SHA-256 of the canonical JSON of its envelope.
 * One chain per device: `number` counts 1, 2, 3 ... and `previous` names the event before, so two tablets never fork one.
 */
export const EnvelopeSchema = v.strictObject({
	v: v.literal(1),
	/** The start-up's id, or the site's for events of the site log. */
	log: v.pipe(v.string(), v.minLength(1), v.maxLength(128)),
	kind: v.string(),
	body: v.record(v.string(), v.unknown()),
	person: v.pipe(v.string(), v.minLength(1), v.maxLength(128)),
	device: v.pipe(v.string(), v.minLength(1), v.maxLength(128)),
	/** SHA-256 of the signer's certificate; absent only in histories that were never signed. */
	certificate: v.exactOptional(EventId),
	/** Id of the shift key event whose key signed this entry; absent when the certificate's own key signed. */
	shiftKey: v.exactOptional(EventId),
	number: v.pipe(v.number(), v.integer(), v.minValue(1)),
	previous: v.nullable(EventId),
	/** The last id known of every other device, by device. */
	seen: v.record(v.string(), EventId),
	/** Logical clock: 1 + the highest clock seen. */
	clock: v.pipe(v.number(), v.integer(), v.minValue(1)),
	entered: InstantSchema,
	/** When the thing was seen, if it was not when it was entered. */
	observed: v.exactOptional(InstantSchema),
});

export type Envelope = {
	readonly v: 1;
	readonly log: string;
	readonly kind: string;
	readonly body: { readonly [name: string]: unknown };
	readonly person: string;
	readonly device: string;
	readonly certificate?: string;
	readonly shiftKey?: string;
	readonly number: number;
	readonly previous: string | null;
	readonly seen: { readonly [device: string]: string };
	readonly clock: number;
	readonly entered: string;
	readonly observed?: string;
};
