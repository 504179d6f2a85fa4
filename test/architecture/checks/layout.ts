import { LONGEST_FILE, ROOMS, ROOMS_WITH_SPEC, SRC_FILES, TEST_FOLDERS, TOP_LEVEL, VAGUE_WORDS } from '../plan';
import { fileName, isCode, type Check, type Tree } from '../tree';

export const topLevelIsThePlan: Check = (tree) =>
	entriesOf(tree, '')
		.filter((entry) => !isIn(TOP_LEVEL, entry))
		.map((entry) => ({ file: entry, says: 'is not in the plan of the top level' }));

export const srcHoldsThePlan: Check = (tree) => [
	...entriesOf(tree, 'src/')
		.filter((entry) => !isIn([...SRC_FILES, 'lib', 'routes', 'cli'], entry))
		.map((entry) => ({ file: `src/${entry}`, says: 'is not in the plan of src' })),
	...entriesOf(tree, 'src/lib/')
		.filter((entry) => !isIn(ROOMS, entry))
		.map((entry) => ({ file: `src/lib/${entry}`, says: 'is no room of the plan' })),
];

export const testsMirrorTheRooms: Check = (tree) =>
	entriesOf(tree, 'test/')
		.filter((entry) => !isIn([...TEST_FOLDERS, 'run.mjs'], entry))
		.map((entry) => ({ file: `test/${entry}`, says: 'has no room of this name' }));

export const specsStandWhereAStrangerNeedsThem: Check = (tree) =>
	[...tree.keys()]
		.filter((file) => file.startsWith('src/lib/') && file.endsWith('.md'))
		.filter((file) => !ROOMS_WITH_SPEC.some((room) => file === `src/lib/${room}/SPEC.md`))
		.map((file) => ({ file, says: `only ${ROOMS_WITH_SPEC.join(', ')} have a SPEC.md` }));

export const filesStayShort: Check = (tree) =>
	[...tree]
		.filter(([file]) => isCode(file))
		.map(([file, text]) => ({ file, lines: text.split('\n').length - 1 }))
		.filter(({ lines }) => lines > LONGEST_FILE)
		.map(({ file, lines }) => ({ file, says: `has ${lines} lines, more than ${LONGEST_FILE}` }));

export const namesFollowTheHouse: Check = (tree) =>
	[...tree.keys()]
		.filter(isCode)
		.filter((file) => !isWellNamed(fileName(file)))
		.map((file) => ({ file, says: 'kebab-case.ts, thing.svelte.ts or PascalCase.svelte' }));

export const namesSaySomething: Check = (tree) =>
	[...tree.keys()]
		.filter((file) => isCode(file) && file !== 'src/service-worker.ts')
		.filter((file) => file.split(/[/.-]/).some((word) => isIn(VAGUE_WORDS, word.toLowerCase())))
		.map((file) => ({ file, says: `a name with ${VAGUE_WORDS.join(', ')} says nothing` }));

const isWellNamed = (name: string): boolean =>
	name.endsWith('.svelte')
		? /^(?:[A-Z][A-Za-z0-9]*|\+(?:page|layout|error))\.svelte$/.test(name)
		: /^\+?[a-z0-9]+(?:[.-][a-z0-9]+)*\.(?:ts|mjs|js)$/.test(name);

const entriesOf = (tree: Tree, folder: string): readonly string[] => [
	...new Set(
		[...tree.keys()].filter((file) => file.startsWith(folder)).map((file) => file.slice(folder.length).split('/')[0]!),
	),
];

const isIn = (list: readonly string[], word: string): boolean => list.includes(word);
