import { allOf, type RecordEvent, type Standing } from '../record';
import type { Replayed } from './check-gates';

/**
 * Whether the start-up met its procedure: a question of its own, beside whether the record is whole. A record of a start-up
 * that was given up can be whole in every byte.
 */
export type ProcessResult = {
	readonly result: 'met' | 'met with concessions' | 'not met' | 'not judged';
	/** What stands in the way of more; empty when it is met. */
	readonly because: readonly string[];
};

export function processResult(replayed: Replayed | undefined): ProcessResult {
	if (replayed === undefined)
		return { result: 'not judged', because: ['the record holds no procedure that can be read'] };
	const missing = missingIn(replayed.end);
	if (missing.length > 0) return { result: 'not met', because: missing };
	const concessions = concessionsIn(replayed);
	return concessions.length > 0
		? { result: 'met with concessions', because: concessions }
		: { result: 'met', because: [] };
}

const missingIn = (end: Standing): readonly string[] => [
	...end.gates.filter(({ state }) => state !== 'released').map(({ gate, state }) => `gate ${gate} is ${state}`),
	...end.deviations
		.filter(({ state, blocks }) => state === 'open' && blocks !== 'nothing')
		.map(
			({ deviation, blocks }) =>
				`deviation ${deviation} is open and blocks ${typeof blocks === 'number' ? `gate ${blocks}` : blocks}`,
		),
	...(end.sealed === undefined ? ['it is not sealed'] : []),
];

function concessionsIn({ startUp, end }: Replayed): readonly string[] {
	return [
		...allOf(startUp, 'deviation dispositioned')
			.filter(({ body }) => body.disposition === 'use as is')
			.map(({ body }) => `deviation ${body.deviation} was accepted as it is`),
		...end.deviations
			.filter(({ state }) => state === 'open')
			.map(({ deviation }) => `deviation ${deviation} is open and blocks nothing`),
		...allOf(startUp, 'not applicable agreed').map(
			(event) => `${stepOf(startUp, event.body.entry)} was agreed not applicable`,
		),
		...allOf(startUp, 'gate released by voice').map(({ body }) => `gate ${body.gate} was released by voice`),
		...allOf(startUp, 'gate released on paper').map(({ body }) => `gate ${body.gate} was released on paper`),
		...allOf(startUp, 'witness waived').map(({ body }) => `the witness of ${body.step} was waived`),
	];
}

const stepOf = (events: readonly RecordEvent[], entry: string): string =>
	allOf(events, 'entry').find(({ id }) => id === entry)?.body.step ?? 'a step';

export type Counts = { readonly [what: string]: number };

/** How much there is of what, for the page that a judge reads first. */
export function countsOf(
	startUp: readonly RecordEvent[],
	site: readonly RecordEvent[],
	end: Standing | undefined,
): Counts {
	const all = [...startUp, ...site];
	return {
		events: startUp.length,
		siteEvents: site.length,
		tablets: new Set(startUp.map(({ device }) => device)).size,
		people: new Set(startUp.map(({ person }) => person)).size,
		entries: allOf(startUp, 'entry').length,
		calculations: allOf(startUp, 'entry').filter(({ body }) => body.calculation !== undefined).length,
		gateActs: all.filter(({ kind }) => kind.startsWith('gate ')).length,
		refusals: allOf(startUp, 'gate refused').length,
		refusedActs: allOf(startUp, 'refused act').length,
		deviations: allOf(startUp, 'deviation raised').length,
		addenda: allOf(startUp, 'addendum').length,
		...(end === undefined
			? {}
			: {
					plantEvents: end.plantEvents.length,
					lateFacts: end.late.length,
					watchGaps: end.watchGaps.length,
					tries: end.tries.length,
					releasedUnaware: end.acts.filter(({ didNotStand }) => didNotStand.length > 0).length,
					notCounted: end.acts.filter(({ counted }) => !counted).length,
				}),
	};
}
