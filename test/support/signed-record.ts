import { canonicalJson, sha256Hex, utf8, type Json } from '../../src/lib/base';
import { runCalculator } from '../../src/lib/calc';
import { signTrustList, type SignedTrustList } from '../../src/lib/identity';
import {
	gateSheet,
	merge,
	printEventLine,
	standing,
	statementOf,
	type BodyOf,
	type GateSheet,
	type RecordEvent,
	type Statement,
} from '../../src/lib/record';
import { verifyRecord, type Report } from '../../src/lib/verify';
import { restate, type Language } from '../../src/lib/wording';
import { asText, SigningTablets } from './signing-tablets';
import { PURGE_INPUTS, SMALL_PROCEDURE } from './small-procedure';
import { makeTestSite, testTrustList, value, type TestSite } from './test-site';

export const START_UP = 'FM-9/small';
export const NOW = '2026-05-14T12:00:00+02:00';

/** A small sealed start-up on two tablets, with every signature real. */
export type SignedRecord = {
	readonly site: TestSite;
	readonly tablets: SigningTablets;
	/** Lines of both logs, in the order of the record. */
	readonly lines: readonly string[];
	readonly events: readonly RecordEvent[];
	readonly trustList: SignedTrustList;
};

export const at = (time: string): string => `2026-05-14T${time}:00+02:00`;

const PEOPLE = [
	{ person: 'TechA', printedName: 'Ada Example', roles: ['technician'], device: 'T-1' },
	{ person: 'TechB', printedName: 'Bo Example', roles: ['technician'], device: 'T-2' },
	{ person: 'SupA', printedName: 'Cy Example', roles: ['shift supervisor'], device: 'T-1' },
	{ person: 'Lead', printedName: 'Di Example', roles: ['commissioning lead'], device: 'T-1' },
	{ person: 'QA', printedName: 'Ed Example', roles: ['QA'], device: 'T-1' },
	{ person: 'Admin', printedName: 'Fi Example', roles: ['site administrator'], device: 'OFFICE' },
] as const;

/** Where a test bends the story: other values, other people, before anything is signed. */
export type Bent = {
	readonly oxygen?: string;
	/** From when on the certificate of a person is good. */
	readonly validFrom?: { readonly [person: string]: string };
	readonly damper?: string;
	readonly people?: BodyOf<'start-up opened'>['people'];
	readonly opening?: (body: BodyOf<'start-up opened'>) => BodyOf<'start-up opened'>;
	readonly statement?: (statement: Statement, sheet: GateSheet) => Statement;
	/** When the sheet of a gate was made, if earlier than it was signed. */
	readonly shownAt?: (gate: number) => string | undefined;
	readonly release?: { readonly person: string; readonly with?: 'shift key' };
	readonly stopAfter?: 'entries' | 'gate 1';
	readonly calculation?: (stored: { [name: string]: unknown }) => { [name: string]: unknown };
	readonly more?: (tablets: SigningTablets) => Promise<void>;
	readonly seal?: (heads: BodyOf<'sealed'>['heads']) => BodyOf<'sealed'>['heads'];
	readonly afterSeal?: (tablets: SigningTablets) => Promise<void>;
};

export async function makeSignedRecord(bent: Bent = {}, onSite?: TestSite): Promise<SignedRecord> {
	const site = onSite ?? (await makeTestSite());
	const tablets = new SigningTablets(site, START_UP);
	for (const person of PEOPLE) {
		const notBefore = bent.validFrom?.[person.person];
		await tablets.enrol({ ...person, ...(notBefore === undefined ? {} : { notBefore }) });
	}
	for (const device of ['T-1', 'T-2']) await tablets.enrolTablet(device);
	const trustList = await signTrustList(testTrustList(site), site.root.key);
	await writeSiteLog(tablets, trustList);
	await writeStartUp(tablets, bent);
	const events = merge(...['OFFICE', 'T-1', 'T-2'].map((device) => tablets.held(device)));
	return { site, tablets, events, lines: events.map(printEventLine), trustList };
}

async function writeSiteLog(tablets: SigningTablets, trustList: SignedTrustList): Promise<void> {
	const admin = { person: 'Admin', device: 'OFFICE', log: 'site' };
	for (const [i, { person, printedName: name, roles }] of PEOPLE.entries()) {
		const certificate = asText(tablets.certificates[i]!);
		const body = { person, name, roles: [...roles], certificate };
		await tablets.say('person enrolled', body, { ...admin, entered: at(`06:0${i}`) });
	}
	for (const [i, device] of ['T-1', 'T-2'].entries()) {
		const certificate = asText(tablets.certificates[PEOPLE.length + i]!);
		await tablets.say('device enrolled', { device, certificate }, { ...admin, entered: at(`06:1${i}`) });
	}
	const list = { ...trustList };
	await tablets.say('trust list issued', { sequence: 1, list }, { ...admin, entered: at('06:20') });
}

async function writeStartUp(tablets: SigningTablets, bent: Bent): Promise<void> {
	const lead = { person: 'Lead', device: 'T-1' };
	await tablets.say('start-up opened', (bent.opening ?? ((same) => same))(opening(tablets, bent)), {
		...lead,
		entered: at('08:00'),
	});
	const [techA, techB] = [
		{ person: 'TechA', device: 'T-1' },
		{ person: 'TechB', device: 'T-2' },
	];
	await tablets.beginShift('TechA', 'T-1', at('08:01'));
	const rows = [
		{ row: 'HV-1', found: 'open', passes: true },
		{ row: 'HV-2', found: bent.damper ?? 'shut', passes: true },
	];
	await tablets.say('entry', { step: 'L1', outcome: 'pass', rows }, { ...techA, entered: at('08:10') });
	const stored = value(runCalculator('sweep-purge@1', PURGE_INPUTS)) as unknown as { [name: string]: unknown };
	const calculation = (bent.calculation ?? ((same) => same))(JSON.parse(JSON.stringify(stored)) as typeof stored);
	await tablets.say('entry', { step: 'K1', outcome: 'pass', calculation }, { ...techA, entered: at('08:15') });
	await tablets.say(
		'copy made',
		{ to: 'T-2', way: 'QR', heads: tablets.codes('T-1') },
		{ ...techA, entered: at('08:16') },
	);
	tablets.give('T-1', 'T-2');
	await tablets.beginShift('TechB', 'T-2', at('08:17'));
	const values = [{ field: 'filter', point: 'AT-212', typed: bent.oxygen ?? '7,4', unit: '%', basis: 'dry' as const }];
	await tablets.say('entry', { step: 'R1', outcome: 'pass', values }, { ...techB, entered: at('08:30') });
	await tablets.say(
		'entry',
		{ step: 'C1', outcome: 'pass', confirmed: ['counted'] },
		{ ...techB, entered: at('08:35') },
	);
	await tablets.signHead('TechB', 'T-2', at('08:36'));
	tablets.give('T-2', 'T-1');
	await bent.more?.(tablets);
	if (bent.stopAfter === 'entries') return;
	await release(tablets, 1, { person: 'SupA', ...bent.release }, at('08:40'), bent);
	if (bent.stopAfter === 'gate 1') return;
	await release(tablets, 2, lead, at('08:50'), bent);
	await tablets.signHead('TechA', 'T-1', at('08:55'));
	const named = [...tablets.heads('T-1')].map(([device, { number, id }]) => [device, { number, id }] as const);
	const heads = (bent.seal ?? ((same) => same))(Object.fromEntries(named));
	await tablets.say('sealed', { heads }, { person: 'QA', device: 'T-1', entered: at('09:00') });
	await bent.afterSeal?.(tablets);
}

function opening(tablets: SigningTablets, { people }: Bent): BodyOf<'start-up opened'> {
	const procedure = SMALL_PROCEDURE as unknown as Json;
	return {
		procedure: { id: 'SMALL-1', revision: 2, hash: sha256Hex(canonicalJson(procedure)) },
		plant: { id: 'FM-9', hash: sha256Hex(canonicalJson(PLANT)) },
		documents: { procedure, plant: PLANT },
		startType: 'first',
		people: people ?? PEOPLE.map(({ person, roles }) => ({ person, roles: [...roles] })),
		demonstration: true,
		siteHeads: { OFFICE: tablets.held('OFFICE').at(-1)!.id },
	};
}

/** The smallest plant: it is enough that it can be read. */
export const PLANT = {
	format: 'gatehold-plant/1',
	unit: 'FM-9',
	title: 'Invented mill',
	site: 'Invented Lime Works',
	revision: 1,
	demonstration: true,
	utcOffsetMinutes: 120,
	...{ volumes: [], ducts: [], elements: [], points: [], venturis: [], inertSources: [], instruments: [], limits: [] },
	fuel: { title: 'Invented lignite' },
};

async function release(
	tablets: SigningTablets,
	gate: number,
	{ person, ...how }: { readonly person: string; readonly with?: 'shift key' },
	entered: string,
	bent: Bent,
): Promise<void> {
	const { shown, sheet } = shownTo(tablets, gate, bent.shownAt?.(gate) ?? entered);
	const statement = bent.statement?.(shown, sheet) ?? shown;
	await tablets.say('gate released', { gate, statement }, { person, device: 'T-1', entered, ...how });
}

/** What a signer on T-1 sees before signing. */
function shownTo(
	tablets: SigningTablets,
	gate: number,
	entered: string,
): { readonly shown: Statement; readonly sheet: GateSheet } {
	const own = tablets.held('T-1').filter(({ log }) => log === START_UP);
	const site = tablets.held('OFFICE');
	const stood = standing(SMALL_PROCEDURE, own, site, entered);
	const sheet = gateSheet(SMALL_PROCEDURE, stood, [...own, ...site], { gate, device: 'T-1' });
	const shown = statementOf(sheet, {
		text: `Gate ${gate}: the steps below stand.`,
		language: 'en',
		textVersion: '1',
		build: 'test',
		declaration: 'No fan stop, opening or loss of inert gas other than listed.',
	});
	return { shown, sheet };
}

const titleOf = (what: string): string => SMALL_PROCEDURE.plantEvents.find(({ id }) => id === what)?.title ?? what;

/** As the app words it, in a language, before it is signed. */
export const worded =
	(language: Language) =>
	(said: Statement, sheet: GateSheet): Statement => {
		const textVersion = `statement-${language}/1`;
		const words = restate({ language, textVersion }, { sheet, meaning: 'released', event: titleOf });
		return statementOf(sheet, { ...said, language, textVersion, ...words! });
	};

/** As the judge gets it: lines that may have been tampered with, and the root that the judge knows. */
export const judge = (
	record: SignedRecord,
	lines: readonly string[] = record.lines,
	more: Partial<Parameters<typeof verifyRecord>[0]> = {},
): Promise<Report> =>
	verifyRecord({
		lines: [{ name: 'record.ndjson', bytes: utf8(lines.join('\n')) }],
		root: record.site.root.certificate.der,
		now: NOW,
		...more,
	});
