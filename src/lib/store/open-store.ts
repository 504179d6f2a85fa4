import { Dexie } from 'dexie';
import { fail, ok, type Result } from '../base';
import { attachments, type Attachments } from './attachments';
import { database, VERSIONS, type Database } from './db';
import { drafts, type Drafts } from './drafts';
import { eventStore, type EventStore } from './events';
import { gateKeys, type GateKeys } from './gate-keys';
import { healthStore, type HealthStore } from './health';
import { erasedBefore, pageMemory, type Memory } from './memory';
import { orFromReserve, reserveOf, type Reserve } from './reserve';
import type { Birth } from './rows';
import { shiftKeys, type ShiftKeys } from './shift-keys';
import { readSite, siteStore, type SiteStore } from './site';
import { storageError, type StorageError } from './storage-error';

/** Everything a tablet keeps. Whatever says saved is durable. */
export type Store = {
	readonly events: EventStore;
	readonly attachments: Attachments;
	readonly drafts: Drafts;
	readonly gateKeys: GateKeys;
	readonly shiftKeys: ShiftKeys;
	readonly site: SiteStore;
	readonly health: HealthStore;
	/** Room for what must still fit when nothing else does; whoever opens the store for a person has it kept. */
	readonly reserve: Reserve;
	/** Set when the browser has erased what this tablet held: to be told, and the tablet enrolled anew. */
	readonly erased?: { readonly made: string; readonly acknowledge: () => void };
	/** Calls back when the storage closes under the app: erased, or taken over by a newer version in another tab. */
	readonly onClosed: (closed: () => void) => void;
	readonly close: () => void;
};

export type OpenOptions = {
	/** Now, as an instant: when a new database is made, it remembers it. */
	readonly now: string;
	/** Where it is remembered that there was a database; the page's local storage unless told otherwise. */
	readonly memory?: Memory;
};

export async function openStore(name: string, options: OpenOptions): Promise<Result<Store, StorageError>> {
	const db = database(name);
	const opened = await openUnlessBlocked(db);
	if (!opened.ok) return opened;
	try {
		const birth = await birthOf(db, options.now);
		neverAnother(db, birth);
		return ok(storeOn(db, birth, options.memory ?? pageMemory(name)));
	} catch (thrown) {
		db.close();
		return fail(storageError(thrown));
	}
}

function storeOn(db: Database, birth: Birth, memory: Memory | undefined): Store {
	const gone = memory === undefined ? undefined : erasedBefore(memory, birth);
	let closedByUs = false;
	const acknowledge = () => memory?.write(JSON.stringify(birth));
	const reserve = reserveOf(db.name);
	const [events, typed, keys, health] = [eventStore(db), drafts(db), gateKeys(db), healthStore(db)];
	return {
		events: { ...events, append: orFromReserve(reserve, events.append) },
		attachments: attachments(db),
		drafts: { ...typed, save: orFromReserve(reserve, typed.save) },
		// A try is counted before it is made, and the count is a write.
		gateKeys: { ...keys, open: orFromReserve(reserve, keys.open) },
		shiftKeys: shiftKeys(db),
		site: siteStore(db),
		health: { ...health, copyMade: orFromReserve(reserve, health.copyMade) },
		reserve,
		...(gone === undefined ? {} : { erased: { made: gone.made, acknowledge } }),
		onClosed: (closed) => {
			db.on('close', () => {
				if (!closedByUs) closed();
			});
		},
		close: () => {
			closedByUs = true;
			db.close();
		},
	};
}

/** An older tab gives way by itself; one that hangs would keep this one waiting for ever. */
async function openUnlessBlocked(db: Database): Promise<Result<'open', StorageError>> {
	const blocked = new Promise<'blocked'>((resolve) => db.on('blocked', () => resolve('blocked')));
	try {
		if ((await Promise.race([db.open(), blocked])) === 'blocked') {
			db.close();
			return fail({ kind: 'storage-blocked' });
		}
	} catch (thrown) {
		return fail(storageError(thrown));
	}
	// Dexie would work on a database that a newer version of the app has changed.
	const known = VERSIONS.at(-1)?.version ?? 0;
	const version = Math.floor(db.backendDB().version / 10);
	if (version <= known) return ok('open');
	db.close();
	return fail({ kind: 'storage-newer', version, known });
}

const birthOf = (db: Database, now: string): PromiseLike<Birth> =>
	db.transaction('rw', db.site, async () => {
		const held = await readSite(db, 'birth');
		if (held !== undefined) return held;
		const birth = { id: crypto.randomUUID(), made: now };
		await db.site.add({ name: 'birth', value: birth });
		return birth;
	});

/** Where a browser loses the connection, Dexie opens again: refused when the database behind it is another, empty one. */
function neverAnother(db: Database, birth: Birth): void {
	const look = async () => {
		if ((await readSite(db, 'birth'))?.id !== birth.id) throw new Dexie.DatabaseClosedError('erased while open');
	};
	db.on('ready', look, true);
}
