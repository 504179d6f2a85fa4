import { allOf } from '../../record';
import type { Story } from './story';

export type ProcessResult = 'met' | 'met with concessions' | 'not met';

/** Whether the procedure was met, by its own rules; and what stands in the way of a plain yes. Verify asks the same anew. */
export function processResult(story: Story): { readonly result: ProcessResult; readonly because: readonly string[] } {
	const missing = missingIn(story);
	if (missing.length > 0) return { result: 'not met', because: missing };
	const concessions = concessionsIn(story);
	return { result: concessions.length > 0 ? 'met with concessions' : 'met', because: concessions };
}

const missingIn = ({ end, say }: Story): readonly string[] => [
	...end.gates
		.filter(({ state }) => state !== 'released')
		.map(({ gate, state }) => say('missing.gate', { gate, state: say(`gate.${state}`) })),
	...end.deviations
		.filter(({ state, blocks }) => state === 'open' && blocks !== 'nothing')
		.map(({ deviation, blocks }) => say('missing.deviation', { deviation, blocks })),
];

function concessionsIn({ events, end, say, names }: Story): readonly string[] {
	const stepOf = (entry: string): string => allOf(events, 'entry').find(({ id }) => id === entry)?.body.step ?? '';
	return [
		...allOf(events, 'deviation dispositioned')
			.filter(({ body }) => body.disposition === 'use as is')
			.map(({ body }) => say('concession.as it is', { deviation: body.deviation })),
		...end.deviations
			.filter(({ state }) => state === 'open')
			.map(({ deviation }) => say('concession.open', { deviation })),
		...allOf(events, 'not applicable agreed').map(({ body, person }) =>
			say('concession.not applicable', { step: stepOf(body.entry), person: names.person(person) }),
		),
		...allOf(events, 'gate released by voice').map(({ body }) => say('concession.voice', { gate: body.gate })),
		...allOf(events, 'gate released on paper').map(({ body }) => say('concession.paper', { gate: body.gate })),
		...allOf(events, 'witness waived').map(({ body }) => say('concession.witness', { step: body.step })),
	];
}
