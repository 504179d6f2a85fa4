import 'fake-indexeddb/auto';
import { beforeAll, describe, expect, test } from 'vitest';
import { BeginSite, OpenDesk, OpenStartUp, PlantBook, Tablet } from '../../src/lib/app';
import { beginSite, objectionsToSite, personId, type NewSite } from '../../src/lib/app/own-site';
import { nextStartUpId } from '../../src/lib/app/new-start-up';
import { plantOn } from '../../src/lib/app/plant-book.svelte';
import { spokenWords } from '../../src/lib/app/spoken-words';
import { openSiteRoot, readCertificate, webRandom } from '../../src/lib/identity';
import { allOf, standing } from '../../src/lib/record';
import { openStore, type Store } from '../../src/lib/store';
import { demoPlant } from '../support/demo-files';
import { freshName, tab } from '../support/open-stores';
import { TestClock } from '../support/tablet-clock';
import { value } from '../support/test-site';

const NOW = Date.parse('2026-12-01T08:00:00Z');
const LEAD_PIN = '73905284';
const SUPERVISOR_PIN = '58290417';

const NEW_SITE: NewSite = {
	site: 'Kalkwerk Nord',
	unit: 'KM-3',
	device: 'T-1',
	people: [
		{
			name: 'Runa Eichhold',
			roles: ['site administrator', 'process engineer', 'commissioning lead'],
			pin: LEAD_PIN,
		},
		{ name: 'Otmar Brandvik', roles: ['shift supervisor'], pin: SUPERVISOR_PIN },
	],
	passphrase: spokenWords(7, webRandom),
};

const name = freshName();
const clock = new TestClock(NOW);

const tablet = async (store: Store): Promise<Tablet> => {
	const opened = value(await Tablet.open(store, clock));
	await opened.choose('Eichhold');
	return opened;
};

beforeAll(async () => {
	const store = value(await openStore(name, { now: '2026-12-01T08:00:00Z' }));
	const at = { now: NOW, utcOffsetMinutes: 60, demonstration: demoPlant() };
	value(await beginSite(store, NEW_SITE, at, () => undefined));
	store.close();
}, 60_000);

describe('a site begun on this tablet', () => {
	test('has its people with keys of their own, under a root that only the words on paper open', async () => {
		const store = await tab(name);
		const { people, device } = value(await Tablet.open(store, clock));
		expect(people.map(({ person, name, roles }) => ({ person, name, roles }))).toEqual([
			{ person: 'Brandvik', name: 'Otmar Brandvik', roles: ['shift supervisor'] },
			{
				person: 'Eichhold',
				name: 'Runa Eichhold',
				roles: ['site administrator', 'process engineer', 'commissioning lead'],
			},
		]);
		expect(device).toBe('T-1');
		const file = value(await store.site.read('root file'))!;
		expect((await openSiteRoot(file, NEW_SITE.passphrase)).ok).toBe(true);
		expect((await openSiteRoot(file, spokenWords(7, webRandom))).ok).toBe(false);
		const root = value(readCertificate(value(await store.site.read('root certificate'))!));
		expect(root.subject).toMatchObject({ kind: 'authority', name: 'Kalkwerk Nord' });
	});

	test('opens a key with its own PIN and with no other', async () => {
		const here = await tablet(await tab(name));
		expect((await here.openKey('Brandvik', LEAD_PIN)).ok).toBe(false);
		expect((await here.openKey('Brandvik', SUPERVISOR_PIN)).ok).toBe(true);
	});

	test('keeps neither a PIN nor a word of the root anywhere', async () => {
		const store = await tab(name);
		const kept = JSON.stringify([
			value(await store.events.readLog('site')).events.map(({ text }) => text),
			value(await store.site.read('root file')),
			value(await store.gateKeys.list()),
			value(await store.drafts.list()),
		]);
		for (const secret of [LEAD_PIN, SUPERVISOR_PIN, NEW_SITE.passphrase]) expect(kept).not.toContain(secret);
	});

	test('describes its unit as a copy whose every value is still to be replaced', async () => {
		const book = value(await PlantBook.open(await tablet(await tab(name))));
		expect([book.plant.unit, book.plant.site, book.plant.demonstration]).toEqual(['KM-3', 'Kalkwerk Nord', false]);
		expect(book.left).toHaveLength(book.plant.copied?.toReplace.length ?? 0);
		expect(book.left.length).toBeGreaterThan(100);
	});
});

test('the time of the plant is said by its distance from UTC, whatever the millisecond', async () => {
	for (const past of [0, 381]) {
		const begin = new BeginSite(await tab(name), new TestClock(NOW + past));
		expect(begin.plantTime).toMatch(/^[+-]\d\d:\d\d$/);
	}
});

describe('what is wrong with a new site is said before anything is made', () => {
	const kinds = (change: Partial<NewSite>): readonly string[] =>
		objectionsToSite({ ...NEW_SITE, ...change }).map(({ kind }) => kind);
	const [lead, supervisor] = NEW_SITE.people;

	test.each<[string, Partial<NewSite>, readonly string[]]>([
		['nothing', {}, []],
		['no name', { site: ' ' }, ['not-a-name']],
		['a unit with a blank', { unit: 'KM 3' }, ['not-a-tag']],
		['two of one name', { people: [lead!, { ...supervisor!, name: ' runa eichhold' }] }, ['same-name']],
		['a PIN that is a date', { people: [lead!, { ...supervisor!, pin: '24121987' }] }, ['bad-pin']],
		['a person without a role', { people: [lead!, { ...supervisor!, roles: [] }] }, ['no-role']],
		['nobody who enrols or describes', { people: [supervisor!] }, ['nobody-enrols', 'nobody-describes']],
	])('%s', (_, change, expected) => {
		expect(kinds(change)).toEqual(expected);
	});
});

test('ids of people and start-ups are never given twice', () => {
	expect(personId('Ragnhild Sørby-Lunde', [])).toBe('SrbyLunde');
	expect(personId('Otmar Brandvik', ['Brandvik', 'Brandvik-2'])).toBe('Brandvik-3');
	expect(personId('Иван Петров', [])).toBe('Person');
	expect(nextStartUpId('KM-3/2026-12-01', ['KM-3/2026-12-01'])).toBe('KM-3/2026-12-01-2');
});

describe('a start-up opened on values that are not replaced', () => {
	test('waits until the procedure is approved, is opened with the PIN of a lead, and holds at gate 0', async () => {
		const here = await tablet(await tab(name));
		const desk = value(await OpenDesk.open(here));
		desk.startType = 'first-start';
		desk.title = 'First start of KM-3';
		expect([desk.isApproved, desk.isReady, desk.findings]).toEqual([false, false, 0]);
		await desk.approve(LEAD_PIN);
		expect([desk.isApproved, desk.isReady]).toEqual([true, true]);
		const id = await desk.openNew(LEAD_PIN);
		expect(id).toBe('KM-3/2026-12-01');
		const startUp = value(await OpenStartUp.open(here, id!));
		expect(startUp.opened.body.demonstration).toBeUndefined();
		expect(startUp.opened.body.people.map(({ person }) => person)).toEqual(['Eichhold', 'Brandvik']);
		expect(startUp.standing.gates[0]?.state).toBe('not ready');
		expect(startUp.standing.gates[0]?.why.map(({ kind }) => kind)).toContain('values to replace');
	}, 30_000);

	test('is refused to somebody who may not release', async () => {
		const here = await tablet(await tab(name));
		await here.choose('Brandvik');
		const desk = value(await OpenDesk.open(here));
		await desk.approve(SUPERVISOR_PIN);
		expect(desk.problem?.kind).toBe('no-right');
	});
});

describe('values replaced on the plant page', () => {
	test('outlive a reload, become the next revision by a PIN, and lapse proofs of the points that changed', async () => {
		const store = await tab(name);
		const here = await tablet(store);
		const book = value(await PlantBook.open(here));
		await book.replace('volumes/HG-21', { 'volume/value': '31,5' });
		await book.replace('points/AT-211', { 'range/to': '21' });
		const again = value(await PlantBook.open(here));
		expect(Object.keys(again.changes)).toEqual(['volumes/HG-21', 'points/AT-211']);
		const wrong = await again.approve('58290410');
		expect(wrong.ok).toBe(false);
		value(await again.approve(LEAD_PIN));

		const plant = value(await plantOn(here));
		expect(plant.revision).toBe(2);
		expect(plant.volumes[0]?.volume.value).toBe('31,5');
		expect(plant.copied?.replaced).toEqual([
			{ item: 'volumes/HG-21', by: 'Eichhold', at: '2026-12-01T09:00:00+01:00' },
			{ item: 'points/AT-211', by: 'Eichhold', at: '2026-12-01T09:00:00+01:00' },
		]);
		expect(plant.copied?.toReplace).not.toContain('volumes/HG-21');
		const described = allOf(value(await store.events.readLog('site')).events, 'plant described');
		expect(described.map(({ body }) => body.changedPoints)).toEqual([[], ['AT-211']]);
		expect(value(await PlantBook.open(here)).changes).toEqual({});
	}, 30_000);

	test('open gate 0 to a start-up once every one of them is replaced', async () => {
		const here = await tablet(await tab(name));
		const book = value(await PlantBook.open(here));
		for (const item of book.left) await book.replace(item, {});
		value(await book.approve(LEAD_PIN));
		const desk = value(await OpenDesk.open(here));
		desk.startType = 'after-trip';
		desk.title = 'Second';
		expect(desk.left).toBe(0);
		const startUp = value(await OpenStartUp.open(here, (await desk.openNew(LEAD_PIN))!));
		const found = standing(startUp.procedure, startUp.events, startUp.siteLog, startUp.instant());
		expect(found.gates[0]?.why.map(({ kind }) => kind)).not.toContain('values to replace');
	}, 30_000);
});
