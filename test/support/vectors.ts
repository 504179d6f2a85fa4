import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const FOLDER = join(import.meta.dirname, '../vectors');

/** One file of check values made by another program; see test/reference/SOURCE.md. */
export const vector = (path: string): unknown => JSON.parse(readFileSync(join(FOLDER, path), 'utf8'));

/** All cases of a folder whose names begin with a capital letter and a number, by name. */
export const cases = (folder: string): readonly { readonly name: string }[] =>
	readdirSync(join(FOLDER, folder))
		.filter((file) => /^[A-Z]\d+.*\.json$/.test(file))
		.sort()
		.map((file) => ({ ...(vector(join(folder, file)) as object), name: file.replace('.json', '') }));
