import { fail, ok, type Result } from '../base';
import {
	beginTry,
	mayTry,
	NO_TRIES,
	openGateKey,
	succeeded,
	type GateKey,
	type MayTry,
	type OpenGateKeyError,
	type SigningKey,
	type Tries,
} from '../identity';
import type { Database } from './db';
import type { GateKeyRow } from './rows';
import { shiftsOf } from './shift-keys';
import { attempt, type StorageError } from './storage-error';

export type Owner = { readonly person: string; readonly device: string };

export type CannotOpen =
	| { readonly kind: 'no-gate-key' }
	| { readonly kind: 'wait'; readonly milliseconds: number; readonly left: number }
	| { readonly kind: 'destroyed' }
	| { readonly kind: 'wrong-pin'; readonly left: number }
	| Exclude<OpenGateKeyError, { readonly kind: 'wrong-pin' }>;

export type GateKeys = {
	/** A new key of the same owner takes the place of the old one, with no tries against it. */
	readonly save: (row: Required<Omit<GateKeyRow, 'tries'>>) => Promise<Result<'saved', StorageError>>;
	readonly list: () => Promise<Result<readonly GateKeyRow[], StorageError>>;
	/** Whether a PIN may be tried now, and how many tries are left. */
	readonly mayTry: (owner: Owner, now: number) => Promise<Result<MayTry, StorageError>>;
	/**
	 * Opens the key for signing. The try is counted durably before it is made, so that neither pulling the plug nor a second
	 * tab wins a free one; the tenth wrong PIN in a row destroys the wrap.
	 *
	 * @param now in milliseconds
	 */
	readonly open: (
		owner: Owner & { readonly pin: string; readonly now: number },
	) => Promise<Result<SigningKey, CannotOpen | StorageError>>;
};

export const gateKeys = (db: Database): GateKeys => ({
	save: (row) =>
		attempt(async () => {
			await db.gateKeys.put({ ...row, tries: NO_TRIES });
			return ok('saved');
		}),
	list: () => attempt(async () => ok(await db.gateKeys.toArray())),
	mayTry: (owner, now) =>
		attempt(async () => ok(mayTry((await db.gateKeys.get(keyOf(owner)))?.tries ?? NO_TRIES, now))),
	open: async ({ pin, now, ...owner }) => {
		const counted = await attempt(() => countTry(db, owner, now));
		if (!counted.ok) return counted;
		const opened = await openGateKey(counted.value.gateKey, pin);
		if (opened.ok) {
			const reset = await attempt(() => change(db, owner, (row) => ({ ...row, tries: succeeded(row.tries) })));
			return reset.ok ? opened : reset;
		}
		if (opened.error.kind !== 'wrong-pin') return fail(opened.error);
		const next = mayTry(counted.value.tries, now);
		if (next.kind !== 'destroyed') return fail({ kind: 'wrong-pin', left: next.left });
		const destroyed = await attempt(() => destroy(db, owner));
		return destroyed.ok ? fail({ kind: 'destroyed' }) : destroyed;
	},
});

const countTry = (
	db: Database,
	owner: Owner,
	now: number,
): PromiseLike<Result<{ readonly gateKey: GateKey; readonly tries: Tries }, CannotOpen>> =>
	db.transaction('rw', [db.gateKeys, db.shiftKeys], async () => {
		const row = await db.gateKeys.get(keyOf(owner));
		if (row === undefined) return fail({ kind: 'no-gate-key' });
		const may = mayTry(row.tries, now);
		if (may.kind === 'wait') return fail(may);
		if (may.kind === 'destroyed' || row.gateKey === undefined) {
			// The plug was pulled between the tenth try and this.
			await destroyIn(db, owner);
			return fail({ kind: 'destroyed' });
		}
		const tries = beginTry(row.tries, now);
		await db.gateKeys.put({ ...row, tries });
		return ok({ gateKey: row.gateKey, tries });
	});

const change = (db: Database, owner: Owner, to: (row: GateKeyRow) => GateKeyRow): PromiseLike<Result<'saved', never>> =>
	db.transaction('rw', db.gateKeys, async () => {
		const row = await db.gateKeys.get(keyOf(owner));
		if (row !== undefined) await db.gateKeys.put(to(row));
		return ok('saved');
	});

/** With the gate key go the keys that it delegated to: whoever guessed at the one shall not enter with the other. */
const destroy = (db: Database, owner: Owner): PromiseLike<Result<'saved', never>> =>
	db.transaction('rw', [db.gateKeys, db.shiftKeys], () => destroyIn(db, owner));

async function destroyIn(db: Database, owner: Owner): Promise<Result<'saved', never>> {
	const row = await db.gateKeys.get(keyOf(owner));
	if (row !== undefined) await db.gateKeys.put(withoutKey(row));
	await shiftsOf(db, owner).delete();
	return ok('saved');
}

function withoutKey({ gateKey: _destroyed, ...row }: GateKeyRow): GateKeyRow {
	return row;
}

const keyOf = ({ person, device }: Owner) => [person, device] as const;
