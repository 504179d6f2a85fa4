import type { Procedure } from '../procedure';
import type { RecordEvent } from './event';
import { factsOf, type GateAct } from './facts';
import { gateStates, notEnoughNow } from './gate-states';
import type { Knowledge } from './knowledge';
import { permissiveStandings } from './permissives';
import { play, type Played } from './play';

export type ActVerdict = { readonly allowed: boolean; readonly because: readonly string[] };

/**
 * Judges every gate act by what its tablet knew when it was made (ST3, ST9). The verdict belongs to the act alone, whoever
 * reads the record later; an act that was not allowed is kept and changes nothing.
 */
export class ActJudge {
	readonly #procedure: Procedure;
	readonly #events: readonly RecordEvent[];
	readonly #knowledge: Knowledge;
	readonly #verdicts = new Map<string, ActVerdict>();

	constructor(procedure: Procedure, events: readonly RecordEvent[], knowledge: Knowledge) {
		this.#procedure = procedure;
		this.#events = events;
		this.#knowledge = knowledge;
	}

	readonly allowed = (act: GateAct): boolean => this.verdict(act).allowed;

	verdict(act: GateAct): ActVerdict {
		const known = this.#verdicts.get(act.id);
		if (known !== undefined) return known;
		// In a record that was tampered with, an act can stand among the things that it rests on.
		this.#verdicts.set(act.id, { allowed: false, because: ['it rests on itself'] });
		const because = this.#objections(act);
		const verdict = { allowed: because.length === 0, because };
		this.#verdicts.set(act.id, verdict);
		return verdict;
	}

	/** The record as the act's tablet had it: its causal past, and the site log up to then. */
	played(act: GateAct): Played {
		const past = this.#knowledge.past(act);
		const known = this.#events.filter(
			(event) => past.has(event.id) || (event.log !== act.log && event.enteredAt <= act.enteredAt),
		);
		return play(this.#procedure, factsOf(this.#procedure, known), act.observedAt, this.allowed);
	}

	#objections(act: GateAct): readonly string[] {
		const played = this.played(act);
		const { facts } = played;
		const track = played.gates.find(({ gate }) => gate.number === act.body.gate);
		if (track === undefined) return [`the procedure has no gate ${String(act.body.gate)}`];
		const roles = facts.rolesOf.get(act.person) ?? [];
		const performed = track.own.filter(
			({ status, entry }) => status.state === 'stands' && entry?.performers.includes(act.person) === true,
		);
		const independence = performed.map(({ step }) => `${act.person} performed ${step.id}`);
		switch (act.kind) {
			case 'gate refused': {
				const refusers = track.gate.refusers ?? [...facts.releasingRoles];
				return roles.some((role) => refusers.includes(role))
					? []
					: [`${act.person} has no role that may refuse this gate`];
			}
			case 'refusal answered':
				return [
					...(roles.some((role) => facts.releasingRoles.has(role)) ? [] : [`${act.person} has no releasing role`]),
					...independence,
				];
			case 'gate released': {
				const { objections } = this.#whetherReady(played, act.body.gate);
				const slot =
					track.slotFor(act, facts) === undefined
						? [`no missing signature of this gate is ${act.person}'s to give`]
						: [];
				return [...slot, ...independence, ...objections];
			}
		}
	}

	#whetherReady(played: Played, gate: number): { readonly objections: readonly string[] } {
		const permissives = permissiveStandings(this.#procedure, played, 0);
		const standing = gateStates(played, notEnoughNow(played, permissives), permissives, 0).find(
			(state) => state.gate === gate,
		);
		if (standing?.state === 'ready') return { objections: [] };
		return { objections: [`the gate was ${standing?.state ?? 'unknown'}`] };
	}
}
