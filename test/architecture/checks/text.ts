import ts from 'typescript';
import { FORBIDDEN_WORDS, LEFT_BEHIND, MACHINE_PATHS, PURE, ROOMS } from '../plan';
import { isCode, placeOf, type Check, type Tree } from '../tree';

/** The door of every room tells, in three lines, what the room is, how it behaves and what it may import. */
export const everyDoorHasItsSign: Check = (tree) =>
	ROOMS.filter((room) => [...tree.keys()].some((file) => file.startsWith(`src/lib/${room}/`))).flatMap((room) => {
		const file = `src/lib/${room}/index.ts`;
		const text = tree.get(file);
		if (text === undefined) return [{ file, says: 'the room has no door' }];
		const sign = new RegExp(`^/\\*\\*\\n \\* ${room}: .+\\n \\* .+\\n \\* May import: .+\\n \\*/\\n`);
		return sign.test(text) ? [] : [{ file, says: 'the door needs its sign of three lines' }];
	});

export const noDefaultExports: Check = (tree) =>
	lines(tree, (file) => isCode(file) && !file.endsWith('.d.ts'), /^\s*export default\b/, 'a default export');

export const noHtmlFromData: Check = (tree) =>
	lines(tree, (file) => file.endsWith('.svelte'), /\{@html\b/, 'markup from data');

const inTwo = (head: string, tail: string) => new RegExp(`\\b(?:it|test|describe)${head}\\.(?:${tail})\\b`);

export const everyTestRuns: Check = (tree) =>
	lines(
		tree,
		(file) => file.startsWith('test/') && isCode(file),
		inTwo('(?:\\.\\w+)*', 'only|skip|todo'),
		'a test that is left out, or leaves the others out',
	);

export const nothingIsLeftBehind: Check = (tree) =>
	lines(tree, isCode, new RegExp(`\\b(?:${LEFT_BEHIND.join('|')})\\b|@ts-(?:ignore|nocheck)`), 'something left behind');

export const noForbiddenWords: Check = (tree) =>
	lines(tree, isOurs, new RegExp(`\\b(?:${FORBIDDEN_WORDS.join('|')})\\b`, 'i'), 'a word that must not stand here');

export const noPlacesOfOneMachine: Check = (tree) =>
	lines(
		tree,
		isOurs,
		new RegExp(`(?:^|[^A-Za-z0-9_.~}])(?:${MACHINE_PATHS.map((path) => path.replace('.', '\\.')).join('|')})`),
		'a path or address of one machine',
	);

export const pureRoomsAreBlind: Check = (tree) =>
	[...tree]
		.filter(([file]) => (PURE as readonly string[]).includes(placeOf(file)) && file.endsWith('.ts'))
		.flatMap(([file, text]) => outsideWorldIn(file, text).map((what) => ({ file, says: `uses ${what}` })));

const OUTSIDE = new Set([
	'fetch',
	'window',
	'document',
	'navigator',
	'localStorage',
	'sessionStorage',
	'indexedDB',
	'process',
	'performance',
	'setTimeout',
	'setInterval',
	'XMLHttpRequest',
	'WebSocket',
	'globalThis',
]);
const OUTSIDE_MEMBERS = new Set(['Date.now', 'Math.random', 'crypto.getRandomValues', 'crypto.randomUUID']);

/** Reads the syntax, not the text: a hold `window` that the file declares itself is no browser window. */
function outsideWorldIn(file: string, text: string): readonly string[] {
	const declared = new Set<string>();
	const used: string[] = [];
	const visit = (node: ts.Node): void => {
		if (isBinding(node) && ts.isIdentifier(node.name)) declared.add(node.name.text);
		if (ts.isIdentifier(node) && OUTSIDE.has(node.text) && isReference(node)) used.push(node.text);
		if (ts.isPropertyAccessExpression(node) && OUTSIDE_MEMBERS.has(node.getText())) used.push(node.getText());
		if (ts.isNewExpression(node) && node.expression.getText() === 'Date' && !node.arguments?.length) {
			used.push('new Date()');
		}
		ts.forEachChild(node, visit);
	};
	visit(ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true));
	return used.filter((name) => !declared.has(name));
}

const isBinding = (node: ts.Node): node is ts.VariableDeclaration | ts.ParameterDeclaration | ts.BindingElement =>
	ts.isVariableDeclaration(node) || ts.isParameter(node) || ts.isBindingElement(node);

/** The name of a member or of a declaration stands for itself; `{ window }` reads the value. */
function isReference(name: ts.Identifier): boolean {
	const parent = name.parent as ts.Node & { readonly name?: ts.Node; readonly propertyName?: ts.Node };
	return ts.isShorthandPropertyAssignment(parent) || (parent.name !== name && parent.propertyName !== name);
}

const isOurs = (file: string): boolean => file !== 'package-lock.json';

const lines = (tree: Tree, where: (file: string) => boolean, what: RegExp, says: string) =>
	[...tree]
		.filter(([file]) => where(file))
		.flatMap(([file, text]) =>
			text
				.split('\n')
				.flatMap((line, i) =>
					what.test(line) ? [{ file, says: `line ${i + 1}: ${says}: ${line.trim().slice(0, 120)}` }] : [],
				),
		);
