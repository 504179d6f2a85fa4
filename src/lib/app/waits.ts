import { calibrationEnds } from '../plant';
import { MINUTE, millis } from '../record';
import { duration, type Moments, type Say } from '../wording';
import { saidBlocking } from './now/now-facts';
import { nextToLapse } from './now/next-to-lapse';
import { whatBlocks } from './now/what-blocks';
import type { OpenRecord } from './record-words';

/** Who asks what waits: a person with the roles of the certificate. */
export type Asking = { readonly person: string; readonly roles: readonly string[] };

export type Waiting = {
	readonly id: string;
	readonly mark: 'next' | 'lapsed' | 'blocks' | 'ready' | 'refused';
	readonly title: string;
	readonly said: string;
	readonly when: string;
	readonly to: { readonly step: string } | { readonly gate: number } | { readonly place: 'lapsed' | 'deviations' };
};

/** What waits for a person in one start-up: hold points first, then refusals, lapses, the next step and own deviations. */
export function waitsFor(told: OpenRecord, { person, roles }: Asking, say: Say, moments: Moments): readonly Waiting[] {
	if (told.standing.sealed !== undefined) return [];
	return [
		...releases(told, person, roles, say),
		...refusals(told, roles, say),
		...lapses(told, say),
		...nextStep(told, roles, say, moments),
		...deviations(told, person, say, moments),
	];
}

/** Ready gates that still need a signature of one of the roles, from somebody who performed nothing under them (ST9). */
function releases(told: OpenRecord, person: string, roles: readonly string[], say: Say): readonly Waiting[] {
	const { procedure, standing } = told;
	return standing.gates
		.filter(
			({ state, missing }) => state === 'ready' && missing.some((any) => any.some((role) => roles.includes(role))),
		)
		.filter(
			({ gate }) => !standing.steps.some((step) => step.gate === gate && step.performedBy?.includes(person) === true),
		)
		.map(({ gate }) => ({
			id: `release ${gate}`,
			mark: 'ready' as const,
			title: say('today.release', { gate }),
			said: procedure.gates.find(({ number }) => number === gate)?.title ?? '',
			when: '',
			to: { gate },
		}));
}

function refusals({ procedure, standing }: OpenRecord, roles: readonly string[], say: Say): readonly Waiting[] {
	const releasing = procedure.gates.flatMap(({ signatures }) => signatures.flatMap((signature) => signature.roles));
	if (!releasing.some((role) => roles.includes(role))) return [];
	return standing.gates.flatMap(({ gate, why }) =>
		why.flatMap((cause) =>
			cause.kind === 'refusal' && !cause.answered
				? [
						{
							id: `refusal ${gate}`,
							mark: 'refused' as const,
							title: say('today.answer', { gate }),
							said: cause.reason,
							when: '',
							to: { gate },
						},
					]
				: [],
		),
	);
}

function lapses({ standing, procedure }: OpenRecord, say: Say): readonly Waiting[] {
	const { steps, earliestFinishMinutes } = standing.reproof;
	const [first] = steps;
	if (first === undefined) return [];
	const title = procedure.steps.find(({ id }) => id === first)?.title ?? '';
	return [
		{
			id: 'lapsed',
			mark: 'lapsed',
			title: say('today.lapsed', { n: steps.length }),
			said: say('today.begin with', { step: `${first} ${title}` }),
			when: say('today.about', { time: duration(earliestFinishMinutes * MINUTE) }),
			to: { place: 'lapsed' },
		},
	];
}

function nextStep(told: OpenRecord, roles: readonly string[], say: Say, moments: Moments): readonly Waiting[] {
	const blocks = whatBlocks(told);
	if (blocks?.kind !== 'step' || blocks.state === 'lapsed') return [];
	const { step, state } = blocks;
	if (step.roles !== undefined && !step.roles.some((role) => roles.includes(role))) return [];
	const { title, said } = saidBlocking(blocks, told, say, moments);
	return [
		{
			id: `step ${step.id}`,
			mark: state === 'failed' ? 'blocks' : 'next',
			title,
			said,
			when: say('today.about', { time: duration(step.minutes * MINUTE) }),
			to: { step: step.id },
		},
	];
}

function deviations(told: OpenRecord, person: string, say: Say, moments: Moments): readonly Waiting[] {
	return told.standing.deviations
		.filter(({ state }) => state === 'open')
		.flatMap(({ deviation, blocks }): readonly Waiting[] => {
			const raised = told.events.find(
				(event) => event.kind === 'deviation raised' && event.body.deviation === deviation,
			);
			if (raised?.kind !== 'deviation raised' || (raised.body.owner ?? raised.person) !== person) return [];
			const { title, due } = raised.body;
			const what =
				typeof blocks === 'number' ? say('today.blocks gate', { gate: blocks }) : say(`today.blocks.${blocks}`);
			return [
				{
					id: deviation,
					mark: 'blocks',
					title: say('today.deviation', { deviation }),
					said: `${title}. ${what}`,
					when: due === undefined ? '' : say('today.due', { at: moments.short(due) }),
					to: { place: 'deviations' },
				},
			];
		});
}

export type RunsOut = {
	readonly id: string;
	readonly title: string;
	readonly said: string;
	readonly when: string;
	readonly left: number;
	readonly step?: string;
	/** Sorts what runs out of several start-ups into one list. */
	readonly end: number;
};

/** What stands in a start-up, but not for ever: proofs with an age, and certificates of its instruments. */
export function runsOut(told: OpenRecord, say: Say, moments: Moments): readonly RunsOut[] {
	if (told.standing.sealed !== undefined) return [];
	const now = millis(told.standing.at);
	const proofs = nextToLapse(told, say, moments).map((each) => ({ ...each, id: each.step }));
	const certificates = told.plant.instruments.flatMap(({ id, title, due }): readonly RunsOut[] => {
		const end = calibrationEnds(due, told.plant);
		if (end - now >= WARNED * DAY) return [];
		const days = Math.max(0, Math.ceil((end - now) / DAY));
		return [
			{
				id,
				title: say('today.calibration', { instrument: id }),
				said: title,
				when: end <= now ? say('today.ended', { day: due }) : say('today.in days', { n: days }),
				left: Math.max(0, (end - now) / (WARNED * DAY)),
				end,
			},
		];
	});
	return [...proofs, ...certificates].sort((a, b) => a.end - b.end);
}

const DAY = 24 * 60 * MINUTE;
/** Days before the end of a certificate from which it is spoken of. */
const WARNED = 30;
