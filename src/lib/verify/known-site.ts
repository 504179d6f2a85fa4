import { allOf, Knowledge, type RecordEvent } from '../record';

/**
 * What a tablet can have held of the site log when it wrote an event: everything that was entered until then (R9), or, when
 * nothing had reached it, what it wrote itself and what the opening of the start-up rests on.
 */
export function knownSite(
	site: readonly RecordEvent[],
	event: RecordEvent,
	startUp: readonly RecordEvent[],
): readonly (readonly RecordEvent[])[] {
	const until = site.filter(({ enteredAt }) => enteredAt <= event.enteredAt);
	const pinned = new Set(allOf(startUp, 'start-up opened').flatMap(({ body }) => Object.values(body.siteHeads ?? {})));
	const knowledge = new Knowledge(site);
	const before = new Set(site.filter(({ id }) => pinned.has(id)).flatMap((head) => [head.id, ...knowledge.past(head)]));
	const own = until.filter(({ id, device }) => device === event.device || before.has(id));
	return own.length === until.length ? [until] : [until, own];
}
