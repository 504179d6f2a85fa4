import { fail, ok, type Result } from '../../base';
import type { Refusal } from '../calculator';

/** Evaluates a fit of t = T/1000 K where it was made, and refuses elsewhere: a fit is not extrapolated. */
export function insideFit(temperature: number, fit: (t: number) => number): Result<number, Refusal> {
	if (!(temperature >= T_MIN && temperature <= T_MAX)) {
		return fail({ kind: 'out-of-range', input: 'temperature', value: temperature, min: T_MIN, max: T_MAX, unit: 'K' });
	}
	return ok(fit(temperature / 1000));
}

const T_MIN = 273;
const T_MAX = 623;
