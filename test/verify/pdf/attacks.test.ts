import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { concat, toBase64, toHex } from '../../../src/lib/base';
import { signIncrement, type ClosingSignature, type Ink } from '../../../src/lib/dossier';
import { enrolPerson, webRandom } from '../../../src/lib/identity';
import { checkPdf, readPdf } from '../../../src/lib/verify';
import { PdfJudges, readPdfsig } from '../../support/pdf-judges';
import { closing, makeBase, makeSigners, signThree, type Signers } from '../../support/small-dossier';
import { latin1 } from '../../support/tamper';
import { makeTestSite, testTrustList, value, type TestSite } from '../../support/test-site';

type Bytes = Uint8Array<ArrayBuffer>;

let site: TestSite;
let signers: Signers;
let two: Bytes;
let three: Bytes;
let judges: PdfJudges;

beforeAll(async () => {
	site = await makeTestSite();
	signers = await makeSigners(site);
	[, , two, three] = await signThree(site, signers);
	judges = new PdfJudges(site.root.certificate.der);
});

afterAll(() => judges.dismiss());

const judge = (bytes: Bytes) =>
	checkPdf(readPdf(bytes), {
		root: site.root.certificate.der,
		trustList: testTrustList(site),
		now: '2026-06-01T00:00:00Z',
	});

/** Outcome, and the checks of the last signature that did not pass. */
async function complaints(bytes: Bytes) {
	const { outcome, checks } = await judge(bytes);
	return [outcome, ...checks.filter((check) => check.outcome !== 'passed').map(({ name }) => name)];
}

/** Changes the last place where a text stands, and keeps the length. */
function editLast(from: RegExp, to: (found: string) => string): Bytes {
	const text = latin1(three);
	const found = [...text.matchAll(new RegExp(from, 'g'))].at(-1)!;
	const changed = to(found[0]).padEnd(found[0].length).slice(0, found[0].length);
	return new Uint8Array(
		Buffer.from(text.slice(0, found.index) + changed + text.slice(found.index + found[0].length), 'latin1'),
	);
}

const CONTENTS = /\/Contents <[0-9a-f]+>/;
const DIGEST = 'bytes are those that were signed';
const UPDATE = 'update 3 is one signature and nothing else';
const COVERS = 'covers the whole file as it was signed';
const READ = 'signature can be read';

describe('[PS3] [PS4] [PS5] a signature that some readers take for none, or for a good one', () => {
	test.each([
		['without contents', CONTENTS, () => '', [UPDATE, COVERS, READ]],
		['with null as its contents', CONTENTS, () => '/Contents null', [COVERS, READ]],
		[
			'with nothing but zeros as its contents',
			CONTENTS,
			(all: string) => `/Contents <${'0'.repeat(all.length - 12)}>`,
			[READ],
		],
		[
			'with its contents as a text in brackets',
			CONTENTS,
			(all: string) => `/Contents (${all.slice(11, -1)})`,
			[COVERS],
		],
		[
			'with capital letters in its contents',
			CONTENTS,
			(all: string) => all.toUpperCase().replace('/CONTENTS', '/Contents'),
			[READ],
		],
		['without a range', /\/ByteRange \[[\d ]+\]/, () => '', [UPDATE, COVERS]],
		['with a range of nothing', /\/ByteRange \[[\d ]+\]/, () => '/ByteRange [0 0 0 0]', [COVERS]],
		['with a negative range', /\/ByteRange \[0 \d+/, (all: string) => all.replace('[0 ', '[-1'), [COVERS]],
		['of another form', /\/ETSI\.CAdES\.detached/, () => '/adbe.pkcs7.detached', [UPDATE]],
		['without its lock', /\/Action \/All/, () => '/Action /Not', [UPDATE]],
	] as const)('%s fails', async (_, from, to, expected) => {
		const [outcome, ...found] = await complaints(editLast(from, to));
		expect(outcome).toBe('failed');
		expect(found).toEqual(expect.arrayContaining([...expected]));
	});

	test('with the contents of another signature of the same file fails over its digest', async () => {
		const [first] = CONTENTS.exec(latin1(three))!;
		expect(await complaints(editLast(CONTENTS, () => first))).toEqual(expect.arrayContaining(['failed', DIGEST]));
	});

	test('that OpenSSL made with attributes of its own is good to other readers, and is not read here', async () => {
		const pair = await crypto.subtle.generateKey({ name: 'ECDSA', namedCurve: 'P-256' }, true, ['sign', 'verify']);
		const [pkcs8, spki] = [
			await crypto.subtle.exportKey('pkcs8', pair.privateKey),
			await crypto.subtle.exportKey('spki', pair.publicKey),
		];
		const certificate = await enrolCyra(toBase64(new Uint8Array(spki)));
		const [, from = 0, to = 0] = [...latin1(three).matchAll(/\/ByteRange \[0 (\d+) +(\d+)/g)].at(-1)!.map(Number);
		const signed = concat(three.subarray(0, from), three.subarray(to));
		const der = judges.opensslSign(signed, { certificate, pkcs8: new Uint8Array(pkcs8) });
		const pdf = editLast(CONTENTS, (all) => `/Contents <${toHex(der).padEnd(all.length - 12, '0')}>`);
		expect(readPdfsig(judges.pdfsig(pdf))).toEqual({ valid: 3, mismatch: 0, trusted: 3, total: 1 });
		const check = (await judge(pdf)).checks.find(({ name, outcome }) => name === READ && outcome === 'failed');
		expect(check).toMatchObject({ field: 'sig_accepted', sub: 'FORMAT_FAILURE' });
		expect(check?.because).toContain('content type, message digest and signing-certificate-v2, and no other attribute');
	});

	test('that carries a root with one changed byte fails, though nobody signed that byte', async () => {
		const root = toHex(site.root.certificate.der);
		const pdf = editLast(new RegExp(root), (found) => found.slice(0, -1) + (found.endsWith('0') ? '1' : '0'));
		expect(readPdfsig(judges.pdfsig(pdf))).toMatchObject({ valid: 3, total: 1 });
		expect(await complaints(pdf)).toEqual(['failed', 'certificates inside are those of the chain']);
	});

	test('that names another certificate than the one beside it, by its hash or by its number, fails', async () => {
		const { der, serial, fingerprint } = signers.sig_accepted.certificate;
		for (const named of [fingerprint, serial]) {
			// The certificate itself holds its number too: what is changed is the last place.
			const pdf = editLast(new RegExp(named), (found) => (found.startsWith('5') ? '6' : '5') + found.slice(1));
			expect(latin1(pdf)).toContain(toHex(der));
			expect(await complaints(pdf)).toEqual(expect.arrayContaining(['failed', 'certificate of the signer is inside']));
		}
	});
});

/** Enrols the third signer again, for a key that this test knows. */
async function enrolCyra(publicKey: string): Promise<Bytes> {
	const { subject, notBefore, notAfter } = signers.sig_accepted.certificate;
	if (subject.kind !== 'person') throw new Error('the third signer is a person');
	const { person, printedName, roles, device } = subject;
	const how = { person, printedName, roles, device, publicKey, validity: { notBefore, notAfter }, random: webRandom };
	return value(await enrolPerson(site.root, how)).der;
}

describe('[PS6] [C5] a person with a good certificate who signs what is not true', () => {
	/** A font that writes one text where another was meant. */
	const lying = (ink: Ink, meant: string, written: string): Ink => ({
		...ink,
		encode: (text) => ink.encode(text === meant ? written : text),
	});

	async function accepted(change: (signature: ClosingSignature, ink: Ink) => ClosingSignature): Promise<Bytes> {
		const { ink } = await makeBase();
		return value(await signIncrement(two, change(closing(site, signers.sig_accepted, 'sig_accepted', ink), ink)));
	}

	/** What every other reader says: nothing is wrong. */
	const FINE = { valid: 3, mismatch: 0, trusted: 3, total: 1 };
	const SHOWN = 'page shows who signed and when';

	test('under another name on the page fails, though every other reader is content', async () => {
		const pdf = await accepted((signature, ink) => ({
			...signature,
			inks: { regular: ink, strong: lying(ink, 'Cyra Example', 'Ada Example') },
		}));
		expect(readPdfsig(judges.pdfsig(pdf))).toEqual(FINE);
		expect(await complaints(pdf)).toEqual(['failed', SHOWN]);
	});

	test('with another time on the page than in the signature fails', async () => {
		const pdf = await accepted((signature, ink) => ({
			...signature,
			inks: { regular: ink, strong: lying(ink, '2026-05-14 19:41:40 +02:00', '2026-05-14 18:41:40 +02:00') },
		}));
		expect(readPdfsig(judges.pdfsig(pdf))).toEqual(FINE);
		expect(await complaints(pdf)).toEqual(['failed', SHOWN]);
	});

	test('with a time before the signature that it covers is undecided: one of two clocks is wrong', async () => {
		const pdf = await accepted((signature) => ({ ...signature, at: '2026-05-14T19:20:00+02:00' }));
		expect(await complaints(pdf)).toEqual(['undecided', 'clocks agree with the order of signing']);
	});

	test('with a time before the certificate, or one that has not come, is not believed', async () => {
		const early = await accepted((signature) => ({ ...signature, at: '2026-01-31T12:00:00Z' }));
		expect(await complaints(early)).toEqual(expect.arrayContaining(['failed', 'certificate was in its time']));
		const late = await accepted((signature) => ({ ...signature, at: '2026-06-02T12:00:00Z' }));
		expect(await complaints(late)).toEqual(expect.arrayContaining(['undecided', 'claimed time has come']));
	});

	test('with a key that is not the one of the certificate fails', async () => {
		const pdf = await accepted((signature) => ({
			...signature,
			sign: closing(site, signers.sig_reviewed, 'sig_accepted', signature.inks.regular).sign,
		}));
		expect(await complaints(pdf)).toEqual(['failed', 'key of the certificate made the signature']);
		expect(readPdfsig(judges.pdfsig(pdf))).toMatchObject({ valid: 2 });
	});
});
