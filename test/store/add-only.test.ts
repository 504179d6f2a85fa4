import 'fake-indexeddb/auto';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { ok } from '../../src/lib/base';
import { RefusedByTable } from '../../src/lib/store/add-only';
import { database, type Database } from '../../src/lib/store/db';
import { rowOf } from '../../src/lib/store/event-row';
import { attempt } from '../../src/lib/store/storage-error';
import { notes } from '../support/kept-events';
import { freshName } from '../support/open-stores';

const [kept, other] = notes(2).map((event) => rowOf(event));
let db: Database;

beforeEach(async () => {
	db = database(freshName());
	await db.open();
	await db.events.add(kept!);
});

afterEach(() => db.close());

const ways: readonly (readonly [string, () => PromiseLike<unknown>])[] = [
	['put over a row', () => db.events.put({ ...kept!, text: '{}' })],
	['put a new row', () => db.events.put(other!)],
	['put many', () => db.events.bulkPut([kept!, other!])],
	['update a row', () => db.events.update([kept!.log, kept!.device, kept!.number, kept!.id], { text: '{}' })],
	['modify rows', () => db.events.toCollection().modify({ text: '{}' })],
	['delete a row', () => db.events.delete([kept!.log, kept!.device, kept!.number, kept!.id])],
	['delete rows', () => db.events.where('id').equals(kept!.id).delete()],
	['clear the table', () => db.events.clear()],
];

test.each(ways)('the database itself refuses to %s of the event table', async (_way, change) => {
	await expect(Promise.resolve(change())).rejects.toThrow('rows are only added');
	expect(await db.events.toArray()).toEqual([kept]);
});

test('an empty event table refuses to be cleared as well', async () => {
	const empty = database(freshName());
	await empty.open();
	await expect(Promise.resolve(empty.events.clear())).rejects.toBeInstanceOf(RefusedByTable);
	empty.close();
});

test('whoever tries is a programmer: the refusal is thrown, not returned', async () => {
	const wipe = async () => {
		await db.events.clear();
		return ok('wiped');
	};
	await expect(attempt(wipe)).rejects.toBeInstanceOf(RefusedByTable);
});

test('the same event added again is refused by its key', async () => {
	await expect(Promise.resolve(db.events.add(kept!))).rejects.toMatchObject({ name: 'ConstraintError' });
	await expect(Promise.resolve(db.events.add({ ...kept!, number: 7 }))).rejects.toMatchObject({
		name: 'ConstraintError',
	});
});
