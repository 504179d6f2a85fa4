import type { Procedure } from '../procedure';
import { Knowledge, standing, type EventOf, type RecordEvent, type Standing } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import { failed, undecided, type Check } from './pdf/check';

/** The two logs that a start-up is judged by, and the procedure that it was run by. */
export type Replayed = {
	readonly procedure: Procedure;
	readonly startUp: readonly RecordEvent[];
	readonly site: readonly RecordEvent[];
	/** What stands at the end, by the whole record. */
	readonly end: Standing;
};

/** Plays the record again: what the rules of the procedure did not allow when it was done is named, act by act. */
export function checkGates(replayed: Replayed): readonly Check[] {
	const byId = new Map([...replayed.startUp, ...replayed.site].map((event) => [event.id, event]));
	return [...checkActs(replayed.end, byId), ...checkStatements(replayed)];
}

function checkActs({ withoutEffect }: Standing, byId: ReadonlyMap<string, RecordEvent>): readonly Check[] {
	const name = 'acts were allowed by the rules';
	const bad = withoutEffect.map(({ event: id, because }) => {
		const event = byId.get(id);
		const called = event === undefined ? id : nameOf(event);
		const facts = event === undefined ? { event: id } : aboutEvent(event);
		return failed(name, `${called} was not allowed: ${because}.`, { facts, sub: 'SIG_CONSTRAINTS_FAILURE' });
	});
	return offences(name, bad, 'By what the tablet of each act knew: role, another performer, proofs, gates below.');
}

const SHOWN = 'statements say what stood when they were signed';

type Signed = EventOf<'gate released'> | EventOf<'gate refused'>;

/** What a signer saw is what stood, as far as the tablet could know. */
function checkStatements({ procedure, startUp, site }: Replayed): readonly Check[] {
	const knowledge = new Knowledge([...startUp, ...site]);
	const acts = startUp.filter(
		(event): event is Signed => event.kind === 'gate released' || event.kind === 'gate refused',
	);
	const bad = acts.flatMap((act) => {
		const past = knowledge.past(act);
		const known = startUp.filter(({ id }) => past.has(id));
		const then = site.filter(({ enteredAt }) => enteredAt <= act.enteredAt);
		return checkStatement(act, procedure, standing(procedure, known, then, act.entered));
	});
	return offences(SHOWN, bad, `${acts.length} gate acts: each step with its state and proof, each open deviation.`);
}

function checkStatement(act: Signed, procedure: Procedure, stood: Standing): readonly Check[] {
	const facts = aboutEvent(act);
	const { statement, gate } = act.body;
	if (statement === undefined) return [undecided(SHOWN, `${nameOf(act)} does not keep what was shown.`, { facts })];
	const wrong = (what: string): Check => failed(SHOWN, `${nameOf(act)} ${what}.`, { facts });
	const steps = new Map(stood.steps.map((step) => [step.step, step]));
	const listed = new Set(statement.list.map(({ step }) => step));
	const left = procedure.steps.filter((step) => step.gate === gate && !listed.has(step.id)).map(({ id }) => id);
	const open = stood.deviations.filter(({ state }) => state === 'open').map(({ deviation }) => deviation);
	return [
		...(left.length === 0 ? [] : [wrong(`leaves out ${left.join(', ')}`)]),
		...statement.list.flatMap(({ step, state, proof }) => {
			const found = steps.get(step);
			if (found === undefined) return [wrong(`lists a step ${step}, which the procedure does not have`)];
			if (found.state !== state) return [wrong(`says that ${step} "${state}"; it was "${found.state}"`)];
			const counted = found.state === 'stands' ? (found.entry ?? null) : null;
			return proof === counted ? [] : [wrong(`names another proof of ${step} than the one that counted`)];
		}),
		...(sameNames(open, statement.openDeviations)
			? []
			: [wrong(`lists open deviations "${statement.openDeviations.join(', ')}"; open were "${open.join(', ')}"`)]),
	];
}

const sameNames = (a: readonly string[], b: readonly string[]): boolean => {
	const [one, other] = [new Set(a), new Set(b)];
	return one.size === other.size && [...one].every((name) => other.has(name));
};
