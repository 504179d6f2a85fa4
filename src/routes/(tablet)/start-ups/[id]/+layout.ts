import { error, redirect } from '@sveltejs/kit';
import { resolve } from '$app/paths';
import { sayProblem, type OpenStartUp } from '$lib/app';
import { speaker } from '$lib/wording';
import type { LayoutLoad } from './$types';

/** Nobody knows the start-ups of a tablet when the app is built. */
export const prerender = false;

export const load: LayoutLoad = async ({ params, parent }): Promise<{ readonly startUp: OpenStartUp }> => {
	const { here, preferences } = await parent();
	if (here.tablet === undefined) redirect(307, resolve('/'));
	const startUp = await here.startUp(params.id);
	if (!startUp.ok) error(404, sayProblem(startUp.error, speaker(preferences.language)));
	return { startUp: startUp.value };
};
