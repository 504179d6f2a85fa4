import type { Gate } from '../procedure';
import type { EventOf } from './event';
import type { DeviationFact, Facts, GateAct } from './facts';
import type { Millis } from './instants';
import type { InnerCause, StepTrack } from './step-track';

export type Refusal = {
	readonly event: EventOf<'gate refused'>;
	answered: boolean;
	/** Things it names that have neither changed nor been proved again. Empty when it names nothing. */
	unchanged: readonly string[];
	changed: boolean;
};

/** What an act found, as known now: the steps under the gate that did not stand at its time (ST3). */
export type ActFound = {
	readonly act: string;
	readonly didNotStand: readonly { readonly step: string; readonly why: readonly InnerCause[] }[];
};

/** One gate through the course of time. */
export class GateTrack {
	readonly gate: Gate;
	readonly own: readonly StepTrack[];
	readonly #isLast: boolean;
	/** Signatures given since the gate last broke, by the slot they fill. */
	#signed = new Map<number, EventOf<'gate released'>>();
	/** The release that still holds, whatever the gates below say. */
	release: { readonly at: Millis; readonly acts: readonly string[] } | undefined;
	/** The last complete release, whether or not it still holds. */
	lastRelease: { readonly at: Millis; readonly acts: readonly string[] } | undefined;
	brokenSince: Millis | undefined;
	refusal: Refusal | undefined;
	openDeviations: readonly DeviationFact[] = [];
	readonly found: ActFound[] = [];

	constructor(gate: Gate, own: readonly StepTrack[], isLast: boolean) {
		this.gate = gate;
		this.own = own;
		this.#isLast = isLast;
	}

	/** Own proofs that have gone for good: the gate needs them again, and a signature (ST8). */
	get gone(): readonly StepTrack[] {
		return this.own.filter((track) => !track.up && !(track.status.gap && track.everPassed));
	}

	/** Own watches that nobody read in time: the gate comes back with the reading (ST6). */
	get gaps(): readonly StepTrack[] {
		return this.own.filter((track) => !track.up && track.status.gap && track.everPassed);
	}

	get waiting(): readonly StepTrack[] {
		return this.own.filter((track) => track.status.state === 'waits');
	}

	/** Signatures still missing, by the roles that may give them. */
	get missing(): readonly (readonly string[])[] {
		return this.release === undefined
			? this.gate.signatures.flatMap((signature, slot) => (this.#signed.has(slot) ? [] : [signature.roles]))
			: [];
	}

	lookAt(at: Millis, facts: Facts): void {
		this.openDeviations = facts.deviations.filter(
			({ blocks, raised, closed }) => this.#concerns(blocks) && raised <= at && at < closed,
		);
		this.#lookAtRefusal(at, facts);
		if (this.gone.length > 0 || this.openDeviations.length > 0 || this.refusal !== undefined) {
			if (this.release !== undefined) this.brokenSince = at;
			this.release = undefined;
			this.#signed = new Map();
		}
	}

	#concerns(blocks: DeviationFact['blocks']): boolean {
		return blocks === this.gate.number || (blocks === 'hand-over' && this.#isLast);
	}

	/** A refusal lasts until something it names changed and somebody answered it in words. */
	#lookAtRefusal(at: Millis, facts: Facts): void {
		if (this.refusal === undefined) return;
		const { event } = this.refusal;
		const names = event.body.names ?? [];
		const since = event.observedAt;
		const isNew = (time: Millis): boolean => time > since && time <= at;
		this.refusal.unchanged = names.filter(
			(name) =>
				!facts.entries.some((entry) => entry.step === name && isNew(entry.observed)) &&
				!facts.findings.some(
					(finding) => finding.instrument === name && (isNew(finding.observed) || isNew(finding.nextGood)),
				) &&
				!facts.checks.some((check) => check.instrument === name && isNew(check.at)) &&
				!facts.deviations.some((deviation) => deviation.deviation === name && isNew(deviation.closed)),
		);
		this.refusal.changed = names.length === 0 || this.refusal.unchanged.length < names.length;
		if (this.refusal.answered && this.refusal.changed) this.refusal = undefined;
	}

	act(act: GateAct, facts: Facts): void {
		switch (act.kind) {
			case 'gate refused':
				this.refusal = { event: act, answered: false, unchanged: act.body.names ?? [], changed: false };
				return this.lookAt(act.observedAt, facts);
			case 'refusal answered':
				if (this.refusal !== undefined) this.refusal.answered = true;
				return this.#lookAtRefusal(act.observedAt, facts);
			case 'gate released':
				return this.#sign(act, facts);
		}
	}

	#sign(act: EventOf<'gate released'>, facts: Facts): void {
		const notStanding = this.own.filter(({ status }) => status.state !== 'stands' && status.state !== 'not applicable');
		this.found.push({
			act: act.id,
			didNotStand: notStanding.map(({ step, status }) => ({ step: step.id, why: status.why })),
		});
		if (this.release !== undefined) return;
		const slot = this.slotFor(act, facts);
		if (slot === undefined) return;
		this.#signed.set(slot, act);
		if (this.#signed.size < this.gate.signatures.length) return;
		const release = { at: act.observedAt, acts: [...this.#signed.values()].map(({ id }) => id) };
		this.lastRelease = release;
		// The act was allowed by what its tablet knew; what is known now may say otherwise, and then it does not hold.
		if (this.gone.length > 0 || this.openDeviations.length > 0 || this.refusal !== undefined) {
			this.brokenSince = act.observedAt;
			this.#signed = new Map();
			return;
		}
		this.release = release;
		this.brokenSince = undefined;
	}

	/** The signature that an act gives: one that is still missing, for a role of the signer, from somebody who gave none. */
	slotFor(act: EventOf<'gate released'>, facts: Facts): number | undefined {
		const roles = facts.rolesOf.get(act.person) ?? [];
		if ([...this.#signed.values()].some(({ person }) => person === act.person)) return undefined;
		const slot = this.gate.signatures.findIndex(
			(signature, i) =>
				!this.#signed.has(i) &&
				signature.roles.some((role) => roles.includes(role)) &&
				(act.body.meaning === undefined || act.body.meaning === signature.meaning),
		);
		return slot === -1 ? undefined : slot;
	}
}
