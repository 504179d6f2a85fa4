import { allOf } from '../../record';
import type { Story } from './story';

/** Whether somebody took this entry back; it stays in the record, and counts for nothing. */
export const isWithdrawn = (entry: string, { events }: Pick<Story, 'events'>): boolean =>
	allOf(events, 'entry withdrawn').some(({ body }) => body.entry === entry);
