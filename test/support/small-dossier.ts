import { AFRelationship, PDFDocument, PDFHexString, PDFName, StandardFonts, type PDFFont } from 'pdf-lib';
import type { ClosingSignature, Ink } from '../../src/lib/dossier';
import { addSignatureFields, signIncrement } from '../../src/lib/dossier';
import { sign } from '../../src/lib/identity';
import { value, type TestSigner, type TestSite } from './test-site';

type Bytes = Uint8Array<ArrayBuffer>;

export const FIELDS = ['sig_performed', 'sig_reviewed', 'sig_accepted'] as const;

export const RECORD = new TextEncoder().encode('{"kind":"start-up opened","v":1}\n{"kind":"sealed","v":1}\n');

/** The smallest file that a dossier could be: two pages, a record as attachment, three open signature fields. */
export async function makeBase(): Promise<{ readonly bytes: Bytes; readonly ink: Ink }> {
	const pdf = await PDFDocument.create({ updateMetadata: false });
	const font = await pdf.embedFont(StandardFonts.Helvetica);
	const ink = inkOf(font);
	const first = pdf.addPage([595, 842]);
	first.drawText('Start-up 2100-14 (demonstration)', { x: 60, y: 760, size: 18, font });
	first.drawText('Fuel feed released by the commissioning lead', { x: 60, y: 730, size: 11, font });
	const page = pdf.addPage([595, 842]);
	page.drawText('Signatures', { x: 60, y: 760, size: 18, font });
	await pdf.attach(RECORD, 'record.ndjson', {
		mimeType: 'application/x-ndjson',
		description: 'The record as signed events',
		creationDate: new Date('2026-05-14T17:00:00Z'),
		modificationDate: new Date('2026-05-14T17:00:00Z'),
		afRelationship: AFRelationship.Source,
	});
	value(
		addSignatureFields(pdf, {
			words: 'Not signed',
			inks: { regular: ink, strong: ink },
			fonts: { Ink: font.ref },
			fields: FIELDS.map((name, i) => ({
				name,
				title: `Signature, ${name.slice(4)}`,
				page,
				box: { x: 60, y: 600 - i * 130, width: 484, height: 98 },
			})),
		}),
	);
	const id = PDFHexString.of('00112233445566778899aabbccddeeff');
	pdf.context.trailerInfo.ID = pdf.context.obj([id, id]);
	pdf.catalog.set(PDFName.of('Lang'), PDFHexString.fromText('en'));
	const bytes = await pdf.save({ useObjectStreams: false, updateFieldAppearances: false, addDefaultPage: false });
	return { bytes: new Uint8Array(bytes), ink };
}

/** Helvetica is not embedded, which a dossier's fonts are; for signing it is a font like any other. */
const inkOf = (font: PDFFont): Ink => ({
	resource: 'Ink',
	encode: (text) => {
		const missing = Array.from(text).find(
			(character) => !font.getCharacterSet().includes(character.codePointAt(0) ?? 0),
		);
		if (missing !== undefined) {
			return {
				ok: false,
				error: { codePoint: `U+${missing.codePointAt(0)!.toString(16).toUpperCase().padStart(4, '0')}` },
			};
		}
		const hex = font.encodeText(text).toString().slice(1, -1);
		return { ok: true, value: { hex, width: font.widthOfTextAtSize(text, 1000) } };
	},
});

export type Signers = { readonly [field in (typeof FIELDS)[number]]: TestSigner };

export async function makeSigners(site: TestSite): Promise<Signers> {
	return {
		sig_performed: await site.enrol({ person: 'P-01', printedName: 'Ada Example', roles: ['technician'] }),
		sig_reviewed: await site.enrol({
			person: 'P-02',
			printedName: 'Bo Example, jun.',
			roles: ['shift supervisor'],
			device: 'T-2',
		}),
		sig_accepted: await site.enrol({
			person: 'P-03',
			printedName: 'Cyra Example',
			roles: ['commissioning lead'],
			device: 'T-2',
		}),
	};
}

export function closing(
	site: TestSite,
	signer: TestSigner,
	field: (typeof FIELDS)[number],
	ink: Ink,
): ClosingSignature {
	const i = FIELDS.indexOf(field);
	const { subject } = signer.certificate;
	return {
		field,
		role: subject.kind === 'person' ? subject.roles.join(', ') : '',
		meaning: field.slice(4),
		at: `2026-05-14T19:${21 + 10 * i}:40+02:00`,
		code: 'M4XQ-0TDR-7WHB-2JKE',
		drawn: [Array.from({ length: 40 }, (_, k) => ({ x: k / 40, y: 0.5 + 0.4 * Math.sin((k * (i + 2)) / 4) }))],
		inks: { regular: ink, strong: ink },
		chain: [signer.certificate.der, site.root.certificate.der],
		sign: (bytes) => sign(bytes, signer.key),
	};
}

/** The base and what it became with each signature: [base, one, two, three]. */
export async function signThree(site: TestSite, signers: Signers): Promise<readonly [Bytes, Bytes, Bytes, Bytes]> {
	const { bytes: base, ink } = await makeBase();
	const one = value(await signIncrement(base, closing(site, signers.sig_performed, 'sig_performed', ink)));
	const two = value(await signIncrement(one, closing(site, signers.sig_reviewed, 'sig_reviewed', ink)));
	const three = value(await signIncrement(two, closing(site, signers.sig_accepted, 'sig_accepted', ink)));
	return [base, one, two, three];
}
