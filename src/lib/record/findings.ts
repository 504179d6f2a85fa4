import type { Procedure } from '../procedure';
import { allOf, type RecordEvent } from './event';
import type { EntryFact } from './entry-facts';
import { millis, type Millis } from './instants';

/** An instrument found bad: what was proved with it from its last good check to its next passing one is void (ST7). */
export type Finding = {
	readonly event: string;
	readonly instrument: string;
	readonly observed: Millis;
	/** -Infinity when the record holds no good check before. */
	readonly lastGood: Millis;
	readonly nextGood: Millis;
	/** Entries that an instrument engineer confirmed with the error applied. */
	readonly confirmed: ReadonlySet<string>;
};

export type GoodCheck = { readonly instrument: string; readonly at: Millis };

export function findingsOf(
	events: readonly RecordEvent[],
	checks: readonly GoodCheck[],
	rolesOf: ReadonlyMap<string, readonly string[]>,
): readonly Finding[] {
	const confirmations = allOf(events, 'value confirmed').filter((event) =>
		(rolesOf.get(event.person) ?? []).includes('instrument engineer'),
	);
	return allOf(events, 'instrument finding').map((event) => {
		const good = checks.filter((check) => check.instrument === event.body.instrument).map((check) => check.at);
		return {
			event: event.id,
			instrument: event.body.instrument,
			observed: event.observedAt,
			lastGood:
				event.body.lastGood === undefined
					? Math.max(-Infinity, ...good.filter((at) => at < event.observedAt))
					: millis(event.body.lastGood),
			nextGood: Math.min(Infinity, ...good.filter((at) => at > event.observedAt)),
			confirmed: new Set(confirmations.filter(({ body }) => body.finding === event.id).map(({ body }) => body.entry)),
		};
	});
}

/** Passing function checks: of the start-up's own check steps, and of the site log. */
export function goodChecks(
	procedure: Procedure,
	events: readonly RecordEvent[],
	entries: readonly EntryFact[],
): readonly GoodCheck[] {
	const checkedBy = new Map(
		procedure.steps.flatMap((step) => (step.checks === undefined ? [] : [[step.id, step.checks] as const])),
	);
	const inSteps = entries.flatMap((entry) => {
		const instrument = checkedBy.get(entry.step);
		return entry.outcome === 'pass' && instrument !== undefined ? [{ instrument, at: entry.observed }] : [];
	});
	const onSite = allOf(events, 'instrument checked')
		.filter((event) => event.body.passes)
		.map((event) => ({ instrument: event.body.instrument, at: event.observedAt }));
	return [...inSteps, ...onSite];
}

/** Whether a proof that used the instrument rests on its bad time: any of its readings between the two good checks. */
export const voids = (finding: Finding, entry: EntryFact): boolean =>
	entry.observed >= finding.lastGood && entry.oldest < finding.nextGood && !finding.confirmed.has(entry.id);
