import type { Plant } from '../../plant';
import { polygon, polyline } from '../path';
import { area, stroke, type Point, type Shape } from '../shape';

type Duct = Plant['ducts'][number];
export type Run = {
	readonly medium: Duct['medium'];
	readonly points: readonly Point[];
	/** Without a direction of its own. */
	readonly still?: true;
};

/** Gas runs in ducts with two walls; inert gas in a chain line, fuel and dust in a bold one. */
const GAS: ReadonlySet<Duct['medium']> = new Set(['process gas', 'hot gas', 'fresh air', 'stack gas']);
export const hasWalls = ({ medium }: Run): boolean => GAS.has(medium);

/** All walls first and then all insides, so that ducts open into each other where they meet. */
export function ductShapes(runs: readonly Run[], width: number): readonly Shape[] {
	const gas = runs.filter((run) => hasWalls(run) && run.points.length > 1);
	return [
		...gas.map(({ points }) => stroke(polygon(outline(points, width / 2)), { pen: 'line' })),
		...gas.map(({ points }) => area(polygon(outline(lengthened(points, width / 2), width / 2 - 0.8)), 'paper')),
		...runs
			.filter((run) => !hasWalls(run) && run.points.length > 1)
			.map((run) =>
				run.medium === 'inert gas'
					? stroke(polyline(run.points), { pen: 'line', dash: 'chain' })
					: stroke(polyline(run.points), { pen: 'bold' }),
			),
	];
}

/** Arrows in the direction of flow: in ducts on every long piece, on lines where they end. */
export function arrowShapes(run: Run, size: number, keepClear: readonly Point[]): readonly Shape[] {
	if (run.still === true) return [];
	const pieces = piecesOf(run.points);
	const last = pieces.at(-1);
	if (!hasWalls(run))
		return last === undefined || last.length === 0
			? []
			: [arrow(between(last.a, last.b, 1 - (size * 0.6) / last.length), directionOf(last), size)];
	const longest = Math.max(0, ...pieces.map(({ length }) => length));
	return pieces
		.filter(({ length }) => length > size * 2 && (length === longest || length > size * 16))
		.flatMap(({ a, b, length }) => {
			const at = [0.5, 0.35, 0.65, 0.2, 0.8].map((part) => between(a, b, part));
			const free = at.find((spot) => keepClear.every((point) => distance(point, spot) > size * 2.2));
			return free === undefined ? [] : [arrow(free, directionOf({ a, b, length }), size)];
		});
}

const directionOf = ({ a, b, length }: Piece): Point => ({ x: (b.x - a.x) / length, y: (b.y - a.y) / length });

function arrow(at: Point, along: Point, size: number): Shape {
	const on = (forward: number, aside: number): Point => ({
		x: at.x + forward * along.x * size - aside * along.y * size,
		y: at.y + forward * along.y * size + aside * along.x * size,
	});
	return area(polygon([on(0.6, 0), on(-0.6, 0.45), on(-0.6, -0.45)]), 'ink');
}

export type Piece = { readonly a: Point; readonly b: Point; readonly length: number };

export const piecesOf = (points: readonly Point[]): readonly Piece[] =>
	points.slice(1).flatMap((b, i) => {
		const a = points[i];
		return a === undefined ? [] : [{ a, b, length: distance(a, b) }];
	});

export const distance = (a: Point, b: Point): number => Math.hypot(a.x - b.x, a.y - b.y);

export const between = (a: Point, b: Point, part: number): Point => ({
	x: a.x + (b.x - a.x) * part,
	y: a.y + (b.y - a.y) * part,
});

/** The point of a piece that is nearest to another point. */
export function nearest(point: Point, { a, b, length }: Piece): Point {
	if (length === 0) return a;
	const part = ((point.x - a.x) * (b.x - a.x) + (point.y - a.y) * (b.y - a.y)) / length ** 2;
	return between(a, b, Math.min(1, Math.max(0, part)));
}

/** The two walls of a run with mitred corners, as one outline. */
function outline(points: readonly Point[], half: number): readonly Point[] {
	const side = (sign: 1 | -1) => points.map((point, i) => shifted(points[i - 1], point, points[i + 1], half * sign));
	return [...side(1), ...side(-1).reverse()];
}

function shifted(before: Point | undefined, at: Point, after: Point | undefined, by: number): Point {
	const first = normal(before ?? at, before === undefined ? (after ?? at) : at);
	const second = normal(after === undefined ? (before ?? at) : at, after ?? at);
	const mean = { x: first.x + second.x, y: first.y + second.y };
	// A mitre grows without bound as a run turns back on itself: cut at three half widths.
	const scale = Math.min(3, 2 / Math.max(1e-6, mean.x ** 2 + mean.y ** 2));
	return { x: at.x + mean.x * scale * by, y: at.y + mean.y * scale * by };
}

function normal(a: Point, b: Point): Point {
	const length = distance(a, b) || 1;
	return { x: -(b.y - a.y) / length, y: (b.x - a.x) / length };
}

function lengthened(points: readonly Point[], by: number): readonly Point[] {
	const ends = (end: Point, inside: Point | undefined): Point =>
		inside === undefined || distance(end, inside) === 0 ? end : between(inside, end, 1 + by / distance(inside, end));
	return points.map((point, i) =>
		i === 0 ? ends(point, points[1]) : i === points.length - 1 ? ends(point, points[i - 1]) : point,
	);
}
