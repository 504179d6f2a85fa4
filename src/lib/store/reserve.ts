import { Dexie, type Table } from 'dexie';
import type { Result } from '../base';
import { storageError, type StorageError } from './storage-error';

/**
 * Room set aside while there is enough, and given up when a write finds none: so that the last entries, the act that is
 * being signed and the copy still fit when photos have filled the tablet. It lies in a database of its own, because the
 * browser counts all of them together and nothing of the record shall wait for it.
 */
export type Reserve = {
	/** Sets the room aside, unless it is. */
	readonly keep: () => Promise<'kept' | 'no room'>;
	/** Gives it up. @returns whether there was any */
	readonly release: () => Promise<boolean>;
	/** Given up since the store was opened, or never to be had: the tablet is full but for small writes. */
	readonly isSpent: () => boolean;
};

/** Some five hundred entries: more than a night holds. */
const BYTES = 4_000_000;

export function reserveOf(name: string, bytes = BYTES): Reserve {
	let isSpent = false;
	return {
		keep: async () => {
			const kept = await withReserve(name, async (room) => {
				if ((await room.count()) === 0) await room.add(new Blob([unlike(bytes)]), 'reserve');
				return true;
			});
			isSpent = kept !== true;
			return isSpent ? 'no room' : 'kept';
		},
		release: async () => {
			const released = await withReserve(name, async (room) => {
				const held = await room.count();
				await room.clear();
				return held > 0;
			});
			isSpent ||= released === true;
			return released === true;
		},
		isSpent: () => isSpent,
	};
}

/** Runs a write again when it found no room and room could be made. */
export const orFromReserve =
	<Given extends readonly unknown[], T, E extends { readonly kind: string }>(
		reserve: Reserve,
		write: (...given: Given) => Promise<Result<T, E>>,
	) =>
	async (...given: Given): Promise<Result<T, E>> => {
		const written = await write(...given);
		if (written.ok || written.error.kind !== 'storage-full' || !(await reserve.release())) return written;
		return write(...given);
	};

async function withReserve(
	name: string,
	use: (room: Table<Blob, string>) => Promise<boolean>,
): Promise<boolean | StorageError> {
	const db = new Dexie(`${name}.reserve`, { cache: 'disabled' });
	db.version(1).stores({ room: '' });
	try {
		return await use(db.table<Blob, string>('room'));
	} catch (thrown) {
		return storageError(thrown);
	} finally {
		db.close();
	}
}

/** Bytes that no medium can make shorter. */
function unlike(count: number): Uint8Array<ArrayBuffer> {
	const bytes = new Uint8Array(count);
	// getRandomValues gives so many at once.
	for (let at = 0; at < count; at += 65_536) crypto.getRandomValues(bytes.subarray(at, at + 65_536));
	return bytes;
}
