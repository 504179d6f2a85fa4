import { Environment, ParseError, type ASTNode } from '@marcbachmann/cel-js';
import { fail, ok, type Result } from '../base';
import type { Permissive } from './schema';

/** What is wrong with a condition, each with its place: `at` is the offset in the condition's text. */
export type ConditionFinding = { readonly at: number } & (
	| { readonly kind: 'condition-unreadable'; readonly expected: string }
	| { readonly kind: 'condition-too-large'; readonly nodes: number; readonly depth: number }
	| { readonly kind: 'condition-unknown-name'; readonly name: string; readonly known: readonly string[] }
	| { readonly kind: 'condition-unlike-quantities'; readonly left: string; readonly right: string }
	| { readonly kind: 'condition-not-a-truth'; readonly found: string }
	| { readonly kind: 'condition-not-allowed'; readonly what: string }
	| { readonly kind: 'condition-nested-macro'; readonly what: string }
	| { readonly kind: 'condition-unused-name'; readonly name: string }
);

export type Condition = (names: { readonly [name: string]: number | boolean }) => boolean;

/**
 * Reads a condition in the Common Expression Language and walks its tree: truths joined by && || ! and ?:, where a truth
 * is a fact, or a reading compared with a number or with a reading of the same quantity, basis and unit; `all` and
 * `exists` over a list of like readings. Everything else of the language is refused, also what would be harmless.
 */
export function readCondition(permissive: Permissive): Result<Condition, readonly ConditionFinding[]> {
	let parsed;
	try {
		parsed = LANGUAGE.parse(permissive.condition);
	} catch (error) {
		if (!(error instanceof ParseError)) throw error;
		return fail([unreadable(error)]);
	}
	const findings: ConditionFinding[] = [];
	const walk = walker(permissive, findings);
	walk.truth(parsed.ast);
	for (const name of Object.keys(walk.known)) {
		if (!walk.used.has(name)) findings.push({ kind: 'condition-unused-name', at: 0, name });
	}
	return findings.length > 0 ? fail(findings) : ok((names) => parsed({ ...names }) === true);
}

/** What an expression is: a truth, a bare number, or a reading (or list of readings) of one quantity in one unit. */
type Kind = 'truth' | 'number' | { readonly reading: string } | { readonly list: string } | undefined;
type Names = { readonly [name: string]: Kind };

function walker(permissive: Permissive, findings: ConditionFinding[]) {
	const known: Names = {
		...Object.fromEntries(
			Object.entries(permissive.readings).map(([name, use]) => [
				name,
				{ reading: [use.quantity, ...(use.basis === undefined ? [] : [use.basis]), `in ${use.unit}`].join(' ') },
			]),
		),
		...Object.fromEntries(Object.keys(permissive.facts ?? {}).map((name) => [name, 'truth' as const])),
	};
	const used = new Set<string>();
	const refuse = (node: ASTNode, what: string): undefined => {
		findings.push({ kind: 'condition-not-allowed', at: node.start, what });
		return undefined;
	};

	const kindOf = (node: ASTNode, bound: Names): Kind => {
		switch (node.op) {
			case 'value':
				if (typeof node.args === 'number' || typeof node.args === 'bigint') return 'number';
				{ refuse(node, `a ${node.args === null ? 'null' : typeof node.args} literal`); return; }
			case 'id':
				return nameKind(node, node.args, bound);
			case '-_':
				{ kindOf(node.args, bound) === 'number' ? 'number' : refuse(node, 'arithmetic with a reading'); return; }
			case '!_':
				truth(node.args, bound);
				return 'truth';
			case '&&':
			case '||':
				node.args.forEach((each) => truth(each, bound));
				return 'truth';
			case '?:':
				node.args.forEach((each) => truth(each, bound));
				return 'truth';
			case '<':
			case '<=':
			case '>':
			case '>=':
			case '==':
			case '!=':
				compare(node, ...node.args, bound);
				return 'truth';
			case 'list':
				return listKind(node, node.args, bound);
			case 'rcall':
				return macroKind(node, node.args, bound);
			case 'call':
				{ refuse(node, node.args[0]); return; }
			default:
				{ refuse(node, node.op); return; }
		}
	};

	const nameKind = (node: ASTNode, name: string, bound: Names): Kind => {
		if (Object.hasOwn(bound, name)) return bound[name];
		used.add(name);
		if (Object.hasOwn(known, name)) return known[name];
		findings.push({ kind: 'condition-unknown-name', at: node.start, name, known: Object.keys(known) });
		return undefined;
	};

	const compare = (node: ASTNode, left: ASTNode, right: ASTNode, bound: Names) => {
		const kinds = [kindOf(left, bound), kindOf(right, bound)] as const;
		if (kinds.includes(undefined)) return;
		const [a, b] = kinds.map(wordsOf) as [string, string];
		if (!kinds.some(isReading)) refuse(node, `comparing ${a} with ${b}`);
		else if (!kinds.includes('number') && a !== b)
			findings.push({ kind: 'condition-unlike-quantities', at: node.start, left: a, right: b });
	};

	const listKind = (node: ASTNode, items: readonly ASTNode[], bound: Names): Kind => {
		const kinds = items.map((item) => kindOf(item, bound));
		if (kinds.includes(undefined)) return undefined;
		const [first] = kinds;
		if (!isReading(first) || !kinds.every(isReading)) { refuse(node, 'a list of anything but readings'); return; }
		const odd = kinds.findIndex((kind) => wordsOf(kind) !== first.reading);
		if (odd === -1) return { list: first.reading };
		const at = items[odd]?.start ?? node.start;
		findings.push({ kind: 'condition-unlike-quantities', at, left: first.reading, right: wordsOf(kinds[odd]) });
		return undefined;
	};

	const macroKind = (
		node: ASTNode,
		[macro, target, args]: readonly [string, ASTNode, readonly ASTNode[]],
		bound: Names,
	): Kind => {
		const [variable, body] = args;
		if (!MACROS.has(macro) || variable?.op !== 'id' || body === undefined) { refuse(node, macro); return; }
		if (Object.keys(bound).length > 0) {
			findings.push({ kind: 'condition-nested-macro', at: node.start, what: macro });
			return undefined;
		}
		if (Object.hasOwn(known, variable.args)) { refuse(variable, `a second meaning of ${variable.args}`); return; }
		const list = kindOf(target, bound);
		if (list === undefined) return 'truth';
		if (typeof list !== 'object' || !('list' in list)) { refuse(target, `${macro} of ${wordsOf(list)}`); return; }
		truth(body, { [variable.args]: { reading: list.list } });
		return 'truth';
	};

	const truth = (node: ASTNode, bound: Names = {}) => {
		const kind = kindOf(node, bound);
		if (kind !== undefined && kind !== 'truth')
			findings.push({ kind: 'condition-not-a-truth', at: node.start, found: wordsOf(kind) });
	};

	return { truth, known, used };
}

const isReading = (kind: Kind): kind is { readonly reading: string } => typeof kind === 'object' && 'reading' in kind;

const wordsOf = (kind: Kind): string => {
	if (typeof kind !== 'object') return kind === 'number' ? 'a number' : 'a truth';
	return 'reading' in kind ? kind.reading : `a list of ${kind.list}`;
};

const unreadable = (error: ParseError): ConditionFinding => {
	const at = error.range?.start ?? 0;
	return error.code === 'limit_exceeded'
		? { kind: 'condition-too-large', at, nodes: MAX_NODES, depth: MAX_DEPTH }
		: { kind: 'condition-unreadable', at, expected: error.summary };
};

/** Far above what a gate needs, far below what can stall a tablet. */
const MAX_NODES = 500;
const MAX_DEPTH = 32;
const MACROS = new Set(['all', 'exists']);
const LANGUAGE = new Environment({
	unlistedVariablesAreDyn: true,
	limits: { maxAstNodes: MAX_NODES, maxDepth: MAX_DEPTH },
});
