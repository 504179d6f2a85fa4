import { DE } from './de';
import { EN } from './en';

/** Languages whose catalogue is complete. */
export type Language = 'en' | 'de';
export type Key = keyof typeof EN;

export type Facts = { readonly [name: string]: string | number };

/** Says a message of the catalogue, in its language, with its facts filled in. */
export type Say = { (key: Key, facts?: Facts): string; readonly language: Language };

/** Each language by its own name. */
export const LANGUAGE_NAMES: { readonly [language in Language]: string } = { en: 'English', de: 'Deutsch' };

export const LANGUAGES: { readonly [language in Language]: { readonly [key in Key]: string } } = { en: EN, de: DE };

export const isLanguage = (text: string): text is Language => Object.hasOwn(LANGUAGES, text);

export const isKey = (text: string): text is Key => Object.hasOwn(EN, text);

/** The facts that a message needs. */
export const asksFor = (key: Key): readonly string[] =>
	[...EN[key].matchAll(/\{(\w+)\}/g)].map(([, name = '']) => name);

/** A message that asks for a fact which is not given is a programmer's error, not a sentence with a hole. */
export const speaker = (language: Language): Say => speakerOf(() => language);

/** Speaks the language that is chosen at the moment of speaking. */
export function speakerOf(chosen: () => Language): Say {
	const say = (key: Key, facts: Facts = {}): string =>
		LANGUAGES[chosen()][key].replace(/\{(\w+)\}/g, (_, name: string) => {
			const fact = facts[name];
			if (fact === undefined) throw new TypeError(`${key} asks for "${name}"`);
			return String(fact);
		});
	return Object.defineProperty(say, 'language', { get: chosen }) as Say;
}

/** "1 deviation", "3 deviations": the message of the number, from a pair of keys. */
export const counted = (say: Say, one: Key, other: Key, n: number): string => say(n === 1 ? one : other, { n });

/** As the first word of a line. */
export const capitalised = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
