import type { Step } from '../procedure';
import { allOf, type BodyOf } from '../record';
import type { OpenStartUp } from './open-start-up.svelte';

/** How one enclosed volume was shown inert, as the table says it. */
export type CoveredVolume = {
	readonly volume: string;
	readonly how: NonNullable<BodyOf<'entry'>['rows']>[number]['found'];
	readonly passes: boolean;
	/** What was read there, or the point that reads it. */
	readonly seen: string;
};

type Calculation = Extract<Step, { readonly kind: 'calculation' }>;

/** A judgement on a purge has a sheet of its own: its verdict is the proof, and it looks at places and volumes. */
export const judgesPurge = (step: Step): step is Calculation =>
	step.kind === 'calculation' && step.proves === 'verdict' && step.calculator.startsWith('purge-adequacy@');

/** The coverage that a judgement would take: the entry that counts for the step that it is bound to. */
export function coverageFor(
	{ procedure, plant, standing, events }: OpenStartUp,
	step: Calculation,
): readonly CoveredVolume[] {
	const bound = Object.values(step.bind).find(({ from }) => from === 'coverage');
	const asked = bound?.from === 'coverage' ? procedure.steps.find(({ id }) => id === bound.step) : undefined;
	if (asked?.kind !== 'coverage') return [];
	const counting = standing.steps.find((one) => one.step === asked.id)?.entry;
	const entry = allOf(events, 'entry').find(({ id }) => id === counting);
	return (entry?.body.rows ?? []).map(({ row, found, passes, reading }) => {
		const of = asked.rows.find(({ id }) => id === row);
		const volume = plant.volumes.find(({ id }) => id === of?.volume);
		const seen = reading === undefined ? (of?.point ?? '') : `${reading.typed}\u00a0${reading.unit}`;
		return { volume: volume?.title ?? row, how: found, passes, seen };
	});
}
