import * as v from 'valibot';
import { PlantSchema, type Plant } from '../plant';
import type { Procedure } from '../procedure';
import { allOf, type EventOf, type RecordEvent } from './event';
import { findingsOf, goodChecks, type Finding, type GoodCheck } from './findings';
import { MINUTE, millis, type Millis } from './instants';
import { inOrder, measuredSkew } from './knowledge';
import { plantFactsOf, type PlantFact } from './plant-facts';

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

export type GateAct = EventOf<'gate released'> | EventOf<'gate refused'> | EventOf<'refusal answered'>;

export type DeviationFact = {
	readonly deviation: string;
	readonly event: string;
	readonly blocks: EventOf<'deviation raised'>['body']['blocks'];
	readonly raised: Millis;
	readonly closed: Millis;
};

/** The record as facts, with everything resolved that does not need the course of time: what play starts from. */
export type Facts = {
	readonly opened: EventOf<'start-up opened'> | undefined;
	readonly startType: string | undefined;
	/** The plant description that the start-up holds; undefined when it holds none that can be read. */
	readonly plant: Plant | undefined;
	readonly rolesOf: ReadonlyMap<string, readonly string[]>;
	readonly releasingRoles: ReadonlySet<string>;
	readonly entries: readonly EntryFact[];
	readonly plantEvents: readonly PlantFact[];
	readonly findings: readonly Finding[];
	readonly checks: readonly GoodCheck[];
	/** Measuring points whose description changed: proofs that read them before are gone. */
	readonly pointsChanged: readonly { readonly event: string; readonly point: string; readonly at: Millis }[];
	readonly deviations: readonly DeviationFact[];
	readonly acts: readonly GateAct[];
	readonly sealed: EventOf<'sealed'> | undefined;
	readonly skew: Millis;
	/** Ages are judged up to here: the last agreed time while a tablet's clock is in doubt. */
	readonly agesUntil: Millis;
	readonly withoutEffect: readonly WithoutEffect[];
};

export function factsOf(procedure: Procedure, events: readonly RecordEvent[]): Facts {
	const rolesOf = readRoles(events);
	const releasingRoles = new Set(
		procedure.gates.flatMap((gate) => gate.signatures.flatMap((signature) => signature.roles)),
	);
	const releases = (person: string): boolean => (rolesOf.get(person) ?? []).some((role) => releasingRoles.has(role));
	const skew = measuredSkew(events);
	const tolerance = Math.max((procedure.toleranceMinutes ?? 2) * MINUTE, skew);
	const withoutEffect: WithoutEffect[] = [];
	const entries = readEntries(procedure, events, releases, withoutEffect);
	const checks = goodChecks(procedure, events, entries);
	const opened = [...allOf(events, 'start-up opened')].sort(inOrder)[0];
	const clock = [...allOf(events, 'clock noted')].sort(inOrder).at(-1);
	return {
		opened,
		startType: opened?.body.startType,
		plant: plantOf(opened),
		rolesOf,
		releasingRoles,
		entries,
		plantEvents: plantFactsOf(procedure, events, { tolerance, releases, withoutEffect }),
		findings: findingsOf(events, checks, rolesOf),
		checks,
		pointsChanged: allOf(events, 'plant described').flatMap((event) =>
			event.body.changedPoints.map((point) => ({ event: event.id, point, at: event.observedAt })),
		),
		deviations: readDeviations(events),
		acts: events.filter(isGateAct).sort((a, b) => a.observedAt - b.observedAt || inOrder(a, b)),
		sealed: [...allOf(events, 'sealed')].sort(inOrder)[0],
		skew,
		agesUntil: clock?.body.state === 'not agreed' ? millis(clock.body.lastAgreed ?? clock.entered) : Infinity,
		withoutEffect,
	};
}

function plantOf(opened: EventOf<'start-up opened'> | undefined): Plant | undefined {
	const plant = v.safeParse(PlantSchema, opened?.body.documents?.['plant']);
	return plant.success ? plant.output : undefined;
}

const isGateAct = (event: RecordEvent): event is GateAct =>
	event.kind === 'gate released' || event.kind === 'gate refused' || event.kind === 'refusal answered';

function readRoles(events: readonly RecordEvent[]): ReadonlyMap<string, readonly string[]> {
	const roles = new Map<string, readonly string[]>();
	const add = (person: string, more: readonly string[]): void =>
		void roles.set(person, [...new Set([...(roles.get(person) ?? []), ...more])]);
	for (const event of allOf(events, 'person enrolled')) add(event.body.person, event.body.roles);
	for (const event of allOf(events, 'start-up opened'))
		for (const { person, roles: own } of event.body.people) add(person, own);
	return roles;
}

function readEntries(
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

function readDeviations(events: readonly RecordEvent[]): readonly DeviationFact[] {
	const closings = allOf(events, 'deviation dispositioned');
	return allOf(events, 'deviation raised').map((event) => ({
		deviation: event.body.deviation,
		event: event.id,
		blocks: event.body.blocks,
		raised: event.observedAt,
		// The first disposition from its raising on; one that came before it speaks of an earlier deviation of this name.
		closed: Math.min(
			Infinity,
			...closings
				.filter((closing) => closing.body.deviation === event.body.deviation && closing.observedAt >= event.observedAt)
				.map((closing) => closing.observedAt),
		),
	}));
}
