import { error } from '@sveltejs/kit';
import { sayProblem, StepDesk } from '$lib/app';
import { speaker } from '$lib/wording';
import type { PageLoad } from './$types';

export const load: PageLoad = async ({ params, parent, depends }): Promise<{ readonly desk: StepDesk }> => {
	// What is half typed belongs to whom typed it: another person finds their own.
	depends('app:person');
	const { startUp, preferences } = await parent();
	const desk = await StepDesk.open(startUp, params.step);
	if (!desk.ok) error(404, sayProblem(desk.error, speaker(preferences.language)));
	return { desk: desk.value };
};
