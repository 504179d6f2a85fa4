import { fail, fromBase64, ok, toBase64, type Result } from '../base';
import { importPublicKey, type SigningKey } from './keys';
import { ES256, subtle } from './webcrypto';

export type SignatureError =
	| { readonly kind: 'algorithm-not-allowed'; readonly alg: string; readonly allowed: readonly string[] }
	| { readonly kind: 'malformed-signature'; readonly expected: '64 bytes, r and s, as base64' }
	| { readonly kind: 'malformed-key'; readonly expected: 'a P-256 public key' }
	| { readonly kind: 'wrong-signature' };

/**
 * ES256 (RFC 7518 section 3.4): ECDSA on P-256 over SHA-256, r and s of 32 bytes each, as base64.
 * Another valid signature of the same bytes can be made from this one by anybody, (r, n - s): the bytes that were signed
 * name a thing, a signature never does.
 */
export async function sign(bytes: Uint8Array<ArrayBuffer>, key: SigningKey): Promise<string> {
	return toBase64(new Uint8Array(await subtle.sign(ES256, key.privateKey, bytes)));
}

export async function checkSignature(claim: {
	readonly bytes: Uint8Array<ArrayBuffer>;
	readonly alg: string;
	readonly signature: string;
	readonly publicKey: string;
}): Promise<Result<'valid', SignatureError>> {
	if (!ALLOWED.includes(claim.alg)) return fail({ kind: 'algorithm-not-allowed', alg: claim.alg, allowed: ALLOWED });
	const signature = fromBase64(claim.signature);
	if (signature?.length !== 64) return fail({ kind: 'malformed-signature', expected: '64 bytes, r and s, as base64' });
	const key = await importPublicKey(claim.publicKey);
	if (key === undefined) return fail({ kind: 'malformed-key', expected: 'a P-256 public key' });
	const valid = await subtle.verify(ES256, key, signature, claim.bytes);
	return valid ? ok('valid') : fail({ kind: 'wrong-signature' });
}

/** What a signature may be made with. A new algorithm is a new line here and nowhere else. */
const ALLOWED: readonly string[] = ['ES256'];
