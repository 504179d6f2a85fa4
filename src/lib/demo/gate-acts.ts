import type { Plant } from '../plant';
import type { Procedure } from '../procedure';
import { gateSheet, headsOf, statementOf, standing, type BodyOf, type Statement, type Trend } from '../record';
import { declarationOf, releaseStatement, sealStatement, speaker, statementVersion, writtenHour } from '../wording';
import type { Person } from './demo-site';
import type { Around } from './entry-body';
import type { Act, PlayFile } from './play-file';
import type { Said, Tablets } from './tablets';

/** Everything that an act of the story plays on. */
export type Stage = {
	readonly play: PlayFile;
	readonly plant: Plant;
	readonly procedure: Procedure;
	readonly people: readonly Person[];
	readonly tablets: Tablets;
	readonly around: Around;
	readonly trends: ReadonlyMap<string, Trend>;
	readonly build: string;
};

type Of<D extends Act['do']> = Extract<Act, { do: D }>;

/** The story is told in English. */
const say = speaker('en');

function sheetAt({ procedure, tablets }: Stage, gate: number, { device, entered }: Said) {
	const events = tablets.startUp(device);
	const found = standing(procedure, events, tablets.siteLog(device), entered);
	return gateSheet(procedure, found, [...events, ...tablets.siteLog(device)], { gate, device });
}

function statementFor(stage: Stage, gate: number, meaning: string, said: Said, copy?: Statement['copy']): Statement {
	const sheet = sheetAt(stage, gate, said);
	return statementOf(sheet, {
		text: releaseStatement(sheet, meaning, {
			say,
			local: writtenHour,
			event: (what) => stage.procedure.plantEvents.find(({ id }) => id === what)?.title ?? what,
		}),
		language: say.language,
		textVersion: statementVersion(say),
		build: stage.build,
		declaration: declarationOf(say),
		...(copy === undefined ? {} : { copy }),
	});
}

/** Before every release a copy to a second place is offered; the newest one counts, or the reason why there is none. */
function copyOf({ tablets }: Stage, act: Of<'release'>, { device }: Said): Statement['copy'] {
	if (act.copySkipped !== undefined) return { skipped: act.copySkipped };
	const made = tablets
		.startUp(device)
		.filter((event) => event.kind === 'copy made')
		.at(-1);
	return made === undefined ? { skipped: 'no second place in reach' } : { made: made.id };
}

export async function release(act: Of<'release'>, stage: Stage, said: Said): Promise<void> {
	const { tablets, procedure } = stage;
	const meaning = act.meaning ?? 'released';
	const body: BodyOf<'gate released'> = {
		gate: act.gate,
		meaning,
		statement: statementFor(stage, act.gate, meaning, said, copyOf(stage, act, said)),
	};
	const objections = tablets.objections(procedure, 'gate released', body, said);
	if (objections.length > 0) {
		await tablets.say('refused act', { act: 'release', gate: act.gate, because: objections.join('; ') }, said);
		return;
	}
	await tablets.signHead('gate act', said);
	await tablets.say('gate released', body, said);
}

export async function refuse(act: Of<'refuse'>, stage: Stage, said: Said): Promise<void> {
	const body: BodyOf<'gate refused'> = {
		gate: act.gate,
		reason: act.reason,
		names: act.names,
		statement: statementFor(stage, act.gate, 'refused', said),
	};
	const objections = stage.tablets.objections(stage.procedure, 'gate refused', body, said);
	if (objections.length > 0)
		await stage.tablets.say('refused act', { act: 'refusal', gate: act.gate, because: objections.join('; ') }, said);
	else await stage.tablets.say('gate refused', body, said);
}

export async function answer(act: Of<'answer'>, stage: Stage, said: Said): Promise<void> {
	const body: BodyOf<'refusal answered'> = { gate: act.gate, words: act.words };
	const objections = stage.tablets.objections(stage.procedure, 'refusal answered', body, said);
	if (objections.length > 0)
		await stage.tablets.say('refused act', { act: 'answer', gate: act.gate, because: objections.join('; ') }, said);
	else await stage.tablets.say('refusal answered', body, said);
}

/** Withdrawing a plant event needs a releasing role other than its author, and evidence; else the attempt is what is kept. */
export async function withdrawEvent(act: Of<'withdraw event'>, event: string, stage: Stage, said: Said): Promise<void> {
	const evidence = act.evidence === undefined ? {} : { evidence: act.evidence };
	const body: BodyOf<'plant event corrected'> = { event, withdrawn: true, reason: act.reason, ...evidence };
	const objections = stage.tablets.objections(stage.procedure, 'plant event corrected', body, said);
	if (objections.length > 0)
		await stage.tablets.say('refused act', { act: 'withdrawal', event, because: objections.join('; ') }, said);
	else await stage.tablets.say('plant event corrected', body, said);
}

export async function handOver(act: Of<'hand over'>, { tablets }: Stage, said: Said): Promise<void> {
	await tablets.signHead('hand-over', said);
	await tablets.say(
		'shift hand-over',
		{ from: act.from, to: act.to, temporaryStatesConfirmed: act.confirmed, summary: act.summary },
		said,
	);
}

export async function seal(stage: Stage, said: Said): Promise<void> {
	const { tablets, play } = stage;
	await tablets.signHead('seal', said);
	const heads = Object.fromEntries(
		[...headsOf(tablets.startUp(said.device))].map(([device, { number, id }]) => [device, { number, id }]),
	);
	const last = stage.procedure.gates.at(-1)?.number ?? 0;
	const sheet = sheetAt(stage, last, said);
	const words = {
		text: sealStatement(play.startUp, say),
		language: say.language,
		textVersion: statementVersion(say),
		build: stage.build,
		declaration: declarationOf(say),
	};
	await tablets.say('sealed', { heads, statement: statementOf(sheet, words) }, said);
}
