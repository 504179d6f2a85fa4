import * as v from 'valibot';
import { concat, fromBase64, type Json } from '../base';
import { LANGUAGES, type Language } from '../wording';

type Bytes = Uint8Array<ArrayBuffer>;

const UpdateSchema = v.strictObject({
	field: v.string(),
	person: v.string(),
	name: v.string(),
	role: v.string(),
	at: v.string(),
	/** The incremental update that this signature added, as base64. */
	bytes: v.string(),
});

const VerifiedSchema = v.strictObject({ outcome: v.picklist(['passed', 'failed', 'undecided']), at: v.string() });

const DossierDraftSchema = v.strictObject({
	v: v.literal(1),
	/** Id of the seal. */
	sealed: v.string(),
	made: v.string(),
	language: v.custom<Language>((given) => typeof given === 'string' && Object.hasOwn(LANGUAGES, given)),
	/** Hash of the first state, which lies among the attachments. */
	base: v.string(),
	notHere: v.array(v.string()),
	updates: v.array(UpdateSchema),
	/** Hash of the closed file, once every signature is there. */
	closed: v.exactOptional(v.string()),
	verified: v.exactOptional(VerifiedSchema),
});

/**
 * A dossier on its way from one signer to the next, as the tablet keeps it: its first state once, and what each signature
 * added. Nothing of it is lost on a reload, and nothing is stored twice.
 */
export type DossierDraft = v.InferOutput<typeof DossierDraftSchema>;
export type SignedUpdate = v.InferOutput<typeof UpdateSchema>;

export function readDossierDraft(typed: Json): DossierDraft | undefined {
	const read = v.safeParse(DossierDraftSchema, typed);
	return read.success ? read.output : undefined;
}

/** One for each start-up on this tablet. */
export const draftOf = (startUp: string, device: string) => ({ startUp, step: DOSSIER, person: device });
export const DOSSIER = 'dossier';

/** A signature adds bytes at the end and changes none before them. */
export const withUpdates = (base: Bytes, updates: readonly SignedUpdate[]): Bytes =>
	concat(base, ...updates.map(({ bytes }) => fromBase64(bytes) ?? new Uint8Array()));
