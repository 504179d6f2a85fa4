import {
	type PDFDict,
	PDFHexString,
	PDFName,
	PDFNumber,
	PDFString,
	type PDFDocument,
	type PDFPage,
	type PDFRef,
} from 'pdf-lib';
import { ok, type Result } from '../../base';
import { unsignedAppearance } from './appearance';
import type { Inks, NoGlyph } from './ink';

/** The place of one signature that the dossier asks for. */
export type SignatureField = {
	/** `sig_performed`, `sig_reviewed`, `sig_accepted`: letters and underscores; readers refuse a period. */
	readonly name: string;
	/** Said by a screen reader: "Signature, performed". */
	readonly title: string;
	readonly page: PDFPage;
	readonly box: { readonly x: number; readonly y: number; readonly width: number; readonly height: number };
};

/**
 * Adds the empty signature fields to the base revision, in the order of signing. All of them and the lock of the last are
 * there from the start, so that a signature later changes one field and nothing else.
 *
 * @returns references of the fields, for the structure tree of a tagged file
 */
export function addSignatureFields(
	pdf: PDFDocument,
	how: {
		readonly fields: readonly SignatureField[];
		/** "Not signed" in the language of the dossier. */
		readonly words: string;
		readonly inks: Inks;
		/** The embedded fonts, by the names that the inks have. */
		readonly fonts: { readonly [resource: string]: PDFRef };
	},
): Result<readonly PDFRef[], NoGlyph> {
	const { context } = pdf;
	const refs: PDFRef[] = [];
	for (const [i, field] of how.fields.entries()) {
		if (!/^[A-Za-z_]+$/.test(field.name)) throw new TypeError(`no name for a field: ${field.name}`);
		const { x, y, width, height } = field.box;
		const drawn = unsignedAppearance(field.box, how.words, how.inks);
		if (!drawn.ok) return drawn;
		const appearance = context.stream(drawn.value, {
			Type: 'XObject',
			Subtype: 'Form',
			BBox: [0, 0, width, height],
			Resources: { Font: how.fonts },
		});
		const dict = context.obj({
			Type: 'Annot',
			Subtype: 'Widget',
			FT: 'Sig',
			T: PDFString.of(field.name),
			TU: PDFHexString.fromText(field.title),
			F: PRINT,
			Rect: [x, y, x + width, y + height],
			P: field.page.ref,
			AP: { N: context.register(appearance) },
		});
		if (i === how.fields.length - 1) dict.set(PDFName.of('Lock'), context.register(lock(pdf)));
		const ref = context.register(dict);
		// addAnnot would rewrite the page's content; the array alone is what is needed.
		const annotations = field.page.node.Annots();
		if (annotations === undefined) field.page.node.set(PDFName.of('Annots'), context.obj([ref]));
		else annotations.push(ref);
		refs.push(ref);
	}
	const form = context.obj({ Fields: refs, SigFlags: SIGNATURES_EXIST + APPEND_ONLY });
	pdf.catalog.set(PDFName.of('AcroForm'), context.register(form));
	return ok(refs);
}

/** ISO 32000-1, table 233: after this signature no field may change; /P 1 (ISO 32000-2): nor anything else. */
const lock = ({ context }: PDFDocument): PDFDict => context.obj({ Type: 'SigFieldLock', Action: 'All', P: 1 });

// ISO 32000-1, tables 165 and 219.
const PRINT = PDFNumber.of(4);
const SIGNATURES_EXIST = 1;
const APPEND_ONLY = 2;
