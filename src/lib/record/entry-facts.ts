import type { Procedure } from '../procedure';
import { allOf, type EventOf, type RecordEvent } from './event';
import { millis, type Millis } from './instants';

export type WithoutEffect = { readonly event: string; readonly because: string };

/** An entry that counts: neither withdrawn nor superseded. */
export type EntryFact = {
	readonly id: string;
	readonly clock: number;
	readonly step: string;
	readonly outcome: EventOf<'entry'>['body']['outcome'];
	readonly observed: Millis;
	/** Observed time of the oldest reading that the proof needs (ST2). */
	readonly oldest: Millis;
	/** Who entered it and who read: none of them may release the gate over it. */
	readonly performers: readonly string[];
	readonly rows: readonly RowFact[];
	/** What the entry says it used; undefined when it leaves that to the step. */
	readonly instruments: readonly string[] | undefined;
	readonly readings: readonly PointReading[];
	readonly flow: EventOf<'entry'>['body']['flow'];
	/** When a releasing role agreed that the step is not applicable. */
	readonly agreed: Millis | undefined;
};

/** A value read at a measuring point, as it was typed. */
export type PointReading = {
	readonly point: string;
	readonly typed: string;
	readonly unit: string;
	readonly basis: 'wet' | 'dry' | undefined;
	readonly observed: Millis;
};

export type RowFact = { readonly row: string; readonly passes: boolean; readonly observed: Millis };

export function entryFactsOf(
	procedure: Procedure,
	events: readonly RecordEvent[],
	releases: (person: string) => boolean,
	withoutEffect: WithoutEffect[],
): readonly EntryFact[] {
	const steps = new Set(procedure.steps.map((step) => step.id));
	const withdrawn = new Set(allOf(events, 'entry withdrawn').map((event) => event.body.entry));
	const standing = allOf(events, 'entry').filter((event) => !withdrawn.has(event.id));
	const superseded = new Set(standing.flatMap((event) => event.body.supersedes ?? []));
	const agreed = new Map<string, Millis>();
	for (const event of allOf(events, 'not applicable agreed'))
		if (releases(event.person)) {
			const before = agreed.get(event.body.entry) ?? Infinity;
			agreed.set(event.body.entry, Math.min(before, event.observedAt));
		} else withoutEffect.push({ event: event.id, because: 'only a releasing role agrees to not applicable' });
	return standing.flatMap((event) => {
		if (superseded.has(event.id)) return [];
		if (!steps.has(event.body.step)) {
			withoutEffect.push({ event: event.id, because: `the procedure has no step ${event.body.step}` });
			return [];
		}
		return [entryFact(event, agreed.get(event.id))];
	});
}

function entryFact(event: EventOf<'entry'>, agreed: Millis | undefined): EntryFact {
	const { body } = event;
	const own = (text: string | undefined): Millis => (text === undefined ? event.observedAt : millis(text));
	const rows = (body.rows ?? []).map((row) => ({ row: row.row, passes: row.passes, observed: own(row.observed) }));
	const readings = [...(body.values ?? []), ...(body.rows ?? []).flatMap((row) => row.reading ?? [])];
	const used = [...(body.instruments ?? []), ...readings.flatMap((reading) => reading.instrument ?? [])];
	return {
		id: event.id,
		clock: event.clock,
		step: body.step,
		outcome: body.outcome,
		observed: event.observedAt,
		oldest: Math.min(
			event.observedAt,
			own(body.from),
			...readings.map((reading) => own(reading.observed)),
			...rows.map((row) => row.observed),
		),
		performers: [
			...new Set([
				event.person,
				...readings.flatMap((reading) => reading.readBy ?? []),
				...(body.rows ?? []).flatMap((row) => row.lookedBy ?? []),
			]),
		],
		rows,
		instruments: used.length === 0 ? undefined : [...new Set(used)],
		readings: readings.flatMap(({ point, typed, unit, basis, observed }) =>
			point === undefined ? [] : [{ point, typed, unit, basis, observed: own(observed) }],
		),
		flow: body.flow,
		agreed,
	};
}
