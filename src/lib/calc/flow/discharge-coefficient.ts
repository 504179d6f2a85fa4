import { isInside, VENTURI_TYPES, type Limits, type VenturiType } from './venturi-types';

export type Coefficient = {
	readonly C: number;
	/** Expanded relative uncertainty; absent where no source gives one. */
	readonly U?: number;
	readonly from: 'standard' | 'indicative table' | 'below the table' | 'above the limit';
};

/**
 * Discharge coefficient of a classical Venturi tube: the part of the ideal flow that really passes.
 *
 *     C = constant of the type       where 2·10⁵ ≤ Re_D ≤ upper limit
 *     C = C(Re_D), indicative        where Re_D < 2·10⁵, linear between the points of the table
 *
 * Below the first point of the table and above the upper limit no source gives an uncertainty: the constant is shown,
 * without one.
 *
 * @param type how the convergent section was made
 * @param reynolds Re_D, of the pipe [1], Re_D > 0
 * @returns C [1], its expanded relative uncertainty [1], and where both come from
 *
 * Source: ISO 5167-4:2003, 5.5.2 to 5.5.4 and Annex B (second-hand and from memory, verify); see venturi-types.ts.
 * Checked against: fluids 1.0.22 inside the range (test/calc/flow/discharge-coefficient.test.ts).
 */
export function dischargeCoefficient(type: VenturiType, reynolds: number): Coefficient {
	const limits: Limits = VENTURI_TYPES[type];
	if (isInside(reynolds, limits.Re_D)) return { C: limits.C, U: limits.U, from: 'standard' };
	if (reynolds > limits.Re_D[1]) return { C: limits.C, from: 'above the limit' };
	const upper = limits.indicative.findIndex((point) => point.Re_D > reynolds);
	const [a, b] = [limits.indicative[upper - 1], limits.indicative[upper]];
	if (a === undefined || b === undefined) return { C: limits.C, from: 'below the table' };
	const part = (reynolds - a.Re_D) / (b.Re_D - a.Re_D);
	return { C: a.C + part * (b.C - a.C), U: Math.max(a.U, b.U), from: 'indicative table' };
}
