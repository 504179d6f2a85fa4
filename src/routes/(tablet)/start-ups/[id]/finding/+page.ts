import { error } from '@sveltejs/kit';
import { sayProblem, SheetDraft } from '$lib/app';
import { speaker } from '$lib/wording';
import type { PageLoad } from './$types';

type Typed = {
	readonly instrument?: string;
	readonly error?: string;
	readonly tolerance?: string;
	readonly note?: string;
};

export const load: PageLoad = async ({ parent, depends }) => {
	depends('app:person');
	const { startUp, preferences } = await parent();
	const draft = await SheetDraft.open<Typed>(startUp, 'instrument finding');
	if (!draft.ok) error(503, sayProblem(draft.error, speaker(preferences.language)));
	return { draft: draft.value };
};
