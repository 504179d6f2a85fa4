import { APP } from './de/app';
import { BEGIN } from './de/begin';
import { CHAPTERS } from './de/chapters';
import { CLOSING } from './de/closing';
import { COVER } from './de/cover';
import { ERRORS } from './de/errors';
import { FINDINGS } from './de/findings';
import { GATES } from './de/gates';
import { HAND_OVER } from './de/hand-over';
import { NOTES } from './de/notes';
import { PEOPLE } from './de/people';
import { OPEN } from './de/open';
import { PLANT } from './de/plant';
import { SCREEN_ACTS } from './de/screen-acts';
import { SCREEN_CALCULATORS } from './de/screen-calculators';
import { SCREEN_DOSSIER } from './de/screen-dossier';
import { SCREEN_ENTRIES } from './de/screen-entries';
import { SCREEN_FRAME } from './de/screen-frame';
import { SCREEN_LINE } from './de/screen-line';
import { SCREEN_LOG } from './de/screen-log';
import { SCREEN_NOW } from './de/screen-now';
import { SCREEN_PAGES } from './de/screen-pages';
import { SCREEN_STEPS } from './de/screen-steps';
import { SETTINGS } from './de/settings';
import { STATEMENTS } from './de/statements';
import { SCREEN_TODAY } from './de/screen-today';
import { STATES } from './de/states';
import { WORDS } from './de/words';
import type { EN } from './en';

/**
 * German, as plants write it. One word for one thing:
 *
 * start-up Anfahrvorgang (place in the app: Anfahren), procedure Anfahrvorschrift, gate Stufe, step Schritt, hold point
 * Haltepunkt, release freigeben, refuse verweigern, refused act abgewiesene Handlung, entry Eintrag, proof Nachweis, it
 * stands er gilt, it lapses er verfällt, failed durchgefallen, try Versuch, blocks sperrt, deviation Abweichung, disposition
 * Entscheidung, not applicable entfällt, plant event Anlagenereignis, watch Überwachung, round Messrunde, reading Messwert
 * (the act: Ablesung), series Messreihe, measuring point Messstelle, instrument Messgerät, tag Kennzeichen, limit Grenzwert,
 * guard band Schutzband, basis Bezug (feucht, trocken), purge Spülen, swept durchspült, enclosed volume Raum, dead leg
 * Totraum, coverage Abdeckung, in-leakage Falschluft, floor Endwert, hold Haltezeit, adequate ausreichend, cannot be shown
 * nicht nachweisbar, line-up Stellungskontrolle, hand-over Übergabe, seal Siegel, record Aufzeichnung, log Protokoll, head code
 * Standcode, site Werk, unit Anlage, site root Wurzel des Werks, enrol aufnehmen, sign unterschreiben, ladder Kontaktplan
 * (IEC 61131-3), limiting oxygen concentration Sauerstoffgrenzkonzentration, concession Einschränkung, witness Zeuge.
 */
export const DE: { readonly [key in keyof typeof EN]: string } = {
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
};
