import { fail, ok, type Result } from '../base';
import { CN, HOST, O, readCertificate, TITLE, UID, type Certificate } from './certificate';
import { millisecondsOf, type Instant } from './instant';
import { importPublicKey } from './keys';
import { printedName, type NameError } from './printed-name';
import type { Role } from './roles';
import type { OpenSiteRoot } from './site-root';
import { ES256, type Random } from './webcrypto';
import { distinguishedName, serialFrom, x509 } from './x509';

/** From when to when a certificate can be used: at most two years, inside the root's own time. */
export type Validity = { readonly notBefore: Instant; readonly notAfter: Instant };

export type EnrolError =
	| NameError
	| { readonly kind: 'malformed-id'; readonly field: 'person' | 'device'; readonly expected: string }
	| { readonly kind: 'no-role' }
	| { readonly kind: 'malformed-key'; readonly expected: 'a P-256 public key' }
	| { readonly kind: 'bad-validity'; readonly expected: string };

/**
 * Issues the certificate of one person's gate key on one tablet. Who stands behind the name is checked by the registrar
 * before this: a face and a document. An id is never given to a second person; the caller keeps the list.
 */
export async function enrolPerson(
	root: OpenSiteRoot,
	person: {
		readonly person: string;
		readonly printedName: string;
		readonly roles: readonly Role[];
		readonly device: string;
		readonly publicKey: string;
		readonly validity: Validity;
		readonly random: Random;
	},
): Promise<Result<Certificate, EnrolError>> {
	const name = printedName(person.printedName);
	if (!name.ok) return name;
	if (!ID.test(person.person)) return fail({ kind: 'malformed-id', field: 'person', expected: ID_FORM });
	if (person.roles.length === 0) return fail({ kind: 'no-role' });
	return issue(root, {
		...person,
		attributes: [[CN, name.value], [UID, person.person], ...person.roles.map((role) => [TITLE, role] as const)],
		extensions: [
			// RFC 9336 documentSigning says what it is for. Alone it is not known to NSS; emailProtection beside it is.
			new x509.ExtendedKeyUsageExtension([x509.ExtendedKeyUsage.emailProtection, DOCUMENT_SIGNING]),
		],
	});
}

/** Issues the certificate of a tablet's own key, which countersigns heads of its chain. */
export async function enrolDevice(
	root: OpenSiteRoot,
	device: {
		readonly device: string;
		readonly label: string;
		readonly publicKey: string;
		readonly validity: Validity;
		readonly random: Random;
	},
): Promise<Result<Certificate, EnrolError>> {
	const label = printedName(device.label);
	if (!label.ok) return label;
	return issue(root, { ...device, attributes: [[CN, label.value]], extensions: [] });
}

async function issue(
	root: OpenSiteRoot,
	of: {
		readonly device: string;
		readonly publicKey: string;
		readonly validity: Validity;
		readonly random: Random;
		readonly attributes: readonly (readonly [oid: string, value: string])[];
		readonly extensions: readonly x509.Extension[];
	},
): Promise<Result<Certificate, EnrolError>> {
	if (!ID.test(of.device)) return fail({ kind: 'malformed-id', field: 'device', expected: ID_FORM });
	const publicKey = await importPublicKey(of.publicKey);
	const rootKey = await importPublicKey(root.key.publicKey);
	if (publicKey === undefined || rootKey === undefined)
		return fail({ kind: 'malformed-key', expected: 'a P-256 public key' });
	const validity = checkValidity(of.validity, root.certificate);
	if (!validity.ok) return validity;
	const issuer = new x509.X509Certificate(root.certificate.der);
	const site = root.certificate.subject.kind === 'authority' ? root.certificate.subject.name : '';
	const attributes = [...of.attributes, [HOST, of.device], [O, site]] as const;
	const certificate = await x509.X509CertificateGenerator.create({
		serialNumber: serialFrom(of.random),
		subject: distinguishedName(attributes),
		issuer: issuer.subjectName,
		notBefore: validity.value.notBefore,
		notAfter: validity.value.notAfter,
		publicKey,
		signingKey: root.key.privateKey,
		signingAlgorithm: ES256,
		extensions: [
			new x509.BasicConstraintsExtension(false, undefined, true),
			new x509.KeyUsagesExtension(x509.KeyUsageFlags.digitalSignature | x509.KeyUsageFlags.nonRepudiation, true),
			...of.extensions,
			await x509.SubjectKeyIdentifierExtension.create(publicKey),
			await x509.AuthorityKeyIdentifierExtension.create(rootKey),
		],
	});
	const read = readCertificate(new Uint8Array(certificate.rawData));
	if (!read.ok) throw new Error(`issued a certificate that does not read back: ${read.error.kind}`);
	return ok(read.value);
}

function checkValidity(
	validity: Validity,
	root: Certificate,
): Result<{ readonly notBefore: Date; readonly notAfter: Date }, EnrolError> {
	const notBefore = new Date(millisecondsOf(validity.notBefore));
	const notAfter = new Date(millisecondsOf(validity.notAfter));
	const latest = new Date(notBefore);
	latest.setUTCFullYear(latest.getUTCFullYear() + MAX_YEARS);
	const bad = (expected: string) => fail({ kind: 'bad-validity', expected } as const);
	if (notAfter <= notBefore) return bad('an end after the beginning');
	if (notAfter > latest) return bad(`at most ${MAX_YEARS} years`);
	if (notBefore.getTime() < millisecondsOf(root.notBefore)) return bad(`not before the site root, ${root.notBefore}`);
	if (notAfter.getTime() > millisecondsOf(root.notAfter)) return bad(`not after the site root, ${root.notAfter}`);
	return ok({ notBefore, notAfter });
}

const MAX_YEARS = 2;

const ID = /^[A-Za-z0-9][A-Za-z0-9._-]{0,63}$/;
const ID_FORM = '1 to 64 letters, digits, periods, hyphens or underscores';

// RFC 9336.
const DOCUMENT_SIGNING = '1.3.6.1.5.5.7.3.36';
