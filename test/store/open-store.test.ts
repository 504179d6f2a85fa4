import 'fake-indexeddb/auto';
import { describe, expect, test, vi } from 'vitest';
import { makeEntryKey } from '../../src/lib/identity';
import { openStore, type Memory, type Store } from '../../src/lib/store';
import { LOG, NOON, notes } from '../support/kept-events';
import { answer, freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';
import { VERSIONS } from '../../src/lib/store/db';

/** One version above what this app knows. */
const NEWER = (VERSIONS.at(-1)?.version ?? 0) + 1;

function memory(kept: string | null = null): Memory {
	return { read: () => kept, write: (text) => (kept = text) };
}

test('a tablet whose database was erased says so until it was told to a person, and never again', async () => {
	const [name, remembered] = [freshName(), memory()];
	const before = await tab(name, { memory: remembered });
	expect(before.erased).toBeUndefined();
	before.close();
	await answer(indexedDB.deleteDatabase(name));

	const later = '2026-05-06T06:00:00+02:00';
	const after = await tab(name, { memory: remembered, now: later });
	expect(after.erased?.made).toBe(NOON);
	after.close();
	const again = await tab(name, { memory: remembered, now: later });
	expect(again.erased?.made).toBe(NOON);
	again.erased?.acknowledge();
	again.close();
	expect((await tab(name, { memory: remembered, now: later })).erased).toBeUndefined();
});

test('every transaction that writes waits for the medium, not for the system to write some day', async () => {
	const asked: (readonly [mode: string, durability: string])[] = [];
	const transaction = vi.spyOn(IDBDatabase.prototype, 'transaction');
	const store = await tab(freshName());
	await store.events.append(notes(1)[0]!);
	await store.drafts.save({ startUp: LOG, step: 'note', person: 'P-01', typed: '', saved: NOON });
	for (const { type, value: made } of transaction.mock.results)
		if (type === 'return') asked.push([made.mode, made.durability]);
	transaction.mockRestore();
	const writing = asked.filter(([mode]) => mode === 'readwrite');
	expect(writing.length).toBeGreaterThanOrEqual(3);
	expect(new Set(writing.map(([, durability]) => durability))).toEqual(new Set(['strict']));
});

test('a tablet that still has its database but forgot it is not called erased', async () => {
	const name = freshName();
	(await tab(name, { memory: memory() })).close();
	expect((await tab(name, { memory: memory() })).erased).toBeUndefined();
});

test('a memory that nobody can read starts anew and stops no tablet', async () => {
	const [name, remembered] = [freshName(), memory('{"id":')];
	const before = await tab(name, { memory: remembered });
	expect(before.erased).toBeUndefined();
	before.close();
	await answer(indexedDB.deleteDatabase(name));
	expect((await tab(name, { memory: remembered })).erased?.made).toBe(NOON);
});

describe('a connection that the browser loses', () => {
	const lost = async (name: string, meanwhile: () => Promise<unknown>): Promise<Store> => {
		const spy = vi.spyOn(IDBDatabase.prototype, 'transaction');
		const store = await tab(name);
		await store.events.append(notes(1)[0]!);
		for (const connection of new Set(spy.mock.contexts as readonly IDBDatabase[])) connection.close();
		spy.mockRestore();
		await meanwhile();
		return store;
	};

	test('is made again, and the tablet goes on', async () => {
		const store = await lost(freshName(), () => Promise.resolve());
		expect(value(await store.events.readLog(LOG)).events).toEqual(notes(1));
	});

	test('is not made again to an empty database, as if nothing had been there', async () => {
		const name = freshName();
		const store = await lost(name, () => answer(indexedDB.deleteDatabase(name)));
		for (let twice = 0; twice < 2; twice++)
			expect(await store.events.append(notes(1)[0]!)).toEqual({ ok: false, error: { kind: 'storage-closed' } });
	});
});

test('an app that is older than the database leaves it alone and says so', async () => {
	const name = freshName();
	const newer = await answer(indexedDB.open(name, 10 * NEWER));
	newer.close();
	expect(await openStore(name, { now: NOON })).toEqual({
		ok: false,
		error: { kind: 'storage-newer', version: NEWER, known: NEWER - 1 },
	});
	const left = await answer(indexedDB.open(name));
	expect([left.version, [...left.objectStoreNames]]).toEqual([10 * NEWER, []]);
	left.close();
});

test('a tab that hangs on an older database is named as what blocks', async () => {
	const name = freshName();
	const hanging = await answer(indexedDB.open(name, 5));
	expect(await openStore(name, { now: NOON })).toEqual({ ok: false, error: { kind: 'storage-blocked' } });
	hanging.close();
});

test('when a newer app takes the database over, this tab is told, and refuses to write', async () => {
	const name = freshName();
	const store = await tab(name);
	let told = 0;
	store.onClosed(() => told++);
	const newer = await answer(indexedDB.open(name, 10 * NEWER));
	expect(told).toBe(1);
	expect(await store.events.append(notes(1)[0]!)).toEqual({ ok: false, error: { kind: 'storage-closed' } });
	expect(await store.events.readLog(LOG)).toEqual({ ok: false, error: { kind: 'storage-closed' } });
	newer.close();
});

test('a store that the app closes itself is no alarm', async () => {
	const store = await tab(freshName());
	let told = 0;
	store.onClosed(() => told++);
	store.close();
	expect(told).toBe(0);
});

test('the tablet keeps its own key as a key: it signs after reopening and gives nothing away', async () => {
	const name = freshName();
	const before = await tab(name);
	const key = await makeEntryKey();
	await before.site.write('tablet', { device: 'T-1', label: 'Tablet 1', certificate: new Uint8Array(2), key });
	await before.site.write('settings', { look: 'night', gloves: true });
	before.close();
	const after = await tab(name);
	const kept = value(await after.site.read('tablet'))!;
	expect(kept.key.publicKey).toBe(key.publicKey);
	await expect(crypto.subtle.exportKey('pkcs8', kept.key.privateKey)).rejects.toThrow();
	expect(await after.site.read('settings')).toEqual({ ok: true, value: { look: 'night', gloves: true } });
	expect(await after.site.read('trust list')).toEqual({ ok: true, value: undefined });
});
