import {
	lettering,
	MARK_TONES,
	markShapes,
	segment,
	stroke,
	type Mark,
	type Shape,
	type Tone,
	type Voice,
} from '../../drawing';
import type { Flow } from './flow';
import { AREA } from './sheet';
import { wrap } from './wrap';

export type Column = {
	readonly head: string;
	/** Points; columns without a width share what is left. */
	readonly width?: number;
	readonly align?: 'start' | 'end';
	readonly voice?: Voice;
};

export type Cell =
	| string
	| {
			readonly text: string;
			readonly voice?: Voice;
			readonly tone?: Tone;
			readonly mark?: Mark;
			/** How many columns it may run over; the next of them are empty. */
			readonly span?: number;
	  };

export type Row = {
	readonly cells: readonly Cell[];
	/** Belongs to the row above: no rule between them. */
	readonly joined?: true;
	/** Kept and overruled: smaller and grey. */
	readonly superseded?: true;
	/** Under the row, in small type, from the second column on. */
	readonly notes?: readonly Cell[];
};

type Line = { readonly text: string; readonly voice: Voice; readonly tone: Tone; readonly mark?: Mark };
type SetCell = {
	readonly x: number;
	readonly right: number;
	readonly align: 'start' | 'end';
	readonly lines: readonly Line[];
};

/** A table with its head repeated on every sheet. A row is broken only where it is higher than a whole sheet. */
export function table(flow: Flow, columns: readonly Column[], rows: readonly Row[]): void {
	const edges = edgesOf(columns);
	flow.keep(HEAD + 2 * LEAD + 2 * PAD);
	drawHead(flow, columns, edges);
	rows.forEach((row, i) => {
		if (i > 0 && row.joined !== true) flow.rule();
		const next = rows[i + 1];
		drawRow(flow, columns, edges, row, next?.joined === true ? LEAD : 0);
	});
	flow.rule();
	flow.space(3);
}

type Edge = { readonly x: number; readonly width: number };

function edgesOf(columns: readonly Column[]): readonly Edge[] {
	const open = columns.filter(({ width }) => width === undefined).length;
	const given = columns.reduce((sum, { width = 0 }) => sum + width, 0);
	const share = open === 0 ? 0 : (AREA.width - given) / open;
	let x = AREA.x;
	return columns.map(({ width = share }) => {
		const edge = { x, width };
		x += width;
		return edge;
	});
}

function drawHead(flow: Flow, columns: readonly Column[], edges: readonly Edge[]): void {
	const y = flow.y;
	columns.forEach(({ head, align = 'start' }, i) => {
		const edge = edges[i];
		if (edge === undefined) return;
		const x = align === 'end' ? edge.x + edge.width - SIDE : edge.x + SIDE;
		flow.draw(lettering(head, { x, y: y + HEAD - 5.5 }, { size: 8, tone: 'soft', anchor: align }));
	});
	flow.draw(stroke(segment(AREA.x, y + HEAD, AREA.x + AREA.width, y + HEAD), { pen: 'bold' }));
	flow.space(HEAD);
}

/** @param tail height of what must not be parted from the row */
function drawRow(flow: Flow, columns: readonly Column[], edges: readonly Edge[], row: Row, tail: number): void {
	const size = row.superseded === true ? SMALL : SIZE;
	const lead = row.superseded === true ? SMALL_LEAD : LEAD;
	const cells = columns.map((column, i) => setCell(row.cells[i] ?? '', column, edges.slice(i), row));
	const notes = setNotes(row, edges);
	const count = Math.max(1, ...cells.map(({ lines }) => lines.length));
	const again = () => {
		flow.rule();
		flow.keep(Infinity);
		drawHead(flow, columns, edges);
	};
	// The row and the first of its notes stay together; a long tail of notes may go over.
	const together = count * lead + Math.min(notes.length, 2) * SMALL_LEAD + 2 * PAD + tail;
	const moves = together > flow.room && together <= AREA.height - HEAD;
	if (moves) again();
	flow.space(row.joined === true && !moves ? 0 : PAD);
	for (let line = 0; line < count; line++) {
		if (lead > flow.room) again();
		flow.draw(...cells.flatMap((cell) => lineShapes(cell, line, flow.y, { size, lead })));
		flow.space(lead);
	}
	for (const note of notes) {
		if (SMALL_LEAD > flow.room) again();
		flow.draw(...lineShapes(note, 0, flow.y, { size: SMALL, lead: SMALL_LEAD }));
		flow.space(SMALL_LEAD);
	}
	flow.space(PAD);
}

/** @param edges those of the cell's column and of all after it */
function setCell(cell: Cell, column: Column, edges: readonly Edge[], { superseded }: Row): SetCell {
	const {
		text,
		voice = column.voice ?? 'text',
		tone,
		mark,
		span = 1,
	} = typeof cell === 'string' ? ({ text: cell } as Exclude<Cell, string>) : cell;
	const x = edges[0]?.x ?? 0;
	const width = edges.slice(0, span).reduce((sum, edge) => sum + edge.width, 0);
	const size = superseded === true ? SMALL : SIZE;
	const indent = mark === undefined ? 0 : MARK;
	const lines = wrap(text, width - 2 * SIDE - indent, { voice, size });
	const usual = superseded === true ? 'soft' : mark === undefined ? 'ink' : MARK_TONES[mark];
	return {
		x: x + SIDE,
		right: x + width - SIDE,
		align: column.align ?? 'start',
		lines: lines.map((line, i) => ({
			text: line,
			voice: superseded === true ? 'text' : voice,
			tone: tone ?? usual,
			...(i === 0 && mark !== undefined ? { mark } : {}),
		})),
	};
}

/** Notes run from the second column to the right edge. */
function setNotes({ notes = [] }: Row, edges: readonly Edge[]): readonly SetCell[] {
	const x = (edges[1]?.x ?? AREA.x) + SIDE;
	const right = AREA.x + AREA.width - SIDE;
	return notes.flatMap((note) => {
		const { text, voice = 'text', tone = 'soft' } = typeof note === 'string' ? { text: note } : note;
		return wrap(text, right - x, { voice, size: SMALL }).map((line) => ({
			x,
			right,
			align: 'start' as const,
			lines: [{ text: line, voice, tone }],
		}));
	});
}

function lineShapes(
	{ x, right, align, lines }: SetCell,
	line: number,
	y: number,
	{ size, lead }: { size: number; lead: number },
): readonly Shape[] {
	const set = lines[line];
	if (set === undefined) return [];
	const base = y + lead / 2 + size * 0.34;
	const hasMark = lines.some(({ mark }) => mark !== undefined);
	const at = align === 'end' ? right : x + (hasMark ? MARK : 0);
	return [
		...(set.mark === undefined ? [] : markShapes(set.mark, { x: x + 3.6, y: y + lead / 2 }, 7.2)),
		...(set.text === ''
			? []
			: [lettering(set.text, { x: at, y: base }, { size, voice: set.voice, tone: set.tone, anchor: align })]),
	];
}

const HEAD = 17;
const SIZE = 9;
const LEAD = 11.6;
const SMALL = 8.2;
const SMALL_LEAD = 10.6;
const PAD = 3.6;
const SIDE = 3.6;
const MARK = 11;
