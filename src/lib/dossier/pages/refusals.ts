import { allOf, type RecordEvent } from '../../record';
import { STYLES, type Flow } from '../layout/flow';
import { table, type Row } from '../layout/table';
import type { Story } from '../story/story';

/** What was refused: by people at a hold point, by the rules, by a calculation. Nothing of it is left out. */
export function refusals(flow: Flow, story: Story): void {
	const { say } = story;
	flow.newSheet(say('refusals.sheet'));
	flow.head(say('refusals.caption'), say('refusals.sheet'));
	refusalsAndAnswers(flow, story);
	refusedActs(flow, story);
	tries(flow, story);
	withoutEffect(flow, story);
	withdrawals(flow, story);
}

function refusalsAndAnswers(flow: Flow, { events, say, moments, names }: Story): void {
	flow.heading(say('refusals.title'), { with: 50 });
	const refused = allOf(events, 'gate refused');
	if (refused.length === 0) return flow.write(say('refusals.none'), STYLES.body);
	const answers = allOf(events, 'refusal answered');
	const when = (event: RecordEvent): string =>
		`${moments.short(event.observed ?? event.entered)}, ${names.person(event.person)}, ${event.device}`;
	table(
		flow,
		[
			{ head: say('hold.gate'), width: 34, voice: 'strong' },
			{ head: say('refusals.reason') },
			{ head: say('refusals.by'), width: 108 },
			{ head: say('refusals.answer'), width: 160 },
		],
		refused.map((event) => {
			const answer = answers.find(({ body, observedAt }) =>
				body.refusal === undefined
					? body.gate === event.body.gate && observedAt >= event.observedAt
					: body.refusal === event.id,
			);
			const asks = event.body.names ?? [];
			return {
				cells: [
					String(event.body.gate),
					event.body.reason,
					when(event),
					answer === undefined ? say('refusals.no answer') : `${answer.body.words} (${when(answer)})`,
				],
				...(asks.length === 0 ? {} : { notes: [say('refusals.must change', { names: asks.join(', ') })] }),
			};
		}),
	);
}

function refusedActs(flow: Flow, story: Story): void {
	const { events, say, moments, names } = story;
	flow.heading(say('refused.title'), { with: 50 });
	const acts = allOf(events, 'refused act');
	if (acts.length === 0) return flow.write(say('refused.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('refused.when'), width: 66 },
			{ head: say('refused.who'), width: 106 },
			{ head: say('refused.act'), width: 90 },
			{ head: say('refused.because') },
		],
		acts.map(({ body, person, device, entered }): Row => ({
			cells: [
				moments.short(entered),
				`${names.person(person)}, ${device}`,
				body.gate === undefined
					? say(`act.${body.act}`)
					: say('refused.of gate', { act: say(`act.${body.act}`), gate: body.gate }),
				body.because,
			],
			...(body.wayOut === undefined ? {} : { notes: [say('refused.way out', { wayOut: body.wayOut })] }),
		})),
	);
}

function tries(flow: Flow, { end, say, moments, names, events }: Story): void {
	flow.heading(say('tries.title'), { with: 50 });
	if (end.tries.length === 0) return flow.write(say('tries.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('entries.step'), width: 40, voice: 'strong' },
			{ head: say('entries.what') },
			{ head: say('refused.when'), width: 70 },
			{ head: say('refused.who'), width: 120 },
		],
		end.tries.map(({ step, event, observed }) => {
			const entry = events.find(({ id }) => id === event);
			return {
				cells: [
					step,
					names.stepTitle(step),
					moments.short(observed),
					entry === undefined ? '' : `${names.person(entry.person)}, ${entry.device}`,
				],
			};
		}),
	);
}

function withoutEffect(flow: Flow, { end, say, events, names, moments }: Story): void {
	if (end.withoutEffect.length === 0) return;
	flow.heading(say('without effect.title'), { with: 50 });
	table(
		flow,
		[
			{ head: say('refused.when'), width: 66 },
			{ head: say('refused.who'), width: 120 },
			{ head: say('refused.act'), width: 100 },
			{ head: say('refused.because') },
		],
		end.withoutEffect.map(({ event: id, because }) => {
			const event = events.find((each) => each.id === id);
			return {
				cells:
					event === undefined
						? ['', '', id, because]
						: [moments.short(event.entered), `${names.person(event.person)}, ${event.device}`, event.kind, because],
			};
		}),
	);
}

function withdrawals(flow: Flow, { events, say, names, moments }: Story): void {
	const told = [
		...allOf(events, 'entry withdrawn').map((event) => ({
			event,
			what: say('withdrawn.entry', { step: stepOf(events, event.body.entry) }),
		})),
		...allOf(events, 'plant event corrected').map((event) => ({ event, what: say('withdrawn.event') })),
	];
	if (told.length === 0) return;
	flow.heading(say('withdrawn.title'), { with: 50 });
	table(
		flow,
		[
			{ head: say('refused.when'), width: 66 },
			{ head: say('refused.who'), width: 120 },
			{ head: say('withdrawn.what'), width: 110 },
			{ head: say('withdrawn.reason') },
		],
		told.map(({ event, what }) => ({
			cells: [moments.short(event.entered), `${names.person(event.person)}, ${event.device}`, what, event.body.reason],
		})),
	);
}

const stepOf = (events: readonly RecordEvent[], entry: string): string =>
	allOf(events, 'entry').find(({ id }) => id === entry)?.body.step ?? '';
