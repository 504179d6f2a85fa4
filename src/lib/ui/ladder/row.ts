import type { ShownContact } from './shown-rungs';

/** A piece of a long rung on its own line, joined to the next by a lettered connector. */
export type Row = {
	readonly letter: string;
	readonly contacts: readonly Placed[];
	readonly y: number;
	readonly isFirst: boolean;
	readonly isLast: boolean;
	/** The power line runs to its end. */
	readonly leads: boolean;
};

export type Placed = {
	readonly contact: ShownContact;
	readonly x: number;
	readonly lines: readonly string[];
	/** How much higher its name stands, where names have to make room for each other. */
	readonly lift: number;
};
