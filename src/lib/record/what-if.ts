import type { Procedure } from '../procedure';
import type { GateStanding, Standing, StepStanding } from './answer';
import type { EventKind, RecordEvent } from './event';
import { standing } from './standing';
import { nextEnvelope, unsignedEvent, type Draft } from './write';

/**
 * Why an act would have no effect, asked before it is signed: the rules play it as if it were there. Empty when it counts.
 * What comes back is kept as a refused act; the act itself is not written.
 */
export function objectionsTo<K extends EventKind>(
	procedure: Procedure,
	draft: Draft<K>,
	known: readonly RecordEvent[],
	site: readonly RecordEvent[],
): readonly string[] {
	const { event, found } = played(procedure, draft, known, site);
	return found.withoutEffect.filter((one) => one.event === event.id).map(({ because }) => because);
}

/** What would stand if a draft were written: shown before it is signed. */
export const standingWith = <K extends EventKind>(
	procedure: Procedure,
	draft: Draft<K>,
	known: readonly RecordEvent[],
	site: readonly RecordEvent[],
): Standing => played(procedure, draft, known, site).found;

/** What falls between two answers: the proofs that stood, and the gates that were released on them. */
export type Impact = {
	readonly steps: readonly StepStanding[];
	readonly gates: readonly GateStanding[];
	/** Work in minutes and earliest finish of the way back. */
	readonly back: Pick<Standing['reproof'], 'minutes' | 'earliestFinishMinutes'> & { readonly steps: number };
};

export function impactOf(before: Standing, after: Standing): Impact {
	const stood = new Set(
		before.steps.filter(({ state }) => state === 'stands' || state === 'waits').map(({ step }) => step),
	);
	const held = new Map(before.gates.map(({ gate, state }) => [gate, state]));
	const { minutes, earliestFinishMinutes, inWorkingOrder } = after.reproof;
	return {
		steps: after.steps.filter(({ step, state }) => stood.has(step) && (state === 'lapsed' || state === 'failed')),
		gates: after.gates.filter(
			({ gate, state }) =>
				held.get(gate) !== state && (state === 'lapsed' || state === 'held' || state === 'not ready'),
		),
		back: { minutes, earliestFinishMinutes, steps: inWorkingOrder.length },
	};
}

function played<K extends EventKind>(
	procedure: Procedure,
	draft: Draft<K>,
	known: readonly RecordEvent[],
	site: readonly RecordEvent[],
): { readonly event: RecordEvent; readonly found: Standing } {
	const ofStartUp = known.some(({ log }) => log === draft.log);
	const event = unsignedEvent(nextEnvelope(draft, ofStartUp ? known : site));
	const [events, siteEvents] = ofStartUp ? [[...known, event], site] : [known, [...site, event]];
	return { event, found: standing(procedure, events, siteEvents, draft.entered) };
}
