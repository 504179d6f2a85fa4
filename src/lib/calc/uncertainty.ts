import type { BudgetRow } from './calculator';

/** An input of a model with its expanded uncertainty (k = 2), both in `unit`; without U when nobody stated one. */
export type Uncertain = {
	readonly name: string;
	readonly symbol?: string;
	readonly value: number;
	readonly U?: number;
	readonly unit: string;
};
export type Numbers = { readonly [name: string]: number };
export type Propagated = {
	/** Only for results whose every input has a stated uncertainty: a sum with a part missing would look too good. */
	readonly U: Numbers;
	readonly budget: readonly BudgetRow[];
	/** Inputs without a stated uncertainty that some result depends on. */
	readonly unstated: readonly string[];
};

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
	const slopes = inputs.filter((input) => input.U !== 0).map((input) => slopesOf(model, centre, input));
	const unstated = slopes.filter(({ input }) => input.U === undefined);
	const outputs = Object.keys(model(centre)).filter((output) => unstated.every(({ slope }) => slope(output) === 0));
	const rows = outputs.map((output) => {
		const parts = slopes
			.map(({ input, slope }) => ({ input, sensitivity: slope(output), part: slope(output) * (input.U ?? 0) }))
			.filter(({ part }) => part !== 0);
		return { output, parts, U: Math.hypot(...parts.map(({ part }) => part)) };
	});
	return {
		U: Object.fromEntries(rows.map(({ output, U }) => [output, U])),
		budget: rows.flatMap(({ output, parts, U }) =>
			parts.map(({ input: { name, value: _, ...input }, sensitivity, part }) => ({
				...input,
				output,
				input: name,
				U: input.U ?? 0,
				sensitivity,
				share: (part / U) ** 2,
			})),
		),
		unstated: unstated.filter(({ slope }) => Object.keys(model(centre)).some(slope)).map(({ input }) => input.name),
	};
}

/** How each result follows one input; where no uncertainty is stated, only whether it follows at all. */
function slopesOf(model: (values: Numbers) => Numbers, centre: Numbers, input: Uncertain) {
	// Never below what the last digits of the value can carry.
	const step = Math.max(STEP * (input.U ?? 0), LEAST_STEP * Math.abs(input.value), Number.EPSILON);
	const above = model({ ...centre, [input.name]: input.value + step });
	const below = model({ ...centre, [input.name]: input.value - step });
	return { input, slope: (output: string) => ((above[output] ?? 0) - (below[output] ?? 0)) / (2 * step) };
}

const STEP = 1e-3;
const LEAST_STEP = 1e-6;
