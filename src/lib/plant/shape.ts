import * as v from 'valibot';
import { fail, ok, type DeepReadonly, type Result } from '../base';

/** A document that has not the shape of its format: where, what was expected, what stood there. */
export type ShapeError = {
	readonly kind: 'wrong-shape';
	/** `steps[3].validity.kind`; empty: the whole document. */
	readonly path: string;
	readonly expected: string;
	readonly found: string;
};

/** Reads what came from outside by a schema. Every wrong place is named, not only the first. */
export function readShape<S extends v.GenericSchema>(
	schema: S,
	document: unknown,
): Result<DeepReadonly<v.InferOutput<S>>, readonly ShapeError[]> {
	const read = v.safeParse(schema, document);
	return read.success ? ok(read.output as DeepReadonly<v.InferOutput<S>>) : fail(read.issues.flatMap(inner).map(said));
}

/** Of a choice between shapes, the complaints of the shape that fits best: those that lie inside the object given. */
function inner(issue: v.BaseIssue<unknown>): readonly v.BaseIssue<unknown>[] {
	const within = (issue.issues ?? []).filter(({ path }) => path !== undefined);
	if (issue.type !== 'union' || within.length === 0) return [issue];
	const outer = issue.path ?? [];
	return within.map((each) => ({ ...each, path: [...outer, ...(each.path ?? [])] as unknown as typeof each.path }));
}

const said = (issue: v.BaseIssue<unknown>): ShapeError => {
	const place = { kind: 'wrong-shape', path: pathOf(issue) } as const;
	if (issue.expected === 'never') return { ...place, expected: 'no such name', found: issue.received };
	const isMissing = issue.type === 'strict_object' && issue.received === 'undefined';
	if (isMissing) return { ...place, expected: 'a value', found: 'nothing' };
	return { ...place, expected: issue.expected ?? issue.message, found: issue.received };
};

const pathOf = ({ path }: v.BaseIssue<unknown>): string =>
	(path ?? [])
		.map(({ key }) => (typeof key === 'number' ? `[${key}]` : `.${String(key)}`))
		.join('')
		.replace(/^\./, '');
