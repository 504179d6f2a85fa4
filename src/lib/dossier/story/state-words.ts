import type { Mark } from '../../drawing';
import type { StepStanding } from '../../record';
import type { Story } from './story';

/** State of a step as a mark and a word of the past: the dossier says what stood, never what stands. */
export function shownState(
	standing: Pick<StepStanding, 'state' | 'since'> | undefined,
	{ say, moments }: Pick<Story, 'say' | 'moments'>,
): { readonly text: string; readonly mark: Mark } {
	const state = standing?.state ?? 'not yet';
	const since = standing?.since;
	switch (state) {
		case 'lapsed':
			return {
				text: since === undefined ? say('state.lapsed') : say('state.lapsed at', { at: moments.clock(since) }),
				mark: 'lapsed',
			};
		case 'failed':
			return { text: say('state.failed'), mark: 'failed' };
		default:
			return { text: say(`state.${state}`), mark: state };
	}
}
