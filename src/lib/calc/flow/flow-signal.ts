/** What a transmitter sends: the difference pressure itself, or its root, which is already a flow. */
export type Characteristic = 'linear' | 'root';

/**
 * Difference pressure behind a 4-20 mA signal.
 *
 *     linear transmitter          Δp = Δp_span (I − 4 mA)/16 mA
 *     root-extracting transmitter Δp = Δp_span [(I − 4 mA)/16 mA]²
 *
 * @param current I [A], 3.8 to 20.5 mA; below 4 mA the difference pressure is negative
 * @param span Δp_span, difference pressure at 20 mA [Pa]
 * @param characteristic what the transmitter is set to
 * @returns Δp [Pa]
 *
 * Source: IEC 60381-1 for the signal; the root setting is common practice.
 * Checked against: worked by hand, 4.16 mA is 1 % of Δp and 10 % of flow (test/calc/flow/flow-signal.test.ts).
 */
export function differencePressureOf(current: number, span: number, characteristic: Characteristic): number {
	const fraction = (current - 4e-3) / 16e-3;
	return span * (characteristic === 'linear' ? fraction : fraction * Math.abs(fraction));
}

/**
 * What a second reading of the same difference pressure says about the transmitter. A root taken twice - in the
 * transmitter and again in the control system - shows as the fourth root.
 *
 *     (I − 4 mA)/16 mA ≈ r (linear), √r (root), ⁴√r (root twice),   r = Δp/Δp_span
 *
 * @param current I [A]
 * @param span Δp_span [Pa]
 * @param dp Δp, read independently at the same time [Pa]
 * @returns the characteristic that fits both readings within 2 % of span [a name], 'neither', or 'cannot tell' where Δp is
 *   below 2 % or above 85 % of the span
 *
 * Source: derived here.
 * Checked against: worked by hand (test/calc/flow/flow-signal.test.ts).
 */
export function characteristicSeen(
	current: number,
	span: number,
	dp: number,
): Characteristic | 'root twice' | 'neither' | 'cannot tell' {
	const ratio = dp / span;
	if (!(ratio > 0.02 && ratio < 0.85)) return 'cannot tell';
	const fraction = (current - 4e-3) / 16e-3;
	const fits = (power: number) => Math.abs(fraction - ratio ** power) <= 0.02;
	if (fits(1)) return 'linear';
	if (fits(1 / 2)) return 'root';
	return fits(1 / 4) ? 'root twice' : 'neither';
}
