import * as v from 'valibot';
import { canonicalJson, fail, fromBase64, ok, toBase64, utf8, type Result } from '../base';
import { CN, readCertificate, type Certificate, type CertificateError } from './certificate';
import { millisecondsOf, utcInstant, type Instant } from './instant';
import { exportPublicKey, makeKeyPair, type SigningKey } from './keys';
import { printedName, type NameError } from './printed-name';
import { readJsonFile, type UnreadableFile } from './read-json-file';
import { ES256, type Random } from './webcrypto';
import { unwrapKey, wrapKey, wrappedKey, type UnwrapError, type WrappedKey } from './wrap';
import { distinguishedName, serialFrom, x509 } from './x509';

/** The site's own authority as a file: needed to enrol people and devices, and for nothing else. */
export type SiteRootFile = {
	readonly kind: 'site root';
	readonly v: 1;
	/** DER as base64. */
	readonly certificate: string;
	readonly key: WrappedKey;
};

export type OpenSiteRoot = { readonly certificate: Certificate; readonly key: SigningKey };

export type SiteRootError =
	| NameError
	| UnwrapError
	| CertificateError
	| { readonly kind: 'short-passphrase'; readonly words: number; readonly atLeast: number }
	| { readonly kind: 'validity-out-of-range'; readonly years: number; readonly min: number; readonly max: number }
	| { readonly kind: 'not-a-site-root'; readonly at: string };

const MIN_WORDS = 6;
const MIN_YEARS = 10;
const MAX_YEARS = 15;

export async function makeSiteRoot(site: {
	readonly name: string;
	readonly now: Instant;
	readonly years?: number;
	readonly passphrase: string;
	readonly random: Random;
}): Promise<Result<SiteRootFile, SiteRootError>> {
	const name = printedName(site.name);
	if (!name.ok) return name;
	const words = site.passphrase.trim().split(/\s+/).length;
	if (words < MIN_WORDS) return fail({ kind: 'short-passphrase', words, atLeast: MIN_WORDS });
	const years = site.years ?? MAX_YEARS;
	if (!(years >= MIN_YEARS && years <= MAX_YEARS)) {
		return fail({ kind: 'validity-out-of-range', years, min: MIN_YEARS, max: MAX_YEARS });
	}
	const pair = await makeKeyPair();
	const notBefore = new Date(millisecondsOf(site.now));
	const notAfter = new Date(notBefore);
	notAfter.setUTCFullYear(notBefore.getUTCFullYear() + years);
	const certificate = await x509.X509CertificateGenerator.createSelfSigned({
		serialNumber: serialFrom(site.random),
		name: distinguishedName([[CN, name.value]]),
		notBefore,
		notAfter,
		keys: pair,
		signingAlgorithm: ES256,
		extensions: [
			// One level of issuing certificates may come between the root and people.
			new x509.BasicConstraintsExtension(true, 1, true),
			new x509.KeyUsagesExtension(x509.KeyUsageFlags.keyCertSign | x509.KeyUsageFlags.cRLSign, true),
			await x509.SubjectKeyIdentifierExtension.create(pair.publicKey),
			await x509.AuthorityKeyIdentifierExtension.create(pair.publicKey),
		],
	});
	const key = await wrapKey(pair.privateKey, {
		secret: site.passphrase,
		of: {
			key: 'site root',
			site: name.value,
			from: utcInstant(notBefore),
			publicKey: await exportPublicKey(pair.publicKey),
		},
		random: site.random,
	});
	return ok({ kind: 'site root', v: 1, certificate: toBase64(new Uint8Array(certificate.rawData)), key });
}

export async function openSiteRoot(
	file: SiteRootFile,
	passphrase: string,
): Promise<Result<OpenSiteRoot, SiteRootError>> {
	const certificate = rootCertificate(file);
	if (!certificate.ok) return certificate;
	const { publicKey } = certificate.value;
	if (file.key.of.publicKey !== publicKey) return fail({ kind: 'not-a-site-root', at: 'key.of.publicKey' });
	const privateKey = await unwrapKey(file.key, passphrase);
	if (!privateKey.ok) return privateKey;
	return ok({ certificate: certificate.value, key: { alg: 'ES256', publicKey, privateKey: privateKey.value } });
}

/** The public half, for which no passphrase is needed. */
export function rootCertificate(file: SiteRootFile): Result<Certificate, SiteRootError> {
	const der = fromBase64(file.certificate);
	return der === undefined ? fail({ kind: 'not-a-site-root', at: 'certificate' }) : readCertificate(der);
}

export const writeSiteRootFile = (root: SiteRootFile): Uint8Array<ArrayBuffer> => utf8(canonicalJson(root));

export const readSiteRootFile = (bytes: Uint8Array): Result<SiteRootFile, UnreadableFile> =>
	readJsonFile(bytes, siteRootFile);

const siteRootFile: v.GenericSchema<unknown, SiteRootFile> = v.strictObject({
	kind: v.literal('site root'),
	v: v.literal(1),
	certificate: v.pipe(v.string(), v.base64()),
	key: wrappedKey,
});
