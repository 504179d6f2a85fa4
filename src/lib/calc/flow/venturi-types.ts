/** One of the three classical Venturi tubes, with the limits inside which the standard gives its coefficient. */
export type VenturiType = keyof typeof VENTURI_TYPES;
export type Limits = {
	readonly edition: string;
	readonly C: number;
	/** Expanded relative uncertainty of C inside the limits. */
	readonly U: number;
	readonly D: readonly [number, number];
	readonly beta: readonly [number, number];
	readonly Re_D: readonly [number, number];
	/** Below the Reynolds limit the coefficient falls: points of C, indicative only. */
	readonly indicative: readonly { readonly Re_D: number; readonly C: number; readonly U: number }[];
};

// ISO 5167-4:2003, 5.5.2 to 5.5.4: C, its uncertainty and the limits of D [m], beta and Re_D. C, uncertainty and Re_D were
// read second-hand, D and beta are from memory, verify. The 2022 edition calls the third type "fabricated".
// Indicative C below 2e5: ISO 5167-4:2003, Annex B (from memory, verify); the last point of each is the standard's C.
export const VENTURI_TYPES = {
	as_cast: {
		edition: 'ISO 5167-4:2003, 5.5.2',
		C: 0.984,
		U: 0.007,
		D: [0.1, 0.8],
		beta: [0.3, 0.75],
		Re_D: [2e5, 2e6],
		indicative: [
			{ Re_D: 4e4, C: 0.957, U: 0.025 },
			{ Re_D: 6e4, C: 0.966, U: 0.025 },
			{ Re_D: 1e5, C: 0.976, U: 0.02 },
			{ Re_D: 1.5e5, C: 0.982, U: 0.015 },
			{ Re_D: 2e5, C: 0.984, U: 0.007 },
		],
	},
	machined: {
		edition: 'ISO 5167-4:2003, 5.5.3',
		C: 0.995,
		U: 0.01,
		D: [0.05, 0.25],
		beta: [0.4, 0.75],
		Re_D: [2e5, 1e6],
		indicative: [
			{ Re_D: 5e4, C: 0.97, U: 0.03 },
			{ Re_D: 1e5, C: 0.977, U: 0.025 },
			{ Re_D: 2e5, C: 0.992, U: 0.025 },
		],
	},
	rough_welded: {
		edition: 'ISO 5167-4:2003, 5.5.4',
		C: 0.985,
		U: 0.015,
		D: [0.2, 1.2],
		beta: [0.4, 0.7],
		Re_D: [2e5, 2e6],
		indicative: [
			{ Re_D: 4e4, C: 0.96, U: 0.03 },
			{ Re_D: 6e4, C: 0.97, U: 0.03 },
			{ Re_D: 1e5, C: 0.98, U: 0.025 },
			{ Re_D: 2e5, C: 0.985, U: 0.015 },
		],
	},
} as const satisfies { readonly [type: string]: Limits };

/** Whether a value is inside a limit of the standard, which includes its ends: a beta of 0.72/1.2 is exactly 0.60. */
export const isInside = (value: number, [min, max]: readonly [number, number]): boolean =>
	value >= min * (1 - ROUNDING) && value <= max * (1 + ROUNDING);

const ROUNDING = 1e-9;
