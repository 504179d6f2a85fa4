import { ok, type Result } from '../../base';
import type { Refusal } from '../calculator';
import { findRoot } from '../purge/find-root';
import { saturationTemperature } from './saturation-temperature';
import { ICE_MIN, P_TRIPLE, sublimationPressure, T_TRIPLE } from './sublimation-pressure';

export type DewPoint =
	| { readonly kind: 'dew' | 'frost'; readonly temperature: number }
	/** No water, or so little that rime would form only below 50 K. */
	| { readonly kind: 'none' };

/**
 * Dew point of a moist gas: metal colder than this gets wet, and wet fuel dust sticks and cakes. Below 0.01 °C it is the
 * frost point, over ice.
 *
 *     T_dp = T_s(x_w p)            where x_w p ≥ 611.657 Pa
 *     p_sub(T_dp) = x_w p          where x_w p < 611.657 Pa
 *
 * The gas is taken as ideal; the real gas has its dew point about 0.1 K lower at 1 atm, which is on the safe side.
 *
 * @param waterVapour x_w, mole of water per mole of wet gas [1], 0 ≤ x_w ≤ 1
 * @param pressure p, static pressure of the gas [Pa absolute], p > 0
 * @returns T_dp, dew or frost point [K], or 'none' for a dry gas; a refusal above the critical pressure of water
 *
 * Source: Dalton's law with IAPWS R7-97(2012) over water and IAPWS R14-08(2011) over ice.
 * Checked against: iapws 1.5, and tables of both releases (test/calc/moisture/dew-point.test.ts).
 */
export function dewPoint(waterVapour: number, pressure: number): Result<DewPoint, Refusal> {
	const partial = waterVapour * pressure;
	if (partial >= P_TRIPLE) {
		const dew = saturationTemperature(partial);
		return dew.ok ? ok({ kind: 'dew', temperature: dew.value }) : dew;
	}
	if (!(partial > overIce(ICE_MIN))) return ok({ kind: 'none' });
	// On logarithms: the pressure over ice spans forty powers of ten.
	const frost = findRoot((T) => Math.log(overIce(T) / partial), ICE_MIN, T_TRIPLE);
	return ok({ kind: 'frost', temperature: frost });
}

function overIce(T: number): number {
	const pressure = sublimationPressure(T);
	return pressure.ok ? pressure.value : Number.NaN;
}
