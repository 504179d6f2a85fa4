/**
 * Runs test of residuals: whether a curve lies on one side of the samples for too long, as it does when two zones of
 * the plant are exchanged at different rates.
 *
 *     z = (R − m)/σ,  m = 2 n₊ n₋/n + 1,  σ² = (m − 1)(m − 2)/(n − 1)
 *
 * @param residuals e in the order of time [any]; zeros are left out
 * @returns R, number of runs of equal sign; z [1], null when all have one sign or there are fewer than three
 *
 * Source: A. Wald, J. Wolfowitz, Ann. Math. Stat. 11 (1940) 147-162.
 * Checked against: statsmodels.sandbox.stats.runs.runstest_1samp (test/calc/purge/runs-test.test.ts).
 */
export function runsTest(residuals: readonly number[]): { readonly runs: number; readonly z: number | null } {
	const signs = residuals.filter((e) => e !== 0).map((e) => e > 0);
	const n = signs.length;
	const above = signs.filter(Boolean).length;
	const runs = signs.filter((sign, i) => i === 0 || sign !== signs[i - 1]).length;
	const m = (2 * above * (n - above)) / n + 1;
	const variance = ((m - 1) * (m - 2)) / (n - 1);
	return { runs, z: n > 2 && variance > 0 ? (runs - m) / Math.sqrt(variance) : null };
}
