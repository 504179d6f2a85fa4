import { IDBObjectStore } from 'fake-indexeddb';
import { afterEach, describe, expect, test } from 'vitest';
import { LOG, NOON, noteAfter, notes } from '../support/kept-events';
import { freshName, tab } from '../support/open-stores';

/** A medium on which nothing fits any more, until somebody makes room. */
const prototype = IDBObjectStore.prototype as unknown as Record<
	'add' | 'put' | 'clear',
	(...given: unknown[]) => unknown
>;
const { add, put, clear } = prototype;
let isFull = false;

for (const [name, original] of Object.entries({ add, put }) as ['add' | 'put', typeof add][])
	prototype[name] = function (...given) {
		if (isFull) throw new DOMException('full', 'QuotaExceededError');
		return original.apply(this, given);
	};
prototype.clear = function (...given) {
	isFull = false;
	return clear.apply(this, given);
};

afterEach(() => (isFull = false));

describe('a tablet that is full', () => {
	test('keeps the next entry out of the room that was set aside, and says that it is used up', async () => {
		const store = await tab(freshName());
		expect(await store.reserve.keep()).toBe('kept');
		const [first] = notes(1);
		expect(await store.events.append(first!)).toMatchObject({ ok: true });
		isFull = true;
		expect(await store.events.append(noteAfter([first!], 'fan runs'))).toEqual({ ok: true, value: 'saved' });
		expect(store.reserve.isSpent()).toBe(true);
		isFull = true;
		const draft = { startUp: LOG, step: 'G1-02', person: 'P-01', typed: { dp: '12.5' }, saved: NOON };
		expect(await store.drafts.save(draft)).toEqual({ ok: false, error: { kind: 'storage-full' } });
	});

	test('gives no room away to a photo', async () => {
		const store = await tab(freshName());
		await store.reserve.keep();
		isFull = true;
		const photo = await store.attachments.save(new Uint8Array([1]), { name: 'door.jpg', mediaType: 'image/jpeg' });
		expect(photo).toEqual({ ok: false, error: { kind: 'storage-full' } });
		expect(store.reserve.isSpent()).toBe(false);
	});

	test('says so at once when no room could be set aside', async () => {
		const store = await tab(freshName());
		isFull = true;
		expect(await store.reserve.keep()).toBe('no room');
		expect(store.reserve.isSpent()).toBe(true);
		isFull = false;
		expect(await store.reserve.keep()).toBe('kept');
		expect(store.reserve.isSpent()).toBe(false);
	});
});
