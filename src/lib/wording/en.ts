import { APP } from './en/app';
import { BEGIN } from './en/begin';
import { CHAPTERS } from './en/chapters';
import { CLOSING } from './en/closing';
import { COVER } from './en/cover';
import { ERRORS } from './en/errors';
import { FINDINGS } from './en/findings';
import { GATES } from './en/gates';
import { HAND_OVER } from './en/hand-over';
import { NOTES } from './en/notes';
import { PEOPLE } from './en/people';
import { OPEN } from './en/open';
import { PLANT } from './en/plant';
import { SCREEN_ACTS } from './en/screen-acts';
import { SCREEN_ENTRIES } from './en/screen-entries';
import { SCREEN_FRAME } from './en/screen-frame';
import { SCREEN_CALCULATORS } from './en/screen-calculators';
import { SCREEN_DOSSIER } from './en/screen-dossier';
import { SCREEN_LINE } from './en/screen-line';
import { SCREEN_LOG } from './en/screen-log';
import { SCREEN_NOW } from './en/screen-now';
import { SCREEN_PAGES } from './en/screen-pages';
import { SCREEN_STEPS } from './en/screen-steps';
import { SETTINGS } from './en/settings';
import { STATEMENTS } from './en/statements';
import { SCREEN_TODAY } from './en/screen-today';
import { STATES } from './en/states';
import { WORDS } from './en/words';

/** English. Every message under a key that says where it stands; another language has the same keys. */
export const EN = {
	...STATES,
	...STATEMENTS,
	...COVER,
	...GATES,
	...CHAPTERS,
	...CLOSING,
	...ERRORS,
	...FINDINGS,
	...NOTES,
	...APP,
	...SCREEN_FRAME,
	...SCREEN_LINE,
	...SCREEN_STEPS,
	...HAND_OVER,
	...PEOPLE,
	...SCREEN_ENTRIES,
	...SCREEN_TODAY,
	...SCREEN_ACTS,
	...SCREEN_LOG,
	...SCREEN_NOW,
	...SCREEN_PAGES,
	...SCREEN_DOSSIER,
	...SETTINGS,
	...SCREEN_CALCULATORS,
	...BEGIN,
	...OPEN,
	...PLANT,
	...WORDS,
} as const;
