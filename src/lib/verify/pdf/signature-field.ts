import { objectIn, resolve, type PdfFile } from './pdf-file';
import { get, itemsOf, nameOf, numberOf, refOf, textOf, type PdfDict, type PdfObject, type PdfValue } from './value';

/** A signature field as one state of the file shows it. */
export type SignatureField = {
	readonly name: string;
	readonly object: number;
	readonly dict: PdfDict;
	/** Object number of the signature dictionary; undefined while nobody has signed. */
	readonly value: number | undefined;
};

/** Every field of the form must be a plain, named signature field; a form that holds anything else is not ours. */
export function signatureFields(file: PdfFile, revision: number): readonly SignatureField[] | undefined {
	const root = resolve(file, get(file.revisions[revision]?.trailer, 'Root'), revision);
	const form = resolve(file, get(root, 'AcroForm'), revision);
	const fields = new Map<string, SignatureField>();
	for (const item of itemsOf(resolve(file, get(form, 'Fields'), revision))) {
		const object = objectIn(file, refOf(item), revision);
		const name = textOf(get(object?.value, 'T'));
		if (object?.value.type !== 'dict' || name === undefined || nameOf(get(object.value, 'FT')) !== 'Sig')
			return undefined;
		if (object.value.entries.has('Kids') || fields.has(name)) return undefined;
		fields.set(name, { name, object: object.number, dict: object.value, value: refOf(get(object.value, 'V')) });
	}
	return [...fields.values()];
}

/** The appearance stream that a field shows in a state. */
export const appearanceOf = (file: PdfFile, field: SignatureField, revision: number): PdfObject | undefined =>
	objectIn(file, refOf(get(resolve(file, get(field.dict, 'AP'), revision), 'N')), revision);

/** What a signature dictionary says (ISO 32000-1, table 252). */
export type SignatureDictionary = {
	readonly dict: PdfDict;
	readonly byteRange: readonly number[];
	/** Where the hexadecimal string of /Contents lies, with its angle brackets. */
	readonly contents: PdfValue | undefined;
	readonly name: string | undefined;
	readonly reason: string | undefined;
	/** The signer's clock as RFC 3339. */
	readonly claimed: string | undefined;
};

export function readSignatureDictionary(dict: PdfDict): SignatureDictionary {
	return {
		dict,
		byteRange: itemsOf(get(dict, 'ByteRange')).map((item) => numberOf(item) ?? NaN),
		contents: get(dict, 'Contents'),
		name: textOf(get(dict, 'Name')),
		reason: textOf(get(dict, 'Reason')),
		claimed: instantOf(textOf(get(dict, 'M')) ?? ''),
	};
}

/** ISO 32000-1, 7.9.4: D:20260514172140+00'00' */
function instantOf(text: string): string | undefined {
	const parts = /^D:(\d{4})(\d\d)(\d\d)(\d\d)(\d\d)(\d\d)(?:Z|([+-])(\d\d)'(\d\d)'?)$/.exec(text);
	if (parts === null) return undefined;
	const [, year, month, day, hour, minute, second, sign = '+', hours = '00', minutes = '00'] = parts;
	const instant = `${year}-${month}-${day}T${hour}:${minute}:${second}${sign}${hours}:${minutes}`;
	return Number.isNaN(Date.parse(instant)) ? undefined : instant;
}
