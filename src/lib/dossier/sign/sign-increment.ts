import { PDFArray, type PDFDict, PDFHexString, PDFName, PDFNumber, PDFRef, type PDFObject } from 'pdf-lib';
import { concat, fail, ok, sha256, toHex, utf8, type Result } from '../../base';
import { readCertificate, type CertificateError } from '../../identity';
import { signedAppearance, type Shown } from './appearance';
import { readSignableFile, type SignableFile, type UnsignableFile } from './base-file';
import { signCms } from './cms';
import { appendUpdate } from './increment';
import type { Inks, NoGlyph } from './ink';

type Bytes = Uint8Array<ArrayBuffer>;

export type ClosingSignature = {
	readonly field: string;
	/** The signer's role and the meaning of the signature, in the language of the dossier: "shift supervisor", "reviewed". */
	readonly role: string;
	readonly meaning: string;
	/** RFC 3339 with its offset: the signer's clock. */
	readonly at: string;
	/** Readable code of the digest of what the signer was shown. */
	readonly code: string;
	/** The pen, if a hand was drawn. */
	readonly drawn?: Shown['drawn'];
	readonly labels?: Labels;
	readonly inks: Inks;
	/** DER; the signer's certificate first, the root last. The printed name is the one in the certificate. */
	readonly chain: readonly Bytes[];
	/** ES256 with the key of the first certificate: r and s as base64. */
	readonly sign: (bytes: Bytes) => Promise<string>;
};

export type Labels = { readonly [line in 'role' | 'meaning' | 'time' | 'certificate' | 'code']: string };

export type SignError =
	| UnsignableFile
	| NoGlyph
	| CertificateError
	| { readonly kind: 'not-a-person'; readonly subject: string }
	| { readonly kind: 'signature-too-long'; readonly bytes: number; readonly room: number };

/**
 * Signs the whole file as it is, by one incremental update: the signature dictionary, what its field shows, and the field
 * itself, which now points to both. PAdES B-B (ETSI EN 319 142-1): ETSI.CAdES.detached over every byte but the hexadecimal
 * string of /Contents. Two signings of the same file differ by the chance inside ECDSA alone.
 */
export async function signIncrement(pdf: Bytes, signature: ClosingSignature): Promise<Result<Bytes, SignError>> {
	const file = await readSignableFile(pdf, signature.field);
	if (!file.ok) return file;
	const { field, appearance, size, previousXref } = file.value;
	const [, , width = 0, height = 0] = appearance.lookup(PDFName.of('BBox'), PDFArray).asArray().map(numberOf);
	const signer = signerOf(signature.chain);
	if (!signer.ok) return signer;
	const drawn = signedAppearance({ width, height }, shown(signature, signer.value), signature.inks);
	if (!drawn.ok) return drawn;
	const [signatureNumber, appearanceNumber] = [size, size + 1];
	const dictionary = signatureDictionary(file.value, signer.value.name, signature);
	const { bytes, bodyAt } = appendUpdate({
		before: pdf,
		previousXref,
		objects: [
			{ number: field.ref.objectNumber, body: signedField(field.dict, signatureNumber, appearanceNumber) },
			{ number: signatureNumber, body: utf8(dictionary.text) },
			{ number: appearanceNumber, body: appearanceStream(appearance, drawn.value) },
		],
		trailer: trailerOf(file.value, { size: size + 2, before: pdf }),
	});
	const start = bodyAt.get(signatureNumber) ?? 0;
	const gap = { from: start + dictionary.contentsAt, to: start + dictionary.contentsAt + CONTENTS_LENGTH };
	bytes.set(utf8(byteRange(gap, bytes.length)), start + dictionary.byteRangeAt);
	const digest = sha256(concat(bytes.subarray(0, gap.from), bytes.subarray(gap.to)));
	const cms = await signCms({ digest, chain: signature.chain, sign: signature.sign });
	if (cms.length > ROOM) return fail({ kind: 'signature-too-long', bytes: cms.length, room: ROOM });
	bytes.set(utf8(toHex(cms)), gap.from + 1);
	return ok(bytes);
}

type Signer = { readonly name: string; readonly serial: string; readonly notAfter: string };

function signerOf([der]: readonly Bytes[]): Result<Signer, SignError> {
	const certificate = readCertificate(der ?? new Uint8Array());
	if (!certificate.ok) return certificate;
	const { subject, serial, notAfter } = certificate.value;
	if (subject.kind !== 'person') return fail({ kind: 'not-a-person', subject: subject.kind });
	return ok({ name: subject.printedName, serial, notAfter });
}

function shown(signature: ClosingSignature, { name, serial, notAfter }: Signer): Shown {
	const labels = signature.labels ?? ENGLISH;
	const lines = [
		{ label: labels.role, value: signature.role },
		{ label: labels.meaning, value: signature.meaning },
		{ label: labels.time, value: signature.at.replace('T', ' ').replace(/(Z|[+-]\d\d:\d\d)$/, ' $1') },
		{ label: labels.certificate, value: `${serial.slice(0, 8).toUpperCase()}, ${notAfter.slice(0, 10)}` },
		{ label: labels.code, value: signature.code },
	];
	return { name, lines, ...(signature.drawn === undefined ? {} : { drawn: signature.drawn }) };
}

const ENGLISH: Labels = {
	role: 'Role',
	meaning: 'Meaning',
	time: 'Time by the clock of the signer',
	certificate: 'Certificate, valid to',
	code: 'Digest of what was shown',
};

/** Bytes kept free for the signature: one with three certificates takes some 2 000. */
const ROOM = 4096;
const CONTENTS_LENGTH = 2 * ROOM + 2;

/** Numbers of ten digits at most, padded with blanks: the file keeps its length when they become known. */
const byteRange = (gap: { readonly from: number; readonly to: number }, length: number): string =>
	`[0 ${[gap.from, gap.to, length - gap.to].map((part) => String(part).padEnd(10)).join(' ')}]`;

/** The dictionary as text with room for what is known last, and where inside it that room lies. */
function signatureDictionary(
	{ pdf, field }: SignableFile,
	name: string,
	{ meaning, role, at }: ClosingSignature,
): { readonly text: string; readonly byteRangeAt: number; readonly contentsAt: number } {
	const locks = field.dict.has(PDFName.of('Lock'));
	const reference = locks
		? ` /Reference [<< /Type /SigRef /TransformMethod /FieldMDP /Data ${String(pdf.context.trailerInfo.Root)}` +
			` /TransformParams << /Type /TransformParams /V /1.2 /Action /All >> >>]`
		: '';
	const head =
		'<< /Type /Sig /Filter /Adobe.PPKLite /SubFilter /ETSI.CAdES.detached' +
		` /Name ${textString(name)} /Reason ${textString(`${meaning}, ${role}`)} /M (${pdfDate(at)})${reference} /ByteRange `;
	const range = byteRange({ from: 0, to: 0 }, 0);
	const contents = `<${'0'.repeat(2 * ROOM)}>`;
	const middle = ' /Contents ';
	return {
		text: `${head}${range}${middle}${contents} >>`,
		byteRangeAt: head.length,
		contentsAt: head.length + range.length + middle.length,
	};
}

/** The field as it was, with its value and its new appearance. */
function signedField(field: PDFDict, signature: number, appearance: number): Bytes {
	const signed = field.clone();
	signed.set(PDFName.of('V'), PDFRef.of(signature));
	signed.set(PDFName.of('AP'), field.context.obj({ N: PDFRef.of(appearance) }));
	return serialise(signed);
}

/** Same box and same fonts as the appearance that it replaces. */
function appearanceStream(before: PDFDict, content: string): Bytes {
	const dict = before.clone();
	dict.delete(PDFName.of('Filter'));
	dict.set(PDFName.of('Length'), PDFNumber.of(utf8(content).length));
	return concat(serialise(dict), utf8(`\nstream\n${content}\nendstream`));
}

/** Same root, same first half of /ID; the second half names the state of the file that was signed. */
function trailerOf({ pdf }: SignableFile, now: { readonly size: number; readonly before: Bytes }): string {
	const { Root, Info, ID } = pdf.context.trailerInfo;
	const first = ID instanceof PDFArray ? ID.get(0) : undefined;
	const id = first === undefined ? '' : ` /ID [${String(first)} <${toHex(sha256(now.before).subarray(0, 16))}>]`;
	return `/Size ${now.size} /Root ${String(Root)}${Info === undefined ? '' : ` /Info ${String(Info)}`}${id}`;
}

function serialise(object: PDFObject): Bytes {
	const bytes = new Uint8Array(object.sizeInBytes());
	object.copyBytesInto(bytes, 0);
	return bytes;
}

const numberOf = (object: PDFObject): number => (object instanceof PDFNumber ? object.asNumber() : 0);

/** UTF-16BE in hexadecimal: no character needs escaping. */
const textString = (text: string): string => String(PDFHexString.fromText(text));

/** ISO 32000-1, 7.9.4, in UTC. */
const pdfDate = (at: string): string => `D:${new Date(at).toISOString().replace(/\D/g, '').slice(0, 14)}+00'00'`;
