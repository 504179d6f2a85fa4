import { PDFHexString, PDFName, PDFString, type PDFDocument } from 'pdf-lib';
import { fromHex, toHex, utf8 } from '../../base';
import { srgbProfile } from './icc';

export type Metadata = {
	readonly title: string;
	readonly language: string;
	readonly writer: string;
	/** RFC 3339: the seal. */
	readonly date: string;
	/** SHA-256, in hexadecimal. */
	readonly digest: string;
};

/** What makes the file a PDF/A-3b and names it: XMP and Info that agree, output intent, language, identifier. */
export function describe(pdf: PDFDocument, metadata: Metadata): void {
	const { context, catalog } = pdf;
	const { title, language, writer, date, digest } = metadata;
	const xmp = context.stream(utf8(xmpOf(metadata)), { Type: 'Metadata', Subtype: 'XML' });
	catalog.set(PDFName.of('Metadata'), context.register(xmp));
	const profile = context.register(context.flateStream(srgbProfile(), { N: 3 }));
	const condition = PDFString.of('sRGB IEC61966-2.1');
	const intent = context.obj({
		Type: 'OutputIntent',
		S: 'GTS_PDFA1',
		OutputConditionIdentifier: condition,
		Info: condition,
		DestOutputProfile: profile,
	});
	catalog.set(PDFName.of('OutputIntents'), context.obj([context.register(intent)]));
	catalog.set(PDFName.of('Lang'), PDFString.of(language));
	catalog.set(PDFName.of('ViewerPreferences'), context.obj({ DisplayDocTitle: true }));
	context.trailerInfo.Info = context.register(
		context.obj({
			Title: PDFHexString.fromText(title),
			Producer: PDFHexString.fromText(writer),
			CreationDate: PDFString.of(pdfDate(date)),
		}),
	);
	const id = PDFHexString.of(toHex(fromHex(digest)?.subarray(0, 16) ?? new Uint8Array(16)));
	context.trailerInfo.ID = context.obj([id, id]);
}

/** An instant in the form of ISO 32000-1, 7.9.4: D:20260514194400+02'00'. */
export function pdfDate(instant: string): string {
	const found = /^(\d{4})-(\d\d)-(\d\d)T(\d\d):(\d\d)(?::(\d\d))?(?:\.\d+)?(Z|([+-]\d\d):(\d\d))$/.exec(instant);
	if (found === null) throw new TypeError(`no moment: ${instant}`);
	const [, year, month, day, hour, minute, second = '00', zone, hours, minutes] = found;
	const offset = zone === 'Z' ? "+00'00'" : `${hours ?? ''}'${minutes ?? ''}'`;
	return `D:${year ?? ''}${month ?? ''}${day ?? ''}${hour ?? ''}${minute ?? ''}${second}${offset}`;
}

/** XMP (ISO 16684-1) with the identification of PDF/A (ISO 19005-3, 6.6.4). */
function xmpOf({ title, language, writer, date }: Metadata): string {
	const when = /T\d\d:\d\d(?::\d\d)/.test(date) ? date.replace(/\.\d+/, '') : date.replace(/(T\d\d:\d\d)/, '$1:00');
	return `<?xpacket begin="\ufeff" id="W5M0MpCehiHzreSzNTczkc9d"?>
<x:xmpmeta xmlns:x="adobe:ns:meta/">
<rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#">
<rdf:Description rdf:about="" xmlns:dc="http://purl.org/dc/elements/1.1/" xmlns:pdf="http://ns.adobe.com/pdf/1.3/" xmlns:pdfaid="http://www.aiim.org/pdfa/ns/id/" xmlns:xmp="http://ns.adobe.com/xap/1.0/">
<pdfaid:part>3</pdfaid:part>
<pdfaid:conformance>B</pdfaid:conformance>
<dc:title><rdf:Alt><rdf:li xml:lang="x-default">${escaped(title)}</rdf:li></rdf:Alt></dc:title>
<dc:language><rdf:Bag><rdf:li>${escaped(language)}</rdf:li></rdf:Bag></dc:language>
<pdf:Producer>${escaped(writer)}</pdf:Producer>
<xmp:CreateDate>${when}</xmp:CreateDate>
</rdf:Description>
</rdf:RDF>
</x:xmpmeta>
<?xpacket end="r"?>`;
}

const escaped = (text: string): string => text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
