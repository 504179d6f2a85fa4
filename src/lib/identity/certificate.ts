import { fail, ok, sha256Hex, toBase64, type Result } from '../base';
import { utcInstant, type Instant } from './instant';
import type { PublicKey } from './keys';
import { isRole, type Role } from './roles';
import { x509 } from './x509';

export type PersonId = string & { readonly __person: true };
export type DeviceId = string & { readonly __device: true };
/** SHA-256 of a certificate's DER, in hexadecimal: how events name their signer. */
export type Fingerprint = string & { readonly __certificate: true };

/**
 * Whom a certificate names. Everything is an ordinary attribute of the X.509 subject, so that any certificate viewer
 * shows it: CN = printed name, UID = person id, title = one role (repeated), host = device id, O = site.
 */
export type Subject =
	| {
			readonly kind: 'person';
			readonly person: PersonId;
			readonly printedName: string;
			readonly roles: readonly Role[];
			/** The tablet that the key was made on and never leaves. */
			readonly device: DeviceId;
			readonly site: string;
	  }
	| { readonly kind: 'device'; readonly device: DeviceId; readonly label: string; readonly site: string }
	| { readonly kind: 'authority'; readonly name: string };

export type Certificate = {
	readonly der: Uint8Array<ArrayBuffer>;
	readonly fingerprint: Fingerprint;
	readonly serial: string;
	readonly subject: Subject;
	/** X.500 name of the issuer as text, to show. */
	readonly issuer: string;
	readonly publicKey: PublicKey;
	readonly notBefore: Instant;
	readonly notAfter: Instant;
};

export type CertificateError =
	| { readonly kind: 'not-a-certificate'; readonly because: string }
	| { readonly kind: 'unknown-subject'; readonly subject: string }
	| { readonly kind: 'unknown-role'; readonly role: string };

/** Reads a certificate that this house issued. It says what the certificate claims: only `checkChain` says who vouches. */
export function readCertificate(der: Uint8Array<ArrayBuffer>): Result<Certificate, CertificateError> {
	const parsed = parseX509(der);
	if (!parsed.ok) return parsed;
	const certificate = parsed.value;
	const subject = readSubject(certificate);
	if (!subject.ok) return subject;
	return ok({
		der,
		fingerprint: fingerprintOf(der),
		serial: certificate.serialNumber,
		subject: subject.value,
		issuer: certificate.issuer,
		publicKey: toBase64(new Uint8Array(certificate.publicKey.rawData)) as PublicKey,
		notBefore: utcInstant(certificate.notBefore),
		notAfter: utcInstant(certificate.notAfter),
	});
}

export const fingerprintOf = (der: Uint8Array): Fingerprint => sha256Hex(der) as Fingerprint;

export function toPem(der: Uint8Array): string {
	const lines = toBase64(der).match(/.{1,64}/g) ?? [];
	return `-----BEGIN CERTIFICATE-----\n${lines.join('\n')}\n-----END CERTIFICATE-----\n`;
}

/** The first certificate of a PEM file (RFC 7468), or the bytes themselves when they already are DER. */
export function fromPem(file: Uint8Array<ArrayBuffer>): Result<Uint8Array<ArrayBuffer>, CertificateError> {
	const text = new TextDecoder('latin1').decode(file);
	const body = /-----BEGIN CERTIFICATE-----([\s\S]*?)-----END CERTIFICATE-----/.exec(text)?.[1];
	if (body === undefined) return withDer(parseX509(file), file);
	try {
		const der = Uint8Array.from(atob(body.replace(/\s/g, '')), (char) => char.charCodeAt(0));
		return withDer(parseX509(der), der);
	} catch {
		return fail({ kind: 'not-a-certificate', because: 'the text between the PEM lines is not base64' });
	}
}

const withDer = <E>(parsed: Result<unknown, E>, der: Uint8Array<ArrayBuffer>) => (parsed.ok ? ok(der) : parsed);

/** For this room: the library's view of a certificate, refused when anything stands behind or inside it unread. */
export function parseX509(der: Uint8Array<ArrayBuffer>): Result<x509.X509Certificate, CertificateError> {
	try {
		if (lengthOf(der) !== der.length)
			return fail({ kind: 'not-a-certificate', because: 'it does not end where it says' });
		const certificate = new x509.X509Certificate(der);
		readEveryMember(certificate);
		return ok(certificate);
	} catch (error) {
		return fail({ kind: 'not-a-certificate', because: error instanceof Error ? error.message : String(error) });
	}
}

/** Length of the outermost element by its own header (X.690, 8.1.3): the library reads over bytes that stand behind it. */
function lengthOf(der: Uint8Array): number {
	const first = der[1] ?? 0;
	const digits = first < 0x80 ? 0 : first & 0x7f;
	const content = digits === 0 ? first : der.subarray(2, 2 + digits).reduce((sum, byte) => sum * 256 + byte, 0);
	return 2 + digits + content;
}

/** The library decodes these when they are asked for, and throws then: better here than in the middle of a judgement. */
const readEveryMember = (certificate: x509.X509Certificate) => [
	certificate.notBefore.toISOString(),
	certificate.notAfter.toISOString(),
	certificate.subject,
	certificate.issuer,
	certificate.extensions,
	certificate.publicKey.algorithm,
	certificate.signatureAlgorithm,
];

function readSubject(certificate: x509.X509Certificate): Result<Subject, CertificateError> {
	const name = certificate.subjectName;
	const only = (attribute: string): string | undefined => {
		const values = name.getField(attribute);
		return values.length === 1 ? values[0] : undefined;
	};
	const [common, site, person, device] = [only(CN), only(O), only(UID), only(HOST)];
	const titles = name.getField(TITLE);
	const unknown = titles.find((title) => !isRole(title));
	if (unknown !== undefined) return fail({ kind: 'unknown-role', role: unknown });
	const authority = certificate.getExtension(x509.BasicConstraintsExtension)?.ca === true;
	if (common !== undefined && authority) return ok({ kind: 'authority', name: common });
	if (common === undefined || site === undefined || device === undefined) {
		return fail({ kind: 'unknown-subject', subject: certificate.subject });
	}
	if (person === undefined) return ok({ kind: 'device', device: device as DeviceId, label: common, site });
	const roles = titles.filter(isRole);
	return ok({
		kind: 'person',
		person: person as PersonId,
		printedName: common,
		roles,
		device: device as DeviceId,
		site,
	});
}

// X.520 and RFC 4519; host is from RFC 4524, section 2.10.
export const CN = '2.5.4.3';
export const O = '2.5.4.10';
export const TITLE = '2.5.4.12';
export const UID = '0.9.2342.19200300.100.1.1';
export const HOST = '0.9.2342.19200300.100.1.9';
