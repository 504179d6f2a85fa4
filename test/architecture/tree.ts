import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

/** Every file of the house by its path, with its text: from the disk, or made by hand to try a check. */
export type Tree = ReadonlyMap<string, string>;

export type Finding = { readonly file: string; readonly says: string };

export type Check = (tree: Tree) => readonly Finding[];

/** As in .gitignore: made or installed, never written by hand. */
const NOT_OURS = new Set(['node_modules', '.git', 'build', '.svelte-kit', '.cache', 'data']);

export function readTree(root: string): Tree {
	const files = filesUnder(root, '');
	return new Map(files.map((file) => [file, isText(file) ? readFileSync(join(root, file), 'utf8') : '']));
}

const filesUnder = (root: string, folder: string): string[] =>
	readdirSync(join(root, folder), { withFileTypes: true }).flatMap((entry) => {
		const path = folder === '' ? entry.name : `${folder}/${entry.name}`;
		if (NOT_OURS.has(path) || path.endsWith('.log')) return [];
		return entry.isDirectory() ? filesUnder(root, path) : [path];
	});

const isText = (file: string): boolean => !/\.(?:woff2|ttf|png|jpg|pdf|icc|zip)$/.test(file);

/** The room that a file stands in, or the other place with rights of its own. */
export function placeOf(file: string): string {
	const room = /^src\/lib\/([^/]+)\//.exec(file)?.[1];
	if (room !== undefined) return room;
	if (file.startsWith('src/routes/')) return 'routes';
	return file.startsWith('src/cli/') ? 'cli' : 'outside';
}

export const isCode = (file: string): boolean => /^(?:src|test)\/.*\.(?:ts|mjs|js|svelte)$/.test(file);

export const fileName = (file: string): string => file.slice(file.lastIndexOf('/') + 1);
