import { fail, ok, type Result } from '../../base';
import {
	allOf,
	inOrder,
	Knowledge,
	millis,
	parseEventLine,
	standing,
	type EventOf,
	type RecordEvent,
	type Standing,
} from '../../record';
import { momentsAt, speaker, type Moments, type Say } from '../../wording';
import type { DossierError, DossierInput } from '../input';
import { namesOf, type StoryNames } from './names';

/** A start-up as it is told: its events, what stands by them at the seal, and the words and names to tell it in. */
export type Story = {
	readonly input: DossierInput;
	/** The start-up's log, in the order of the record. */
	readonly events: readonly RecordEvent[];
	readonly site: readonly RecordEvent[];
	readonly opened: EventOf<'start-up opened'>;
	readonly sealed: EventOf<'sealed'>;
	/** What stands at the seal, by everything that is known. */
	readonly end: Standing;
	readonly acts: readonly Act[];
	readonly say: Say;
	readonly moments: Moments;
	readonly names: StoryNames;
};

/** A gate act with what its tablet knew when it was signed. */
export type Act = {
	readonly event: EventOf<'gate released'> | EventOf<'gate refused'>;
	readonly judged: Standing['acts'][number] | undefined;
	readonly asKnown: Standing;
	/** What had happened by then and had not reached the tablet. */
	readonly unknown: readonly RecordEvent[];
};

export function storyOf(input: DossierInput): Result<Story, DossierError> {
	const startUp = readLines(input.lines, 'start-up');
	const site = readLines(input.siteLines, 'site');
	if (!startUp.ok) return startUp;
	if (!site.ok) return site;
	const openings = allOf(startUp.value, 'start-up opened');
	const [opened] = openings;
	if (opened === undefined || openings.length > 1) return fail({ kind: 'not-one-opening', found: openings.length });
	const [sealed] = allOf(startUp.value, 'sealed');
	if (sealed === undefined) return fail({ kind: 'not-sealed' });
	if (input.signatures.length === 0) return fail({ kind: 'no-signature-asked-for' });
	const end = standing(input.procedure, startUp.value, site.value, sealed.entered);
	// Later events are left out of the answer by its instant, so they are looked for by the seal itself.
	const inside = new Set(new Knowledge(startUp.value).past(sealed)).add(sealed.id);
	// A tablet countersigns the head that the seal names, and so after it.
	const after = startUp.value.filter(({ id, kind }) => !inside.has(id) && kind !== 'chain head').map(({ id }) => id);
	if (after.length > 0) return fail({ kind: 'after-the-seal', events: after });
	const say = speaker(input.language);
	return ok({
		input,
		events: startUp.value,
		site: site.value,
		opened,
		sealed,
		end,
		acts: actsOf(input, startUp.value, site.value, end),
		say,
		moments: momentsAt(input.plant.utcOffsetMinutes, say),
		names: namesOf(input, opened, site.value),
	});
}

function readLines(lines: readonly string[], log: 'start-up' | 'site'): Result<readonly RecordEvent[], DossierError> {
	const events: RecordEvent[] = [];
	for (const [i, line] of lines.entries()) {
		const event = parseEventLine(line, i + 1);
		if (!event.ok) return fail({ ...event.error, log });
		events.push(event.value);
	}
	return ok(events.sort(inOrder));
}

/** Each act beside the world as its tablet knew it, worked out anew from the record. */
function actsOf(
	{ procedure }: DossierInput,
	events: readonly RecordEvent[],
	site: readonly RecordEvent[],
	end: Standing,
): readonly Act[] {
	const knowledge = new Knowledge([...events, ...site]);
	const acts = [...allOf(events, 'gate released'), ...allOf(events, 'gate refused')].sort(
		(a, b) => a.enteredAt - b.enteredAt || inOrder(a, b),
	);
	return acts.map((event) => {
		const past = knowledge.past(event);
		const known = events.filter(({ id }) => past.has(id));
		const siteThen = site.filter(({ enteredAt }) => enteredAt <= event.enteredAt);
		return {
			event,
			judged: end.acts.find((act) => act.event === event.id),
			asKnown: standing(procedure, known, siteThen, event.entered),
			unknown: events.filter(
				(other) => !past.has(other.id) && other.id !== event.id && happenedBy(other, event.enteredAt),
			),
		};
	});
}

/** Facts that bear on a gate; what tablets say about themselves does not. */
function happenedBy(event: RecordEvent, at: number): boolean {
	switch (event.kind) {
		case 'plant event begun':
			return millis(event.body.begin) <= at;
		case 'entry':
			return event.observedAt <= at && event.body.outcome !== 'pass';
		default:
			return false;
	}
}
