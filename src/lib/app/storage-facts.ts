import { fail, ok, type Result } from '../base';
import { allOf } from '../record';
import type { StorageError } from '../store';
import type { ThisTablet } from './this-tablet.svelte';

/** How safe the record is on this tablet, as far as anybody can know. */
export type StorageFacts = {
	readonly persisted?: boolean;
	readonly usage?: number;
	readonly quota?: number;
	/** When the storage was made that the browser has erased since. */
	readonly erased?: string;
	readonly isScarce: boolean;
	readonly copies: readonly CopyOf[];
};

export type CopyOf = {
	readonly startUp: string;
	readonly title: string;
	readonly demonstration: boolean;
	/** Own events that no second place is known to hold. */
	readonly onlyHere: number;
	readonly newest?: { readonly at: string; readonly to: string };
};

export async function lookAtStorage(here: ThisTablet): Promise<Result<StorageFacts, StorageError>> {
	const { store } = here;
	const health = await store.health.look();
	if (!health.ok) return health;
	const { persisted, usage, quota, onlyHere } = health.value;
	const copies: CopyOf[] = [];
	for (const { id, title, demonstration } of here.startUps) {
		const log = await store.events.readLog(id);
		if (!log.ok) return fail(log.error);
		const newest = allOf(log.value.events, 'copy made').at(-1);
		copies.push({
			startUp: id,
			title,
			demonstration,
			onlyHere: onlyHere[id] ?? 0,
			...(newest === undefined ? {} : { newest: { at: newest.entered, to: newest.body.to } }),
		});
	}
	return ok({
		...(persisted === undefined ? {} : { persisted }),
		...(usage === undefined ? {} : { usage }),
		...(quota === undefined ? {} : { quota }),
		...(store.erased === undefined ? {} : { erased: store.erased.made }),
		isScarce: isScarce(usage, quota) || store.reserve.isSpent(),
		copies,
	});
}

/** Less than a tenth of what the browser allows is left, or less than some photos and a dossier need. */
export const isScarce = (usage: number | undefined, quota: number | undefined): boolean =>
	usage !== undefined && quota !== undefined && (quota - usage < quota / 10 || quota - usage < 50 * MEGABYTE);

const MEGABYTE = 1_000_000;

/** "42 MB", "1.3 GB" */
export function sayBytes(bytes: number): string {
	const megabytes = bytes / MEGABYTE;
	if (megabytes >= 1000) return `${(megabytes / 1000).toFixed(1)}\u00a0GB`;
	return `${megabytes.toFixed(megabytes < 10 ? 1 : 0)}\u00a0MB`;
}
