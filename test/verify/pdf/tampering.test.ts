import { afterAll, beforeAll, expect, test } from 'vitest';
import { concat, utf8 } from '../../../src/lib/base';
import { signIncrement } from '../../../src/lib/dossier';
import { checkPdf, readPdf, type PdfQuestion } from '../../../src/lib/verify';
import { PdfJudges, readPdfsig } from '../../support/pdf-judges';
import { closing, makeBase, makeSigners, RECORD, signThree, type Signers } from '../../support/small-dossier';
import { appendUnsigned, findObjects, flip, latin1, stream } from '../../support/tamper';
import { makeTestSite, testTrustList, value, type TestSite } from '../../support/test-site';

type Bytes = Uint8Array<ArrayBuffer>;
type Files = { readonly base: Bytes; readonly one: Bytes; readonly two: Bytes; readonly three: Bytes };

let site: TestSite;
let signers: Signers;
let files: Files;
let objects: Awaited<ReturnType<typeof findObjects>>;
let judges: PdfJudges;

beforeAll(async () => {
	site = await makeTestSite();
	signers = await makeSigners(site);
	const [base, one, two, three] = await signThree(site, signers);
	files = { base, one, two, three };
	objects = await findObjects(three);
	judges = new PdfJudges(site.root.certificate.der);
});

afterAll(() => judges.dismiss());

const question = (): PdfQuestion => ({
	root: site.root.certificate.der,
	trustList: testTrustList(site),
	now: '2026-06-01T00:00:00Z',
	required: [
		{ field: 'sig_performed', roles: ['technician'] },
		{ field: 'sig_reviewed', roles: ['shift supervisor'] },
		{ field: 'sig_accepted', roles: ['commissioning lead'] },
	],
});

const judge = (pdf: Bytes) => checkPdf(readPdf(pdf), question());

/** What did not pass, as the words that a person would read. */
const complaints = async (pdf: Bytes) =>
	(await judge(pdf)).checks
		.filter(({ outcome }) => outcome !== 'passed')
		.map(({ name, field }) => (field === undefined ? name : `${name} (${field})`));

test('a dossier that nobody touched passes every check of ours, and the other judges agree', async () => {
	expect(await complaints(files.three)).toEqual([]);
	expect(await judge(files.three)).toMatchObject({ class: 'TOTAL-PASSED', outcome: 'passed' });
	expect(readPdfsig(judges.pdfsig(files.three))).toEqual({ valid: 3, mismatch: 0, trusted: 3, total: 1 });
	expect(judges.qpdf(files.three)).toMatchObject({ status: 0 });
});

const DIGEST = 'bytes are those that were signed';
const UPDATE_4 = 'update 4 is one signature and nothing else';
const FOLLOWS = 'nothing follows the last signature';

/** One row per tampering: what was done, what another reader says of it, and what we say. */
const ROWS: readonly {
	readonly row: string;
	readonly what: string;
	readonly tamper: () => Bytes | Promise<Bytes>;
	readonly pdfsig: ReturnType<typeof readPdfsig>;
	readonly complaints: readonly string[];
}[] = [
	{
		row: 'T1',
		what: 'a byte of a page is flipped',
		tamper: () => flip(files.three, bodyStart(files.three, objects.content) + 20),
		pdfsig: { valid: 0, mismatch: 3, trusted: 0, total: 1 },
		complaints: [`${DIGEST} (sig_performed)`, `${DIGEST} (sig_reviewed)`, `${DIGEST} (sig_accepted)`],
	},
	{
		row: 'T2',
		what: 'an unsigned update replaces what page 1 says',
		tamper: () => appendUnsigned(files.three, [{ number: objects.content, body: stream('BT ET') }]),
		pdfsig: { valid: 3, mismatch: 0, trusted: 3, total: 0 },
		complaints: [UPDATE_4, FOLLOWS],
	},
	{
		row: 'T3',
		what: 'an unsigned update puts another record in the place of the attached one',
		tamper: () => appendUnsigned(files.three, [{ number: objects.attachment, body: stream('{"kind":"forged"}') }]),
		pdfsig: { valid: 3, mismatch: 0, trusted: 3, total: 0 },
		complaints: [UPDATE_4, FOLLOWS],
	},
	{
		row: 'T4',
		what: 'the last signature is cut off, which every other reader takes for a whole file',
		tamper: () => files.two,
		pdfsig: { valid: 2, mismatch: 0, trusted: 2, total: 1 },
		complaints: ['field sig_accepted is signed (sig_accepted)'],
	},
	{
		row: 'T5',
		what: 'an unsigned update changes the name that a signature shows',
		tamper: () =>
			appendUnsigned(files.three, [
				{ number: objects.appearance, body: stream('BT ET', '/Type /XObject /Subtype /Form /BBox [0 0 484 98]') },
			]),
		pdfsig: { valid: 3, mismatch: 0, trusted: 3, total: 0 },
		complaints: [UPDATE_4, FOLLOWS],
	},
	{
		row: 'T6',
		what: 'an unsigned update puts a stamp over page 1',
		tamper: () =>
			appendUnsigned(files.three, [
				{
					number: objects.page,
					body: objects.bodyOf(objects.page).replace('/Annots [ ]', `/Annots [${objects.free} 0 R]`),
				},
				{ number: objects.free, body: '<< /Type /Annot /Subtype /Stamp /Rect [50 700 400 780] /F 4 >>' },
			]),
		pdfsig: { valid: 3, mismatch: 0, trusted: 3, total: 0 },
		complaints: [UPDATE_4, FOLLOWS],
	},
	{
		row: 'T7',
		what: 'bytes are hidden in the room behind the first signature',
		tamper: () => hideInPadding(files.three),
		pdfsig: { valid: 1, mismatch: 2, trusted: 1, total: 1 },
		complaints: [
			'nothing is hidden behind the signature (sig_performed)',
			`${DIGEST} (sig_reviewed)`,
			`${DIGEST} (sig_accepted)`,
		],
	},
	{
		row: 'T8',
		what: 'the last state is signed again under a false root with the same names',
		tamper: () => signUnderFalseRoot(),
		pdfsig: { valid: 3, mismatch: 0, trusted: 2, total: 1 },
		complaints: ['one root vouches for all signers or for none', 'site root vouches for the signer (sig_accepted)'],
	},
	{
		row: 'T9',
		what: 'a comment is added behind the end',
		tamper: () => concat(files.three, utf8('% harmless\n')),
		pdfsig: { valid: 3, mismatch: 0, trusted: 3, total: 0 },
		complaints: ['file ends where its last state ends', FOLLOWS],
	},
	{
		row: 'T10',
		what: 'a byte of the attached record is flipped',
		tamper: () => flip(files.three, bodyStart(files.three, objects.attachment) + 8),
		pdfsig: { valid: 0, mismatch: 3, trusted: 0, total: 1 },
		complaints: [`${DIGEST} (sig_performed)`, `${DIGEST} (sig_reviewed)`, `${DIGEST} (sig_accepted)`],
	},
	{
		row: 'T11',
		what: 'an insider changes page 1 and then signs as the third',
		tamper: () => signAfterChange(),
		pdfsig: { valid: 3, mismatch: 0, trusted: 3, total: 1 },
		complaints: ['update 3 is one signature and nothing else'],
	},
];

for (const { row, what, tamper, pdfsig, complaints: expected } of ROWS) {
	test(`[${row}] ${what}`, async () => {
		const pdf = await tamper();
		expect(readPdfsig(judges.pdfsig(pdf))).toEqual(pdfsig);
		expect(await complaints(pdf)).toEqual(expected);
		expect(await judge(pdf)).toMatchObject({ class: 'TOTAL-FAILED', outcome: 'failed' });
	});
}

test('[PS8] an update that brings another record does not change the record that is read', () => {
	const forged = appendUnsigned(files.three, [{ number: objects.attachment, body: stream('{"kind":"forged"}') }]);
	expect(readPdf(forged).attachments).toEqual([
		{ name: 'record.ndjson', mediaType: 'application/x-ndjson', bytes: RECORD },
	]);
});

test('a dossier judged without a site root is undecided, whatever names it carries', async () => {
	const { root: _, ...withoutRoot } = question();
	const report = await checkPdf(readPdf(files.three), withoutRoot);
	expect(report).toMatchObject({ class: 'INDETERMINATE', sub: 'NO_CERTIFICATE_CHAIN_FOUND', outcome: 'undecided' });
});

test('a dossier of another site is undecided: this root can say nothing about it', async () => {
	const other = await makeTestSite('Another Invented Site');
	const report = await checkPdf(readPdf(files.three), { ...question(), root: other.root.certificate.der });
	expect(report).toMatchObject({ class: 'INDETERMINATE', sub: 'NO_CERTIFICATE_CHAIN_FOUND', outcome: 'undecided' });
});

test('[C2] a signer without the role that the record asks for fails the dossier', async () => {
	const required = [{ field: 'sig_performed', roles: ['QA'] as const }];
	const report = await checkPdf(readPdf(files.three), { ...question(), required });
	expect(report.outcome).toBe('failed');
	expect(report.signatures[0]).toMatchObject({ class: 'INDETERMINATE', sub: 'SIG_CONSTRAINTS_FAILURE' });
});

/** Behind `obj` of the first object with this number: inside its dictionary or stream. */
function bodyStart(file: Bytes, number: number): number {
	const text = latin1(file);
	const object = text.indexOf(`\n${number} 0 obj`);
	return text.indexOf('stream\n', object) + 'stream\n'.length;
}

function hideInPadding(file: Bytes): Bytes {
	const hidden = file.slice();
	const end = latin1(file).indexOf('0>', latin1(file).indexOf('/Contents <'));
	hidden.set(utf8('48656c6c6f'), end - 40);
	return hidden;
}

async function signUnderFalseRoot(): Promise<Bytes> {
	const falseSite = await makeTestSite();
	const { ink } = await makeBase();
	const signer = await falseSite.enrol({
		person: 'P-03',
		printedName: 'Cyra Example',
		roles: ['commissioning lead'],
		device: 'T-2',
	});
	return value(await signIncrement(files.two, closing(falseSite, signer, 'sig_accepted', ink)));
}

async function signAfterChange(): Promise<Bytes> {
	const { ink } = await makeBase();
	const changed = appendUnsigned(files.two, [{ number: objects.content, body: stream('BT ET') }]);
	return value(await signIncrement(changed, closing(site, signers.sig_accepted, 'sig_accepted', ink)));
}
