import { error, redirect } from '@sveltejs/kit';
import { resolve } from '$app/paths';
import { OpenDesk, sayProblem } from '$lib/app';
import { speaker } from '$lib/wording';
import type { PageLoad } from './$types';

export const load: PageLoad = async ({ parent }): Promise<{ readonly desk: OpenDesk }> => {
	const { here, preferences } = await parent();
	if (here.tablet === undefined) redirect(307, resolve('/'));
	const desk = await OpenDesk.open(here.tablet);
	if (!desk.ok) error(404, sayProblem(desk.error, speaker(preferences.language)));
	return { desk: desk.value };
};
