import { MINUTE } from './instants';

/** The last instant, now or before, at which the clock of the plant showed "HH:MM". */
export function lastTimeAt(clock: string, now: number, utcOffsetMinutes: number): number | undefined {
	const [, hours, minutes] = /^(\d\d):(\d\d)$/.exec(clock) ?? [];
	if (hours === undefined || minutes === undefined) return undefined;
	const shift = utcOffsetMinutes * MINUTE;
	const midnight = Math.floor((now + shift) / DAY) * DAY - shift;
	const at = midnight + (Number(hours) * 60 + Number(minutes)) * MINUTE;
	return at <= now ? at : at - DAY;
}

const DAY = 24 * 60 * MINUTE;
