import { fail, ok, type Result } from '../base';
import type { Plant } from '../plant';

/** The part of a path up to and with the word that leads nowhere. */
export type NoSuchPath = { readonly stopsAt: string };

/**
 * Follows a slash path through a plant description. A word after a list is the id or tag of one of its items:
 * `venturis/FT-201/pipeDiameter`.
 */
export function atPlantPath(plant: Plant, path: string): Result<unknown, NoSuchPath> {
	let here: unknown = plant;
	const walked: string[] = [];
	for (const word of path.split('/')) {
		walked.push(word);
		here = Array.isArray(here) ? itemOf(here, word) : memberOf(here, word);
		if (here === undefined) return fail({ stopsAt: walked.join('/') });
	}
	return ok(here);
}

const itemOf = (list: readonly unknown[], word: string): unknown =>
	list.find((item) => memberOf(item, 'id') === word || memberOf(item, 'tag') === word);

const memberOf = (object: unknown, name: string): unknown =>
	typeof object === 'object' && object !== null && Object.hasOwn(object, name)
		? (object as { readonly [name: string]: unknown })[name]
		: undefined;
