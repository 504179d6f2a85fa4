import { expect, test } from 'vitest';
import { LOG, noteAfter, notes } from '../support/kept-events';
import { freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

const AT = '2026-05-04T13:30:00+02:00';

test('entries are counted as only here until a copy is known to hold them', async () => {
	const store = await tab(freshName());
	const chain = notes(5);
	for (const event of chain) await store.events.append(event);
	for (const event of notes(2, { log: 'site' })) await store.events.append(event);
	expect(value(await store.health.look()).onlyHere).toEqual({ [LOG]: 5, site: 2 });

	await store.health.copyMade({ at: AT, to: 'tablet T-2' }, [{ log: LOG, device: 'T-1', number: 4 }]);
	expect(value(await store.health.look())).toMatchObject({
		onlyHere: { [LOG]: 1, site: 2 },
		lastCopy: { at: AT, to: 'tablet T-2' },
	});
	await store.events.append(noteAfter(chain, 'after the copy'));
	expect(value(await store.health.look()).onlyHere).toEqual({ [LOG]: 2, site: 2 });
});

test('what came from another tablet is held there as well and is not counted', async () => {
	const store = await tab(freshName());
	await store.events.importEvents(notes(3, { device: 'T-2' }));
	expect(value(await store.health.look())).toEqual({ onlyHere: {} });
});

test('a browser that knows nothing of persistence has not granted it', async () => {
	const store = await tab(freshName());
	expect(await store.health.askToPersist()).toBe(false);
});
