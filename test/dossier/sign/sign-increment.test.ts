import { PDFArray, PDFDict, PDFDocument, PDFHexString, PDFName, PDFNumber, PDFRef, PDFString } from 'pdf-lib';
import { beforeAll, describe, expect, test } from 'vitest';
import { concat, fromBase64, sha256Hex, utf8 } from '../../../src/lib/base';
import { signIncrement, type ClosingSignature, type Ink } from '../../../src/lib/dossier';
import { sign } from '../../../src/lib/identity';
import { checkPdf, readPdf } from '../../../src/lib/verify';
import { closing, FIELDS, makeBase, makeSigners, signThree, type Signers } from '../../support/small-dossier';
import { latin1 } from '../../support/tamper';
import { makeTestSite, testTrustList, value, type TestSite } from '../../support/test-site';

type Bytes = Uint8Array<ArrayBuffer>;

let site: TestSite;
let signers: Signers;
let base: Bytes;
let ink: Ink;

beforeAll(async () => {
	site = await makeTestSite();
	signers = await makeSigners(site);
	({ bytes: base, ink } = await makeBase());
});

const performed = (change: Partial<ClosingSignature> = {}): ClosingSignature => ({
	...closing(site, signers.sig_performed, 'sig_performed', ink),
	...change,
});

describe('a closing signature', () => {
	test('adds to the file and changes no byte of it, three times over', async () => {
		const states = await signThree(site, signers);
		for (const [before, after] of [states.slice(0, 2), states.slice(1, 3), states.slice(2, 4)]) {
			expect(after!.length).toBeGreaterThan(before!.length);
			expect(after!.slice(0, before!.length)).toEqual(before);
			expect(after!.length - before!.length).toBeLessThan(13_000);
		}
	});

	test('[PS2] brings three objects: the field, the signature and what the field shows', async () => {
		const added = latin1(value(await signIncrement(base, performed())).slice(base.length));
		const size = Number(/\/Size (\d+)/.exec(latin1(base).slice(latin1(base).lastIndexOf('trailer')))![1]);
		const field = Number(
			/(\d+) 0 obj\n<<\n\/Type \/Annot\n\/Subtype \/Widget\n\/FT \/Sig\n\/T \(sig_performed\)/.exec(latin1(base))![1],
		);
		const numbers = [...added.matchAll(/^(\d+) 0 obj$/gm)].map(([, number]) => Number(number));
		expect(numbers).toEqual([field, size, size + 1]);
		expect(added).toContain(`/Size ${size + 2} `);
	});

	test('[PS4] covers every byte but the hexadecimal string of its contents', async () => {
		const signed = value(await signIncrement(base, performed()));
		const text = latin1(signed);
		const [, from = 0, to = 0, rest = 0] = /\/ByteRange \[0 (\d+) +(\d+) +(\d+) *\]/.exec(text)!.map(Number);
		expect(text.slice(from - '/Contents '.length, from)).toBe('/Contents ');
		expect(text.slice(from, to)).toMatch(/^<[0-9a-f]{8192}>$/);
		expect(to + rest).toBe(signed.length);
	});

	test('[PS3] says name, meaning, role and time inside the bytes that it covers', async () => {
		const signed = value(await signIncrement(base, performed()));
		const dictionary = await signatureOf(signed, 'sig_performed');
		expect(dictionary.lookup(PDFName.of('Name'), PDFHexString).decodeText()).toBe('Ada Example');
		expect(dictionary.lookup(PDFName.of('Reason'), PDFHexString).decodeText()).toBe('performed, technician');
		expect(dictionary.lookup(PDFName.of('M'), PDFString).asString()).toBe("D:20260514172140+00'00'");
		expect(dictionary.get(PDFName.of('SubFilter'))).toBe(PDFName.of('ETSI.CAdES.detached'));
	});

	test('[PS6] shows name, role, meaning, time with its offset, certificate and digest code, and the drawn hand', async () => {
		const shown = textShown(latin1(value(await signIncrement(base, performed())).slice(base.length)));
		const { serial } = signers.sig_performed.certificate;
		expect(shown).toEqual([
			'Ada Example',
			...['Role', 'technician', 'Meaning', 'performed'],
			...['Time by the clock of the signer', '2026-05-14 19:21:40 +02:00'],
			...['Certificate, valid to', `${serial.slice(0, 8).toUpperCase()}, 2028-01-31`],
			...['Digest of what was shown', 'M4XQ-0TDR-7WHB-2JKE'],
		]);
		const added = latin1(value(await signIncrement(base, performed())).slice(base.length));
		expect(added.match(/ l /g)!.length).toBeGreaterThanOrEqual(39);
	});

	test('[PS3] locks all fields if it is the last, and only then', async () => {
		const [, one, , three] = await signThree(site, signers);
		expect((await signatureOf(one, 'sig_performed')).has(PDFName.of('Reference'))).toBe(false);
		const [reference] = (await signatureOf(three, 'sig_accepted')).lookup(PDFName.of('Reference'), PDFArray).asArray();
		expect(String(reference)).toMatch(/\/TransformMethod \/FieldMDP[\s\S]*\/Action \/All/);
	});

	test('made twice by the same hand is the same file: the chance lies inside the signature alone', async () => {
		const fixed = performed({ sign: () => Promise.resolve(Buffer.alloc(64, 7).toString('base64')) });
		const [a, b] = [value(await signIncrement(base, fixed)), value(await signIncrement(base, fixed))];
		expect(sha256Hex(a)).toBe(sha256Hex(b));
	});

	test('holds when r begins with a zero byte, and when it begins with a high bit', async () => {
		const { key } = signers.sig_performed;
		for (const wanted of [(first: number) => first === 0, (first: number) => first >= 0x80]) {
			const grind = async (bytes: Bytes): Promise<string> => {
				for (;;) {
					const signature = await sign(bytes, key);
					if (wanted(fromBase64(signature)![0]!)) return signature;
				}
			};
			const signed = value(await signIncrement(base, performed({ sign: grind })));
			const question = { root: site.root.certificate.der, trustList: testTrustList(site), now: '2026-06-01T00:00:00Z' };
			const { signatures } = await checkPdf(readPdf(signed), question);
			expect(signatures).toMatchObject([{ field: 'sig_performed', class: 'TOTAL-PASSED' }]);
		}
	});
});

describe('a signature is refused, and the file stays as it was', () => {
	test('when the field does not exist, naming those that do', async () => {
		const refused = await signIncrement(base, performed({ field: 'sig_witnessed' }));
		expect(refused).toEqual({
			ok: false,
			error: { kind: 'no-such-field', field: 'sig_witnessed', fields: [...FIELDS] },
		});
	});

	test('when the field is signed already', async () => {
		const [, one] = await signThree(site, signers);
		expect(await signIncrement(one, performed())).toEqual({
			ok: false,
			error: { kind: 'already-signed', field: 'sig_performed' },
		});
	});

	test('when the fonts of the dossier lack a character, with its code point and the text it is in', async () => {
		const refused = await signIncrement(base, performed({ meaning: 'geprüft ✓' }));
		expect(refused).toEqual({ ok: false, error: { kind: 'no-glyph', codePoint: 'U+2713', text: 'geprüft ✓' } });
	});

	test('when the certificate is not that of a person', async () => {
		const chain = [site.root.certificate.der];
		expect(await signIncrement(base, performed({ chain }))).toEqual({
			ok: false,
			error: { kind: 'not-a-person', subject: 'authority' },
		});
		expect(await signIncrement(base, performed({ chain: [utf8('none')] }))).toMatchObject({
			error: { kind: 'not-a-certificate' },
		});
	});

	test('when so many certificates come with it that they do not fit', async () => {
		const chain = [signers.sig_performed.certificate.der, ...Array<Bytes>(9).fill(site.root.certificate.der)];
		expect(await signIncrement(base, performed({ chain }))).toMatchObject({
			error: { kind: 'signature-too-long', room: 4096 },
		});
	});

	test('when the file is cut off, goes on behind its end, or keeps its objects in streams', async () => {
		const refusal = async (file: Bytes) => {
			const refused = await signIncrement(file, performed());
			return refused.ok ? undefined : [refused.error.kind, 'because' in refused.error ? refused.error.because : ''];
		};
		const end = ['not-our-file', 'it does not end in startxref and %%EOF'];
		expect(await refusal(base.slice(0, -2))).toEqual(end);
		expect(await refusal(concat(base, utf8('\n%')))).toEqual(end);
		expect(await refusal(utf8('not a PDF'))).toEqual(end);
		const packed = await PDFDocument.load(base, { updateMetadata: false });
		const streams = new Uint8Array(await packed.save({ useObjectStreams: true, updateFieldAppearances: false }));
		expect(await refusal(streams)).toEqual(['not-our-file', 'it has no classic cross-reference table']);
	});
});

test('[PS1] an open field is printed, shows that nobody has signed, and the last one is locked from the start', async () => {
	const pdf = await PDFDocument.load(base, { updateMetadata: false });
	const form = pdf.catalog.lookup(PDFName.of('AcroForm'), PDFDict);
	expect(form.lookup(PDFName.of('SigFlags'), PDFNumber).asNumber()).toBe(3);
	const fields = form
		.lookup(PDFName.of('Fields'), PDFArray)
		.asArray()
		.map((ref) => pdf.context.lookup(ref, PDFDict));
	expect(fields.map((field) => field.lookup(PDFName.of('T'), PDFString).asString())).toEqual([...FIELDS]);
	expect(fields.map((field) => field.lookup(PDFName.of('F'), PDFNumber).asNumber())).toEqual([4, 4, 4]);
	expect(fields.map((field) => field.get(PDFName.of('Lock')) instanceof PDFRef)).toEqual([false, false, true]);
	expect(textShown(latin1(base))).toEqual(['Not signed', 'Not signed', 'Not signed']);
});

async function signatureOf(file: Bytes, name: string): Promise<PDFDict> {
	const pdf = await PDFDocument.load(file, { updateMetadata: false });
	const fields = pdf.catalog.lookup(PDFName.of('AcroForm'), PDFDict).lookup(PDFName.of('Fields'), PDFArray);
	const all = fields.asArray().map((ref) => pdf.context.lookup(ref, PDFDict));
	return all
		.find((field) => field.lookup(PDFName.of('T'), PDFString).asString() === name)!
		.lookup(PDFName.of('V'), PDFDict);
}

/** The texts of the signature appearances, which are not packed; in the test font a code is a character. */
const textShown = (file: string): readonly string[] =>
	[...file.matchAll(/BT \/Ink [^<]*<([0-9A-F]*)> Tj ET/g)].map(([, hex]) =>
		Buffer.from(hex!, 'hex').toString('latin1'),
	);
