import type { Json } from '../base';
import type { CalcNote } from '../calc';
import { fromSi, shownUnit, type QuantityName } from '../quantity';
import { duration, type Moments } from './moment';
import { sayWord } from './word';
import { capitalised, isKey, LANGUAGES, type Say } from './say';
import { printInstant, millis } from '../record';

/** What a moment of a series means on the clock: the instant of its zero, when the calculation knows it. */
export type SeriesClock = { readonly zero: string | undefined; readonly moments: Moments };

/**
 * A calculator's note as a sentence of the catalogue; where there is none, as its name and facts in SI units, so that
 * nothing a calculator said is lost.
 */
export function sayNote(note: CalcNote, say: Say, clock?: SeriesClock): string {
	const { kind, level: _level, criterion, ...facts } = note;
	const head = typeof criterion === 'string' && criterion.length === 1 ? `(${criterion}) ` : '';
	const key = `note.${kind}`;
	const filled = isKey(key) ? fill(LANGUAGES[say.language][key], note, say, clock) : undefined;
	return head + (filled ?? plainly(kind, facts, say));
}

/** @returns undefined when the note lacks a fact that the sentence needs: then it is said plainly */
function fill(template: string, note: CalcNote, say: Say, clock: SeriesClock | undefined): string | undefined {
	const missing = [...template.matchAll(PLACEHOLDER)].some(([, name = '']) => (note[name] ?? null) === null);
	if (missing) return undefined;
	return template.replace(PLACEHOLDER, (_, name: string, form: string | undefined) =>
		shownFact(note[name] ?? null, form, say, clock),
	);
}

const PLACEHOLDER = /\{(\w+)(?::([\w%]+))?\}/g;

function shownFact(fact: Json, form: string | undefined, say: Say, clock: SeriesClock | undefined): string {
	if (form === 'basis' && (fact === 'wet' || fact === 'dry')) return say(`basis.${fact}`);
	if (typeof fact !== 'number' || form === undefined) return sayFact(fact, say);
	if (form === 'time') return duration(fact * 1000);
	if (form === 'clock')
		return clock?.zero === undefined
			? `${sayNumber(fact, say)}\u00a0s`
			: clock.moments.clock(printInstant(millis(clock.zero) + fact * 1000, 0));
	const shown = FORMS[form];
	if (shown === undefined) return sayNumber(fact, say);
	const value = fromSi(fact, shown.quantity, shown.unit);
	return `${sayNumber(value.ok ? value.value : fact, say)}\u00a0${shownUnit(shown.unit)}`;
}

const FORMS: { readonly [form: string]: { readonly quantity: QuantityName; readonly unit: string } } = {
	'%': { quantity: 'fraction', unit: '%' },
	flow: { quantity: 'volume-flow-normal-wet', unit: 'm3(n)/h' },
	m3n: { quantity: 'volume-normal', unit: 'm3(n)' },
	degC: { quantity: 'temperature', unit: 'degC' },
	K: { quantity: 'temperature-difference', unit: 'K' },
	Pa: { quantity: 'pressure-difference', unit: 'Pa' },
	mA: { quantity: 'current', unit: 'mA' },
};

function plainly(kind: string, facts: { readonly [name: string]: Json }, say: Say): string {
	const said = Object.entries(facts).flatMap(([name, value]) =>
		value === null ? [] : [`${spaced(name)} ${sayFact(value, say)}`],
	);
	const title = capitalised(spaced(kind));
	return said.length === 0 ? `${title}.` : `${title}: ${said.join(', ')}.`;
}

function sayFact(value: Json, say: Say): string {
	if (typeof value === 'number') return sayNumber(value, say);
	if (typeof value === 'string') return sayWord(value, say);
	if (typeof value === 'boolean' || value === null) return String(value);
	if (Array.isArray(value)) return value.map((part: Json) => sayFact(part, say)).join(', ');
	return Object.entries(value)
		.map(([name, part]) => `${spaced(name)} ${sayFact(part, say)}`)
		.join(' ');
}

/** Four significant digits, as is enough to recognise a value; the stored result has them all. */
export function sayNumber(value: number, say: Say): string {
	return withMark(printed(value), say);
}

/** A number of the program's data with the decimal mark of the language; what a person typed is never changed. */
export const withMark = (number: string, say: Say): string =>
	say.language === 'de' && /^\D?\d[\d\u00a0]*\.\d/.test(number) ? number.replace('.', ',') : number;

function printed(value: number): string {
	if (!Number.isFinite(value)) return String(value);
	const size = Math.abs(value);
	if (size !== 0 && (size < 1e-3 || size >= 1e7)) return value.toExponential(3).replaceAll('-', '−').replace('+', '');
	const [whole = '', decimals] = String(Number(value.toPrecision(4)))
		.replace('-', '−')
		.split('.');
	const grouped = /\d{5}/.test(whole) ? whole.replaceAll(/\B(?=(?:\d{3})+$)/g, '\u00a0') : whole;
	return decimals === undefined ? grouped : `${grouped}.${decimals}`;
}

const spaced = (name: string): string =>
	name.replaceAll('-', ' ').replace(/([a-z])([A-Z])/g, (_, a: string, b: string) => `${a} ${b.toLowerCase()}`);
