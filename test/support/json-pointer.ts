/** A copy of a JSON document with values written at JSON pointers (RFC 6901); null removes what stands there. */
export function withSet(document: unknown, set: { readonly [pointer: string]: unknown }): unknown {
	const copy = structuredClone(document);
	for (const [pointer, value] of Object.entries(set)) write(copy, pointer.split('/').slice(1), value);
	return copy;
}

type Node = { [name: string]: unknown };

function write(document: unknown, words: readonly string[], value: unknown): void {
	const names = [...words];
	const last = names.pop();
	if (last === undefined) throw new Error('a pointer to the whole document');
	const parent = names.reduce<unknown>((here, name) => (here as Node)[name], document) as Node | undefined;
	if (parent === undefined) throw new Error(`nothing at ${words.join('/')}`);
	if (value !== null) parent[last] = structuredClone(value);
	else if (Array.isArray(parent)) parent.splice(Number(last), 1);
	else Reflect.deleteProperty(parent, last);
}
