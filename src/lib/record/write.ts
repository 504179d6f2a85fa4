import { canonicalJson, type Json } from '../base';
import type { BodyOf, EventKind, RecordEvent } from './event';
import { fromChecked } from './event';
import type { Envelope } from './envelope';

/** What a tablet says when it writes an event. Time and people arrive as arguments; nothing here looks at a clock. */
export type Draft<K extends EventKind = EventKind> = {
	readonly log: string;
	readonly kind: K;
	readonly body: BodyOf<K>;
	readonly person: string;
	readonly device: string;
	readonly entered: string;
	readonly observed?: string;
	readonly certificate?: string;
	readonly shiftKey?: string;
};

/**
 * The envelope of the next event of a tablet: its number and the event before on its own chain, the last id known of every
 * other tablet, and a logical clock above everything seen.
 *
 * @param known every event of this log that the tablet holds
 */
export function nextEnvelope<K extends EventKind>(draft: Draft<K>, known: readonly RecordEvent[]): Envelope {
	const heads = new Map<string, RecordEvent>();
	let clock = 0;
	for (const event of known) {
		if (event.log !== draft.log) continue;
		clock = Math.max(clock, event.clock);
		const head = heads.get(event.device);
		if (head === undefined || event.number > head.number) heads.set(event.device, event);
	}
	const own = heads.get(draft.device);
	heads.delete(draft.device);
	const seen = Object.fromEntries([...heads].map(([device, head]) => [device, head.id]));
	const { log, kind, body, person, device, entered, observed, certificate, shiftKey } = draft;
	return {
		v: 1,
		log,
		kind,
		body: body,
		person,
		device,
		...(certificate === undefined ? {} : { certificate }),
		...(shiftKey === undefined ? {} : { shiftKey }),
		number: (own?.number ?? 0) + 1,
		previous: own?.id ?? null,
		seen,
		clock: clock + 1,
		entered,
		...(observed === undefined ? {} : { observed }),
	};
}

/** The exact text that is hashed and signed. */
export const textOf = (envelope: Envelope): string => canonicalJson(envelope as unknown as Json);

/** An event that nobody signed: for tests, translations and what-ifs. */
export const unsignedEvent = (envelope: Envelope): RecordEvent => fromChecked(textOf(envelope), envelope, {});
