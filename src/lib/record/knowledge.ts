import type { RecordEvent } from './event';
import { millis, type Millis } from './instants';

/** Total order of the record, used only to break ties: logical clock, then id. */
export const inOrder = (a: RecordEvent, b: RecordEvent): number =>
	a.clock - b.clock || (a.id < b.id ? -1 : a.id > b.id ? 1 : 0);

/** Set union: the same events in any order, once each. Merging two tablets is exactly this. */
export function merge(...logs: readonly (readonly RecordEvent[])[]): readonly RecordEvent[] {
	const byId = new Map<string, RecordEvent>();
	for (const log of logs) for (const event of log) if (!byId.has(event.id)) byId.set(event.id, event);
	return [...byId.values()].sort(inOrder);
}

/**
 * What the tablet of an event knew when it made it: everything before it on its own chain, and everything that chain had
 * seen of others. A property of the event alone, so it is worked out once, whoever asks.
 */
export class Knowledge {
	readonly #byId: ReadonlyMap<string, RecordEvent>;
	readonly #byPlace: ReadonlyMap<string, RecordEvent>;
	readonly #pasts = new Map<string, ReadonlySet<string>>();

	constructor(events: readonly RecordEvent[]) {
		this.#byId = new Map(events.map((event) => [event.id, event]));
		this.#byPlace = new Map(events.map((event) => [place(event, event.number), event]));
	}

	/** Ids known before the event was made, without itself. */
	past(event: RecordEvent): ReadonlySet<string> {
		const known = this.#pasts.get(event.id) ?? this.#walk(this.#parents(event));
		this.#pasts.set(event.id, known);
		return known;
	}

	/** What a tablet knows at an instant: its own events, what they had seen, and what its file says it received. */
	knownTo(device: string, at: Millis): ReadonlySet<string> {
		const roots: string[] = [];
		for (const event of this.#byId.values()) {
			const own = event.device === device && event.enteredAt <= at;
			const received = event.received !== undefined && millis(event.received) <= at;
			if (own || received) roots.push(event.id);
		}
		return this.#walk(roots);
	}

	/** The given events and everything before them. With a list, not by recursion: a chain may be as long as the record. */
	#walk(roots: readonly string[]): ReadonlySet<string> {
		const found = new Set<string>();
		const open = [...roots];
		for (let id = open.pop(); id !== undefined; id = open.pop()) {
			const event = this.#byId.get(id);
			if (event === undefined || found.has(id)) continue;
			found.add(id);
			open.push(...this.#parents(event));
		}
		return found;
	}

	/** The event before on its own chain, by number, so that an unlinked history reads the same; and what it had seen. */
	#parents(event: RecordEvent): readonly string[] {
		const before = this.#byPlace.get(place(event, event.number - 1));
		return [...(before === undefined ? [] : [before.id]), ...Object.values(event.seen)];
	}
}

const place = (event: RecordEvent, number: number): string => JSON.stringify([event.log, event.device, number]);

/**
 * Clock skew between tablets, as far as the record shows it: an event that another tablet had already seen cannot have
 * been entered after that tablet's next event.
 */
export function measuredSkew(events: readonly RecordEvent[]): Millis {
	const byId = new Map(events.map((event) => [event.id, event]));
	let skew = 0;
	for (const event of events)
		for (const id of Object.values(event.seen)) {
			const seen = byId.get(id);
			if (seen !== undefined && seen.device !== event.device) skew = Math.max(skew, seen.enteredAt - event.enteredAt);
		}
	return skew;
}
