import type { RecordEvent } from '../record';
import { passed, type Check } from './pdf/check';

/** How an event is named to people: whose tablet, which number on its chain, what it is. */
export const nameOf = (event: RecordEvent): string => `${event.device} number ${event.number} (${whatOf(event)})`;

function whatOf(event: RecordEvent): string {
	switch (event.kind) {
		case 'entry':
			return `entry on ${event.body.step}`;
		case 'gate released':
		case 'gate refused':
		case 'refusal answered':
		case 'gate released by voice':
		case 'gate released on paper':
			return `${event.kind}, gate ${event.body.gate}`;
		default:
			return event.kind;
	}
}

export const aboutEvent = (event: RecordEvent): Check['facts'] => ({
	log: event.log,
	device: event.device,
	number: event.number,
	event: event.id,
});

/** One check for each place where a rule was broken; where it was not, one that says so. */
export const offences = (
	name: string,
	found: readonly Check[],
	held: string,
	facts: Check['facts'] = {},
): readonly Check[] => (found.length > 0 ? found : [passed(name, held, { facts })]);
