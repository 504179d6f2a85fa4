import { error, redirect } from '@sveltejs/kit';
import { resolve } from '$app/paths';
import { PlantBook, sayProblem } from '$lib/app';
import { speaker } from '$lib/wording';
import type { PageLoad } from './$types';

export const load: PageLoad = async ({ parent }): Promise<{ readonly book: PlantBook }> => {
	const { here, preferences } = await parent();
	if (here.tablet === undefined) redirect(307, resolve('/'));
	const book = await PlantBook.open(here.tablet);
	if (!book.ok) error(404, sayProblem(book.error, speaker(preferences.language)));
	return { book: book.value };
};
