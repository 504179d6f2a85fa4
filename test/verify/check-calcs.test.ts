import { beforeAll, describe, expect, test } from 'vitest';
import { canonicalJson, sha256Hex, utf8 } from '../../src/lib/base';
import { runCalculator } from '../../src/lib/calc';
import type { Check, Report } from '../../src/lib/verify';
import { at, judge, makeSignedRecord } from '../support/signed-record';
import { PURGE_INPUTS } from '../support/small-procedure';
import { makeTestSite, type TestSite } from '../support/test-site';

let site: TestSite;
beforeAll(async () => {
	site = await makeTestSite();
});

const bad = (report: Report): readonly Check[] => report.checks.filter(({ outcome }) => outcome !== 'passed');
const AGAIN = 'calculations come out again as they are stored';

type Stored = { [name: string]: unknown };
const calculated = async (calculation: (stored: Stored) => Stored): Promise<readonly Check[]> =>
	bad(await judge(await makeSignedRecord({ calculation }, site)));

describe('a stored calculation', () => {
	test('whose result was embellished before it was signed', async () => {
		const found = await calculated((stored) => ({
			...stored,
			values: { ...(stored.values as object), timeByMixing: { value: 1200, unit: 's' } },
		}));
		expect(found.map(({ name, outcome, facts }) => [name, outcome, facts.at])).toEqual([
			[AGAIN, 'failed', 'values.timeByMixing.value'],
		]);
	});

	test('whose inputs were changed and the result kept', async () => {
		const found = await calculated((stored) => ({
			...stored,
			inputs: { ...(stored.inputs as object), mixing: 0.5 },
		}));
		expect(found.map(({ name, outcome }) => [name, outcome])).toEqual([[AGAIN, 'failed']]);
	});

	test('whose inputs no calculator would take', async () => {
		const found = await calculated((stored) => ({ ...stored, inputs: { volumes: [] } }));
		expect(found).toContainEqual(expect.objectContaining({ name: AGAIN, outcome: 'failed' }));
	});

	test('that is right, of a flow that the procedure does not bind it to', async () => {
		const inertFlow = { value: 5000, unit: 'm3(n)/h' };
		const other = runCalculator('sweep-purge@1', { ...PURGE_INPUTS, inertFlow });
		const found = await calculated(() => JSON.parse(JSON.stringify(other.ok ? other.value : {})) as Stored);
		expect(found.map(({ because }) => because)).toEqual([
			'T-1 number 4 (entry on K1) took another inertFlow than the record held.',
		]);
	});

	test('that is right, with a mixing factor that somebody typed', async () => {
		const other = runCalculator('sweep-purge@1', { ...PURGE_INPUTS, mixing: 0.9 });
		expect(await calculated(() => JSON.parse(JSON.stringify(other.ok ? other.value : {})) as Stored)).toEqual([]);
	});

	test('by a version that is not known here: undecided, not failed', async () => {
		const found = await calculated((stored) => ({ ...stored, calc: 'sweep-purge@77' }));
		expect(found.find(({ name }) => name === AGAIN)?.outcome).toBe('undecided');
	});

	test('with a word that the calculator does not say', async () => {
		const found = await calculated((stored) => ({ ...stored, scope: 'in scope', notes: [] }));
		const kept = await calculated((stored) => stored);
		expect(kept).toEqual([]);
		expect(found.map(({ name }) => name)).toEqual([AGAIN]);
	});
});

describe('documents and attachments', () => {
	const photo = utf8('an invented photo');
	const attachment = { hash: sha256Hex(photo), name: 'photo-1.jpg', mediaType: 'image/jpeg', bytes: photo.length };
	const withPhoto = () =>
		makeSignedRecord(
			{
				more: async (tablets) => {
					const body = { text: 'Seen.', attachments: [attachment] };
					await tablets.say('note', body, { person: 'TechA', device: 'T-1', entered: at('08:38') });
				},
			},
			site,
		);

	test('an attachment that is here, is not here, or is another one under its name', async () => {
		const record = await withPhoto();
		const beside = (name: string, bytes: Uint8Array<ArrayBuffer>) =>
			judge(record, record.lines, { attachments: [{ name, bytes }] });
		expect((await beside('anything', photo)).class).toBe('TOTAL-PASSED');
		expect(await judge(record)).toMatchObject({ class: 'INDETERMINATE', sub: 'SIGNED_DATA_NOT_FOUND' });
		expect(await beside('photo-1.jpg', utf8('another photo'))).toMatchObject({
			class: 'TOTAL-FAILED',
			sub: 'HASH_FAILURE',
		});
	});

	test('an attachment that is not as long as its event says', async () => {
		const record = await makeSignedRecord(
			{
				more: async (tablets) => {
					const body = { text: 'Seen.', attachments: [{ ...attachment, bytes: 5 }] };
					await tablets.say('note', body, { person: 'TechA', device: 'T-1', entered: at('08:38') });
				},
			},
			site,
		);
		const report = await judge(record, record.lines, { attachments: [{ name: 'photo-1.jpg', bytes: photo }] });
		expect(bad(report).map(({ because }) => because)).toEqual([
			'photo-1.jpg of T-1 number 6 (note) has 17 bytes; the event says 5.',
		]);
	});

	test('a procedure inside that is not the one pinned', async () => {
		const record = await makeSignedRecord(
			{ opening: (body) => ({ ...body, procedure: { ...body.procedure, hash: sha256Hex(canonicalJson({})) } }) },
			site,
		);
		const report = await judge(record);
		expect(report).toMatchObject({ class: 'TOTAL-FAILED', sub: 'HASH_FAILURE' });
		expect(bad(report).map(({ name }) => name)).toEqual(['procedure is the one that was pinned']);
	});

	test('a record without its procedure: gates cannot be played again, and that is said', async () => {
		const record = await makeSignedRecord({ opening: ({ documents: _, ...body }) => body }, site);
		const report = await judge(record);
		expect(report).toMatchObject({ class: 'INDETERMINATE', process: { result: 'not judged' } });
	});
});
