import * as v from 'valibot';
import { PlantSchema, type Plant } from '../plant';
import type { Procedure } from '../procedure';
import { allOf, type EventOf, type RecordEvent } from './event';
import { entryFactsOf, type EntryFact, type WithoutEffect } from './entry-facts';
import { findingsOf, goodChecks, type Finding, type GoodCheck } from './findings';
import { MINUTE, millis, type Millis } from './instants';
import { inOrder, measuredSkew } from './knowledge';
import { plantFactsOf, type PlantFact } from './plant-facts';

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
	const entries = entryFactsOf(procedure, events, releases, withoutEffect);
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

/** Read once per document: every gate act is judged on the same one. */
const PLANTS = new WeakMap<object, Plant | { readonly unreadable: true }>();

function plantOf(opened: EventOf<'start-up opened'> | undefined): Plant | undefined {
	const document = opened?.body.documents?.plant;
	if (typeof document !== 'object' || document === null) return undefined;
	const known = PLANTS.get(document) ?? readPlant(document);
	PLANTS.set(document, known);
	return 'unreadable' in known ? undefined : known;
}

function readPlant(document: object): Plant | { readonly unreadable: true } {
	const plant = v.safeParse(PlantSchema, document);
	return plant.success ? plant.output : { unreadable: true };
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
