import { fail, ok, utf8, type Result } from '../base';
import { makeEntryKey, makeResumeCode, sign, toJwk, webRandom, type ResumeCode, type SigningKey } from '../identity';
import {
	allOf,
	gateSheet,
	headCode,
	headsOf,
	headText,
	objectionsTo,
	statementOf,
	type BodyOf,
	type EventKind,
	type GateSheet,
	type Statement,
} from '../record';
import { declarationOf, releaseStatement, statementVersion, writtenHour, type Say } from '../wording';
import { BUILD } from '../demo';
import type { OpenStartUp, Seen } from './open-start-up.svelte';
import type { Problem } from './problem';

/** What a hold point's sheet shows, and the very words that a signature would cover. */
export type ShownSheet = {
	readonly sheet: GateSheet;
	readonly statement: Statement;
	/** How many events it was made from. */
	readonly events: number;
};

type Meaning = NonNullable<BodyOf<'gate released'>['meaning']> | 'refused';

/** The copy in a second place that the sheet offers: the newest one made, or the reason why there is none. */
export type CopySaid = { readonly skipped: string } | { readonly made: string };

export type GateSign = {
	readonly gate: number;
	readonly pin: string;
	readonly shown: ShownSheet;
};

/** @param say the language that is shown, and so the one that is signed and kept */
export function sheetOf(startUp: OpenStartUp, gate: number, meaning: Meaning, say: Say, copy?: CopySaid): ShownSheet {
	const { procedure, standing, events, siteLog, tablet } = startUp;
	const sheet = gateSheet(procedure, standing, [...events, ...siteLog], { gate, device: tablet.device });
	const statement = statementOf(sheet, {
		text: releaseStatement(sheet, meaning, {
			say,
			local: writtenHour,
			event: (what) => procedure.plantEvents.find(({ id }) => id === what)?.title ?? what,
		}),
		language: say.language,
		textVersion: statementVersion(say),
		build: BUILD,
		declaration: declarationOf(say),
		shownAt: standing.at,
		...(copy === undefined ? {} : { copy }),
	});
	return { sheet, statement, events: events.length };
}

export async function release(startUp: OpenStartUp, how: GateSign): Promise<Result<'signed', Problem>> {
	const { gate, shown } = how;
	const last = startUp.procedure.gates.at(-1)?.number;
	const meaning = gate === last ? 'accepted' : 'released';
	return actOnGate(startUp, how, 'release', 'gate released', { gate, meaning, statement: shown.statement });
}

export async function refuse(
	startUp: OpenStartUp,
	how: GateSign & { readonly reason: string; readonly names: readonly string[] },
): Promise<Result<'signed', Problem>> {
	const { gate, reason, names, shown } = how;
	return actOnGate(startUp, how, 'refusal', 'gate refused', { gate, reason, names, statement: shown.statement });
}

export async function answerRefusal(
	startUp: OpenStartUp,
	how: Omit<GateSign, 'shown'> & { readonly words: string },
): Promise<Result<'signed', Problem>> {
	return actOnGate(startUp, how, 'answer', 'refusal answered', { gate: how.gate, words: how.words });
}

export async function disposeDeviation(
	startUp: OpenStartUp,
	how: { readonly pin: string } & BodyOf<'deviation dispositioned'>,
): Promise<Result<'signed', Problem>> {
	const { pin, ...body } = how;
	return actOnGate(startUp, { pin }, 'disposition', 'deviation dispositioned', body);
}

/** A finding stands in the site's log: it is about the instrument, in every start-up. */
export async function recordFinding(
	startUp: OpenStartUp,
	how: { readonly pin: string; readonly observed?: string } & BodyOf<'instrument finding'>,
): Promise<Result<'signed', Problem>> {
	const { pin, observed, ...body } = how;
	const key = await openKey(startUp, pin);
	if (!key.ok) return key;
	const seen = observed === undefined ? {} : { observed };
	const written = await startUp.write('instrument finding', body, { key: key.value }, seen);
	return written.ok ? ok('signed') : written;
}

/** The shift's entry key, delegated by the gate key: one PIN, and entries need no other until the shift is over. */
export async function beginShift(startUp: OpenStartUp, pin: string, code?: string): Promise<Result<'signed', Problem>> {
	const resume = code === undefined ? undefined : await makeResumeCode(code, { pin, random: webRandom });
	if (resume?.ok === false) return resume;
	const key = await openKey(startUp, pin);
	return key.ok ? beginShiftWith(startUp, key.value, resume?.value) : key;
}

export async function beginShiftWith(
	startUp: OpenStartUp,
	key: SigningKey,
	chosen?: ResumeCode,
): Promise<Result<'signed', Problem>> {
	const { tablet } = startUp;
	const now = tablet.clock.now();
	const made = await makeEntryKey();
	const body: BodyOf<'shift key'> = {
		publicKey: await toJwk(made.publicKey),
		notBefore: startUp.instant(now),
		notAfter: startUp.instant(now + SHIFT),
		entriesOnly: true,
	};
	const written = await startUp.write('shift key', body, { key });
	if (!written.ok) return written;
	const { person, id: shiftKey } = written.value;
	const resume = chosen === undefined ? tablet.shifts.resumeOf(person) : { ...chosen, wrong: 0 };
	const row = { person, log: startUp.id, shiftKey, key: made, notAfter: now + SHIFT };
	const kept = await tablet.shifts.begin({ ...row, ...(resume === undefined ? {} : { resume }) });
	return kept.ok ? ok('signed') : kept;
}

/** After the screen was covered: the code that was chosen with the shift, or the PIN; the shift is the same. */
export async function goOn(
	startUp: OpenStartUp,
	shown: { readonly code: string } | { readonly pin: string },
): Promise<Result<'runs', Problem>> {
	const { person, shifts } = startUp.tablet;
	if (person === undefined) return fail({ kind: 'nobody-chosen' });
	if ('code' in shown) return shifts.goOn(person.person, shown.code);
	const key = await openKey(startUp, shown.pin);
	return key.ok ? ok('runs') : key;
}

const SHIFT = 12 * 3_600_000;

/** A copy in a second place was made and compared: number and head code of every chain stand in the record. */
export async function noteCopy(startUp: OpenStartUp, to: string): Promise<Result<string, Problem>> {
	const signer = startUp.entrySigner();
	if (!signer.ok) return signer;
	const heads = [...headsOf(startUp.log)].map(
		([tablet, head]) => [tablet, { number: head.number, code: headCode(head) }] as const,
	);
	const body = { to, way: 'file', heads: Object.fromEntries(heads) } as const;
	const written = await startUp.write('copy made', body, signer.value);
	if (!written.ok) return written;
	const chains = heads.map(([device, { number }]) => ({ log: startUp.id, device, number }));
	const kept = await startUp.tablet.store.health.copyMade({ at: written.value.entered, to }, chains);
	return kept.ok ? ok(written.value.id) : kept;
}

export const newestCopy = (startUp: OpenStartUp) => allOf(startUp.log, 'copy made').at(-1);

type Refusable = BodyOf<'refused act'>['act'];

async function actOnGate<K extends EventKind>(
	startUp: OpenStartUp,
	how: { readonly pin: string; readonly shown?: ShownSheet },
	act: Refusable,
	kind: K,
	body: BodyOf<K>,
): Promise<Result<'signed', Problem>> {
	const kept = await startUp.keepHeld();
	if (!kept.ok) return kept;
	if (how.shown !== undefined && how.shown.events !== startUp.log.length) return fail({ kind: 'sheet-changed' });
	const key = await openKey(startUp, how.pin);
	return key.ok ? judgedAct(startUp, key.value, act, kind, body) : key;
}

/** What the rules do not allow becomes a refused act: it is kept, says why, and changes nothing. */
export async function judgedAct<K extends EventKind>(
	startUp: OpenStartUp,
	key: SigningKey,
	act: Refusable,
	kind: K,
	body: BodyOf<K>,
	seen: Seen = {},
): Promise<Result<'signed', Problem>> {
	const draft = startUp.draft(kind, body, seen);
	if (!draft.ok) return draft;
	const because = objectionsTo(startUp.procedure, draft.value, startUp.log, startUp.siteLog);
	if (because.length > 0) {
		const gate = 'gate' in body && typeof body.gate === 'number' ? { gate: body.gate } : {};
		const refused = await startUp.write('refused act', { act, ...gate, because: because.join('; ') }, { key }, seen);
		return refused.ok ? fail({ kind: 'refused-act', because }) : refused;
	}
	if (kind === 'gate released') {
		const head = await signHead(startUp, 'gate act', key);
		if (!head.ok) return head;
	}
	const written = await startUp.write(kind, body, { key }, seen);
	return written.ok ? ok('signed') : written;
}

export async function openKey(startUp: OpenStartUp, pin: string): Promise<Result<SigningKey, Problem>> {
	const { person } = startUp.tablet;
	return person === undefined ? fail({ kind: 'nobody-chosen' }) : startUp.tablet.openKey(person.person, pin);
}

/** The tablet countersigns how far its chain has got, so that a cut tail is seen. */
export async function signHead(
	startUp: OpenStartUp,
	why: BodyOf<'chain head'>['why'],
	key: SigningKey,
): Promise<Result<'signed', Problem>> {
	const { device, tabletKey } = startUp.tablet;
	const own = headsOf(startUp.log).get(device);
	if (own === undefined) return ok('signed');
	const head = { log: startUp.id, device, number: own.number, head: own.id };
	const deviceSignature = await sign(utf8(headText(head)), tabletKey);
	const written = await startUp.write(
		'chain head',
		{ number: own.number, head: own.id, why, deviceSignature },
		{ key },
	);
	return written.ok ? ok('signed') : written;
}
