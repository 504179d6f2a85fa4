import { expect, test } from 'vitest';
import { eventStoreSuite } from './event-store-suite';
import { LOG, NOON, noteAfter, notes } from '../support/kept-events';
import { answer, everythingIn, freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

eventStoreSuite('the tablet keeps events in IndexedDB', async () => {
	const name = freshName();
	return Promise.resolve(async () => (await tab(name)).events);
});

test('the draft an entry was made from goes in the same moment as the entry comes', async () => {
	const store = await tab(freshName());
	const key = { startUp: LOG, step: 'G2-03', person: 'P-01' };
	await store.drafts.save({ ...key, typed: { o2: '4,9' }, saved: NOON });
	const [note] = notes(1);
	await store.events.append(note!, { draft: key });
	expect(await store.drafts.read(key)).toEqual({ ok: true, value: undefined });
});

test('a refused entry leaves its draft where it was', async () => {
	const store = await tab(freshName());
	const draft = { startUp: LOG, step: 'G2-03', person: 'P-01', typed: { o2: '4,9' }, saved: NOON };
	await store.drafts.save(draft);
	await store.events.append(notes(1)[0]!);
	expect(await store.events.append(noteAfter([], 'made too early'), { draft })).toMatchObject({ ok: false });
	expect(await store.drafts.read(draft)).toEqual({ ok: true, value: draft });
});

test('a damaged row is named beside the sound ones, never left out in silence', async () => {
	const name = freshName();
	const store = await tab(name);
	const [first, second, third] = notes(3);
	for (const event of [first!, second!, third!]) await store.events.append(event);
	const { log, device, number, id } = second!;
	const db = await answer(indexedDB.open(name));
	const rows = db.transaction('events', 'readwrite').objectStore('events');
	await answer(rows.put({ log, device, number, id, text: second!.text.replace('note 2', 'note 9') }));
	await answer(rows.put({ log, device, number: 3, id: third!.id, text: third!.text.slice(0, -1) }));
	db.close();

	const { events, damaged } = value(await store.events.readLog(LOG));
	expect(events).toEqual([first]);
	expect(damaged).toMatchObject([
		{ log, device, number, id, error: { kind: 'not-the-kept-event' } },
		{ log, device, number: 3, id: third!.id, error: { kind: 'not-json' } },
	]);
});

test('what was hashed and signed is kept as it was, with its signature and when it came', async () => {
	const name = freshName();
	const store = await tab(name);
	const event = { ...notes(1)[0]!, signature: 'c2lnbmVk' };
	await store.events.importEvents([event], NOON);
	const { log, device, number, id, text, signature } = event;
	expect((await everythingIn(name)).events).toEqual([{ log, device, number, id, text, signature, received: NOON }]);
});
