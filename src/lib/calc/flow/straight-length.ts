import type { CalcNote } from '../calculator';
import type { VenturiGiven } from './venturi-inputs';

export type StraightLength = {
	/** Added to the relative expanded uncertainty of C, arithmetically. */
	readonly added: number;
	readonly notes: readonly CalcNote[];
};

/**
 * What the straight pipe upstream of a Venturi tube does to its coefficient: nothing where it is long enough, half a
 * percent of uncertainty in the bracketed range, and below that the standard no longer holds.
 *
 *     U(C)/C + 0.5 %   where reduced ≤ L/D < needed
 *
 * @param given L, straight length [m]; needed and reduced, multiples of D from the edition in force [1]
 * @param D pipe diameter [m]
 * @returns what is added to U(C)/C [1], and the notes that say why
 *
 * Source: ISO 5167-4:2003, 6.2 and Table 1 (from memory, verify); the lengths themselves are data of the site.
 * Checked against: worked by hand (test/calc/flow/straight-length.test.ts).
 */
export function straightLength(given: VenturiGiven, D: number): StraightLength {
	const { straightLength: length, straightLengthNeeded: needed, straightLengthReduced: reduced } = given;
	if (length === undefined || needed === undefined) return { added: 0, notes: [] };
	const facts = { has: length.value / D, needs: needed.value };
	if (facts.has >= facts.needs) return { added: 0, notes: [] };
	if (reduced !== undefined && facts.has >= reduced.value) {
		return { added: ADDED, notes: [{ kind: 'straight-length-reduced', level: 'warning', ...facts, added: ADDED }] };
	}
	return { added: 0, notes: [{ kind: 'straight-length-short', level: 'outside scope', ...facts }] };
}

const ADDED = 0.005;
