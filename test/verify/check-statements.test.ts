import { beforeAll, describe, expect, test } from 'vitest';
import { readableCode, sha256Hex } from '../../src/lib/base';
import type { GateSheet, Statement } from '../../src/lib/record';
import type { Check, Report } from '../../src/lib/verify';
import { restate } from '../../src/lib/wording';
import { judge, makeSignedRecord, worded } from '../support/signed-record';
import { makeTestSite, type TestSite } from '../support/test-site';

let site: TestSite;
beforeAll(async () => {
	site = await makeTestSite();
});

const bad = (report: Report): readonly Check[] => report.checks.filter(({ outcome }) => outcome !== 'passed');

const judged = async (statement: (said: Statement, sheet: GateSheet) => Statement): Promise<Report> =>
	judge(await makeSignedRecord({ statement }, site), undefined, { restate });

describe('the words of a signed statement are said again in their own language', () => {
	test.each(['en', 'de'] as const)('%s: a record as it was signed passes', async (language) => {
		const record = await makeSignedRecord({ statement: worded(language) }, site);
		const texts = record.events.flatMap((one) => (one.kind === 'gate released' ? [one.body.statement!.text] : []));
		expect(texts[0]).toMatch(language === 'de' ? /^Stufe 1, .*: freigegeben\. / : /^Gate 1, .*: released\. /);
		expect((await judge(record, undefined, { restate })).class).toBe('TOTAL-PASSED');
	});

	test('words that the sheet does not give fail, even with the right code', async () => {
		const report = await judged((said, sheet) => {
			const text = worded('de')(said, sheet).text.replace('keine Erlaubnis', 'eine Erlaubnis');
			return { ...worded('de')(said, sheet), text, code: readableCode(sha256Hex(text), 16) };
		});
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report).map(({ because }) => because)[0]).toMatch(
			/^T-1 number 6 \(gate released, gate 1\) says "Stufe 1/,
		);
	});

	test('a declaration that was not asked for fails', async () => {
		const report = await judged((said, sheet) => ({ ...worded('de')(said, sheet), declaration: 'Alles in Ordnung.' }));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)[0]!.because).toContain('declares "Alles in Ordnung."');
	});

	test('German words that are called English fail', async () => {
		const report = await judged((said, sheet) => ({
			...worded('de')(said, sheet),
			language: 'en',
			textVersion: 'statement-en/1',
		}));
		expect(report.class).toBe('TOTAL-FAILED');
	});

	test('a language, or a version, that is not spoken here is undecided, and not passed over', async () => {
		for (const said of [
			{ language: 'fi', textVersion: 'statement-fi/1' },
			{ language: 'de', textVersion: 'statement-de/9' },
		]) {
			const report = await judged((shown) => ({ ...shown, ...said }));
			expect(report.class).toBe('INDETERMINATE');
			expect(bad(report)[0]!.because).toContain(`is worded in ${said.textVersion}, which is not spoken here`);
		}
	});
});

/** Gate 1 of the signed record is released at 08:40:00. */
describe('[R11] a sheet that was read for a while is judged by the moment for which it was made', () => {
	const readSince =
		(shownAt: string, says: { readonly shownAt?: string } = { shownAt }) =>
		(): Promise<Report> =>
			makeSignedRecord(
				{
					shownAt: (gate) => (gate === 1 ? shownAt : undefined),
					statement: (said, sheet) => (sheet.gate === 1 ? { ...said, ...says } : said),
				},
				site,
			).then((record) => judge(record));

	test('its ages are those of that moment, a minute less than when it was signed', async () => {
		const report = await readSince('2026-05-14T08:39:20+02:00')();
		expect(bad(report)).toEqual([]);
		expect(report.class).toBe('TOTAL-PASSED');
	});

	test('a sheet that does not say its moment is taken for one of the moment of signing, and its ages are wrong', async () => {
		const report = await readSince('2026-05-14T08:39:20+02:00', {})();
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)[0]!.because).toContain('shows {"ageMinutes":29');
	});

	test.each(['2026-05-14T08:40:01+02:00', '2026-05-14T07:39:59+02:00'])(
		'a sheet of %s is not what a signer of 08:40 was shown',
		async (shownAt) => {
			const report = await readSince('2026-05-14T08:40:00+02:00', { shownAt })();
			expect(report.class).toBe('TOTAL-FAILED');
			expect(bad(report)[0]!.because).toContain(`says that it was shown at ${shownAt}`);
		},
	);
});
