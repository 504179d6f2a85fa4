import type { Gate, Procedure, Step } from '../../procedure';
import type { GateStanding, Standing, StepStanding } from '../../record';

/** How a contact is drawn. Only `stands` and `not applicable` let the line pass. */
export type ContactState = 'stands' | 'not yet' | 'lapsed' | 'blocks' | 'not applicable';

export type Contact = {
	readonly id: string;
	readonly label: string;
	/** What it stands for: the gate before, a group of steps, a blocking deviation, a permissive, or the plant description. */
	readonly of: 'gate' | 'group' | 'deviation' | 'permissive' | 'plant';
	readonly state: ContactState;
	/** "3 of 4", or the word of the state. */
	readonly word: string;
	/** The line reaches its left bar. */
	readonly powered: boolean;
};

export type CoilState = GateStanding['state'];

export type Rung = {
	readonly gate: number;
	readonly title: string;
	readonly contacts: readonly Contact[];
	readonly coil: CoilState;
	/** How many contacts the line passes: all of them when the gate is ready or released, none when it never arrives. */
	readonly passes: number;
	/** The line comes down the rail as far as this rung. */
	readonly reached: boolean;
};

export const isClosed = (state: ContactState): boolean => state === 'stands' || state === 'not applicable';

/**
 * What the ladder says, before it is drawn. The line comes down the left rail to the first gate that is not released and
 * runs along its rung to the first contact that is open; released rungs are lined throughout. Nothing else is.
 */
export function rungsOf(procedure: Procedure, standing: Standing): readonly Rung[] {
	let arrives = true;
	return procedure.gates.map((gate, i) => {
		const before = procedure.gates[i - 1];
		const coil = coilOf(standing, gate.number);
		const released = coil === 'released';
		const open = [
			...(before === undefined ? [] : [gateContact(before, coilOf(standing, before.number))]),
			...plantContacts(standing, gate.number),
			...deviationContacts(standing, gate.number),
			...groupContacts(procedure, standing, gate.number),
			...permissiveContacts(procedure, standing, gate),
		];
		const firstOpen = open.findIndex(({ state }) => !isClosed(state));
		const reached = arrives;
		const passes = !reached ? 0 : released || firstOpen === -1 ? open.length : firstOpen;
		const contacts = open.map((contact, at) => ({ ...contact, powered: reached && at <= passes }));
		arrives = reached && released;
		return { gate: gate.number, title: gate.title, contacts, coil, passes, reached };
	});
}

type Unpowered = Omit<Contact, 'powered'>;

const coilOf = (standing: Standing, gate: number): CoilState =>
	standing.gates.find((each) => each.gate === gate)?.state ?? 'not ready';

const gateContact = ({ number }: Gate, state: CoilState): Unpowered => ({
	id: `gate-${number}`,
	label: `Gate ${number}`,
	of: 'gate',
	state: state === 'released' ? 'stands' : state === 'lapsed' ? 'lapsed' : 'not yet',
	word: state,
});

/** Values of a copied plant description that are still another unit's. */
const plantContacts = (standing: Standing, gate: number): readonly Unpowered[] =>
	(standing.gates.find((each) => each.gate === gate)?.why ?? [])
		.filter(({ kind }) => kind === 'values to replace')
		.map(() => ({ id: 'plant', label: 'Plant values', of: 'plant', state: 'blocks', word: 'blocks' }));

const deviationContacts = (standing: Standing, gate: number): readonly Unpowered[] =>
	standing.deviations
		.filter(({ state, blocks }) => state === 'open' && blocks === gate)
		.map(({ deviation }) => ({ id: deviation, label: deviation, of: 'deviation', state: 'blocks', word: 'blocks' }));

function groupContacts(procedure: Procedure, standing: Standing, gate: number): readonly Unpowered[] {
	const groups = new Map<string, StepStanding['state'][]>();
	for (const step of procedure.steps.filter((each) => each.gate === gate)) {
		const states = groups.get(step.group) ?? [];
		groups.set(step.group, [...states, stateOf(standing, step)]);
	}
	return [...groups].map(([label, states]) => {
		const state = groupState(states);
		return { id: label, label, of: 'group', state, word: groupWord(states, state) };
	});
}

const stateOf = (standing: Standing, step: Step): StepStanding['state'] =>
	standing.steps.find((each) => each.step === step.id)?.state ?? 'not yet';

/** The worst of its steps. A waiting proof is kept but lets nothing pass, so its contact is open. */
function groupState(states: readonly StepStanding['state'][]): ContactState {
	if (states.every((state) => state === 'not applicable')) return 'not applicable';
	if (states.includes('failed')) return 'blocks';
	if (states.includes('lapsed')) return 'lapsed';
	return states.every((state) => state === 'stands' || state === 'not applicable') ? 'stands' : 'not yet';
}

function groupWord(states: readonly StepStanding['state'][], state: ContactState): string {
	if (state !== 'not yet') return states.includes('failed') ? 'failed' : state;
	if (states.every((each) => each !== 'not yet')) return 'waits';
	const needed = states.filter((each) => each !== 'not applicable');
	return `${needed.filter((each) => each === 'stands').length} of ${needed.length}`;
}

const permissiveContacts = (procedure: Procedure, standing: Standing, gate: Gate): readonly Unpowered[] =>
	(gate.permissives ?? []).map((id) => {
		const value = standing.permissives.find((each) => each.permissive === id)?.value ?? 'unknown';
		const label = procedure.permissives?.find((each) => each.id === id)?.title ?? id;
		return { id, label, of: 'permissive', state: value === 'TRUE' ? 'stands' : 'not yet', word: value };
	});
