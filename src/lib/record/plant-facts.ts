import type { LapsedBy, PlantEventKind, Procedure } from '../procedure';
import { allOf, type EventOf, type RecordEvent } from './event';
import type { WithoutEffect } from './entry-facts';
import { MINUTE, millis, type Millis } from './instants';
import { inOrder } from './knowledge';

/** Something that happened to the plant, as an interval (ST2). `end` is Infinity while it goes on. */
export type PlantFact = {
	readonly event: string;
	readonly what: string;
	/** The names that steps are lapsed by, given how long it lasted. */
	readonly names: readonly string[];
	readonly item: string | undefined;
	readonly begin: Millis;
	readonly end: Millis;
	/** A proof counts again when its oldest needed reading was observed from here on. */
	readonly voidsBefore: Millis;
	readonly enteredAt: Millis;
	readonly withdrawn: boolean;
};

/** A shift hand-over whose temporary states nobody confirmed counts as this, from the hand-over on (ST11). */
const UNCONFIRMED = 'hand-over-unconfirmed';

export function plantFactsOf(
	procedure: Procedure,
	events: readonly RecordEvent[],
	rules: {
		readonly tolerance: Millis;
		readonly releases: (person: string) => boolean;
		readonly withoutEffect: WithoutEffect[];
	},
): readonly PlantFact[] {
	const kinds = new Map(procedure.plantEvents.map((kind) => [kind.id, kind]));
	const ends = latestEnds(events);
	const corrections = allOf(events, 'plant event corrected');
	const begun = allOf(events, 'plant event begun').map((event) => {
		const interval = correct(event, ends.get(event.id), corrections, rules);
		return { event, what: event.body.what, item: event.body.item, ...interval };
	});
	const unconfirmed = allOf(events, 'shift hand-over')
		.filter((event) => !event.body.temporaryStatesConfirmed)
		.map((event) => ({
			event,
			what: UNCONFIRMED,
			item: undefined,
			begin: event.observedAt,
			end: ends.get(event.id) ?? Infinity,
			withdrawn: false,
		}));
	return [...begun, ...unconfirmed].map(({ event, ...fact }) => ({
		...fact,
		event: event.id,
		enteredAt: event.enteredAt,
		names: fact.withdrawn ? [] : namesOf(fact.what, fact.end - fact.begin, kinds.get(fact.what)),
		voidsBefore: fact.end + rules.tolerance,
	}));
}

/** Where two people report different ends, the wider interval counts. */
function latestEnds(events: readonly RecordEvent[]): ReadonlyMap<string, Millis> {
	const ends = new Map<string, Millis>();
	for (const { body } of allOf(events, 'plant event ended'))
		ends.set(body.event, Math.max(ends.get(body.event) ?? -Infinity, millis(body.end)));
	return ends;
}

type Interval = { readonly begin: Millis; readonly end: Millis; readonly withdrawn: boolean };

/**
 * Anyone may widen an interval. Withdrawing or shortening it needs a releasing role other than the author, and evidence;
 * without them the correction is kept and changes nothing.
 */
function correct(
	event: EventOf<'plant event begun'>,
	reportedEnd: Millis | undefined,
	corrections: readonly EventOf<'plant event corrected'>[],
	rules: { readonly releases: (person: string) => boolean; readonly withoutEffect: WithoutEffect[] },
): Interval {
	const ends = [
		...(event.body.end === undefined ? [] : [millis(event.body.end)]),
		...(reportedEnd === undefined ? [] : [reportedEnd]),
	];
	let interval: Interval = {
		begin: millis(event.body.begin),
		end: ends.length === 0 ? Infinity : Math.max(...ends),
		withdrawn: false,
	};
	for (const correction of corrections.filter(({ body }) => body.event === event.id).sort(inOrder)) {
		const { body } = correction;
		const wanted: Interval = {
			begin: body.begin === undefined ? interval.begin : millis(body.begin),
			end: body.end === undefined ? interval.end : millis(body.end),
			withdrawn: body.withdrawn ?? interval.withdrawn,
		};
		const narrows =
			wanted.withdrawn || wanted.begin > interval.begin || (wanted.end < interval.end && interval.end !== Infinity);
		const because = !narrows
			? undefined
			: !rules.releases(correction.person)
				? 'withdrawing or shortening an event needs a releasing role'
				: correction.person === event.person
					? 'withdrawing or shortening an event needs somebody other than its author'
					: body.evidence === undefined
						? 'withdrawing or shortening an event needs evidence'
						: undefined;
		if (because === undefined) interval = wanted;
		else rules.withoutEffect.push({ event: correction.id, because });
	}
	return interval;
}

function namesOf(what: string, lasted: Millis, kind: PlantEventKind | undefined): readonly string[] {
	if (kind?.short !== undefined && lasted <= kind.short.upToMinutes * MINUTE) return [kind.short.countsAs];
	if (kind?.long !== undefined && lasted > kind.long.overMinutes * MINUTE) return [what, kind.long.countsAlsoAs];
	return [what];
}

/** Whether an event lapses what names it; for a row of a table, whether it lapses that row. */
export function lapses(fact: PlantFact, by: LapsedBy, row: string | undefined): boolean {
	const named = typeof by === 'string' ? { event: by } : by;
	if (!fact.names.includes(named.event)) return false;
	if (named.item !== undefined && fact.item !== undefined && named.item !== fact.item) return false;
	return !(named.rows === 'item' && row !== undefined && fact.item !== undefined && fact.item !== row);
}
