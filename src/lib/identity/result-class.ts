/**
 * The answer to "is this signature good?", in the words of ETSI EN 319 102-1: never a bare yes.
 *
 * Source: ETSI EN 319 102-1, main status indications and sub-indications (from memory, verify the edition).
 */
export type ResultClass = 'TOTAL-PASSED' | 'INDETERMINATE' | 'TOTAL-FAILED';

export type SubIndication = keyof typeof CLASS_OF;

/** Which class a sub-indication belongs to. */
const CLASS_OF = {
	FORMAT_FAILURE: 'TOTAL-FAILED',
	HASH_FAILURE: 'TOTAL-FAILED',
	SIG_CRYPTO_FAILURE: 'TOTAL-FAILED',
	REVOKED: 'TOTAL-FAILED',
	EXPIRED: 'TOTAL-FAILED',
	NOT_YET_VALID: 'TOTAL-FAILED',
	SIG_CONSTRAINTS_FAILURE: 'INDETERMINATE',
	CHAIN_CONSTRAINTS_FAILURE: 'INDETERMINATE',
	CERTIFICATE_CHAIN_GENERAL_FAILURE: 'INDETERMINATE',
	CRYPTO_CONSTRAINTS_FAILURE: 'INDETERMINATE',
	NO_SIGNING_CERTIFICATE_FOUND: 'INDETERMINATE',
	NO_CERTIFICATE_CHAIN_FOUND: 'INDETERMINATE',
	REVOKED_NO_POE: 'INDETERMINATE',
	OUT_OF_BOUNDS_NOT_REVOKED: 'INDETERMINATE',
	OUT_OF_BOUNDS_NO_POE: 'INDETERMINATE',
	TRY_LATER: 'INDETERMINATE',
	SIGNED_DATA_NOT_FOUND: 'INDETERMINATE',
} as const satisfies { readonly [name: string]: ResultClass };

export const classOf = (sub: SubIndication): ResultClass => CLASS_OF[sub];
