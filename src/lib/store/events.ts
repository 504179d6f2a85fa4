import { liveQuery } from 'dexie';
import { fail, ok, type Result } from '../base';
import type { RecordEvent } from '../record';
import type { Database } from './db';
import { draftKey } from './drafts';
import { eventOf, keyOf, rowOf, startingWith, type DamagedRow, type EventKey } from './event-row';
import { startUpOf, withEvent, type LogRow, type StartUp } from './log-row';
import type { DraftKey } from './rows';
import { attempt, type StorageError } from './storage-error';

/** Where another tab has got this tablet's chain meanwhile: the event is to be made anew on top of it. */
export type ChainMovedOn = {
	readonly kind: 'chain-moved-on';
	readonly head: { readonly number: number; readonly id: string } | null;
};

/** What every keeper of events can do, the tablet's as well as the hub's. */
export type EventStore = {
	/**
	 * Keeps the next event of this tablet, if its chain still ends where the event says. Resolves when the bytes are
	 * durable: only then may a screen say saved. The draft that the event was made from goes in the same transaction,
	 * so that it is neither lost nor entered twice.
	 */
	readonly append: (
		event: RecordEvent,
		from?: { readonly draft?: DraftKey },
	) => Promise<Result<'saved', ChainMovedOn | StorageError>>;
	/**
	 * Takes in events of other tablets, or of a copy: all or none, those that are held already stay as they are.
	 *
	 * @param received when they came, to be kept with each that is new; absent: as the lines say, for a restored copy
	 */
	readonly importEvents: (
		events: readonly RecordEvent[],
		received?: string,
	) => Promise<Result<{ readonly added: number; readonly known: number }, StorageError>>;
	readonly readLog: (log: string) => Promise<Result<ReadLog, StorageError>>;
	/** Newest first. */
	readonly listStartUps: () => Promise<Result<readonly StartUp[], StorageError>>;
	/** Calls back with how many events the log holds, now and after every change in any tab, until it is told to stop. */
	readonly watch: (log: string, changed: (events: number) => void) => () => void;
};

export type ReadLog = { readonly events: readonly RecordEvent[]; readonly damaged: readonly DamagedRow[] };

export const eventStore = (db: Database): EventStore => ({
	append: (event, from) => append(db, event, from?.draft),
	importEvents: (events, received) => importEvents(db, events, received),
	readLog: (log) => readLog(db, log),
	listStartUps: () =>
		attempt(async () => {
			const rows = await db.logs.toArray();
			return ok(rows.sort((a, b) => b.lastEnteredAt - a.lastEnteredAt).flatMap(startUpOf));
		}),
	watch: (log, changed) => {
		// A closed database ends the watch; whoever reads or writes next is told why.
		const next = (row: LogRow | undefined) => changed(row?.events ?? 0);
		const watching = liveQuery(() => db.logs.get(log)).subscribe({ next, error: () => undefined });
		return () => watching.unsubscribe();
	},
});

/** The event was hashed and signed before: a transaction that waits for anything but the database commits its first half. */
const append = (
	db: Database,
	event: RecordEvent,
	draft: DraftKey | undefined,
): Promise<Result<'saved', ChainMovedOn | StorageError>> =>
	attempt(() =>
		db.transaction('rw', [db.events, db.outbox, db.logs, db.drafts], async () => {
			const head = await headOf(db, event);
			// Asked again by somebody who never heard the answer.
			if (head?.id === event.id) return ok('saved' as const);
			if (event.previous !== (head?.id ?? null) || event.number !== (head?.number ?? 0) + 1)
				return fail({ kind: 'chain-moved-on' as const, head });
			await db.events.add(rowOf(event));
			await db.outbox.add({ key: keyOf(event) });
			await db.logs.put(withEvent(await db.logs.get(event.log), event));
			if (draft !== undefined) await db.drafts.delete(draftKey(draft));
			return ok('saved' as const);
		}),
	);

/** Read from the keys alone. */
async function headOf(
	db: Database,
	{ log, device }: { readonly log: string; readonly device: string },
): Promise<ChainMovedOn['head']> {
	const chain = db.events.where(KEY).between(...startingWith([log, device]));
	const [last] = await chain.reverse().limit(1).primaryKeys();
	if (last === undefined) return null;
	const [, , number, id] = last;
	return { number, id };
}

const importEvents = (
	db: Database,
	events: readonly RecordEvent[],
	received: string | undefined,
): Promise<Result<{ readonly added: number; readonly known: number }, StorageError>> =>
	attempt(() =>
		db.transaction('rw', [db.events, db.logs], async () => {
			const offered = [...new Map(events.map((event) => [event.id, event])).values()];
			const held = await db.events.bulkGet(offered.map((event): EventKey => keyOf(event)));
			const fresh = offered.filter((_, i) => held[i] === undefined);
			await db.events.bulkAdd(fresh.map((event) => rowOf(event, received ?? event.received)));
			const rows = new Map<string, LogRow | undefined>();
			for (const event of fresh) {
				const { log } = event;
				rows.set(log, withEvent(rows.has(log) ? rows.get(log) : await db.logs.get(log), event));
			}
			await db.logs.bulkPut([...rows.values()].filter((row) => row !== undefined));
			return ok({ added: fresh.length, known: events.length - fresh.length });
		}),
	);

const readLog = (db: Database, log: string): Promise<Result<ReadLog, StorageError>> =>
	attempt(async () => {
		const rows = db.events.where(KEY).between(...startingWith([log]));
		const events: RecordEvent[] = [];
		const damaged: DamagedRow[] = [];
		for (const row of await rows.toArray()) {
			const event = eventOf(row);
			if (event.ok) events.push(event.value);
			else damaged.push(event.error);
		}
		return ok({ events, damaged });
	});

const KEY = '[log+device+number+id]';
