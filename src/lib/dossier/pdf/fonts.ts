import { PDFHexString, PDFName, PDFNumber, PDFRawStream, type PDFContext, type PDFRef } from 'pdf-lib';
import { fromBase64, utf8 } from '../../base';
import type { Face } from '../fonts/face';

/**
 * Embeds a face as it stands, all of its letters: a name signed years later finds its glyphs here. Glyph codes are two
 * bytes, the glyph's own number (Identity-H; ISO 32000-1, 9.7.4 and 9.7.5).
 */
export function embedFace(context: PDFContext, { data, letters }: Face): PDFRef {
	const name = `${SUBSET}+${data.name}`;
	const program = fromBase64(data.deflated);
	if (program === undefined) throw new TypeError(`${data.name} is not base64`);
	const file = PDFRawStream.of(context.obj({ Filter: 'FlateDecode', Length1: data.bytes }), program);
	const descriptor = context.obj({
		Type: 'FontDescriptor',
		FontName: name,
		Flags: NONSYMBOLIC,
		FontBBox: [...data.box],
		ItalicAngle: 0,
		Ascent: data.ascent,
		Descent: data.descent,
		CapHeight: data.capHeight,
		StemV: data.stem,
		FontFile2: context.register(file),
	});
	const byGlyph = new Map<number, { readonly code: number; readonly width: number }>();
	for (const [code, { id, width }] of letters) if (!byGlyph.has(id)) byGlyph.set(id, { code, width });
	const glyphs = [...byGlyph].map(([id, glyph]) => ({ id, ...glyph })).sort((a, b) => a.id - b.id);
	const descendant = context.obj({
		Type: 'Font',
		Subtype: 'CIDFontType2',
		BaseFont: name,
		CIDSystemInfo: {
			Registry: PDFHexString.of('41646F6265'),
			Ordering: PDFHexString.of('4964656E74697479'),
			Supplement: 0,
		},
		FontDescriptor: context.register(descriptor),
		CIDToGIDMap: 'Identity',
		DW: 1000,
	});
	const widths = context.obj([]);
	for (const { id, width } of glyphs) {
		widths.push(PDFNumber.of(id));
		widths.push(context.obj([width]));
	}
	descendant.set(PDFName.of('W'), widths);
	return context.register(
		context.obj({
			Type: 'Font',
			Subtype: 'Type0',
			BaseFont: name,
			Encoding: 'Identity-H',
			DescendantFonts: [context.register(descendant)],
			ToUnicode: context.register(context.flateStream(utf8(toUnicode(glyphs)))),
		}),
	);
}

/** What each glyph says, for copying and searching (ISO 32000-1, 9.10.3). */
function toUnicode(glyphs: readonly { readonly id: number; readonly code: number }[]): string {
	const hex = (value: number) => value.toString(16).toUpperCase().padStart(4, '0');
	const lines = glyphs.map(({ id, code }) => `<${hex(id)}> <${hex(code)}>`);
	const blocks = Array.from({ length: Math.ceil(lines.length / 100) }, (_, i) => lines.slice(i * 100, (i + 1) * 100));
	return [
		'/CIDInit /ProcSet findresource begin',
		'12 dict begin',
		'begincmap',
		'/CIDSystemInfo << /Registry (Adobe) /Ordering (UCS) /Supplement 0 >> def',
		'/CMapName /Adobe-Identity-UCS def',
		'/CMapType 2 def',
		'1 begincodespacerange <0000> <FFFF> endcodespacerange',
		...blocks.map((block) => `${block.length} beginbfchar\n${block.join('\n')}\nendbfchar`),
		'endcmap',
		'CMapName currentdict /CMap defineresource pop',
		'end end',
	].join('\n');
}

/** Six letters before the name say that the font is a part of a larger one; always the same part. */
const SUBSET = 'GATEHD';
/** ISO 32000-1, table 123. */
const NONSYMBOLIC = 32;
