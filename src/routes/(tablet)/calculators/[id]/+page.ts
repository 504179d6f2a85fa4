import { error } from '@sveltejs/kit';
import { CATALOGUE, latest, type Calculator } from '$lib/calc';
import { sayRefusal, speaker } from '$lib/wording';
import type { PageLoad } from './$types';

/** Calculators are known to the app alone: one page answers for all of them. */
export const prerender = false;

export const load: PageLoad = async ({ params, parent }): Promise<{ readonly calculator: Calculator }> => {
	const calculator = latest(params.id);
	if (calculator !== undefined) return { calculator };
	const { preferences } = await parent();
	const unknown = { kind: 'unknown-calculator', calc: params.id, known: Object.keys(CATALOGUE) };
	error(404, sayRefusal(unknown, speaker(preferences.language)));
};
