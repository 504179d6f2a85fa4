import { beforeAll, describe, expect, test } from 'vitest';
import type { Check, Report } from '../../src/lib/verify';
import { at, judge, makeSignedRecord } from '../support/signed-record';
import { makeTestSite, type TestSite } from '../support/test-site';

let site: TestSite;
beforeAll(async () => {
	site = await makeTestSite();
});

const bad = (report: Report): readonly Check[] => report.checks.filter(({ outcome }) => outcome !== 'passed');
const PASSES = 'passes follow from what was recorded';

describe('a pass that the recorded values do not carry', () => {
	test.each([
		[
			'above the limit',
			'8,2',
			'T-2 number 2 (entry on R1) says pass, but filter is 8,2 %; allowed is at most 8.0 %, guard 0.3 %.',
		],
		[
			'inside the limit and outside its guard',
			'7,71',
			'T-2 number 2 (entry on R1) says pass, but filter is 7,71 %; allowed is at most 8.0 %, guard 0.3 %.',
		],
	])('%s', async (_what, oxygen, because) => {
		const report = await judge(await makeSignedRecord({ oxygen }, site));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report).map((check) => check.because)).toEqual([because]);
	});

	test('exactly at the limit less its guard passes', async () => {
		expect((await judge(await makeSignedRecord({ oxygen: '7,7' }, site))).class).toBe('TOTAL-PASSED');
	});

	test('a value that is no number cannot be judged', async () => {
		const report = await judge(await makeSignedRecord({ oxygen: 'about 7' }, site));
		expect(report.class).toBe('INDETERMINATE');
		expect(bad(report).map(({ name }) => name)).toEqual([PASSES]);
	});

	test('a damper that was found as the table does not ask', async () => {
		const report = await judge(await makeSignedRecord({ damper: 'open' }, site));
		expect(bad(report).map((check) => check.because)).toEqual([
			'T-1 number 3 (entry on L1) says pass, but HV-2 was found "open"; required is "shut".',
		]);
	});

	test('a pass without the value, and a confirmation that confirms nothing', async () => {
		const bent = await makeSignedRecord(
			{
				more: async (tablets) => {
					const said = { person: 'TechA', device: 'T-1' };
					await tablets.say('entry', { step: 'R1', outcome: 'pass' }, { ...said, entered: at('08:37') });
					await tablets.say('entry', { step: 'C1', outcome: 'pass' }, { ...said, entered: at('08:38') });
				},
			},
			site,
		);
		expect(bad(await judge(bent)).map(({ facts }) => facts.because)).toEqual([
			'it holds no value for filter',
			'it does not confirm counted',
		]);
	});
});
