import type { GateStanding, PermissiveStanding } from './answer';
import type { GateTrack } from './gate-track';
import { printInstant, MINUTE } from './instants';
import type { Played } from './play';
import type { InnerCause, StepTrack } from './step-track';

/**
 * Proofs that are unbroken and yet not good enough now: an age that counts again, a condition that is not TRUE. The step
 * is to be proved again; an age leaves the gate of the step as it is (ST11).
 */
export type NotEnoughNow = ReadonlyMap<string, InnerCause>;

/**
 * A watch is needed again, and what must be fresh at a gate's release is again, when that gate lost its release (ST4). A
 * proof of a lower gate, once that gate was released on it, counts again only for a new proof that relies on it; the
 * re-proof list asks for that. A `while` needs its condition TRUE.
 */
export function notEnoughNow(played: Played, permissives: readonly PermissiveStanding[]): NotEnoughNow {
	const found = new Map<string, InnerCause>();
	for (const track of played.steps.values()) {
		const { validity, id } = track.step;
		const holder = played.gates.find(({ gate }) => gate.number === track.until);
		const neededAgain = track.isWatch || track.until === track.step.gate;
		if (neededAgain && holder !== undefined && holder.release === undefined && spentAndRunOut(track, played))
			found.set(id, countsAgain(track));
		if (validity.kind !== 'while' || !track.required || track.status.state !== 'stands') continue;
		const value = permissives.find(({ permissive }) => permissive === validity.permissive)?.value ?? 'unknown';
		if (value !== 'TRUE') found.set(id, { kind: 'condition', permissive: validity.permissive, value });
	}
	return found;
}

export const spentAndRunOut = (track: StepTrack, played: Played): boolean =>
	track.spent && track.status.state === 'stands' && track.ranOut(Math.min(played.now, played.facts.agesUntil));

export const countsAgain = (track: StepTrack): InnerCause => ({
	kind: 'age counts again',
	minutes: track.life / MINUTE,
	since: (track.entry?.observed ?? 0) + track.life,
	gate: track.until ?? track.step.gate,
});

/** The state of every gate, from the lowest up: each needs the one below (ST8). */
export function gateStates(
	played: Played,
	notEnough: NotEnoughNow,
	permissives: readonly PermissiveStanding[],
	offset: number,
): readonly GateStanding[] {
	const states: GateStanding[] = [];
	for (const track of played.gates)
		states.push(gateStanding(track, states.at(-1), played, notEnough, permissives, offset));
	return states;
}

function gateStanding(
	track: GateTrack,
	below: GateStanding | undefined,
	played: Played,
	notEnough: NotEnoughNow,
	permissives: readonly PermissiveStanding[],
	offset: number,
): GateStanding {
	const { gate } = track;
	const belowReleased = below === undefined || below.state === 'released';
	const why: GateStanding['why'] = [
		...refusalOf(track),
		...(below === undefined ? valuesToReplace(played) : []),
		...(belowReleased ? [] : [{ kind: 'lower gate' as const, gate: below.gate, state: below.state }]),
		...stepsThatMiss(track, played, notEnough),
		...track.openDeviations.map(({ deviation, event }) => ({ kind: 'deviation' as const, deviation, event })),
		...permissives
			.filter(({ permissive, value }) => gate.permissives?.includes(permissive) === true && value !== 'TRUE')
			.map(({ permissive, value }) => ({ kind: 'permissive' as const, permissive, value })),
	];
	const conditionDown = track.own.some(({ step }) => notEnough.get(step.id)?.kind === 'condition');
	const state = stateOf(track, { belowReleased, nothingMissing: why.length === 0, conditionDown });
	const needsRelease =
		track.release === undefined && track.lastRelease !== undefined && track.brokenSince !== undefined;
	return {
		gate: gate.number,
		state,
		acts: track.lastRelease?.acts ?? [],
		...(track.lastRelease === undefined ? {} : { releasedAt: printInstant(track.lastRelease.at, offset) }),
		missing: track.missing,
		why: [
			...(state === 'released' ? [] : why),
			...(needsRelease
				? [{ kind: 'needs release again' as const, since: printInstant(track.brokenSince ?? 0, offset) }]
				: []),
		],
	};
}

function stateOf(
	track: GateTrack,
	{
		belowReleased,
		nothingMissing,
		conditionDown,
	}: { readonly [fact in 'belowReleased' | 'nothingMissing' | 'conditionDown']: boolean },
): GateStanding['state'] {
	if (track.refusal !== undefined) return 'refused';
	if (track.release !== undefined) {
		if (track.gaps.length > 0 || conditionDown) return 'lapsed';
		return belowReleased && track.waiting.length === 0 ? 'released' : 'held';
	}
	if (nothingMissing) return 'ready';
	return track.lastRelease === undefined ? 'not ready' : 'lapsed';
}

/** The lowest gate waits for a plant description of this unit: every later limit and volume comes from it (ST15). */
function valuesToReplace({ facts: { plant } }: Played): GateStanding['why'] {
	const { from = '', toReplace = [] } = plant?.copied ?? {};
	return toReplace.length === 0 ? [] : [{ kind: 'values to replace', from, items: toReplace }];
}

function refusalOf(track: GateTrack): GateStanding['why'] {
	if (track.refusal === undefined) return [];
	const { event, answered, unchanged } = track.refusal;
	return [{ kind: 'refusal', event: event.id, reason: event.body.reason, answered, unchanged }];
}

/** Own steps that do not stand; and for a release, steps here or below that are not good enough now: all proofs must stand (ST9). */
function stepsThatMiss(track: GateTrack, played: Played, notEnough: NotEnoughNow): GateStanding['why'] {
	const own = track.own
		.filter(({ status }) => status.state !== 'stands' && status.state !== 'not applicable')
		.map(({ step, status }) => ({ kind: 'step' as const, step: step.id, state: status.state }));
	const late = [...notEnough.keys()]
		.filter((id) => (played.steps.get(id)?.step.gate ?? Infinity) <= track.gate.number)
		.map((step) => ({ kind: 'step' as const, step, state: 'lapsed' }));
	return track.release === undefined ? [...own, ...late] : own;
}
