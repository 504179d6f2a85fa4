import { fail, ok, type Result } from '../../base';
import { fQuantile, tQuantile } from './f-quantile';
import { findRoot } from './find-root';
import { inflation } from './inflation';

/** Seconds since the purge reached the place, and the oxygen there. */
export type DecaySample = { readonly t: number; readonly C: number };

/** A bound is null where the samples do not give one. */
export type Bounds = { readonly low: number | null; readonly high: number | null };

export type DecayFit = {
	/** Floor: the oxygen that goes on for ever at this in-leakage. */
	readonly Cf: number;
	/** Oxygen at t = 0. */
	readonly C0: number;
	/** Exchange rate [1/s]. */
	readonly lambda: number;
	readonly standardErrors: { readonly Cf: number; readonly C0: number; readonly lambda: number };
	/** Cf ± t SE, C0 ± t SE, lambda ± t SE. */
	readonly linearBounds: { readonly Cf: Bounds; readonly C0: Bounds; readonly lambda: Bounds };
	/** All values with which the samples still agree; the bounds to decide by. */
	readonly bounds: { readonly Cf: Bounds; readonly lambda: Bounds };
	readonly samples: number;
	/** Sum of squared residuals and residual standard deviation with n − 3 degrees of freedom. */
	readonly SSR: number;
	readonly s: number;
	/** Student's t of the bounds, with the degrees of freedom of the samples that count as independent; null: fewer than four do. */
	readonly t: number | null;
	/** Factor on the variance because neighbouring residuals resemble each other; 1 = independent. */
	readonly inflation: number;
	readonly residuals: readonly number[];
	/** Standard error of the curve at t seconds. */
	readonly curveError: (t: number) => number;
};

export type DecayRefusal =
	| { readonly kind: 'too-few-samples'; readonly samples: number; readonly least: number }
	/** The samples lie on a straight line: neither rate nor floor can be told from it. */
	| { readonly kind: 'no-curvature' }
	/** All is over between two samples. */
	| { readonly kind: 'too-coarse' }
	| { readonly kind: 'not-falling' };

/**
 * Fit of an observed oxygen decay to its floor: how fast the gas is exchanged and where the oxygen will stay.
 *
 *     C(t) = Cf + (C0 − Cf) e^(−λt),  least squares in Cf, C0, λ by variable projection:
 *     for a given λ the best Cf and C0 are linear, so that only λ is searched for, as the root of dSSR/dλ
 *     SE from s² (JᵀJ)⁻¹ with s² = SSR/(n − 3);  bounds { λ : SSR(λ) ≤ SSR_min (1 + q F_p(1, ν)/(n − 3)) }, Cf alike,
 *     q = 1 and ν = n − 3 for independent residuals, else q = inflation and ν = n/q − 3
 *
 * @param samples t [s] and C [1], n ≥ 4, in any order
 * @param options confidence p [1] of the bounds, 0.95 unless told; whether like neighbours widen them
 * @returns Cf, C0 [1], λ [1/s] with standard errors and bounds, or why there is no such curve
 *
 * Source: G. H. Golub, V. Pereyra, SIAM J. Numer. Anal. 10 (1973) 413-432; D. M. Bates, D. G. Watts, Nonlinear
 * Regression Analysis and Its Applications (1988), section 6.1 (profile bounds; from memory, verify).
 * Checked against: scipy.optimize.curve_fit and brentq on the profile (test/calc/purge/decay-fit.test.ts).
 */
export function decayFit(
	samples: readonly DecaySample[],
	options: { readonly confidence?: number; readonly neighbours?: 'independent' | 'alike' } = {},
): Result<DecayFit, DecayRefusal> {
	const n = samples.length;
	const times = new Set(samples.map(({ t }) => t)).size;
	if (times < 4) return fail({ kind: 'too-few-samples', samples: times, least: 4 });
	const data = [...samples].sort((a, b) => a.t - b.t);
	const rate = bestRate((lambda) => freeFloor(data, lambda), limitsOf(data));
	if (rate === 'low') return fail({ kind: 'no-curvature' });
	if (rate === 'high') return fail({ kind: 'too-coarse' });
	const { Cf, C0, SSR } = freeFloor(data, rate);
	if (!(C0 > Cf)) return fail({ kind: 'not-falling' });
	// So steep that carried back to t = 0 it leaves all numbers behind.
	if (!Number.isFinite(C0)) return fail({ kind: 'too-coarse' });

	const curve = (t: number): number => Cf + (C0 - Cf) * Math.exp(-rate * t);
	const residuals = data.map(({ t, C }) => C - curve(t));
	const q = options.neighbours === 'alike' ? inflation(residuals) : 1;
	const degrees = n / q - 3;
	const s = Math.sqrt(SSR / (n - 3));
	// From the first sample on: far from t = 0 the derivatives by C0 and λ would look the same.
	const first = data[0]?.t ?? 0;
	const gradient = (t: number): Vector => gradientAt(t - first, { height: curve(first) - Cf, lambda: rate });
	const spread = inverse(data.map(({ t }) => gradient(t)));
	const error = (g: Vector): number => s * Math.sqrt(q * form(spread, g));
	const standardErrors = { Cf: error([1, 0, 0]), C0: error(gradient(0)), lambda: error([0, 0, 1]) };

	const p = options.confidence ?? 0.95;
	// So alike that fewer than four count as independent: a curve without bounds.
	const t = degrees < 1 ? null : tQuantile((1 + p) / 2, degrees);
	const allowed = t === null ? Infinity : SSR * (1 + (q * fQuantile(p, 1, degrees)) / (n - 3));
	const around = (value: number, error: number): Bounds =>
		t === null ? OPEN : { low: value - t * error, high: value + t * error };
	return ok({
		...{ Cf, C0, lambda: rate, standardErrors, samples: n, SSR, s, t, inflation: q, residuals },
		linearBounds: {
			Cf: around(Cf, standardErrors.Cf),
			C0: around(C0, standardErrors.C0),
			lambda: around(rate, standardErrors.lambda),
		},
		bounds: {
			Cf: t === null ? OPEN : floorBounds(data, { Cf, rate, allowed, step: t * standardErrors.Cf }),
			lambda: t === null ? OPEN : rateBounds(data, { rate, allowed }),
		},
		curveError: (at) => error(gradient(at)),
	});
}

/** Cf and C0 that suit a given λ best, with the sum of squares and what is left of dSSR/dλ, up to its positive factors. */
function freeFloor(data: readonly DecaySample[], lambda: number): Projected & { Cf: number; C0: number } {
	// Counted from the first sample, or a large λ would leave nothing of all of them. 1 − e^(−λt) keeps the digits of a small λ.
	const first = data[0]?.t ?? 0;
	const gone = data.map(({ t }) => -Math.expm1(-lambda * (t - first)));
	const meanGone = mean(gone);
	const meanC = mean(data.map(({ C }) => C));
	let [Sgg, SgC] = [0, 0];
	data.forEach(({ C }, i) => {
		const g = (gone[i] ?? 0) - meanGone;
		Sgg += g * g;
		SgC += g * (C - meanC);
	});
	const drop = SgC / Sgg;
	const start = meanC - drop * meanGone;
	let [SSR, pull] = [0, 0];
	data.forEach(({ t, C }, i) => {
		const residual = C - start - drop * (gone[i] ?? 0);
		SSR += residual * residual;
		pull += residual * (t - first) * (1 - (gone[i] ?? 0));
	});
	return { Cf: start + drop, C0: start + drop - drop * Math.exp(lambda * first), SSR, slope: -drop * pull };
}

/** The same with the floor held: only the height above it is free. */
function heldFloor(data: readonly DecaySample[], lambda: number, Cf: number): Projected {
	const first = data[0]?.t ?? 0;
	let [See, SeC] = [0, 0];
	for (const { t, C } of data) {
		const e = Math.exp(-lambda * (t - first));
		See += e * e;
		SeC += e * (C - Cf);
	}
	const height = SeC / See;
	let [SSR, pull] = [0, 0];
	for (const { t, C } of data) {
		const e = Math.exp(-lambda * (t - first));
		const residual = C - Cf - height * e;
		SSR += residual * residual;
		pull += residual * (t - first) * e;
	}
	return { SSR, slope: height * pull };
}

const OPEN: Bounds = { low: null, high: null };

type Projected = { readonly SSR: number; readonly slope: number };
type Limits = { readonly low: number; readonly high: number };

/** Rates that these times can tell: 1/1000 of one exchange over the whole span, to all gone between two samples. */
function limitsOf(data: readonly DecaySample[]): Limits {
	const times = data.map(({ t }) => t);
	const span = (times.at(-1) ?? 0) - (times[0] ?? 0);
	const steps = times.slice(1).map((t, i) => t - (times[i] ?? 0));
	return { low: 1e-3 / span, high: 20 / Math.min(...steps.filter((step) => step > 0)) };
}

/** The lowest of a row of rates, then the root of the slope beside it; the end that it runs to when there is none inside. */
function bestRate(project: (lambda: number) => Projected, { low, high }: Limits): number | 'low' | 'high' {
	const count = 80;
	const rates = Array.from({ length: count + 1 }, (_, i) => low * (high / low) ** (i / count));
	const sums = rates.map((lambda) => project(lambda).SSR);
	const best = sums.indexOf(Math.min(...sums));
	const [left, right] = [rates[best - 1], rates[best + 1]];
	if (left === undefined) return 'low';
	if (right === undefined) return 'high';
	const slope = (lambda: number): number => project(lambda).slope;
	if (!(slope(left) < 0)) return 'low';
	if (!(slope(right) > 0)) return 'high';
	return findRoot(slope, left, right);
}

function rateBounds(data: readonly DecaySample[], fit: { rate: number; allowed: number }): Bounds {
	const tooMuch = (lambda: number): number => freeFloor(data, lambda).SSR - fit.allowed;
	const edge = (factor: number, limit: number): number | null => {
		for (let [from, to] = [fit.rate, fit.rate * factor]; ; [from, to] = [to, to * factor]) {
			if (factor < 1 ? to < limit : to > limit) return null;
			if (tooMuch(to) > 0) return findRoot(tooMuch, from, to);
		}
	};
	if (!(tooMuch(fit.rate) < 0)) return { low: fit.rate, high: fit.rate };
	const { low, high } = limitsOf(data);
	return { low: edge(1 / 1.1, low), high: edge(1.1, high) };
}

/** For each floor the rate is fitted anew: a floor is ruled out only when no rate goes with it. */
function floorBounds(
	data: readonly DecaySample[],
	fit: { Cf: number; rate: number; allowed: number; step: number },
): Bounds {
	const limits = limitsOf(data);
	const tooMuch = (Cf: number): number => {
		const rate = nearRate((lambda) => heldFloor(data, lambda, Cf).slope, fit.rate, limits);
		return heldFloor(data, rate, Cf).SSR - fit.allowed;
	};
	const all = data.map(({ C }) => C);
	const reach = Math.max(...all) - Math.min(...all);
	const begin = Math.min(Math.max(fit.step, reach / 1e4), reach / 4);
	const edge = (sign: -1 | 1): number | null => {
		for (let [from, step] = [0, begin]; step < 100 * reach; [from, step] = [step, 2 * step]) {
			if (tooMuch(fit.Cf + sign * step) > 0) return findRoot(tooMuch, fit.Cf + sign * from, fit.Cf + sign * step);
		}
		return null;
	};
	if (!(tooMuch(fit.Cf) < 0)) return { low: fit.Cf, high: fit.Cf };
	return { low: edge(-1), high: edge(1) };
}

/** The root of the slope nearest to a rate that is known to be close, or the limit it runs to. */
function nearRate(slope: (lambda: number) => number, from: number, { low, high }: Limits): number {
	let [left, right] = [from / 1.1, from * 1.1];
	while (left > low && !(slope(left) < 0)) [left, right] = [left / 1.5, left];
	while (right < high && !(slope(right) > 0)) [left, right] = [right, right * 1.5];
	return slope(left) < 0 && slope(right) > 0 ? findRoot(slope, left, right) : slope(left) < 0 ? right : left;
}

type Vector = readonly [number, number, number];
type Matrix = readonly [Vector, Vector, Vector];

/** Derivatives of C(t) by floor, start and λ: one row of J. */
function gradientAt(t: number, { height, lambda }: { height: number; lambda: number }): Vector {
	const e = Math.exp(-lambda * t);
	return [-Math.expm1(-lambda * t), e, -height * t * e];
}

/** (JᵀJ)⁻¹ by cofactors; each parameter is first measured in its own size, so that a small λ does no harm. */
function inverse(J: readonly Vector[]): Matrix {
	const sum = (i: number, k: number): number => J.reduce((all, row) => all + (row[i] ?? 0) * (row[k] ?? 0), 0);
	const [sa, sb, sc] = [Math.sqrt(sum(0, 0)), Math.sqrt(sum(1, 1)), Math.sqrt(sum(2, 2))];
	const [ab, ac, bc] = [sum(0, 1) / (sa * sb), sum(0, 2) / (sa * sc), sum(1, 2) / (sb * sc)];
	const determinant = 1 + 2 * ab * ac * bc - ab * ab - ac * ac - bc * bc;
	const entry = (cofactor: number, scale: number): number => cofactor / (determinant * scale);
	const [xy, xz, yz] = [entry(ac * bc - ab, sa * sb), entry(ab * bc - ac, sa * sc), entry(ab * ac - bc, sb * sc)];
	return [
		[entry(1 - bc * bc, sa * sa), xy, xz],
		[xy, entry(1 - ac * ac, sb * sb), yz],
		[xz, yz, entry(1 - ab * ab, sc * sc)],
	];
}

/** gᵀ M g */
const form = (M: Matrix, g: Vector): number =>
	M.reduce((all, row, i) => all + (g[i] ?? 0) * row.reduce((sum, entry, k) => sum + entry * (g[k] ?? 0), 0), 0);

const mean = (values: readonly number[]): number => values.reduce((all, value) => all + value, 0) / values.length;
