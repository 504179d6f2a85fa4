import { fail, ok, type Result } from '../base';
import { allOf, impactOf, standingWith, type BodyOf, type Impact } from '../record';
import type { TemporaryState } from '../wording';
import { beginShiftWith, signHead } from './gate-acts';
import type { OpenStartUp } from './open-start-up.svelte';
import type { Problem } from './problem';

/** Of whom the PIN was wrong, or what else stood in the way. Nothing was signed by anybody. */
export type HandOverProblem = { readonly whose?: 'goes' | 'comes'; readonly problem: Problem };

export type HandOver = {
	/** Who comes and signs; who goes is who holds the tablet. */
	readonly comes: string;
	readonly from: readonly string[];
	readonly to: readonly string[];
	readonly confirmed: boolean;
	readonly summary: string;
	readonly pins: { readonly goes: string; readonly comes: string };
};

/** What is only so for a while, as the record has it: the site's list, and what the steps say that a hand-over puts in doubt. */
export function temporaryStates({ procedure, standing, events, siteLog }: OpenStartUp): readonly TemporaryState[] {
	const listed = new Map(allOf(siteLog, 'temporary state').map(({ body }) => [body.state, body]));
	const onSite = [...listed.values()].filter(({ ended }) => ended !== true);
	const inSteps = procedure.steps
		.filter(({ lapsedBy }) => lapsedBy.some((by) => (typeof by === 'string' ? by : by.event) === UNCONFIRMED))
		.flatMap((step): readonly TemporaryState[] => {
			const id = standing.steps.find((one) => one.step === step.id)?.entry;
			const entry = allOf(events, 'entry').find((one) => one.id === id);
			if (entry === undefined) return [];
			const { choice, note } = entry.body;
			const chosen = step.kind === 'choice' ? step.options.find((option) => option.id === choice)?.title : undefined;
			const text = [`${step.id} ${step.title}`, chosen, note].filter((part) => part !== undefined).join(': ');
			return [{ id: step.id, text: text.replace(/\.$/, '') }];
		});
	return [
		...inSteps,
		...onSite.map(({ state, owner, until }) => ({ id: state, text: [state, owner, until].filter(Boolean).join(', ') })),
	];
}

const UNCONFIRMED = 'hand-over-unconfirmed';

/** What lapses when the temporary states are not confirmed (ST11). */
export function unconfirmedImpact(startUp: OpenStartUp): Impact {
	const { procedure, standing, events, siteLog, tablet } = startUp;
	const holder = tablet.person?.person ?? '';
	const body = { from: [holder], to: [holder], temporaryStatesConfirmed: false };
	const draft = startUp.draft('shift hand-over', body);
	return impactOf(standing, draft.ok ? standingWith(procedure, draft.value, events, siteLog) : standing);
}

/**
 * Both sign the same words, each with the own gate key. Both PINs are tried before anything is written. The shift of those who
 * go ends on this tablet, the shift of who comes begins, and the tablet is theirs.
 */
export async function handOverShift(startUp: OpenStartUp, how: HandOver): Promise<Result<'signed', HandOverProblem>> {
	const { tablet } = startUp;
	const goes = tablet.person?.person;
	if (goes === undefined) return fail({ problem: { kind: 'nobody-chosen' } });
	const flushed = await startUp.keepHeld();
	if (!flushed.ok) return fail({ problem: flushed.error });
	const out = await tablet.openKey(goes, how.pins.goes);
	if (!out.ok) return fail({ whose: 'goes', problem: out.error });
	const coming = await tablet.openKey(how.comes, how.pins.comes);
	if (!coming.ok) return fail({ whose: 'comes', problem: coming.error });
	const body: BodyOf<'shift hand-over'> = {
		from: [...how.from],
		to: [...how.to],
		temporaryStatesConfirmed: how.confirmed,
		summary: how.summary,
	};
	const head = await signHead(startUp, 'hand-over', out.value);
	if (!head.ok) return fail({ problem: head.error });
	const given = await startUp.write('shift hand-over', body, { key: out.value });
	if (!given.ok) return fail({ problem: given.error });
	await tablet.choose(how.comes);
	const taken = await startUp.write('shift hand-over', body, { key: coming.value });
	if (!taken.ok) return fail({ problem: taken.error });
	const begun = await beginShiftWith(startUp, coming.value);
	if (!begun.ok) return fail({ problem: begun.error });
	for (const person of how.from) await tablet.shifts.end(person, startUp.id);
	return ok('signed');
}
