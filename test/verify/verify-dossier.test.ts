import { PDFDocument } from 'pdf-lib';
import { beforeAll, describe, expect, test } from 'vitest';
import { REBUILD } from '../../src/cli/rebuild';
import { utf8 } from '../../src/lib/base';
import { verifyDossier, type DossierReport } from '../../src/lib/verify';
import { makeSignedDossier } from '../support/signed-dossier';
import { SMALL_PROCEDURE } from '../support/small-procedure';
import { makeSignedRecord, NOW, type SignedRecord } from '../support/signed-record';

let record: SignedRecord;
let dossier: Uint8Array<ArrayBuffer>;
beforeAll(async () => {
	record = await makeSignedRecord();
	dossier = await makeSignedDossier(record);
});

const judge = (
	bytes: Uint8Array<ArrayBuffer>,
	more: Partial<Parameters<typeof verifyDossier>[1]> = {},
): Promise<DossierReport> =>
	verifyDossier(bytes, { root: record.site.root.certificate.der, now: NOW, rebuild: REBUILD, ...more });

const bad = ({ checks }: DossierReport): readonly string[] =>
	checks.filter(({ outcome }) => outcome !== 'passed').map(({ name }) => name);

test('a dossier that nobody touched: file, signatures, record, rules and pages hold', async () => {
	const report = await judge(dossier);
	expect(bad(report)).toEqual([]);
	expect(report).toMatchObject({ class: 'TOTAL-PASSED', outcome: 'passed', process: { result: 'met' } });
	expect(report.signatures.map(({ class: verdict }) => verdict)).toEqual(Array(3).fill('TOTAL-PASSED'));
});

describe('what an insider wrote and three people signed', () => {
	const ofStartUp = (): readonly string[] => record.lines.filter((_, i) => record.events[i]!.log !== 'site');

	test('a line of the record with another signature', async () => {
		const [first, ...rest] = ofStartUp();
		const stripped = JSON.stringify({ text: (JSON.parse(first!) as { text: string }).text });
		const report = await judge(await makeSignedDossier(record, { lines: [stripped, ...rest] }));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)).toEqual(['events are signed by the key that they name']);
	});

	test('a site log without an event', async () => {
		const siteLines = record.lines.filter((_, i) => record.events[i]!.log === 'site').slice(1);
		const report = await judge(await makeSignedDossier(record, { siteLines }));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)).toContain('chains are whole');
	});

	test('a procedure beside the record that is not the one inside it', async () => {
		const procedure = { ...SMALL_PROCEDURE, title: 'A kinder procedure' };
		const report = await judge(await makeSignedDossier(record, { procedure }));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)).toEqual(['documents beside the record are those inside it']);
	});

	test('pages that this record does not make', async () => {
		const build = () => Promise.resolve(utf8('%PDF-1.7 other pages %%EOF'));
		const report = await judge(dossier, { rebuild: { ...REBUILD, build } });
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)).toEqual(['pages are those that the record makes']);
	});

	test('roles that may not sign: the fields ask for them, and the certificates do not have them', async () => {
		const signatures = ['performed', 'reviewed', 'accepted'].map((meaning) => ({
			field: `sig_${meaning}`,
			meaning: meaning as 'performed',
			roles: ['process engineer'],
		}));
		const report = await judge(await makeSignedDossier(record, { signatures }));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(new Set(bad(report))).toEqual(new Set(['signer had the role']));
	});
});

describe('what cannot be told is undecided, not failed', () => {
	test('a root that the judge does not bring', async () => {
		const report = await judge(dossier, { root: undefined });
		expect(report).toMatchObject({ class: 'INDETERMINATE', sub: 'NO_CERTIFICATE_CHAIN_FOUND' });
		expect(bad(report)).toEqual(['trust is anchored in a root that the judge knows']);
	});

	test('pages that nobody wrote again, or that another version wrote', async () => {
		expect(bad(await judge(dossier, { rebuild: undefined }))).toEqual(['pages are those that the record makes']);
		const older = await judge(await makeSignedDossier(record, { writer: 'Gatehold 0.0.9' }));
		expect(older.class).toBe('INDETERMINATE');
		expect(bad(older)).toEqual(['pages are those that the record makes']);
	});
});

describe('what is not a dossier', () => {
	test('the first half of one names the byte where it ends', async () => {
		const report = await judge(dossier.slice(0, dossier.length / 2));
		expect(report).toMatchObject({ class: 'TOTAL-FAILED', isPdf: true, process: { result: 'not judged' } });
		expect(report.checks[0]?.because).toMatch(/At byte \d+/);
	});

	test('another PDF holds no record', async () => {
		const pdf = await PDFDocument.create();
		pdf.addPage();
		const report = await judge(new Uint8Array(await pdf.save({ useObjectStreams: false })));
		expect(report).toMatchObject({ class: 'TOTAL-FAILED', isPdf: true });
		expect(bad(report)).toContain('dossier has its table of contents');
	});

	test('any bytes', async () => {
		expect(await judge(utf8('time;O2\n08:00;7,4'))).toMatchObject({ class: 'TOTAL-FAILED', isPdf: false });
	});
});
