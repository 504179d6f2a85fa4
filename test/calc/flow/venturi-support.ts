import { venturiFlow } from '../../../src/lib/calc/flow/venturi-flow';
import type { CalcNote, CalcResult, Refusal } from '../../../src/lib/calc';

/** A plausible Venturi of the circuit: moist gas at 95 degC, every uncertainty stated. Tests change one thing in it. */
export const CIRCUIT = {
	type: 'rough_welded',
	pipeDiameter: 1.2,
	throatDiameter: 0.72,
	pressure: { value: 98_500, unit: 'Pa(a)', U: 200 },
	dp: { value: 800, unit: 'Pa', U: 8 },
	temperature: { value: 368.15, unit: 'K', U: 2 },
	composition: {
		N2: 0.62,
		CO2: { value: 0.1, unit: '1', U: 0.005 },
		O2: { value: 0.08, unit: '1', U: 0.003 },
		H2O: { value: 0.2, unit: '1', U: 0.02 },
	},
} as const;

export function run(inputs: unknown): CalcResult {
	const result = venturiFlow.run(inputs);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
}

export const valueOf = (inputs: unknown, name: string): number | null | undefined => run(inputs).values[name]?.value;

export const kindsOf = (inputs: unknown): readonly string[] => run(inputs).notes.map((note) => note.kind);

export function factsOf(inputs: unknown, kind: string): CalcNote {
	const note = run(inputs).notes.find((each) => each.kind === kind);
	if (note === undefined) throw new Error(`no note ${kind}: ${JSON.stringify(run(inputs).notes)}`);
	return note;
}

export function refusalsOf(inputs: unknown): readonly Refusal[] {
	const result = venturiFlow.run(inputs);
	if (result.ok) throw new Error('a result where a refusal was expected');
	return result.error;
}
