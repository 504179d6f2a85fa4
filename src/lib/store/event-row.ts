import { fail, ok, type Result } from '../base';
import { parseEventLine, type EventError, type RecordEvent } from '../record';

/** The key of an event: all events of a log stand together, those of one tablet in the order of its chain. */
export type EventKey = readonly [log: string, device: string, number: number, id: string];

/** An event as it is kept: the exact text that was hashed and signed, beside what finds it. */
export type EventRow = {
	readonly log: string;
	readonly device: string;
	readonly number: number;
	readonly id: string;
	readonly text: string;
	readonly signature?: string;
	readonly received?: string;
};

/** A row that does not read as what it was kept as. It is shown, never left out in silence. */
export type DamagedRow = {
	readonly log: string;
	readonly device: string;
	readonly number: number;
	readonly id: string;
	readonly error: EventError | { readonly kind: 'not-the-kept-event'; readonly found: string };
};

export const keyOf = ({ log, device, number, id }: Omit<EventRow, 'text'>): EventKey => [log, device, number, id];

/** IndexedDB sorts a list behind every text and number, and a shorter list before one that it begins. */
export const AFTER_EVERY_TEXT: readonly never[] = [];

/** From where to where the keys stand that begin like this. */
export const startingWith = (key: readonly string[]) => [key, [...key, AFTER_EVERY_TEXT]] as const;

export function rowOf(event: RecordEvent, received = event.received): EventRow {
	const { log, device, number, id, text, signature } = event;
	return {
		log,
		device,
		number,
		id,
		text,
		...(signature === undefined ? {} : { signature }),
		...(received === undefined ? {} : { received }),
	};
}

export function eventOf(row: EventRow): Result<RecordEvent, DamagedRow> {
	const { log, device, number, id, text, signature, received } = row;
	const place = { log, device, number, id };
	const event = parseEventLine(JSON.stringify({ text, signature, received }));
	if (!event.ok) return fail({ ...place, error: event.error });
	const same = keyOf(event.value).every((part, i) => part === keyOf(row)[i]);
	return same ? ok(event.value) : fail({ ...place, error: { kind: 'not-the-kept-event', found: event.value.id } });
}
