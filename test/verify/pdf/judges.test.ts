import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { concat, fromHex } from '../../../src/lib/base';
import { findPyHanko } from '../../support/judges.mjs';
import { PdfJudges, readPdfsig } from '../../support/pdf-judges';
import { makeSigners, signThree } from '../../support/small-dossier';
import { latin1 } from '../../support/tamper';
import { makeTestSite } from '../../support/test-site';

let dossier: Uint8Array<ArrayBuffer>;
let judges: PdfJudges;

beforeAll(async () => {
	const site = await makeTestSite();
	[, , , dossier] = await signThree(site, await makeSigners(site));
	judges = new PdfJudges(site.root.certificate.der);
});

afterAll(() => judges.dismiss());

describe('a dossier with three closing signatures, before programs of other people that know the site root', () => {
	test('pdfsig: three valid signatures of trusted people, in order, and the last covers the whole file', () => {
		const said = judges.pdfsig(dossier);
		expect(readPdfsig(said)).toEqual({ valid: 3, mismatch: 0, trusted: 3, total: 1 });
		expect(said.text.match(/Common Name: .*/g)).toEqual([
			'Common Name: Ada Example',
			'Common Name: Bo Example, jun.',
			'Common Name: Cyra Example',
		]);
		expect(said.text.match(/Signature Type: .*/g)).toEqual(Array(3).fill('Signature Type: ETSI.CAdES.detached'));
		expect(said.text.trim().split('\n').at(-3)).toContain('Total document signed');
	});

	test('qpdf: no syntax or encoding errors', () => {
		expect(judges.qpdf(dossier)).toMatchObject({ status: 0 });
		expect(judges.qpdf(dossier).text).toContain('No syntax or stream encoding errors found');
	});

	test('openssl: each signature holds as CAdES over the bytes it says it covers, and fails over one byte less', () => {
		for (const { cms, content } of signaturesOf(dossier)) {
			expect(judges.openssl(cms, content).text).toContain('CAdES Verification successful');
			expect(judges.openssl(cms, content.slice(1)).status).not.toBe(0);
		}
	});

	test.runIf(findPyHanko() !== undefined)(
		'pyHanko: three valid signatures, and each change between them is a signature',
		() => {
			const { status, text } = judges.pyHanko(dossier);
			expect(status).toBe(0);
			expect(text.match(/The signature is judged VALID\./g)).toHaveLength(3);
			expect(text.match(/The signer's certificate is trusted\./g)).toHaveLength(3);
			expect(text).toContain('The signature covers the entire file.');
		},
	);
});

/** DER of each signature and the bytes of its /ByteRange, found by looking at the text alone. */
const signaturesOf = (file: Uint8Array<ArrayBuffer>) =>
	[...latin1(file).matchAll(/\/ByteRange \[(\d+) +(\d+) +(\d+) +(\d+) *\] \/Contents <([0-9a-f]+)>/g)].map((found) => {
		const [a = 0, b = 0, c = 0, d = 0] = found.slice(1, 5).map(Number);
		return {
			content: concat(file.subarray(a, a + b), file.subarray(c, c + d)),
			cms: withoutPadding(fromHex(found[5]!)!),
		};
	});

/** SEQUENCE with a length of two bytes. */
const withoutPadding = (der: Uint8Array<ArrayBuffer>) => der.slice(0, 4 + (der[2] ?? 0) * 256 + (der[3] ?? 0));
