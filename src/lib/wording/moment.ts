import { millis, printInstant } from '../record';
import type { Say, Key } from './say';

/** Moments as people at the plant read them: by its own clock, whatever offset the tablet wrote. */
export type Moments = {
	/** "21:45" */
	readonly clock: (instant: string) => string;
	/** "14 Mar" */
	readonly day: (instant: string) => string;
	/** "14 Mar 21:45" */
	readonly short: (instant: string) => string;
	/** "14 March 2026, 21:45 +01:00" */
	readonly full: (instant: string) => string;
};

export function momentsAt(utcOffsetMinutes: number, say: Say): Moments {
	const local = (instant: string): string => printInstant(millis(instant), utcOffsetMinutes);
	const clock = (instant: string): string => local(instant).slice(11, 16);
	const day = (instant: string): string => dayOf(local(instant), say, 'short');
	return {
		clock,
		day,
		short: (instant) => `${day(instant)}\u00a0${clock(instant)}`,
		full: (instant) => {
			const text = local(instant);
			return `${dayOf(text, say, 'long')} ${text.slice(0, 4)}, ${clock(instant)} ${text.slice(-6)}`;
		},
	};
}

function dayOf(local: string, say: Say, form: 'short' | 'long'): string {
	const month = say(`month.${local.slice(5, 7)}` as Key);
	const day = Number(local.slice(8, 10));
	return say('moment.day', { day, month: form === 'short' ? Array.from(month).slice(0, 3).join('') : month });
}

/** "6 min 40 s", "2 h 5 min": two units at most, none of them zero unless all are. */
export function duration(milliseconds: number): string {
	const seconds = Math.round(Math.abs(milliseconds) / 1000);
	const parts = [
		[Math.floor(seconds / 3600), 'h'],
		[Math.floor((seconds % 3600) / 60), 'min'],
		[seconds % 60, 's'],
	] as const;
	const said = parts.filter(([count]) => count > 0).slice(0, 2);
	return said.length === 0 ? '0\u00a0s' : said.map(([count, unit]) => `${count}\u00a0${unit}`).join(' ');
}
