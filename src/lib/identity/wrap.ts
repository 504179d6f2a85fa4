import * as v from 'valibot';
import { canonicalJson, fail, fromBase64, ok, toBase64, utf8, type Result } from '../base';
import { P256, subtle, type Random } from './webcrypto';

/**
 * A private key at rest: PKCS#8 under AES-256-GCM, the key of which is stretched from a secret that a person knows.
 * Every member but `sealed` is authenticated with it: a changed member fails like a wrong secret.
 */
export type WrappedKey = {
	readonly v: 1;
	/** Whose key this is and what for; authenticated, not interpreted. */
	readonly of: { readonly [name: string]: string };
	readonly kdf: 'PBKDF2-SHA-256';
	readonly iterations: number;
	/** 16 bytes as base64. */
	readonly salt: string;
	readonly cipher: 'AES-256-GCM';
	/** 12 bytes as base64. */
	readonly iv: string;
	readonly sealed: string;
};

export type UnwrapError =
	/** The secret is wrong, or a member was changed: the seal does not tell which. */
	| { readonly kind: 'wrong-secret' }
	| { readonly kind: 'weak-wrap'; readonly iterations: number; readonly atLeast: number }
	| { readonly kind: 'damaged-wrap'; readonly at: string; readonly expected: string };

// OWASP ASVS 5.0, appendix C: PBKDF2-HMAC-SHA-256 with at least 600 000 iterations.
export const MIN_ITERATIONS = 600_000;

/** Above this a file from elsewhere could hold the tablet busy for minutes. */
export const MAX_ITERATIONS = 10_000_000;

export async function wrapKey(
	privateKey: CryptoKey,
	how: {
		readonly secret: string;
		readonly of: WrappedKey['of'];
		readonly iterations?: number;
		readonly random: Random;
	},
): Promise<WrappedKey> {
	const iterations = how.iterations ?? MIN_ITERATIONS;
	if (!(iterations >= MIN_ITERATIONS && iterations <= MAX_ITERATIONS)) throw new TypeError(`${iterations} iterations`);
	const salt = how.random(16);
	const iv = how.random(12);
	const stated: Stated = {
		v: 1,
		of: how.of,
		kdf: 'PBKDF2-SHA-256',
		iterations,
		salt: toBase64(salt),
		cipher: 'AES-256-GCM',
		iv: toBase64(iv),
	};
	const kek = await stretch({ secret: how.secret, salt, iterations, use: 'wrapKey' });
	const sealed = await subtle.wrapKey('pkcs8', privateKey, kek, aesGcm(iv, stated));
	return { ...stated, sealed: toBase64(new Uint8Array(sealed)) };
}

/** Opens a wrapped key for signing. What comes out cannot be exported. */
export async function unwrapKey(wrapped: WrappedKey, secret: string): Promise<Result<CryptoKey, UnwrapError>> {
	const { sealed, ...stated } = wrapped;
	const { iterations } = stated;
	if (!(iterations >= MIN_ITERATIONS)) return fail({ kind: 'weak-wrap', iterations, atLeast: MIN_ITERATIONS });
	if (iterations > MAX_ITERATIONS) return damaged('iterations', `at most ${MAX_ITERATIONS}`);
	const salt = fromBase64(stated.salt);
	if (salt?.length !== 16) return damaged('salt', '16 bytes as base64');
	const iv = fromBase64(stated.iv);
	if (iv?.length !== 12) return damaged('iv', '12 bytes as base64');
	const bytes = fromBase64(sealed);
	if (bytes === undefined) return damaged('sealed', 'base64');
	const kek = await stretch({ secret, salt, iterations, use: 'unwrapKey' });
	try {
		return ok(await subtle.unwrapKey('pkcs8', bytes, kek, aesGcm(iv, stated), P256, false, ['sign']));
	} catch {
		return fail({ kind: 'wrong-secret' });
	}
}

type Stated = Omit<WrappedKey, 'sealed'>;

const damaged = (at: string, expected: string) => fail({ kind: 'damaged-wrap', at, expected } as const);

const aesGcm = (iv: Uint8Array<ArrayBuffer>, stated: Stated) => ({
	name: 'AES-GCM',
	iv,
	additionalData: utf8(canonicalJson(stated)),
});

/** NFKC first, so that the same secret typed on two keyboards is the same secret (NIST SP 800-63B, 5.1.1.2). */
async function stretch(from: {
	readonly secret: string;
	readonly salt: Uint8Array<ArrayBuffer>;
	readonly iterations: number;
	readonly use: 'wrapKey' | 'unwrapKey';
}): Promise<CryptoKey> {
	const typed = await subtle.importKey('raw', utf8(from.secret.normalize('NFKC')), 'PBKDF2', false, ['deriveKey']);
	const pbkdf2 = { name: 'PBKDF2', hash: 'SHA-256', salt: from.salt, iterations: from.iterations };
	return subtle.deriveKey(pbkdf2, typed, { name: 'AES-GCM', length: 256 }, false, [from.use]);
}

const base64 = v.pipe(v.string(), v.base64());

export const wrappedKey: v.GenericSchema<unknown, WrappedKey> = v.strictObject({
	v: v.literal(1),
	of: v.record(v.string(), v.string()),
	kdf: v.literal('PBKDF2-SHA-256'),
	iterations: v.pipe(v.number(), v.integer()),
	salt: base64,
	cipher: v.literal('AES-256-GCM'),
	iv: base64,
	sealed: base64,
});
