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
	const walk = new Walk(permissive);
	walk.truth(parsed.ast, NOTHING);
	// In a condition that was refused in part, a name may be used where the walk did not go.
	const findings = walk.findings.length > 0 ? walk.findings : walk.unused();
	return findings.length > 0 ? fail(findings) : ok((names) => parsed({ ...names }) === true);
}

/** What an expression is: a truth, a bare number, or a reading (or a list of readings) of one quantity in one unit. */
type Kind = 'truth' | 'number' | { readonly reading: string } | { readonly list: string } | 'refused';
type Names = ReadonlyMap<string, Kind>;

class Walk {
	readonly findings: ConditionFinding[] = [];
	readonly #known: Names;
	readonly #used = new Set<string>();

	constructor({ readings, facts = {} }: Permissive) {
		this.#known = new Map<string, Kind>([
			...Object.entries(readings).map(([name, use]): [string, Kind] => [
				name,
				{ reading: [use.quantity, ...(use.basis === undefined ? [] : [use.basis]), `in ${use.unit}`].join(' ') },
			]),
			...Object.keys(facts).map((name): [string, Kind] => [name, 'truth']),
		]);
	}

	unused(): readonly ConditionFinding[] {
		const names = [...this.#known.keys()].filter((name) => !this.#used.has(name));
		return names.map((name) => ({ kind: 'condition-unused-name', at: 0, name }));
	}

	truth(node: ASTNode, bound: Names): void {
		const kind = this.#kindOf(node, bound);
		if (kind === 'truth' || kind === 'refused') return;
		this.findings.push({ kind: 'condition-not-a-truth', at: node.start, found: wordsOf(kind) });
	}

	#refuse(node: ASTNode, what: string): 'refused' {
		this.findings.push({ kind: 'condition-not-allowed', at: node.start, what });
		return 'refused';
	}

	#kindOf(node: ASTNode, bound: Names): Kind {
		switch (node.op) {
			case 'value':
				if (typeof node.args === 'number' || typeof node.args === 'bigint') return 'number';
				return this.#refuse(node, `the literal ${node.input.slice(node.start, node.end)}`);
			case 'id':
				return this.#name(node, node.args, bound);
			case '-_':
				return this.#kindOf(node.args, bound) === 'number' ? 'number' : this.#refuse(node, 'arithmetic');
			case '!_':
				this.truth(node.args, bound);
				return 'truth';
			case '&&':
			case '||':
			case '?:':
				for (const part of node.args) this.truth(part, bound);
				return 'truth';
			case '<':
			case '<=':
			case '>':
			case '>=':
			case '==':
			case '!=':
				return this.#comparison(node, node.args, bound);
			case 'list':
				return this.#list(node, node.args, bound);
			case 'rcall':
				return this.#macro(node, node.args, bound);
			case 'call':
				return this.#refuse(node, node.args[0]);
			default:
				return this.#refuse(node, node.op);
		}
	}

	#name(node: ASTNode, name: string, bound: Names): Kind {
		this.#used.add(name);
		const kind = bound.get(name) ?? this.#known.get(name);
		if (kind !== undefined) return kind;
		this.findings.push({ kind: 'condition-unknown-name', at: node.start, name, known: [...this.#known.keys()] });
		return 'refused';
	}

	#comparison(node: ASTNode, [left, right]: readonly [ASTNode, ASTNode], bound: Names): Kind {
		const a = this.#kindOf(left, bound);
		const b = this.#kindOf(right, bound);
		if (a === 'refused' || b === 'refused') return 'refused';
		const readings = [a, b].filter(isReading);
		if (readings.length === 0 || ![a, b].every((kind) => kind === 'number' || isReading(kind)))
			return this.#refuse(node, `comparing ${wordsOf(a)} with ${wordsOf(b)}`);
		if (readings.length === 2 && wordsOf(a) !== wordsOf(b)) return this.#unlike(node, a, b);
		return 'truth';
	}

	#unlike(node: ASTNode, left: Kind, right: Kind): 'refused' {
		const words = { left: wordsOf(left), right: wordsOf(right) };
		this.findings.push({ kind: 'condition-unlike-quantities', at: node.start, ...words });
		return 'refused';
	}

	#list(node: ASTNode, items: readonly ASTNode[], bound: Names): Kind {
		const kinds = items.map((item) => ({ item, kind: this.#kindOf(item, bound) }));
		if (kinds.some(({ kind }) => kind === 'refused')) return 'refused';
		const first = kinds[0]?.kind;
		if (first === undefined || !isReading(first) || !kinds.every(({ kind }) => isReading(kind)))
			return this.#refuse(node, 'a list of anything but readings');
		const odd = kinds.find(({ kind }) => wordsOf(kind) !== first.reading);
		return odd === undefined ? { list: first.reading } : this.#unlike(odd.item, first, odd.kind);
	}

	#macro(node: ASTNode, [macro, target, args]: readonly [string, ASTNode, readonly ASTNode[]], bound: Names): Kind {
		const [variable, body] = args;
		if (!MACROS.has(macro) || variable?.op !== 'id' || body === undefined) return this.#refuse(node, macro);
		if (bound !== NOTHING) {
			this.findings.push({ kind: 'condition-nested-macro', at: node.start, what: macro });
			return 'refused';
		}
		if (this.#known.has(variable.args)) return this.#refuse(variable, `a second meaning of ${variable.args}`);
		const list = this.#kindOf(target, bound);
		if (list === 'refused') return 'refused';
		if (typeof list !== 'object' || !('list' in list)) return this.#refuse(target, `${macro} of ${wordsOf(list)}`);
		this.truth(body, new Map([[variable.args, { reading: list.list }]]));
		return 'truth';
	}
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

const NOTHING: Names = new Map();
const MACROS = new Set(['all', 'exists']);

/** Far above what a gate needs, far below what can stall a tablet. */
const MAX_NODES = 500;
const MAX_DEPTH = 32;
const LANGUAGE = new Environment({
	unlistedVariablesAreDyn: true,
	limits: { maxAstNodes: MAX_NODES, maxDepth: MAX_DEPTH },
});
