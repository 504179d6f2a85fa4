import { clipped } from '../path';
import type { Box, Point } from '../shape';
import { distance } from './ducts';

/** Something to be put down near its anchor: a bubble with its reading, or the name of a piece of equipment. */
export type Item = {
	readonly anchor: Point;
	readonly places: readonly Place[];
	/** What it may lie on: the equipment that it names. */
	readonly own?: Box;
};

/** The box that an item would take, where its leader would end (a name has none), and what is wrong with the place. */
export type Place = { readonly box: Box; readonly leaderTo?: Point; readonly cost: number };

/** `hard` things are never covered if there is any other place, `soft` ones only when it is worth it. */
export type Obstacles = { readonly hard: readonly Box[]; readonly soft: readonly Box[]; readonly sheet: Box };

/**
 * Puts every item where it covers nothing: each in turn takes its cheapest place, the most bound to its place first; then
 * each may move again, and may push its neighbours to another place. The same plant always gives the same sheet.
 */
export function placeItems(items: readonly Item[], obstacles: Obstacles): readonly Place[] {
	const places = items.map((item) =>
		item.places
			.map((place) => ({ ...place, cost: place.cost + ownCost(item, place, obstacles) }))
			.sort((a, b) => a.cost - b.cost),
	);
	const sheet = new Map<number, Place>();
	for (let round = 0; round < ROUNDS; round++) {
		for (const i of items.keys()) settle(i, items, places, sheet);
		if (round > 0) for (const i of items.keys()) pushNeighbours(i, items, places, sheet);
	}
	return items.map((item, i) => sheet.get(i) ?? { box: { ...item.anchor, width: 0, height: 0 }, cost: 0 });
}

type Sheet = Map<number, Place>;

/** The best place of an item while all others stand still. */
function settle(i: number, items: readonly Item[], places: readonly (readonly Place[])[], sheet: Sheet): void {
	let least = Infinity;
	let best: Place | undefined;
	for (const place of places[i] ?? []) {
		// They are sorted: no later place can be better.
		if (place.cost >= least) break;
		const cost = place.cost + clashes(i, place, items, sheet);
		if (cost < least) [best, least] = [place, cost];
	}
	if (best !== undefined) sheet.set(i, best);
}

/** An item that stands badly tries its own best places once more, each time with those it would cover settling anew. */
function pushNeighbours(i: number, items: readonly Item[], places: readonly (readonly Place[])[], sheet: Sheet): void {
	const now = sheet.get(i);
	if (now === undefined || now.cost + clashes(i, now, items, sheet) < WELL) return;
	for (const place of (places[i] ?? []).slice(0, TRIES)) {
		const trial: Sheet = new Map(sheet).set(i, place);
		const pushed = [...sheet.keys()].filter((other) => other !== i && clashesWith(i, place, other, items, sheet) > 0);
		for (const other of pushed) settle(other, items, places, trial);
		const moved = [i, ...pushed];
		if (costOf(moved, items, trial) >= costOf(moved, items, sheet)) continue;
		for (const [other, stands] of trial) sheet.set(other, stands);
		return;
	}
}

/** What these items pay together, each pair counted once; the others did not move. */
function costOf(some: readonly number[], items: readonly Item[], sheet: Sheet): number {
	let sum = 0;
	for (const [k, i] of some.entries()) {
		const place = sheet.get(i);
		if (place === undefined) continue;
		sum += place.cost;
		for (const other of sheet.keys()) {
			if (!some.slice(0, k + 1).includes(other)) sum += clashesWith(i, place, other, items, sheet);
		}
	}
	return sum;
}

function clashesWith(i: number, place: Place, other: number, items: readonly Item[], sheet: Sheet): number {
	const stands = sheet.get(other);
	return stands === undefined ? 0 : clash(items[i], place, items[other], stands);
}

function clashes(i: number, place: Place, items: readonly Item[], sheet: Sheet): number {
	let sum = 0;
	for (const [other, stands] of sheet) if (other !== i) sum += clash(items[i], place, items[other], stands);
	return sum;
}

function ownCost(item: Item, { box, leaderTo }: Place, { hard, soft, sheet }: Obstacles): number {
	const outside = box.width * box.height - overlap(box, sheet);
	const others = hard.filter((each) => each !== item.own);
	const covered = others.reduce((sum, each) => sum + overlap(grown(box, CLEAR), each), 0);
	const touched = soft.reduce((sum, each) => sum + overlap(box, each), 0);
	const crossed = leaderTo === undefined ? 0 : others.filter((each) => crosses(item.anchor, leaderTo, each)).length;
	return (
		(outside > 0.5 ? COVERED * 10 : 0) +
		(covered > 0.5 ? COVERED + covered : 0) +
		(touched > 0.5 ? 40 + touched : 0) +
		crossed * 60
	);
}

function clash(a: Item | undefined, placeA: Place, b: Item | undefined, placeB: Place): number {
	if (a === undefined || b === undefined) return 0;
	const covered = overlap(grown(placeA.box, CLEAR), placeB.box);
	const [toA, toB] = [placeA.leaderTo, placeB.leaderTo];
	return (
		(covered > 0.5 ? COVERED + covered : 0) +
		(toA !== undefined && crosses(a.anchor, toA, placeB.box) ? 400 : 0) +
		(toB !== undefined && crosses(b.anchor, toB, placeA.box) ? 400 : 0) +
		(toA !== undefined && toB !== undefined && cross(a.anchor, toA, b.anchor, toB) ? 300 : 0)
	);
}

export const overlap = (a: Box, b: Box): number =>
	Math.max(0, Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x)) *
	Math.max(0, Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y));

export const grown = ({ x, y, width, height }: Box, by: number): Box => ({
	x: x - by,
	y: y - by,
	width: width + 2 * by,
	height: height + 2 * by,
});

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

/** More than any leader or preference can cost. */
const COVERED = 1e5;
/** What an item pays where nothing is wrong but a few steps aside. */
const WELL = 60;
const TRIES = 24;
const ROUNDS = 3;
/** Room that lettering keeps around itself. */
const CLEAR = 3;
