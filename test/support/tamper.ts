import { PDFArray, PDFDict, PDFDocument, PDFName, PDFRef } from 'pdf-lib';
import { concat, utf8 } from '../../src/lib/base';

type Bytes = Uint8Array<ArrayBuffer>;

/** The hand of somebody who knows PDF: adds an update to a file that changes these objects, signed by nobody. */
export function appendUnsigned(
	file: Bytes,
	objects: readonly { readonly number: number; readonly body: string }[],
): Bytes {
	const text = latin1(file);
	const previous = /startxref\s+(\d+)\s+%%EOF\s*$/.exec(text)![1]!;
	const trailer = text.slice(text.lastIndexOf('trailer'));
	const kept = trailer.match(/\/(?:Root|Info) \d+ 0 R|\/ID ?\[[^\]]*\]/g)!.join(' ');
	const before = Number(/\/Size (\d+)/.exec(trailer)![1]);
	const size = Math.max(before, ...objects.map(({ number }) => number + 1));
	let added = '';
	const entries = objects.map(({ number, body }) => {
		const at = file.length + added.length;
		added += `${number} 0 obj\n${body}\nendobj\n`;
		return `${number} 1\n${String(at).padStart(10, '0')} 00000 n \n`;
	});
	const xref = file.length + added.length;
	added += `xref\n${entries.join('')}trailer\n<< /Size ${size} ${kept} /Prev ${previous} >>\nstartxref\n${xref}\n%%EOF\n`;
	return concat(file, utf8(added));
}

/** Where things lie in a file, so that a test can reach for them. */
export async function findObjects(file: Bytes) {
	const pdf = await PDFDocument.load(file, { updateMetadata: false });
	const page = pdf.getPage(0);
	const contents = page.node.get(PDFName.of('Contents'));
	const content = contents instanceof PDFArray ? contents.get(0) : contents;
	const names = pdf.catalog.lookup(PDFName.of('Names'), PDFDict).lookup(PDFName.of('EmbeddedFiles'), PDFDict);
	const specification = names.lookup(PDFName.of('Names'), PDFArray).lookup(1, PDFDict);
	const embedded = specification.lookup(PDFName.of('EF'), PDFDict).get(PDFName.of('F'));
	const fields = pdf.catalog.lookup(PDFName.of('AcroForm'), PDFDict).lookup(PDFName.of('Fields'), PDFArray);
	const [field] = fields.asArray().map((ref) => pdf.context.lookup(ref, PDFDict));
	const appearance = field!.lookup(PDFName.of('AP'), PDFDict).get(PDFName.of('N'));
	const number = (object: unknown): number => (object instanceof PDFRef ? object.objectNumber : NaN);
	const bodyOf = (object: number): string => String(pdf.context.lookup(PDFRef.of(object)));
	return {
		page: number(page.ref),
		content: number(content),
		attachment: number(embedded),
		appearance: number(appearance),
		free: pdf.context.largestObjectNumber + 1,
		bodyOf,
	};
}

export function flip(file: Bytes, at: number): Bytes {
	const flipped = file.slice();
	flipped[at] = (flipped[at] ?? 0) ^ 1;
	return flipped;
}

/** One character per byte. */
export const latin1 = (bytes: Uint8Array): string => Buffer.from(bytes).toString('latin1');

export const stream = (content: string, entries = ''): string =>
	`<< /Length ${content.length} ${entries} >>\nstream\n${content}\nendstream`;
