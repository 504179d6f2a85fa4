import { allOf, type EventOf, type RecordEvent, type Standing } from '../../record';

/** Entries that were neither withdrawn nor corrected; a withdrawal that the rules do not allow takes nothing away (ST1). */
export function countedEntries(events: readonly RecordEvent[], standing: Standing): readonly EventOf<'entry'>[] {
	const gone = goneEntries(events, standing);
	return allOf(events, 'entry').filter(({ id }) => !gone.has(id));
}

/** What became of an entry, by its id: the event that withdrew or corrected it. */
export function goneEntries(events: readonly RecordEvent[], standing: Standing): ReadonlyMap<string, RecordEvent> {
	const idle = new Set(standing.withoutEffect.map(({ event }) => event));
	const gone = new Map<string, RecordEvent>();
	for (const event of events) {
		if (idle.has(event.id)) continue;
		if (event.kind === 'entry withdrawn') gone.set(event.body.entry, event);
		if (event.kind === 'entry' && event.body.supersedes !== undefined) gone.set(event.body.supersedes, event);
	}
	// A correction that was itself withdrawn corrects nothing.
	return new Map([...gone].filter(([, by]) => by.kind !== 'entry' || gone.get(by.id)?.kind !== 'entry withdrawn'));
}
