import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';
import { expect, test } from 'vitest';

const ROOM = join(import.meta.dirname, '../../src/lib/store');

test('inside a transaction nothing is awaited but the database (rule 33)', () => {
	const sources = readdirSync(ROOM).map((file) => readFileSync(join(ROOM, file), 'utf8'));
	const found = sources.map(awaitedInTransactions);
	expect(found.flat().length).toBeGreaterThanOrEqual(10);
	expect(found.flat().filter((awaited) => !isOfDatabase(awaited))).toEqual([]);
});

test('a signature awaited inside a transaction would be found', () => {
	const planted = `db.transaction('rw', db.events, async () => { await db.events.get(1); await sign(bytes, key); });`;
	expect(awaitedInTransactions(planted).filter((awaited) => !isOfDatabase(awaited))).toEqual(['sign(bytes, key)']);
});

/** A table's method, or a function of the room that is given the database first. */
const isOfDatabase = (awaited: string): boolean => /^(?:db\.\w+\b|\w+\(db\b)/.test(awaited);

function awaitedInTransactions(source: string): readonly string[] {
	const awaited: string[] = [];
	const visit = (node: ts.Node, inside: boolean): void => {
		if (inside && ts.isAwaitExpression(node)) awaited.push(node.expression.getText());
		const begins = ts.isCallExpression(node) && node.expression.getText().endsWith('.transaction');
		ts.forEachChild(node, (child) => visit(child, inside || begins));
	};
	visit(ts.createSourceFile('one.ts', source, ts.ScriptTarget.Latest, true), false);
	return awaited;
}
