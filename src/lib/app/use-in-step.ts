import { ok, type Result } from '../base';
import type { CalcResult } from '../calc';
import type { Step } from '../procedure';
import { keepInDraft } from './step-desk.svelte';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';
import type { ThisTablet } from './this-tablet.svelte';

type Calculation = Extract<Step, { readonly kind: 'calculation' }>;
/** A calculation step of a start-up that is not sealed, and binds this calculator. */
export type UsableStep = { readonly startUp: OpenStartUp; readonly step: Calculation };

export async function stepsThatUse(here: ThisTablet, calc: string): Promise<readonly UsableStep[]> {
	if (here.tablet === undefined) return [];
	const opened = await Promise.all(here.startUps.map(({ id }) => here.startUp(id)));
	return opened.flatMap((startUp) => {
		if (!startUp.ok || startUp.value.isSealed) return [];
		return startUp.value.procedure.steps.flatMap((step) =>
			step.kind === 'calculation' && step.calculator === calc ? [{ startUp: startUp.value, step }] : [],
		);
	});
}

/**
 * Puts what was planned into the draft of a step: fields that the step leaves to be typed are filled, and the note tells the
 * plan. What the step binds to readings stays bound to them: a planned number never becomes a reading.
 */
export async function useInStep(
	{ startUp, step }: UsableStep,
	plan: { readonly result: CalcResult; readonly said: string },
): Promise<Result<'kept', Problem>> {
	const given = plan.result.inputs as { readonly [input: string]: unknown };
	const inputs = Object.fromEntries(
		Object.entries(step.bind).flatMap(([name, binding]) => {
			const value = given[name];
			return binding.from === 'typed' && typeof value === 'string' ? [[name, value] as const] : [];
		}),
	);
	const kept = await keepInDraft(startUp, step.id, ({ note, inputs: typed, ...draft }) => ({
		...draft,
		inputs: { ...typed, ...inputs },
		note: note === undefined || note.trim() === '' ? plan.said : `${note}\n${plan.said}`,
	}));
	return kept.ok ? ok('kept') : kept;
}
