/** A moment as RFC 3339 text with its offset, as the record keeps it: "2026-05-04T14:12:07+02:00". */
export type Instant = string;

/** Milliseconds since 1970-01-01T00:00:00Z. A text that names no moment is a programmer's error: check it at the door. */
export function millisecondsOf(instant: Instant): number {
	const value = RFC_3339.test(instant) ? Date.parse(instant) : NaN;
	if (Number.isNaN(value)) throw new TypeError(`no moment: ${instant}`);
	return value;
}

export const isInstant = (text: string): boolean => RFC_3339.test(text) && !Number.isNaN(Date.parse(text));

/** Certificates carry whole seconds in UTC; this is that form. */
export const utcInstant = (date: Date): Instant => date.toISOString().replace(/\.\d{3}Z$/, 'Z');

const RFC_3339 = /^\d{4}-\d\d-\d\dT\d\d:\d\d(?::\d\d(?:\.\d{1,3})?)?(?:Z|[+-]\d\d:\d\d)$/;
