/** An instant inside the record room: milliseconds since 1970-01-01T00:00Z. Ages and durations are differences of these. */
export type Millis = number;

export const MINUTE = 60_000;

/** @param text RFC 3339, checked by the schema at the door */
export const millis = (text: string): Millis => Date.parse(text);

/** Minutes east of UTC that the text shows. */
export function offsetMinutes(text: string): number {
	const found = /([+-])(\d\d):(\d\d)$/.exec(text);
	if (found === null) return 0;
	const minutes = Number(found[2]) * 60 + Number(found[3]);
	return found[1] === '-' ? -minutes : minutes;
}

/** Prints an instant with an offset, so that a person reads plant local time: "2026-05-04T18:40:00+02:00". */
export function printInstant(at: Millis, offset: number): string {
	const local = new Date(at + offset * MINUTE)
		.toISOString()
		.replace(/\.000Z$/, 'Z')
		.slice(0, -1);
	const size = Math.abs(offset);
	const two = (n: number): string => String(n).padStart(2, '0');
	return `${local}${offset < 0 ? '-' : '+'}${two(Math.floor(size / 60))}:${two(size % 60)}`;
}
