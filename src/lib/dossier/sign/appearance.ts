import { fail, ok, type Result } from '../../base';
import type { Ink, Inks, NoGlyph } from './ink';

/** What a signature field shows: said once for the printed page, and inside the bytes that its signature covers. */
export type Shown = {
	readonly name: string;
	/** Label and value, in reading order: role, meaning, time with offset, certificate, digest code. */
	readonly lines: readonly { readonly label: string; readonly value: string }[];
	/** Strokes of a pen as points from (0, 0) at the lower left to (1, 1). A picture of a hand, and not the signature. */
	readonly drawn?: readonly (readonly Point[])[];
};

export type Point = { readonly x: number; readonly y: number };

export type Box = { readonly width: number; readonly height: number };

/** The content stream of a field that nobody has signed: the line, and the words that say so. */
export function unsignedAppearance(box: Box, words: string, inks: Inks): Result<string, NoGlyph> {
	const said = text(inks.regular, {
		text: words,
		size: small(box),
		x: 0,
		y: box.height * NAME_AT,
		room: lineEnd(box),
		tone: QUIET,
	});
	return said.ok ? ok([line(box), said.value].join('\n')) : said;
}

/** Left: the drawn hand over a line, the printed name under it. Right: two columns of label over value. */
export function signedAppearance(box: Box, shown: Shown, inks: Inks): Result<string, NoGlyph> {
	const parts = [line(box), ...(shown.drawn ?? []).map((stroke) => pen(box, stroke))];
	const name = text(inks.strong, {
		text: shown.name,
		size: large(box),
		x: 0,
		y: box.height * NAME_AT,
		room: lineEnd(box),
		tone: INK,
	});
	if (!name.ok) return name;
	parts.push(name.value);
	const rows = Math.ceil(shown.lines.length / COLUMNS.length);
	for (const [i, { label, value }] of shown.lines.entries()) {
		const column = i % COLUMNS.length;
		const [left = 0, right = 1] = [COLUMNS[column], COLUMNS[column + 1]];
		const top = box.height * (1 - Math.floor(i / COLUMNS.length) / rows);
		const place = { x: left * box.width, room: (right - left - GAP) * box.width };
		const above = text(inks.regular, { ...place, text: label, size: small(box), y: top - small(box), tone: QUIET });
		const below = text(inks.strong, {
			...place,
			text: value,
			size: large(box),
			y: top - small(box) - large(box) * 1.15,
			tone: INK,
		});
		if (!above.ok) return above;
		if (!below.ok) return below;
		parts.push(above.value, below.value);
	}
	return ok(parts.join('\n'));
}

/** One line of text that shrinks until it fits its room: a long name stays whole. */
function text(
	ink: Ink,
	said: {
		readonly text: string;
		readonly size: number;
		readonly x: number;
		readonly y: number;
		readonly room: number;
		readonly tone: string;
	},
): Result<string, NoGlyph> {
	const glyphs = ink.encode(said.text);
	if (!glyphs.ok) return fail({ kind: 'no-glyph', codePoint: glyphs.error.codePoint, text: said.text });
	const { hex, width } = glyphs.value;
	const size = Math.min(said.size, (said.room * 1000) / Math.max(width, 1));
	return ok(
		`BT /${ink.resource} ${number(size)} Tf ${said.tone} rg ${number(said.x)} ${number(said.y)} Td <${hex}> Tj ET`,
	);
}

function pen(box: Box, stroke: readonly Point[]): string {
	const [bottom, top] = [box.height * (LINE_AT + 0.04), box.height * 0.96];
	const inside = (value: number) => Math.min(1, Math.max(0, value));
	const path = stroke.map(({ x, y }, i) => {
		const at = `${number(inside(x) * lineEnd(box))} ${number(bottom + inside(y) * (top - bottom))}`;
		return `${at} ${i === 0 ? 'm' : 'l'}`;
	});
	return path.length < 2 ? '' : `q ${HAND} RG 1.6 w 1 J 1 j ${path.join(' ')} S Q`;
}

const line = (box: Box): string =>
	`q ${INK} RG 0.8 w 0 ${number(box.height * LINE_AT)} m ${number(lineEnd(box))} ${number(box.height * LINE_AT)} l S Q`;

const lineEnd = (box: Box): number => box.width * 0.36;
const small = (box: Box): number => Math.min(7, box.height * 0.08);
const large = (box: Box): number => Math.min(9.5, box.height * 0.11);

/** Never in exponent form, which PDF does not know. */
const number = (value: number): string => String(Number(value.toFixed(3)));

const LINE_AT = 0.3;
const NAME_AT = 0.12;
/** Where the columns begin, in parts of the width. */
const COLUMNS = [0.4, 0.71] as const;
const GAP = 0.02;

// The tones of the sheet: ink, quiet ink, and the violet of a person's hand.
const INK = '0.071 0.125 0.165';
const QUIET = '0.271 0.322 0.357';
const HAND = '0.29 0.153 0.522';
