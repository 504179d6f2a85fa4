import { ok, type Result } from '../base';
import type { Database } from './db';
import type { Draft, DraftKey } from './rows';
import { attempt, type StorageError } from './storage-error';

export type Drafts = {
	readonly save: (draft: Draft) => Promise<Result<'saved', StorageError>>;
	readonly read: (key: DraftKey) => Promise<Result<Draft | undefined, StorageError>>;
	readonly drop: (key: DraftKey) => Promise<Result<'dropped', StorageError>>;
	readonly list: (startUp?: string) => Promise<Result<readonly Draft[], StorageError>>;
};

export const drafts = (db: Database): Drafts => ({
	save: (draft) =>
		attempt(async () => {
			await db.drafts.put(draft);
			return ok('saved');
		}),
	read: (key) => attempt(async () => ok(await db.drafts.get(draftKey(key)))),
	drop: (key) =>
		attempt(async () => {
			await db.drafts.delete(draftKey(key));
			return ok('dropped');
		}),
	list: (startUp) =>
		attempt(async () => {
			const all = await db.drafts.toArray();
			return ok(startUp === undefined ? all : all.filter((draft) => draft.startUp === startUp));
		}),
});

export const draftKey = ({ startUp, step, person }: DraftKey) => [startUp, step, person] as const;
