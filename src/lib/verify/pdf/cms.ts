import { concat, sameBytes, sha256, toBase64, toHex, type Result } from '../../base';
import { attempt, damaged, type Damage } from './damage';
import { children, expect, oidOf, readDer, TAG, type Der } from './der';

type Bytes = Uint8Array<ArrayBuffer>;

/** What a CMS signature says, read but not yet believed. */
export type ReadCms = {
	/** SHA-256 that the signer signed, as hexadecimal. */
	readonly messageDigest: string;
	/** DER of the signer's certificate; undefined when what the signature names is not inside. */
	readonly certificate: Bytes | undefined;
	readonly otherCertificates: readonly Bytes[];
	/** What the key signed: the attributes as a SET. */
	readonly signedBytes: Bytes;
	/** r and s of 32 bytes each, as base64. */
	readonly signature: string;
	/** Length of the DER. */
	readonly length: number;
};

/**
 * Reads a detached CAdES signature of baseline B-B and nothing wider: one signer, SHA-256, ECDSA, three signed attributes,
 * no unsigned ones (RFC 5652, RFC 5035; ETSI EN 319 122-1).
 */
export function readCms(bytes: Bytes): Result<ReadCms, Damage> {
	return attempt(() => {
		const outer = readDer(bytes);
		const [type, explicit] = children(outer, TAG.sequence, 'a ContentInfo');
		if (oidOf(type, 'a content type') !== OID.signedData) damaged(0, 'signed data');
		const [inner] = children(explicit, TAG.context0, 'signed data');
		const [version, digests, encapsulated, certificates, signers, more] = children(inner, TAG.sequence, 'SignedData');
		requireVersion1(version);
		const [digest, secondDigest] = children(digests, TAG.set, 'digest algorithms');
		if (secondDigest !== undefined) damaged(secondDigest.at, 'one digest algorithm');
		requireAlgorithm(digest, OID.sha256);
		const [contentType, content] = children(encapsulated, TAG.sequence, 'encapsulated content');
		if (oidOf(contentType, 'a content type') !== OID.data || content !== undefined) damaged(0, 'detached data');
		const found = children(certificates, TAG.context0, 'certificates').map(({ whole }) => whole);
		const [signer, secondSigner] = children(signers, TAG.set, 'signers');
		if (secondSigner !== undefined || more !== undefined) damaged(0, 'one signer');
		return { ...readSigner(signer, found), length: outer.whole.length };
	});
}

function readSigner(signer: Der | undefined, certificates: readonly Bytes[]): Omit<ReadCms, 'length'> {
	const [version, id, digest, attributes, algorithm, signature, more] = children(signer, TAG.sequence, 'a signer');
	requireVersion1(version);
	requireAlgorithm(digest, OID.sha256);
	requireAlgorithm(algorithm, OID.ecdsaWithSha256);
	if (more !== undefined) damaged(more.at, 'no unsigned attributes');
	const signed = readAttributes(attributes);
	if (oidOf(readDer(signed.contentType), 'a content type') !== OID.data) damaged(0, 'data as the signed content type');
	const messageDigest = expect(readDer(signed.messageDigest), TAG.octets, 'a message digest').content;
	const named = signingCertificate(signed.signingCertificate);
	const [issuer, serial] = children(id, TAG.sequence, 'issuer and serial number').map(({ whole }) => whole);
	const certificate = certificates.find((der) => sameBytes(sha256(der), named) && isIssuedAs(der, issuer, serial));
	const raw = expect(attributes, TAG.context0, 'signed attributes').whole;
	return {
		messageDigest: toHex(messageDigest),
		certificate,
		otherCertificates: certificates.filter((der) => der !== certificate),
		// Stored with the tag [0], signed as SET OF.
		signedBytes: concat(Uint8Array.of(TAG.set), raw.subarray(1)),
		signature: toBase64(rawSignature(expect(signature, TAG.octets, 'a signature').content)),
	};
}

type Attributes = { readonly contentType: Bytes; readonly messageDigest: Bytes; readonly signingCertificate: Bytes };

/** Exactly these three: two copies of one, or one that we do not know, could say two things to two readers. */
function readAttributes(set: Der | undefined): Attributes {
	const attributes = new Map<string, Bytes>();
	for (const attribute of children(set, TAG.context0, 'signed attributes')) {
		const [type, values] = children(attribute, TAG.sequence, 'an attribute');
		const [value, second] = children(values, TAG.set, 'the value of an attribute');
		const oid = oidOf(type, 'the type of an attribute');
		if (value === undefined || second !== undefined || attributes.has(oid)) return damaged(attribute.at, 'one value');
		attributes.set(oid, value.whole);
	}
	const [contentType, messageDigest, signingCertificate] = [
		attributes.get(OID.contentType),
		attributes.get(OID.messageDigest),
		attributes.get(OID.signingCertificateV2),
	];
	if (
		contentType === undefined ||
		messageDigest === undefined ||
		signingCertificate === undefined ||
		attributes.size !== 3
	) {
		return damaged(set?.at ?? 0, 'content type, message digest and signing-certificate-v2, and no other attribute');
	}
	return { contentType, messageDigest, signingCertificate };
}

/** SHA-256 of the certificate that the signer says is theirs (ESSCertIDv2 without an algorithm means SHA-256). */
function signingCertificate(attribute: Bytes): Bytes {
	const [list] = children(readDer(attribute), TAG.sequence, 'signing-certificate-v2');
	const [id] = children(list, TAG.sequence, 'certificate ids');
	const [hash] = children(id, TAG.sequence, 'a certificate id');
	return expect(hash, TAG.octets, 'a SHA-256 of the certificate').content;
}

/** Whether issuer and serial number of the certificate are the ones that the signer names. */
function isIssuedAs(certificate: Bytes, issuer: Bytes | undefined, serial: Bytes | undefined): boolean {
	const [tbs] = children(readDer(certificate), TAG.sequence, 'a certificate');
	const [, number, , name] = children(tbs, TAG.sequence, 'a certificate').map(({ whole }) => whole);
	if (issuer === undefined || serial === undefined || number === undefined || name === undefined) return false;
	return sameBytes(issuer, name) && sameBytes(serial, number);
}

/** SEQUENCE of two INTEGERs to 64 bytes (RFC 3279 to RFC 7518). */
function rawSignature(der: Bytes): Bytes {
	const sequence = readDer(der);
	const integers = children(sequence, TAG.sequence, 'r and s');
	if (sequence.whole.length !== der.length || integers.length !== 2) return damaged(0, 'r and s');
	return concat(...integers.map((integer) => expect(integer, TAG.integer, 'a number').content).map(to32));
}

function to32(integer: Bytes): Bytes {
	const first = integer[0] ?? 0;
	const padded = first === 0 && integer.length > 1;
	if (first >= 0x80 || (padded && (integer[1] ?? 0) < 0x80))
		return damaged(0, 'a positive number in its shortest form');
	const digits = padded ? integer.subarray(1) : integer;
	return digits.length > 32
		? damaged(0, 'a number of at most 32 bytes')
		: concat(new Uint8Array(32 - digits.length), digits);
}

function requireVersion1(version: Der | undefined): void {
	const { content } = expect(version, TAG.integer, 'a version');
	if (content.length !== 1 || content[0] !== 1) damaged(version?.at ?? 0, 'version 1');
}

function requireAlgorithm(algorithm: Der | undefined, oid: string): void {
	const [name, parameters] = children(algorithm, TAG.sequence, 'an algorithm');
	const plain = parameters === undefined || sameBytes(parameters.whole, NULL);
	if (oidOf(name, 'an algorithm') !== oid || !plain) damaged(algorithm?.at ?? 0, `the algorithm ${oid}`);
}

const NULL = Uint8Array.of(0x05, 0x00);

// RFC 5652, RFC 5754, RFC 5758, RFC 5035.
const OID = {
	data: '1.2.840.113549.1.7.1',
	signedData: '1.2.840.113549.1.7.2',
	contentType: '1.2.840.113549.1.9.3',
	messageDigest: '1.2.840.113549.1.9.4',
	signingCertificateV2: '1.2.840.113549.1.9.16.2.47',
	sha256: '2.16.840.1.101.3.4.2.1',
	ecdsaWithSha256: '1.2.840.10045.4.3.2',
} as const;
