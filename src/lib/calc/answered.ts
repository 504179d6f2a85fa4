import type { CalcValue, OutputSpec } from './calculator';
import type { Numbers } from './uncertainty';

/** Values in the order of the outputs, each with its uncertainty; what has no number says why. */
export const answered = (
	outputs: readonly OutputSpec[],
	values: { readonly [name: string]: number | undefined },
	U: Numbers,
	because: { readonly [name: string]: string } = {},
): { readonly [name: string]: CalcValue } =>
	Object.fromEntries(
		outputs.map(({ name, unit }): [string, CalcValue] => {
			const value = values[name];
			if (value === undefined) return [name, { value: null, unit, because: because[name] ?? 'not known' }];
			return [name, { value, unit, ...(U[name] === undefined ? {} : { U: U[name] }) }];
		}),
	);
