import { clipped } from '../path';
import type { Box, Point } from '../shape';
import { distance } from './ducts';
import type { Item, Obstacles, Place } from './item';

/** More than any leader or preference can cost. */
const COVERED = 1e5;
/** Room that lettering keeps around itself. */
const CLEAR = 3;

/** A place with all that it touches: what lies elsewhere cannot clash with it. */
export type Reached = Place & { readonly reach: Box };

export const reached = ({ anchor }: Item, place: Place): Reached => {
	const { box, leaderTo } = place;
	const reach =
		leaderTo === undefined
			? box
			: around([anchor, leaderTo, { x: box.x, y: box.y }, { x: box.x + box.width, y: box.y + box.height }]);
	return { ...place, reach: grown(reach, CLEAR) };
};

/** What a place costs by itself: over the edge, over equipment and ducts, its leader through them. */
export function costOfPlace(item: Item, { box, leaderTo, cost }: Place, { hard, soft, sheet }: Obstacles): number {
	const outside = box.width * box.height - overlap(box, sheet);
	const others = hard.filter((each) => each !== item.own);
	const covered = others.reduce((sum, each) => sum + overlap(grown(box, CLEAR), each), 0);
	const touched = soft.reduce((sum, each) => sum + overlap(box, each), 0);
	const crossed = leaderTo === undefined ? 0 : others.filter((each) => crosses(item.anchor, leaderTo, each)).length;
	return (
		cost +
		(outside > 0.5 ? COVERED * 10 : 0) +
		(covered > 0.5 ? COVERED + covered : 0) +
		(touched > 0.5 ? 40 + touched : 0) +
		crossed * 60
	);
}

/** What two items cost each other: lettering over lettering, a leader through it, leaders that cross. */
export function clash(a: Item, placeA: Reached, b: Item, placeB: Reached): number {
	const covered = overlap(grown(placeA.box, CLEAR), placeB.box);
	const [toA, toB] = [placeA.leaderTo, placeB.leaderTo];
	return (
		(covered > 0.5 ? COVERED + covered : 0) +
		(toA !== undefined && crosses(a.anchor, toA, placeB.box) ? 400 : 0) +
		(toB !== undefined && crosses(b.anchor, toB, placeA.box) ? 400 : 0) +
		(toA !== undefined && toB !== undefined && cross(a.anchor, toA, b.anchor, toB) ? 300 : 0)
	);
}

const overlap = (a: Box, b: Box): number =>
	Math.max(0, Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x)) *
	Math.max(0, Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y));

export const grown = ({ x, y, width, height }: Box, by: number): Box => ({
	x: x - by,
	y: y - by,
	width: width + 2 * by,
	height: height + 2 * by,
});

/** The smallest box that holds all points. */
export function around(points: readonly Point[]): Box {
	const [xs, ys] = [points.map(({ x }) => x), points.map(({ y }) => y)];
	const [x, y] = [Math.min(...xs), Math.min(...ys)];
	return { x, y, width: Math.max(...xs) - x, height: Math.max(...ys) - y };
}

/** A line that runs more than a touch inside a box; where it starts inside, only its way out counts. */
function crosses(from: Point, to: Point, box: Box): boolean {
	if (isWithin(from, box)) return false;
	const piece = clipped(from, to, box);
	return piece !== undefined && distance(piece[0], piece[1]) > 2;
}

const isWithin = ({ x, y }: Point, box: Box): boolean =>
	x >= box.x && x <= box.x + box.width && y >= box.y && y <= box.y + box.height;

function cross(a: Point, b: Point, c: Point, d: Point): boolean {
	const turn = (p: Point, q: Point, r: Point) => (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x);
	return turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0;
}
