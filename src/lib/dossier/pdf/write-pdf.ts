import { PDFDocument, PDFName, type PDFPage, type PDFRef } from 'pdf-lib';
import { ok, utf8, type Result } from '../../base';
import type { Progress } from '../input';
import { FACES } from '../fonts/faces';
import { INKS } from '../fonts/inks';
import type { PictureBox, Sheet } from '../layout/sheet';
import { PAPER } from '../layout/sheet';
import type { NoGlyph } from '../sign/ink';
import { addSignatureFields } from '../sign/signature-fields';
import { attach, type Attachment } from './attach';
import { contentOf, number } from './content';
import { embedFace } from './fonts';
import { describe, pdfDate, type Metadata } from './metadata';

export type Document = {
	readonly sheets: readonly Sheet[];
	readonly attachments: readonly Attachment[];
	readonly metadata: Metadata;
	/** "Not signed", in the language of the dossier. */
	readonly unsigned: string;
	readonly progress: Progress;
};

/**
 * The base revision: one file of classic cross-references, the same bytes wherever it is written. Low-level objects only,
 * since the library's comforts would bring today's date and other fonts in.
 */
export async function writePdf(document: Document): Promise<Result<Uint8Array<ArrayBuffer>, NoGlyph>> {
	const pdf = await PDFDocument.create({ updateMetadata: false });
	const { context } = pdf;
	const fonts: { [resource: string]: PDFRef } = {};
	for (const [name, face] of Object.entries(FACES)) fonts[name] = embedFace(context, face);
	const taken = new Map<string, PDFRef>();
	/** Once, however often it is drawn; the bytes as they came. */
	const imageOf = ({ hash, bytes, width, height, colours }: PictureBox): PDFRef => {
		const held = taken.get(hash);
		if (held !== undefined) return held;
		const ref = context.register(
			context.stream(bytes, {
				Type: 'XObject',
				Subtype: 'Image',
				Width: width,
				Height: height,
				ColorSpace: colours,
				BitsPerComponent: 8,
				Filter: 'DCTDecode',
			}),
		);
		taken.set(hash, ref);
		return ref;
	};
	const pages: { readonly page: PDFPage; readonly sheet: Sheet }[] = [];
	for (const [done, sheet] of document.sheets.entries()) {
		document.progress('sheet', done, document.sheets.length);
		const content = contentOf(sheet.shapes, PAPER.height);
		if (!content.ok) return content;
		const page = pdf.addPage([PAPER.width, PAPER.height]);
		const drawn = sheet.pictures.map((picture) => ({ ...picture, name: `P${picture.hash.slice(0, 16)}` }));
		const images = Object.fromEntries(drawn.map((picture) => [picture.name, imageOf(picture)]));
		page.node.set(
			PDFName.of('Resources'),
			context.obj(drawn.length === 0 ? { Font: fonts } : { Font: fonts, XObject: images }),
		);
		const written = [...drawn.map(placePicture), content.value].join('\n');
		page.node.set(PDFName.of('Contents'), context.register(context.flateStream(utf8(written))));
		pages.push({ page, sheet });
	}
	const fields = pages.flatMap(({ page, sheet }) =>
		sheet.fields.map(({ name, title, box }) => ({
			name,
			title,
			page,
			box: { x: box.x, y: PAPER.height - box.y - box.height, width: box.width, height: box.height },
		})),
	);
	const added = addSignatureFields(pdf, { fields, words: document.unsigned, inks: INKS, fonts });
	if (!added.ok) return added;
	attach(pdf, document.attachments, { date: pdfDate(document.metadata.date), progress: document.progress });
	describe(pdf, document.metadata);
	const bytes = await pdf.save({
		useObjectStreams: false,
		updateFieldAppearances: false,
		addDefaultPage: false,
		objectsPerTick: Infinity,
	});
	return ok(new Uint8Array(bytes));
}

/** An image fills the unit square, turned over like everything else. */
const placePicture = ({ name, box }: { readonly name: string; readonly box: PictureBox['box'] }): string =>
	`q ${[box.width, 0, 0, box.height, box.x, PAPER.height - box.y - box.height].map(number).join(' ')} cm /${name} Do Q`;
