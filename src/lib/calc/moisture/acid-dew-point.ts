import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';

/**
 * Sulphuric acid dew point: metal colder than this is attacked, far above the dew point of water.
 *
 *     1000/T = 2.276 − 0.0294 ln p_w − 0.0858 ln p_a + 0.0062 ln p_w ln p_a     (mmHg)
 *
 * Partial pressures go in as mmHg: with atmospheres the same formula gives 13 °C where 137 °C is right.
 *
 * @param water p_w, partial pressure of water vapour [Pa absolute], p_w > 0
 * @param acid p_a, partial pressure of SO3 and H2SO4 together [Pa absolute], p_a > 0
 * @returns T, acid dew point [K]; a refusal without water or without acid
 *
 * Source: F. H. Verhoff and J. T. Banchero, Chem. Eng. Prog. 70(8) (1974) 71-72.
 * Checked against: a published worked example, 402 K (test/calc/moisture/acid-dew-point.test.ts).
 */
export function acidDewPoint(water: number, acid: number): Result<number, Refusal> {
	if (!(water > 0)) return fail({ kind: 'acid-without-water', input: 'waterVapour', value: water });
	if (!(acid > 0)) return fail({ kind: 'out-of-range', input: 'sulphurTrioxide', value: acid, min: 0, unit: 'Pa(a)' });
	const lnWater = Math.log(water / MMHG);
	const lnAcid = Math.log(acid / MMHG);
	return ok(1000 / (2.276 - 0.0294 * lnWater - 0.0858 * lnAcid + 0.0062 * lnWater * lnAcid));
}

/**
 * Sulphuric acid dew point by a second correlation, so that their distance shows how little is known.
 *
 *     t = 203.25 + 27.6 lg p_w + 10.83 lg p_a + 1.06 (lg p_a + 8)^2.19     (atm, °C)
 *
 * @param water p_w, partial pressure of water vapour [Pa absolute], p_w > 0
 * @param acid p_a, partial pressure of SO3 and H2SO4 together [Pa absolute], p_a ≥ 10⁻⁸ atm
 * @returns T, acid dew point [K]; a refusal without water, or where the power of a negative number would be needed
 *
 * Source: A. G. Okkes, Hydrocarbon Processing, July 1987 (coefficients from a public copy; citation from memory, verify).
 * Checked against: another program's values, see test (test/calc/moisture/acid-dew-point.test.ts).
 */
export function acidDewPointOkkes(water: number, acid: number): Result<number, Refusal> {
	if (!(water > 0)) return fail({ kind: 'acid-without-water', input: 'waterVapour', value: water });
	if (!(acid >= LEAST_ACID * ATM)) {
		return fail({ kind: 'out-of-range', input: 'sulphurTrioxide', value: acid, min: LEAST_ACID * ATM, unit: 'Pa(a)' });
	}
	const lgWater = Math.log10(water / ATM);
	const lgAcid = Math.log10(acid / ATM);
	return ok(273.15 + 203.25 + 27.6 * lgWater + 10.83 * lgAcid + 1.06 * (lgAcid + 8) ** 2.19);
}

const ATM = 101_325;
// NIST SP 811: conventional millimetre of mercury.
const MMHG = 133.322_387_415;
const LEAST_ACID = 1e-8;
