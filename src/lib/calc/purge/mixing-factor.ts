/**
 * Mixing factor that an observed decay points to: the part of the entering gas that takes part in the exchange.
 *
 *     K = λ V / (Q_I + Q_L)
 *
 * @param lambda λ, fitted exchange rate [1/s]
 * @param zone V free gas volume [m³(n)], Q_I inert gas and Q_L air that enter [m³(n)/s]
 * @returns K [1]; above 1 it says that a volume or a flow is wrong, or that the fit is noise
 *
 * Source: the exchange rate of one mixed zone, solved for K (derived).
 * Checked against: engineering check value A5, K = 0.7245 (test/calc/purge/mixing-factor.test.ts).
 */
export const mixingFactor = (lambda: number, { V, Q_I, Q_L }: { V: number; Q_I: number; Q_L: number }): number =>
	(lambda * V) / (Q_I + Q_L);
