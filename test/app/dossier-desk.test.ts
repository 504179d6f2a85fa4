import 'fake-indexeddb/auto';
import { beforeAll, beforeEach, describe, expect, test } from 'vitest';
import {
	checkFile,
	DEMONSTRATION_PIN,
	DossierDesk,
	OpenStartUp,
	outsideSeal,
	note,
	beginShift,
	seal,
	sealSheetOf,
	stillOpen,
	Tablet,
} from '../../src/lib/app';
import { doDossierWork } from '../../src/lib/app/dossier-work';
import type { RunDossierJob } from '../../src/lib/app/dossier-job';
import { openStore, type Store } from '../../src/lib/store';
import { speaker } from '../../src/lib/wording';
import { demoFiles } from '../support/demo-files';
import { freshName, tab } from '../support/open-stores';
import { playUpToTheSeal } from '../support/played-tablet';
import { TestClock } from '../support/tablet-clock';
import { value } from '../support/test-site';

const NOON = Date.parse('2026-12-01T12:00:20Z');
const name = freshName();
const clock = new TestClock(NOON);
let store: Store;
let id: string;

beforeAll(async () => {
	store = value(await openStore(name, { now: '2026-12-01T12:00:20Z' }));
	id = await playUpToTheSeal(store, demoFiles(), NOON);
}, 180_000);

beforeEach(async () => {
	store = await tab(name);
});

const opened = async (): Promise<OpenStartUp> =>
	value(await OpenStartUp.open(value(await Tablet.open(store, clock)), id));

/** The same work as in the worker, here. */
const here: RunDossierJob = (job) => ({ answer: doDossierWork(job, () => undefined), cancel: () => undefined });

const personOf = (startUp: OpenStartUp, id: string) => {
	const person = startUp.tablet.people.find((one) => one.person === id);
	if (person === undefined) throw new Error(`nobody is ${id}`);
	return person;
};

describe('from the last release to the closed file', () => {
	test('before the seal every gate is released and nothing is open', async () => {
		const open = stillOpen(await opened());
		expect({ gates: open.gates, deviations: open.deviations, refusals: open.refusals }).toEqual({
			gates: [],
			deviations: [],
			refusals: [],
		});
		expect(open.tablets.map(({ device }) => device)).toEqual(['T-1']);
	});

	test('a technician who tries to seal is refused; the attempt is kept and the record goes on', async () => {
		const startUp = await opened();
		await startUp.tablet.choose('TechA');
		const done = await seal(startUp, { pin: DEMONSTRATION_PIN, shown: sealSheetOf(startUp, speaker('en')) });
		expect(done).toMatchObject({ error: { kind: 'refused-act' } });
		expect(startUp.isSealed).toBe(false);
		expect(startUp.log.at(-1)).toMatchObject({ kind: 'refused act', body: { act: 'seal' } });
		await startUp.tablet.choose('QA');
	});

	test('a wrong PIN seals nothing, and a sheet that the record has outrun is shown anew', async () => {
		const startUp = await opened();
		const shown = sealSheetOf(startUp, speaker('en'));
		expect(await seal(startUp, { pin: '11223345', shown })).toMatchObject({ error: { kind: 'wrong-pin' } });
		const old = { ...shown, events: shown.events - 1 };
		expect(await seal(startUp, { pin: DEMONSTRATION_PIN, shown: old })).toMatchObject({
			error: { kind: 'sheet-changed' },
		});
		expect(startUp.isSealed).toBe(false);
	});

	test('QA seals; a second seal is refused and writes nothing', async () => {
		const startUp = await opened();
		value(await seal(startUp, { pin: DEMONSTRATION_PIN, shown: sealSheetOf(startUp, speaker('en')) }));
		expect(startUp.isSealed).toBe(true);
		const events = startUp.log.length;
		const again = await seal(startUp, { pin: DEMONSTRATION_PIN, shown: sealSheetOf(startUp, speaker('en')) });
		expect(again).toMatchObject({ error: { kind: 'sealed' } });
		expect(startUp.log.length).toBe(events);
	});

	test('the unfinished file and its signatures are there after a reload; the closed file passes every check', async () => {
		const first = await opened();
		const desk = value(await DossierDesk.open(first, here));
		expect(desk.pdf).toBeUndefined();
		value(await desk.build('en'));
		expect(desk.next?.meaning).toBe('performed');
		expect(await desk.sign(personOf(first, 'QA'), DEMONSTRATION_PIN)).toMatchObject({
			error: { kind: 'not-this-signature' },
		});
		expect(await desk.sign(personOf(first, 'TechA'), '11223345')).toMatchObject({ error: { kind: 'wrong-pin' } });
		value(await desk.sign(personOf(first, 'Lead'), DEMONSTRATION_PIN));

		const startUp = await opened();
		const again = value(await DossierDesk.open(startUp, here));
		expect(again.pdf).toEqual(desk.pdf);
		expect(again.places.map(({ signed }) => signed?.person)).toEqual(['Lead', undefined, undefined]);
		// Who performed does not review.
		expect(again.mayGive(again.next!).map(({ person }) => person)).toEqual(['ProcEng']);
		value(await again.sign(personOf(startUp, 'ProcEng'), DEMONSTRATION_PIN));
		value(await again.sign(personOf(startUp, 'SupA'), DEMONSTRATION_PIN));
		expect(again.isClosed).toBe(true);

		const root = value(await store.site.read('root certificate'));
		const report = await checkFile({ name: 'x.pdf', bytes: again.pdf!, root, now: '2026-12-01T12:01:00Z' });
		expect(report.checks.filter(({ outcome }) => outcome !== 'passed')).toEqual([]);
		expect(report.class).toBe('TOTAL-PASSED');
		const kept = value(await store.attachments.list()).filter(({ mediaType }) => mediaType === 'application/pdf');
		expect(kept.map(({ bytes }) => bytes)).toContain(again.pdf!.length);
	}, 120_000);

	test('a sealed record takes no more entries; an addendum stays outside the file and is counted', async () => {
		const startUp = await opened();
		expect(outsideSeal(startUp)).toEqual([]);
		value(await beginShift(startUp, DEMONSTRATION_PIN));
		expect(await note(startUp, { text: 'seen afterwards' })).toEqual({
			ok: false,
			error: { kind: 'sealed', startUp: id },
		});
		const key = value(await startUp.tablet.openKey('QA', DEMONSTRATION_PIN));
		value(await startUp.write('addendum', { text: 'seen afterwards' }, { key }));
		expect(outsideSeal(startUp).map(({ kind }) => kind)).toEqual(['addendum']);
	});
});
