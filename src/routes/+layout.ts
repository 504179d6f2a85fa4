import { Preferences } from '$lib/app';

/** One page of files that runs in the browser alone, so that it also runs where no server answers. */
export const ssr = false;
export const prerender = true;

/** Made once, for as long as the tab lives. */
export const load = (): { readonly preferences: Preferences } => ({
	preferences: new Preferences(localStorage, navigator.languages),
});
