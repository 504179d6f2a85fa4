import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const FOLDER = join(import.meta.dirname, '../vectors');

/** One file of check values made by another program; see test/reference/SOURCE.md. */
export const vector = <T>(path: string): T => JSON.parse(readFileSync(join(FOLDER, path), 'utf8')) as T;

/** All cases of a folder whose names begin with a capital letter and a number, by name. */
export const cases = <T>(folder: string): readonly (T & { readonly name: string })[] =>
	readdirSync(join(FOLDER, folder))
		.filter((file) => /^[A-Z]\d+.*\.json$/.test(file))
		.sort()
		.map((file) => ({ ...vector<T>(join(folder, file)), name: file.replace('.json', '') }));
