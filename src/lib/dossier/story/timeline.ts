import type { Span, Timeline } from '../../drawing';
import { allOf, millis, printInstant, standing, type RecordEvent, type Standing } from '../../record';
import type { Story } from './story';

/** The whole start-up as spans and moments. A release lasts until what broke it happened, however late that was typed. */
export function timelineOf(story: Story): Timeline {
	const { events, end, input, opened, sealed, say, names, moments } = story;
	const from = millis(opened.entered);
	const to = millis(sealed.entered);
	const samples = changes(story).map((at) => ({
		at,
		states: standing(input.procedure, events, story.site, instant(at)).gates,
	}));
	const entries = allOf(events, 'entry');
	return {
		from,
		to,
		utcOffsetMinutes: input.plant.utcOffsetMinutes,
		gates: input.procedure.gates.map(({ number: gate }) => {
			const under = new Set(input.procedure.steps.filter((step) => step.gate === gate).map(({ id }) => id));
			const proofs = entries.filter(({ body }) => under.has(body.step)).map(({ observedAt }) => observedAt);
			return {
				name: String(gate),
				begins: proofs.length === 0 ? undefined : Math.min(...proofs),
				released: releasedSpans(gate, samples, to),
				proofs,
			};
		}),
		events: end.plantEvents
			.filter(({ withdrawn }) => withdrawn !== true)
			.map((event) => ({ from: millis(event.begin), to: event.end === null ? to : millis(event.end) })),
		gaps: end.watchGaps.map((gap) => ({ from: millis(gap.from), to: gap.to === null ? to : millis(gap.to) })),
		notes: [
			...story.acts.map(({ event, judged }) => ({
				at: event.observedAt,
				text: say(event.kind === 'gate released' ? 'timeline.released' : 'timeline.refused', {
					at: moments.clock(event.observed ?? event.entered),
					gate: event.body.gate,
					person: names.person(event.person),
				}),
				...(judged?.counted === false
					? { tone: 'soft' as const }
					: event.kind === 'gate released'
						? { tone: 'ok' as const, mark: 'stands' as const }
						: { tone: 'bad' as const, mark: 'failed' as const }),
			})),
			...end.plantEvents.map(({ what, item, begin, end: until }) => ({
				at: millis(begin),
				text: say(until === null ? 'timeline.event goes on' : 'timeline.event', {
					what: [names.plantEvent(what), ...(item === undefined ? [] : [item])].join(' '),
					begin: moments.clock(begin),
					end: until === null ? '' : moments.clock(until),
				}),
				tone: 'warn' as const,
				mark: 'lapsed' as const,
			})),
			...end.watchGaps.map((gap) => ({
				at: millis(gap.from),
				text: say('timeline.gap', {
					step: gap.step,
					from: moments.clock(gap.from),
					to: gap.to === null ? '' : moments.clock(gap.to),
				}),
				tone: 'warn' as const,
			})),
			...allOf(story.site, 'instrument finding').map((event) => ({
				at: event.observedAt,
				text: say('timeline.finding', {
					at: moments.clock(event.observed ?? event.entered),
					instrument: event.body.instrument,
				}),
				tone: 'warn' as const,
				mark: 'warning' as const,
			})),
			...allOf(events, 'deviation raised').map((event) => ({
				at: event.observedAt,
				text: say('timeline.deviation', {
					at: moments.clock(event.observed ?? event.entered),
					deviation: event.body.deviation,
				}),
				tone: 'bad' as const,
			})),
			...allOf(events, 'shift hand-over').map((event) => ({
				at: event.observedAt,
				text: say('timeline.hand-over', { at: moments.clock(event.observed ?? event.entered) }),
				tone: 'soft' as const,
			})),
			{
				at: to,
				text: say('timeline.sealed', { at: moments.clock(sealed.entered), person: names.person(sealed.person) }),
				tone: 'ink' as const,
			},
		],
	};
}

const instant = (at: number): string => printInstant(at, 0);

/** Moments at which a gate may have changed its state, as it was recorded then: proofs in their time change none that was released. */
function changes({ events, site, end, sealed }: Story): readonly number[] {
	const moments = [...events, ...site].filter(mayChangeGates).map(({ enteredAt }) => enteredAt);
	const gaps = end.watchGaps.flatMap(({ from, to }) => [millis(from), ...(to === null ? [] : [millis(to)])]);
	return [...new Set([...moments, ...gaps, millis(sealed.entered)])].sort((a, b) => a - b);
}

function mayChangeGates(event: RecordEvent): boolean {
	switch (event.kind) {
		case 'entry':
			return event.body.outcome !== 'pass' || event.observedAt !== event.enteredAt;
		case 'gate released':
		case 'gate refused':
		case 'refusal answered':
		case 'entry withdrawn':
		case 'plant event begun':
		case 'plant event ended':
		case 'plant event corrected':
		case 'deviation raised':
		case 'deviation dispositioned':
		case 'shift hand-over':
		case 'copy received':
		case 'clock noted':
		case 'instrument finding':
		case 'plant described':
			return true;
		default:
			return false;
	}
}

type Sample = { readonly at: number; readonly states: Standing['gates'] };

function releasedSpans(gate: number, samples: readonly Sample[], end: number): readonly Span[] {
	const spans: Span[] = [];
	let since: number | undefined;
	for (const { at, states } of samples) {
		const state = states.find((each) => each.gate === gate);
		if (state?.state === 'released') {
			since ??=
				state.releasedAt === undefined || spans.some(({ to }) => to > millis(state.releasedAt ?? ''))
					? at
					: millis(state.releasedAt);
			continue;
		}
		if (since === undefined) continue;
		spans.push({ from: since, to: Math.max(since, Math.min(at, brokenAt(gate, states) ?? at)) });
		since = undefined;
	}
	return since === undefined ? spans : [...spans, { from: since, to: end }];
}

/** When what broke the gate, or the one below it, happened. */
function brokenAt(gate: number, states: Standing['gates']): number | undefined {
	const own = states.find((each) => each.gate === gate);
	for (const why of own?.why ?? []) {
		if (why.kind === 'needs release again') return millis(why.since);
		if (why.kind === 'lower gate') return brokenAt(why.gate, states);
	}
	return undefined;
}
