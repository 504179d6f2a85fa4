import type { Box } from '../shape';
import { clash, costOfPlace, reached, type Reached } from './clash';
import type { Item, Obstacles, Place } from './item';

/**
 * Puts every item where it covers nothing, as well as two orders of trying find it: each in turn takes its
 * cheapest place; then each may move again, and may push its neighbours on. The same plant always gives the same sheet.
 */
export function placeItems(items: readonly Item[], obstacles: Obstacles): readonly Place[] {
	const choices = items.map((item) => ({
		item,
		places: item.places
			.map((place) => reached(item, { ...place, cost: costOfPlace(item, place, obstacles) }))
			.sort((a, b) => a.cost - b.cost),
	}));
	const order = [...choices.keys()];
	const freedom = choices.map(({ places }) => places.filter(({ cost }) => cost < WELL).length);
	const orders = [order, [...order].sort((a, b) => (freedom[a] ?? 0) - (freedom[b] ?? 0))];
	const tried = orders.map((each) => new Placing(choices, each));
	const best = tried.reduce((least, each) => (each.cost < least.cost ? each : least));
	return items.map((item, i) => best.place(i) ?? { box: { ...item.anchor, width: 0, height: 0 }, cost: 0 });
}

type Choice = { readonly item: Item; readonly places: readonly Reached[] };
/** Where each item stands, by its number; undefined until it has been put down. */
type Sheet = (Reached | undefined)[];

/** One way of putting all items down. */
class Placing {
	readonly cost: number;
	readonly #choices: readonly Choice[];
	#sheet: Sheet;

	constructor(choices: readonly Choice[], order: readonly number[]) {
		this.#choices = choices;
		this.#sheet = choices.map(() => undefined);
		for (let round = 0; round < ROUNDS; round++) {
			for (const i of order) this.#settle(i, this.#sheet);
			if (round > 0) for (const i of order) this.#pushNeighbours(i);
		}
		this.cost = this.#costOf(order, this.#sheet);
	}

	place(i: number): Place | undefined {
		return this.#sheet[i];
	}

	/** The best place of an item while all others stand still. */
	#settle(i: number, sheet: Sheet): void {
		let least = Infinity;
		for (const place of this.#choices[i]?.places ?? []) {
			// They are sorted: no later place can be better.
			if (place.cost >= least) return;
			const cost = place.cost + this.#clashes(i, place, sheet);
			if (cost < least) [sheet[i], least] = [place, cost];
		}
	}

	/** An item that stands badly tries its own best places once more, each time with those it would cover settling anew. */
	#pushNeighbours(i: number): void {
		const now = this.#sheet[i];
		if (now === undefined || now.cost + this.#clashes(i, now, this.#sheet) < WELL) return;
		for (const place of (this.#choices[i]?.places ?? []).slice(0, TRIES)) {
			const trial = this.#sheet.with(i, place);
			const pushed = trial.flatMap((_, other) => (this.#clash(i, place, other, this.#sheet) > 0 ? [other] : []));
			for (const other of pushed) this.#settle(other, trial);
			const moved = [i, ...pushed];
			if (this.#costOf(moved, trial) >= this.#costOf(moved, this.#sheet)) continue;
			this.#sheet = trial;
			return;
		}
	}

	/** What these items pay together, each pair counted once; the others did not move. */
	#costOf(some: readonly number[], sheet: Sheet): number {
		let sum = 0;
		for (const [k, i] of some.entries()) {
			const place = sheet[i];
			if (place === undefined) continue;
			sum += place.cost + this.#clashes(i, place, sheet);
			for (const other of some.slice(0, k)) sum -= this.#clash(i, place, other, sheet);
		}
		return sum;
	}

	#clashes(i: number, place: Reached, sheet: Sheet): number {
		let sum = 0;
		for (let other = 0; other < sheet.length; other++) sum += this.#clash(i, place, other, sheet);
		return sum;
	}

	#clash(i: number, place: Reached, other: number, sheet: Sheet): number {
		const stands = sheet[other];
		if (stands === undefined || other === i || !touches(place.reach, stands.reach)) return 0;
		const [own, neighbour] = [this.#choices[i], this.#choices[other]];
		return own === undefined || neighbour === undefined ? 0 : clash(own.item, place, neighbour.item, stands);
	}
}

const touches = (a: Box, b: Box): boolean =>
	a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

/** What an item pays where nothing is wrong but a few steps aside. */
const WELL = 60;
const TRIES = 32;
const ROUNDS = 3;
