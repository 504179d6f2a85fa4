import 'fake-indexeddb/auto';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { beforeAll, beforeEach, describe, expect, test } from 'vitest';
import {
	attachSeries,
	beginShift,
	calculate,
	enter,
	findingImpact,
	handOverShift,
	OpenStartUp,
	playDemonstration,
	recordPlantEvent,
	DEMONSTRATION_PIN,
	release,
	sheetOf,
	suppliedTrend,
	Tablet,
	temporaryStates,
	unconfirmedImpact,
} from '../../src/lib/app';
import { printInstant } from '../../src/lib/record';
import { openStore, type Store } from '../../src/lib/store';
import { speaker } from '../../src/lib/wording';
import { freshName, tab } from '../support/open-stores';
import { TestClock } from '../support/tablet-clock';
import { value } from '../support/test-site';

const DEMO = join(import.meta.dirname, '../../static/demo');
const read = async (name: string): Promise<Uint8Array<ArrayBuffer>> => new Uint8Array(await readFile(join(DEMO, name)));

const NOON = Date.parse('2026-12-01T12:00:20Z');
const name = freshName();
const clock = new TestClock(NOON);
let store: Store;
let id: string;

beforeAll(async () => {
	store = value(await openStore(name, { now: '2026-12-01T12:00:20Z' }));
	id = value(await playDemonstration(store, clock, read, () => undefined));
}, 180_000);

beforeEach(async () => {
	store = await tab(name);
});

const opened = async (): Promise<OpenStartUp> =>
	value(await OpenStartUp.open(value(await Tablet.open(store, clock)), id));

async function inShift(person: string): Promise<OpenStartUp> {
	const startUp = await opened();
	await startUp.tablet.choose(person);
	value(await beginShift(startUp, DEMONSTRATION_PIN));
	return startUp;
}

const stateOf = (startUp: OpenStartUp, step: string): string | undefined =>
	startUp.standing.steps.find((one) => one.step === step)?.state;
const gateOf = (startUp: OpenStartUp, gate: number): string | undefined =>
	startUp.standing.gates.find((one) => one.gate === gate)?.state;

describe('the demonstration, taken up in the middle of its purge', () => {
	test('is now: two gates are released, the third is not, and the newest entry is some minutes old', async () => {
		const startUp = await opened();
		expect([0, 1, 2].map((gate) => gateOf(startUp, gate))).toEqual(['released', 'released', 'not ready']);
		expect(startUp.id).toBe('FM-1/2026-12-01');
		const newest = Math.max(...startUp.log.map(({ enteredAt }) => enteredAt));
		expect((NOON - newest) / 60_000).toBeGreaterThan(10);
		expect((NOON - newest) / 60_000).toBeLessThan(15);
	});

	test('an entry needs a shift, begun with the PIN of who holds the tablet', async () => {
		const startUp = await opened();
		await startUp.tablet.choose('TechA');
		expect(await enter(startUp, '2.23', {})).toMatchObject({ error: { kind: 'no-shift' } });
		expect(await beginShift(startUp, '11223345')).toMatchObject({ error: { kind: 'wrong-pin', left: 9 } });
		expect(await beginShift(startUp, DEMONSTRATION_PIN)).toEqual({ ok: true, value: 'signed' });
	});

	test('what was saved can be taken back for ten seconds, and is part of the record after them', async () => {
		const startUp = await inShift('TechA');
		const before = startUp.log.length;
		value(await enter(startUp, '2.26', watch('3,1')));
		expect(startUp.events).toHaveLength(before + 1);
		value(await startUp.takeBack());
		expect(startUp.events).toHaveLength(before);
		value(await enter(startUp, '2.26', watch('3,1')));
		clock.goOn(10_000);
		await startUp.keepHeld();
		expect(startUp.log).toHaveLength(before + 1);
		startUp.close();
	});

	test('what was saved and not taken back is part of the record when the tablet is opened again', async () => {
		const startUp = await inShift('TechA');
		const before = startUp.log.length;
		value(await enter(startUp, '2.26', watch('3,0')));
		startUp.close();
		const again = await opened();
		expect(again.log).toHaveLength(before + 1);
		expect(again.log.at(-1)).toMatchObject({ kind: 'entry', body: { step: '2.26' } });
	});

	test('two tabs write one after the other: nothing is lost and the chain does not fork', async () => {
		const one = await inShift('TechA');
		const two = await inShift('TechA');
		const before = two.log.length;
		value(await enter(one, '2.26', watch('3,2')));
		value(await enter(two, '2.26', watch('3,3')));
		value(await two.keepHeld());
		value(await one.keepHeld());
		const read = value(await store.events.readLog(id)).events.filter(({ device }) => device === 'T-1');
		expect(read).toHaveLength(before + 2);
		expect(new Set(read.map(({ number }) => number)).size).toBe(read.length);
	});

	test('before an instrument is signed as bad, the sheet says what falls with it and since when it was last good', async () => {
		const startUp = await inShift('TechA');
		const asFound = { error: '-0.6', unit: '%', tolerance: '0.2' };
		const { impact, lastGood, values } = findingImpact(startUp, { instrument: 'AT-213', asFound }, clock.now());
		const fallen = impact.steps.map(({ step }) => step);
		expect(fallen).toContain('2.3');
		expect(fallen).not.toContain('2.2');
		const checked = startUp.log.find((event) => event.kind === 'entry' && event.body.step === '2.3');
		expect(lastGood).toBe(checked?.observed ?? checked?.entered);
		// 7.9 read by an analyser that reads 0.6 low was 8.5.
		expect([...values.values()].flat()).toContainEqual(expect.objectContaining({ typed: '7,9', corrected: '8.5' }));
		expect(stateOf(startUp, '2.3')).toBe('stands');
	});

	test('a shift is handed over by two PINs: both sign the same words, and who comes goes on without another PIN', async () => {
		const startUp = await inShift('TechA');
		const before = startUp.log.length;
		const how = { comes: 'TechB', from: ['TechA'], to: ['TechB'], confirmed: true, summary: 'Purge goes on.' };
		const pins = { goes: DEMONSTRATION_PIN, comes: '11223345' };
		expect(await handOverShift(startUp, { ...how, pins })).toMatchObject({
			error: { whose: 'comes', problem: { kind: 'wrong-pin' } },
		});
		expect(startUp.log).toHaveLength(before);
		value(await handOverShift(startUp, { ...how, pins: { ...pins, comes: DEMONSTRATION_PIN } }));
		const signed = startUp.log.flatMap((event) => (event.kind === 'shift hand-over' ? [event] : []));
		expect(signed.map(({ person, body }) => [person, body.summary])).toEqual([
			['TechA', 'Purge goes on.'],
			['TechB', 'Purge goes on.'],
		]);
		expect(startUp.tablet.person?.person).toBe('TechB');
		expect(startUp.entrySigner().ok).toBe(true);
		expect(startUp.tablet.shifts.stateOf('TechA', id)).toBe('none');
	});

	test('a hand-over without confirming the temporary states would lapse the step that holds them', async () => {
		const startUp = await inShift('TechA');
		expect(temporaryStates(startUp).map((state) => state.id)).toEqual(['0.8']);
		expect(unconfirmedImpact(startUp).steps.map(({ step }) => step)).toEqual(['0.8']);
	});

	test('with the supplied trend the purge is adequate, and Gate 2 is released by who performed none of its steps', async () => {
		const startUp = await inShift('TechA');
		const values = { 'AT-211': '3,1', 'AT-212': '3,3', 'AT-213': '6,4', 'AT-214': '3.8' };
		value(await enter(startUp, '2.22', { values: measuring(values) }));
		value(await enter(startUp, '2.23', { confirmed: confirmsOf(startUp, '2.23') }));
		value(await attachSeries(startUp, '2.21', value(await suppliedTrend(store, read, 'purge-1.csv'))));
		value(await calculate(startUp, '2.25'));
		expect(stateOf(startUp, '2.25')).toBe('stands');
		value(await calculate(startUp, '2.27'));
		value(await enter(startUp, '2.26', watch('3,1')));
		expect(gateOf(startUp, 2)).toBe('ready');
		const sheet = () => sheetOf(startUp, 2, 'released', speaker('en'), { skipped: 'no second place in reach' });
		const sign = () => release(startUp, { gate: 2, pin: DEMONSTRATION_PIN, shown: sheet() });
		expect(await sign()).toMatchObject({ error: { kind: 'refused-act' } });
		expect(startUp.log.at(-1)).toMatchObject({ kind: 'refused act', body: { act: 'release', gate: 2 } });
		await startUp.tablet.choose('SupA');
		const stale = sheet();
		value(await startUp.reload());
		expect(await release(startUp, { gate: 2, pin: '90817263', shown: sheet() })).toMatchObject({
			error: { kind: 'wrong-pin' },
		});
		expect(await sign()).toEqual({ ok: true, value: 'signed' });
		expect(gateOf(startUp, 2)).toBe('released');
		expect(await release(startUp, { gate: 2, pin: DEMONSTRATION_PIN, shown: stale })).toMatchObject({
			error: { kind: 'sheet-changed' },
		});
	});

	test('a fan stop told as just now lapses at once what rests on the fan, in whatever part of a second it is told', async () => {
		const startUp = await inShift('TechA');
		clock.goOn(650);
		await startUp.reload();
		const begin = printInstant(startUp.now, startUp.plant.utcOffsetMinutes);
		value(await recordPlantEvent(startUp, { what: 'fan-stop', begin }));
		expect(stateOf(startUp, '2.25')).toBe('lapsed');
		expect(gateOf(startUp, 2)).toBe('lapsed');
		startUp.close();
	});
});

const watch = (typed: string) =>
	({
		values: { 'AT-211': typed, 'AT-212': '3,3', 'AT-213': '6,3', 'AT-214': '3,8' },
		flow: 'unbroken',
	}) as const;

const measuring = (values: { readonly [field: string]: string }) =>
	Object.fromEntries(
		Object.entries(values).map(([field, typed]) => [field, { typed, analyserMode: 'measuring' as const }]),
	);

function confirmsOf(startUp: OpenStartUp, id: string): readonly string[] {
	const step = startUp.procedure.steps.find((one) => one.id === id);
	return step?.kind === 'confirm' ? step.confirms.map((one) => one.id) : [];
}
