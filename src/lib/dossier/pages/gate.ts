import { coilShapes, lettering, segment, stroke, type Shape } from '../../drawing';
import { millis } from '../../record';
import { AREA } from '../layout/sheet';
import { facts } from '../layout/facts';
import { STYLES, type Flow } from '../layout/flow';
import { table } from '../layout/table';
import { wrap } from '../layout/wrap';
import { capitalised, sayWords } from '../../wording';
import { linesOf } from '../story/act-lines';
import { releasesOf } from '../story/releases';
import type { Act, Story } from '../story/story';
import { entriesOfGate } from './entries';
import { photosOfGate } from './photos';

/** One gate: every act at its hold point, with what stood then by two kinds of knowledge, and every entry under it. */
export function gatePages(flow: Flow, story: Story, gate: number): void {
	const { say, end, names } = story;
	const release = releasesOf(story).find((each) => each.gate === gate);
	const state = end.gates.find((each) => each.gate === gate)?.state ?? 'not ready';
	flow.newSheet(say('gate.sheet', { gate, title: names.gateTitle(gate) }));
	flow.draw(...coilShapes(state, { x: AREA.x + AREA.width - 16, y: AREA.y + 18 }, 14));
	flow.head(say('gate.caption', { gate, holdPoint: release?.holdPoint ?? '' }), names.gateTitle(gate), AREA.width - 50);
	const acts = story.acts.filter(({ event }) => event.body.gate === gate);
	if (acts.length === 0) flow.write(say('gate.no act'), STYLES.body);
	for (const act of acts) actOf(flow, story, act);
	entriesOfGate(flow, story, gate);
	photosOfGate(flow, story, gate);
}

function actOf(flow: Flow, story: Story, act: Act): void {
	const { say, names, moments } = story;
	const { event, judged } = act;
	const { statement } = event.body;
	const isRelease = event.kind === 'gate released';
	const at = event.observed ?? event.entered;
	flow.heading(
		say(isRelease ? 'gate.released by' : 'gate.refused by', {
			person: names.person(event.person),
			at: moments.short(at),
		}),
		{ with: 150 },
	);
	facts(flow, [
		{ label: say('gate.person'), value: names.person(event.person) },
		{ label: say('gate.role'), value: sayWords(names.roles(event.person), say) },
		{
			label: say('gate.meaning'),
			value: event.body.meaning ?? (isRelease ? say('gate.meaning.released') : say('gate.meaning.refused')),
		},
		{ label: say('gate.time'), value: moments.full(at) },
		{ label: say('gate.tablet'), value: event.device },
		{ label: say('gate.code'), value: statement?.code ?? '–', voice: statement === undefined ? 'strong' : 'code' },
	]);
	if (event.kind === 'gate refused') flow.write(say('gate.reason', { reason: event.body.reason }), STYLES.body);
	if (judged?.counted === false)
		flow.write(say('gate.not counted', { because: judged.notCountedBecause.join('; ') }), {
			...STYLES.body,
			tone: 'bad',
		});
	if (statement !== undefined) signedText(flow, [statement.text, statement.declaration]);
	for (const line of knownThen(act, story)) flow.write(line, STYLES.note);
	flow.space(5);
	table(
		flow,
		[
			{ head: say('entries.step'), width: 36, voice: 'strong' },
			{ head: say('entries.what') },
			{ head: say('gate.evidence'), width: 158 },
			{ head: say('gate.as known when signed'), width: 88 },
			{ head: say('gate.as known at sealing'), width: 84 },
		],
		linesOf(act, story).map(({ step, title, evidence, asKnown, asSealed, learned }) => ({
			cells: [step, capitalised(title), evidence, asKnown, asSealed],
			...(learned.length === 0 ? {} : { notes: learned.map((text) => ({ text, tone: 'warn' as const })) }),
		})),
	);
}

/** What was signed, word for word, in the voice that is kept for it, with a line at its side. */
function signedText(flow: Flow, paragraphs: readonly string[]): void {
	const { lead, size } = STYLES.signed;
	const lines = paragraphs.flatMap((paragraph, i) => [
		...(i === 0 ? [] : ['']),
		...wrap(paragraph, AREA.width - INDENT, STYLES.signed),
	]);
	flow.space(3);
	for (const line of lines) {
		flow.block(line === '' ? 5 : lead, ({ x, y, height }): readonly Shape[] => [
			stroke(segment(x + 3, y, x + 3, y + height), { pen: 'bold', tone: 'hand' }),
			...(line === '' ? [] : [lettering(line, { x: x + INDENT, y: y + height / 2 + 3.5 }, { size, voice: 'signed' })]),
		]);
	}
	flow.space(4);
}

const INDENT = 14;

/** What the signer's tablet knew of the others, and what it did not. */
function knownThen({ event, unknown }: Act, story: Story): readonly string[] {
	const { say, names, moments } = story;
	const { statement } = event.body;
	const others = statement?.others ?? [];
	return [
		...others.map(({ device, number, head, lastHeard }) =>
			say('gate.other tablet', {
				device,
				number,
				head: head ?? '–',
				heard: lastHeard === null ? say('gate.never heard') : moments.short(lastHeard),
			}),
		),
		...unknown.map((missed) => {
			switch (missed.kind) {
				case 'plant event begun':
					return say('gate.event not known', {
						what: names.plantEvent(missed.body.what),
						begin: moments.clock(missed.body.begin),
						tablet: event.device,
						entered: moments.short(missed.entered),
					});
				default:
					return say('gate.fact not known', {
						tablet: event.device,
						entered: moments.short(missed.entered),
						on: missed.device,
					});
			}
		}),
		...(statement?.clock === 'not agreed' ? [say('gate.clock not agreed')] : []),
		...(statement?.copy !== undefined && 'skipped' in statement.copy
			? [say('gate.copy skipped', { reason: statement.copy.skipped })]
			: []),
		...lateActs(event, story),
	];
}

function lateActs(event: Act['event'], { say, moments }: Story): readonly string[] {
	if (event.observed === undefined || millis(event.observed) === event.enteredAt) return [];
	return [say('gate.entered later', { entered: moments.short(event.entered) })];
}
