import { beforeAll, describe, expect, test } from 'vitest';
import { verify } from '../../../src/cli/commands/verify';
import { toPem } from '../../../src/lib/identity';
import { aFolder } from '../../support/files';
import { heard } from '../../support/heard';
import { makeSignedDossier } from '../../support/signed-dossier';
import { makeSignedRecord, worded } from '../../support/signed-record';

const folder = aFolder();
let [dossier, root, damaged, record, cut] = ['', '', '', '', ''];

beforeAll(async () => {
	const signed = await makeSignedRecord({ statement: worded('en') });
	const pdf = await makeSignedDossier(signed);
	dossier = folder.put('dossier.pdf', pdf);
	root = folder.put('root.pem', toPem(signed.site.root.certificate.der));
	const changed = pdf.slice();
	changed[2000] = changed[2000]! ^ 1;
	damaged = folder.put('damaged.pdf', changed);
	record = folder.put('record.ndjson', signed.lines.join('\n'));
	cut = folder.put('cut.ndjson', signed.lines.slice(0, -1).join('\n'));
});

async function run(...args: readonly string[]) {
	const { terminal, printed, complained } = heard();
	const outcome = await verify.run(args, terminal);
	return { outcome, printed: printed.join('\n'), complained: complained.join('\n') };
}

describe('a dossier', () => {
	test('with the root: integrity and procedure are two lines, and every check says why', async () => {
		const { outcome, printed } = await run(dossier, '--root', root);
		expect(outcome).toBe('passed');
		expect(printed).toMatch(/^ {2}Integrity of this file: TOTAL-PASSED \(\d+ checks hold, 0 failed, 0 undecided\)$/m);
		expect(printed).toMatch(/^ {2}Rules of the procedure: met$/m);
		expect(printed).toMatch(
			/^ {2}holds {6}pages are those that the record makes: Written again from the record: the same \d+ bytes\./m,
		);
		// Never the word alone: people read "passed" as "safe".
		expect(printed).not.toMatch(/^\s*passed\s*$/im);
	});

	test('without the root: nobody says whose it is', async () => {
		const { outcome, printed } = await run(dossier);
		expect(outcome).toBe('indeterminate');
		expect(printed).toContain('Integrity of this file: INDETERMINATE, NO_CERTIFICATE_CHAIN_FOUND');
		expect(printed).toContain('trust is anchored in a root that the judge knows');
	});

	test('with one bit changed: failed, and what failed stands first', async () => {
		const { outcome, printed } = await run(damaged, '--root', root);
		expect(outcome).toBe('failed');
		const [first] = printed.split('\n').filter((line) => /^ {2}(holds|FAILED|undecided)/.test(line));
		expect(first).toMatch(/^ {2}FAILED/);
	});

	test('as JSON: the whole report, by file', async () => {
		const { printed } = await run(dossier, '--root', root, '--json');
		const [report] = JSON.parse(printed) as { file: string; class: string; process: object; checks: object[] }[];
		expect(report).toMatchObject({ file: dossier, class: 'TOTAL-PASSED', process: { result: 'met', because: [] } });
		expect(report?.checks.length).toBeGreaterThan(80);
	});
});

describe('several files', () => {
	test('the worst decides, wherever it stands', async () => {
		expect((await run(dossier, record, '--root', root)).outcome).toBe('passed');
		expect((await run(damaged, dossier, '--root', root)).outcome).toBe('failed');
		expect((await run(dossier, cut, '--root', root)).outcome).toBe('indeterminate');
		expect((await run(dossier, `${folder.path}/gone.pdf`, '--root', root)).outcome).toBe('unusable-input');
	});
});

describe('what cannot be judged is named', () => {
	test.each([
		['a foreign record file', () => folder.put('foreign.ndjson', '{"ts":1,"tag":"AT-211"}\n'), 'Line 1 of '],
		['a trend', () => folder.put('trend.csv', 'time;O2\n08:00;7,4\n'), 'Line 1 of '],
		['an empty file', () => folder.put('empty', ''), 'is neither a dossier nor a record'],
		['no file', () => `${folder.path}/gone`, 'there is no such file'],
	])('%s', async (_what, file, because) => {
		const { outcome, printed, complained } = await run(file(), '--root', root);
		expect({ outcome, printed }).toEqual({ outcome: 'unusable-input', printed: '' });
		expect(complained).toContain(because);
	});

	test('a PDF that ends in the middle is a damaged dossier: the byte is named', async () => {
		const { outcome, printed } = await run(folder.put('half.pdf', '%PDF-1.7\n1 0 obj\n<< /Type /Cat'), '--root', root);
		expect(outcome).toBe('failed');
		expect(printed).toMatch(/FAILED {5}file can be read to the last byte: At byte \d+ it is damaged/);
	});

	test('a root that is none, and no file at all', async () => {
		expect((await run(dossier, '--root', record)).complained).toContain('is no certificate');
		expect((await run()).outcome).toBe('unusable-input');
	});
});
