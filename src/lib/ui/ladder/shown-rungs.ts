import { rungsOf, type Contact, type Rung } from '../../drawing';
import type { Procedure, Step } from '../../procedure';
import type { GateStanding, Standing, StepStanding } from '../../record';
import { sayWord, shownText, type Moments, type Say } from '../../wording';
import { passes, type CoilState, type ContactState } from './states';

export type ShownContact = {
	readonly id: string;
	readonly label: string;
	readonly of: Contact['of'];
	readonly state: ContactState;
	/** "3 of 4", "09:14", "not appl." */
	readonly word: string;
	/** The power line reaches it. */
	readonly powered: boolean;
};

export type ShownRung = {
	readonly gate: number;
	readonly title: string;
	readonly holdPoint: string;
	readonly contacts: readonly ShownContact[];
	readonly coil: CoilState;
	/** The power line reaches the coil. */
	readonly arrives: boolean;
	readonly reached: boolean;
	readonly caption: string;
};

export type Told = { readonly procedure: Procedure; readonly standing: Standing };

/** The rungs of a start-up as screens show them: what blocks first is what comes next. */
export const shownRungs = ({ procedure, standing }: Told, say: Say, moments: Moments): readonly ShownRung[] =>
	rungsOf(procedure, standing).map((rung) => {
		const gate = procedure.gates.find(({ number }) => number === rung.gate);
		const steps = procedure.steps.filter((step) => step.gate === rung.gate);
		const contacts = rung.contacts.map((contact, i): ShownContact => {
			const state = stateOf(contact, rung.reached && i === rung.passes && rung.coil !== 'released');
			const label = labelOf(contact, say);
			return { ...contact, label, state, word: wordOf(contact, state, { steps, standing, say, moments }) };
		});
		return {
			gate: rung.gate,
			title: shownText(rung.title, say),
			holdPoint: shownText(gate?.holdPoint ?? '', say),
			contacts,
			coil: rung.coil,
			arrives: rung.reached && rung.passes === contacts.length,
			reached: rung.reached,
			caption: captionOf(rung, steps, standing, say, moments),
		};
	});

function labelOf({ of, label }: Contact, say: Say): string {
	if (of === 'plant') return say('ui.plant values');
	const gate = of === 'gate' ? /\d+/.exec(label)?.[0] : undefined;
	return gate === undefined ? shownText(label, say) : say('ui.gate', { gate });
}

function stateOf({ of, state, word }: Contact, isFirstOpen: boolean): ContactState {
	if (of === 'permissive' && word === 'unknown') return 'unknown';
	if (state === 'blocks') return of === 'deviation' || of === 'plant' ? 'blocks' : 'failed';
	return state === 'not yet' && isFirstOpen && of === 'group' ? 'next' : state;
}

type Around = {
	readonly steps: readonly Step[];
	readonly standing: Standing;
	readonly say: Say;
	readonly moments: Moments;
};

function wordOf(contact: Contact, state: ContactState, { steps, standing, say, moments }: Around): string {
	if (contact.of === 'permissive') return contact.word === 'unknown' ? say('ui.undecided') : sayWord(contact.word, say);
	if (contact.of === 'gate') return say(`ui.under.${contact.word as CoilState}`);
	if (state === 'blocks') return say('ui.blocks');
	if (state === 'failed') return say('state.failed');
	if (state === 'not applicable') return say('state.not applicable');
	const found = statesOf(contact.id, steps, standing);
	if (state === 'lapsed') {
		const since = found.find((each) => each.state === 'lapsed')?.since;
		return since === undefined ? say('state.lapsed') : moments.clock(since);
	}
	const asked = found.filter((each) => each.state !== 'not applicable');
	return say('ui.of', { n: asked.filter((each) => each.state === 'stands').length, all: asked.length });
}

/** What is known of the steps of a group, in the order of the procedure. */
export const statesOf = (group: string, steps: readonly Step[], standing: Standing): readonly StepStanding[] =>
	steps
		.filter((step) => step.group === group)
		.flatMap((step) => standing.steps.find((each) => each.step === step.id) ?? []);

function captionOf(rung: Rung, steps: readonly Step[], standing: Standing, say: Say, moments: Moments): string {
	const gate = standing.gates.find((each) => each.gate === rung.gate);
	if (gate === undefined || gate.state === 'not ready') {
		const asked = standing.steps.filter((each) => each.gate === rung.gate && each.state !== 'not applicable');
		const stand = asked.filter(({ state }) => state === 'stands').length;
		return say('ui.of', { n: stand, all: asked.length === 0 ? steps.length : asked.length });
	}
	return gateWords(gate, say, moments);
}

/** "released 05:52", "released 08:58, lapsed 09:14", "ready to be released". */
export function gateWords(gate: GateStanding, say: Say, moments: Moments): string {
	const released = gate.releasedAt === undefined ? undefined : moments.clock(gate.releasedAt);
	if (gate.state === 'released' && released !== undefined) return say('ui.gate.released at', { at: released });
	const again = gate.why.find((each) => each.kind === 'needs release again');
	if (gate.state === 'lapsed' && released !== undefined)
		return again?.kind === 'needs release again'
			? say('ui.gate.lapsed at', { at: released, lapsed: moments.clock(again.since) })
			: say('ui.gate.lapsed', { at: released });
	return say(`ui.coil.${gate.state}`);
}

/** The rung that work is on: the first whose gate is not released. */
export const rungInWork = (rungs: readonly ShownRung[]): ShownRung | undefined =>
	rungs.find(({ coil }) => coil !== 'released');

/** The title of a start-up says in words where its line ends. */
export function stopsAt(unit: string, rungs: readonly ShownRung[], say: Say): string {
	const rung = rungInWork(rungs);
	if (rung === undefined) return say('ui.stops.nowhere', { unit });
	if (rung.coil === 'ready') return say('ui.stops.ready', { unit, gate: rung.gate });
	if (rung.coil === 'refused') return say('ui.stops.refused', { unit, gate: rung.gate });
	const open = rung.contacts.find(({ state }) => !passes(state));
	if (open === undefined) return say('ui.stops.gate', { unit, gate: rung.gate });
	if (open.of === 'deviation') return say('ui.stops.deviation', { unit, gate: rung.gate, what: open.label });
	return say('ui.stops', { unit, gate: rung.gate, what: say.language === 'en' ? lowered(open.label) : open.label });
}

/** In the middle of a sentence; a word in capitals, such as a tag, keeps them. */
const lowered = (label: string): string =>
	/^[A-Z][a-z]/.test(label) ? label.charAt(0).toLowerCase() + label.slice(1) : label;
