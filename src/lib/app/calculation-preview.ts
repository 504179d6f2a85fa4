import { CATALOGUE, runCalculator, type CalcResult, type Calculator } from '../calc';
import { bindInputs, type Binding, type Step } from '../procedure';
import { lookupIn } from '../record';
import { sayRefusal, shownText, type Say } from '../wording';
import type { OpenStartUp } from './open-start-up.svelte';

/** A calculation as it would come out now: its inputs with their origin, what is missing, its result. Nothing is written. */
export type CalculationPreview = {
	readonly calculator: Calculator;
	readonly inputs: readonly ShownInput[];
	readonly missing: readonly string[];
	readonly refused: readonly string[];
	readonly result: CalcResult | undefined;
	/** Instant of the zero of the series that it rests on. */
	readonly zero: string | undefined;
	/** Inputs that are typed into the step itself. */
	readonly typed: readonly { readonly name: string; readonly title: string }[];
};

export type ShownInput = {
	readonly name: string;
	readonly symbol?: string;
	readonly title: string;
	readonly value: string;
	readonly origin: string;
};

type Calculation = Extract<Step, { readonly kind: 'calculation' }>;

export function previewCalculation(
	startUp: OpenStartUp,
	step: Calculation,
	typed: { readonly [input: string]: string },
	say: Say,
): CalculationPreview | undefined {
	const calculator = CATALOGUE[step.calculator];
	if (calculator === undefined) return undefined;
	const { procedure, plant, events, standing, trends } = startUp;
	const lookup = lookupIn({ events, standing, trends, typed });
	const bound = bindInputs(step, { procedure, plant, lookup });
	const result = bound.ok ? runCalculator(step.calculator, bound.value) : undefined;
	const values = bound.ok ? bound.value : {};
	const series = Object.values(step.bind).find(({ from }) => from === 'zero' || from === 'series');
	const missing = bound.ok ? [] : bound.error.map(({ input, binding }) => `${input} (${originOf(binding, say)})`);
	return {
		calculator,
		inputs: calculator.inputs.flatMap(({ name, symbol, means }) => {
			const binding = step.bind[name];
			if (binding === undefined || values[name] === undefined) return [];
			const shown = { name, title: means, value: shownValue(values[name], say), origin: originOf(binding, say) };
			return [symbol === undefined ? shown : { ...shown, symbol }];
		}),
		missing: [...new Set(missing)],
		refused: result?.ok === false ? result.error.map((refusal) => sayRefusal(refusal, say)) : [],
		result: result?.ok === true ? result.value : undefined,
		zero: series !== undefined && 'step' in series ? lookup.series(series.step)?.zero : undefined,
		typed: Object.entries(step.bind).flatMap(([name, binding]) =>
			binding.from === 'typed' ? [{ name, title: shownText(binding.title, say) }] : [],
		),
	};
}

function originOf(binding: Binding, say: Say): string {
	switch (binding.from) {
		case 'plant':
		case 'limit':
			return say('app.origin.plant');
		case 'procedure':
			return binding.why === undefined ? say('app.origin.procedure') : shownText(binding.why, say);
		case 'calibration':
			return say('app.origin.instrument', { instrument: binding.instrument });
		case 'typed':
			return say('app.origin.typed');
		case 'group':
		case 'list':
			return say('app.origin.several');
		default:
			return say('problem.of step', { step: binding.step });
	}
}

/** A measure is read out; what is a table is told by its size. */
function shownValue(value: unknown, say: Say): string {
	if (typeof value !== 'object' || value === null) return String(value);
	if ('value' in value && 'unit' in value) return `${String(value.value)} ${String(value.unit)}`;
	return say('app.origin.entries', { n: Array.isArray(value) ? value.length : Object.keys(value).length });
}
