import type { Procedure } from '../procedure';
import type { Standing } from './answer';
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
	const event = unsignedEvent(nextEnvelope(draft, known));
	const found: Standing = standing(procedure, [...known, event], site, draft.entered);
	return found.withoutEffect.filter((one) => one.event === event.id).map(({ because }) => because);
}
