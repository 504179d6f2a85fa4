import type { Procedure } from '../../procedure';
import type { Cause, Standing, StepStanding } from '../../record';
import { sayCause, shownIn, shownText, type Moments, type Say } from '../../wording';
import { namesOf } from '../ladder/leader-notes';
import type { CoilState, ContactState } from '../ladder/states';

/** One mark of the chain that leads from a fact of the plant to the gates that it took. */
export type ChainItem = {
	readonly id: string;
	readonly title: string;
	readonly text: string;
	readonly mark: { readonly fact: 'red' | 'yellow' } | { readonly state: ContactState } | { readonly coil: CoilState };
};

type Told = {
	readonly procedure: Procedure;
	readonly standing: Standing;
	readonly say: Say;
	readonly moments: Moments;
};

/** Why proofs fell: the facts first, then what relied on what, then the gates. Each "why" ends at something that happened. */
export function lapseChain(told: Told): readonly ChainItem[] {
	return [...facts(told), ...fallen(told), ...gates(told)];
}

const lapsedSteps = ({ standing }: Told): readonly StepStanding[] =>
	standing.steps.filter(({ state }) => state === 'lapsed' || state === 'failed');

function facts(told: Told): readonly ChainItem[] {
	const { procedure, say, moments } = told;
	const seen = new Map<string, ChainItem>();
	for (const cause of lapsedSteps(told).flatMap(({ why }) => why)) {
		if (!isFact(cause)) continue;
		const text = sayCause(cause, say, moments, namesOf(shownIn(procedure, say)));
		const id = `${cause.kind} ${text}`;
		const fact = cause.kind === 'plant event' ? 'red' : 'yellow';
		if (!seen.has(id)) seen.set(id, { id, title: say('ui.fact', { text }), text: '', mark: { fact } });
	}
	return [...seen.values()].slice(0, MOST_FACTS);
}

const isFact = ({ kind }: Cause): boolean => kind !== 'relies on' && kind !== 'not proved';

/** By group, as on the ladder: a group is one line, its first fallen step says why. */
function fallen(told: Told): readonly ChainItem[] {
	const { procedure, say, moments } = told;
	const groups = new Map<string, StepStanding[]>();
	for (const found of lapsedSteps(told)) {
		const group = procedure.steps.find(({ id }) => id === found.step)?.group ?? found.step;
		groups.set(group, [...(groups.get(group) ?? []), found]);
	}
	return [...groups].map(([group, steps]): ChainItem => {
		const [first] = steps;
		const cause = first?.why[0];
		const why = cause === undefined ? '' : sayCause(cause, say, moments, namesOf(shownIn(procedure, say)));
		const state = steps.some((each) => each.state === 'failed') ? 'failed' : 'lapsed';
		return {
			id: `group ${group}`,
			title: shownText(group, say),
			text: `${say(`ui.contact.${state}`)}: ${steps.map(({ step }) => step).join(', ')}. ${why}`,
			mark: { state },
		};
	});
}

const gates = ({ standing, procedure, say, moments }: Told): readonly ChainItem[] =>
	standing.gates
		.filter(({ state }) => state === 'lapsed' || state === 'held' || state === 'refused')
		.map(({ gate, state, releasedAt }) => ({
			id: `gate ${gate}`,
			title: `${say('ui.gate', { gate })} ${shownText(procedure.gates.find(({ number }) => number === gate)?.title ?? '', say)}`,
			text:
				state === 'lapsed' && releasedAt !== undefined
					? say('ui.gate.lapsed', { at: moments.clock(releasedAt) })
					: say(`ui.coil.${state}`),
			mark: { coil: state },
		}));

const MOST_FACTS = 4;
