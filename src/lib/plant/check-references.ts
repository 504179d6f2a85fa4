import { itemsWithValues } from './copied';
import type { PlantFinding } from './finding';
import type { Plant } from './schema';

/** The end of a duct, or what a point reads, that is no item of the unit: the air around it. */
export const OUTSIDE = 'outside';

/** Ids that are given once only, and that exist where they are named. */
export function checkReferences(plant: Plant): readonly PlantFinding[] {
	const places = [plant.volumes, plant.surroundings ?? [], plant.ducts].flat().map(({ id }) => id);
	const all = new Set([...places, ...plant.inertSources.map(({ tag }) => tag), OUTSIDE]);
	const tags = new Set(plant.points.map(({ tag }) => tag));
	const place = (path: string, id: string): readonly PlantFinding[] =>
		all.has(id) ? [] : [{ kind: 'unknown-place', path, id }];
	const point = (path: string, tag: string | undefined): readonly PlantFinding[] =>
		tag === undefined || tags.has(tag) ? [] : [{ kind: 'unknown-point', path, tag }];

	return [
		...duplicates(plant),
		...plant.volumes.flatMap(({ walls = [] }, i) =>
			walls.flatMap((wall, k) => point(`volumes[${i}].walls[${k}].point`, wall.point)),
		),
		...plant.ducts.flatMap((duct, i) => [...place(`ducts[${i}].from`, duct.from), ...place(`ducts[${i}].to`, duct.to)]),
		...plant.elements.flatMap(({ duct }, i) => ductOf(plant, `elements[${i}].duct`, duct)),
		...plant.points.flatMap(({ at, tag, instrument }, i) => [
			...place(`points[${i}].at`, at),
			...instrumentOf(plant, `points[${i}].instrument`, { tag, instrument }),
		]),
		...plant.venturis.flatMap((venturi, i) => [
			...ductOf(plant, `venturis[${i}].duct`, venturi.duct),
			...Object.entries(venturi.points).flatMap(([name, tag]) => point(`venturis[${i}].points.${name}`, tag)),
		]),
		...plant.inertSources.flatMap(({ meter }, i) => meterOf(plant, `inertSources[${i}].meter`, meter)),
		...plant.instruments.flatMap((instrument, i) => point(`instruments[${i}].point`, instrument.point)),
		...plant.limits.flatMap(({ appliesTo = [] }, i) =>
			appliesTo.flatMap((tag, k) => point(`limits[${i}].appliesTo[${k}]`, tag)),
		),
		...point('fuel.outletPoint', plant.fuel.outletPoint),
		...copiedItems(plant),
	];
}

function copiedItems(plant: Plant): readonly PlantFinding[] {
	const items = new Set(itemsWithValues(plant));
	return (plant.copied?.toReplace ?? []).flatMap((id, i) =>
		items.has(id) ? [] : [{ kind: 'unknown-place', path: `copied.toReplace[${i}]`, id }],
	);
}

function ductOf(plant: Plant, path: string, id: string | undefined): readonly PlantFinding[] {
	const isKnown = id === undefined || plant.ducts.some((duct) => duct.id === id);
	return isKnown ? [] : [{ kind: 'unknown-duct', path, id }];
}

function instrumentOf(
	plant: Plant,
	path: string,
	{ tag, instrument: id }: { readonly tag: string; readonly instrument: string | undefined },
): readonly PlantFinding[] {
	if (id === undefined) return [];
	const instrument = plant.instruments.find((each) => each.id === id);
	if (instrument === undefined) return [{ kind: 'unknown-instrument', path, id }];
	const { point = tag } = instrument;
	return point === tag ? [] : [{ kind: 'instrument-of-another-point', path, instrument: id, point }];
}

/** What circulates in the loop is many times what enters it: only a meter of the inert gas itself may count it. */
function meterOf(plant: Plant, path: string, tag: string): readonly PlantFinding[] {
	const meter = plant.points.find((point) => point.tag === tag);
	if (meter === undefined) return [{ kind: 'unknown-point', path, tag }];
	return meter.medium === 'inert gas' ? [] : [{ kind: 'not-an-inert-gas-meter', path, tag, medium: meter.medium }];
}

type Named = { readonly path: string; readonly id: string };

/** Places share one set of names, since ducts and points name them alike; every other list has its own. */
function duplicates(plant: Plant): readonly PlantFinding[] {
	const named = (list: string, ids: readonly string[]): readonly Named[] =>
		ids.map((id, i) => ({ path: `${list}[${i}]`, id }));
	const ids = (items: readonly { readonly id: string }[]) => items.map(({ id }) => id);
	const tags = (items: readonly { readonly tag: string }[]) => items.map(({ tag }) => tag);
	const groups: readonly (readonly Named[])[] = [
		[
			...named('volumes', ids(plant.volumes)),
			...named('surroundings', ids(plant.surroundings ?? [])),
			...named('ducts', ids(plant.ducts)),
			...named('inertSources', tags(plant.inertSources)),
		],
		named('elements', tags(plant.elements)),
		named('points', tags(plant.points)),
		named('venturis', tags(plant.venturis)),
		named('instruments', ids(plant.instruments)),
		named('limits', ids(plant.limits)),
	];
	return groups.flatMap((group) =>
		group.flatMap(({ path, id }, i) => {
			const first = group.findIndex((each) => each.id === id);
			return first < i ? [{ kind: 'duplicate-id' as const, path, id, first: group[first]?.path ?? '' }] : [];
		}),
	);
}
