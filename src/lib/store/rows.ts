import type { Json } from '../base';
import type { GateKey, ResumeCode, SignedTrustList, SigningKey, SiteRootFile, Tries } from '../identity';
import type { Plant } from '../plant';

/** A photo or trend file, named by its bytes; the shape in which events carry it. */
export type Attachment = {
	/** SHA-256 of the bytes. */
	readonly hash: string;
	readonly name: string;
	readonly mediaType: string;
	readonly bytes: number;
};

/** The blob is a handle: its bytes are read only when somebody asks for them. */
export type KeptAttachment = Attachment & { readonly blob: Blob };

export type DraftKey = {
	/** The log it belongs to, or any other name for what has none yet. */
	readonly startUp: string;
	/** The step, or the sheet where it is none: "note", "plant event". */
	readonly step: string;
	readonly person: string;
};

/** Something half typed, exactly as typed. It is no record yet and may be changed and dropped. */
export type Draft = DraftKey & { readonly typed: Json; readonly saved: string };

/** A person's gate key on this tablet, as it lies there: wrapped, with its certificate and the wrong tries in a row. */
export type GateKeyRow = {
	readonly person: string;
	readonly device: string;
	/** Absent after the tenth wrong PIN: the wrap is destroyed and its owner enrols again. */
	readonly gateKey?: GateKey;
	/** DER; `readCertificate` says what it claims. */
	readonly certificate: Uint8Array<ArrayBuffer>;
	readonly tries: Tries;
};

/**
 * The key of a person's shift in one start-up, kept so that a browser that was killed goes on. It cannot be exported by a
 * script and lies on the medium as plain bytes (as the tablet's own): it signs entries only, for twelve hours at most.
 */
export type ShiftKeyRow = {
	readonly person: string;
	readonly device: string;
	readonly log: string;
	/** Id of the `shift key` event by which the gate key delegates to it. */
	readonly shiftKey: string;
	readonly key: SigningKey;
	/** In milliseconds; from here on the key is no use and is dropped. */
	readonly notAfter: number;
	/** When its owner last had the tablet in hand, in milliseconds. */
	readonly touched: number;
	/** With what the owner goes on after the screen was covered, and how often something else was typed. */
	readonly resume?: ResumeCode & { readonly wrong: number };
};

/** What the tablet knows of its site and of itself, one value under each name. */
export type SiteValues = {
	/** Only on the tablet that holds the site's root; wrapped by its passphrase. */
	readonly 'root file': SiteRootFile;
	/** DER of the root that this tablet trusts. */
	readonly 'root certificate': Uint8Array<ArrayBuffer>;
	readonly 'trust list': SignedTrustList;
	readonly tablet: Tablet;
	/** The unit of this site as it was approved last; the record pins it by its hash. */
	readonly plant: Plant;
	/** The revision that is being approved: put in place of the other once its event is written. */
	readonly 'next plant': Plant;
	readonly settings: { readonly [name: string]: Json };
	readonly 'last copy': Copy;
	/** Made with the database; a database without it, on a tablet that remembers one, was erased. */
	readonly birth: Birth;
};

export type SiteRow = { readonly name: keyof SiteValues; readonly value: SiteValues[keyof SiteValues] };

export type Tablet = {
	readonly device: string;
	readonly label: string;
	/** DER. */
	readonly certificate: Uint8Array<ArrayBuffer>;
	/** Cannot be exported by a script; on the medium it lies as plain bytes, so it only countersigns. */
	readonly key: SigningKey;
};

/** A copy in a second place: another tablet, a stick, a file. */
export type Copy = { readonly at: string; readonly to: string };

export type Birth = { readonly id: string; readonly made: string };
