import 'fake-indexeddb/auto';
import { afterEach } from 'vitest';
import { openStore, type OpenOptions, type Store } from '../../src/lib/store';
import { NOON } from './kept-events';
import { value } from './test-site';

const open: Store[] = [];

afterEach(() => {
	for (const store of open.splice(0)) store.close();
});

/** Opens a tablet's store on an IndexedDB in memory; closed after the test. The same name again is another tab. */
export async function tab(name: string, options: Partial<OpenOptions> = {}): Promise<Store> {
	const store = value(await openStore(name, { now: NOON, ...options }));
	open.push(store);
	return store;
}

export const freshName = (): string => `tablet ${crypto.randomUUID()}`;

/** Everything in a database, read past the store; of a blob only its size. */
export async function everythingIn(name: string): Promise<{ readonly [table: string]: readonly unknown[] }> {
	const db = await answer(indexedDB.open(name));
	try {
		const tables: Record<string, readonly unknown[]> = {};
		for (const table of db.objectStoreNames) {
			const rows = await answer<unknown[]>(db.transaction(table).objectStore(table).getAll());
			tables[table] = rows.map((row) => ({ ...(row as object), ...sizeOfBlob(row) }));
		}
		return tables;
	} finally {
		db.close();
	}
}

export const answer = <T>(request: IDBRequest<T>): Promise<T> =>
	new Promise((resolve, reject) => {
		request.onsuccess = () => resolve(request.result);
		request.onerror = () => reject(request.error ?? new Error('a request failed without a word'));
	});

const sizeOfBlob = (row: unknown) => {
	const { blob } = row as { blob?: Blob };
	return blob === undefined ? {} : { blob: blob.size };
};
