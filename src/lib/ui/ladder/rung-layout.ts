import { roughly } from '../../drawing';
import type { LeaderNote } from './leader-notes';
import { placeNotes, type PlacedNote } from './place-notes';
import type { Placed, Row } from './row';
import type { ShownContact, ShownRung } from './shown-rungs';

export type OpenedRung = {
	readonly rows: readonly Row[];
	readonly notes: readonly PlacedNote[];
	readonly height: number;
	readonly coil: { readonly x: number; readonly y: number };
};

/** The rung in work, opened: names over its contacts, words under them, and the notes led to them. */
export function openRung(rung: ShownRung, notes: readonly LeaderNote[], width: number): OpenedRung {
	const [left, right] = [RAIL + FIRST, width - RAIL - COIL];
	const fits = Math.max(4, Math.floor((right - 58 - left) / PITCH) + 1);
	const count = Math.max(1, Math.ceil(rung.contacts.length / fits));
	const length = Math.ceil(rung.contacts.length / count);
	const pitch = Math.min(86, (right - 58 - left) / Math.max(1, length - 1));
	let y = HEAD;
	const rows = Array.from({ length: count }, (_, k): Row => {
		const own = rung.contacts.slice(k * length, (k + 1) * length);
		const { named, above } = withNames(own, left, pitch);
		y += above + (k === 0 ? 0 : BETWEEN);
		return {
			letter: String.fromCharCode('a'.charCodeAt(0) + k),
			contacts: named,
			y,
			isFirst: k === 0,
			isLast: k === count - 1,
			leads: own.every(({ powered, state }) => powered && (state === 'stands' || state === 'not applicable')),
		};
	});
	const placed = placeNotes(rows, notes, { top: y + 62, left: RAIL + 16, right: width - RAIL });
	return { rows, notes: placed, coil: { x: right, y }, height: y + 62 + placed.length * NOTE + 6 };
}

/** Names on one level where each fits over its contact; else on two, so that each has the width of two contacts. */
function withNames(
	contacts: readonly ShownContact[],
	left: number,
	pitch: number,
): { readonly named: readonly Placed[]; readonly above: number } {
	const single = contacts.map(({ label }) => wrapped(label, pitch - 5));
	const isCrowded = single.some((lines) => lines.length > 2 || lines.some((line) => line.endsWith('…')));
	const lines = isCrowded ? contacts.map(({ label }) => wrapped(label, 2 * pitch - 10).slice(0, 2)) : single;
	const tall = (level: 0 | 1): number =>
		Math.max(0, ...lines.flatMap((each, i) => (i % 2 === level ? each.length : []))) * LINE;
	const lift = isCrowded ? tall(0) + 6 : 0;
	return {
		above: 34 + (isCrowded ? lift + tall(1) : Math.max(tall(0), tall(1))),
		named: contacts.map((contact, i) => ({
			contact,
			x: Math.round(left + i * pitch),
			lines: lines[i] ?? [],
			lift: i % 2 === 1 ? lift : 0,
		})),
	};
}

/** In lines of at most this width; the letters are the narrow ones. */
export function wrapped(label: string, width: number): readonly string[] {
	const lines: string[] = [];
	for (const word of label.split(' ').flatMap((each) => divided(each, width))) {
		const last = lines.at(-1);
		const joined = last === undefined ? word : `${last} ${word}`;
		if (last !== undefined && narrow(joined) <= width) lines[lines.length - 1] = joined;
		else lines.push(word);
	}
	const shown = lines.length > 2 ? [...lines.slice(0, 1), lines.slice(1).join(' ')] : lines;
	return (lines.length > 2 && narrow(shown[1] ?? '') <= width ? lines : shown).map((line) => shortened(line, width));
}

/** A word too long for a line, at its hyphens and where a soft hyphen allows it; long words are built of short ones. */
function divided(word: string, width: number): readonly string[] {
	const whole = word.replaceAll('\u00ad', '');
	if (narrow(whole) <= width) return [whole];
	const [first = '', ...parts] = word.split(/(?<=-)|\u00ad/);
	const lines = [first];
	for (const part of parts) {
		const line = lines.at(-1) ?? '';
		if (narrow(`${line}${part}-`) <= width) lines[lines.length - 1] = line + part;
		else lines.splice(-1, 1, line.endsWith('-') ? line : `${line}-`, part);
	}
	return lines;
}

function shortened(line: string, width: number): string {
	if (narrow(line) <= width) return line;
	let text = line;
	while (text.length > 3 && narrow(`${text}…`) > width) text = text.slice(0, -1);
	return `${text.trimEnd()}…`;
}

const narrow = (text: string): number => roughly(text, 'text', 17) * NARROW;

/** Sofia Sans Condensed is about three quarters as wide as Sofia Sans. */
const NARROW = 0.76;
export const RAIL = 10;
const FIRST = 46;
const COIL = 44;
/** Closer than this a finger would meet two contacts. */
const PITCH = 48;
const LINE = 19;
const HEAD = 42;
const BETWEEN = 66;
const NOTE = 48;
