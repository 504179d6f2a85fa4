import { roughly } from '../../drawing';
import type { LeaderNote } from './leader-notes';
import type { ShownContact, ShownRung } from './shown-rungs';

/** A piece of a long rung on its own line, joined to the next by a lettered connector. */
export type Row = {
	readonly letter: string;
	readonly contacts: readonly Placed[];
	readonly y: number;
	readonly isFirst: boolean;
	readonly isLast: boolean;
	/** The power line runs to its end. */
	readonly leads: boolean;
	readonly reached: boolean;
};

type Placed = {
	readonly contact: ShownContact;
	readonly x: number;
	readonly lines: readonly string[];
	readonly lift: number;
};

export type PlacedNote = {
	readonly note: LeaderNote;
	readonly y: number;
	readonly x: number;
	readonly foot: number;
	readonly textX: number;
	readonly anchor: 'start' | 'end';
	readonly edge: number;
};

export type OpenedRung = {
	readonly rows: readonly Row[];
	readonly notes: readonly PlacedNote[];
	readonly height: number;
	readonly coil: { readonly x: number; readonly y: number };
};

/** The rung in work, opened: names over its contacts, words under them, and the notes led to them. */
export function openRung(rung: ShownRung, notes: readonly LeaderNote[], width: number): OpenedRung {
	const [left, right] = [RAIL + FIRST, width - RAIL - COIL];
	const fits = Math.max(4, Math.floor((right - 60 - left) / PITCH) + 1);
	const count = Math.max(1, Math.ceil(rung.contacts.length / fits));
	const length = Math.ceil(rung.contacts.length / count);
	const pitch = Math.min(84, (right - 62 - left) / Math.max(1, length - 1));
	const rows = Array.from({ length: count }, (_, k): Row => {
		const own = rung.contacts.slice(k * length, (k + 1) * length);
		const crowded = own.some(({ label }) => wrapped(label, pitch - 5).length > 2);
		const contacts = own.map((contact, i): Placed => {
			const lines = wrapped(contact.label, crowded ? 2 * pitch - 8 : pitch - 5).slice(0, 2);
			return { contact, x: Math.round(left + i * pitch), lines, lift: crowded && i % 2 === 1 ? 40 : 0 };
		});
		return {
			letter: String.fromCharCode(97 + k),
			contacts,
			y: HEAD + k * ROW,
			isFirst: k === 0,
			isLast: k === count - 1,
			leads: own.every(({ state }) => state === 'stands' || state === 'not applicable') && own.every((c) => c.powered),
			reached: own[0]?.powered ?? rung.reached,
		};
	});
	const end = HEAD + (count - 1) * ROW;
	const placed = placeNotes(rows, notes, width);
	return {
		rows,
		notes: placed,
		coil: { x: right, y: end },
		height: end + 62 + placed.length * NOTE + 6,
	};
}

/** Leftmost first while every text has room on the left of its leader, so that none crosses; else rightmost first. */
function placeNotes(rows: readonly Row[], notes: readonly LeaderNote[], width: number): readonly PlacedNote[] {
	const lastRow = rows.at(-1);
	if (lastRow === undefined) return [];
	const found = notes.slice(0, MOST_NOTES).flatMap((note) => {
		const row = rows.find(({ contacts }) => contacts.some(({ contact }) => contact.id === note.contact));
		const at = row?.contacts.find(({ contact }) => contact.id === note.contact);
		const length = roughly(`${note.word} ${note.text}`, 'strong', 18) + 8;
		return row === undefined || at === undefined ? [] : [{ note, row, x: at.x, length }];
	});
	const allLeft = found.every(({ x, length }) => TEXT + length + 18 <= x);
	const ordered = allLeft ? found : [...found].sort((a, b) => b.x - a.x);
	return ordered.map(({ note, row, x, length }, k): PlacedNote => {
		const y = lastRow.y + 62 + k * NOTE + 24;
		const foot = row.y + 52;
		if (allLeft) return { note, y, x, foot, textX: TEXT, anchor: 'start', edge: TEXT + length };
		const fits = x + 22 + length <= width - RAIL;
		return fits
			? { note, y, x, foot, textX: x + 20, anchor: 'start', edge: x + 14 }
			: {
					note,
					y,
					x,
					foot,
					textX: Math.max(x - 20, TEXT + length),
					anchor: 'end',
					edge: Math.max(x - 14, TEXT + length),
				};
	});
}

/** In lines of at most this width; the letters are the narrow ones. */
function wrapped(label: string, width: number): readonly string[] {
	const lines: string[] = [];
	for (const word of label.split(' ')) {
		const last = lines.at(-1);
		const joined = last === undefined ? word : `${last} ${word}`;
		if (last !== undefined && narrow(joined) <= width) lines[lines.length - 1] = joined;
		else lines.push(word);
	}
	return lines.map((line) => shortened(line, width));
}

function shortened(line: string, width: number): string {
	if (narrow(line) <= width) return line;
	let text = line;
	while (text.length > 3 && narrow(`${text}…`) > width) text = text.slice(0, -1);
	return `${text}…`;
}

const narrow = (text: string): number => roughly(text, 'text', 17) * NARROW;

/** Sofia Sans Condensed is about three quarters as wide as Sofia Sans. */
const NARROW = 0.76;
export const RAIL = 10;
const FIRST = 46;
const COIL = 44;
const PITCH = 56;
const HEAD = 118;
const ROW = 140;
const NOTE = 48;
const TEXT = 26;
const MOST_NOTES = 4;
