import type { Procedure } from '../../procedure';
import type { Cause, Standing } from '../../record';
import { sayCause, shownIn, shownText, type Moments, type Say } from '../../wording';
import { statesOf, type ShownContact, type ShownRung, type Told } from './shown-rungs';

/** A sentence led to its contact: "Lapsed suction, fan stop 09:14". */
export type LeaderNote = {
	readonly contact: string;
	readonly word: string;
	/** What it speaks of, when that is not the text itself: "Fan flow". */
	readonly subject?: string;
	readonly text: string;
	/** The step that the note names, when it names one. */
	readonly step?: string;
};

/** What is said about a rung: what is next, what has lapsed, what blocks. */
export function leaderNotes(
	rung: ShownRung,
	{ procedure, standing }: Told,
	{ say, moments, deviations }: { say: Say; moments: Moments; deviations?: ReadonlyMap<string, string> | undefined },
): readonly LeaderNote[] {
	const around = { procedure, standing, say, moments };
	return rung.contacts.flatMap((contact): readonly LeaderNote[] => {
		const { id, label, state, of } = contact;
		if (of === 'gate' && state !== 'stands')
			return [{ contact: id, word: say('ui.lead.waits'), text: say('ui.lead.for gate', { gate: label }) }];
		if (of === 'plant') return [{ contact: id, word: label, text: plantText(rung.gate, standing, say) }];
		if (state === 'blocks')
			return [{ contact: id, word: say('ui.lead.deviation', { id }), text: deviations?.get(id) ?? say('ui.blocks') }];
		if (state === 'next') return stepNote(contact, rung, say('ui.lead.next'), around, () => true);
		if (state === 'failed')
			return stepNote(contact, rung, say('ui.lead.failed'), around, (found) => found === 'failed');
		if (state === 'lapsed') return lapseNote(contact, rung, around);
		if (of === 'permissive' && contact.powered && state !== 'stands')
			return [{ contact: id, word: say('ui.lead.condition'), subject: label, text: contact.word }];
		return [];
	});
}

/** "still of FM-1, Demonstration lime works, revision 4: 123" */
function plantText(gate: number, { gates }: Standing, say: Say): string {
	const why = gates.find((each) => each.gate === gate)?.why.find(({ kind }) => kind === 'values to replace');
	return why?.kind === 'values to replace' ? say('ui.lead.plant', { from: why.from, n: why.items.length }) : '';
}

/** On a drawing one fact is said once, for everything that it took. */
export function mergedNotes(notes: readonly LeaderNote[], say: Say): readonly LeaderNote[] {
	const merged = new Map<string, readonly LeaderNote[]>();
	for (const note of notes) {
		const fact = `${note.word} ${note.text}`;
		merged.set(fact, [...(merged.get(fact) ?? []), note]);
	}
	return [...merged.values()].flatMap(([first, ...others]) => {
		if (first === undefined) return [];
		const { subject } = first;
		return others.length === 0 || subject === undefined
			? [first]
			: [{ ...first, subject: say('ui.lead.and others', { first: subject, n: others.length }) }];
	});
}

/** "Fan flow and 3 more: process-gas fan stopped 02:11 to 02:16" */
export const noteText = ({ subject, text }: LeaderNote): string =>
	subject === undefined ? text : `${subject}: ${text}`;

type Around = {
	readonly procedure: Procedure;
	readonly standing: Standing;
	readonly say: Say;
	readonly moments: Moments;
};

function stepNote(
	contact: ShownContact,
	{ gate }: ShownRung,
	word: string,
	{ procedure, standing, say }: Around,
	isMeant: (state: string) => boolean,
): readonly LeaderNote[] {
	const found = ofGroup(contact, gate, procedure, standing).find(
		({ state }) => state !== 'stands' && state !== 'not applicable' && isMeant(state),
	);
	const step = procedure.steps.find(({ id }) => id === found?.step);
	return step === undefined
		? []
		: [{ contact: contact.id, word, text: `${step.id} ${shownText(step.title, say)}`, step: step.id }];
}

function lapseNote(contact: ShownContact, { gate }: ShownRung, around: Around): readonly LeaderNote[] {
	const { procedure, standing, say, moments } = around;
	const lapsed = ofGroup(contact, gate, procedure, standing).find(({ state }) => state === 'lapsed');
	const cause = lapsed === undefined ? undefined : firstFact(lapsed.why);
	if (lapsed === undefined || cause === undefined) return [];
	const said = sayCause(cause, say, moments, namesOf(shownIn(procedure, say)));
	return [{ contact: contact.id, word: say('ui.lead.lapsed'), subject: contact.label, text: said, step: lapsed.step }];
}

const ofGroup = (contact: ShownContact, gate: number, procedure: Procedure, standing: Standing) =>
	statesOf(
		contact.id,
		procedure.steps.filter((step) => step.gate === gate),
		standing,
	);

/** A fact of the plant before what only follows from one. */
const firstFact = (why: readonly Cause[]): Cause | undefined => why.find(({ kind }) => kind !== 'relies on') ?? why[0];

/** Plant events and conditions by their titles in the procedure. */
export const namesOf = (procedure: Procedure) => ({
	plantEvent: (what: string): string => procedure.plantEvents.find(({ id }) => id === what)?.title ?? what,
	permissive: (id: string): string => procedure.permissives?.find((each) => each.id === id)?.title ?? id,
});
