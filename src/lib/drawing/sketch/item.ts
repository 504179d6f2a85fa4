import type { Box, Point } from '../shape';

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
