import type { Procedure } from '../procedure';
import type { SignedEvent } from './check-signatures';
import { aboutEvent, nameOf, offences } from './about-event';
import { failed, type Check } from './pdf/check';
import { allOf, isOf, type RecordEvent } from '../record';

/** Who entered a step has, by certificate, a role that the step may be performed by. */
export function checkPerformers(procedure: Procedure | undefined, signed: readonly SignedEvent[]): readonly Check[] {
	const name = 'steps were performed by the roles that they ask for';
	const steps = new Map((procedure?.steps ?? []).map((step) => [step.id, step]));
	const bad = signed.flatMap(({ event, signer }) => {
		if (!isOf(event, 'entry')) return [];
		const allowed = steps.get(event.body.step)?.roles;
		const { subject } = signer.certificate;
		const roles: readonly string[] = subject.kind === 'person' ? subject.roles : [];
		if (allowed === undefined || allowed.some((role) => roles.includes(role))) return [];
		const because = `${nameOf(event)} asks for ${allowed.join(' or ')}; ${event.person} is certified as ${roles.join(', ')}.`;
		return [failed(name, because, { facts: aboutEvent(event), sub: 'SIG_CONSTRAINTS_FAILURE' })];
	});
	return offences(name, bad, 'By their certificates.');
}

/**
 * The record says who has which role, and its rules go by that: nobody who signed is said to have a role that the
 * certificate does not name.
 */
export function checkRoles(events: readonly RecordEvent[], signed: readonly SignedEvent[]): readonly Check[] {
	const name = 'roles in the record are certified';
	const certified = new Map<string, Set<string>>();
	for (const { event, signer } of signed) {
		const { subject } = signer.certificate;
		if (subject.kind !== 'person' || subject.person !== event.person) continue;
		const roles = certified.get(event.person) ?? new Set();
		for (const role of subject.roles) roles.add(role);
		certified.set(event.person, roles);
	}
	const claims = [
		...allOf(events, 'start-up opened').flatMap((event) => event.body.people.map((claim) => ({ event, claim }))),
		...allOf(events, 'person enrolled').map((event) => ({ event, claim: event.body })),
	];
	const bad = claims.flatMap(({ event, claim: { person, roles } }) => {
		const own = certified.get(person);
		const more = own === undefined ? [] : roles.filter((role) => !own.has(role));
		if (more.length === 0) return [];
		const because = `${nameOf(event)} says that ${person} is ${more.join(', ')}; no certificate that ${person} signed under says so.`;
		const facts = { ...aboutEvent(event), person, roles: more.join(', ') };
		return [failed(name, because, { facts, sub: 'SIG_CONSTRAINTS_FAILURE' })];
	});
	return offences(name, bad, 'Of everybody who signed.');
}
