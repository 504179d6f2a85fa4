/** Positions of an axis at steps of 1, 2 or 5 times a power of ten, at most `count` of them inside the range. */
export function ticks(
	from: number,
	to: number,
	count: number,
): { readonly at: readonly number[]; readonly decimals: number } {
	const span = to - from;
	if (!(span > 0) || !Number.isFinite(span)) return { at: [], decimals: 0 };
	const rough = span / Math.max(1, count);
	const power = Math.floor(Math.log10(rough));
	// A span that is nearly nothing, or nearly everything, has no steps that a double can tell apart.
	if (!Number.isFinite(power) || Math.abs(power) > 250) return { at: [], decimals: 0 };
	const decade = 10 ** power;
	const step = decade * (STEPS.find((each) => each * decade >= rough * 0.999) ?? 10);
	const first = Math.ceil(from / step - 1e-9);
	const last = Math.floor(to / step + 1e-9);
	if (!(last >= first) || last - first > 1000) return { at: [], decimals: 0 };
	return {
		at: Array.from({ length: last - first + 1 }, (_, i) => (first + i) * step),
		decimals: Math.max(0, -Math.floor(Math.log10(step) + 1e-9)),
	};
}

/** Powers of ten inside the range, with their twos and fives when there are few. */
export function logarithmicTicks(from: number, to: number): readonly number[] {
	if (!(from > 0) || !(to > from) || !Number.isFinite(to)) return [];
	const [first, last] = [Math.floor(Math.log10(from)), Math.ceil(Math.log10(to))];
	const steps = last - first > 4 ? [1] : [1, 2, 5];
	return Array.from({ length: last - first + 1 }, (_, i) => first + i)
		.flatMap((power) => steps.map((step) => step * 10 ** power))
		.filter((at) => at >= from * (1 - 1e-9) && at <= to * (1 + 1e-9));
}

/** A clock's steps, in seconds: 1, 5, 15 minutes and so on, for an axis of time. */
export function timeStep(spanSeconds: number, count: number): number {
	return TIME_STEPS.find((step) => spanSeconds / step <= count) ?? 86_400 * Math.ceil(spanSeconds / 86_400 / count);
}

/** A value of an axis in as many decimals as its steps have, with a true minus sign. */
export const tickLabel = (value: number, decimals: number): string =>
	(Math.abs(value) < 1e-12 ? 0 : value).toFixed(Math.min(decimals, 12)).replace('-', '\u2212');

const STEPS = [1, 2, 5, 10];
const TIME_STEPS = [60, 300, 600, 900, 1800, 3600, 7200, 10_800, 21_600, 43_200, 86_400];
