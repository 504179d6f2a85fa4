import { canonicalJson, readableCode, sha256Hex, type Json } from '../base';
import {
	allOf,
	gateSheet,
	Knowledge,
	millis,
	standing,
	statementOf,
	type EventOf,
	type GateSheet,
	type Standing,
	type Statement,
} from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import type { Replayed } from './check-gates';
import { knownSite } from './known-site';
import { failed, undecided, type Check } from './pdf/check';

const SHOWN = 'statements say what stood when they were signed';

type Act = EventOf<'gate released'> | EventOf<'gate refused'>;

/** Says the words of a stored statement again, in its own language. Handed in, so that the reader knows no writer. */
export type Restate = (
	said: Pick<Statement, 'language' | 'textVersion'>,
	of:
		| { readonly sheet: GateSheet; readonly meaning: string; readonly event: (what: string) => string }
		| { readonly startUp: string },
) => Pick<Statement, 'text' | 'declaration'> | undefined;

/** What a signer was shown is what the record holds for that moment, as far as the tablet could know. */
export function checkStatements(replayed: Replayed, restate?: Restate): readonly Check[] {
	const { procedure, startUp, site } = replayed;
	const knowledge = new Knowledge([...startUp, ...site]);
	const acts = startUp.filter((event): event is Act => event.kind === 'gate released' || event.kind === 'gate refused');
	const bad = acts.flatMap((act) => {
		const { statement } = act.body;
		if (statement === undefined)
			return [undecided(SHOWN, `${nameOf(act)} does not keep what was shown.`, { facts: aboutEvent(act) })];
		if (!procedure.gates.some(({ number }) => number === act.body.gate)) return [];
		const shownAt = statement.shownAt ?? act.entered;
		if (!isFresh(shownAt, act)) {
			const what = `${nameOf(act)} says that it was shown at ${shownAt}; it was signed at ${act.entered}.`;
			return [failed(SHOWN, what, { facts: aboutEvent(act) })];
		}
		const past = knowledge.past(act);
		const known = startUp.filter(({ id }) => past.has(id));
		const found = knownSite(site, act, known).map((then) => {
			const stood = standing(procedure, known, then, shownAt);
			return differencesOf(act, statement, stood, { ...replayed, startUp: known, site: then, restate });
		});
		const wrong = found.some((differences) => differences.length === 0) ? [] : (found[0] ?? []);
		return wrong.map((what) => failed(SHOWN, `${nameOf(act)} ${what}.`, { facts: aboutEvent(act) }));
	});
	const sealed = allOf(startUp, 'sealed').flatMap((seal) => {
		const said = seal.body.statement;
		if (said === undefined) return [];
		return differencesOfWords(said, { startUp: seal.log }, restate).map((what) =>
			failed(SHOWN, `${nameOf(seal)} ${what}.`, { facts: aboutEvent(seal) }),
		);
	});
	return offences(
		SHOWN,
		[...bad, ...sealed, ...foreignWords([...acts, ...allOf(startUp, 'sealed')], restate)],
		`${acts.length} gate acts: words, steps with state and proof, counts, deviations, tablets.`,
	);
}

/** [R11] Time to read a sheet, and no more. */
const isFresh = (shownAt: string, { enteredAt }: Act): boolean =>
	millis(shownAt) <= enteredAt && enteredAt - millis(shownAt) <= HOUR;

const HOUR = 3_600_000;

function differencesOf(
	{ kind, body, device }: Act,
	said: Statement,
	stood: Standing,
	{ procedure, startUp, site, restate }: Replayed & { readonly restate: Restate | undefined },
): readonly string[] {
	const sheet = gateSheet(procedure, stood, [...startUp, ...site], { gate: body.gate, device });
	const shown = statementOf(sheet, said);
	const code = readableCode(sha256Hex(said.text), 16);
	const meaning = kind === 'gate refused' ? 'refused' : (body.meaning ?? 'released');
	const event = (what: string): string => procedure.plantEvents.find(({ id }) => id === what)?.title ?? what;
	return [
		...differencesOfWords(said, { sheet, meaning, event }, restate),
		...(said.code === code ? [] : [`says that its words have the code ${said.code}; they have ${code}`]),
		...differencesOfList(said.list, shown.list),
		...BESIDE.flatMap(({ name, called }) =>
			same(said[name], shown[name])
				? []
				: [`says of ${called} ${short(said[name])}; the record holds ${short(shown[name])}`],
		),
	];
}

function differencesOfWords(
	said: Statement,
	of: Parameters<Restate>[1],
	restate: Restate | undefined,
): readonly string[] {
	const again = restate?.(said, of);
	if (again === undefined) return [];
	return [
		...(again.text === said.text ? [] : [`says ${short(said.text)}; its sheet gives ${short(again.text)}`]),
		...(again.declaration === said.declaration
			? []
			: [`declares ${short(said.declaration)}; asked for was ${short(again.declaration)}`]),
	];
}

/** In a language or a version of the sentences that is not spoken here: what was signed stands, and cannot be compared. */
const foreignWords = (acts: readonly (Act | EventOf<'sealed'>)[], restate: Restate | undefined): readonly Check[] =>
	acts.flatMap((act) => {
		const said = act.body.statement;
		if (restate === undefined || said === undefined || restate(said, { startUp: act.log }) !== undefined) return [];
		const what = `${nameOf(act)} is worded in ${said.textVersion}, which is not spoken here: its words were not said again.`;
		return [undecided(SHOWN, what, { facts: aboutEvent(act) })];
	});

/** What stands in a statement beside its words and its list. */
const BESIDE = [
	{ name: 'counts', called: 'the counts' },
	{ name: 'openDeviations', called: 'open deviations' },
	{ name: 'lapsesSince', called: 'events since the last act' },
	{ name: 'late', called: 'late entries' },
	{ name: 'others', called: 'other tablets' },
	{ name: 'clock', called: 'the clock' },
] as const satisfies readonly { readonly name: keyof Statement; readonly called: string }[];

function differencesOfList(said: Statement['list'], shown: Statement['list']): readonly string[] {
	const listed = new Map(said.map((line) => [line.step, line]));
	const asked = new Set(shown.map(({ step }) => step));
	return [
		...shown.flatMap((line) => {
			const own = listed.get(line.step);
			if (own === undefined) return [`leaves out ${line.step}`];
			if (own.state !== line.state) return [`says that ${line.step} "${own.state}"; it was "${line.state}"`];
			if (own.proof !== line.proof) return [`names another proof of ${line.step} than the one that counted`];
			return same(own, line) ? [] : [`shows ${short(own)}; the record holds ${short(line)}`];
		}),
		...said.filter(({ step }) => !asked.has(step)).map(({ step }) => `lists ${step}, which is not under this gate`),
	];
}

const same = (a: unknown, b: unknown): boolean => canonicalJson(a as Json) === canonicalJson(b as Json);
const short = (value: unknown): string => JSON.stringify(value).slice(0, 200);
