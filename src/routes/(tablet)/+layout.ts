import { error } from '@sveltejs/kit';
import { sayProblem, systemClock, ThisTablet } from '$lib/app';
import { speaker } from '$lib/wording';

/** Storage and tablet are opened once for as long as the tab lives. */
export const load = async (): Promise<{ readonly here: ThisTablet }> => {
	const here = await ThisTablet.open(systemClock);
	if (!here.ok) error(503, sayProblem(here.error, speaker('en')));
	return { here: here.value };
};
