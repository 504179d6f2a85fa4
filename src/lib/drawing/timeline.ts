import { apart } from './apart';
import { markShapes, type Mark } from './marks';
import { rectangle, segment } from './path';
import { wallClock } from './plot/frame';
import { roughly } from './roughly';
import { area, lettering, stroke, type Drawing, type Measure, type Shape, type Tone } from './shape';
import { timeStep } from './ticks';

/** A start-up from its opening to its seal; instants in milliseconds. */
export type Timeline = {
	readonly from: number;
	readonly to: number;
	readonly utcOffsetMinutes: number;
	readonly gates: readonly {
		readonly name: string;
		/** From the first proof under it: the thin line. */
		readonly begins: number | undefined;
		/** While it was released: the thick line. */
		readonly released: readonly Span[];
		/** When something was observed under it. */
		readonly proofs: readonly number[];
	}[];
	/** What happened to the plant, across all gates. */
	readonly events: readonly Span[];
	/** Stretches that nobody watched. */
	readonly gaps: readonly Span[];
	readonly notes: readonly { readonly at: number; readonly text: string; readonly tone: Tone; readonly mark?: Mark }[];
};

export type Span = { readonly from: number; readonly to: number };

export type TimelineLook = {
	readonly width: number;
	readonly height: number;
	readonly lettering?: number;
	readonly measure?: Measure;
};

/**
 * The whole start-up on one page, time running down. Each gate is a line: thin from its first proof, thick while it was
 * released; a plant event lies across all of them, so that one sees which lines it cut.
 */
export function drawTimeline(
	line: Timeline,
	{ width, height, lettering: size = 13, measure = roughly }: TimelineLook,
): Drawing {
	const top = size * 2.4;
	const span = Math.max(1, line.to - line.from);
	const y = (at: number): number =>
		top + (Math.min(Math.max(at, line.from), line.to) - line.from) * ((height - top - size) / span);
	const left = measure('00:00', 'text', size) + size;
	const pitch = Math.min(size * 2.8, (width * 0.45) / Math.max(1, line.gates.length));
	const right = left + pitch * line.gates.length;
	const x = (gate: number): number => left + pitch * (gate + 0.5);
	return {
		width,
		height,
		shapes: [
			...hours(line, y, left, right, size),
			...line.events.map(({ from, to }) => band(left, right, y(from), y(to), 'warn-fill')),
			...line.gaps.map(({ from, to }) => band(left, right, y(from), y(to), 'warn-wash')),
			...line.gates.flatMap((gate, i) => gateLine(gate, x(i), y, line.to, size)),
			...line.gates.map(({ name }, i) =>
				lettering(name, { x: x(i), y: size * 1.2 }, { size: size * 1.1, voice: 'title', anchor: 'middle' }),
			),
			...notes(line, y, right, { width, height, size, measure }),
		],
	};
}

type ToY = (at: number) => number;

function hours(
	{ from, to, utcOffsetMinutes }: Timeline,
	y: ToY,
	left: number,
	right: number,
	size: number,
): readonly Shape[] {
	const step = timeStep((to - from) / 1000, 14) * 1000;
	const shift = utcOffsetMinutes * 60_000;
	const first = Math.ceil((from + shift) / step);
	const count = Math.max(0, Math.min(100, Math.floor((to + shift) / step) - first + 1));
	const ticks = Array.from({ length: count }, (_, i) => (first + i) * step);
	return ticks.flatMap((wall) => [
		stroke(segment(left, y(wall - shift), right, y(wall - shift)), { pen: 'hair', tone: 'faint' }),
		lettering(
			wallClock(wall / 1000),
			{ x: left - size * 0.6, y: y(wall - shift) + size * 0.35 },
			{ size, tone: 'soft', anchor: 'end' },
		),
	]);
}

/** Never thinner than can be seen: a stop of two minutes in a day is still a stop. */
const band = (left: number, right: number, from: number, to: number, tone: Tone): Shape =>
	area(rectangle({ x: left, y: from, width: right - left, height: Math.max(1.5, to - from) }), tone);

function gateLine(
	{ begins, released, proofs }: Timeline['gates'][number],
	x: number,
	y: ToY,
	end: number,
	size: number,
): readonly Shape[] {
	const half = size * 0.42;
	return [
		...(begins === undefined ? [] : [stroke(segment(x, y(begins), x, y(end)), { pen: 'line' })]),
		...released.map(({ from, to }) => stroke(segment(x, y(from), x, y(to)), { pen: 'power' })),
		stroke(
			proofs.flatMap((at) => segment(x - half, y(at), x + half, y(at))),
			{ pen: 'hair' },
		),
	];
}

type Sheet = { readonly width: number; readonly height: number; readonly size: number; readonly measure: Measure };

/** What happened, in words beside the lines: pushed apart, smaller when there are many, each led to its moment. */
function notes(
	line: Timeline,
	y: ToY,
	right: number,
	{ width, height, size: usual, measure }: Sheet,
): readonly Shape[] {
	const sorted = [...line.notes].sort((a, b) => a.at - b.at);
	const size = Math.min(usual, (height - usual * 3) / Math.max(1, sorted.length) / 1.3);
	const lines = apart(
		sorted.map(({ at }) => y(at)),
		size * 1.3,
		height - size,
	);
	const [bend, edge] = [right + usual * 0.6, right + usual * 2.4];
	return sorted.flatMap(({ at, text, tone, mark }, i) => {
		const level = lines[i] ?? y(at);
		const x = edge + size * (mark === undefined ? 0.4 : 1.6);
		return [
			stroke([...segment(right, y(at), bend, y(at)), ['L', edge, level]], { pen: 'hair', tone: 'soft' }),
			...(mark === undefined ? [] : markShapes(mark, { x: edge + size * 0.75, y: level }, size * 0.8)),
			lettering(
				text,
				{ x, y: level + size * 0.35 },
				{ size: size * Math.min(1, (width - x) / Math.max(1, measure(text, 'text', size))), tone },
			),
		];
	});
}
