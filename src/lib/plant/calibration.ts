/** Milliseconds since 1970-01-01T00:00Z. */
type Millis = number;

/**
 * The instant at which a calibration that is due on a date has run out: 24:00 plant time of that day.
 *
 * @param due a day, "2026-05-04", checked by the schema and `checkPlant`
 */
export const calibrationEnds = (due: string, { utcOffsetMinutes }: { readonly utcOffsetMinutes: number }): Millis =>
	Date.parse(`${due}T00:00:00Z`) + DAY - utcOffsetMinutes * MINUTE;

/** Whether an instrument is in calibration at an instant; at the very end it no longer is. */
export const isInCalibration = (
	instrument: { readonly due: string },
	plant: { readonly utcOffsetMinutes: number },
	at: Millis,
): boolean => at < calibrationEnds(instrument.due, plant);

/** Whether the calendar has this day: the shape alone would let the 31st of February pass. */
export function isDay(text: string): boolean {
	const at = Date.parse(`${text}T00:00:00Z`);
	return !Number.isNaN(at) && new Date(at).toISOString().startsWith(text);
}

const MINUTE = 60_000;
const DAY = 24 * 60 * MINUTE;
