import { allOf, judgeEntry, type EntryFault, type EventOf, type RecordEvent } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import type { Documents } from './check-documents';
import { failed, undecided, type Check } from './pdf/check';

const NAME = 'passes follow from what was recorded';

/** An entry that says "pass" holds everything that its step asks for, and every value keeps its limit and guard. */
export function checkOutcomes(events: readonly RecordEvent[], { procedure, plant }: Documents): readonly Check[] {
	if (procedure === undefined) return [undecided(NAME, 'The record holds no procedure that can be read.')];
	const byId = new Map(events.map((event) => [event.id, event]));
	const steps = new Map(procedure.steps.map((step) => [step.id, step]));
	const passes = allOf(events, 'entry').filter(({ body }) => body.outcome === 'pass');
	const bad = passes.flatMap((event) => {
		const step = steps.get(event.body.step);
		const faults: readonly EntryFault[] =
			step === undefined
				? [{ kind: 'does not pass', because: `the procedure has no step ${event.body.step}` }]
				: judgeEntry(step, event.body, { plant, byId });
		return faults.map((found) => said(event, found));
	});
	return offences(NAME, bad, `${passes.length} passes judged again.`);
}

function said(event: EventOf<'entry'>, { because, kind }: EntryFault): Check {
	const facts = { ...aboutEvent(event), step: event.body.step, because };
	return kind === 'does not pass'
		? failed(NAME, `${nameOf(event)} says pass, but ${because}.`, { facts })
		: undecided(NAME, `${nameOf(event)} says pass; ${because}.`, { facts });
}
