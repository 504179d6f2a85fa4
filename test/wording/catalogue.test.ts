import { describe, expect, test } from 'vitest';
import { LANGUAGES, type Key } from '../../src/lib/wording';
import { readTree } from '../architecture/tree';

type Messages = { readonly [key in Key]: string };

const KEYS = Object.keys(LANGUAGES.en) as Key[];

const source = [...readTree('src')]
	.filter(([file]) => /\.(?:ts|svelte)$/.test(file) && !/^lib\/(?:demo|wording\/(?:en|de))[/.]/.test(file))
	.map(([, text]) => text)
	.join('\n');

/** Quoted, or the name of a property. */
const isWord = (word: string): boolean =>
	["'", '"', '`'].some((mark) => source.includes(mark + word + mark)) ||
	(/^\w+$/.test(word) && new RegExp(`\\b${word}\\??:`).test(source));

const templates = [...source.matchAll(/`([\w-]+\.(?:[\w -]+\.)*)\$\{[^}`]+\}([\w. -]*)`/g)].map(
	([, head = '', tail = '']) => ({
		head,
		tail,
	}),
);

/** A key made from a template is used when what fills the hole is a word that the program knows. */
const isMade = (key: string): boolean =>
	templates.some(({ head, tail }) => {
		if (!key.startsWith(head) || !key.endsWith(tail)) return false;
		const hole = key.slice(head.length, key.length - tail.length);
		return isWord(hole) || /^\d\d$/.test(hole);
	});

/** What the rules object is made in the record, in English, and found again by its message: the parts between its facts. */
const isKept = (key: Key): boolean =>
	key.startsWith('objection.') &&
	LANGUAGES.en[key].split(/\{\w+\}/).every((part) => part.length < 3 || source.includes(part));

describe('every message', () => {
	test('is said somewhere', () => {
		expect(KEYS.filter((key) => !isWord(key) && !isMade(key) && !isKept(key))).toEqual([]);
	});

	test('stands in one file only: a key said twice would silently take the other one\u2019s words', () => {
		const keys = [...readTree('src/lib/wording/en').values()].flatMap((file) =>
			[...file.matchAll(/^\t(?:'([^']+)'|(\w+)):/gm)].map(([, quoted, bare]) => quoted ?? bare),
		);
		expect(keys.length).toBe(KEYS.length);
		expect(keys.filter((key, i) => keys.indexOf(key) !== i)).toEqual([]);
	});

	test('that the program says is in the catalogue', () => {
		const said = [...source.matchAll(/\bsay\(\s*'([^']+)'(?! in )/g)].map(([, key = '']) => key);
		expect(said.length).toBeGreaterThan(200);
		expect(said.filter((key) => !Object.hasOwn(LANGUAGES.en, key))).toEqual([]);
	});
});

/** Messages of only facts and marks, and words that German trade has from English or Latin. */
const ALIKE = [
	/^[^a-z]*$/i,
	/^(?:Name|Person|Tablet|Bytes|SHA-256|PIN|OK|minus|Linear|Code|Dossier|April|August|September|November)$/,
	/^\{n\} min$/,
	/^U \{value\} \{unit\} \(k = 2\)$/,
];

describe.each(Object.entries(LANGUAGES) as ['en' | 'de', Messages][])('the catalogue in %s', (language, messages) => {
	test('asks in every message for the facts, and the forms of facts, that the English one asks for', () => {
		const asked = (message: string) => [...message.matchAll(/\{[^}]*\}/g)].map(([name]) => name).sort();
		expect(Object.entries(messages).map(([key, message]) => [key, asked(message)])).toEqual(
			KEYS.map((key) => [key, asked(LANGUAGES.en[key])]),
		);
	});

	test('has no message that is empty or carries blanks at its ends', () => {
		expect(Object.entries(messages).filter(([, message]) => message.trim() !== message || message === '')).toEqual([]);
	});

	if (language === 'en') return;

	test('has no message left in English', () => {
		const bare = (message: string) => message.replaceAll(/\{[^}]*\}/g, '').trim();
		const same = KEYS.filter((key) => messages[key] === LANGUAGES.en[key]);
		expect(
			same.filter((key) => !ALIKE.some((alike) => alike.test(bare(messages[key])) || alike.test(messages[key]))),
		).toEqual([]);
		const english = /\b(?:the|and|with|not|this|of|is|are|were|no|by|from|to|it|has|its)\b/i;
		expect(KEYS.filter((key) => english.test(bare(messages[key])))).toEqual([]);
	});
});

test('German uses one word for one thing: what it chose, and nothing beside it', () => {
	const beside: readonly (readonly [string, RegExp])[] = [
		['Stufe, not Gate or Tor', /\bGates?\b|\bTore?s?\b/],
		['Messgerät, not Instrument', /\bInstrument(?:e|en|s)?\b/],
		['Messstelle, not Messpunkt', /Messpunkt/],
		['Grenzwert, not Limit', /\bLimits?\b/],
		['freigeben, not entlassen or lösen', /\bentlass|\bRelease/],
		['verfällt, not erlischt or läuft aus', /erlisch|erlosch/],
		['Anfahrvorgang, not Anfahrt or Start-up', /\bAnfahrt(?:en)?\b|Start-up|Startup/],
		['Falschluft, not Leckage', /Leckage|Leckluft/],
		['Schutzband, not Sicherheitsband', /Sicherheitsband/],
	];
	const messages = Object.entries(LANGUAGES.de);
	expect(
		beside.flatMap(([rule, word]) => messages.filter(([, said]) => word.test(said)).map(([key]) => [rule, key])),
	).toEqual([]);
});

test('German never says that a place may be entered, that a plant is inert or tight, or that anything is certified', () => {
	const forbidden =
		/betreten|gasdicht|\b(?:ist|sind|war) inert\b|gefahrlos|unbedenklich|zertifizierte?[ns]? (?:nach|für)|Betreten erlaubt/i;
	expect(Object.entries(LANGUAGES.de).filter(([, said]) => forbidden.test(said))).toEqual([]);
});
