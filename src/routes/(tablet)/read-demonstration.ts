import { asset } from '$app/paths';
import type { ReadFile } from '$lib/app';

/** Files of the demonstration come from where the app came from, and from its cache when there is no network. */
export const readDemonstration: ReadFile = async (name) => {
	const answer = await fetch(asset(`/demo/${name}`));
	return new Uint8Array(await answer.arrayBuffer());
};
