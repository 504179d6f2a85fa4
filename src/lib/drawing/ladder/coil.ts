import { arc, circle, polyline, segment } from '../path';
import { area, stroke, type Point, type Segment, type Shape } from '../shape';
import type { CoilState } from './rungs';

/**
 * The hold point at the end of a rung, as a coil. Two arcs: not ready; ringed: ready to be released; a filled disc with a
 * tick: released; a disc cut in two: released, then lapsed; the cut disc unfilled: held by a lower gate; a slash: refused.
 */
export function coilShapes(state: CoilState, at: Point, radius: number): readonly Shape[] {
	switch (state) {
		case 'not ready':
			return [arcs(at, radius, 'line')];
		case 'ready':
			return [arcs(at, radius, 'bold'), stroke(circle(at, radius + 5), { pen: 'bold', tone: 'must' })];
		case 'released':
			return [area(circle(at, radius), 'ok-fill'), tick(at, radius)];
		case 'lapsed':
			return halves(at, radius).map((half) => stroke(half, { pen: 'line', fill: 'warn-fill' }));
		case 'held':
			return halves(at, radius).map((half) => stroke(half, { pen: 'line', fill: 'paper' }));
		case 'refused':
			return [
				arcs(at, radius, 'bold'),
				stroke(segment(at.x - radius, at.y + radius * 0.8, at.x + radius, at.y - radius * 0.8), {
					pen: 'bold',
					tone: 'bad',
				}),
			];
	}
}

/** A tick on a filled disc, drawn as a path: no font needs to have it. */
export const tick = ({ x, y }: Point, radius: number): Shape =>
	stroke(
		polyline([
			{ x: x - radius * 0.45, y: y + radius * 0.04 },
			{ x: x - radius * 0.11, y: y + radius * 0.4 },
			{ x: x + radius * 0.51, y: y - radius * 0.34 },
		]),
		{ pen: radius < 9 ? 'line' : 'bold', tone: 'paper' },
	);

const arcs = (at: Point, radius: number, pen: 'line' | 'bold'): Shape => {
	// 61 degrees to either side, as two arcs each.
	const side = (middle: number) => [...arc(at, radius, middle - 61, middle), ...arc(at, radius, middle, middle + 61)];
	return stroke([...side(180), ...side(0)], { pen });
};

function halves(at: Point, radius: number): readonly (readonly Segment[])[] {
	// Where the cut, four tenths of the radius wide, meets the circle.
	const edge = (Math.acos(0.2) * 180) / Math.PI;
	return [180, 0].map((middle) => [
		...arc(at, radius, middle - edge, middle),
		...arc(at, radius, middle, middle + edge).slice(1),
		['Z'],
	]);
}
