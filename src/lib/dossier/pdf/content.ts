import { fail, ok, type Result } from '../../base';
import {
	COLOURS,
	DASHES,
	type PathShape,
	type Pen,
	type Segment,
	type Shape,
	type TextShape,
	type Tone,
} from '../../drawing';
import { FACES, VOICES } from '../fonts/faces';
import type { NoGlyph } from '../sign/ink';

/**
 * Shapes as a PDF content stream (ISO 32000-1, clauses 8 and 9). Shapes grow downwards from the top of the sheet, PDF
 * upwards from its foot: every point is turned over here, and nowhere else.
 */
export function contentOf(shapes: readonly Shape[], sheetHeight: number): Result<string, NoGlyph> {
	const lines: string[] = [];
	for (const shape of shapes) {
		const written = write(shape, sheetHeight);
		if (!written.ok) return written;
		lines.push(written.value);
	}
	return ok(lines.join('\n'));
}

function write(shape: Shape, height: number): Result<string, NoGlyph> {
	switch (shape.kind) {
		case 'path':
			return ok(writePath(shape, height));
		case 'text':
			return writeText(shape, height);
		case 'group':
			return contentOf(shape.shapes, height);
	}
}

function writePath({ path, pen, tone = 'ink', dash, fill }: PathShape, height: number): string {
	if (path.length === 0 || (pen === undefined && fill === undefined)) return '';
	const setup = [
		...(fill === undefined ? [] : [`${RGB[fill]} rg`]),
		...(pen === undefined ? [] : [`${RGB[tone]} RG ${number(PENS[pen])} w ${pen === 'dot' ? 1 : 0} J`]),
		...(dash === undefined ? [] : [`[${DASHES[dash].map((length) => number(length * DASH)).join(' ')}] 0 d`]),
	];
	const paint = pen === undefined ? 'f' : fill === undefined ? 'S' : 'B';
	return `q ${setup.join(' ')} ${path.map((segment) => writeSegment(segment, height)).join(' ')} ${paint} Q`;
}

function writeSegment(segment: Segment, height: number): string {
	switch (segment[0]) {
		case 'M':
			return `${number(segment[1])} ${number(height - segment[2])} m`;
		case 'L':
			return `${number(segment[1])} ${number(height - segment[2])} l`;
		case 'C': {
			const [, x1, y1, x2, y2, x, y] = segment;
			return `${[x1, height - y1, x2, height - y2, x, height - y].map(number).join(' ')} c`;
		}
		case 'Z':
			return 'h';
	}
}

function writeText({ text, x, y, size, voice, tone, anchor }: TextShape, height: number): Result<string, NoGlyph> {
	const { face, tracking } = VOICES[voice];
	const set = FACES[face].set(text.normalize('NFC'), tracking);
	if (!set.ok) return fail(set.error);
	const width = (set.value.width * size) / 1000;
	const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
	const at = `${number(left)} ${number(height - y)} Td`;
	return ok(`BT /${face} ${number(size)} Tf ${RGB[tone]} rg ${at} ${showing(set.value.glyphs)} TJ ET`);
}

/** Glyph codes with what lies between them; a TJ number moves to the left, so it is what is added with its sign turned. */
function showing(glyphs: readonly { readonly id: number; readonly after: number }[]): string {
	const parts: string[] = [];
	let run = '';
	for (const { id, after } of glyphs) {
		run += id.toString(16).padStart(4, '0');
		if (after === 0) continue;
		parts.push(`<${run}> ${number(-after)}`);
		run = '';
	}
	return `[${[...parts, ...(run === '' ? [] : [`<${run}>`])].join(' ')}]`;
}

/** Three decimals, never in exponent form, which PDF does not know. A number that is none must never reach a sheet. */
export function number(value: number): string {
	if (!Number.isFinite(value)) throw new TypeError(`${String(value)} cannot be drawn`);
	return String(Number(value.toFixed(3)) || 0);
}

const rgb = (colour: string): string =>
	[1, 3, 5].map((at) => number(parseInt(colour.slice(at, at + 2), 16) / 255)).join(' ');

const RGB = Object.fromEntries(Object.entries(COLOURS).map(([tone, colour]) => [tone, rgb(colour)])) as {
	readonly [tone in Tone]: string;
};

/** Pens on paper, in points. */
const PENS: { readonly [pen in Pen]: number } = { hair: 0.5, line: 0.8, bold: 1.7, power: 3.6, dot: 1.3 };
/** Dashes are drawn for the screen: on paper they are this much shorter. */
const DASH = 0.5;
