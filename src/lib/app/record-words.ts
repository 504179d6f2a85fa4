import type { Plant } from '../plant';
import type { Procedure } from '../procedure';
import { MINUTE, type EventOf, type RecordEvent, type Standing } from '../record';
import { duration, type Say } from '../wording';
import type { Trends } from './trend-files';

/** What a start-up's pages are told from: an open start-up, or anything that knows as much of one. */
export type OpenRecord = {
	readonly procedure: Procedure;
	readonly plant: Plant;
	readonly opened: EventOf<'start-up opened'>;
	readonly events: readonly RecordEvent[];
	readonly siteLog: readonly RecordEvent[];
	readonly standing: Standing;
	readonly trends: Trends;
	readonly instant: (at?: number) => string;
};

/** A person by the name in the record, else by the id. */
export const nameOf = ({ opened, siteLog }: Pick<OpenRecord, 'opened' | 'siteLog'>, person: string): string =>
	opened.body.people.find((each) => each.person === person)?.name ??
	siteLog.flatMap((event) =>
		event.kind === 'person enrolled' && event.body.person === person ? event.body.name : [],
	)[0] ??
	person;

/** "12 min old"; under a minute nobody counts seconds. */
export const ageOf = (milliseconds: number, say: Say): string =>
	milliseconds < MINUTE
		? say('now.just now')
		: say('now.old', { age: duration(Math.floor(milliseconds / MINUTE) * MINUTE) });
