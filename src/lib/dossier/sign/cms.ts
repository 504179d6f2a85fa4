import {
	Attribute,
	CertificateChoices,
	CertificateSet,
	CMSVersion,
	ContentInfo,
	DigestAlgorithmIdentifier,
	DigestAlgorithmIdentifiers,
	EncapsulatedContentInfo,
	id_signedData,
	IssuerAndSerialNumber,
	SignatureAlgorithmIdentifier,
	SignedData,
	SignerIdentifier,
	SignerInfo,
	SignerInfos,
} from '@peculiar/asn1-cms';
import {
	AsnArray,
	AsnConvert,
	AsnObjectIdentifierConverter,
	AsnProp,
	AsnType,
	AsnTypeTypes,
	OctetString,
} from '@peculiar/asn1-schema';
import { Certificate } from '@peculiar/asn1-x509';
import { fromBase64, sameBytes, sha256 } from '../../base';

type Bytes = Uint8Array<ArrayBuffer>;

/**
 * A detached CAdES signature (ETSI EN 319 122-1, baseline B-B; RFC 5652) over a SHA-256 digest, as DER.
 * Signed beside the digest: the content type and which certificate signed (RFC 5035). No signing time: in a PDF it stands
 * in /M of the signature dictionary, and may stand in one place only (ETSI EN 319 142-1).
 */
export async function signCms(of: {
	readonly digest: Bytes;
	/** DER; the signer's certificate first. */
	readonly chain: readonly Bytes[];
	/** ES256 over these bytes: r and s, 32 bytes each, as base64. */
	readonly sign: (bytes: Bytes) => Promise<string>;
}): Promise<Bytes> {
	const [signer] = of.chain;
	if (signer === undefined) throw new TypeError('no certificate of the signer');
	const certificate = parseCertificate(signer);
	const attributes = inDerOrder([
		new Attribute({ attrType: CONTENT_TYPE, attrValues: [AsnObjectIdentifierConverter.toASN(DATA).toBER()] }),
		new Attribute({ attrType: MESSAGE_DIGEST, attrValues: [AsnConvert.serialize(new OctetString(of.digest))] }),
		new Attribute({ attrType: SIGNING_CERTIFICATE_V2, attrValues: [AsnConvert.serialize(signingCertificate(signer))] }),
	]);
	// What is signed is the SET OF (0x31); what is stored is the same with the tag [0].
	const signature = await of.sign(new Uint8Array(AsnConvert.serialize(new AttributeSet(attributes))));
	const signerInfo = new SignerInfo({
		version: CMSVersion.v1,
		sid: new SignerIdentifier({
			issuerAndSerialNumber: new IssuerAndSerialNumber({
				issuer: certificate.tbsCertificate.issuer,
				serialNumber: certificate.tbsCertificate.serialNumber,
			}),
		}),
		digestAlgorithm: new DigestAlgorithmIdentifier({ algorithm: SHA_256 }),
		signedAttrs: attributes,
		signatureAlgorithm: new SignatureAlgorithmIdentifier({ algorithm: ECDSA_WITH_SHA_256 }),
		signature: new OctetString(ecdsaDer(signature)),
	});
	const choices = of.chain.map((der) => new CertificateChoices({ certificate: parseCertificate(der) }));
	const signedData = new SignedData({
		version: CMSVersion.v1,
		digestAlgorithms: new DigestAlgorithmIdentifiers([new DigestAlgorithmIdentifier({ algorithm: SHA_256 })]),
		encapContentInfo: new EncapsulatedContentInfo({ eContentType: DATA }),
		certificates: new CertificateSet(inDerOrder(choices)),
		signerInfos: new SignerInfos([signerInfo]),
	});
	const content = new ContentInfo({ contentType: id_signedData, content: AsnConvert.serialize(signedData) });
	return new Uint8Array(AsnConvert.serialize(content));
}

/** The members of a DER SET OF stand in the order of their encodings (X.690, 11.6). */
function inDerOrder<T>(items: readonly T[]): T[] {
	const encoded = items.map((item) => ({ item, der: new Uint8Array(AsnConvert.serialize(item)) }));
	return encoded.sort((a, b) => compare(a.der, b.der)).map(({ item }) => item);
}

function compare(a: Uint8Array, b: Uint8Array): number {
	const at = a.findIndex((byte, i) => byte !== b[i]);
	return at < 0 ? a.length - b.length : (a[at] ?? 0) - (b[at] ?? -1);
}

/** The signature covers the certificate as it was issued: what would come out with other bytes is not put in. */
function parseCertificate(der: Bytes): Certificate {
	const certificate = AsnConvert.parse(der, Certificate);
	if (!sameBytes(new Uint8Array(AsnConvert.serialize(certificate)), der))
		throw new TypeError('a certificate that is not DER');
	return certificate;
}

function signingCertificate(der: Bytes): SigningCertificateV2 {
	const id = new EssCertIdV2();
	// Without an algorithm it is SHA-256: DER leaves a default out.
	id.certHash = new OctetString(sha256(der));
	const attribute = new SigningCertificateV2();
	attribute.certs = [id];
	return attribute;
}

/** r and s as SEQUENCE of two INTEGERs (RFC 3279): no leading zeros but the one that keeps a number positive. */
function ecdsaDer(signature: string): Bytes {
	const raw = fromBase64(signature);
	if (raw?.length !== 64) throw new TypeError('an ES256 signature has 64 bytes');
	const integers = [raw.subarray(0, 32), raw.subarray(32)].flatMap((half) => {
		const first = half.findIndex((byte) => byte !== 0);
		const digits = first < 0 ? [0] : [...half.subarray(first)];
		const value = (digits[0] ?? 0) >= 0x80 ? [0, ...digits] : digits;
		return [0x02, value.length, ...value];
	});
	return Uint8Array.of(0x30, integers.length, ...integers);
}

class AttributeSet extends AsnArray<Attribute> {}
AsnType({ type: AsnTypeTypes.Set, itemType: Attribute })(AttributeSet);

/** RFC 5035, without what is optional. */
class EssCertIdV2 {
	certHash = new OctetString();
}
AsnType({ type: AsnTypeTypes.Sequence })(EssCertIdV2);
AsnProp({ type: OctetString })(EssCertIdV2.prototype, 'certHash');

class SigningCertificateV2 {
	certs: EssCertIdV2[] = [];
}
AsnType({ type: AsnTypeTypes.Sequence })(SigningCertificateV2);
AsnProp({ type: EssCertIdV2, repeated: 'sequence' })(SigningCertificateV2.prototype, 'certs');

// RFC 5652, RFC 5754, RFC 5758, RFC 5035.
const DATA = '1.2.840.113549.1.7.1';
const CONTENT_TYPE = '1.2.840.113549.1.9.3';
const MESSAGE_DIGEST = '1.2.840.113549.1.9.4';
const SIGNING_CERTIFICATE_V2 = '1.2.840.113549.1.9.16.2.47';
const SHA_256 = '2.16.840.1.101.3.4.2.1';
const ECDSA_WITH_SHA_256 = '1.2.840.10045.4.3.2';
