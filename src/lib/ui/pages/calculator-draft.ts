import type { Calculator } from '../../calc';
import { isQuantityName } from '../../quantity';

/** What is typed into a calculator so far, by the name of the input. */
export type CalculatorDraft = { readonly [input: string]: { readonly text: string; readonly unit: string } };

/** The inputs as the calculator takes them: numbers as typed with their unit, tables and series as JSON. What is empty is left out. */
export const inputsFrom = (calculator: Calculator, draft: CalculatorDraft): { readonly [input: string]: unknown } =>
	Object.fromEntries(
		calculator.inputs.flatMap(({ name, quantity, choices }) => {
			const typed = draft[name];
			if (typed === undefined || typed.text.trim() === '') return [];
			if (choices !== undefined) return [[name, typed.text]];
			return [[name, isQuantityName(quantity) ? { value: typed.text, unit: typed.unit } : fromJson(typed.text)]];
		}),
	);

/** Text that is no JSON is a text: an outlet by name. The calculator refuses what it cannot take, with its place. */
function fromJson(text: string): unknown {
	try {
		return JSON.parse(text) as unknown;
	} catch {
		return text;
	}
}
