import { canonicalJson, fail, ok, sha256Hex, type Json, type Result } from '../base';
import { may, ROLES, rolesWith, type Right } from '../identity';
import type { Plant } from '../plant';
import { checkProcedure, type Procedure, type ProcedureFinding } from '../procedure';
import { allOf, headsOf, printInstant, type BodyOf, type RecordEvent } from '../record';
import { writeEvent } from './logbook';
import { pinned } from './own-site';
import type { Problem } from './problem';
import { SITE_LOG, type Tablet } from './tablet.svelte';

export type NewStartUp = {
	readonly plant: Plant;
	readonly procedure: Procedure;
	readonly startType: string;
	readonly title: string;
	/** Who is on the plant, by id. */
	readonly present: readonly string[];
};

export const pinnedProcedure = (procedure: Procedure) => ({
	id: procedure.id,
	revision: procedure.revision,
	hash: sha256Hex(canonicalJson(procedure as unknown as Json)),
});

/** What is wrong with a procedure for this plant; a start-up is opened on none that contradicts it. */
export const findingsAgainst = (procedure: Procedure, plant: Plant): readonly ProcedureFinding[] =>
	checkProcedure(procedure, { plant, roles: ROLES });

/** Whether somebody who may has approved exactly this procedure for the site. */
export function isApproved(procedure: Procedure, siteLog: readonly RecordEvent[]): boolean {
	const { hash } = pinnedProcedure(procedure);
	return allOf(siteLog, 'procedure approved').some(({ body }) => body.procedure.hash === hash);
}

export async function approveProcedure(
	tablet: Tablet,
	of: { readonly procedure: Procedure; readonly plant: Plant; readonly pin: string },
): Promise<Result<'signed', Problem>> {
	const signer = whoHolds(tablet, 'approve a procedure');
	if (!signer.ok) return signer;
	const key = await tablet.openKey(signer.value.person, of.pin);
	if (!key.ok) return key;
	const draft = {
		log: SITE_LOG,
		kind: 'procedure approved' as const,
		body: { procedure: pinnedProcedure(of.procedure), roles: [...signer.value.roles] },
		person: signer.value.person,
		device: tablet.device,
		entered: printInstant(Math.floor(tablet.clock.now() / 1000) * 1000, of.plant.utcOffsetMinutes),
		certificate: signer.value.certificate.fingerprint,
	};
	const written = await writeEvent(tablet.store, draft, { key: key.value });
	return written.ok ? ok('signed') : written;
}

/**
 * Opens a start-up: everything that it will be judged by is pinned in its first event, signed by somebody who may release.
 *
 * @returns its id: unit and day, numbered when the day has one already
 */
export async function openNewStartUp(
	tablet: Tablet,
	{ plant, procedure, startType, title, present }: NewStartUp,
	pin: string,
): Promise<Result<string, Problem>> {
	const signer = whoHolds(tablet, 'release');
	if (!signer.ok) return signer;
	const site = await tablet.store.events.readLog(SITE_LOG);
	if (!site.ok) return site;
	const known = await tablet.store.events.listStartUps();
	if (!known.ok) return known;
	const entered = printInstant(Math.floor(tablet.clock.now() / 1000) * 1000, plant.utcOffsetMinutes);
	const log = nextStartUpId(
		`${plant.unit}/${entered.slice(0, 10)}`,
		known.value.map(({ id }) => id),
	);
	const key = await tablet.openKey(signer.value.person, pin);
	if (!key.ok) return key;
	const body: BodyOf<'start-up opened'> = {
		procedure: pinnedProcedure(procedure),
		plant: pinned(plant),
		fuel: { id: plant.fuel.title.slice(0, 128), hash: sha256Hex(canonicalJson(plant.fuel)) },
		documents: { procedure, plant },
		startType,
		title: title.trim(),
		people: peopleOf(site.value.events, tablet),
		present: [...present],
		siteHeads: Object.fromEntries([...headsOf(site.value.events)].map(([device, { id }]) => [device, id])),
		...(plant.demonstration ? { demonstration: true } : {}),
	};
	const { person, certificate } = signer.value;
	const draft = {
		log,
		kind: 'start-up opened' as const,
		body,
		person,
		device: tablet.device,
		entered,
		certificate: certificate.fingerprint,
	};
	const written = await writeEvent(tablet.store, draft, { key: key.value });
	return written.ok ? ok(log) : written;
}

export function nextStartUpId(plain: string, known: readonly string[]): string {
	if (!known.includes(plain)) return plain;
	for (let n = 2; ; n++) if (!known.includes(`${plain}-${n}`)) return `${plain}-${n}`;
}

/** Everybody of the site, with the roles of their newest enrolment. */
function peopleOf(site: readonly RecordEvent[], tablet: Tablet): BodyOf<'start-up opened'>['people'] {
	const enrolled = new Map(
		allOf(site, 'person enrolled').map(({ body: { person, name, roles } }) => [
			person,
			{ person, name, roles: [...roles] },
		]),
	);
	for (const { person, name, roles } of tablet.people)
		if (!enrolled.has(person)) enrolled.set(person, { person, name, roles: [...roles] });
	return [...enrolled.values()];
}

function whoHolds(tablet: Tablet, right: Right) {
	const { person } = tablet;
	if (person === undefined) return fail({ kind: 'nobody-chosen' } as const);
	return may(person.roles, right)
		? ok(person)
		: fail({ kind: 'no-right', person: person.name, roles: rolesWith(right) } as const);
}
