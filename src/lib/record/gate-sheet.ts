import { readableCode, sha256Hex } from '../base';
import type { Procedure, Step } from '../procedure';
import type { GateStanding, Standing } from './answer';
import type { BodyOf, EventOf, RecordEvent } from './event';
import { allOf } from './event';
import { headCode, headsOf } from './chain';
import { MINUTE, millis, type Millis } from './instants';

/**
 * Everything that a hold point's sheet shows before somebody signs: what stands and on which evidence, what happened since
 * the last act, what other tablets are not heard of. The wording room makes the statement from it; both go into the
 * signed bytes.
 */
export type GateSheet = {
	readonly gate: number;
	readonly title: string;
	readonly holdPoint: string;
	readonly state: GateStanding['state'];
	readonly list: readonly SheetLine[];
	readonly counts: { readonly [what: string]: number };
	readonly openDeviations: readonly string[];
	readonly eventsSince: Standing['plantEvents'];
	readonly findingsSince: readonly { readonly instrument: string; readonly error?: string }[];
	readonly late: readonly string[];
	readonly refusal: { readonly reason: string; readonly answer?: string } | undefined;
	readonly others: readonly OtherTablet[];
	readonly clock: 'agreed' | 'not agreed';
	readonly missing: readonly (readonly string[])[];
	/** Age of the newest reading on the list, in minutes. */
	readonly newestMinutes: number | undefined;
	readonly oldestMinutes: number | undefined;
};

export type SheetLine = NonNullable<BodyOf<'gate released'>['statement']>['list'][number];
export type OtherTablet = NonNullable<BodyOf<'gate released'>['statement']>['others'][number];

/** @param events the start-up's log and, for findings, the site's */
export function gateSheet(
	procedure: Procedure,
	found: Standing,
	events: readonly RecordEvent[],
	asked: { readonly gate: number; readonly device: string },
): GateSheet {
	const gate = procedure.gates.find(({ number }) => number === asked.gate);
	const standing = found.gates.find((state) => state.gate === asked.gate);
	if (gate === undefined || standing === undefined) throw new Error(`no gate ${String(asked.gate)}`);
	const now = millis(found.at);
	const list = procedure.steps
		.filter((step) => step.gate === asked.gate)
		.map((step) => sheetLine(step, found, events, now));
	const ages = list.flatMap(({ ageMinutes }) => ageMinutes ?? []);
	const since = lastActBefore(events, asked.gate, now);
	const eventsSince = found.plantEvents.filter(
		({ end, withdrawn }) => withdrawn !== true && (end === null || millis(end) > since),
	);
	const late = found.late.map(({ event }) => event);
	const under = new Set(list.map(({ step }) => step));
	return {
		gate: gate.number,
		title: gate.title,
		holdPoint: gate.holdPoint,
		state: standing.state,
		list,
		counts: {
			steps: list.length,
			stand: list.filter(({ state }) => state === 'stands').length,
			'not applicable': list.filter(({ state }) => state === 'not applicable').length,
			'plant events since': eventsSince.length,
			tries: found.tries.filter(({ step }) => under.has(step)).length,
			late: late.length,
			'refused acts': found.refusedActs.length,
		},
		openDeviations: found.deviations.filter(({ state }) => state === 'open').map(({ deviation }) => deviation),
		eventsSince,
		findingsSince: findingsSince(events, since),
		late,
		refusal: refusalOf(events, asked.gate, since),
		others: otherTablets(
			events.filter(({ log }) => log === found.startUp),
			asked.device,
		),
		clock: found.clock.state,
		missing: standing.missing,
		newestMinutes: ages.length === 0 ? undefined : Math.min(...ages),
		oldestMinutes: ages.length === 0 ? undefined : Math.max(...ages),
	};
}

export type Statement = NonNullable<BodyOf<'gate released'>['statement']>;

/** What goes into the signed bytes of an act: the words that were shown and everything that was shown beside them. */
export function statementOf(
	sheet: GateSheet,
	words: Pick<Statement, 'text' | 'language' | 'textVersion' | 'build' | 'declaration' | 'copy' | 'shownAt'>,
): Statement {
	return {
		...words,
		code: readableCode(sha256Hex(words.text), 16),
		list: sheet.list,
		counts: sheet.counts,
		openDeviations: sheet.openDeviations,
		lapsesSince: sheet.eventsSince.map(({ what, begin, end }) => `${what} ${begin} ${end ?? 'not ended'}`),
		late: sheet.late,
		others: sheet.others,
		clock: sheet.clock,
		...(sheet.refusal?.answer === undefined ? {} : { answersRefusal: sheet.refusal.answer }),
	};
}

function sheetLine(step: Step, found: Standing, events: readonly RecordEvent[], now: Millis): SheetLine {
	const standing = found.steps.find((one) => one.step === step.id);
	const entry = events.find(({ id }) => id === standing?.entry);
	const body = entry?.kind === 'entry' ? entry.body : undefined;
	const used = [...(body?.instruments ?? []), ...(body?.values ?? []).flatMap(({ instrument }) => instrument ?? [])];
	const value = body === undefined ? undefined : headline(body);
	return {
		step: step.id,
		proof: standing?.state === 'stands' ? (standing.entry ?? null) : null,
		state: standing?.state ?? 'not yet',
		...(value === undefined ? {} : { value }),
		...(body?.limit === undefined ? {} : { limit: body.limit }),
		...(entry === undefined ? {} : { ageMinutes: Math.round((now - entry.observedAt) / MINUTE) }),
		...(used.length === 0 ? {} : { instruments: [...new Set(used)] }),
	};
}

/** The values of an entry in one line, as they were typed. */
export function headline(body: BodyOf<'entry'>): string | undefined {
	const values = (body.values ?? []).map(({ field, point, typed, unit, basis }) =>
		`${point ?? field ?? ''} ${typed} ${unit}${basis === undefined ? '' : ` ${basis}`}`.trim(),
	);
	const verdict = (body.calculation?.verdict as { word?: string } | undefined)?.word;
	const parts = [
		...(verdict === undefined ? [] : [verdict]),
		...values,
		...(body.choice === undefined ? [] : [body.choice]),
	];
	return parts.length === 0 ? undefined : parts.join('; ');
}

function lastActBefore(events: readonly RecordEvent[], gate: number, now: Millis): Millis {
	const acts = [...allOf(events, 'gate released'), ...allOf(events, 'gate refused')];
	const times = acts.filter((act) => act.body.gate === gate && act.observedAt < now).map((act) => act.observedAt);
	return Math.max(-Infinity, ...times);
}

const findingsSince = (events: readonly RecordEvent[], since: Millis): GateSheet['findingsSince'] =>
	allOf(events, 'instrument finding')
		.filter((event) => event.observedAt > since)
		.map(({ body }) => ({
			instrument: body.instrument,
			...(body.asFound === undefined ? {} : { error: `${body.asFound.error} ${body.asFound.unit}` }),
		}));

/** The refusal of this gate since its last release, and the newest answer to it. */
function refusalOf(events: readonly RecordEvent[], gate: number, since: Millis): GateSheet['refusal'] {
	const refusals = allOf(events, 'gate refused').filter(
		({ body, observedAt }) => body.gate === gate && observedAt >= since,
	);
	const refusal = latest(refusals);
	if (refusal === undefined) return undefined;
	const answers = allOf(events, 'refusal answered').filter(
		({ body, observedAt }) => body.gate === gate && observedAt >= refusal.observedAt,
	);
	const answer = latest(answers);
	return { reason: refusal.body.reason, ...(answer === undefined ? {} : { answer: answer.body.words }) };
}

const latest = <E extends EventOf<'gate refused'> | EventOf<'refusal answered'>>(events: readonly E[]): E | undefined =>
	[...events].sort((a, b) => a.observedAt - b.observedAt).at(-1);

/** What is known here of every other tablet: its last number, its head code, when it was last heard of. */
export function otherTablets(events: readonly RecordEvent[], device: string): readonly OtherTablet[] {
	return [...headsOf(events)]
		.filter(([other]) => other !== device)
		.map(([other, head]) => ({ device: other, number: head.number, head: headCode(head), lastHeard: head.entered }));
}
