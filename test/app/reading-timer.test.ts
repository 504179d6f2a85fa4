import 'fake-indexeddb/auto';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import {
	beginShift,
	DEMONSTRATION_PIN,
	enter,
	OpenStartUp,
	playDemonstration,
	ReadingTimer,
	suppliedTrends,
	StepDesk,
	Tablet,
} from '../../src/lib/app';
import { utf8 } from '../../src/lib/base';
import { openStore, type Store } from '../../src/lib/store';
import { freshName } from '../support/open-stores';
import { TestClock } from '../support/tablet-clock';
import { value } from '../support/test-site';

const DEMO = join(import.meta.dirname, '../../static/demo');
const read = async (name: string): Promise<Uint8Array<ArrayBuffer>> => new Uint8Array(await readFile(join(DEMO, name)));
const clock = new TestClock(Date.parse('2026-12-01T12:00:20Z'));
let store: Store;
let startUp: OpenStartUp;

beforeAll(async () => {
	store = value(await openStore(freshName(), { now: '2026-12-01T12:00:20Z' }));
	const id = value(await playDemonstration(store, clock, read, () => undefined));
	startUp = value(await OpenStartUp.open(value(await Tablet.open(store, clock)), id));
	await startUp.tablet.choose('TechA');
	value(await beginShift(startUp, DEMONSTRATION_PIN));
}, 180_000);

const timerOf = (id: string): ReadingTimer => {
	const step = value(startUp.stepOf(id));
	if (step.kind !== 'quick sheet' && step.kind !== 'watch') throw new Error(`${id} has no rounds`);
	return new ReadingTimer(startUp, step);
};
const ROUND = Object.fromEntries(['AT-211', 'AT-212', 'AT-213', 'AT-214'].map((tag) => [tag, '3,1']));

async function read226(): Promise<void> {
	value(await enter(startUp, '2.26', { values: ROUND, flow: 'unbroken' }));
	value(await startUp.keepHeld());
}

/** What was read from the store has arrived. */
const settled = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 50));

describe('the timer of readings', () => {
	test('of a quick sheet rings once when the next round is due, and goes on after a reload', async () => {
		let rings = 0;
		const timer = timerOf('2.22');
		const stop = timer.run(() => rings++);
		await settled();
		expect(timer.secondsLeft).toBeUndefined();
		await timer.choose(2);
		expect(timer.secondsLeft).toBe(120);
		for (let second = 0; second < 125; second++) clock.goOn(1000);
		expect(rings).toBe(1);
		stop();
		const again = timerOf('2.22');
		again.run(() => undefined);
		await settled();
		expect(again.everyMinutes).toBe(2);
		expect(again.secondsLeft).toBe(-5);
		await again.choose(undefined);
		expect(timerOf('2.22').secondsLeft).toBeUndefined();
	});

	test('of a watch has the time of the procedure, and counts the rounds', async () => {
		const timer = timerOf('2.26');
		const before = timer.rounds;
		await read226();
		expect(timer.everyMinutes).toBe(30);
		expect(timer.rounds).toBe(before + 1);
		expect(timerOf('2.26').secondsLeft).toBe(30 * 60);
	});
});

describe('a trend that is being read in', () => {
	test('is found again after a reload, with what was corrected of it', async () => {
		const desk = value(await StepDesk.open(startUp, '2.21'));
		const file = 'when;at 211\n01/12/2026 12:00:00;1,5\n01/12/2026 12:00:10;1,4\n';
		await desk.choose({ name: 'recorder.csv', bytes: utf8(file) });
		expect(desk.trend).toMatchObject({ error: { kind: 'not-a-time' } });
		desk.readAs({ time: 'day first' });
		expect(desk.columns).toEqual([{ column: 'at 211', point: 'AT-211' }]);
		desk.useColumns([{ column: 'at 211', point: 'AT-212' }]);
		await settled();
		const again = value(await StepDesk.open(startUp, '2.21'));
		expect(again.file?.name).toBe('recorder.csv');
		expect(again.trend).toMatchObject({ ok: true, value: { decimalMark: ',' } });
		expect(again.columns).toEqual([{ column: 'at 211', point: 'AT-212' }]);
	});

	test('that the demonstration supplies is of the past: the second purge has just ended', async () => {
		const offered = await suppliedTrends(startUp, read);
		expect(offered.map(({ file }) => file.name)[0]).toBe('purge-2.csv');
		expect(offered.map(({ file }) => file.name)).toContain('purge-1.csv');
		for (const { from, to } of offered) {
			expect(Date.parse(to)).toBeLessThanOrEqual(clock.now());
			expect(Date.parse(from)).toBeLessThan(Date.parse(to));
		}
		expect(clock.now() - Date.parse(offered[0]?.to ?? '')).toBeLessThan(60_000);
	});
});
