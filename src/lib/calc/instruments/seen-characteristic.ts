export type Seen = 'linear' | 'root' | 'root twice' | 'neither' | 'cannot tell';

/**
 * What a signal looks like against what was applied. A root taken in the transmitter and again in the control system shows
 * as the fourth root: a third of the span then reads three quarters.
 *
 *     y ≈ x (linear), x^½ (root), x^¼ (root twice),   smallest of the largest deviations, within 2 % of span
 *
 * @param points x applied and y seen [1 of span]; only 0.02 < x < 0.85 can tell, where the three are apart
 * @returns the characteristic that all of these points fit [a name]; 'cannot tell' without such a point
 *
 * Source: derived here.
 * Checked against: worked by hand (test/calc/instruments/seen-characteristic.test.ts).
 */
export function seenBy(points: readonly { readonly x: number; readonly y: number }[]): Seen {
	const telling = points.filter(({ x }) => x > 0.02 && x < 0.85);
	if (telling.length === 0) return 'cannot tell';
	const fits = FORMS.map(({ seen, power }) => ({
		seen,
		off: Math.max(...telling.map(({ x, y }) => Math.abs(y - x ** power))),
	}));
	const best = fits.reduce((least, each) => (each.off < least.off ? each : least));
	return best.off <= FIT ? best.seen : 'neither';
}

const FORMS = [
	{ seen: 'linear', power: 1 },
	{ seen: 'root', power: 1 / 2 },
	{ seen: 'root twice', power: 1 / 4 },
] as const;
const FIT = 0.02;
