import { canonicalJson, readableCode, sha256Hex, type Json } from '../base';
import { gateSheet, Knowledge, standing, statementOf, type EventOf, type Standing, type Statement } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import type { Replayed } from './check-gates';
import { knownSite } from './known-site';
import { failed, undecided, type Check } from './pdf/check';

const SHOWN = 'statements say what stood when they were signed';

type Act = EventOf<'gate released'> | EventOf<'gate refused'>;

/** What a signer was shown is what the record holds for that moment, as far as the tablet could know. */
export function checkStatements(replayed: Replayed): readonly Check[] {
	const { procedure, startUp, site } = replayed;
	const knowledge = new Knowledge([...startUp, ...site]);
	const acts = startUp.filter((event): event is Act => event.kind === 'gate released' || event.kind === 'gate refused');
	const bad = acts.flatMap((act) => {
		const { statement } = act.body;
		if (statement === undefined)
			return [undecided(SHOWN, `${nameOf(act)} does not keep what was shown.`, { facts: aboutEvent(act) })];
		if (!procedure.gates.some(({ number }) => number === act.body.gate)) return [];
		const past = knowledge.past(act);
		const known = startUp.filter(({ id }) => past.has(id));
		const found = knownSite(site, act, known).map((then) => {
			const stood = standing(procedure, known, then, act.entered);
			return differencesOf(act, statement, stood, { ...replayed, startUp: known, site: then });
		});
		const wrong = found.some((differences) => differences.length === 0) ? [] : (found[0] ?? []);
		return wrong.map((what) => failed(SHOWN, `${nameOf(act)} ${what}.`, { facts: aboutEvent(act) }));
	});
	return offences(
		SHOWN,
		bad,
		`${acts.length} gate acts: words, steps with state and proof, counts, deviations, tablets.`,
	);
}

function differencesOf(
	{ body, device }: Act,
	said: Statement,
	stood: Standing,
	{ procedure, startUp, site }: Replayed,
): readonly string[] {
	const sheet = gateSheet(procedure, stood, [...startUp, ...site], { gate: body.gate, device });
	const shown = statementOf(sheet, said);
	const code = readableCode(sha256Hex(said.text), 16);
	return [
		...(said.code === code ? [] : [`says that its words have the code ${said.code}; they have ${code}`]),
		...differencesOfList(said.list, shown.list),
		...BESIDE.flatMap(({ name, called }) =>
			same(said[name], shown[name])
				? []
				: [`says of ${called} ${short(said[name])}; the record holds ${short(shown[name])}`],
		),
	];
}

/** What stands in a statement beside its list; the words themselves are the signer's to read. */
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
