import { ok, type Result } from '../base';
import type { Database } from './db';
import { startingWith } from './event-row';
import type { ShiftKeyRow } from './rows';
import { attempt, type StorageError } from './storage-error';

type Owner = { readonly person: string; readonly device: string };

export type ShiftKeys = {
	/** A new shift of the same person in the same start-up takes the place of the old one. */
	readonly save: (row: ShiftKeyRow) => Promise<Result<'saved', StorageError>>;
	/**
	 * The keys of the shifts that still run on this tablet; those that have ended are dropped.
	 *
	 * @param now in milliseconds
	 */
	readonly list: (device: string, now: number) => Promise<Result<readonly ShiftKeyRow[], StorageError>>;
	/** What has changed about a person's shifts here: when the tablet was last in hand, what was typed to go on. */
	readonly change: (
		owner: Owner,
		changed: Partial<Pick<ShiftKeyRow, 'touched'>> & { readonly wrong?: number },
	) => Promise<Result<'saved', StorageError>>;
	/** A shift is over: in one start-up, or in all. */
	readonly drop: (owner: Owner & { readonly log?: string }) => Promise<Result<'dropped', StorageError>>;
};

export const shiftKeys = (db: Database): ShiftKeys => ({
	save: (row) =>
		attempt(async () => {
			await db.shiftKeys.put(row);
			return ok('saved');
		}),
	list: (device, now) =>
		attempt(async () => {
			const rows = (await db.shiftKeys.toArray()).filter((row) => row.device === device);
			const over = rows.filter(({ notAfter }) => notAfter <= now);
			if (over.length > 0) await db.shiftKeys.bulkDelete(over.map(({ person, log }) => [person, device, log]));
			return ok(rows.filter(({ notAfter }) => notAfter > now));
		}),
	change: (owner, { touched, wrong }) =>
		attempt(() =>
			db.transaction('rw', db.shiftKeys, async () => {
				const rows = await shiftsOf(db, owner).toArray();
				await db.shiftKeys.bulkPut(
					rows.map((row) => ({
						...row,
						...(touched === undefined ? {} : { touched }),
						...(row.resume === undefined || wrong === undefined ? {} : { resume: { ...row.resume, wrong } }),
					})),
				);
				return ok('saved' as const);
			}),
		),
	drop: ({ log, ...owner }) =>
		attempt(async () => {
			if (log === undefined) await shiftsOf(db, owner).delete();
			else await db.shiftKeys.delete([owner.person, owner.device, log]);
			return ok('dropped');
		}),
});

export const shiftsOf = (db: Database, { person, device }: Owner) =>
	db.shiftKeys.where('[person+device+log]').between(...startingWith([person, device]));
