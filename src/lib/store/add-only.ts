import type { DBCore, DBCoreTable, Middleware } from 'dexie';

/**
 * Makes the database itself say no: whatever code asks, this table takes new rows and nothing else. Below Dexie's hooks, so
 * that `clear` on an empty table and a `put` that happens to hit no row are refused as well.
 */
export const addOnly = (table: string): Middleware<DBCore> => ({
	stack: 'dbcore',
	name: `${table} are added only`,
	create: (core) => ({ ...core, table: (name) => (name === table ? guarded(core.table(name)) : core.table(name)) }),
});

const guarded = (table: DBCoreTable): DBCoreTable => ({
	...table,
	mutate: (request) =>
		request.type === 'add'
			? table.mutate(request)
			: Promise.reject(new RefusedByTable(`${table.name}: ${request.type} is refused, rows are only added`)),
});

/** Only a programmer can act on it: it is thrown, never returned. */
export class RefusedByTable extends Error {
	override readonly name = 'RefusedByTable';
}
