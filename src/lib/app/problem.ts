import type { DossierError } from '../dossier';
import type { ResumeCodeError } from '../identity';
import type { ComposeError, SeriesError, TrendError } from '../record';
import type { CannotOpen, ChainMovedOn, StorageError } from '../store';

/** Why something could not be done, for a person to read and act on. Nothing was kept unless it says so. */
export type Problem =
	| StorageError
	| ChainMovedOn
	| CannotOpen
	| ComposeError
	| SeriesError
	| TrendError
	| ResumeCodeError
	/** One tablet holds one site of its own. */
	| { readonly kind: 'site-exists' }
	/** What was typed about a new site is not complete. */
	| { readonly kind: 'site-incomplete'; readonly n: number }
	/** The identity room refused a key or a certificate of a new site. */
	| { readonly kind: 'site-refused'; readonly because: string }
	| { readonly kind: 'no-right'; readonly person: string; readonly roles: readonly string[] }
	| { readonly kind: 'no-plant' }
	| { readonly kind: 'plant-refused'; readonly at: string }
	/** The tablet holds no site and no people yet. */
	| { readonly kind: 'no-site' }
	| { readonly kind: 'nobody-chosen' }
	| { readonly kind: 'not-enrolled-here'; readonly person: string }
	/** Entries are signed with the key of the shift, and none was begun in this start-up. */
	| { readonly kind: 'no-shift'; readonly person: string }
	/** The screen was covered meanwhile: who holds the tablet says so again before the next entry. */
	| { readonly kind: 'shift-covered'; readonly person: string }
	| { readonly kind: 'wrong-code'; readonly left: number }
	/** Three wrong codes, or none chosen: the PIN it is. */
	| { readonly kind: 'code-used-up' }
	| { readonly kind: 'no-such-start-up'; readonly startUp: string }
	| { readonly kind: 'start-up-unreadable'; readonly startUp: string; readonly what: string }
	| { readonly kind: 'not-a-picture' | 'not-utf8'; readonly name: string }
	| { readonly kind: 'no-such-step'; readonly step: string }
	| { readonly kind: 'sealed'; readonly startUp: string }
	/** What the rules do not allow: kept as a refused act. */
	| { readonly kind: 'refused-act'; readonly because: readonly string[] }
	/** The record went on after the sheet was made: it is shown anew before anybody signs. */
	| { readonly kind: 'sheet-changed' }
	/** The dossier is made of a sealed record alone. */
	| { readonly kind: 'not-sealed-yet'; readonly startUp: string }
	| { readonly kind: 'dossier-refused'; readonly error: DossierError }
	| { readonly kind: 'signing-refused'; readonly because: string }
	/** Has no role for it, gave another signature of this file, or has no key here. */
	| { readonly kind: 'not-this-signature'; readonly person: string; readonly meaning: string }
	| { readonly kind: 'no-root-in-file'; readonly name: string }
	| { readonly kind: 'work-stopped'; readonly because: string }
	| { readonly kind: 'demonstration-stopped'; readonly because: string };
