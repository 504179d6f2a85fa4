import type { GateSheet } from '../record';
import { isKey, isLanguage, speaker, type Say } from './say';

/** Version of the sentences below: it stands inside every signed statement, so that they can be found again. */
export const statementVersion = (say: Say): string => say('statement.version');

export type StatementWords = {
	/** The language that is signed. */
	readonly say: Say;
	/** Prints an instant as plant local time, "02:11". */
	readonly local: (instant: string) => string;
	/** The procedure's name of a plant event: "Process-gas fan stopped". */
	readonly event: (what: string) => string;
};

/**
 * The sentence that a signatory signs at a hold point, made from the sheet and nothing else: what is released, on which
 * evidence, what happened since the last act, and what the tablet does not know.
 */
export function releaseStatement(sheet: GateSheet, meaning: string, words: StatementWords): string {
	const { say, local } = words;
	const meant = `statement.meaning.${meaning}`;
	const sentences = [
		say('statement.act', {
			gate: sheet.gate,
			title: sheet.title,
			meaning: isKey(meant) ? say(meant) : meaning,
			holdPoint: sheet.holdPoint,
		}),
		stepsOf(sheet, say),
		sheet.eventsSince.length === 0
			? say('statement.no event')
			: say('statement.events', { events: sheet.eventsSince.map((event) => sayEvent(event, words)).join('; ') }),
		...sheet.findingsSince.map(({ instrument, error }) =>
			error === undefined
				? say('statement.finding', { instrument })
				: say('statement.finding with error', { instrument, error }),
		),
		...(sheet.refusal === undefined
			? []
			: [
					say('statement.refused before', {
						reason: sheet.refusal.reason,
						answer: sheet.refusal.answer ?? say('statement.no answer'),
					}),
				]),
		...(sheet.openDeviations.length === 0
			? []
			: [say('statement.deviations', { deviations: sheet.openDeviations.join(', ') })]),
		...sheet.others.map((other) => {
			const facts = { device: other.device, number: other.number, head: other.head ?? say('statement.head unknown') };
			return other.lastHeard === null
				? say('statement.tablet never', facts)
				: say('statement.tablet', { ...facts, heard: local(other.lastHeard) });
		}),
		...(sheet.clock === 'agreed' ? [] : [say('statement.clock')]),
		say('statement.no permission'),
	];
	return sentences.join(' ');
}

function stepsOf({ counts, newestMinutes, oldestMinutes }: GateSheet, say: Say): string {
	const n = counts.steps ?? 0;
	const agreed = counts['not applicable'] ?? 0;
	return say(n === 1 ? 'statement.step' : 'statement.steps', {
		n,
		stand: counts.stand ?? 0,
		agreed: agreed > 0 ? say('statement.agreed', { n: agreed }) : '',
		seen:
			newestMinutes === undefined
				? ''
				: say('statement.seen', { newest: minutes(newestMinutes), oldest: minutes(oldestMinutes ?? 0) }),
	});
}

function sayEvent({ what, item, begin, end }: GateSheet['eventsSince'][number], words: StatementWords): string {
	const { say, local, event } = words;
	const named = `${event(what)}${item === undefined ? '' : ` (${item})`}`;
	return end === null
		? say('statement.event goes on', { what: named, begin: local(begin) })
		: say('statement.event over', { what: named, begin: local(begin), end: local(end) });
}

/** What the signer declares besides: nothing happened that the record does not say. */
export const declarationOf = (say: Say): string => say('statement.declaration');

export const sealStatement = (startUp: string, say: Say): string => say('statement.seal', { startUp });

const minutes = (n: number): string =>
	n < 120 ? `${String(n)} min` : `${String(Math.floor(n / 60))} h ${String(n % 60)} min`;

/** What a stored statement was made from, to say its words again. */
export type Restated =
	| { readonly sheet: GateSheet; readonly meaning: string; readonly event: (what: string) => string }
	| { readonly startUp: string };

/**
 * The words of a stored statement, said again in its own language.
 *
 * @returns undefined for a language, or a version of the sentences, that is not spoken here
 */
export function restate(
	said: { readonly language: string; readonly textVersion: string },
	of: Restated,
): { readonly text: string; readonly declaration: string } | undefined {
	const { language } = said;
	if (!isLanguage(language)) return undefined;
	const say = speaker(language);
	if (said.textVersion !== statementVersion(say)) return undefined;
	const text =
		'startUp' in of
			? sealStatement(of.startUp, say)
			: releaseStatement(of.sheet, of.meaning, { say, local: writtenHour, event: of.event });
	return { text, declaration: declarationOf(say) };
}

/** An instant's hour as it was written, with the offset of the tablet: "02:11". */
export const writtenHour = (instant: string): string => instant.slice(11, 16);
