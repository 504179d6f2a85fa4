import type { Procedure, Step } from '../procedure';
import type { ReproofItem, Standing } from './answer';
import { countsAgain, spentAndRunOut, type NotEnoughNow } from './gate-states';
import type { Played } from './play';
import type { InnerCause, StepTrack } from './step-track';

/** A step to be proved again, before its times and causes are printed. */
export type ToProve = {
	readonly track: StepTrack;
	readonly why: readonly InnerCause[];
	readonly state: ReproofItem['state'];
};

/**
 * What must be proved again so that nothing up to the highest gate begun is lapsed or failed (ST10): those steps, and what
 * a new proof of them relies on if that has run out or was never proved.
 */
export function stepsToProve(played: Played, notEnough: NotEnoughNow): readonly ToProve[] {
	const highest = highestBegun(played);
	const found = new Map<string, ToProve>();
	const add = (track: StepTrack, why: readonly InnerCause[], state: ReproofItem['state']): void => {
		if (found.has(track.step.id)) return;
		found.set(track.step.id, { track, why, state });
		for (const id of track.step.redo) addUpstream(played.steps.get(id));
		for (const check of uncheckedSinceFinding(track, played)) addUpstream(check);
	};
	const addUpstream = (upstream: StepTrack | undefined): void => {
		if (!upstream?.required) return;
		const { state, why } = upstream.status;
		if (spentAndRunOut(upstream, played)) add(upstream, [countsAgain(upstream)], 'lapsed');
		else if (state === 'not yet' || state === 'lapsed' || state === 'failed') add(upstream, why, state);
	};
	for (const track of played.steps.values()) {
		const { step, status } = track;
		if (step.gate > highest) continue;
		const late = notEnough.get(step.id);
		if (status.state === 'lapsed' || status.state === 'failed') add(track, status.why, status.state);
		else if (late !== undefined) add(track, [late], 'lapsed');
	}
	return [...found.values()];
}

/** Check steps of instruments that were found bad and have not passed since: a new proof with them would be void too. */
function uncheckedSinceFinding(track: StepTrack, played: Played): readonly StepTrack[] {
	const used = track.entry?.instruments ?? track.step.instruments;
	const bad = played.facts.findings.filter(({ nextGood }) => nextGood > played.now).map(({ instrument }) => instrument);
	return [...played.steps.values()].filter(
		({ step }) => step.checks !== undefined && used.includes(step.checks) && bad.includes(step.checks),
	);
}

/** A gate has begun when the gate below it was once released; the lowest has begun with the start-up. */
function highestBegun(played: Played): number {
	let highest = played.gates[0]?.gate.number ?? 0;
	for (const [i, track] of played.gates.entries()) {
		const below = played.gates[i - 1];
		if (below?.lastRelease !== undefined) highest = Math.max(highest, track.gate.number);
	}
	return highest;
}

/** The list in the order in which people work: gate by gate, upstream first, short-lived steps last. */
export function inWorkingOrder(procedure: Procedure, list: readonly ToProve[]): readonly ToProve[] {
	const ids = new Set(list.map(({ track }) => track.step.id));
	const place = new Map(procedure.steps.map((step, i) => [step.id, i]));
	const rest = [...list].sort(
		(a, b) =>
			a.track.step.gate - b.track.step.gate ||
			b.track.life - a.track.life ||
			(place.get(a.track.step.id) ?? 0) - (place.get(b.track.step.id) ?? 0),
	);
	const upstream = upstreamIn(list);
	const done = new Set<string>();
	const ordered: ToProve[] = [];
	while (rest.length > 0) {
		const next = rest.findIndex(({ track }) => upstream(track.step).every((id) => !ids.has(id) || done.has(id)));
		// A circle is refused when a procedure is saved; if one came through, its steps follow as they stand.
		const [item] = rest.splice(Math.max(next, 0), 1);
		if (item === undefined) break;
		done.add(item.track.step.id);
		ordered.push(item);
	}
	return ordered;
}

/** What a step of the list comes after: what it relies on, and the function checks of the instruments that it uses. */
function upstreamIn(list: readonly ToProve[]): (step: Step) => readonly string[] {
	const checks = list.flatMap(({ track: { step } }) =>
		step.checks === undefined ? [] : [{ id: step.id, checks: step.checks }],
	);
	return (step) => [
		...step.redo,
		...step.waits,
		...checks.filter((check) => check.id !== step.id && step.instruments.includes(check.checks)).map(({ id }) => id),
	];
}

export type Slot = { readonly begins: number; readonly ends: number };

/**
 * When each step of the list can begin and end, in minutes from now, for so many people: the longest path over relies-on
 * and gate order, each person doing one step at a time.
 */
export function schedule(ordered: readonly ToProve[], people: number): readonly Slot[] {
	const free = Array.from({ length: Math.max(1, people) }, () => 0);
	const ends = new Map<string, number>();
	const upstream = upstreamIn(ordered);
	const slots: Slot[] = [];
	let gate = -1;
	let gateBegins = 0;
	for (const { track } of ordered) {
		const { step } = track;
		if (step.gate !== gate) {
			gate = step.gate;
			gateBegins = Math.max(0, ...ends.values());
		}
		const upstreamEnds = upstream(step).map((id) => ends.get(id) ?? 0);
		const who = free.indexOf(Math.min(...free));
		const begins = Math.max(gateBegins, free[who] ?? 0, ...upstreamEnds);
		free[who] = begins + step.minutes;
		ends.set(step.id, begins + step.minutes);
		slots.push({ begins, ends: begins + step.minutes });
	}
	return slots;
}

/** @returns the list as it is published, with `print` for its causes */
export function reproofList(
	procedure: Procedure,
	list: readonly ToProve[],
	people: number,
	print: (cause: InnerCause) => ReproofItem['why'][number],
): Standing['reproof'] {
	const ordered = inWorkingOrder(procedure, list);
	const slots = schedule(ordered, people);
	const ids = new Set(list.map(({ track }) => track.step.id));
	return {
		steps: procedure.steps.filter(({ id }) => ids.has(id)).map(({ id }) => id),
		minutes: list.reduce((sum, { track }) => sum + track.step.minutes, 0),
		inWorkingOrder: ordered.map(({ track, why, state }, i) => ({
			step: track.step.id,
			gate: track.step.gate,
			title: track.step.title,
			minutes: track.step.minutes,
			state,
			why: why.map(print),
			...(track.status.rows.length === 0 ? {} : { rows: [...track.status.rows] }),
			begins: slots[i]?.begins ?? 0,
			ends: slots[i]?.ends ?? 0,
		})),
		earliestFinishMinutes: Math.max(0, ...slots.map(({ ends }) => ends)),
	};
}
