import { fromBase64, toBase64 } from '../base';
import { P256, subtle } from './webcrypto';

/** A P-256 public key as base64 of its SubjectPublicKeyInfo (RFC 5480): what statements, certificates and PEM files carry. */
export type PublicKey = string & { readonly __publicKey: true };

/** A key that can sign now. It cannot be exported: what leaves it are signatures. */
export type SigningKey = { readonly alg: 'ES256'; readonly publicKey: PublicKey; readonly privateKey: CryptoKey };

/** Of a shift: cannot be exported, and is kept on the tablet until the shift ends. A gate key signs for it (`shift-key.ts`). */
export async function makeEntryKey(): Promise<SigningKey> {
	const pair = await subtle.generateKey(P256, false, ['sign', 'verify']);
	return { alg: 'ES256', publicKey: await exportPublicKey(pair.publicKey), privateKey: pair.privateKey };
}

/** An exportable pair, for the moment between making a key and wrapping it. It stays inside this room. */
export const makeKeyPair = (): Promise<CryptoKeyPair> => subtle.generateKey(P256, true, ['sign', 'verify']);

export const exportPublicKey = async (key: CryptoKey): Promise<PublicKey> =>
	toBase64(new Uint8Array(await subtle.exportKey('spki', key))) as PublicKey;

/** @returns undefined when the text is not a P-256 key */
export async function importPublicKey(publicKey: string): Promise<CryptoKey | undefined> {
	const spki = fromBase64(publicKey);
	if (spki === undefined) return undefined;
	try {
		return await subtle.importKey('spki', spki, P256, true, ['verify']);
	} catch {
		return undefined;
	}
}

/** The same key as a JSON Web Key (RFC 7517), which is how a `shift key` event carries it. */
export type Jwk = { readonly kty: 'EC'; readonly crv: 'P-256'; readonly x: string; readonly y: string };

export async function toJwk(publicKey: PublicKey): Promise<Jwk> {
	const key = await importPublicKey(publicKey);
	if (key === undefined) throw new TypeError('not a P-256 key');
	const { x, y } = await subtle.exportKey('jwk', key);
	if (x === undefined || y === undefined) throw new TypeError('not a P-256 key');
	return { kty: 'EC', crv: 'P-256', x, y };
}

/** @returns undefined when it is anything but a public P-256 key with no other member */
export async function fromJwk(jwk: unknown): Promise<PublicKey | undefined> {
	if (typeof jwk !== 'object' || jwk === null || Object.keys(jwk).sort().join() !== 'crv,kty,x,y') return undefined;
	try {
		return await exportPublicKey(await subtle.importKey('jwk', jwk, P256, true, ['verify']));
	} catch {
		return undefined;
	}
}
