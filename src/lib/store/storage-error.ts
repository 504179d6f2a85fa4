import { fail, type Result } from '../base';
import { RefusedByTable } from './add-only';

/** What can go wrong with the tablet's storage, whatever was asked of it. */
export type StorageError =
	/** Nothing was kept. Photos go to a second place, or space is made; readings are small and may still fit. */
	| { readonly kind: 'storage-full' }
	/** Erased by the browser, or given up to a newer version of the app in another tab: this tab must be loaded again. */
	| { readonly kind: 'storage-closed' }
	/** Another tab holds the database at an older version and does not let go. */
	| { readonly kind: 'storage-blocked' }
	/** A newer version of the app has been here: this one must not write. */
	| { readonly kind: 'storage-newer'; readonly version: number; readonly known: number }
	/** No database at all: a browser that forbids storage here. */
	| { readonly kind: 'storage-missing' }
	/** The medium or the browser failed in its own words. Nothing of what was asked was kept. */
	| { readonly kind: 'storage-failed'; readonly name: string; readonly message: string };

/** Runs work on the database; what storage throws becomes data, what only a programmer can act on stays thrown. */
export async function attempt<T, E = never>(
	work: () => PromiseLike<Result<T, E>>,
): Promise<Result<T, E | StorageError>> {
	try {
		return await work();
	} catch (thrown) {
		return fail(storageError(thrown));
	}
}

/** A failed transaction says AbortError or the like; the cause hides one or two levels below. */
export function storageError(thrown: unknown): StorageError {
	const causes = causesOf(thrown);
	if (causes.length === 0 || causes.some((cause) => cause instanceof RefusedByTable)) throw thrown;
	const names = causes.map(({ name }) => name);
	if (names.includes('QuotaExceededError')) return { kind: 'storage-full' };
	if (names.includes('DatabaseClosedError') || names.includes('InvalidStateError')) return { kind: 'storage-closed' };
	if (names.includes('MissingAPIError')) return { kind: 'storage-missing' };
	const { name, message } = causes.at(-1) ?? { name: 'unknown', message: '' };
	if (PROGRAMMERS.has(name)) throw thrown;
	return { kind: 'storage-failed', name, message };
}

function causesOf(thrown: unknown): readonly Error[] {
	const causes: Error[] = [];
	for (let cause = thrown; cause instanceof Error; cause = (cause as { inner?: unknown }).inner) {
		if (causes.includes(cause)) break;
		causes.push(cause);
	}
	return causes;
}

const PROGRAMMERS = new Set([
	'TypeError',
	'ReferenceError',
	'RangeError',
	'DataError',
	'DataCloneError',
	'SchemaError',
]);
