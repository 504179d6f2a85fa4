import { nextEnvelope, unsignedEvent, type BodyOf, type RecordEvent } from '../../src/lib/record';

export const LOG = 'SU-0001';
export const NOON = '2026-05-04T12:00:00+02:00';

const minutesAfterNoon = (minutes: number): string => {
	const [hours, rest] = [12 + Math.floor(minutes / 60), minutes % 60];
	return `2026-05-04T${String(hours).padStart(2, '0')}:${String(rest).padStart(2, '0')}:00+02:00`;
};

type Where = { readonly device?: string; readonly log?: string; readonly minute?: number };

/** The next note of a tablet that knows these events. */
export const noteAfter = (known: readonly RecordEvent[], text: string, where: Where = {}): RecordEvent =>
	next(known, 'note', { text }, where);

export const opening = (known: readonly RecordEvent[], body: Partial<BodyOf<'start-up opened'>>, where: Where = {}) =>
	next(known, 'start-up opened', { procedure: { id: 'PR-1' }, people: [], ...body }, where);

/** The first notes of a tablet, one a minute. */
export function notes(count: number, where: Where = {}): readonly RecordEvent[] {
	const events: RecordEvent[] = [];
	for (let i = 0; i < count; i++) events.push(noteAfter(events, `note ${i + 1}`, { ...where, minute: i }));
	return events;
}

const next = <K extends 'note' | 'start-up opened'>(
	known: readonly RecordEvent[],
	kind: K,
	body: BodyOf<K>,
	{ device = 'T-1', log = LOG, minute = 0 }: Where,
): RecordEvent =>
	unsignedEvent(nextEnvelope({ log, kind, body, person: 'P-01', device, entered: minutesAfterNoon(minute) }, known));
