import type { Procedure } from '../procedure';
import { MINUTE, millis, type Standing } from '../record';
import type { Moments } from './moment';
import { counted, type Say } from './say';

/** What is only so for a while: a bypass, a forced signal, a fitted blind, a supply that is not the lasting one. */
export type TemporaryState = { readonly id: string; readonly text: string };

export type HandOverFacts = {
	readonly procedure: Procedure;
	readonly standing: Standing;
	/** Titles of deviations by id. */
	readonly deviations: ReadonlyMap<string, string>;
	readonly temporary: readonly TemporaryState[];
};

/** What the shift that goes says to the one that comes, made from the record: it is signed by both, word for word. */
export function handOverSummary(facts: HandOverFacts, say: Say, moments: Moments): string {
	return [...gates(facts, say), ...proofs(facts, say, moments), ...open(facts, say, moments)].join(' ');
}

function gates({ standing }: HandOverFacts, say: Say): readonly string[] {
	return standing.gates
		.map(({ gate, state }) => ({ gate, state }))
		.reduce<{ state: string; from: number; to: number }[]>((runs, { gate, state }) => {
			const last = runs.at(-1);
			if (last?.state === state) last.to = gate;
			else runs.push({ state, from: gate, to: gate });
			return runs;
		}, [])
		.map(({ state, from, to }) =>
			say(from === to ? 'handover.gate' : 'handover.gates', {
				from,
				to,
				state: say(`ui.coil.${state as Standing['gates'][number]['state']}`),
			}),
		);
}

function proofs({ procedure, standing }: HandOverFacts, say: Say, moments: Moments): readonly string[] {
	const titleOf = (id: string): string => `${id} ${procedure.steps.find((step) => step.id === id)?.title ?? ''}`.trim();
	const at = millis(standing.at);
	const soon = standing.steps
		.filter(({ until }) => until !== undefined && until !== 'unknown' && millis(until) - at <= SOON)
		.filter(({ state }) => state === 'stands')
		.map(({ step, until = '' }) => `${titleOf(step)} ${moments.clock(until)}`);
	const list = standing.reproof.steps;
	return [
		list.length === 0
			? say('handover.nothing lapsed')
			: say('handover.prove again', {
					steps: list.map(titleOf).join(', '),
					minutes: standing.reproof.minutes,
				}),
		...(soon.length === 0 ? [] : [say('handover.lapses soon', { steps: soon.join(', ') })]),
	];
}

function open(
	{ procedure, standing, deviations, temporary }: HandOverFacts,
	say: Say,
	moments: Moments,
): readonly string[] {
	const blocked = (blocks: Standing['deviations'][number]['blocks']): string =>
		typeof blocks === 'number' ? say('ui.gate', { gate: blocks }) : say(`blocks.${blocks}`);
	const raised = standing.deviations
		.filter(({ state }) => state === 'open')
		.map(({ deviation, blocks }) =>
			say('handover.deviation', { deviation, title: deviations.get(deviation) ?? '', blocks: blocked(blocks) }),
		);
	const going = standing.plantEvents
		.filter(({ end, withdrawn }) => end === null && withdrawn !== true)
		.map(({ what, begin }) =>
			say('handover.going on', {
				what: procedure.plantEvents.find(({ id }) => id === what)?.title ?? what,
				at: moments.clock(begin),
			}),
		);
	return [
		...going,
		...(raised.length === 0 ? [say('handover.no deviation')] : raised),
		temporary.length === 0
			? say('handover.no temporary')
			: counted(say, 'handover.temporary', 'handover.temporaries', temporary.length) +
				` ${temporary.map(({ text }) => text).join('; ')}.`,
	];
}

/** What lapses by its age within two hours is said. */
const SOON = 120 * MINUTE;
