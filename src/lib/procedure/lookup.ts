import type { CalcResult } from '../calc';
import type { Basis } from '../plant';

/** Milliseconds since 1970-01-01T00:00Z. */
export type Millis = number;

/** A reading as it was typed, with what was said beside it. */
export type BoundReading = {
	readonly typed: string;
	readonly unit: string;
	readonly basis?: Basis;
	/** The point or the portable instrument that showed it. */
	readonly tag?: string;
	readonly mode?: string;
	readonly at: Millis;
};

/** Samples of a series step: seconds since `zero`, by tag. The shape that the calculators of series ask for. */
export type BoundSeries = {
	readonly zero: string;
	readonly zeroAt: Millis;
	readonly byTag: {
		readonly [tag: string]: {
			readonly unit: string;
			readonly t: readonly number[];
			readonly values: readonly number[];
			readonly flagged?: readonly { readonly from: number; readonly to: number; readonly flag: string }[];
		};
	};
};

/** The answer to one row of a coverage table, and the reading that shows it, when one was taken. */
export type BoundRow = { readonly row: string; readonly found: string; readonly reading?: BoundReading };

/** What a calculation step may ask of the record. Whoever holds the record answers; undefined says "nothing there yet". */
export type Lookup = {
	/** The instant of the calculation. */
	readonly now: Millis;
	readonly reading: (step: string, field: string) => BoundReading | undefined;
	readonly series: (step: string) => BoundSeries | undefined;
	readonly rows: (step: string) => readonly BoundRow[] | undefined;
	readonly result: (step: string) => CalcResult | undefined;
	readonly observed: (step: string) => Millis | undefined;
	readonly person: (step: string) => string | undefined;
	readonly standing: (step: string) => 'stands' | 'does not stand' | 'not known';
	/** A value typed into the calculation step itself, by the path of its input: `composition.N2`. */
	readonly typed: (input: string) => unknown;
};
