import type { Procedure } from '../schema';
import type { Plant } from '../../plant';
import { INERT_START_UP, inertStartUpFor } from './inert-start-up';

/** Every built-in procedure, by id. */
export const LIBRARY: { readonly [id: string]: Procedure } = {
	[INERT_START_UP.id]: INERT_START_UP,
};

/** The built-in procedures as a unit uses them: those of the demonstration as they are, those of a site by its own values. */
export const libraryFor = (plant: Plant): readonly Procedure[] =>
	plant.demonstration ? Object.values(LIBRARY) : [inertStartUpFor(plant)];
