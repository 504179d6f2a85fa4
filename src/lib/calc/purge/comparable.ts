import type { Basis } from './place-input';

/**
 * A reading on the basis of its limit: a dry reading is never below the wet one, so that without a proof of moisture it
 * is compared as it is.
 *
 *     read dry, limit wet:  C_w = C_d (1 − x_w,low), x_w,low = 0 unless proved
 *     read wet, limit dry:  C_d = C_w / (1 − x_w,high)
 *
 * @param C oxygen as read [1]
 * @param basis of the reading and of the limit; waterVapour: proved bounds of x_w [1] in the wet gas
 * @returns C on the basis of the limit, on the safe side [1]; null where the upper bound of the moisture is needed and missing
 *
 * Source: definition of the dry fraction, C_w = C_d (1 − x_w).
 * Checked against: the definition, both ways (test/calc/purge/comparable.test.ts).
 */
export function comparable(
	C: number,
	basis: {
		readonly read: Basis;
		readonly limit: Basis;
		readonly waterVapour: { low: number; high?: number | undefined };
	},
): number | null {
	if (basis.read === basis.limit) return C;
	if (basis.read === 'dry') return C * (1 - basis.waterVapour.low);
	return basis.waterVapour.high === undefined ? null : C / (1 - basis.waterVapour.high);
}
