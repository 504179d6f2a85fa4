import { error } from '@sveltejs/kit';
import { sayProblem, SheetDraft } from '$lib/app';
import { speaker } from '$lib/wording';
import type { PageLoad } from './$types';

export const load: PageLoad = async ({ parent, depends }) => {
	depends('app:person');
	const { startUp, preferences } = await parent();
	const draft = await SheetDraft.open<{ readonly note: string }>(startUp, 'hand-over');
	if (!draft.ok) error(503, sayProblem(draft.error, speaker(preferences.language)));
	return { draft: draft.value };
};
