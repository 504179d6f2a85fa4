import { allOf, type Cause, type StepStanding } from '../../record';
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

/** The list that was signed says it in its own words; else it is put together from the entry that counted then. */
function evidenceOf(act: Act, step: string, then: StepStanding | undefined, story: Story): string {
	const signed = act.event.body.statement?.list.find((line) => line.step === step);
	if (signed?.value !== undefined) {
		return [signed.value, signed.limit, ...(signed.instruments === undefined ? [] : [signed.instruments.join(', ')])]
			.filter((part) => part !== undefined && part !== '')
			.join('; ');
	}
	const entry = allOf(story.events, 'entry').find(({ id }) => id === then?.entry);
	if (entry === undefined) return '';
	const procedure = story.names.step(step);
	const fields = procedure !== undefined && 'fields' in procedure ? (procedure.fields ?? []) : [];
	const values = (entry.body.values ?? []).map((reading) => {
		const field = fields.find(({ id, point }) =>
			reading.field === undefined ? point === reading.point : id === reading.field,
		);
		const bounds = boundsOf(field?.limit, story.input);
		const instrument = reading.instrument ?? reading.point ?? field?.point ?? '';
		return {
			text: [instrument, printReading(reading, story)].filter((part) => part !== '').join(' '),
			limit: bounds === undefined ? '' : printBounds(bounds, story),
		};
	});
	const limits = [...new Set(values.map(({ limit }) => limit).filter((limit) => limit !== ''))];
	const rows = entry.body.rows ?? [];
	return [
		...values.map(({ text }) => text),
		...(rows.length === 0
			? []
			: [story.say('gate.rows', { good: rows.filter(({ passes }) => passes).length, all: rows.length })]),
		...limits,
	].join('; ');
}

function learnedOf(why: readonly Cause[], entry: string | undefined, story: Story): readonly string[] {
	return why.flatMap((cause) => [
		sayCause(cause, story.say, story.moments, story.names),
		...(cause.kind === 'instrument finding' && entry !== undefined ? rejudged(entry, cause, story) : []),
	]);
}
