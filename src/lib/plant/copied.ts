import { canonicalJson, type Json } from '../base';
import type { Plant } from './schema';

/** Lists of a description whose items carry values that belong to one unit alone. */
const LISTS = ['volumes', 'ducts', 'points', 'venturis', 'inertSources', 'instruments', 'limits'] as const;
const SINGLES = ['altitude', 'purge', 'fuel'] as const;

export type ValueList = (typeof LISTS)[number];

/** Every item of a description that carries values of the unit, in the order in which it is written. */
export const itemsWithValues = (plant: Plant): readonly string[] => [
	...SINGLES.filter((name) => plant[name] !== undefined),
	...LISTS.flatMap((list) => plant[list].map((item) => `${list}/${nameOf(item)}`)),
];

/** A new unit's description, begun as a copy: everything that it says of values is still to be replaced. */
export function copyOf(plant: Plant, as: Pick<Plant, 'unit' | 'site' | 'title' | 'utcOffsetMinutes'>): Plant {
	const from = `${plant.unit}, ${plant.site}, revision ${plant.revision}`;
	const copied = { from, toReplace: itemsWithValues(plant), replaced: [] };
	return { ...plant, ...as, revision: 1, demonstration: false, copied };
}

/** Takes items as replaced by a person: whether their values were changed, or found to be the unit's own as they are. */
export function replacedBy(plant: Plant, items: readonly string[], by: string, at: string): Plant {
	const { copied } = plant;
	if (copied === undefined) return plant;
	const fresh = items.filter((item) => copied.toReplace.includes(item));
	return {
		...plant,
		copied: {
			...copied,
			toReplace: copied.toReplace.filter((item) => !fresh.includes(item)),
			replaced: [...copied.replaced, ...fresh.map((item) => ({ item, by, at }))],
		},
	};
}

/**
 * Measuring points that are not described as before: their own description, their instrument, or a limit that applies to
 * them. Proofs that read them under the old description lapse (record/SPEC.md, ST7).
 */
export function changedPoints(before: Plant, after: Plant): readonly string[] {
	const tags = new Set([...before.points, ...after.points].map(({ tag }) => tag));
	return [...tags].filter((tag) => canonicalJson(about(before, tag)) !== canonicalJson(about(after, tag)));
}

function about(plant: Plant, tag: string): Json {
	const point = plant.points.find((each) => each.tag === tag);
	const instruments = plant.instruments.filter((each) => each.point === tag || each.id === point?.instrument);
	const limits = plant.limits.filter(({ appliesTo = [] }) => appliesTo.includes(tag));
	return { point: point ?? null, instruments, limits };
}

const nameOf = (item: { readonly id: string } | { readonly tag: string }): string =>
	'id' in item ? item.id : item.tag;
