import { ok, type Result } from '../base';
import type { Database } from './db';
import { AFTER_EVERY_TEXT } from './event-row';
import type { Copy } from './rows';
import { readSite } from './site';
import { attempt, type StorageError } from './storage-error';

export type Health = {
	/** False: the browser may erase everything when space runs short. Absent: it does not say. */
	readonly persisted?: boolean;
	/** Bytes, as the browser estimates them: enough to show, not enough to promise that a photo fits. */
	readonly usage?: number;
	readonly quota?: number;
	readonly lastCopy?: Copy;
	/** Own events that no second place is known to hold, by log. */
	readonly onlyHere: { readonly [log: string]: number };
};

/** How far a copy goes: a tablet's chain in a log up to this number. */
export type CopiedChain = { readonly log: string; readonly device: string; readonly number: number };

export type HealthStore = {
	readonly look: () => Promise<Result<Health, StorageError>>;
	/** Asks the browser never to erase by itself; it may ask the person, and may say no. */
	readonly askToPersist: () => Promise<boolean>;
	/** After the copy was compared, not when it was begun. */
	readonly copyMade: (copy: Copy, chains: readonly CopiedChain[]) => Promise<Result<'saved', StorageError>>;
};

export const healthStore = (db: Database): HealthStore => ({
	look: () =>
		attempt(async () => {
			const keys = await db.outbox.toCollection().primaryKeys();
			const onlyHere: Record<string, number> = {};
			for (const [log] of keys) onlyHere[log] = (onlyHere[log] ?? 0) + 1;
			const lastCopy = await readSite(db, 'last copy');
			return ok({ ...(await browserSays()), ...(lastCopy === undefined ? {} : { lastCopy }), onlyHere });
		}),
	askToPersist: async () => (await storageManager()?.persist?.()) ?? false,
	copyMade: (copy, chains) =>
		attempt(() =>
			db.transaction('rw', [db.outbox, db.site], async () => {
				for (const { log, device, number } of chains)
					await db.outbox.where('key').between([log, device], [log, device, number, AFTER_EVERY_TEXT]).delete();
				await db.site.put({ name: 'last copy', value: copy });
				return ok('saved' as const);
			}),
		),
});

async function browserSays(): Promise<Pick<Health, 'persisted' | 'usage' | 'quota'>> {
	const storage = storageManager();
	const persisted = await storage?.persisted?.();
	const { usage, quota } = (await storage?.estimate?.()) ?? {};
	return {
		...(persisted === undefined ? {} : { persisted }),
		...(usage === undefined ? {} : { usage }),
		...(quota === undefined ? {} : { quota }),
	};
}

/** Old browsers have parts of it, a page without a secure origin has none. */
const storageManager = (): Partial<StorageManager> | undefined =>
	(globalThis.navigator as { readonly storage?: Partial<StorageManager> } | undefined)?.storage;
