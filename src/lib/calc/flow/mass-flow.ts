/**
 * Mass flow through a Venturi tube.
 *
 *     q_m = C ε (π/4) d² √(2 Δp ρ₁) / √(1 − β⁴),   β = d/D
 *
 * @param C discharge coefficient [1]
 * @param epsilon ε, expansibility factor [1]
 * @param d throat diameter at working temperature [m], 0 < d < D
 * @param D pipe diameter at working temperature [m]
 * @param dp Δp, difference pressure [Pa], Δp ≥ 0
 * @param rho1 ρ₁, density at the upstream tapping [kg/m³]
 * @returns q_m, mass flow [kg/s]
 *
 * Source: ISO 5167-1:2003, Eq. (1) (numbering from memory, verify).
 * Checked against: fluids 1.0.22, 66 cases (test/calc/flow/venturi-flow.test.ts).
 */
export const massFlow = ({ C, epsilon, d, D, dp, rho1 }: Meter): number =>
	(C * epsilon * (Math.PI / 4) * d ** 2 * Math.sqrt(2 * dp * rho1)) / Math.sqrt(1 - (d / D) ** 4);

export type Meter = {
	readonly C: number;
	readonly epsilon: number;
	readonly d: number;
	readonly D: number;
	readonly dp: number;
	readonly rho1: number;
};

/**
 * Reynolds number of the pipe: whether the flow is turbulent enough for the coefficient of the meter to hold.
 *
 *     Re_D = 4 q_m / (π μ₁ D)
 *
 * @param flow q_m, mass flow [kg/s]
 * @param viscosity μ₁, dynamic viscosity at the upstream tapping [Pa s]
 * @param D pipe diameter [m]
 * @returns Re_D [1]
 *
 * Source: ISO 5167-1:2003, 3.3.2 (from memory, verify).
 * Checked against: fluids 1.0.22, 66 cases (test/calc/flow/venturi-flow.test.ts).
 */
export const reynoldsNumber = (flow: number, viscosity: number, D: number): number =>
	(4 * flow) / (Math.PI * viscosity * D);

/**
 * A diameter at working temperature: a hot tube is wider than its drawing, by 0.36 % for carbon steel at 320 °C.
 *
 *     D = D₂₀ [1 + α (T − 293.15 K)]
 *
 * @param diameter D₂₀ or d₂₀, as measured at 20 °C [m]
 * @param expansion α, coefficient of linear thermal expansion [1/K]
 * @param temperature T, of the metal [K]
 * @returns D or d [m]
 *
 * Source: ISO 5167-1:2003, 5.2 asks for it; the linear form is common practice.
 * Checked against: worked by hand (test/calc/flow/mass-flow.test.ts).
 */
export const hotDiameter = (diameter: number, expansion: number, temperature: number): number =>
	diameter * (1 + expansion * (temperature - 293.15));
