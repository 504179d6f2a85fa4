import { PDFArray, PDFDict, PDFDocument, PDFName, PDFRef, PDFString, PDFHexString } from 'pdf-lib';
import { fail, ok, type Result } from '../../base';

type Bytes = Uint8Array<ArrayBuffer>;

/** What signing needs to know of the file it adds to. */
export type SignableFile = {
	readonly pdf: PDFDocument;
	readonly field: { readonly ref: PDFRef; readonly dict: PDFDict };
	/** Dictionary of the appearance that the field shows until now. */
	readonly appearance: PDFDict;
	readonly previousXref: number;
	/** The first object number that is free. */
	readonly size: number;
};

export type UnsignableFile =
	| { readonly kind: 'not-our-file'; readonly because: string }
	| { readonly kind: 'no-such-field'; readonly field: string; readonly fields: readonly string[] }
	| { readonly kind: 'already-signed'; readonly field: string };

/** Reads a dossier that waits for a signature. Whether it is a good dossier is for verify to say: here it is only added to. */
export async function readSignableFile(bytes: Bytes, field: string): Promise<Result<SignableFile, UnsignableFile>> {
	const notOurs = (because: string) => fail({ kind: 'not-our-file', because } as const);
	const tail = new TextDecoder('latin1').decode(bytes.subarray(-64));
	const previousXref = Number(/startxref\s+(\d+)\s+%%EOF\s*$/.exec(tail)?.[1]);
	if (Number.isNaN(previousXref)) return notOurs('it does not end in startxref and %%EOF');
	if (new TextDecoder('latin1').decode(bytes.subarray(previousXref, previousXref + 4)) !== 'xref') {
		return notOurs('it has no classic cross-reference table');
	}
	let pdf: PDFDocument;
	try {
		pdf = await PDFDocument.load(bytes, { updateMetadata: false, throwOnInvalidObject: true });
	} catch (error) {
		return notOurs(error instanceof Error ? error.message : String(error));
	}
	const fields = pdf.catalog.lookupMaybe(PDFName.of('AcroForm'), PDFDict)?.lookupMaybe(PDFName.of('Fields'), PDFArray);
	const refs = fields?.asArray().filter((item) => item instanceof PDFRef) ?? [];
	const named = refs.map((ref) => ({ ref, dict: pdf.context.lookup(ref, PDFDict) }));
	const found = named.find(({ dict }) => nameOf(dict) === field);
	if (found === undefined) return fail({ kind: 'no-such-field', field, fields: named.map(({ dict }) => nameOf(dict)) });
	if (found.dict.has(PDFName.of('V'))) return fail({ kind: 'already-signed', field });
	const appearance = pdf.context.lookup(found.dict.lookupMaybe(PDFName.of('AP'), PDFDict)?.get(PDFName.of('N')));
	const dict = appearance !== undefined && 'dict' in appearance ? appearance.dict : undefined;
	if (!(dict instanceof PDFDict)) return notOurs(`the field ${field} has no appearance`);
	return ok({ pdf, field: found, appearance: dict, previousXref, size: pdf.context.largestObjectNumber + 1 });
}

const nameOf = (field: PDFDict): string =>
	field.lookupMaybe(PDFName.of('T'), PDFString, PDFHexString)?.decodeText() ?? '';
