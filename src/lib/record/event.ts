import * as v from 'valibot';
import { canonicalJson, fail, ok, parseJson, sha256Hex, type DeepReadonly, type Json, type Result } from '../base';
import { SITE_BODIES, START_UP_BODIES } from './bodies';
import { EnvelopeSchema, InstantSchema, type Envelope } from './envelope';
import { millis, type Millis } from './instants';
import { lift } from './lift';

const BODIES = { ...START_UP_BODIES, ...SITE_BODIES };

export type EventKind = keyof typeof BODIES;
export type BodyOf<K extends EventKind> = DeepReadonly<v.InferOutput<(typeof BODIES)[K]>>;

/** One event as it was kept: the exact text that was hashed and signed, and what was read from it. */
export type RecordEvent = {
	[Kind in EventKind]: Omit<Envelope, 'kind' | 'body'> & {
		readonly id: string;
		/** The canonical bytes, exactly as hashed; nobody writes them again to check them. */
		readonly text: string;
		/** Base64 of the ES256 signature over `text`, raw r and s; absent in a history that was never signed. */
		readonly signature?: string;
		/** When the tablet that keeps this line got it from another one. */
		readonly received?: string;
		readonly kind: Kind;
		readonly body: BodyOf<Kind>;
		readonly enteredAt: Millis;
		readonly observedAt: Millis;
	};
}[EventKind];

export type EventOf<K extends EventKind> = Extract<RecordEvent, { readonly kind: K }>;

export type EventError =
	| { readonly kind: 'not-json'; readonly line: number; readonly at: number; readonly because: string }
	| {
			readonly kind: 'not-an-event';
			readonly line: number;
			readonly path: string;
			readonly expected: string;
			readonly found: string;
	  }
	| { readonly kind: 'unknown-version'; readonly line: number; readonly version: unknown }
	| { readonly kind: 'unknown-kind'; readonly line: number; readonly found: string }
	| { readonly kind: 'not-canonical'; readonly line: number };

/**
 * A line as stored and sent: the signed text as a string, so that its bytes survive every tool; or, for histories made by
 * hand or by a translator, the envelope itself (bare, or under `envelope`).
 */
const LineSchema = v.strictObject({
	text: v.exactOptional(v.string()),
	envelope: v.exactOptional(v.record(v.string(), v.unknown())),
	signature: v.exactOptional(v.string()),
	received: v.exactOptional(InstantSchema),
});

/** Reads NDJSON, or one JSON array, of event lines. Blank lines are allowed; the first bad line is named. */
export function parseEvents(file: string): Result<readonly RecordEvent[], EventError> {
	const lines = file.trimStart().startsWith('[')
		? linesOfArray(file)
		: ok(file.split('\n').map((text, i) => ({ text, line: i + 1 })));
	if (!lines.ok) return lines;
	const events: RecordEvent[] = [];
	for (const { text, line } of lines.value) {
		if (text.trim() === '') continue;
		const event = parseEventLine(text, line);
		if (!event.ok) return event;
		events.push(event.value);
	}
	return ok(events);
}

function linesOfArray(file: string): Result<readonly { text: string; line: number }[], EventError> {
	const json = parseJson(file);
	if (!json.ok) return fail({ kind: 'not-json', line: 1, at: json.error.at, because: json.error.kind });
	return ok((json.value as readonly Json[]).map((item, i) => ({ text: JSON.stringify(item), line: i + 1 })));
}

export function parseEventLine(text: string, line = 1): Result<RecordEvent, EventError> {
	const json = parseJson(text);
	if (!json.ok) return fail({ kind: 'not-json', line, at: json.error.at, because: json.error.kind });
	const isObject = typeof json.value === 'object' && json.value !== null && !Array.isArray(json.value);
	if (!isObject) return fail({ kind: 'not-an-event', line, path: '', expected: 'an object', found: text.slice(0, 40) });
	if ('kind' in (json.value as object)) return parseEnvelope(json.value, {}, line);
	const stored = v.safeParse(LineSchema, json.value);
	if (!stored.success) return refused(stored.issues[0], line);
	const { text: signed, envelope, signature, received } = stored.output;
	const kept = { ...(signature === undefined ? {} : { signature }), ...(received === undefined ? {} : { received }) };
	if (signed === undefined) return parseEnvelope(envelope ?? null, kept, line);
	const inner = parseJson(signed);
	if (!inner.ok) return fail({ kind: 'not-json', line, at: inner.error.at, because: inner.error.kind });
	if (canonicalJson(inner.value) !== signed) return fail({ kind: 'not-canonical', line });
	return parseEnvelope(inner.value, kept, line);
}

function parseEnvelope(
	json: unknown,
	kept: { readonly signature?: string; readonly received?: string },
	line: number,
): Result<RecordEvent, EventError> {
	const version: unknown = typeof json === 'object' && json !== null ? (json as { v?: unknown }).v : undefined;
	const lifted = lift(json);
	if (!lifted.ok) return fail({ kind: 'unknown-version', line, version });
	const envelope = v.safeParse(EnvelopeSchema, lifted.value);
	if (!envelope.success) return refused(envelope.issues[0], line);
	const { kind } = envelope.output;
	if (!isEventKind(kind)) return fail({ kind: 'unknown-kind', line, found: kind });
	const body = v.safeParse(BODIES[kind], envelope.output.body);
	if (!body.success) return refused(body.issues[0], line, 'body');
	return ok(fromChecked(canonicalJson(json as Json), envelope.output as Envelope, kept));
}

/** The event of an envelope whose shape is known to be right: just parsed, or just made. */
export function fromChecked(
	text: string,
	envelope: Envelope,
	kept: { readonly signature?: string; readonly received?: string },
): RecordEvent {
	const enteredAt = millis(envelope.entered);
	const observedAt = envelope.observed === undefined ? enteredAt : millis(envelope.observed);
	return { ...envelope, ...kept, id: sha256Hex(text), text, enteredAt, observedAt } as RecordEvent;
}

/** The line that is stored and sent. */
export const printEventLine = (event: RecordEvent): string =>
	JSON.stringify({
		text: event.text,
		...(event.signature === undefined ? {} : { signature: event.signature }),
		...(event.received === undefined ? {} : { received: event.received }),
	});

export const isEventKind = (kind: string): kind is EventKind => Object.hasOwn(BODIES, kind);

export const isOf = <K extends EventKind>(event: RecordEvent, kind: K): event is EventOf<K> => event.kind === kind;

export const allOf = <K extends EventKind>(events: readonly RecordEvent[], kind: K): readonly EventOf<K>[] =>
	events.filter((event): event is EventOf<K> => isOf(event, kind));

function refused(issue: v.BaseIssue<unknown>, line: number, under?: string): Result<never, EventError> {
	const path = [under, v.getDotPath(issue)].filter((part) => part !== undefined && part !== null).join('.');
	return fail({ kind: 'not-an-event', line, path, expected: issue.expected ?? issue.message, found: issue.received });
}
