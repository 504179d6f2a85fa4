import type { PlotMark } from '../../calc';
import { hatching, rectangle, segment } from '../path';
import { area, lettering, stroke, type Box, type Shape, type Tone } from '../shape';
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

/** What lies over the curves: the limit, the edges of a window, the beginning of an event, and their names. */
export function linesOf(mark: PlotMark, frame: Frame, size: number): readonly Shape[] {
	const { box } = frame;
	const scale = mark.axis === 'x' ? frame.x : frame.y;
	const edges = [mark.at, ...(mark.to === undefined ? [] : [mark.to])].map(scale.at).filter((at) => at !== undefined);
	if (edges.length === 0) return [];
	const across = (at: number) =>
		mark.axis === 'y' ? segment(box.x, at, box.x + box.width, at) : segment(at, box.y, at, box.y + box.height);
	if (mark.axis === 'y') {
		const [at] = edges as [number];
		const below = edges.length > 1 ? Math.max(...edges) : at;
		const y = mark.kind === 'limit' ? at - size * 0.45 : below + size * 1.05;
		return [
			...(mark.kind === 'limit' ? [stroke(across(at), { pen: 'bold', tone: 'bad' })] : []),
			...(mark.kind === 'window' ? [stroke(edges.flatMap(across), { pen: 'line', dash: 'dashed' })] : []),
			lettering(mark.label, { x: box.x + size, y }, { size, voice: 'strong', tone: LABEL_TONES[mark.kind] }),
		];
	}
	const left = Math.min(...edges);
	return [
		stroke(edges.flatMap(across), { pen: 'line', tone: mark.kind === 'limit' ? 'bad' : 'ink', dash: 'dashed' }),
		lettering(
			mark.label,
			{ x: left + size * 0.4, y: box.y + size },
			{ size, voice: 'strong', tone: LABEL_TONES[mark.kind] },
		),
	];
}

function boxOf({ axis, at, to }: PlotMark, frame: Frame): Box | undefined {
	if (to === undefined) return undefined;
	const scale = axis === 'x' ? frame.x : frame.y;
	const [a, b] = [scale.at(at), scale.at(to)];
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
