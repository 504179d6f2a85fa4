import { GERMAN } from '../procedure';
import type { Language, Say } from './say';

/**
 * A text of the procedure in the language chosen; as it is written where nobody has translated these very words. For screens
 * only: what is recorded and signed is the procedure's own text.
 */
export const shownText = (text: string, say: Say): string => PHRASES[say.language][text] ?? text;

/** A procedure, or a part of it, with its texts in the language chosen; ids, groups, positions and documents are data and stay. */
export function shownIn<T>(data: T, say: Say): T {
	const phrases = PHRASES[say.language];
	return phrases === NONE ? data : (translated(data, '', phrases) as T);
}

type Phrases = { readonly [english: string]: string };

const NONE: Phrases = {};
const PHRASES: { readonly [language in Language]: Phrases } = { en: NONE, de: GERMAN };

function translated(value: unknown, name: string, phrases: Phrases): unknown {
	if (typeof value === 'string') return TEXTS.has(name) ? (phrases[value] ?? value) : value;
	if (Array.isArray(value)) return value.map((item) => translated(item, name, phrases));
	if (typeof value !== 'object' || value === null) return value;
	return Object.fromEntries(
		Object.entries(value).map(([key, part]) => [key, key === 'source' ? part : translated(part, key, phrases)]),
	);
}

/** Fields of a procedure that are only read. */
const TEXTS = new Set([
	'title',
	'holdPoint',
	'does',
	'why',
	'text',
	'shows',
	'showsFirst',
	'withFeedOn',
	'otherwise',
	'inertedBy',
	'party',
]);
