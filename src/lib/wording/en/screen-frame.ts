/** The frame of a start-up: its places, and what is always in reach. */
export const SCREEN_FRAME = {
	'ui.frame.places': 'Places of start-up {name}',
	'ui.frame.more': 'More',
	'ui.frame.line': 'Line',
	'ui.frame.lapsed': 'Lapsed',
	'ui.frame.deviations': 'Deviations',
	'ui.frame.log': 'Log',
	'ui.frame.hand-over': 'Hand-over',
	'ui.frame.dossier': 'Dossier',
	'ui.frame.happened': 'Something happened',
	'ui.frame.about': 'About Gatehold',
} as const;
