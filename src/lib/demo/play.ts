import * as v from 'valibot';
import { canonicalJson, sha256Hex, toBase64, fromUtf8, type Json } from '../base';
import { signTrustList } from '../identity';
import { parsePlant, type Plant } from '../plant';
import { LIBRARY, parseProcedure, type Procedure, type Step } from '../procedure';
import {
	headsOf,
	millis,
	parseTrend,
	printInstant,
	seriesBody,
	standing,
	type RecordEvent,
	type Standing,
	type Trend,
} from '../record';
import { DemoSite, type Person } from './demo-site';
import { attachment, calculatedBody, enteredBody, type Around, type Files } from './entry-body';
import { answer, handOver, refuse, release, seal, withdrawEvent, type Stage } from './gate-acts';
import { DemoStopped, must } from './must';
import { PlayFileSchema, type Act, type PlayFile } from './play-file';
import { SITE_LOG, Tablets, type Said } from './tablets';

/** A start-up played to its end: every event signed, on the tablets where it happened. */
export type PlayedStartUp = Stage & {
	readonly site: DemoSite;
	readonly closing: readonly Extract<Act, { do: 'sign' }>[];
	readonly attachedFiles: readonly {
		readonly name: string;
		readonly mediaType: string;
		readonly bytes: Uint8Array<ArrayBuffer>;
	}[];
};

export type How = {
	/** Called before every act. */
	readonly progress?: (done: number, of: number) => void;
	/** Everybody is enrolled on every tablet with this PIN, so that somebody can go on in their place. */
	readonly pin?: string;
};

const OFFICE = 'OFFICE';

/**
 * Plays a start-up from data files through the same rooms as on a tablet: people are enrolled, outcomes follow from limits,
 * calculations are run, acts that the rules do not allow become refused acts, everything is signed.
 *
 * @param files the folder of the start-up
 */
export async function playStartUp(files: Files, how: How = {}): Promise<PlayedStartUp> {
	const play = readPlayFile(files);
	const plant = must(parsePlant(json(files, play.plant)), play.plant);
	const procedure = LIBRARY[play.procedure] ?? must(parseProcedure(json(files, play.procedure)), play.procedure);
	const people = v.parse(PeopleSchema, json(files, play.people)).people as readonly Person[];
	const instant = (local: string): string => `${local}${printInstant(0, plant.utcOffsetMinutes).slice(19)}`;
	const first = play.acts[0];
	if (first === undefined) throw new DemoStopped('the file tells of no act');
	const site = await DemoSite.make(plant.site, instant(first.at), how.pin);
	const tablets = new Tablets(site, play.startUp);
	await enrolEveryone({ play, people, site, everywhere: how.pin !== undefined });
	await writeSiteLog({ play, plant, procedure, people, site, tablets, begins: instant(first.at) });
	const around: Around = { procedure, plant, files, instant };
	const stage: Stage = { play, plant, procedure, people, tablets, around, trends: new Map(), build: BUILD };
	for (const [i, act] of play.acts.entries()) {
		how.progress?.(i, play.acts.length);
		await perform(act, stage);
	}
	const named = play.acts.flatMap((act) => [
		...('photo' in act ? [act.photo] : []),
		...(act.do === 'attach' ? [act.file] : []),
	]);
	const attachedFiles = [...new Set(named)].map((name) => ({ ...attachment(name, files), bytes: files.read(name) }));
	return { ...stage, site, closing: play.acts.filter((act) => act.do === 'sign'), attachedFiles };
}

export const BUILD = 'Gatehold 0.1.0';

function readPlayFile(files: Files): PlayFile {
	const read = v.safeParse(PlayFileSchema, json(files, 'start-up.json'));
	if (read.success) return read.output;
	const [issue] = read.issues;
	throw new DemoStopped(`start-up.json: ${v.getDotPath(issue) ?? ''}: ${issue.message}`);
}

const json = (files: Files, name: string): unknown => JSON.parse(fromUtf8(files.read(name)));

const PeopleSchema = v.object({
	people: v.array(v.object({ person: v.string(), name: v.string(), roles: v.array(v.string()) })),
});

async function enrolEveryone(of: {
	readonly play: PlayFile;
	readonly people: readonly Person[];
	readonly site: DemoSite;
	readonly everywhere: boolean;
}): Promise<void> {
	const { play, people, site, everywhere } = of;
	const acting = new Set(play.acts.map((act) => JSON.stringify([act.by, act.on ?? play.tablets[0]])));
	for (const person of people) {
		for (const tablet of play.tablets)
			if (everywhere || acting.has(JSON.stringify([person.person, tablet]))) await site.enrol(person, tablet);
		if (isOffice(person)) await site.enrol(person, OFFICE);
	}
	for (const tablet of [...play.tablets, OFFICE]) await site.enrolTablet(tablet);
}

const isOffice = ({ roles }: Person): boolean =>
	roles.includes('site administrator') || roles.includes('process engineer') || roles.includes('instrument engineer');

/** What the site knows before the start-up: its people, tablets, instruments, the plant and the procedure, as signed events. */
async function writeSiteLog(of: {
	readonly play: PlayFile;
	readonly plant: Plant;
	readonly procedure: Procedure;
	readonly people: readonly Person[];
	readonly site: DemoSite;
	readonly tablets: Tablets;
	readonly begins: string;
}): Promise<void> {
	const { play, plant, procedure, people, site, tablets, begins } = of;
	const by = (role: string): Omit<Said, 'entered'> => {
		const person = people.find(({ roles }) => (roles as readonly string[]).includes(role));
		if (person === undefined) throw new DemoStopped(`nobody is ${role}`);
		return { person: person.person, device: OFFICE, log: SITE_LOG };
	};
	let minute = 0;
	const entered = (): string =>
		printInstant(millis(begins) - 26 * 3_600_000 + minute++ * 60_000, plant.utcOffsetMinutes);
	for (const { certificate } of people.flatMap((person) => keysOf(person, play, site)))
		if (certificate.subject.kind === 'person') {
			const { person, printedName: name, roles } = certificate.subject;
			await tablets.say(
				'person enrolled',
				{ person, name, roles: [...roles], certificate: toBase64(certificate.der) },
				{ ...by('site administrator'), entered: entered() },
			);
		}
	for (const certificate of site.certificates)
		if (certificate.subject.kind === 'device')
			await tablets.say(
				'device enrolled',
				{ device: certificate.subject.device, certificate: toBase64(certificate.der) },
				{ ...by('site administrator'), entered: entered() },
			);
	const list = {
		kind: 'trust list',
		v: 1,
		site: plant.site,
		sequence: 1,
		issued: site.validity.notBefore,
		nextUpdate: site.validity.notAfter,
		certificates: [],
		revocations: [],
	} as const;
	await tablets.say(
		'trust list issued',
		{ sequence: 1, list: { ...(await signTrustList(list, site.root.key)) } },
		{ ...by('site administrator'), entered: entered() },
	);
	for (const { id, serial, point, due } of plant.instruments)
		await tablets.say(
			'instrument registered',
			{ instrument: id, serial, due, ...(point === undefined ? {} : { point }) },
			{ ...by('instrument engineer'), entered: entered() },
		);
	await tablets.say(
		'plant described',
		{ plant: { id: plant.unit, revision: plant.revision, hash: hashOf(plant) }, changedPoints: [] },
		{ ...by('process engineer'), entered: entered() },
	);
	await tablets.say(
		'procedure approved',
		{
			procedure: { id: procedure.id, revision: procedure.revision, hash: hashOf(procedure) },
			roles: ['process engineer'],
		},
		{ ...by('process engineer'), entered: entered() },
	);
	for (const tablet of play.tablets) tablets.give(OFFICE, tablet);
}

function keysOf(person: Person, play: PlayFile, site: DemoSite) {
	return [...play.tablets, OFFICE].flatMap((tablet) => {
		try {
			return [site.personKey(person.person, tablet)];
		} catch {
			return [];
		}
	});
}

const hashOf = (document: Plant | Procedure): string => sha256Hex(canonicalJson(document as unknown as Json));

async function perform(act: Act, stage: Stage): Promise<void> {
	const { play, plant, procedure, people, tablets, around } = stage;
	const device = act.on ?? play.tablets[0] ?? '';
	const entered = around.instant(act.at);
	const said: Said = { person: act.by, device, entered };
	const seen = 'observed' in act ? { ...said, observed: around.instant(act.observed) } : said;
	const local = (time: string | undefined, name: string): object =>
		time === undefined ? {} : { [name]: around.instant(time) };
	switch (act.do) {
		case 'open': {
			const { do: _do, at: _at, by: _by, on: _on, ...words } = act;
			const siteHeads = Object.fromEntries(
				[...headsOf(tablets.siteLog(device))].map(([tablet, { id }]) => [tablet, id]),
			);
			await tablets.say(
				'start-up opened',
				{
					procedure: { id: procedure.id, revision: procedure.revision, hash: hashOf(procedure) },
					plant: { id: plant.unit, revision: plant.revision, hash: hashOf(plant) },
					documents: { procedure, plant },
					people: people.map(({ person, name, roles }) => ({ person, name, roles: [...roles] })),
					demonstration: true,
					siteHeads,
					...words,
				},
				said,
			);
			return;
		}
		case 'start shift':
			return tablets.beginShift(said);
		case 'enter': {
			await tablets.say('entry', enteredBody(act, stepOf(procedure, act.step), around, tablets.startUp(device)), seen);
			return;
		}
		case 'calculate': {
			const record = {
				events: tablets.startUp(device),
				standing: standsOn(stage, device, seen.observed ?? entered),
				trends: stage.trends,
			};
			await tablets.say('entry', calculatedBody(act, stepOf(procedure, act.step), around, record), seen);
			return;
		}
		case 'attach':
			return attachSeries(act, stage, seen);
		case 'agree not applicable': {
			const entry = tablets
				.startUp(device)
				.filter((event) => event.kind === 'entry' && event.body.step === act.step)
				.at(-1);
			await tablets.say(
				'not applicable agreed',
				{ entry: entry?.id ?? '', ...(act.reason === undefined ? {} : { reason: act.reason }) },
				said,
			);
			return;
		}
		case 'event': {
			const { what, item, seenBy, note } = act;
			const more = {
				...(item === undefined ? {} : { item }),
				...(seenBy === undefined ? {} : { seenBy }),
				...(note === undefined ? {} : { note }),
			};
			await tablets.say(
				'plant event begun',
				{ what, begin: around.instant(act.begin), ...local(act.end, 'end'), ...more },
				said,
			);
			return;
		}
		case 'event ended': {
			const event = newestEvent(tablets.startUp(device), act.what);
			await tablets.say('plant event ended', { event, end: around.instant(act.end) }, said);
			return;
		}
		case 'withdraw event':
			return withdrawEvent(act, newestEvent(tablets.startUp(device), act.what), stage, said);
		case 'fact':
			await tablets.say('fact', { what: act.what, ...local(act.begin, 'begin'), ...local(act.end, 'end') }, said);
			return;
		case 'raise': {
			const { deviation, title, blocks, step, owner } = act;
			await tablets.say(
				'deviation raised',
				{
					deviation,
					title,
					blocks,
					...(step === undefined ? {} : { step }),
					...(owner === undefined ? {} : { owner }),
				},
				said,
			);
			return;
		}
		case 'dispose': {
			const { deviation, disposition, reason } = act;
			await tablets.say(
				'deviation dispositioned',
				{ deviation, disposition, ...(reason === undefined ? {} : { reason }) },
				said,
			);
			return;
		}
		case 'find': {
			const { instrument, error, unit, tolerance, note } = act;
			await tablets.say(
				'instrument finding',
				{ instrument, asFound: { error, unit, tolerance }, ...(note === undefined ? {} : { note }) },
				{ ...seen, log: SITE_LOG },
			);
			return;
		}
		case 'release':
			return release(act, stage, said);
		case 'refuse':
			return refuse(act, stage, said);
		case 'answer':
			return answer(act, stage, said);
		case 'hand over':
			return handOver(act, stage, said);
		case 'copy':
			await tablets.say(
				'copy made',
				{ to: act.to, way: act.way, heads: tablets.headCodes(device), compared: true },
				said,
			);
			tablets.give(device, act.to);
			await tablets.say(
				'copy received',
				{ from: device, heads: tablets.headCodes(act.to) },
				{ ...said, device: act.to },
			);
			return;
		case 'note':
			await tablets.say('note', { text: act.text, ...(act.step === undefined ? {} : { step: act.step }) }, said);
			return;
		case 'seal':
			return seal(stage, said);
		case 'sign':
			// Signs the file, not the record: done when the dossier is built.
			return;
	}
}

export const standsOn = ({ procedure, tablets }: Stage, device: string, at: string): Standing =>
	standing(procedure, tablets.startUp(device), tablets.siteLog(device), at);

const stepOf = (procedure: Procedure, id: string): Step => {
	const step = procedure.steps.find((one) => one.id === id);
	if (step === undefined) throw new DemoStopped(`the procedure has no step ${id}`);
	return step;
};

function newestEvent(events: readonly RecordEvent[], what: string): string {
	const event = events.filter((one) => one.kind === 'plant event begun' && one.body.what === what).at(-1);
	if (event === undefined) throw new DemoStopped(`no ${what} is recorded`);
	return event.id;
}

/** The trend is kept as the file it came in; its columns become a series of the measuring points that they name. */
async function attachSeries(
	act: Extract<Act, { do: 'attach' }>,
	{ plant, procedure, tablets, around, trends }: Stage,
	said: Said,
): Promise<void> {
	const kept = attachment(act.file, around.files);
	const trend: Trend = must(parseTrend(fromUtf8(around.files.read(act.file)), plant.utcOffsetMinutes), act.file);
	(trends as Map<string, Trend>).set(kept.hash, trend);
	const attached = must(seriesBody(trend, kept, plant, { note: act.note }), act.file);
	const series = await tablets.say('series attached', attached, said);
	const step = stepOf(procedure, act.step);
	const enter = { ...act, do: 'enter' as const, photo: undefined, file: undefined };
	const { photo: _photo, file: _file, ...plain } = enter;
	const body = {
		...enteredBody(plain, step, around, tablets.startUp(said.device)),
		series: [series.id],
		from: act.from === undefined ? attached.from : around.instant(act.from),
	};
	await tablets.say('entry', { ...body, outcome: 'pass' }, said);
}
