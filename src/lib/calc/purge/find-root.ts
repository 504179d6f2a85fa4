/**
 * Where a function of one variable is zero, between two ends at which it has different signs.
 *
 *     inverse quadratic interpolation where it is safe, halving where it is not
 *
 * @param f the function [any]
 * @param a one end [any]
 * @param b the other end [any], f(a) f(b) ≤ 0
 * @returns x [any] to the last digits; throws a RangeError where the signs do not differ
 *
 * Source: T. R. Chandrupatla, Advances in Engineering Software 28 (1997) 145-149.
 * Checked against: roots known in closed form (test/calc/purge/find-root.test.ts).
 */
export function findRoot(f: (x: number) => number, a: number, b: number): number {
	let [x1, x2] = [b, a];
	let [f1, f2] = [f(b), f(a)];
	if (f1 === 0) return x1;
	if (f2 === 0) return x2;
	// Not by their product: two very small values multiply to zero.
	if (Number.isNaN(f1 + f2) || f1 > 0 === f2 > 0) throw new RangeError(`no change of sign between ${a} and ${b}`);
	let part = 0.5;
	for (let i = 0; i < 200; i++) {
		const x = x1 + part * (x2 - x1);
		const y = f(x);
		const crossed = y > 0 !== f1 > 0;
		const [x3, f3] = crossed ? [x2, f2] : [x1, f1];
		if (crossed) [x2, f2] = [x1, f1];
		[x1, f1] = [x, y];
		const best = Math.abs(f1) < Math.abs(f2) ? x1 : x2;
		const limit = (2 * Number.EPSILON * Math.abs(best) + Number.MIN_VALUE) / Math.abs(x2 - x1);
		if (f1 === 0 || limit > 0.5) return best;
		part = Math.min(1 - limit, Math.max(limit, nextPart({ x1, f1, x2, f2, x3, f3 })));
	}
	return x1;
}

type Points = { x1: number; f1: number; x2: number; f2: number; x3: number; f3: number };

/** The part of the interval to go: by the parabola through three points when it is monotone between them, else one half. */
function nextPart({ x1, f1, x2, f2, x3, f3 }: Points): number {
	const xi = (x1 - x2) / (x3 - x2);
	const phi = (f1 - f2) / (f3 - f2);
	if (!(phi ** 2 < xi && (1 - phi) ** 2 < 1 - xi)) return 0.5;
	return (f1 / (f2 - f1)) * (f3 / (f2 - f3)) + ((x3 - x1) / (x2 - x1)) * (f1 / (f3 - f1)) * (f2 / (f3 - f2));
}
