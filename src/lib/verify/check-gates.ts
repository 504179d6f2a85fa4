import type { Procedure } from '../procedure';
import type { RecordEvent, Standing } from '../record';
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
	return [...checkActs(replayed.end, byId), ...checkSubstitutes(replayed.startUp)];
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

/** Acts that stand for an absent signatory or a lost key: their rules are not judged here, so they are not passed over. */
function checkSubstitutes(startUp: readonly RecordEvent[]): readonly Check[] {
	return startUp
		.filter(({ kind }) => kind === 'gate released by voice' || kind === 'gate released on paper')
		.map((event) =>
			undecided('acts by voice and on paper', `${nameOf(event)} is kept, and counts for nothing here.`, {
				facts: aboutEvent(event),
			}),
		);
}
