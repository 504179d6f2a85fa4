import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkChains, merge, type RecordEvent } from '../../src/lib/record';
import type { EventStore } from '../../src/lib/store';
import { LOG, noteAfter, notes, opening } from '../support/kept-events';
import { value } from '../support/test-site';

/**
 * What every keeper of events must do, whatever it keeps them in.
 *
 * @param open makes an empty store and opens it as often as asked: the tabs of one tablet
 */
export function eventStoreSuite(name: string, open: () => Promise<() => Promise<EventStore>>): void {
	const fresh = async (): Promise<EventStore> => (await open())();
	const log = async (store: EventStore): Promise<readonly RecordEvent[]> => value(await store.readLog(LOG)).events;

	describe(name, () => {
		test('a chain is read back in the order it was written, byte for byte', async () => {
			const store = await fresh();
			const chain = notes(12);
			for (const event of chain) expect(await store.append(event)).toEqual({ ok: true, value: 'saved' });
			expect(await store.readLog(LOG)).toEqual({ ok: true, value: { events: chain, damaged: [] } });
		});

		test('a start-up that nobody opened here is empty, and logs do not mix', async () => {
			const store = await fresh();
			const [note] = notes(1, { log: 'SU-0002' });
			expect(await store.append(note!)).toMatchObject({ ok: true });
			expect(await log(store)).toEqual([]);
		});

		test('an event made before another tab wrote is refused with the head to build on, and nothing is kept', async () => {
			const store = await fresh();
			const first = noteAfter([], 'draught at the mill door');
			const late = noteAfter([], 'no draught');
			await store.append(first);
			expect(await store.append(late)).toEqual({
				ok: false,
				error: { kind: 'chain-moved-on', head: { number: 1, id: first.id } },
			});
			expect(await log(store)).toEqual([first]);
		});

		test('an event beyond the end of the chain is refused', async () => {
			const store = await fresh();
			const [, second] = notes(2);
			expect(await store.append(second!)).toEqual({ ok: false, error: { kind: 'chain-moved-on', head: null } });
			expect(await log(store)).toEqual([]);
		});

		test('an event that is saved again, because its answer was lost, is there once', async () => {
			const store = await fresh();
			const [note] = notes(1);
			await store.append(note!);
			expect(await store.append(note!)).toEqual({ ok: true, value: 'saved' });
			expect(await log(store)).toEqual([note]);
		});

		test('events of other tablets come in once, keep when they came, and leave our own chain alone', async () => {
			const store = await fresh();
			const ours = notes(2);
			for (const event of ours) await store.append(event);
			const theirs = notes(3, { device: 'T-2' });
			const received = '2026-05-04T13:00:00+02:00';
			expect(value(await store.importEvents([...theirs, ...theirs], received))).toEqual({ added: 3, known: 3 });
			expect(value(await store.importEvents(theirs, '2026-05-04T15:00:00+02:00'))).toEqual({ added: 0, known: 3 });
			expect(await log(store)).toEqual([...ours, ...theirs.map((event) => ({ ...event, received }))]);
			expect(await store.append(noteAfter(await log(store), 'after the copy'))).toMatchObject({ ok: true });
		});

		test('importing is set union: in whatever order and portions, the same events are held', async () => {
			const told = [...notes(4), ...notes(4, { device: 'T-2' }), ...notes(2, { device: 'T-3' })];
			const portions = fc.array(fc.shuffledSubarray(told), { maxLength: 4 });
			await fc.assert(
				fc.asyncProperty(portions, async (offers) => {
					const store = await fresh();
					for (const offer of offers) await store.importEvents(offer);
					expect(byId(await log(store))).toEqual(byId(merge(...offers)));
				}),
				{ numRuns: 40 },
			);
		});

		test('two events of one number, from a tablet that was cloned, are both kept and shown as a fork', async () => {
			const store = await fresh();
			const [a, b] = [noteAfter([], 'one tablet'), noteAfter([], 'its clone')];
			await store.importEvents([a]);
			await store.importEvents([b]);
			expect(byId(await log(store))).toEqual(byId([a, b]));
			expect(checkChains(await log(store)).map(({ kind }) => kind)).toEqual(['chain forked']);
		});

		test('however two tabs take turns, the chain never forks and no entry is lost', async () => {
			await fc.assert(
				fc.asyncProperty(fc.scheduler(), fc.integer({ min: 1, max: 4 }), async (turns, count) => {
					const tabOf = await open();
					const write = async (who: string): Promise<void> => {
						const store = await tabOf();
						for (let done = 0; done < count;) {
							await turns.schedule(Promise.resolve(), `${who} reads`);
							const next = noteAfter(await log(store), `${who} ${done}`);
							await turns.schedule(Promise.resolve(), `${who} writes`);
							const appended = await store.append(next);
							if (appended.ok) done++;
							else expect(appended.error.kind).toBe('chain-moved-on');
						}
					};
					await turns.waitFor(Promise.all([write('left'), write('right')]));
					const kept = await log(await tabOf());
					expect(kept).toHaveLength(2 * count);
					expect(checkChains(kept)).toEqual([]);
				}),
				{ numRuns: 40 },
			);
		});

		test('the list of start-ups follows from the events, whatever order they came in', async () => {
			const opened = opening([], { title: 'First start of mill 2', demonstration: true });
			const [later] = notes(1, { device: 'T-2', minute: 0 });
			const note = noteAfter([opened], 'door D-3 closed', { minute: 7 });
			const events = [opened, note, later!];
			await fc.assert(
				fc.asyncProperty(fc.shuffledSubarray(events, { minLength: 3 }), async (told) => {
					const store = await fresh();
					for (const event of told) await store.importEvents([event]);
					await store.importEvents(notes(2, { log: 'site' }));
					expect(value(await store.listStartUps())).toEqual([
						{
							id: LOG,
							title: 'First start of mill 2',
							opened: opened.entered,
							lastEntered: note.entered,
							events: 3,
							sealed: false,
							demonstration: true,
						},
					]);
				}),
			);
		});

		test('another tab is told of every entry, and no more once it stops listening', async () => {
			const tabOf = await open();
			const [writer, reader] = [await tabOf(), await tabOf()];
			const told: number[] = [];
			const stop = reader.watch(LOG, (events) => told.push(events));
			const [one, two, three] = notes(3);
			await until(() => told.includes(0));
			await writer.append(one!);
			await until(() => told.includes(1));
			await writer.importEvents([two!]);
			await until(() => told.includes(2));
			stop();
			await writer.append(three!);
			await new Promise((resolve) => setTimeout(resolve, 50));
			expect(told).not.toContain(3);
		});
	});
}

const byId = (events: readonly RecordEvent[]) => new Map(events.map((event) => [event.id, event]));

/** A change travels between tabs in its own time; the test's own limit ends a wait in vain. */
async function until(holds: () => boolean): Promise<void> {
	while (!holds()) await new Promise((resolve) => setTimeout(resolve, 5));
}
