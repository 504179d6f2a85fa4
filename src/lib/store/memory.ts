import * as v from 'valibot';
import type { Birth } from './rows';

/**
 * A place outside the database that remembers that there was one. Browsers erase a site's databases all together, so the
 * memory must lie elsewhere: an emptied database would otherwise look like a new tablet.
 */
export type Memory = { readonly read: () => string | null; readonly write: (text: string) => void };

/** The page's local storage, which Chromium does not count among what it erases for space. In a worker there is none. */
export function pageMemory(name: string): Memory | undefined {
	const storage = (globalThis as { readonly localStorage?: Storage }).localStorage;
	if (storage === undefined) return undefined;
	const key = `gatehold.birth.${name}`;
	return { read: () => storage.getItem(key), write: (text) => storage.setItem(key, text) };
}

/** @returns the database that is gone, when this is not the one remembered */
export function erasedBefore(memory: Memory, birth: Birth): Birth | undefined {
	const remembered = v.safeParse(BirthSchema, memory.read());
	// Nothing that can be read says nothing about what was lost: from now on it is remembered.
	if (!remembered.success) memory.write(JSON.stringify(birth));
	return remembered.success && remembered.output.id !== birth.id ? remembered.output : undefined;
}

const BirthSchema = v.pipe(v.string(), v.parseJson(), v.object({ id: v.string(), made: v.string() }));
