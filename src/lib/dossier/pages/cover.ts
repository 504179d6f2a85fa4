import { ladder, lettering, rectangle, segment, stroke, type Shape } from '../../drawing';
import { allOf } from '../../record';
import { counted } from '../../wording';
import { measure } from '../fonts/faces';
import { AREA } from '../layout/sheet';
import { STYLES, type Flow } from '../layout/flow';
import { wrap } from '../layout/wrap';
import { releasesOf } from '../story/releases';
import { processResult } from '../story/process-result';
import type { Story } from '../story/story';

/** The page for the judge: what was started, when, released by whom; then three answers that are never one. */
export function cover(flow: Flow, story: Story): void {
	const { say, end, input, opened, moments } = story;
	flow.newSheet(say('cover.sheet'));
	const demo =
		input.plant.demonstration || opened.body.demonstration === true || input.procedure.demonstration === true;
	if (demo) flow.draw(...demonstration(say('cover.demonstration')));
	flow.head(say('cover.caption'), titleOf(story), AREA.width - (demo ? 120 : 0));
	flow.write(lead(story), STYLES.lead);
	flow.space(7);
	const captions = new Map(releasesOf(story).map(({ gate, caption }) => [gate, caption]));
	const drawn = ladder(input.procedure, end, { width: 700, rungHeight: 60, captions, measure });
	flow.figure(drawn, AREA.width - 6);
	flow.space(9);
	const { result, because } = processResult(story);
	const rows = [
		{ label: say('cover.integrity'), lines: [say('cover.integrity.text', { signatures: input.signatures.length })] },
		{ label: say('cover.rules'), strong: say(`process.${result}`), lines: [...because, countsLine(story)] },
		{ label: say('cover.not shown'), lines: [say('cover.not shown.text')] },
	];
	for (const row of rows) answer(flow, row);
	flow.space(4);
	flow.write(
		say('cover.opened', { at: moments.full(opened.entered), person: story.names.person(opened.person) }),
		STYLES.note,
	);
}

export const titleOf = ({ opened, input }: Story): string =>
	opened.body.title ?? `${input.procedure.title}, ${input.plant.title}`;

function lead(story: Story): string {
	const { say, end, moments, input } = story;
	const releases = releasesOf(story).filter(({ at }) => at !== undefined);
	const [first, last] = [releases[0], releases.at(-1)];
	const proved = end.steps.filter(({ state }) => state === 'stands').length;
	const again = provedAgain(story);
	const sentences = [
		first?.at === undefined || last?.at === undefined
			? say('cover.no gate released')
			: say('cover.gates released', {
					gates: say('cover.gates of', {
						released: end.gates.filter(({ state }) => state === 'released').length,
						all: end.gates.length,
					}),
					from: withoutOffset(moments.full(first.at)),
					to: withoutOffset(moments.full(last.at)),
				}),
		say('cover.steps', {
			proved: counted(say, 'count.step proved', 'count.steps proved', proved),
			again: counted(say, 'count.again', 'count.again', again),
			deviations: counted(say, 'count.deviation', 'count.deviations', end.deviations.length),
		}),
		say('cover.start type', {
			type: startType(story),
			inert: input.plant.inertSources.map(({ title }) => title).join(', '),
		}),
		say('cover.data'),
	];
	return sentences.join(' ');
}

const withoutOffset = (moment: string): string => moment.replace(/ [+-]\d\d:\d\d$/, '');

function startType({ end, input }: Story): string {
	return input.procedure.startTypes.find(({ id }) => id === end.startType)?.title ?? end.startType ?? '';
}

/** Steps that were proved, lost, and proved once more. */
function provedAgain({ events, input }: Story): number {
	const passes = allOf(events, 'entry').filter(({ body }) => body.outcome === 'pass');
	return input.procedure.steps.filter(
		({ id, validity }) => validity.kind !== 'watch' && passes.filter(({ body }) => body.step === id).length > 1,
	).length;
}

/** The counts that a judge asks for, with the zeros: what did not happen is said too. */
function countsLine(story: Story): string {
	const { end, events, say, acts, sealed } = story;
	const counts = [
		['count.lapse', 'count.lapses', acts.filter(({ judged }) => (judged?.didNotStand.length ?? 0) > 0).length],
		['count.plant event', 'count.plant events', end.plantEvents.length],
		['count.watch gap', 'count.watch gaps', end.watchGaps.length],
		['count.late fact', 'count.late facts', end.late.length],
		['count.refusal', 'count.refusals', allOf(events, 'gate refused').length],
		['count.refused act', 'count.refused acts', end.refusedActs.length],
		['count.try', 'count.tries', end.tries.length],
		['count.voice act', 'count.voice acts', allOf(events, 'gate released by voice').length],
		['count.paper act', 'count.paper acts', allOf(events, 'gate released on paper').length],
		['count.lost device', 'count.lost devices', sealed.body.lost?.length ?? 0],
	] as const;
	return `${counts.map(([one, other, n]) => counted(say, one, other, n)).join(', ')}.`;
}

function demonstration(word: string): readonly Shape[] {
	const width = measure(word, 'strong', 9.2) + 14;
	const box = { x: AREA.x + AREA.width - width, y: AREA.y + 2, width, height: 18 };
	return [
		stroke(rectangle(box), { pen: 'line' }),
		lettering(word, { x: box.x + 7, y: box.y + 12.4 }, { size: 9.2, voice: 'strong' }),
	];
}

type Answer = { readonly label: string; readonly strong?: string; readonly lines: readonly string[] };

/** One of the three answers: its name in the margin, the answer beside it, a rule above. */
function answer(flow: Flow, { label, strong, lines }: Answer): void {
	const left = 128;
	const width = AREA.width - left;
	const set = lines.flatMap((line) => wrap(line, width, STYLES.body));
	const head = strong === undefined ? 0 : 14;
	const height = 10 + head + set.length * STYLES.body.lead;
	flow.block(height, ({ x, y }) => [
		stroke(segment(x, y, x + AREA.width, y), { pen: 'line' }),
		...wrap(label, left - 8, STYLES.subheading).map((line, i) =>
			lettering(line, { x, y: y + 14 + i * 12.5 }, { size: 9.8, voice: 'title' }),
		),
		...(strong === undefined ? [] : [lettering(strong, { x: x + left, y: y + 14 }, { size: 10.8, voice: 'title' })]),
		...set.map((line, i) =>
			lettering(line, { x: x + left, y: y + 14 + head + i * STYLES.body.lead }, { size: STYLES.body.size }),
		),
	]);
}
