import 'fake-indexeddb/auto';
import { expect, test } from 'vitest';
import { database, VERSIONS, type Version } from '../../src/lib/store/db';
import { LOG, notes } from '../support/kept-events';
import { answer, everythingIn, freshName, tab } from '../support/open-stores';
import { value } from '../support/test-site';

const [first, second] = notes(2);
const place = ({ log, device, number, id }: NonNullable<typeof first>) => ({ log, device, number, id });

/** Every version that was shipped, written out by hand and never changed: its block, and rows as a tablet in the field holds them. */
const SHIPPED: readonly { readonly block: Version; readonly rows: { readonly [table: string]: readonly object[] } }[] =
	[
		{
			block: {
				version: 1,
				stores: {
					events: '[log+device+number+id], &id',
					outbox: 'key',
					logs: 'log',
					attachments: 'hash',
					drafts: '[startUp+step+person]',
					gateKeys: '[person+device]',
					site: 'name',
				},
			},
			rows: {
				events: [
					{ ...place(first!), text: first!.text },
					{ ...place(second!), text: second!.text, signature: 'c2lnbmVk' },
				],
				logs: [{ log: LOG, events: 2, lastEntered: second!.entered, lastEnteredAt: second!.enteredAt, sealed: false }],
				drafts: [{ startUp: LOG, step: 'G1-02', person: 'P-01', typed: { dp: '12,5' }, saved: second!.entered }],
				site: [{ name: 'settings', value: { look: 'night' } }],
			},
		},
		{
			block: { version: 2, stores: { shiftKeys: '[person+device+log]' } },
			rows: {
				events: [
					{ ...place(first!), text: first!.text },
					{ ...place(second!), text: second!.text, signature: 'c2lnbmVk' },
				],
				logs: [{ log: LOG, events: 2, lastEntered: second!.entered, lastEnteredAt: second!.enteredAt, sealed: false }],
				drafts: [{ startUp: LOG, step: 'G1-02', person: 'P-01', typed: { dp: '12,5' }, saved: second!.entered }],
				shiftKeys: [
					{ person: 'P-01', device: 'T-1', log: LOG, shiftKey: 'f'.repeat(64), notAfter: 4e12, touched: 1e12 },
				],
				site: [{ name: 'settings', value: { look: 'night' } }],
			},
		},
	];

test('the blocks of shipped versions are history: none was edited, a new one stands here as well', () => {
	expect(VERSIONS.map(({ version, stores }) => ({ version, stores }))).toEqual(SHIPPED.map(({ block }) => block));
});

test.each(SHIPPED)('a tablet at version $block.version opens with everything it held', async ({ block, rows }) => {
	const name = freshName();
	await inTheField(name, block, rows);
	const store = await tab(name);
	const { events, damaged } = value(await store.events.readLog(LOG));
	expect([events, damaged]).toEqual([[first, { ...second, signature: 'c2lnbmVk' }], []]);
	expect(value(await store.drafts.list())).toEqual(rows.drafts);
	expect(await store.site.read('settings')).toEqual({ ok: true, value: { look: 'night' } });
	expect(value(await store.shiftKeys.list('T-1', 2e12))).toEqual(rows.shiftKeys ?? []);
});

const next = (upgrade: NonNullable<Version['upgrade']>): readonly Version[] => [
	...VERSIONS,
	{ version: 1 + (VERSIONS.at(-1)?.version ?? 0), stores: { drafts: '[startUp+step+person], saved' }, upgrade },
];

test('an upgrade changes every row of a table that may change', async () => {
	const name = freshName();
	await inTheField(name, SHIPPED[0]!.block, SHIPPED[0]!.rows);
	const db = database(
		name,
		next(async (all) => {
			await all.table('drafts').toCollection().modify({ saved: 'lifted' });
		}),
	);
	await db.open();
	expect(await db.drafts.where('saved').equals('lifted').count()).toBe(1);
	db.close();
});

test('an upgrade that fails half-way leaves the old database whole', async () => {
	const name = freshName();
	await inTheField(name, SHIPPED[0]!.block, SHIPPED[0]!.rows);
	const before = await everythingIn(name);
	const db = database(
		name,
		next(async (all) => {
			await all.table('drafts').toCollection().modify({ saved: 'lifted' });
			throw new Error('the plug was pulled');
		}),
	);
	await expect(Promise.resolve(db.open())).rejects.toThrow('the plug was pulled');
	db.close();
	expect(await everythingIn(name)).toEqual(before);
	expect(await (await tab(name)).drafts.list()).toMatchObject({ ok: true });
});

test('no upgrade may rewrite events', async () => {
	const name = freshName();
	await inTheField(name, SHIPPED[0]!.block, SHIPPED[0]!.rows);
	const before = await everythingIn(name);
	const db = database(
		name,
		next(async (all) => {
			await all.table('events').toCollection().modify({ text: '{}' });
		}),
	);
	await expect(Promise.resolve(db.open())).rejects.toThrow('rows are only added');
	db.close();
	expect(await everythingIn(name)).toEqual(before);
});

/** Makes a database as that version's block says, with nothing of today's code but Dexie. */
async function inTheField(name: string, block: Version, rows: { readonly [table: string]: readonly object[] }) {
	const old = database(
		name,
		SHIPPED.map((one) => one.block).filter(({ version }) => version <= block.version),
	);
	await old.open();
	old.close();
	const raw = await answer(indexedDB.open(name));
	for (const [table, all] of Object.entries(rows))
		for (const row of all) await answer(raw.transaction(table, 'readwrite').objectStore(table).put(row));
	raw.close();
}
