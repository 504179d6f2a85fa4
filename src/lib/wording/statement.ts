import type { GateSheet } from '../record';

/** Version of the sentences below: it stands inside every signed statement, so that they can be found again. */
export const STATEMENT_VERSION = 'statement-en/1';

/**
 * The sentence that a signatory signs at a hold point, made from the sheet and nothing else: what is released, on which
 * evidence, what happened since the last act, and what the tablet does not know.
 *
 * @param words.local prints an instant as plant local time, "02:11"
 * @param words.event the procedure's name of a plant event: "Process-gas fan stopped"
 */
export function releaseStatement(
	sheet: GateSheet,
	meaning: string,
	words: { readonly local: (instant: string) => string; readonly event: (what: string) => string },
): string {
	const { local, event } = words;
	const { counts } = sheet;
	const sentences = [
		`Gate ${String(sheet.gate)}, ${sheet.title}: ${meaning}. This lets ${sheet.holdPoint} happen.`,
		`Of ${count(counts.steps ?? 0, 'step')} under it ${String(counts.stand ?? 0)} stand as listed${
			(counts['not applicable'] ?? 0) > 0 ? `, ${String(counts['not applicable'])} agreed not applicable` : ''
		}${sheet.newestMinutes === undefined ? '' : `; the newest was observed ${minutes(sheet.newestMinutes)} before, the oldest ${minutes(sheet.oldestMinutes ?? 0)}`}.`,
		sheet.eventsSince.length === 0
			? 'No plant event is recorded since the last act on this gate.'
			: `Plant events since the last act on this gate: ${sheet.eventsSince
					.map(
						({ what, item, begin, end }) =>
							`${event(what)}${item === undefined ? '' : ` (${item})`} ${local(begin)} to ${end === null ? 'not ended' : local(end)}`,
					)
					.join('; ')}.`,
		...sheet.findingsSince.map(
			({ instrument, error }) =>
				`${instrument} was found bad${error === undefined ? '' : ` (as found ${error})`}; what rested on it was proved again.`,
		),
		...(sheet.refusal === undefined
			? []
			: [`Refused before: "${sheet.refusal.reason}". Answer: "${sheet.refusal.answer ?? 'none'}".`]),
		...(sheet.openDeviations.length === 0
			? []
			: [`Open deviations that do not block this gate: ${sheet.openDeviations.join(', ')}.`]),
		...sheet.others.map(
			({ device, number, head, lastHeard }) =>
				`Tablet ${device} was last heard ${lastHeard === null ? 'never' : `at ${local(lastHeard)}`} (number ${String(number)}, head ${head ?? 'unknown'}); its later entries are not covered.`,
		),
		...(sheet.clock === 'agreed' ? [] : ['Clock not agreed: ages are judged by the last agreed time.']),
		'This is a statement about what was recorded. It is no permission to enter, and replaces no permit, interlock or gas test.',
	];
	return sentences.join(' ');
}

/** What the signer declares besides: nothing happened that the record does not say. */
export const DECLARATION =
	'I know of no fan stop, opening, loss of inert gas, burner trip, feed stop or power dip other than those listed.';

export const sealStatement = (startUp: string): string =>
	`The record of ${startUp} is closed. It takes no more entries, only addenda. Sealing says that the record is complete as far as this tablet knows; it does not say that readings, clocks or people were right.`;

const count = (n: number, what: string): string => `${String(n)} ${what}${n === 1 ? '' : 's'}`;
const minutes = (n: number): string =>
	n < 120 ? `${String(n)} min` : `${String(Math.floor(n / 60))} h ${String(n % 60)} min`;
