import { IDBObjectStore } from 'fake-indexeddb';
import { afterAll, afterEach, beforeAll, describe, expect, test } from 'vitest';
import { checkChains } from '../../src/lib/record';
import type { Store } from '../../src/lib/store';
import { LOG, NOON, noteAfter, notes } from '../support/kept-events';
import { everythingIn, freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

/** Fails the write with this number, and with `sticky` every later one, as a dying medium does. */
let fault: { readonly at: number; readonly sticky: boolean; writes: number; fired: number } | undefined;

const methods = ['put', 'add', 'delete'] as const;
const writing: { [method: string]: unknown } = IDBObjectStore.prototype as never;
const originals = methods.map((method) => writing[method] as (...given: unknown[]) => unknown);

beforeAll(() => {
	methods.forEach((method, i) => {
		writing[method] = function (...given: unknown[]) {
			if (fault !== undefined && fails(fault)) throw new DOMException('injected', 'UnknownError');
			return originals[i]?.apply(this, given);
		};
	});
});

afterEach(() => (fault = undefined));

afterAll(() => {
	methods.forEach((method, i) => (writing[method] = originals[i]));
});

function fails(of: NonNullable<typeof fault>): boolean {
	const hit = of.sticky ? ++of.writes >= of.at : ++of.writes === of.at;
	if (hit) of.fired++;
	return hit;
}

const held = notes(3);
const draft = { startUp: LOG, step: 'G1-02', person: 'P-01', typed: { dp: '12.5' }, saved: NOON };

type Work = {
	readonly what: string;
	readonly writes: number;
	readonly run: (store: Store) => Promise<{ readonly ok: boolean; readonly error?: unknown }>;
};

const works: readonly Work[] = [
	{
		what: 'an entry made from a draft',
		writes: 4,
		run: ({ events }) => events.append(noteAfter(held, 'fan runs'), { draft }),
	},
	{
		what: 'a copy that comes in',
		writes: 5,
		run: ({ events }) => events.importEvents([...notes(3, { device: 'T-2' }), ...notes(1, { log: 'site' })]),
	},
	{ what: 'a draft', writes: 1, run: ({ drafts }) => drafts.save({ ...draft, typed: { dp: '12.7' } }) },
	{
		what: 'a photo',
		writes: 1,
		run: ({ attachments }) =>
			attachments.save(new Uint8Array([1, 2, 3]), { name: 'door.jpg', mediaType: 'image/jpeg' }),
	},
	{ what: 'a setting', writes: 1, run: ({ site }) => site.write('settings', { look: 'night' }) },
	{
		what: 'a copy that was made',
		writes: 2,
		run: ({ health }) => health.copyMade({ at: NOON, to: 'stick' }, [{ log: LOG, device: 'T-1', number: 3 }]),
	},
];

describe.each(works)('$what', ({ run, writes }) => {
	test.each([false, true])(
		'is kept whole or not at all at every failing write (sticky: %s), and a second try works',
		async (sticky) => {
			let points = 0;
			for (let at = 1; ; at++) {
				const { name, store } = await someRecord();
				const before = await everythingIn(name);
				fault = { at, sticky, writes: 0, fired: 0 };
				const answer = await run(store);
				const { fired } = fault;
				fault = undefined;
				if (fired === 0) break;
				points++;
				expect(answer).toEqual({
					ok: false,
					error: { kind: 'storage-failed', name: 'UnknownError', message: 'injected' },
				});
				expect(await everythingIn(name)).toEqual(before);
				expect(await run(store)).toMatchObject({ ok: true });
				const { events, damaged } = value(await store.events.readLog(LOG));
				expect([checkChains(events), damaged]).toEqual([[], []]);
			}
			expect(points).toBeGreaterThanOrEqual(writes);
		},
	);
});

async function someRecord(): Promise<{ readonly name: string; readonly store: Store }> {
	const name = freshName();
	const store = await tab(name);
	for (const event of held) await store.events.append(event);
	await store.drafts.save(draft);
	return { name, store };
}
