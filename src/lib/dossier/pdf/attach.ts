import { PDFDict, PDFHexString, PDFName, PDFString, type PDFArray, type PDFDocument } from 'pdf-lib';
import { toHex } from '../../base';
import type { Progress } from '../input';

/** A file that travels inside the dossier. */
export type Attachment = {
	/** ASCII letters, digits, points, hyphens. */
	readonly name: string;
	readonly mediaType: string;
	readonly description: string;
	/** How it relates to the pages (ISO 32000-2, table 43): they are made from it, or it stands behind them. */
	readonly relation: 'Source' | 'Data' | 'Supplement';
	readonly bytes: Uint8Array<ArrayBuffer>;
};

/** Puts files into the document as associated files (PDF/A-3: ISO 19005-3, 6.8), in the order of their names. */
export function attach(
	pdf: PDFDocument,
	attachments: readonly Attachment[],
	{ date, progress }: { readonly date: string; readonly progress: Progress },
): void {
	const { context, catalog } = pdf;
	const sorted = [...attachments].sort((a, b) => (a.name < b.name ? -1 : 1));
	const names: PDFArray = context.obj([]);
	const associated: PDFArray = context.obj([]);
	for (const [done, { name, mediaType, description, relation, bytes }] of sorted.entries()) {
		progress('file', done, sorted.length);
		if (!/^[A-Za-z0-9][A-Za-z0-9.-]*$/.test(name)) throw new TypeError(`no name for a file inside a PDF: ${name}`);
		const stream = context.flateStream(bytes, {
			Type: 'EmbeddedFile',
			Subtype: mediaType,
			Params: { Size: bytes.length, ModDate: PDFString.of(date) },
		});
		const file = context.register(stream);
		const entry = context.obj({
			Type: 'Filespec',
			F: PDFString.of(name),
			UF: PDFHexString.fromText(name),
			Desc: PDFHexString.fromText(description),
			AFRelationship: relation,
			EF: { F: file, UF: file },
		});
		const ref = context.register(entry);
		names.push(PDFHexString.of(toHex(new TextEncoder().encode(name))));
		names.push(ref);
		associated.push(ref);
	}
	const tree = catalog.lookupMaybe(PDFName.of('Names'), PDFDict) ?? context.obj({});
	tree.set(PDFName.of('EmbeddedFiles'), context.obj({ Names: names }));
	catalog.set(PDFName.of('Names'), tree);
	catalog.set(PDFName.of('AF'), associated);
}
