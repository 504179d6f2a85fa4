import type { Step } from '../procedure';
import { shownUnit } from '../quantity';
import type { BodyOf } from '../record';
import { counted, isKey, type Say } from './say';
import { shownText } from './shown-in';

type Entry = BodyOf<'entry'>;

/** What an entry says, in one line: values as they were typed, tables and confirmations by their count. */
export function sayEntry(body: Entry, step: Step | undefined, say: Say): string {
	const values = (body.values ?? []).map(({ field, point, typed, unit }) =>
		[point ?? field ?? '', typed, shownUnit(unit)].filter((part) => part !== '').join('\u00a0'),
	);
	const shown =
		values.length > MOST_VALUES
			? [...values.slice(0, MOST_VALUES - 1), say('entry.more', { n: values.length - MOST_VALUES + 1 })]
			: values;
	const said = [
		...verdictOf(body, say),
		shown.join(', '),
		...tableOf(body, say),
		...confirmsOf(body, step, say),
		choiceOf(body, step, say),
	];
	const beside = [
		...(body.series === undefined ? [] : [say('entry.series')]),
		...(body.attachments === undefined || body.attachments.length === 0
			? []
			: [counted(say, 'entry.photo', 'entry.photos', body.attachments.length)]),
		body.reason ?? '',
		body.note ?? '',
	];
	return [...said, ...beside].filter((part) => part !== '').join('; ');
}

const MOST_VALUES = 6;

function verdictOf(body: Entry, say: Say): readonly string[] {
	const word = (body.calculation?.verdict as { readonly word?: unknown } | undefined)?.word;
	const key = `verdict.${String(word)}`;
	return isKey(key) ? [say(key)] : [];
}

const tableOf = ({ rows = [] }: Entry, say: Say): readonly string[] =>
	rows.length === 0 ? [] : [say('entry.rows', { n: rows.filter(({ passes }) => passes).length, all: rows.length })];

function confirmsOf({ confirmed }: Entry, step: Step | undefined, say: Say): readonly string[] {
	if (confirmed === undefined) return [];
	const all =
		step?.kind === 'confirm'
			? step.confirms.length
			: step?.kind === 'review point'
				? step.documents.length
				: confirmed.length;
	return [say('entry.confirmed', { n: confirmed.length, all })];
}

const choiceOf = ({ choice = '' }: Entry, step: Step | undefined, say: Say): string =>
	shownText((step?.kind === 'choice' ? step.options.find(({ id }) => id === choice)?.title : undefined) ?? choice, say);
