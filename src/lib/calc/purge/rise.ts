import type { DecaySample } from './decay-fit';
import { tQuantile } from './f-quantile';

/**
 * Rise of the oxygen in the hold window: whether dead legs give back what they kept.
 *
 *     b = Σ(t − t̄)(C − C̄)/Σ(t − t̄)²,  SE² = Σ(C − Ĉ)²/((n − 2) Σ(t − t̄)²),  lower bound b − t_(0.975, n−2) SE
 *
 * The bounds are those of independent samples even where neighbours are alike: wider ones would hide a rise.
 *
 * @param samples t [s], C [1] of the hold window, n ≥ 3
 * @returns slope b and its lower bound [1/s]; null with fewer than three times
 *
 * Source: ordinary least squares; JCGM 100:2008, H.3 (from memory, verify).
 * Checked against: scipy.stats.linregress (test/calc/purge/rise.test.ts).
 */
export function rise(samples: readonly DecaySample[]): { readonly slope: number; readonly low: number } | null {
	const n = samples.length;
	if (new Set(samples.map(({ t }) => t)).size < 3) return null;
	const meanT = samples.reduce((sum, { t }) => sum + t, 0) / n;
	const meanC = samples.reduce((sum, { C }) => sum + C, 0) / n;
	const Stt = samples.reduce((sum, { t }) => sum + (t - meanT) ** 2, 0);
	const slope = samples.reduce((sum, { t, C }) => sum + (t - meanT) * (C - meanC), 0) / Stt;
	const rest = samples.reduce((sum, { t, C }) => sum + (C - meanC - slope * (t - meanT)) ** 2, 0);
	const error = Math.sqrt(rest / (n - 2) / Stt);
	return { slope, low: slope - tQuantile(0.975, n - 2) * error };
}
