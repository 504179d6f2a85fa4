import type { PlaceFit } from './place-fit';
import { sweepPlan, type Sweeping } from './sweep-plan';
import { timeTo } from './time-to';

/** Seconds from now until a place is at its line; null: unreachable. `latest` with the slowest rate and the highest floor. */
export type Forecast = {
	readonly seconds: number | null;
	readonly latest: number | null;
	readonly rough: boolean;
	readonly by: 'fit' | 'planning twin';
};

/** Below so many exchanges a fit does not carry a forecast. */
export const EXCHANGES_FOR_FORECAST = 2;

/**
 * Forecast for a place above its line. The fit forecasts once it spans two exchanges; before, or without a fit, the
 * planning twin does, from the last reading, and the forecast is rough.
 *
 *     t = ln((C − Cf)/(Ca − Cf))/λ;  latest: with λ_low and Cf_high of the profile bounds
 *
 * @param now t [s], last reading [1] and acceptance line Ca [1]
 * @param by the fit if there is one, and what the planning twin knows: V [m³(n)], K [1], Q_I, Q_L [m³(n)/s], Ci [1]
 * @returns seconds [s]; null where the floor lies at or above the line, or where no inert gas flows
 *
 * Source: the decay and the one-zone plan, solved for the time (derived).
 * Checked against: decays of known course (test/calc/purge/forecast.test.ts).
 */
export function forecast(
	now: { readonly t: number; readonly last: number; readonly accept: number },
	by: { readonly fit: PlaceFit | undefined; readonly twin: Omit<Sweeping, 'C0' | 'Ct' | 'least'> | undefined },
): Forecast {
	const { t, last, accept } = now;
	if (last <= accept) return { seconds: 0, latest: 0, rough: false, by: 'fit' };
	if (by.fit !== undefined && by.fit.exchanges >= EXCHANGES_FOR_FORECAST) {
		const { Cf, lambda, bounds } = by.fit.fit;
		// The curve may already be below the line while the last reading still is not.
		const C0 = Math.max(by.fit.curve(t), accept);
		const { high } = bounds.Cf;
		const { low } = bounds.lambda;
		return {
			seconds: timeTo(accept, { C0, floor: Cf, rate: lambda }),
			latest: high === null || low === null ? null : timeTo(accept, { C0: Math.max(C0, last), floor: high, rate: low }),
			...{ rough: false, by: 'fit' },
		};
	}
	const seconds = by.twin === undefined ? null : sweepPlan({ ...by.twin, C0: last, Ct: accept, least: 0 }).timeByMixing;
	return { seconds, latest: null, rough: true, by: 'planning twin' };
}
