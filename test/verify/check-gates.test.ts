import { beforeAll, describe, expect, test } from 'vitest';
import type { Check, Report } from '../../src/lib/verify';
import { at, judge, makeSignedRecord, type SignedRecord } from '../support/signed-record';
import { makeTestSite, type TestSite } from '../support/test-site';

let site: TestSite;
beforeAll(async () => {
	site = await makeTestSite();
});

const bad = (report: Report): readonly Check[] => report.checks.filter(({ outcome }) => outcome !== 'passed');
const bend = (bent: Parameters<typeof makeSignedRecord>[0]): Promise<SignedRecord> => makeSignedRecord(bent, site);

describe('acts that the rules do not allow', () => {
	test('a release by the performer of a step under the gate', async () => {
		const record = await bend({
			people: [{ person: 'Lead', roles: ['commissioning lead', 'shift supervisor'] }],
			more: async (tablets) => {
				await tablets.beginShift('SupA', 'T-1', at('08:37'));
				const rows = [{ row: 'HV-1', found: 'open', passes: true }];
				const said = { person: 'SupA', device: 'T-1', entered: at('08:38') };
				await tablets.say('entry', { step: 'L1', outcome: 'pass', rows }, said);
			},
		});
		const report = await judge(record);
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)).toContainEqual(
			expect.objectContaining({
				name: 'acts were allowed by the rules',
				sub: 'SIG_CONSTRAINTS_FAILURE',
				facts: expect.objectContaining({ device: 'T-1' }) as object,
			}),
		);
		expect(report.process.result).toBe('not met');
	});

	test('a release over a proof that never stood', async () => {
		const record = await bend({
			more: async (tablets) => {
				const said = { person: 'TechA', device: 'T-1', entered: at('08:38') };
				await tablets.say('entry', { step: 'K1', outcome: 'fail' }, said);
			},
		});
		const report = await judge(record);
		const gates = bad(report).filter(({ name }) => name === 'acts were allowed by the rules');
		expect(gates.map(({ facts }) => facts.number)).toEqual([7, 8]);
	});
});

test('an act by voice is kept, is not judged, and is not passed over', async () => {
	const record = await bend({
		more: async (tablets) => {
			const body = { gate: 1, caller: 'SupA', code: 'M4XQ-0TDR', callBack: 'telephone 17' };
			await tablets.say('gate released by voice', body, { person: 'TechA', device: 'T-1', entered: at('08:38') });
		},
	});
	const report = await judge(record);
	expect(report.class).toBe('INDETERMINATE');
	expect(bad(report).map(({ name }) => name)).toEqual(['acts by voice and on paper']);
	expect(report.process).toEqual({ result: 'met with concessions', because: ['gate 1 was released by voice'] });
});

describe('statements', () => {
	test('that call a step standing when it was not, or name another proof, or leave one out', async () => {
		const wrong = await bend({
			statement: (said) => ({
				...said,
				list: said.list
					.map((line) => (line.step === 'L1' ? { ...line, state: 'waits' } : line))
					.map((line) => (line.step === 'R1' ? { ...line, proof: '0'.repeat(64) } : line))
					.filter(({ step }) => step !== 'C1'),
			}),
		});
		const report = await judge(wrong);
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report).map(({ because }) => because)).toEqual([
			'T-1 number 6 (gate released, gate 1) says that L1 "waits"; it was "stands".',
			'T-1 number 7 (gate released, gate 2) names another proof of R1 than the one that counted.',
			'T-1 number 7 (gate released, gate 2) leaves out C1.',
		]);
	});

	test('whose value, count, other tablet or code of the words is not what was there', async () => {
		const wrong = await bend({
			stopAfter: 'gate 1',
			statement: (said) => ({
				...said,
				code: '0000-0000-0000-0000',
				list: said.list.map((line) => (line.step === 'K1' ? { ...line, value: 'adequate' } : line)),
				counts: { ...said.counts, tries: 7 },
				others: said.others.map((other) => ({ ...other, lastHeard: at('08:39') })),
			}),
		});
		const found = bad(await judge(wrong)).filter(({ name }) => name.startsWith('statements'));
		expect(found.map(({ because }) => /(code|shows|counts|other tablets)/.exec(because)?.[0])).toEqual([
			'code',
			'shows',
			'counts',
			'other tablets',
		]);
	});

	test('that are silent about an open deviation', async () => {
		const record = await bend({
			more: async (tablets) => {
				const body = { deviation: 'D-1', title: 'Paint is missing', blocks: 'nothing' } as const;
				await tablets.say('deviation raised', body, { person: 'TechA', device: 'T-1', entered: at('08:38') });
			},
			statement: (said) => ({ ...said, openDeviations: [] }),
		});
		const report = await judge(record);
		expect(bad(report).map(({ name, facts }) => [name, facts.number])).toEqual([
			['statements say what stood when they were signed', 7],
			['statements say what stood when they were signed', 8],
		]);
	});
});

describe('the seal', () => {
	test('that leaves a tablet out, or names an earlier event of it', async () => {
		const without = await bend({ seal: ({ 'T-2': _, ...heads }) => heads });
		expect(bad(await judge(without)).map(({ name, facts }) => [name, facts.device])).toEqual([
			['seal covers every chain', 'T-2'],
		]);
		const short = await bend({ seal: (heads) => ({ ...heads, 'T-1': { ...heads['T-1']!, number: 3 } }) });
		expect(bad(await judge(short)).map(({ name }) => name)).toContain('seal covers every chain');
	});

	test('of a technician is not allowed', async () => {
		const record = await bend({
			afterSeal: async (tablets) => {
				const said = { person: 'TechA', device: 'T-1', entered: at('09:05') };
				await tablets.say('sealed', { heads: {} }, said);
			},
		});
		const found = bad(await judge(record)).map(({ name }) => name);
		expect(found).toContain('signers had the right by their certificates');
		expect(found).toContain('record is sealed');
	});

	test('is followed by addenda; anything else that comes to light is shown and undecided', async () => {
		const addendum = await bend({
			afterSeal: async (tablets) => {
				await tablets.say('addendum', { text: 'A photo.' }, { person: 'QA', device: 'T-1', entered: at('09:10') });
			},
		});
		expect(await judge(addendum)).toMatchObject({ class: 'TOTAL-PASSED', process: { result: 'met' } });
		const late = await bend({
			afterSeal: async (tablets) => {
				await tablets.say('note', { text: 'Late.' }, { person: 'TechB', device: 'T-2', entered: at('09:10') });
			},
		});
		expect(await judge(late)).toMatchObject({ class: 'INDETERMINATE', process: { result: 'met' } });
	});
});

test('integrity and procedure are two answers: a start-up that was given up is whole, and not met', async () => {
	const record = await bend({ oxygen: '7.2', stopAfter: 'gate 1' });
	const sealed = await judge(record);
	expect(sealed.process).toEqual({ result: 'not met', because: ['gate 2 is ready', 'it is not sealed'] });
	expect(sealed.checked.failed).toBe(0);
});

test('a deviation that was accepted as it is makes a concession', async () => {
	const record = await bend({
		more: async (tablets) => {
			const raised = { deviation: 'D-1', title: 'Scale of PT-7 hard to read', blocks: 1 };
			await tablets.say('deviation raised', raised, { person: 'TechA', device: 'T-1', entered: at('08:37') });
			const disposed = { deviation: 'D-1', disposition: 'use as is', reason: 'read twice' } as const;
			await tablets.say('deviation dispositioned', disposed, { person: 'Lead', device: 'T-1', entered: at('08:38') });
		},
	});
	expect(await judge(record)).toMatchObject({
		class: 'TOTAL-PASSED',
		process: { result: 'met with concessions', because: ['deviation D-1 was accepted as it is'] },
	});
});
