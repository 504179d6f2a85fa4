import type { Verdict } from '../../calc';
import { allOf, type BodyOf, type Cause, type EventOf, type StepStanding } from '../../record';
import { sayCause } from '../../wording';
import { boundsOf, printBounds, printReading } from './print';
import { rejudged } from './rejudged';
import { shownState } from './state-words';
import type { Act, Story } from './story';
import type { Mark } from '../../drawing';

export type ActLine = {
	readonly step: string;
	readonly title: string;
	/** What the proof said when the act was signed: its values, as far as they can be named in a line. */
	readonly evidence: string;
	readonly asKnown: { readonly text: string; readonly mark: Mark };
	readonly asSealed: { readonly text: string; readonly mark: Mark };
	/** What was learned afterwards about this proof. */
	readonly learned: readonly string[];
};

/** Under a gate act, step by step: what stood as known when it was signed, and what is known at the seal of that moment. */
export function linesOf(act: Act, story: Story): readonly ActLine[] {
	const { input, say } = story;
	const gate = act.event.body.gate;
	const listed = new Set(act.event.body.statement?.list.map(({ step }) => step) ?? []);
	const steps = input.procedure.steps.filter((step) => step.gate === gate || listed.has(step.id));
	return steps.map(({ id, title }) => {
		const then = act.asKnown.steps.find(({ step }) => step === id);
		const fell = act.judged?.didNotStand.find(({ step }) => step === id);
		return {
			step: id,
			title,
			evidence: evidenceOf(act, id, then, story),
			asKnown: shownState(then, story),
			asSealed:
				fell === undefined ? shownState(then, story) : { text: say('gate.did not stand'), mark: 'lapsed' as const },
			learned: fell === undefined ? [] : learnedOf(fell.why, then?.entry, story),
		};
	});
}

/** What the proof said, with which instrument, by whom and when: as it was signed, or put together from its entry. */
function evidenceOf(act: Act, step: string, then: StepStanding | undefined, story: Story): string {
	const entry = allOf(story.events, 'entry').find(({ id }) => id === then?.entry);
	const signed = act.event.body.statement?.list.find((line) => line.step === step);
	const said = signed?.value === undefined ? (entry === undefined ? [] : foundIn(entry, story)) : asSigned(signed);
	const by =
		entry === undefined
			? []
			: [`${story.names.person(entry.person)}, ${story.moments.short(entry.observed ?? entry.entered)}`];
	return [...said, ...by].filter((line) => line !== '').join('\n');
}

type SignedLine = NonNullable<Act['event']['body']['statement']>['list'][number];

function asSigned({ value = '', limit, guard, instruments = [] }: SignedLine): readonly string[] {
	const others = instruments.filter((id) => !value.includes(id));
	return [value, others.join(', '), [limit, guard].filter((part) => part !== undefined && part !== '').join(', ')];
}

function foundIn({ body }: EventOf<'entry'>, story: Story): readonly string[] {
	const step = story.names.step(body.step);
	const fields = step !== undefined && 'fields' in step ? (step.fields ?? []) : [];
	const values = (body.values ?? []).map((reading) => {
		const field = fields.find(({ id, point }) =>
			reading.field === undefined ? point === reading.point : id === reading.field,
		);
		const bounds = boundsOf(field?.limit, story.input);
		const instrument = reading.instrument ?? reading.point ?? field?.point ?? '';
		return {
			text: [instrument, printReading(reading, story)].filter((part) => part !== '').join('\u00a0'),
			limit: bounds === undefined ? '' : printBounds(bounds, story),
		};
	});
	const limits = [...new Set(values.map(({ limit }) => limit).filter((limit) => limit !== ''))];
	const rows = body.rows ?? [];
	const calculation = verdictOf(body.calculation);
	return [
		...values.map(({ text }) => text),
		...limits,
		...(rows.length === 0
			? []
			: [story.say('gate.rows', { good: rows.filter(({ passes }) => passes).length, all: rows.length })]),
		...(calculation === undefined ? [] : [story.say(`verdict.${calculation}`)]),
		...withInstruments(body.instruments ?? step?.instruments ?? [], values, story),
	];
}

/** Instruments that the values do not already name. */
function withInstruments(
	ids: readonly string[],
	values: readonly { readonly text: string }[],
	{ say }: Story,
): readonly string[] {
	const others = ids.filter((id) => !values.some(({ text }) => text.startsWith(id)));
	return others.length === 0 ? [] : [say('gate.with', { instruments: others.join(', ') })];
}

const verdictOf = (calculation: BodyOf<'entry'>['calculation']): Verdict['word'] | undefined => {
	const word = (calculation?.verdict as { readonly word?: unknown } | undefined)?.word;
	return word === 'adequate' || word === 'not yet' || word === 'cannot be shown' ? word : undefined;
};

function learnedOf(why: readonly Cause[], entry: string | undefined, story: Story): readonly string[] {
	return why.flatMap((cause) => [
		sayCause(cause, story.say, story.moments, story.names),
		...(cause.kind === 'instrument finding' && entry !== undefined ? rejudged(entry, cause, story) : []),
	]);
}
