import * as v from 'valibot';
import { canonicalJson, fail, ok, utf8, type Result } from '../base';
import type { Certificate } from './certificate';
import { isInstant, millisecondsOf, type Instant } from './instant';
import type { SigningKey } from './keys';
import { readJsonFile, type UnreadableFile } from './read-json-file';
import { checkSignature, sign, type SignatureError } from './sign';

/** What a site knows of its certificates, signed and carried to tablets that may not see a network for a month. */
export type TrustList = {
	readonly kind: 'trust list';
	readonly v: 1;
	readonly site: string;
	/** Grows by one with every issue; a tablet keeps the highest it has seen. */
	readonly sequence: number;
	readonly issued: Instant;
	/** After this moment something may have been revoked that this list does not know. It never stops a signature. */
	readonly nextUpdate: Instant;
	/** DER as base64: people, devices and issuers. */
	readonly certificates: readonly string[];
	readonly revocations: readonly Revocation[];
};

export type Revocation = {
	/** Fingerprint of the certificate. */
	readonly certificate: string;
	readonly at: Instant;
	readonly reason: 'device lost' | 'left the site' | 'key may be known' | 'replaced' | 'issued in error';
};

/** The bytes that were signed are the bytes that are kept and carried. */
export type SignedTrustList = { readonly text: string; readonly alg: 'ES256'; readonly signature: string };

export type TrustListError =
	| UnreadableFile
	| SignatureError
	| { readonly kind: 'of-another-site'; readonly site: string }
	| { readonly kind: 'older-than-held'; readonly sequence: number; readonly held: number }
	/** Two lists under one number: the issuer's key or the issuer's word is no longer good. */
	| { readonly kind: 'forked'; readonly sequence: number };

export async function signTrustList(list: TrustList, key: SigningKey): Promise<SignedTrustList> {
	const text = canonicalJson(list);
	return { text, alg: 'ES256', signature: await sign(utf8(text), key) };
}

export async function openTrustList(
	signed: SignedTrustList,
	root: Certificate,
): Promise<Result<TrustList, TrustListError>> {
	const bytes = utf8(signed.text);
	const checked = await checkSignature({
		bytes,
		alg: signed.alg,
		signature: signed.signature,
		publicKey: root.publicKey,
	});
	if (!checked.ok) return checked;
	const list = readJsonFile(bytes, trustList);
	if (!list.ok) return list;
	const { site } = list.value;
	return root.subject.kind === 'authority' && root.subject.name === site
		? list
		: fail({ kind: 'of-another-site', site });
}

/** Which of two opened lists a tablet keeps. An older one is refused: that is how a revocation would be undone. */
export function replaceTrustList(held: TrustList | undefined, offered: TrustList): Result<TrustList, TrustListError> {
	if (held === undefined || offered.sequence > held.sequence) return ok(offered);
	if (offered.sequence < held.sequence) {
		return fail({ kind: 'older-than-held', sequence: offered.sequence, held: held.sequence });
	}
	return canonicalJson(held) === canonicalJson(offered) ? ok(held) : fail({ kind: 'forked', sequence: held.sequence });
}

/** A list informs about a moment when it was issued after it, or had not run out by then. */
export const informsAbout = (list: TrustList, moment: Instant): boolean =>
	millisecondsOf(list.issued) >= millisecondsOf(moment) || millisecondsOf(list.nextUpdate) >= millisecondsOf(moment);

const instant = v.pipe(v.string(), v.check(isInstant, 'an RFC 3339 moment'));

export const trustList: v.GenericSchema<unknown, TrustList> = v.strictObject({
	kind: v.literal('trust list'),
	v: v.literal(1),
	site: v.string(),
	sequence: v.pipe(v.number(), v.safeInteger(), v.minValue(0)),
	issued: instant,
	nextUpdate: instant,
	certificates: v.array(v.pipe(v.string(), v.base64())),
	revocations: v.array(
		v.strictObject({
			certificate: v.pipe(v.string(), v.regex(/^[0-9a-f]{64}$/)),
			at: instant,
			reason: v.picklist(['device lost', 'left the site', 'key may be known', 'replaced', 'issued in error']),
		}),
	),
});

export const signedTrustList: v.GenericSchema<unknown, SignedTrustList> = v.strictObject({
	text: v.string(),
	alg: v.literal('ES256'),
	signature: v.string(),
});
