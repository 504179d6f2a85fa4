import type { Plot, PlotCurve, PlotMark } from '../../calc';
import { apart } from '../apart';
import { circle, segment } from '../path';
import { roughly } from '../roughly';
import { lettering, stroke, type Dash, type Drawing, type Measure, type Point, type Shape } from '../shape';
import { curveShapes, endOf } from './curves';
import { frameOf, type AxisLook, type Frame } from './frame';
import { groundOf, linesOf } from './marks';

export type PlotLook = {
	readonly width: number;
	readonly height: number;
	readonly x?: AxisLook;
	readonly y?: AxisLook;
	/** Size of the lettering; by default that of a screen. */
	readonly lettering?: number;
	readonly measure?: Measure;
};

/** A calculator's picture: what was read as dots, what was fitted as lines named at their end, the limit with its guard band. */
export function drawPlot(
	plot: Plot,
	{ width, height, x, y, lettering: size = 14, measure = roughly }: PlotLook,
): Drawing {
	const lines = plot.curves.filter((curve) => curve.kind === 'line' || curve.kind === 'steps');
	// A name is said once: a second line of it, such as a floor, belongs to the first.
	const named = lines.filter(({ label }, i) => lines.findIndex((other) => other.label === label) === i);
	const spots = plot.curves.filter(
		(curve) => curve.kind === 'points' && curve.x.length <= FEW && !lines.some(({ label }) => label === curve.label),
	);
	const right = Math.max(
		size * 2,
		...named.map(({ label, decides }) => measure(label, decides === true ? 'title' : 'text', size) + size * 2.2),
	);
	const left = size * 4;
	const box = {
		x: left,
		y: size * 2.2,
		width: Math.max(size, width - left - right),
		height: Math.max(size, height - size * (x?.clock === undefined ? 5.4 : 4.2)),
	};
	const frame = frameOf(plot, box, { ...(x === undefined ? {} : { x }), ...(y === undefined ? {} : { y }) }, size);
	const marks = plot.marks.map((mark) => widened(mark, plot.marks));
	const curves = [...plot.curves].sort((a, b) => layer(a) - layer(b));
	const shapes = [
		...grid(frame),
		...marks.flatMap((mark) => groundOf(mark, frame)),
		...curves.flatMap((curve) => curveShapes(curve, frame, dashOf(curve, named))),
		...marks.flatMap((mark) => linesOf(mark, frame, { size, measure, curves, unit: plot.y.unit })),
		...axes(plot, frame, size, x?.clock !== undefined),
		...endNames(named, frame, size),
		...spots.flatMap((curve) => spotName(curve, frame, { size, measure })),
	];
	return { width, height, shapes };
}

/** A guard that says only where it ends reaches from there to its limit. */
function widened(mark: PlotMark, marks: readonly PlotMark[]): PlotMark {
	if (mark.kind !== 'guard' || mark.to !== undefined) return mark;
	const limit = marks.find(({ kind, axis }) => kind === 'limit' && axis === mark.axis);
	return limit === undefined ? mark : { ...mark, to: limit.at };
}

/** How a curve is told from the others without colour, here and in the table beside the plot. */
export const dashOf = (curve: PlotCurve, lines: readonly PlotCurve[]): Dash | undefined =>
	DASH_CYCLE[lines.filter(({ decides }) => decides !== true).indexOf(curve) % DASH_CYCLE.length] ??
	(lines.includes(curve) ? undefined : 'dotted');

const layer = ({ kind, decides }: PlotCurve): number =>
	({ band: 0, points: 1, steps: 2, line: 3 })[kind] + (decides === true ? 0.5 : 0);

function grid({ box, x, y }: Frame): readonly Shape[] {
	const lines = [
		...x.ticks.flatMap(({ at }) => segment(at, box.y, at, box.y + box.height)),
		...y.ticks.flatMap(({ at }) => segment(box.x, at, box.x + box.width, at)),
	];
	return [stroke(lines, { pen: 'hair', tone: 'faint' })];
}

function axes(plot: Plot, { box, x, y }: Frame, size: number, isClock: boolean): readonly Shape[] {
	const bottom = box.y + box.height;
	const marks = x.ticks.flatMap(({ at }) => segment(at, bottom, at, bottom + size * 0.4));
	const xName = isClock ? '' : [plot.x.label, plot.x.unit].filter((part) => part !== '').join(', ');
	return [
		stroke([...segment(box.x, box.y, box.x, bottom), ...segment(box.x, bottom, box.x + box.width, bottom), ...marks], {
			pen: 'line',
		}),
		...x.ticks.map(({ at, label }) =>
			lettering(label, { x: at, y: bottom + size * 1.5 }, { size, tone: 'soft', anchor: 'middle' }),
		),
		...y.ticks.map(({ at, label }) =>
			lettering(label, { x: box.x - size * 0.6, y: at + size * 0.35 }, { size, tone: 'soft', anchor: 'end' }),
		),
		lettering(
			[plot.y.label, plot.y.unit].filter((part) => part !== '').join(', '),
			{ x: 0, y: size },
			{ size, voice: 'strong' },
		),
		...(xName === ''
			? []
			: [lettering(xName, { x: box.x + box.width, y: bottom + size * 2.9 }, { size, tone: 'soft', anchor: 'end' })]),
	];
}

/** Names at the ends of the curves, pushed apart so that none covers another, each led to its curve by a hairline. */
function endNames(curves: readonly PlotCurve[], frame: Frame, size: number): readonly Shape[] {
	const ends = curves
		.map((curve) => ({ curve, end: endOf(curve, frame) }))
		.filter((each): each is { curve: PlotCurve; end: Point } => each.end !== undefined)
		.sort((a, b) => a.end.y - b.end.y);
	const heights = apart(
		ends.map(({ end }) => end.y),
		size * 1.3,
		frame.box.y + frame.box.height,
	);
	const x = frame.box.x + frame.box.width + size * 1.2;
	return ends.flatMap(({ curve, end }, i) => {
		const y = heights[i] ?? end.y;
		const decides = curve.decides === true;
		return [
			stroke(segment(end.x, end.y, x - size * 0.3, y), { pen: 'hair', tone: 'soft' }),
			lettering(curve.label, { x, y: y + size * 0.35 }, { size, voice: decides ? 'title' : 'text' }),
		];
	});
}

/** A point that stands for itself is ringed and named beside it. */
function spotName(
	curve: PlotCurve,
	frame: Frame,
	{ size, measure }: { readonly size: number; readonly measure: Measure },
): readonly Shape[] {
	const at = endOf(curve, frame);
	if (at === undefined) return [];
	const right = frame.box.x + frame.box.width;
	const fits = at.x + size + measure(curve.label, 'strong', size) < right;
	return [
		stroke(circle(at, size * 0.32), { pen: curve.decides === true ? 'bold' : 'line', fill: 'paper' }),
		lettering(
			curve.label,
			{ x: at.x + (fits ? size * 0.7 : -size * 0.7), y: at.y + size * 1.2 },
			{ size, voice: 'strong', anchor: fits ? 'start' : 'end' },
		),
	];
}

/** So few points are single readings, not a series. */
const FEW = 3;
const DASH_CYCLE: readonly (Dash | undefined)[] = [undefined, 'dashed', 'dotted', 'chain'];
