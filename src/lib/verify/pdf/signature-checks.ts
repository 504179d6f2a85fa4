import { concat, fromHex, sha256Hex } from '../../base';
import { checkSignature, readCertificate, type Certificate } from '../../identity';
import { failed, passed, undecided, type Check } from './check';
import { readCms, type ReadCms } from './cms';
import type { PdfFile } from './pdf-file';
import type { SignatureDictionary } from './signature-field';

/** Which bytes were signed: all of the file as it was then, and only the signature itself left out. */
export function checkCoverage(file: PdfFile, revision: number, field: string, signature: SignatureDictionary): Check {
	const name = 'covers the whole file as it was signed';
	const { contents, byteRange } = signature;
	const to = file.revisions[revision]?.to ?? 0;
	const sub = 'FORMAT_FAILURE';
	if (contents?.type !== 'string' || file.text[contents.from] !== '<') {
		return failed(name, 'The signature is not a hexadecimal string in its place.', { field, sub });
	}
	const expected = [0, contents.from, contents.to, to - contents.to];
	const facts = { signed: byteRange.join(' '), expected: expected.join(' ') };
	if (byteRange.length === 4 && byteRange.every((part, i) => part === expected[i])) {
		return passed(name, `It covers ${to} bytes and leaves out its own ${contents.to - contents.from}.`, {
			field,
			facts,
		});
	}
	return failed(name, `It says that it covers [${facts.signed}]; that would be [${facts.expected}].`, {
		field,
		facts,
		sub,
	});
}

/** The DER at the beginning of /Contents, and whether nothing but zeros fills the rest. */
export function readContents(
	file: PdfFile,
	field: string,
	{ contents }: SignatureDictionary,
): { readonly checks: readonly Check[]; readonly cms: ReadCms | undefined } {
	const digits = contents === undefined ? '' : file.text.slice(contents.from + 1, contents.to - 1);
	// One way to write it: in capitals it would be the same signature in another file.
	const bytes = /[A-F]/.test(digits) ? undefined : fromHex(digits);
	const cms = bytes === undefined ? undefined : readCms(bytes);
	if (bytes === undefined || cms?.ok !== true) {
		const why =
			cms?.ok === false
				? `${cms.error.expected} expected at its byte ${cms.error.at}`
				: 'it is not hexadecimal in small letters';
		const because = `The signature cannot be read: ${why}.`;
		return { checks: [failed('signature can be read', because, { field, sub: 'FORMAT_FAILURE' })], cms: undefined };
	}
	const { length } = cms.value;
	const readable = passed('signature can be read', `A CAdES signature of ${length} bytes.`, {
		field,
		facts: { length },
	});
	const hidden = bytes.subarray(length).findIndex((byte) => byte !== 0);
	const name = 'nothing is hidden behind the signature';
	const rest = bytes.length - length;
	const padding =
		hidden < 0
			? passed(name, `${rest} zero bytes fill the room that was kept.`, { field, facts: { rest } })
			: failed(name, `Byte ${length + hidden} of the room kept for it is not zero.`, { field, sub: 'FORMAT_FAILURE' });
	return { checks: [readable, padding], cms: cms.value };
}

export function checkDigest(file: PdfFile, field: string, signature: SignatureDictionary, cms: ReadCms): Check {
	const [first = 0, gapFrom = 0, gapTo = 0, rest = 0] = signature.byteRange;
	const digest = sha256Hex(
		concat(file.bytes.subarray(first, first + gapFrom), file.bytes.subarray(gapTo, gapTo + rest)),
	);
	const name = 'bytes are those that were signed';
	const facts = { signed: cms.messageDigest, found: digest };
	if (digest === cms.messageDigest) return passed(name, 'Their SHA-256 is the one that was signed.', { field, facts });
	return failed(name, 'Their SHA-256 is not the one that was signed.', { field, facts, sub: 'HASH_FAILURE' });
}

export async function checkKey(
	field: string,
	cms: ReadCms,
): Promise<{ readonly checks: readonly Check[]; readonly certificate: Certificate | undefined }> {
	const name = 'certificate of the signer is inside';
	const sub = 'NO_SIGNING_CERTIFICATE_FOUND';
	if (cms.certificate === undefined) {
		const because = 'No certificate inside is the one that signing-certificate-v2 names.';
		return { checks: [failed(name, because, { field, sub })], certificate: undefined };
	}
	const read = readCertificate(cms.certificate);
	if (!read.ok) {
		const because = `The certificate is not one that a site issues to a person: ${read.error.kind}.`;
		return { checks: [undecided(name, because, { field, sub })], certificate: undefined };
	}
	const { publicKey, fingerprint, serial } = read.value;
	const found = passed(name, `Serial number ${serial}.`, { field, facts: { fingerprint, serial } });
	const claim = { bytes: cms.signedBytes, alg: 'ES256', signature: cms.signature, publicKey };
	const valid = await checkSignature(claim);
	const signed = valid.ok
		? passed('key of the certificate made the signature', 'ES256 holds.', { field })
		: failed('key of the certificate made the signature', `It did not: ${valid.error.kind}.`, {
				field,
				sub: 'SIG_CRYPTO_FAILURE',
			});
	return { checks: [found, signed], certificate: read.value };
}
