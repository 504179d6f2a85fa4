import { tick } from './ladder/coil';
import { clockShapes } from './ladder/contact';
import { polygon, rectangle, segment } from './path';
import { area, stroke, type Point, type Shape, type Tone } from './shape';

/** The mark beside a word of state: shape and colour say the same as the word. */
export type Mark = 'stands' | 'not yet' | 'waits' | 'lapsed' | 'failed' | 'not applicable' | 'warning';

export const MARK_TONES: { readonly [mark in Mark]: Tone } = {
	stands: 'ok',
	'not yet': 'soft',
	waits: 'soft',
	lapsed: 'warn',
	failed: 'bad',
	'not applicable': 'soft',
	warning: 'warn',
};

/** Centred on `at`, as high as `size`. */
export function markShapes(mark: Mark, at: Point, size: number): readonly Shape[] {
	const { x, y } = at;
	const half = size / 2;
	const box = { x: x - half, y: y - half, width: size, height: size };
	switch (mark) {
		case 'stands':
			return [area(rectangle(box), 'ok-fill'), tick(at, half * 1.05)];
		case 'not yet':
			return [stroke(rectangle(box), { pen: 'line', fill: 'paper' })];
		case 'waits':
			return [
				stroke(rectangle(box), { pen: 'line', fill: 'paper' }),
				...[-0.22, 0.22].map((d) =>
					stroke(segment(x + d * size, y - half / 2, x + d * size, y + half / 2), { pen: 'line' }),
				),
			];
		case 'lapsed':
			return clockShapes(at, half);
		case 'failed':
			return [
				area(diamond(at, half * 1.2), 'bad'),
				stroke(segment(x - half * 0.45, y + half * 0.45, x + half * 0.45, y - half * 0.45), {
					pen: 'line',
					tone: 'paper',
				}),
			];
		case 'not applicable':
			return [
				stroke(rectangle(box), { pen: 'line', tone: 'soft', dash: 'dotted' }),
				stroke(segment(x - half / 2, y, x + half / 2, y), { pen: 'line', tone: 'soft' }),
			];
		case 'warning':
			return warning(at, half);
	}
}

const diamond = ({ x, y }: Point, half: number) =>
	polygon([
		{ x, y: y - half },
		{ x: x + half, y },
		{ x, y: y + half },
		{ x: x - half, y },
	]);

/** The triangle of ISO 7010 (from memory, verify), with its exclamation mark. */
function warning({ x, y }: Point, half: number): readonly Shape[] {
	const triangle = polygon([
		{ x, y: y - half },
		{ x: x + half * 1.12, y: y + half * 0.86 },
		{ x: x - half * 1.12, y: y + half * 0.86 },
	]);
	const mark = [...segment(x, y - half * 0.34, x, y + half * 0.28), ...segment(x, y + half * 0.5, x, y + half * 0.62)];
	return [stroke(triangle, { pen: 'line', fill: 'warn-fill' }), stroke(mark, { pen: 'line' })];
}
