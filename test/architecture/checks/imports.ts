import { dirname, join } from 'node:path';
import ts from 'typescript';
import { MAY_IMPORT, ROOMS, type Room } from '../plan';
import { isCode, placeOf, type Check, type Finding, type Tree } from '../tree';

type Import = { readonly from: string; readonly to: string };

export const importsGoDownward: Check = (tree) =>
	importsOf(tree)
		.filter(({ from, to }) => isRoom(placeOf(to)) && placeOf(from) !== placeOf(to))
		.filter(({ from, to }) => !allowedIn(placeOf(from)).includes(placeOf(to)))
		.map(({ from, to }) => ({ file: from, says: `${placeOf(from)} may not import ${placeOf(to)}` }));

export const roomsAreEnteredByTheirDoor: Check = (tree) =>
	importsOf(tree).flatMap(({ from, to }): Finding[] => {
		const [here, there] = [placeOf(from), placeOf(to)];
		if (!isRoom(there) || to.endsWith('.css')) return [];
		const door = `src/lib/${there}/index.ts`;
		if (here !== there && to !== door) return [{ file: from, says: `${to} is behind the door of ${there}` }];
		if (here === there && to === door) return [{ file: from, says: 'goes through its own door' }];
		return [];
	});

export const nothingImportsRoutesOrCommands: Check = (tree) =>
	importsOf(tree)
		.filter(({ from, to }) => ['routes', 'cli'].includes(placeOf(to)) && placeOf(from) !== placeOf(to))
		.map(({ from, to }) => ({ file: from, says: `${to} is for nobody to import` }));

/** Every import in src must lead to a file of the house or to a package: a wrong path would slip past the other checks. */
export const importsLeadSomewhere: Check = (tree) =>
	sourcesOf(tree).flatMap(([file, text]) =>
		specifiersIn(file, text)
			.filter((specifier) => isOurs(specifier) && resolve(tree, file, specifier) === undefined)
			.map((specifier) => ({ file, says: `${specifier} leads nowhere` })),
	);

export const noCircles: Check = (tree) => {
	const next = new Map<string, string[]>();
	// A component that draws a tree imports itself: that is recursion, and no circle between files.
	for (const { from, to } of importsOf(tree))
		if (from !== to || !from.endsWith('.svelte')) next.set(from, [...(next.get(from) ?? []), to]);
	const done = new Set<string>();
	const circles: Finding[] = [];
	const visit = (file: string, path: readonly string[]): void => {
		if (path.includes(file)) {
			circles.push({ file, says: [...path.slice(path.indexOf(file)), file].join(' -> ') });
			return;
		}
		if (done.has(file)) return;
		for (const to of next.get(file) ?? []) visit(to, [...path, file]);
		done.add(file);
	};
	for (const file of next.keys()) visit(file, []);
	return circles;
};

const importsOf = (tree: Tree): readonly Import[] =>
	sourcesOf(tree).flatMap(([file, text]) =>
		specifiersIn(file, text).flatMap((specifier) => {
			const to = resolve(tree, file, specifier);
			return to === undefined ? [] : [{ from: file, to }];
		}),
	);

const sourcesOf = (tree: Tree): readonly (readonly [string, string])[] =>
	[...tree].filter(([file]) => file.startsWith('src/') && isCode(file));

/** Type imports, re-exports and dynamic imports count like any other. */
function specifiersIn(file: string, text: string): readonly string[] {
	const code = file.endsWith('.svelte') ? scriptsIn(text) : text;
	return ts.preProcessFile(code, true, true).importedFiles.map(({ fileName }) => fileName);
}

const scriptsIn = (svelte: string): string =>
	[...svelte.matchAll(/<script[^>]*>([\s\S]*?)<\/script>/g)].map(([, code]) => code).join('\n');

/** `./$types` is made by SvelteKit for each route. */
const isOurs = (specifier: string): boolean => /^(?:\.|\$lib\/)/.test(specifier) && !specifier.endsWith('/$types');

function resolve(tree: Tree, from: string, specifier: string): string | undefined {
	if (!isOurs(specifier)) return undefined;
	const path = specifier.replace(/\?.*$/, '').replace(/^\$lib\//, 'src/lib/');
	const full = path.startsWith('.') ? join(dirname(from), path) : path;
	return ['', '.ts', '.js', '/index.ts'].map((ending) => full + ending).find((file) => tree.has(file));
}

const allowedIn = (place: string): readonly string[] =>
	Object.hasOwn(MAY_IMPORT, place) ? MAY_IMPORT[place as keyof typeof MAY_IMPORT] : [];

const isRoom = (place: string): place is Room => (ROOMS as readonly string[]).includes(place);
