import type { Gate, Procedure, Step } from '../procedure';
import type { EntryFact } from './entry-facts';
import type { Facts, GateAct } from './facts';
import type { Millis } from './instants';
import { GateTrack } from './gate-track';
import { StepTrack, type InnerCause } from './step-track';

/** Whether the rules allowed an act, by what its tablet knew when it was made. */
export type Allowed = (act: GateAct) => boolean;

export type Played = {
	readonly now: Millis;
	readonly facts: Facts;
	readonly steps: ReadonlyMap<string, StepTrack>;
	readonly gates: readonly GateTrack[];
};

/**
 * Lets the facts happen again in the order in which they were observed, up to an instant, with the hindsight of the whole
 * record: what breaks a proof, which gate act still holds. Typing order and arrival order do not matter, because nothing
 * here looks at them (ST1). Pure: the same facts and instant give the same answer.
 */
export function play(procedure: Procedure, facts: Facts, now: Millis, allowed: Allowed): Played {
	const required = requiredSteps(procedure, facts);
	const steps = new Map(
		upstreamFirst(procedure.steps).map((step) => [step.id, new StepTrack(step, required.has(step.id))]),
	);
	const gates = procedure.gates.map(
		(gate) =>
			new GateTrack(
				gate,
				[...steps.values()].filter(({ step }) => step.gate === gate.number),
				isLast(gate, procedure),
			),
	);
	const entriesAt = groupByInstant(facts.entries);
	const actsAt = groupByInstant(facts.acts.map((act) => ({ act, observed: act.observedAt })));
	for (const [at, due] of calendar(facts, steps, now)) {
		const changed = new Set<string>();
		for (const track of steps.values()) {
			const { id, redo, waits } = track.step;
			if (!due.everything && !due.steps.has(id) && ![...redo, ...waits].some((one) => changed.has(one))) continue;
			const before = track.status.state;
			stepForward(track, at, entriesAt.get(at) ?? [], facts, steps, gates);
			if (track.status.state !== before) changed.add(id);
		}
		for (const gate of gates) {
			if (due.gates || gate.refusal !== undefined || gate.own.some(({ step }) => changed.has(step.id)))
				gate.lookAt(at, facts);
			for (const { act } of actsAt.get(at) ?? [])
				if (act.body.gate === gate.gate.number && allowed(act)) gate.act(act, facts);
			if (gate.release?.at === at) spendAges(steps, gate.gate.number);
		}
	}
	return { now, facts, steps, gates };
}

function stepForward(
	track: StepTrack,
	at: Millis,
	entries: readonly EntryFact[],
	facts: Facts,
	steps: ReadonlyMap<string, StepTrack>,
	gates: readonly GateTrack[],
): void {
	const entry = newest(entries.filter(({ step }) => step === track.step.id));
	if (entry !== undefined) {
		const holder = track.until === undefined ? undefined : gates.find(({ gate }) => gate.number === track.until);
		track.take(entry, holder?.release !== undefined);
	}
	track.wear(at, facts);
	for (const id of track.step.redo) {
		const upstream = steps.get(id);
		if (upstream === undefined) continue;
		// An age that was spent still counts for a proof made now (ST4); a proof made before stays as it is.
		const tooOldForNew = entry !== undefined && upstream.required && upstream.ranOut(Math.min(at, facts.agesUntil));
		if (!upstream.up || tooOldForNew) track.break(at, { kind: 'relies on', step: id } satisfies InnerCause);
	}
	const waitsFor = track.step.waits.filter((id) => {
		const state = steps.get(id)?.status.state;
		return state !== undefined && state !== 'stands' && state !== 'not applicable';
	});
	track.settle(at, facts, waitsFor);
}

/** Ages that last until a gate stop counting when it is released on them (ST4). */
function spendAges(steps: ReadonlyMap<string, StepTrack>, gate: number): void {
	for (const track of steps.values()) if (track.until === gate && track.status.state === 'stands') track.spent = true;
}

/** At equal observed time the worse outcome counts, else the id decides (ST1). */
function newest(entries: readonly EntryFact[]): EntryFact | undefined {
	const rank = (entry: EntryFact): number => WORSE.indexOf(entry.outcome);
	return [...entries].sort((a, b) => rank(a) - rank(b) || (a.id < b.id ? -1 : 1)).at(-1);
}

const WORSE: readonly EntryFact['outcome'][] = ['pass', 'not applicable', 'cannot do', 'try', 'fail'];

/** What can change at an instant; a step changes besides when one changes that it relies on. */
type Due = { everything: boolean; gates: boolean; readonly steps: Set<string> };

/** Every instant at which something can change, in order. */
function calendar(
	facts: Facts,
	steps: ReadonlyMap<string, StepTrack>,
	now: Millis,
): readonly (readonly [Millis, Due])[] {
	const days = new Map<Millis, Due>();
	const on = (at: Millis): Due => {
		const due = days.get(at) ?? { everything: false, gates: false, steps: new Set<string>() };
		if (at <= now) days.set(at, due);
		return due;
	};
	for (const { step, observed, agreed } of facts.entries) {
		const ends = observed + (steps.get(step)?.life ?? Infinity);
		for (const at of [observed, agreed ?? observed, ends]) on(at).steps.add(step);
	}
	for (const { begin } of facts.plantEvents) on(begin).everything = true;
	for (const { observed } of facts.findings) on(observed).everything = true;
	for (const { at } of facts.pointsChanged) on(at).everything = true;
	for (const { raised, closed } of facts.deviations) for (const at of [raised, closed]) on(at).gates = true;
	for (const { observedAt } of facts.acts) on(observedAt).gates = true;
	return [...days].sort(([a], [b]) => a - b);
}

function groupByInstant<T extends { readonly observed: Millis }>(
	items: readonly T[],
): ReadonlyMap<Millis, readonly T[]> {
	const groups = new Map<Millis, T[]>();
	for (const item of items) {
		const group = groups.get(item.observed);
		if (group === undefined) groups.set(item.observed, [item]);
		else group.push(item);
	}
	return groups;
}

/**
 * Steps that the start type asks for. A lighter type that the record contradicts ("opened" excludes "without opening"), or
 * that nobody with a releasing role chose, counts as asking for everything.
 */
function requiredSteps(procedure: Procedure, facts: Facts): ReadonlySet<string> {
	const all = new Set(procedure.steps.map((step) => step.id));
	const type = procedure.startTypes.find(({ id }) => id === facts.startType);
	if (type === undefined || facts.opened === undefined) return all;
	const contradicted = facts.plantEvents.some((event) => event.names.some((name) => type.excludedBy.includes(name)));
	const roles = facts.rolesOf.get(facts.opened.person) ?? [];
	const chosen = !type.needsReleasingRole || roles.some((role) => facts.releasingRoles.has(role));
	return contradicted || !chosen ? all : new Set([...all].filter((id) => !type.without.includes(id)));
}

/** The relies-on graph has no circles (checked when a procedure is saved); a circle here only loses its order. */
export function upstreamFirst(steps: readonly Step[]): readonly Step[] {
	const byId = new Map(steps.map((step) => [step.id, step]));
	const done = new Set<string>();
	const sorted: Step[] = [];
	const visit = (step: Step): void => {
		if (done.has(step.id)) return;
		done.add(step.id);
		for (const id of [...step.redo, ...step.waits]) {
			const upstream = byId.get(id);
			if (upstream !== undefined) visit(upstream);
		}
		sorted.push(step);
	};
	steps.forEach(visit);
	return sorted;
}

const isLast = (gate: Gate, procedure: Procedure): boolean => gate === procedure.gates.at(-1);
