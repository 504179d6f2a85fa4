import { canonicalJson, sha256Hex, type Json } from '../base';
import { PlantSchema, readShape, type Plant } from '../plant';
import { ProcedureSchema, type Procedure } from '../procedure';
import type { EventOf } from '../record';
import { failed, passed, undecided, type Check } from './pdf/check';

/** The documents that a start-up was run by, out of its own record. */
export type Documents = { readonly procedure: Procedure | undefined; readonly plant: Plant | undefined };

type Opened = EventOf<'start-up opened'>;
const KINDS = ['procedure', 'plant', 'fuel'] as const;

/** What the opening pinned by hash is what the record holds: the approved procedure, this plant, this fuel. */
export function checkDocuments(opened: Opened | undefined): {
	readonly checks: readonly Check[];
	readonly documents: Documents;
} {
	const held = opened?.body.documents ?? {};
	const procedure = readShape(ProcedureSchema, held.procedure);
	const plant = readShape(PlantSchema, held.plant);
	const shapes = [
		{ kind: 'procedure', read: procedure },
		{ kind: 'plant', read: plant },
	].flatMap(({ kind, read }) =>
		read.ok || held[kind] === undefined
			? []
			: [
					failed(
						`${kind} can be read`,
						`At "${read.error[0]?.path ?? ''}": ${read.error[0]?.expected ?? ''} expected.`,
					),
				],
	);
	return {
		checks: [...KINDS.flatMap((kind) => (opened === undefined ? [] : checkPinned(kind, opened))), ...shapes],
		documents: {
			procedure: procedure.ok ? procedure.value : undefined,
			plant: plant.ok ? plant.value : undefined,
		},
	};
}

function checkPinned(kind: (typeof KINDS)[number], { body }: Opened): readonly Check[] {
	const name = `${kind} is the one that was pinned`;
	const pinned = body[kind];
	const document = body.documents?.[kind];
	if (pinned === undefined) {
		if (document === undefined)
			return kind === 'fuel' ? [] : [undecided(name, 'The opening pins none and holds none.')];
		return [undecided(name, 'The record holds it, and its opening pins none.')];
	}
	const called = `${pinned.id}${pinned.revision === undefined ? '' : ` revision ${pinned.revision}`}`;
	const facts = { pinned: pinned.hash ?? '', id: pinned.id };
	if (document === undefined) return [undecided(name, `The record does not hold ${called}.`, { facts })];
	if (pinned.hash === undefined) return [undecided(name, `${called} is pinned by its name only.`, { facts })];
	const found = sha256Hex(canonicalJson(document as Json));
	if (found !== pinned.hash)
		return [
			failed(name, `The document inside has another hash than ${called}.`, {
				facts: { ...facts, found },
				sub: 'HASH_FAILURE',
			}),
		];
	const own = idOf(document);
	if (
		own.id !== undefined &&
		(own.id !== pinned.id || (pinned.revision !== undefined && own.revision !== pinned.revision))
	)
		return [
			failed(
				name,
				`The document inside says that it is ${own.id} revision ${String(own.revision)}; pinned is ${called}.`,
				{ facts },
			),
		];
	return [passed(name, `${called}, hash ${found.slice(0, 16)}.`, { facts })];
}

/** Procedures and plants name themselves; other documents need not. */
function idOf(document: unknown): { readonly id?: string; readonly revision?: number } {
	const { id, unit, revision } = document as {
		readonly id?: unknown;
		readonly unit?: unknown;
		readonly revision?: unknown;
	};
	const named = typeof id === 'string' ? id : unit;
	return {
		...(typeof named === 'string' ? { id: named } : {}),
		...(typeof revision === 'number' ? { revision } : {}),
	};
}
