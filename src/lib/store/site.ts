import { ok, type Result } from '../base';
import type { Database } from './db';
import type { SiteValues } from './rows';
import { attempt, type StorageError } from './storage-error';

export type SiteStore = {
	readonly read: <Name extends keyof SiteValues>(
		name: Name,
	) => Promise<Result<SiteValues[Name] | undefined, StorageError>>;
	readonly write: <Name extends Exclude<keyof SiteValues, 'birth' | 'last copy'>>(
		name: Name,
		value: SiteValues[Name],
	) => Promise<Result<'saved', StorageError>>;
};

export const siteStore = (db: Database): SiteStore => ({
	read: (name) => attempt(async () => ok(await readSite(db, name))),
	write: (name, value) =>
		attempt(async () => {
			await db.site.put({ name, value });
			return ok('saved');
		}),
});

export async function readSite<Name extends keyof SiteValues>(
	db: Database,
	name: Name,
): Promise<SiteValues[Name] | undefined> {
	const row = await db.site.get(name);
	return row?.value as SiteValues[Name] | undefined;
}
