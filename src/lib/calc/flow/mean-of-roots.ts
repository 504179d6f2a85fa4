/**
 * Difference pressure that stands for a series: its root is the mean of the roots, since flow follows the root. The root
 * of the mean would read too much, the more the flow pulsates.
 *
 *     Δp̄ = (1/n Σ √Δpᵢ)²
 *     pulsation = √(1/n Σ (Δpᵢ − m)²) / m,   m = 1/n Σ Δpᵢ
 *
 * @param series Δpᵢ, in the order read [Pa], each Δpᵢ ≥ 0, at least one
 * @returns dp, the mean by roots [Pa]; pulsation, relative [1], steady enough up to 0.10; overread, what the root of the
 *   mean would have added to the flow, relative [1]
 *
 * Source: ISO 5167-1:2003, 6.3.1 (from memory, verify) for the limit; ISO/TR 3313 on pulsating flow.
 * Checked against: sinusoidal pulsation in closed form (test/calc/flow/mean-of-roots.test.ts).
 */
export function meanOfRoots(series: readonly number[]): {
	readonly dp: number;
	readonly pulsation: number;
	readonly overread: number;
} {
	const mean = average(series);
	const root = average(series.map(Math.sqrt));
	if (mean === 0) return { dp: 0, pulsation: 0, overread: 0 };
	return {
		dp: root ** 2,
		pulsation: Math.sqrt(average(series.map((dp) => (dp - mean) ** 2))) / mean,
		overread: Math.sqrt(mean) / root - 1,
	};
}

/** Above this the flow is not steady: ISO 5167-1:2003, 6.3.1 (from memory, verify). */
export const PULSATION_LIMIT = 0.1;

const average = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;
