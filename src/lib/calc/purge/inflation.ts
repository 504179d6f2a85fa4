/**
 * Inflation of a variance because neighbouring residuals resemble each other: how many samples make one independent one.
 *
 *     r = Σ e_i e_(i+1) / Σ e_i²;   q = (1 + r)/(1 − r), not below 1
 *
 * @param residuals e in the order of time [any]
 * @returns q [1], ≥ 1; infinite when r reaches 1
 *
 * Source: the variance of a mean of first-order autoregressive residuals; G. E. P. Box, G. M. Jenkins, G. C. Reinsel,
 * Time Series Analysis, section 2.1 (from memory, verify).
 * Checked against: the definition, term by term with numpy (test/calc/purge/inflation.test.ts).
 */
export function inflation(residuals: readonly number[]): number {
	let [squares, products] = [0, 0];
	residuals.forEach((e, i) => {
		squares += e * e;
		products += e * (residuals[i + 1] ?? 0);
	});
	const r = squares === 0 ? 0 : products / squares;
	return Math.max(1, (1 + r) / (1 - r));
}
