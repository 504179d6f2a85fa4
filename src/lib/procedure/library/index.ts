import type { Procedure } from '../schema';
import { INERT_START_UP } from './inert-start-up';

/** Every built-in procedure, by id. */
export const LIBRARY: { readonly [id: string]: Procedure } = {
	[INERT_START_UP.id]: INERT_START_UP,
};
