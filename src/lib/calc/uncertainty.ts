import type { BudgetRow } from './calculator';

/** An input of a model with its expanded uncertainty (k = 2), both in `unit`. */
export type Uncertain = {
	readonly name: string;
	readonly symbol?: string;
	readonly value: number;
	readonly U: number;
	readonly unit: string;
};
export type Numbers = { readonly [name: string]: number };
export type Propagated = { readonly U: Numbers; readonly budget: readonly BudgetRow[] };

/**
 * Expanded uncertainty of results whose inputs are uncertain: how far the flow, or a clearance, can be from what was read.
 *
 *     U_y² = Σ (cᵢ Uᵢ)²,   cᵢ = ∂y/∂xᵢ
 *
 * @param model y = f(x), from the values of all inputs to those of all results [SI]
 * @param inputs xᵢ, Uᵢ, independent of each other, all at the same coverage [their own units], Uᵢ ≥ 0
 * @returns U of every result [its own unit] and, per result and input, the part each contributes
 *
 * Source: JCGM 100:2008, 5.1.2 Eq. (10), derivatives numerically by 5.1.3 Note 2 with a thousandth of U as step.
 * Checked against: the closed form of ISO 5167-1, 8.2.2 (test/calc/flow/venturi-uncertainty.test.ts).
 */
export function propagate(model: (values: Numbers) => Numbers, inputs: readonly Uncertain[]): Propagated {
	const centre = Object.fromEntries(inputs.map((input) => [input.name, input.value]));
	const slopes = inputs
		.filter((input) => input.U > 0)
		.map((input) => {
			const step = input.U * STEP;
			const above = model({ ...centre, [input.name]: input.value + step });
			const below = model({ ...centre, [input.name]: input.value - step });
			return { input, slope: (output: string) => ((above[output] ?? 0) - (below[output] ?? 0)) / (2 * step) };
		});
	const outputs = Object.keys(model(centre));
	const U = Object.fromEntries(
		outputs.map((output) => [output, Math.hypot(...slopes.map(({ input, slope }) => slope(output) * input.U))]),
	);
	const budget = outputs.flatMap((output) =>
		slopes.flatMap(({ input, slope }): BudgetRow[] => {
			const sensitivity = slope(output);
			const { name, symbol, unit } = input;
			const total = U[output] ?? 0;
			if (sensitivity === 0 || total === 0) return [];
			const share = ((sensitivity * input.U) / total) ** 2;
			return [
				{ output, input: name, ...(symbol === undefined ? {} : { symbol }), U: input.U, unit, sensitivity, share },
			];
		}),
	);
	return { U, budget };
}

const STEP = 1e-3;
