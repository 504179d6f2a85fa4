import type { Json } from '../base';
import type { CalcNote } from '../calc';

/**
 * A calculator's note as a line of text: what it is called, then its facts with their names, so that nothing a calculator
 * said is lost. Facts are in SI units, as in the stored result.
 */
export function sayNote({ kind, level: _level, criterion, ...facts }: CalcNote): string {
	const said = Object.entries(facts).flatMap(([name, value]) =>
		value === null ? [] : [`${spaced(name)} ${sayFact(value)}`],
	);
	const title = capital(spaced(kind));
	const head = typeof criterion === 'string' ? `(${criterion}) ${title}` : title;
	return said.length === 0 ? `${head}.` : `${head}: ${said.join(', ')}.`;
}

function sayFact(value: Json): string {
	if (typeof value === 'number') return sayNumber(value);
	if (typeof value === 'string') return value;
	if (typeof value === 'boolean' || value === null) return String(value);
	if (Array.isArray(value)) return value.map(sayFact).join(' / ');
	return Object.entries(value)
		.map(([name, part]) => `${spaced(name)} ${sayFact(part)}`)
		.join(' ');
}

/** Four significant digits, as is enough to recognise a value; the stored result has them all. */
export function sayNumber(value: number): string {
	if (!Number.isFinite(value)) return String(value);
	const size = Math.abs(value);
	if (size !== 0 && (size < 1e-3 || size >= 1e7)) return value.toExponential(3).replace('-', '−').replace('+', '');
	return String(Number(value.toPrecision(4))).replace('-', '−');
}

const spaced = (name: string): string =>
	name.replaceAll('-', ' ').replace(/([a-z])([A-Z])/g, (_, a: string, b: string) => `${a} ${b.toLowerCase()}`);

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
