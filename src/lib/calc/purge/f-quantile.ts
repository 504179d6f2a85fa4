/**
 * Quantile of the F distribution: how much worse a fit may get before a value of its parameter is ruled out.
 *
 *     F = d2 y / (d1 (1 − y)),  where  I_y(d1/2, d2/2) = p  (regularised incomplete beta function)
 *
 * @param p probability [1], 0 < p < 1
 * @param d1 degrees of freedom above [1], > 0, not necessarily whole
 * @param d2 degrees of freedom below [1], > 0
 * @returns F [1]
 *
 * Source: NIST Digital Library of Mathematical Functions, 8.17.22 (continued fraction), 8.17.4 (symmetry); 5.11.1 (log gamma).
 * Checked against: scipy.stats.f.ppf (test/calc/purge/f-quantile.test.ts).
 */
export function fQuantile(p: number, d1: number, d2: number): number {
	if (!(p > 0 && p < 1 && d1 > 0 && d2 > 0)) throw new RangeError(`no F quantile for p ${p}, ${d1} and ${d2} degrees`);
	const y = betaQuantile(p, d1 / 2, d2 / 2);
	// 1 − y would lose its digits where y is close to 1; its own quantile keeps them.
	const rest = y < 0.5 ? 1 - y : betaQuantile(1 - p, d2 / 2, d1 / 2);
	return (d2 * y) / (d1 * rest);
}

/**
 * Quantile of Student's t: half the width of a confidence interval in standard errors.
 *
 *     t_p(ν) = √F_(2p−1)(1, ν)  for p > 1/2, and  t_(1−p) = −t_p
 *
 * @param p probability [1], 0 < p < 1
 * @param degrees ν, degrees of freedom [1], > 0
 * @returns t [1]
 *
 * Source: the square of a t variable with ν degrees of freedom is an F variable with 1 and ν.
 * Checked against: scipy.stats.t.ppf (test/calc/purge/f-quantile.test.ts).
 */
export function tQuantile(p: number, degrees: number): number {
	if (p === 0.5) return 0;
	return p > 0.5 ? Math.sqrt(fQuantile(2 * p - 1, 1, degrees)) : -tQuantile(1 - p, degrees);
}

/** Newton's steps on I_x(a, b) = p, kept inside an interval that halves whenever a step would leave it. */
function betaQuantile(p: number, a: number, b: number): number {
	let [low, high] = [0, 1];
	let x = a / (a + b);
	for (let i = 0; i < 200; i++) {
		const tooMuch = regularisedBeta(x, a, b) - p;
		if (tooMuch > 0) high = x;
		else low = x;
		const density = Math.exp((a - 1) * Math.log(x) + (b - 1) * Math.log1p(-x) - logBeta(a, b));
		const step = x - tooMuch / density;
		const next = step > low && step < high ? step : (low + high) / 2;
		if (Math.abs(next - x) <= 1e-16 * x) return next;
		x = next;
	}
	return x;
}

function regularisedBeta(x: number, a: number, b: number): number {
	if (x > (a + 1) / (a + b + 2)) return 1 - regularisedBeta(1 - x, b, a);
	const front = Math.exp(a * Math.log(x) + b * Math.log1p(-x) - logBeta(a, b)) / a;
	return front / betaFraction(x, a, b);
}

/** 1 + d1/(1 + d2/(1 + ...)) by Lentz's method, d of DLMF 8.17.23. */
function betaFraction(x: number, a: number, b: number): number {
	let [f, c, d] = [1, 1, 0];
	for (let j = 1; j <= 1000; j++) {
		const m = Math.floor(j / 2);
		const term =
			j % 2 === 0
				? (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m))
				: (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
		d = 1 / nonZero(1 + term * d);
		c = nonZero(1 + term / c);
		f *= c * d;
		if (Math.abs(c * d - 1) < 1e-16) break;
	}
	return f;
}

const nonZero = (value: number): number => (value === 0 ? 1e-300 : value);

const logBeta = (a: number, b: number): number => logGamma(a) + logGamma(b) - logGamma(a + b);

/** Stirling's series at x ≥ 12, where its next term is below 1e-17; smaller x are lifted by Γ(x) = Γ(x + 1)/x. */
function logGamma(x: number): number {
	let product = 1;
	let y = x;
	while (y < 12) product *= y++;
	const z = 1 / (y * y);
	const series = (1 / 12 - z * (1 / 360 - z * (1 / 1260 - z * (1 / 1680 - z * (1 / 1188 - (z * 691) / 360360))))) / y;
	return (y - 0.5) * Math.log(y) - y + 0.5 * Math.log(2 * Math.PI) + series - Math.log(product);
}
