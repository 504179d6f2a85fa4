import type { SCREEN_FRAME as EN } from '../en/screen-frame';

/** Der Rahmen eines Anfahrvorgangs: seine Orte, und was immer erreichbar ist. */
export const SCREEN_FRAME: { readonly [key in keyof typeof EN]: string } = {
	'ui.frame.places': 'Orte des Anfahrvorgangs {name}',
	'ui.frame.more': 'Mehr',
	'ui.frame.line': 'Kontaktplan',
	'ui.frame.lapsed': 'Verfallen',
	'ui.frame.deviations': 'Abweichungen',
	'ui.frame.log': 'Protokoll',
	'ui.frame.hand-over': 'Übergabe',
	'ui.frame.dossier': 'Dossier',
	'ui.frame.happened': 'Etwas ist geschehen',
	'ui.frame.about': 'Über die App',
};
