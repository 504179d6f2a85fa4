import { Dexie, type Table } from 'dexie';
import { addOnly } from './add-only';
import type { EventKey, EventRow } from './event-row';
import type { LogRow } from './log-row';
import type { Draft, GateKeyRow, KeptAttachment, ShiftKeyRow, SiteRow } from './rows';

/** The tablet's database. Only this file knows its shape; every other file of the room gets it as an argument. */
export type Database = Dexie & {
	readonly events: Table<EventRow, EventKey>;
	/** Own events that no second place is known to hold. */
	readonly outbox: Table<{ readonly key: EventKey }, EventKey>;
	/** Derived from `events` in the same transaction: what the list of start-ups shows without opening one. */
	readonly logs: Table<LogRow, string>;
	readonly attachments: Table<KeptAttachment, string>;
	readonly drafts: Table<Draft, readonly [startUp: string, step: string, person: string]>;
	readonly gateKeys: Table<GateKeyRow, readonly [person: string, device: string]>;
	readonly shiftKeys: Table<ShiftKeyRow, readonly [person: string, device: string, log: string]>;
	readonly site: Table<SiteRow, string>;
};

/**
 * Every version that was ever shipped. These blocks are history: a tablet in the field may stand at any of them. A new
 * version is a new block with what it changes, and an upgrade where rows must change.
 *
 * An event's key ends in its id: two tablets that call themselves the same give two events of one number, both are
 * evidence, and merging stays set union. A log is read by the range of its keys, which is the fastest way there is.
 */
export const VERSIONS: readonly Version[] = [
	{
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
	// A shift survives the death of the browser: its key is kept until it ends.
	{ version: 2, stores: { shiftKeys: '[person+device+log]' } },
];

export type Version = {
	readonly version: number;
	readonly stores: { readonly [table: string]: string | null };
	readonly upgrade?: Parameters<ReturnType<Dexie['version']>['upgrade']>[0];
};

/**
 * Strict durability: a transaction is complete when its bytes have left for the medium, not when the system has promised to
 * write them some day; by default a power cut takes what was shown as saved. No cache, so that a live query never shows
 * what is not yet written. No opening again by itself, so that an erased database is not mistaken for an empty one.
 */
export function database(name: string, versions: readonly Version[] = VERSIONS): Database {
	const db = new Dexie(name, { chromeTransactionDurability: 'strict', cache: 'disabled', autoOpen: false });
	for (const { version, stores, upgrade } of versions) {
		const declared = db.version(version).stores(stores);
		if (upgrade !== undefined) declared.upgrade(upgrade);
	}
	db.use(addOnly('events'));
	return db as Database;
}
