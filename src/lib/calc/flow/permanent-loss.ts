/**
 * Pressure that a Venturi tube costs for good, after the gas has slowed down again behind it.
 *
 *     Δϖ = ξ(β, D) Δp
 *
 * ξ is read from the chart between its curve for 65 mm and its curve for 500 mm, linear in D. For wider pipes the lower
 * curve is kept: wall roughness matters less there, so the loss is not larger. Outside the chart otherwise: no value.
 *
 * @param dp Δp, difference pressure [Pa]
 * @param beta β, diameter ratio [1], 0.30 ≤ β ≤ 0.75
 * @param D pipe diameter [m], D ≥ 0.065
 * @returns Δϖ, permanent pressure loss [Pa], or undefined outside the chart
 *
 * Source: ASME MFC-3M-2004 and ISO 5167-4:2003, Annex C, chart as read off in fluids 1.0.22 (dP_venturi_tube).
 * Checked against: fluids 1.0.22 (test/calc/flow/permanent-loss.test.ts).
 */
export function permanentLoss(dp: number, beta: number, D: number): number | undefined {
	if (!(beta >= 0.3 - ROUNDING && beta <= 0.75 + ROUNDING && D >= 0.065)) return undefined;
	const part = Math.min(1, (D - 0.065) / (0.5 - 0.065));
	const high = between(beta, 1);
	return dp * (high + part * (between(beta, 2) - high));
}

/** The band the standard names for all Venturi tubes: ISO 5167-4:2003, 5.9 (from memory, verify). */
export const LOSS_BAND = { least: 0.05, most: 0.2 } as const;

/** Linear between the points of one curve of the chart; its last point, 0.74965, stands for 0.75 as well. */
function between(beta: number, curve: 1 | 2): number {
	const after = CHART.findIndex((point) => point[0] >= beta);
	const b = CHART.at(after) ?? [0, 0, 0];
	const a = CHART[Math.max(0, after - 1)] ?? b;
	if (after < 0 || a === b) return b[curve];
	return a[curve] + ((beta - a[0]) / (b[0] - a[0])) * (b[curve] - a[curve]);
}

const ROUNDING = 1e-9;

// fluids 1.0.22 (MIT), flow_meter.py: venturi_tube_betas, venturi_tube_dP_high (65 mm), venturi_tube_dP_low (500 mm).
const CHART: readonly (readonly [beta: number, narrow: number, wide: number])[] = [
	[0.29916, 0.164534, 0.089232],
	[0.29947, 0.164504, 0.089218],
	[0.31239, 0.163591, 0.088671],
	[0.31901, 0.163508, 0.088435],
	[0.32658, 0.163439, 0.088206],
	[0.33729, 0.162652, 0.087853],
	[0.34202, 0.162224, 0.087655],
	[0.34706, 0.161866, 0.087404],
	[0.35903, 0.161238, 0.086693],
	[0.36596, 0.160786, 0.086241],
	[0.37258, 0.160295, 0.085813],
	[0.38487, 0.15928, 0.085142],
	[0.38581, 0.159193, 0.085102],
	[0.40125, 0.157776, 0.084446],
	[0.40535, 0.157467, 0.084202],
	[0.41574, 0.156517, 0.083301],
	[0.42425, 0.155323, 0.08247],
	[0.43401, 0.153835, 0.08165],
	[0.44788, 0.151862, 0.080582],
	[0.45259, 0.151154, 0.080213],
	[0.47181, 0.14784, 0.078509],
	[0.47309, 0.147613, 0.078378],
	[0.49354, 0.144052, 0.075989],
	[0.49924, 0.14305, 0.075226],
	[0.51653, 0.140107, 0.0727],
	[0.5238, 0.138981, 0.071598],
	[0.53763, 0.136794, 0.069562],
	[0.54806, 0.134737, 0.068128],
	[0.55684, 0.132847, 0.066986],
	[0.57389, 0.129303, 0.064658],
	[0.58235, 0.127637, 0.063298],
	[0.59782, 0.124758, 0.060872],
	[0.60156, 0.124006, 0.060378],
	[0.62265, 0.119269, 0.057879],
	[0.62649, 0.118449, 0.057403],
	[0.64948, 0.113605, 0.054091],
	[0.65099, 0.113269, 0.053879],
	[0.6687, 0.108995, 0.051726],
	[0.67587, 0.107109, 0.050931],
	[0.68855, 0.103688, 0.049362],
	[0.69318, 0.102529, 0.048675],
	[0.70618, 0.099567, 0.046522],
	[0.71333, 0.097791, 0.045381],
	[0.72351, 0.095055, 0.04384],
	[0.74954, 0.087681, 0.039913],
	[0.74965, 0.087648, 0.039896],
];
