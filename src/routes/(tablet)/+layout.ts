import { error } from '@sveltejs/kit';
import { sayProblem, systemClock, ThisTablet } from '$lib/app';
import { speaker } from '$lib/wording';
import type { LayoutLoad } from './$types';

/** Storage and tablet are opened once for as long as the tab lives. */
export const load: LayoutLoad = async ({ parent }): Promise<{ readonly here: ThisTablet }> => {
	const { preferences } = await parent();
	const here = await ThisTablet.open(systemClock, localStorage);
	if (!here.ok) error(503, sayProblem(here.error, speaker(preferences.language)));
	return { here: here.value };
};
