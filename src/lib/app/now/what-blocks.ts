import { rungsOf } from '../../drawing';
import type { Procedure, Step } from '../../procedure';
import { allOf, type RecordEvent, type Standing } from '../../record';

/** The one thing at which the line of a start-up ends. */
export type Blocking =
	| { readonly kind: 'step'; readonly step: Step; readonly state: 'next' | 'lapsed' | 'failed'; readonly last?: Worked }
	| { readonly kind: 'deviation'; readonly deviation: string; readonly title: string; readonly raised: Worked }
	| { readonly kind: 'condition'; readonly gate: number; readonly title: string; readonly value: string }
	| { readonly kind: 'release'; readonly gate: number; readonly roles: readonly string[] }
	| { readonly kind: 'refusal'; readonly gate: number; readonly reason: string; readonly by?: Worked }
	| { readonly kind: 'gate'; readonly gate: number };

/** Who is on it, and since when. */
export type Worked = { readonly person: string; readonly at: string };

type Told = { readonly procedure: Procedure; readonly standing: Standing; readonly events: readonly RecordEvent[] };

export function whatBlocks({ procedure, standing, events }: Told): Blocking | undefined {
	const rung = rungsOf(procedure, standing).find(({ coil }) => coil !== 'released');
	if (rung === undefined) return undefined;
	const { gate } = rung;
	const found = standing.gates.find((each) => each.gate === gate);
	if (rung.coil === 'refused') {
		const why = found?.why.find((each) => each.kind === 'refusal');
		const act = events.find(({ id }) => why?.kind === 'refusal' && id === why.event);
		const by = act === undefined ? {} : { by: workedBy(act) };
		return { kind: 'refusal', gate, reason: why?.kind === 'refusal' ? why.reason : '', ...by };
	}
	const contact = rung.contacts[rung.passes];
	if (contact === undefined) return { kind: 'release', gate, roles: found?.missing.flat() ?? [] };
	if (contact.of === 'deviation') {
		const raised = allOf(events, 'deviation raised').find(({ body }) => body.deviation === contact.id);
		if (raised === undefined) return { kind: 'gate', gate };
		const owner = { person: raised.body.owner ?? raised.person, at: seenAt(raised) };
		return { kind: 'deviation', deviation: contact.id, title: raised.body.title, raised: owner };
	}
	if (contact.of === 'permissive') return { kind: 'condition', gate, title: contact.label, value: contact.word };
	if (contact.of === 'gate') return { kind: 'gate', gate: gate - 1 };
	return blockingStep({ procedure, standing, events }, gate, contact.id) ?? { kind: 'gate', gate };
}

/** The worst of a group comes first, as it does for its contact. */
function blockingStep({ procedure, standing, events }: Told, gate: number, group: string): Blocking | undefined {
	const steps = procedure.steps.filter((step) => step.gate === gate && step.group === group);
	const stateOf = (step: Step) => standing.steps.find((each) => each.step === step.id)?.state ?? 'not yet';
	for (const state of ['failed', 'lapsed', 'not yet', 'waits'] as const) {
		const step = steps.find((each) => stateOf(each) === state);
		if (step === undefined) continue;
		const ids = new Set(steps.map(({ id }) => id));
		const last = allOf(events, 'entry')
			.filter(({ body }) => ids.has(body.step))
			.sort((a, b) => a.observedAt - b.observedAt)
			.at(-1);
		return {
			kind: 'step',
			step,
			state: state === 'failed' || state === 'lapsed' ? state : 'next',
			...(last === undefined ? {} : { last: workedBy(last) }),
		};
	}
	return undefined;
}

const seenAt = (event: RecordEvent): string => event.observed ?? event.entered;
const workedBy = (event: RecordEvent): Worked => ({ person: event.person, at: seenAt(event) });
