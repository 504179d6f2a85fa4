import type { Procedure } from '../procedure';
import type { ActJudge } from './acts';
import type { ActJudged, Cause, PermissiveStanding, Standing, StepStanding } from './answer';
import { allOf, isOf, type RecordEvent } from './event';
import type { Facts } from './facts';
import { gateStates, type NotEnoughNow } from './gate-states';
import { MINUTE, millis, printInstant } from './instants';
import type { Played } from './play';
import { reproofList, stepsToProve } from './reproof';
import type { InnerCause, StepTrack } from './step-track';
import { watchGaps } from './watch-gaps';

/** Everything that was worked out, for the answer to say. */
export type Worked = {
	readonly procedure: Procedure;
	readonly events: readonly RecordEvent[];
	readonly inside: readonly RecordEvent[];
	readonly after: readonly RecordEvent[];
	readonly seal: RecordEvent | undefined;
	readonly judge: ActJudge;
	readonly facts: Facts;
	readonly played: Played;
	readonly permissives: readonly PermissiveStanding[];
	readonly notEnough: NotEnoughNow;
	readonly at: string;
	readonly offset: number;
	readonly knownTo: string | undefined;
};

export function answer(worked: Worked): Standing {
	const { procedure, events, inside, after, seal, judge, facts, played, permissives, notEnough, at, offset, knownTo } =
		worked;
	const gates = gateStates(played, notEnough, permissives, offset);
	const print = (cause: InnerCause): Cause => printCause(cause, offset);
	const toProve = stepsToProve(played, notEnough);
	const lapsedNow = new Map([
		...notEnough,
		...toProve.flatMap(({ track, why }) =>
			why.flatMap((cause) => (cause.kind === 'age counts again' ? [[track.step.id, cause] as const] : [])),
		),
	]);
	const late = lateFacts(procedure, events);
	const startUp = (facts.opened ?? events.find(({ kind }) => kind === 'entry'))?.log ?? '';
	return {
		format: 'gatehold-standing/1',
		startUp,
		procedure: { id: procedure.id, revision: procedure.revision },
		at,
		...(knownTo === undefined ? {} : { knownTo }),
		checksSignatures: false,
		...(facts.startType === undefined ? {} : { startType: facts.startType }),
		steps: procedure.steps.map(({ id }) => stepStanding(id, worked, lapsedNow, gates, print)),
		permissives,
		gates,
		reproof: reproofList(procedure, toProve, peoplePresent(inside, facts), print),
		deviations: facts.deviations.map(({ deviation, blocks, raised, closed }) => ({
			deviation,
			state: closed <= played.now ? 'dispositioned' : 'open',
			blocks,
			raised: printInstant(raised, offset),
			...(closed === Infinity ? {} : { closed: printInstant(closed, offset) }),
		})),
		plantEvents: facts.plantEvents.map((event) => ({
			event: event.event,
			what: event.what,
			countsAs: event.names,
			...(event.item === undefined ? {} : { item: event.item }),
			begin: printInstant(event.begin, offset),
			end: event.end === Infinity ? null : printInstant(event.end, offset),
			entered: printInstant(event.enteredAt, offset),
			late: late.some((fact) => fact.event === event.event),
			...(event.withdrawn ? { withdrawn: true as const } : {}),
		})),
		late,
		watchGaps: watchGaps(procedure, played).map((gap) => ({
			step: gap.step,
			from: printInstant(gap.from, offset),
			to: gap.to === undefined ? null : printInstant(gap.to, offset),
		})),
		tries: facts.entries
			.filter(({ outcome }) => outcome === 'try')
			.map(({ step, id, observed }) => ({ step, event: id, observed: printInstant(observed, offset) })),
		refusedActs: allOf(inside, 'refused act').map(({ id }) => id),
		acts: facts.acts.flatMap((act) => (act.kind === 'refusal answered' ? [] : [actJudged(act, worked, judge, print)])),
		withoutEffect: [
			...facts.withoutEffect,
			...facts.acts
				.filter((act) => !judge.allowed(act))
				.map((act) => ({ event: act.id, because: judge.verdict(act).because.join('; ') })),
		],
		...(seal === undefined ? {} : { sealed: { event: seal.id, at: printInstant(seal.observedAt, offset) } }),
		afterSeal: after.map(({ id }) => id),
		clock: { state: facts.agesUntil === Infinity ? 'agreed' : 'not agreed', skewMinutes: facts.skew / MINUTE },
	};
}

function stepStanding(
	id: string,
	{ played, facts, offset }: Worked,
	lapsedNow: NotEnoughNow,
	gates: Standing['gates'],
	print: (cause: InnerCause) => Cause,
): StepStanding {
	const track = played.steps.get(id);
	if (track === undefined) throw new Error(`no track of step ${id}`);
	const { status, entry, step } = track;
	const cause = lapsedNow.get(id);
	const state = cause === undefined ? status.state : 'lapsed';
	const since = cause?.kind === 'age counts again' ? cause.since : status.since;
	const lower = gates.filter(({ gate }) => gate < step.gate).at(-1);
	return {
		step: id,
		gate: step.gate,
		state,
		...(since === undefined ? {} : { since: printInstant(since, offset) }),
		...untilOf(track, state, facts, offset),
		...(entry === undefined
			? {}
			: { entry: entry.id, observed: printInstant(entry.observed, offset), performedBy: [...entry.performers] }),
		why: (cause === undefined ? status.why : [cause]).map(print),
		waitsFor: state === 'waits' ? status.why.flatMap((why) => (why.kind === 'relies on' ? [why.step] : [])) : [],
		...(status.rows.length === 0 ? {} : { rows: [...status.rows] }),
		tries: facts.entries.filter((one) => one.step === id && one.outcome === 'try').length,
		...(entry !== undefined && state === 'stands' && lower !== undefined && lower.state !== 'released'
			? { aheadOfRelease: true as const }
			: {}),
	};
}

function untilOf(track: StepTrack, state: string, facts: Facts, offset: number): { readonly until?: string } {
	if (track.entry === undefined || track.life === Infinity || track.spent || (state !== 'stands' && state !== 'waits'))
		return {};
	return { until: facts.agesUntil === Infinity ? printInstant(track.entry.observed + track.life, offset) : 'unknown' };
}

function actJudged(
	act: Extract<Facts['acts'][number], { kind: 'gate released' | 'gate refused' }>,
	{ played, offset }: Worked,
	judge: ActJudge,
	print: (cause: InnerCause) => Cause,
): ActJudged {
	const { allowed, because } = judge.verdict(act);
	const found = played.gates.flatMap((gate) => gate.found).find((one) => one.act === act.id);
	return {
		event: act.id,
		act: act.kind === 'gate released' ? 'released' : 'refused',
		gate: act.body.gate,
		person: act.person,
		device: act.device,
		at: printInstant(act.observedAt, offset),
		counted: allowed,
		notCountedBecause: [...because],
		didNotStand: (found?.didNotStand ?? []).map(({ step, why }) => ({ step, why: why.map(print) })),
	};
}

export function printCause(cause: InnerCause, offset: number): Cause {
	switch (cause.kind) {
		case 'plant event': {
			const { event, what, item, begin, end } = cause;
			const interval = { begin: printInstant(begin, offset), end: end === Infinity ? null : printInstant(end, offset) };
			return { kind: 'plant event', event, what, ...(item === undefined ? {} : { item }), ...interval };
		}
		case 'age':
		case 'watch gap':
		case 'age counts again':
			return { ...cause, since: printInstant(cause.since, offset) };
		case 'instrument finding':
			return { ...cause, lastGood: cause.lastGood === -Infinity ? null : printInstant(cause.lastGood, offset) };
		default:
			return cause;
	}
}

function lateFacts(procedure: Procedure, events: readonly RecordEvent[]): Standing['late'] {
	const limit = (procedure.lateMinutes ?? 10) * MINUTE;
	return events.flatMap((event) => {
		const seen = isOf(event, 'entry')
			? event.observedAt
			: isOf(event, 'plant event begun')
				? millis(event.body.begin)
				: undefined;
		const by = seen === undefined ? 0 : event.enteredAt - seen;
		return by > limit ? [{ event: event.id, minutes: by / MINUTE }] : [];
	});
}

/** People who may enter: those last handed over to, or named present at the opening, or all of the start-up. */
function peoplePresent(events: readonly RecordEvent[], facts: Facts): number {
	const handOver = [...allOf(events, 'shift hand-over')].sort((a, b) => a.observedAt - b.observedAt).at(-1);
	const present = handOver?.body.to ?? facts.opened?.body.present;
	return new Set(present ?? facts.opened?.body.people.map(({ person }) => person) ?? []).size;
}
