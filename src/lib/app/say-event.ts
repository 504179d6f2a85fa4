import { shownUnit } from '../quantity';
import type { BodyOf, RecordEvent } from '../record';
import { shownText, type Say } from '../wording';
import { nameOf, type OpenRecord } from './record-words';

/** What an event says, in one line. */
export function sayEvent(event: RecordEvent, told: OpenRecord, say: Say): string {
	const titleOf = (id: string): string =>
		shownText(told.procedure.steps.find((step) => step.id === id)?.title ?? id, say);
	const happened = (what: string): string =>
		shownText(told.procedure.plantEvents.find(({ id }) => id === what)?.title ?? what, say);
	const people = (ids: readonly string[]): string => ids.map((id) => nameOf(told, id)).join(', ');
	switch (event.kind) {
		case 'entry': {
			const { step, outcome, reason, note } = event.body;
			const said = say('log.entry', { title: titleOf(step), outcome: say(`outcome.${outcome}`) });
			return [said, reason, note].filter((part) => part !== undefined).join('. ');
		}
		case 'entry withdrawn':
			return say('log.entry withdrawn', { reason: event.body.reason });
		case 'series attached':
			return say('log.series', { name: event.body.attachment.name, n: event.body.samples });
		case 'deviation raised':
			return say('log.deviation raised', { deviation: event.body.deviation, title: event.body.title });
		case 'deviation progressed':
			return say('log.deviation progressed', { deviation: event.body.deviation, note: event.body.note });
		case 'deviation dispositioned': {
			const { deviation, disposition, reason } = event.body;
			const said = say(`disposition.${disposition}`);
			return say('log.deviation dispositioned', { deviation, said, reason: reason ?? '' }).trim();
		}
		case 'plant event begun':
			return [happened(event.body.what), event.body.item, event.body.note]
				.filter((part) => part !== undefined)
				.join('. ');
		case 'plant event ended': {
			const begun = told.events.find(({ id }) => id === event.body.event);
			return say('log.ended', {
				what: begun?.kind === 'plant event begun' ? happened(begun.body.what) : event.body.event,
			});
		}
		case 'plant event corrected':
			return say('log.corrected', { reason: event.body.reason });
		case 'fact':
			return say('ui.fact', { text: event.body.what });
		case 'gate released':
		case 'gate released by voice':
		case 'gate released on paper':
			return say('log.released', { gate: event.body.gate });
		case 'gate refused':
			return say('log.refused', { gate: event.body.gate, reason: event.body.reason });
		case 'refusal answered':
			return say('log.answered', { gate: event.body.gate, words: event.body.words });
		case 'refused act':
			return say('log.refused act', { act: say(`act.${event.body.act}`), because: event.body.because });
		case 'note':
		case 'addendum':
			return say(event.kind === 'note' ? 'log.note' : 'log.addendum', { text: event.body.text });
		case 'shift hand-over':
			return say('log.hand-over', { from: people(event.body.from), to: people(event.body.to) });
		case 'instrument finding':
			return say('log.finding', { instrument: event.body.instrument });
		case 'copy made':
			return say('log.copy made', { to: event.body.to });
		case 'copy received':
			return say('log.copy received', { from: event.body.from });
		default:
			return isNamed(event.kind) ? say(`log.kind.${event.kind}`) : event.kind;
	}
}

/** The values of an entry as they were typed, in one line. */
export function sayValues(
	{ values = [], calculation, choice, step }: BodyOf<'entry'>,
	told: OpenRecord,
	say: Say,
): string | undefined {
	const asked = told.procedure.steps.find(({ id }) => id === step);
	const chosen = asked?.kind === 'choice' ? asked.options.find(({ id }) => id === choice)?.title : undefined;
	const verdict = (calculation?.verdict as { readonly word?: unknown } | undefined)?.word;
	const parts = [
		...(isVerdict(verdict) ? [say(`verdict.${verdict}`)] : []),
		...values.map(({ field, point, typed, unit, basis }) =>
			[point ?? field ?? '', typed, shownUnit(unit), basis === undefined ? '' : say(`basis.${basis}`)].join(' ').trim(),
		),
		...(choice === undefined ? [] : [chosen ?? choice]),
	];
	return parts.length === 0 ? undefined : parts.join('; ');
}

const VERDICTS = ['adequate', 'not yet', 'cannot be shown'] as const;
const isVerdict = (word: unknown): word is (typeof VERDICTS)[number] => (VERDICTS as readonly unknown[]).includes(word);

/** Kinds that are said by their name alone. */
const NAMED = [
	'start-up opened',
	'not applicable agreed',
	'instrument assigned',
	'witness invited',
	'witness attended',
	'witness waived',
	'clock noted',
	'shift key',
	'chain head',
	'sealed',
] as const;
type Named = (typeof NAMED)[number];
const isNamed = (kind: string): kind is Named => (NAMED as readonly string[]).includes(kind);
