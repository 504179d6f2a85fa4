import { isKey, LANGUAGES, type Key, type Say } from './say';

/** A word of the data in the language chosen; what the catalogue does not know, as a role of one site only, as it is written. */
export function sayWord(word: string, say: Say): string {
	const key = `word.${word}`;
	return isKey(key) ? say(key) : word;
}

export const sayWords = (words: readonly string[], say: Say): string =>
	words.map((word) => sayWord(word, say)).join(', ');

/**
 * What the rules had against an act. The record keeps it in English, whatever language was shown; here it is found again among
 * the English messages and said in the language chosen. What is not found is said as it was kept.
 */
export function sayObjection(kept: string, say: Say): string {
	for (const { key, names, pattern } of OBJECTIONS) {
		const found = pattern.exec(kept);
		if (found === null) continue;
		const facts = names.map((name, i) => [name, sayWord(found[i + 1] ?? '', say)] as const);
		return say(key, Object.fromEntries(facts));
	}
	return kept;
}

const OBJECTIONS = Object.keys(LANGUAGES.en)
	.filter((key): key is Key => key.startsWith('objection.'))
	.map((key) => {
		const message = LANGUAGES.en[key];
		const names = [...message.matchAll(/\{(\w+)\}/g)].map(([, name = '']) => name);
		return { key, names, pattern: new RegExp(`^${message.replaceAll(/\{\w+\}/g, '(.+)')}$`) };
	});
