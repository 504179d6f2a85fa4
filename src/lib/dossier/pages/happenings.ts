import { allOf, millis } from '../../record';
import { duration } from '../../wording';
import { STYLES, type Flow } from '../layout/flow';
import { table } from '../layout/table';
import { lapsedBy } from '../story/lapsed-by';
import type { Story } from '../story/story';

/** What happened to the plant, what it took away and when that came back; gaps in the watch; deviations. */
export function happenings(flow: Flow, story: Story): void {
	const { say } = story;
	flow.newSheet(say('happenings.sheet'));
	flow.head(say('happenings.caption'), say('happenings.sheet'));
	plantEvents(flow, story);
	facts(flow, story);
	watchGaps(flow, story);
	deviations(flow, story);
}

function plantEvents(flow: Flow, story: Story): void {
	const { say, end, names, moments, events } = story;
	flow.heading(say('events.title'), { with: 50 });
	if (end.plantEvents.length === 0) return flow.write(say('events.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('events.what') },
			{ head: say('events.when'), width: 92 },
			{ head: say('events.entered'), width: 108 },
			{ head: say('events.lapsed'), width: 150 },
		],
		end.plantEvents.map((event) => {
			const told = events.find(({ id }) => id === event.event);
			const lapsed = lapsedBy(event, story);
			const what = [names.plantEvent(event.what), ...(event.item === undefined ? [] : [event.item])].join(' ');
			const late = event.late
				? [say('entries.late', { minutes: Math.round((millis(event.entered) - millis(event.begin)) / 60_000) })]
				: [];
			const received =
				told?.received === undefined ? [] : [say('events.received', { at: moments.short(told.received) })];
			return {
				...(event.withdrawn === true ? { superseded: true as const } : {}),
				cells: [
					{ text: event.withdrawn === true ? say('events.withdrawn', { what }) : what, voice: 'strong' as const },
					event.end === null
						? say('events.goes on', { begin: moments.short(event.begin) })
						: say('events.interval', {
								begin: moments.short(event.begin),
								end: moments.clock(event.end),
								length: duration(millis(event.end) - millis(event.begin)),
							}),
					[
						told === undefined
							? ''
							: say('entries.by', {
									person: names.person(told.person),
									device: told.device,
									entered: moments.short(event.entered),
								}),
						...late,
						...received,
					].join('; '),
					lapsed
						.map(({ step, again }) =>
							again === undefined ? say('events.not again', { step }) : say('events.again', { step, at: again }),
						)
						.join('; '),
				],
			};
		}),
	);
	flow.write(say('events.note'), STYLES.note);
}

function facts(flow: Flow, { events, say, moments, names }: Story): void {
	const told = allOf(events, 'fact');
	if (told.length === 0) return;
	flow.heading(say('facts.title'), { with: 50 });
	table(
		flow,
		[
			{ head: say('facts.what') },
			{ head: say('events.when'), width: 110 },
			{ head: say('events.entered'), width: 150 },
		],
		told.map(({ body, person, device, entered }) => ({
			cells: [
				body.what,
				[
					...(body.begin === undefined ? [] : [moments.short(body.begin)]),
					...(body.end === undefined ? [] : [moments.clock(body.end)]),
				].join(' – '),
				say('entries.by', { person: names.person(person), device, entered: moments.short(entered) }),
			],
		})),
	);
}

function watchGaps(flow: Flow, { end, say, moments, names }: Story): void {
	flow.heading(say('gaps.title'), { with: 50 });
	if (end.watchGaps.length === 0) return flow.write(say('gaps.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('entries.step'), width: 40, voice: 'strong' },
			{ head: say('gaps.watch') },
			{ head: say('gaps.from'), width: 80 },
			{ head: say('gaps.to'), width: 80 },
		],
		end.watchGaps.map(({ step, from, to }) => ({
			cells: [step, names.stepTitle(step), moments.short(from), to === null ? say('gaps.open') : moments.short(to)],
		})),
	);
}

function deviations(flow: Flow, story: Story): void {
	const { events, end, say, moments, names } = story;
	const raised = allOf(events, 'deviation raised');
	flow.heading(say('deviations.title'), { with: 50 });
	if (raised.length === 0) return flow.write(say('deviations.none'), STYLES.body);
	table(
		flow,
		[
			{ head: say('deviations.no'), width: 40, voice: 'strong' },
			{ head: say('deviations.what') },
			{ head: say('deviations.blocks'), width: 60 },
			{ head: say('deviations.raised'), width: 104 },
			{ head: say('deviations.closed'), width: 116 },
		],
		raised.map(({ body, person, observed, entered }) => {
			const { deviation, title, blocks } = body;
			const closing = allOf(events, 'deviation dispositioned').find((event) => event.body.deviation === deviation);
			const progress = allOf(events, 'deviation progressed').filter((event) => event.body.deviation === deviation);
			const state = end.deviations.find((each) => each.deviation === deviation)?.state ?? 'open';
			return {
				cells: [
					deviation,
					title,
					typeof blocks === 'number' ? say('deviations.gate', { gate: blocks }) : say(`blocks.${blocks}`),
					`${moments.short(observed ?? entered)}, ${names.person(person)}`,
					closing === undefined
						? { text: say(`deviation.${state}`), mark: 'failed' as const }
						: [
								say(`disposition.${closing.body.disposition}`),
								moments.short(closing.observed ?? closing.entered),
								names.person(closing.person),
								closing.body.reason ?? '',
							]
								.filter((part) => part !== '')
								.join(', '),
				],
				notes: progress.map((event) => `${moments.short(event.entered)}: ${event.body.note}`),
			};
		}),
	);
}
