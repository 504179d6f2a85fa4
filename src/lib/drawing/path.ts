import type { Box, Point, Segment } from './shape';

export const segment = (x1: number, y1: number, x2: number, y2: number): readonly Segment[] => [
	['M', x1, y1],
	['L', x2, y2],
];

export const polyline = (points: readonly Point[]): readonly Segment[] =>
	points.map(({ x, y }, i) => [i === 0 ? 'M' : 'L', x, y] as const);

export const polygon = (points: readonly Point[]): readonly Segment[] => [...polyline(points), ['Z']];

export const rectangle = ({ x, y, width, height }: Box): readonly Segment[] =>
	polygon([
		{ x, y },
		{ x: x + width, y },
		{ x: x + width, y: y + height },
		{ x, y: y + height },
	]);

export const circle = ({ x, y }: Point, radius: number): readonly Segment[] => {
	const k = radius * QUARTER;
	return [
		['M', x + radius, y],
		['C', x + radius, y + k, x + k, y + radius, x, y + radius],
		['C', x - k, y + radius, x - radius, y + k, x - radius, y],
		['C', x - radius, y - k, x - k, y - radius, x, y - radius],
		['C', x + k, y - radius, x + radius, y - k, x + radius, y],
		['Z'],
	];
};

/** An arc of at most a quarter circle; angles in degrees, clockwise from three o'clock. */
export function arc(centre: Point, radius: number, from: number, to: number): readonly Segment[] {
	const [a, b] = [(from * Math.PI) / 180, (to * Math.PI) / 180];
	const k = (4 / 3) * Math.tan((b - a) / 4) * radius;
	const on = (angle: number): Point => ({
		x: centre.x + radius * Math.cos(angle),
		y: centre.y + radius * Math.sin(angle),
	});
	const [start, end] = [on(a), on(b)];
	return [
		['M', start.x, start.y],
		[
			'C',
			start.x - k * Math.sin(a),
			start.y + k * Math.cos(a),
			end.x + k * Math.sin(b),
			end.y - k * Math.cos(b),
			end.x,
			end.y,
		],
	];
}

export function roundedRectangle({ x, y, width, height }: Box, radius: number): readonly Segment[] {
	const r = Math.min(radius, width / 2, height / 2);
	const k = r * (1 - QUARTER);
	const [right, bottom] = [x + width, y + height];
	return [
		['M', x + r, y],
		['L', right - r, y],
		['C', right - k, y, right, y + k, right, y + r],
		['L', right, bottom - r],
		['C', right, bottom - k, right - k, bottom, right - r, bottom],
		['L', x + r, bottom],
		['C', x + k, bottom, x, bottom - k, x, bottom - r],
		['L', x, y + r],
		['C', x, y + k, x + k, y, x + r, y],
		['Z'],
	];
}

/** Slanted lines that fill a box: what is guarded or forbidden. Clipped here, so that paper and screen need no clip. */
export function hatching({ x, y, width, height }: Box, pitch: number): readonly Segment[] {
	const lines: Segment[] = [];
	for (let at = pitch; at < width + height; at += pitch) {
		const [low, high] = [Math.max(0, at - height), Math.min(width, at)];
		if (high > low) lines.push(['M', x + low, y + at - low], ['L', x + high, y + at - high]);
	}
	return lines;
}

/** The part of a line inside a box (Liang and Barsky, 1984), or nothing. */
export function clipped(a: Point, b: Point, { x, y, width, height }: Box): readonly [Point, Point] | undefined {
	let [t0, t1] = [0, 1];
	const [dx, dy] = [b.x - a.x, b.y - a.y];
	for (const [p, q] of [
		[-dx, a.x - x],
		[dx, x + width - a.x],
		[-dy, a.y - y],
		[dy, y + height - a.y],
	] as const) {
		if (p === 0) {
			if (q < 0) return undefined;
		} else if (p < 0) t0 = Math.max(t0, q / p);
		else t1 = Math.min(t1, q / p);
	}
	if (t0 > t1) return undefined;
	// What rounding leaves of a very long line is put back on the edge.
	const inside = (value: number, from: number, length: number) => Math.min(from + length, Math.max(from, value));
	const onEdge = (point: Point): Point => ({ x: inside(point.x, x, width), y: inside(point.y, y, height) });
	const on = (t: number): Point => onEdge({ x: a.x + t * dx, y: a.y + t * dy });
	return [t0 === 0 ? onEdge(a) : on(t0), t1 === 1 ? onEdge(b) : on(t1)];
}

/** Control points of a quarter circle as a cubic curve: 4/3 (sqrt 2 - 1). */
const QUARTER = (4 / 3) * (Math.SQRT2 - 1);
