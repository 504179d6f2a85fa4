import type { PlotCurve, PlotMark } from '../../calc';
import { hatching, rectangle, segment } from '../path';
import { area, lettering, stroke, type Box, type Measure, type Shape, type Tone } from '../shape';
import type { Frame } from './frame';

/** What lies under the curves: the wash of an event or a hold window, and the hatched guard band. */
export function groundOf(mark: PlotMark, frame: Frame): readonly Shape[] {
	const box = boxOf(mark, frame);
	if (box === undefined) return [];
	if (mark.kind === 'guard') {
		return [area(rectangle(box), 'warn-wash'), stroke(hatching(box, 7), { pen: 'hair', tone: 'warn' })];
	}
	return mark.kind === 'event' ? [area(rectangle(box), 'warn-wash')] : [];
}

export type Lettered = {
	readonly size: number;
	readonly measure: Measure;
	readonly curves: readonly PlotCurve[];
	readonly unit: string;
};

/** What lies over the curves: the limit, the edges of a window, the beginning of an event, and their names. */
export function linesOf(mark: PlotMark, frame: Frame, lettered: Lettered): readonly Shape[] {
	const edges = [mark.at, ...(mark.to === undefined ? [] : [mark.to])].flatMap(
		(value) => shownAt(frame, mark.axis, value) ?? [],
	);
	if (edges.length === 0) return [];
	return mark.axis === 'y' ? level(mark, edges, frame, lettered) : moment(mark, edges, frame, lettered);
}

function level(
	mark: PlotMark,
	edges: readonly number[],
	frame: Frame,
	{ size, measure, curves, unit }: Lettered,
): readonly Shape[] {
	const { box } = frame;
	const across = (at: number) => segment(box.x, at, box.x + box.width, at);
	const [at = 0] = edges;
	const y = mark.kind === 'limit' ? at - size * 0.45 : Math.max(...edges) + size * 1.05;
	const name = [mark.label, shown(mark.at), unit].filter((part) => part !== '').join(' ');
	const width = measure(name, 'strong', size);
	const left = { x: box.x + size, y: y - size, width, height: size * 1.3 };
	const right = { ...left, x: box.x + box.width - size - width };
	const isDrawn = mark.kind === 'window' || mark.kind === 'event';
	const { x } = crowd(right, curves, frame) < crowd(left, curves, frame) ? right : left;
	return [
		...(mark.kind === 'limit' ? [stroke(across(at), { pen: 'bold', tone: 'bad' })] : []),
		...(isDrawn ? [stroke(edges.flatMap(across), { pen: 'line', dash: 'dashed' })] : []),
		lettering(name, { x, y }, { size, voice: 'strong', tone: mark.kind === 'event' ? 'ink' : LABEL_TONES[mark.kind] }),
	];
}

/** How many points of the curves lie where a name would stand. */
const crowd = ({ x, y, width, height }: Box, curves: readonly PlotCurve[], frame: Frame): number =>
	curves.reduce(
		(count, curve) =>
			count +
			curve.x.filter((value, i) => {
				const [atX, atY] = [frame.x.at(value), frame.y.at(curve.y[i] ?? Number.NaN)];
				return atX !== undefined && atY !== undefined && atX >= x && atX <= x + width && atY >= y && atY <= y + height;
			}).length,
		0,
	);

function moment(
	mark: PlotMark,
	edges: readonly number[],
	{ box }: Frame,
	{ size, measure }: Lettered,
): readonly Shape[] {
	const across = (at: number) => segment(at, box.y, at, box.y + box.height);
	const left = Math.min(...edges);
	const isMoment = mark.kind === 'event' && mark.to === undefined;
	const fits = left + size * 0.4 + measure(mark.label, 'strong', size) <= box.x + box.width;
	return [
		stroke(edges.flatMap(across), { pen: 'line', tone: mark.kind === 'limit' ? 'bad' : 'ink', dash: 'dashed' }),
		lettering(
			mark.label,
			{ x: left + size * (fits ? 0.4 : -0.4), y: box.y + size },
			{ size, voice: 'strong', tone: isMoment ? 'ink' : LABEL_TONES[mark.kind], anchor: fits ? 'start' : 'end' },
		),
	];
}

/** A limit is named with its value. */
const shown = (value: number): string => String(Number(value.toPrecision(4))).replace('-', '−');

/** Where a mark lies; undefined for one that the axis does not reach. */
function shownAt({ box, x, y }: Frame, axis: 'x' | 'y', value: number): number | undefined {
	const at = (axis === 'x' ? x : y).at(value);
	const [start, length] = axis === 'x' ? [box.x, box.width] : [box.y, box.height];
	return at !== undefined && at >= start - 0.5 && at <= start + length + 0.5 ? at : undefined;
}

function boxOf({ axis, at, to }: PlotMark, frame: Frame): Box | undefined {
	if (to === undefined) return undefined;
	const [a, b] = [shownAt(frame, axis, at), shownAt(frame, axis, to)];
	if (a === undefined || b === undefined) return undefined;
	const { box } = frame;
	return axis === 'x'
		? { x: Math.min(a, b), y: box.y, width: Math.abs(b - a), height: box.height }
		: { x: box.x, y: Math.min(a, b), width: box.width, height: Math.abs(b - a) };
}

const LABEL_TONES: { readonly [kind in PlotMark['kind']]: Tone } = {
	limit: 'bad',
	guard: 'warn',
	window: 'ok',
	event: 'warn',
};
