import type { ContactState } from '../ladder/states';

/** What the first page of a running start-up shows, said in words: who holds the record makes it, with the age of everything. */
export type NowFacts = {
	/** Fan, inert gas, burner, mill, feed: as last recorded. `said`: since when, by whom, how old. */
	readonly plant: readonly { readonly name: string; readonly word: string; readonly said: string }[];
	readonly oxygen?: {
		readonly typed: string;
		/** With its basis: "% by volume, moist". */
		readonly unit: string;
		readonly place: string;
		/** Age and trend. */
		readonly said: string;
		/** "limit 8.0, margin 0.6" */
		readonly against: string;
	};
	/** No minutes while it is not recorded as in use. */
	readonly inert?: { readonly minutes?: string; readonly reserve: string };
	readonly blocks?: {
		readonly state: ContactState;
		readonly title: string;
		/** Who is on it, since when. */
		readonly said: string;
		/** Where to go on: a step, a hold point, or neither. */
		readonly step?: string;
		readonly gate?: number;
	};
	readonly nextToLapse: readonly {
		readonly step: string;
		readonly title: string;
		readonly said: string;
		readonly when: string;
		/** Part of its time that is left, 1 to 0. */
		readonly left: number;
	}[];
	/** Temporary states, people, refusals, deviations, other tablets: each a line. */
	readonly besides: readonly { readonly name: string; readonly said: string }[];
	/** Set when the newest reading is older than its watch: says so. */
	readonly stale?: string;
};
