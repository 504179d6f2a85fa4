/**
 * Whether a value agrees with one printed in a document: within half a unit of the last printed digit (house rule 9).
 * `printed` is the text of the document: "0.353658941e-2", "12.43", "2.490889E+02".
 */
export function agreesWith(value: number, printed: string): boolean {
	const [mantissa = '', exponent = '0'] = printed.toLowerCase().split('e');
	const decimals = mantissa.split('.')[1]?.length ?? 0;
	const lastDigit = 10 ** (Number(exponent) - decimals);
	// A billionth of the last digit for the rounding of the comparison itself.
	return Math.abs(value - Number(printed)) <= 0.5 * lastDigit * (1 + 1e-9);
}

/** Whether a value agrees with one computed by another program, to a relative tolerance. */
export const agreesWithin = (value: number, expected: number, relative: number): boolean =>
	Math.abs(value - expected) <= relative * Math.abs(expected);
