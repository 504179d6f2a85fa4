import type { Instant, Role, TrustList } from '../../identity';

/** What the judge knows and the judged file does not say. */
export type PdfQuestion = {
	/** DER of the site root as the judge knows it; without it nobody vouches for anybody. */
	readonly root?: Uint8Array<ArrayBuffer> | undefined;
	readonly trustList?: TrustList | undefined;
	readonly now: Instant;
	/** The whole file existed not later than this: an archive receipt. */
	readonly provenBy?: Instant | undefined;
	/** What the record asks for: each field, and the roles of which its signer must have one. */
	readonly required?: readonly RequiredSignature[];
};

export type RequiredSignature = { readonly field: string; readonly roles?: readonly Role[] };
