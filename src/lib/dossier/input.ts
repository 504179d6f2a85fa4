import type { EventError } from '../record';
import type { Plant } from '../plant';
import type { Procedure } from '../procedure';
import type { Language } from '../wording';
import type { NoGlyph } from './sign/ink';

type Bytes = Uint8Array<ArrayBuffer>;

/** All that a dossier is made from. The same input makes the same bytes, wherever and whenever it is written (SPEC.md, D1). */
export type DossierInput = {
	/** Stored lines of the start-up's log, as far as the seal covers them; kept byte for byte. */
	readonly lines: readonly string[];
	/** Stored lines of the site's log that the start-up rests on. */
	readonly siteLines: readonly string[];
	/** The documents that the opening pinned. */
	readonly procedure: Procedure;
	readonly plant: Plant;
	/** DER of the site root, and of every certificate that signed or was issued to who signed. */
	readonly root: Bytes;
	readonly certificates: readonly Bytes[];
	/** Photos and trend files that events name by their hash. */
	readonly files: readonly { readonly name: string; readonly mediaType: string; readonly bytes: Bytes }[];
	readonly language: Language;
	/** Program and version that write the file: "Gatehold 0.1.0". */
	readonly writer: string;
	/** The closing signatures, in the order of signing. After the last the file takes no more. */
	readonly signatures: readonly RequiredSignature[];
};

export type RequiredSignature = {
	/** `sig_performed`: letters and underscores. */
	readonly field: string;
	readonly meaning: 'performed' | 'reviewed' | 'accepted';
	/** Any one of these roles. */
	readonly roles: readonly string[];
};

/** How far the writing of a dossier is: told to whoever waits for it, and no part of its bytes. */
export type Progress = (part: 'chapter' | 'sheet' | 'file', done: number, of: number) => void;

export type DossierError =
	| (EventError & { readonly log: 'start-up' | 'site' })
	| { readonly kind: 'not-one-opening'; readonly found: number }
	| { readonly kind: 'not-sealed' }
	/** Events that the seal does not cover: they belong into a supplement. */
	| { readonly kind: 'after-the-seal'; readonly events: readonly string[] }
	| { readonly kind: 'no-signature-asked-for' }
	| NoGlyph;
