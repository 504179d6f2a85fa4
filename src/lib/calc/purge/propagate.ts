import type { BudgetRow } from '../calculator';

/** An input of an uncertainty budget: x with its expanded uncertainty U (k = 2), both in SI units. */
export type Uncertain = {
	readonly input: string;
	readonly symbol: string;
	readonly unit: string;
	readonly x: number;
	readonly U?: number | undefined;
};

/**
 * Expanded uncertainty of outputs from those of the inputs, with the budget that shows where it comes from.
 *
 *     U(y)² = Σ (∂y/∂x_i U(x_i))²,  derivatives as central differences over U/1000
 *
 * @param f outputs by name from the inputs in their order; null where an output has no number
 * @param inputs x_i and U(x_i) [any], uncorrelated; those without U contribute nothing
 * @returns U of each output [its unit] that has a number, and one row for each output and input with a part in it
 *
 * Source: JCGM 100:2008 (GUM), 5.1.2 Eq. (10) and the note to 5.1.3 (differences); U = 2u throughout.
 * Checked against: derivatives in closed form (test/calc/purge/propagate.test.ts).
 */
export function propagate<Name extends string>(
	f: (x: readonly number[]) => { readonly [N in Name]: number | null },
	inputs: readonly Uncertain[],
): { readonly U: { readonly [N in Name]?: number }; readonly budget: readonly BudgetRow[] } {
	const x = inputs.map((input) => input.x);
	const U: { [N in Name]?: number } = {};
	const budget: BudgetRow[] = [];
	for (const [output, value] of Object.entries(f(x)) as [Name, number | null][]) {
		if (value === null) continue;
		const parts = inputs.flatMap(({ U: width = 0, ...input }, i) => {
			if (!(width > 0)) return [];
			const step = width / 1000;
			const at = (shift: number): number | null => f(x.map((each, k) => (k === i ? each + shift : each)))[output];
			const [above, below] = [at(step), at(-step)];
			// Within a thousandth of U from where the output ends: no derivative, and so no uncertainty to state.
			const sensitivity = above === null || below === null ? Number.NaN : (above - below) / (2 * step);
			return [{ ...input, width, sensitivity }];
		});
		const variance = parts.reduce((sum, { sensitivity, width }) => sum + (sensitivity * width) ** 2, 0);
		if (!(variance > 0)) continue;
		U[output] = Math.sqrt(variance);
		for (const { input, symbol, unit, width, sensitivity } of parts) {
			budget.push({ output, input, symbol, U: width, unit, sensitivity, share: (sensitivity * width) ** 2 / variance });
		}
	}
	return { U, budget };
}
