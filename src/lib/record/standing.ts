import type { Procedure } from '../procedure';
import { ActJudge } from './acts';
import type { Standing } from './answer';
import { allOf, type RecordEvent } from './event';
import { factsOf } from './facts';
import { notEnoughNow } from './gate-states';
import { millis, offsetMinutes } from './instants';
import { inOrder, Knowledge } from './knowledge';
import { permissiveStandings } from './permissives';
import { play } from './play';
import { answer } from './print-answer';

/**
 * What stands, and why not: the heart of the house (record/SPEC.md, rules ST1 to ST11). A pure, total function of the
 * procedure, the events and an instant; the same events in any order give the same answer.
 *
 * @param startUpEvents the start-up's log, in any order, duplicates allowed
 * @param siteEvents the site's log, as far as it is known
 * @param at the instant that is asked about, RFC 3339; events entered later are left out
 * @param knownTo the tablet whose knowledge is asked for; absent: everything in the two logs
 */
export function standing(
	procedure: Procedure,
	startUpEvents: readonly RecordEvent[],
	siteEvents: readonly RecordEvent[],
	at: string,
	knownTo?: string,
): Standing {
	const now = millis(at);
	const offset = offsetMinutes(at);
	const all = unique([...startUpEvents, ...siteEvents]).filter((event) => event.enteredAt <= now);
	const knowledge = new Knowledge(all);
	const known = knownTo === undefined ? undefined : knowledge.knownTo(knownTo, now);
	const site = new Set(siteEvents.map(({ id }) => id));
	const events = known === undefined ? all : all.filter((event) => known.has(event.id) || site.has(event.id));
	const { inside, after, seal } = splitAtSeal(events, site, knowledge);
	const judge = new ActJudge(procedure, inside, knowledge);
	const facts = factsOf(procedure, inside);
	const played = play(procedure, facts, now, judge.allowed);
	const permissives = permissiveStandings(procedure, played, offset);
	const notEnough = notEnoughNow(played, permissives);
	return answer({
		procedure,
		events,
		inside,
		after,
		seal,
		judge,
		facts,
		played,
		permissives,
		notEnough,
		at,
		offset,
		knownTo,
	});
}

/** What is inside the seal is what the seal's tablet knew; anything else came after it and needs an addendum. */
function splitAtSeal(
	events: readonly RecordEvent[],
	site: ReadonlySet<string>,
	knowledge: Knowledge,
): {
	readonly inside: readonly RecordEvent[];
	readonly after: readonly RecordEvent[];
	readonly seal: RecordEvent | undefined;
} {
	const seal = [...allOf(events, 'sealed')].sort(inOrder)[0];
	if (seal === undefined) return { inside: events, after: [], seal };
	const past = knowledge.past(seal);
	const isInside = (event: RecordEvent): boolean =>
		event.id === seal.id || past.has(event.id) || (site.has(event.id) && event.enteredAt <= seal.enteredAt);
	return { inside: events.filter(isInside), after: events.filter((event) => !isInside(event)), seal };
}

function unique(events: readonly RecordEvent[]): readonly RecordEvent[] {
	return [...new Map(events.map((event) => [event.id, event])).values()];
}
