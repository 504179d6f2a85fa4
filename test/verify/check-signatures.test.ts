import { beforeAll, describe, expect, test } from 'vitest';
import { utf8 } from '../../src/lib/base';
import { sign, signTrustList } from '../../src/lib/identity';
import { fromChecked, printEventLine, textOf, type RecordEvent } from '../../src/lib/record';
import type { Check, Report } from '../../src/lib/verify';
import { at, judge, makeSignedRecord, START_UP, type SignedRecord } from '../support/signed-record';
import { makeTestSite, testTrustList } from '../support/test-site';

let record: SignedRecord;
beforeAll(async () => {
	record = await makeSignedRecord();
});

const bad = (report: Report): readonly Check[] => report.checks.filter(({ outcome }) => outcome !== 'passed');
const SIGNED = 'events are signed by the key that they name';

const indexOf = (device: string, number: number): number =>
	record.events.findIndex((event) => event.log === START_UP && event.device === device && event.number === number);

/** The same lines, with the signature of one event replaced. */
function withSignature(index: number, signature: string | undefined): readonly string[] {
	const { signature: _, ...bare } = record.events[index]!;
	const event = { ...bare, ...(signature === undefined ? {} : { signature }) } as RecordEvent;
	return record.lines.with(index, printEventLine(event));
}

describe('signatures', () => {
	test('stripped: the event is unsigned, and that fails', async () => {
		const report = await judge(record, withSignature(indexOf('T-1', 6), undefined));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report)).toEqual([
			expect.objectContaining({
				name: SIGNED,
				outcome: 'failed',
				sub: 'SIGNED_DATA_NOT_FOUND',
				facts: expect.objectContaining({ device: 'T-1', number: 6, because: 'unsigned' }) as object,
			}),
		]);
	});

	test('moved from another event of the same person: it is not over this one', async () => {
		const [from, to] = [indexOf('T-1', 3), indexOf('T-1', 4)];
		const report = await judge(record, withSignature(to, record.events[from]!.signature));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(report.sub).toBe('SIG_CRYPTO_FAILURE');
		expect(bad(report).map(({ name, sub, facts }) => [name, sub, facts.number])).toEqual([
			[SIGNED, 'SIG_CRYPTO_FAILURE', 4],
		]);
	});

	test('made by another person over the very same bytes: the key is not the one that the event names', async () => {
		const gate = indexOf('T-1', 6);
		const forged = await sign(utf8(record.events[gate]!.text), record.tablets.signers.get('Lead T-1')!.key);
		const report = await judge(record, withSignature(gate, forged));
		expect(report.sub).toBe('SIG_CRYPTO_FAILURE');
	});

	test.each([
		['not base64', '?'],
		['too short', 'AAAA'],
		['padded with other bits than base64 writes', 'B=='],
	])('%s: no signature', async (_what, tail) => {
		const gate = indexOf('T-1', 6);
		const good = record.events[gate]!.signature!;
		const signature = tail.length === 3 ? nextSpelling(good) : tail;
		const report = await judge(record, withSignature(gate, signature));
		expect(report.class).toBe('TOTAL-FAILED');
		expect(report.sub).toBe('FORMAT_FAILURE');
	});

	test('the other valid signature of the same bytes (r, n - s) is no second event', async () => {
		const gate = indexOf('T-1', 6);
		const report = await judge(record, withSignature(gate, twin(record.events[gate]!.signature!)));
		expect(report.class).toBe('TOTAL-PASSED');
		const twice = record.lines.toSpliced(gate, 0, withSignature(gate, twin(record.events[gate]!.signature!))[gate]!);
		expect(bad(await judge(record, twice)).map(({ name }) => name)).toEqual(['every event stands once']);
	});

	test('an unsigned history is no record, however well it hangs together', async () => {
		const bare = record.events.map(({ text }) => JSON.stringify({ text }));
		const report = await judge(record, bare);
		expect(report.class).toBe('TOTAL-FAILED');
		expect(bad(report).filter(({ name }) => name === SIGNED)).toHaveLength(record.lines.length);
	});

	test('an event under a name that its certificate does not carry', async () => {
		const forged = await resigned(indexOf('T-1', 6), 'Lead T-1', { person: 'SupA' }, 'Lead T-1');
		const found = bad(await judge(record, forged));
		expect(found).toContainEqual(
			expect.objectContaining({
				name: 'signers are who the events say',
				sub: 'SIG_CONSTRAINTS_FAILURE',
				facts: expect.objectContaining({ person: 'SupA', certified: 'Lead' }) as object,
			}),
		);
	});
});

/** One event changed and signed again by somebody who holds a key: the forgery of an insider. */
async function resigned(
	index: number,
	by: string,
	change: Partial<RecordEvent>,
	certificateOf = by,
	of = record,
): Promise<readonly string[]> {
	const {
		id: _i,
		text: _t,
		signature: _s,
		enteredAt: _e,
		observedAt: _o,
		received: _r,
		...envelope
	} = of.events[index]!;
	const certificate = of.tablets.signers.get(certificateOf)!.certificate.fingerprint;
	const changed = { ...envelope, certificate, ...change } as unknown as Parameters<typeof textOf>[0];
	const text = textOf(changed);
	const signature = await sign(utf8(text), of.tablets.signers.get(by)!.key);
	return of.lines.with(index, printEventLine(fromChecked(text, changed, { signature })));
}

/** The same 64 bytes, spelled with other padding bits. */
function nextSpelling(base64: string): string {
	const letters = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';
	const last = letters.indexOf(base64.at(-3)!);
	return `${base64.slice(0, -3)}${letters[last + 1]!}==`;
}

function twin(base64: string): string {
	const bytes = Buffer.from(base64, 'base64');
	// SEC 2, section 2.4.2: order n of secp256r1.
	const n = 0xffffffff00000000ffffffffffffffffbce6faada7179e84f3b9cac2fc632551n;
	const s = n - BigInt(`0x${bytes.subarray(32).toString('hex')}`);
	return Buffer.concat([bytes.subarray(0, 32), Buffer.from(s.toString(16).padStart(64, '0'), 'hex')]).toString(
		'base64',
	);
}

describe('keys of a shift', () => {
	test('do not release a gate', async () => {
		const bent = await makeSignedRecord(
			{
				more: (tablets) => tablets.beginShift('SupA', 'T-1', at('08:38')).then(() => undefined),
				release: { person: 'SupA', with: 'shift key' },
			},
			record.site,
		);
		expect(bad(await judge(bent))).toContainEqual(
			expect.objectContaining({
				name: SIGNED,
				sub: 'SIG_CONSTRAINTS_FAILURE',
				facts: expect.objectContaining({ because: 'needs-gate-key' }) as object,
			}),
		);
	});

	test.each([
		['longer than twelve hours', 13, at('08:39'), 'shift-too-long'],
		['after it ran out', 1, at('09:45'), 'outside-shift'],
	])('%s: its entries do not count as signed', async (_what, hours, entered, because) => {
		const bent = await makeSignedRecord(
			{
				stopAfter: 'entries',
				more: async (tablets) => {
					await tablets.beginShift('SupA', 'T-1', at('08:38'), hours);
					await tablets.say('note', { text: 'A note.' }, { person: 'SupA', device: 'T-1', entered });
				},
			},
			record.site,
		);
		expect(bad(await judge(bent)).map(({ facts }) => facts.because)).toContain(because);
	});

	test('do not sign what came before them on their tablet', async () => {
		const twice = await makeSignedRecord(
			{
				stopAfter: 'entries',
				more: (tablets) => tablets.beginShift('TechB', 'T-2', at('08:30')).then(() => undefined),
			},
			record.site,
		);
		const { certificate } = twice.tablets.signers.get('TechB T-2')!;
		const later = twice.tablets.held('T-2').at(-1)!;
		const entry = twice.events.findIndex(
			({ device, number, log }) => log === START_UP && device === 'T-2' && number === 2,
		);
		const lines = await resigned(entry, 'TechB T-2', { shiftKey: later.id }, 'TechB T-2', twice);
		expect(certificate.fingerprint).toBe(later.certificate);
		const all = [...lines, printEventLine(later)];
		expect(bad(await judge(twice, all)).map(({ facts }) => facts.because)).toContain('shift-key-comes-later');
	});

	test('of another person or another tablet do not sign', async () => {
		const note = indexOf('T-2', 2);
		const { shiftKey } = record.events[indexOf('T-1', 3)]!;
		const lines = await resigned(note, 'TechB T-2', { shiftKey: shiftKey! });
		expect(bad(await judge(record, lines)).map(({ facts }) => facts.because)).toContain(
			'shift-key-of-another-certificate',
		);
	});
});

describe('roles', () => {
	test('a release by somebody whom the record calls a supervisor and the certificate a technician', async () => {
		const bent = await makeSignedRecord(
			{
				people: [
					{ person: 'TechA', roles: ['technician', 'shift supervisor'] },
					...['TechB', 'SupA', 'Lead', 'QA'].map((person) => ({ person, roles: ['commissioning lead'] })),
				],
				release: { person: 'TechA' },
			},
			record.site,
		);
		const report = await judge(bent);
		expect(report).toMatchObject({ class: 'TOTAL-FAILED' });
		const names = bad(report).map(({ name }) => name);
		expect(names).toContain('signers had the right by their certificates');
		expect(names).toContain('roles in the record are certified');
		// TechA performed the steps under the gate as well.
		expect(names).toContain('acts were allowed by the rules');
	});

	test('a supervisor who enters a step that asks for a technician', async () => {
		const bent = await makeSignedRecord(
			{
				more: async (tablets) => {
					await tablets.beginShift('SupA', 'T-1', at('08:37'));
					const values = [{ field: 'filter', typed: '7.0', unit: '%' }];
					const said = { person: 'SupA', device: 'T-1', entered: at('08:38') };
					await tablets.say('entry', { step: 'R1', outcome: 'pass', values }, said);
				},
			},
			record.site,
		);
		expect(bad(await judge(bent))).toEqual([
			expect.objectContaining({
				name: 'steps were performed by the roles that they ask for',
				sub: 'SIG_CONSTRAINTS_FAILURE',
			}),
		]);
	});
});

describe('trust', () => {
	test('no root given: the record agrees with itself, and nobody says whose it is', async () => {
		const report = await judge(record, record.lines, { root: undefined });
		expect(report).toMatchObject({ class: 'INDETERMINATE', sub: 'NO_CERTIFICATE_CHAIN_FOUND' });
		const brought = await judge(record, record.lines, {
			root: undefined,
			rootInFile: record.site.root.certificate.der,
		});
		expect(brought).toMatchObject({ class: 'INDETERMINATE', sub: 'NO_CERTIFICATE_CHAIN_FOUND' });
		expect(bad(brought).map(({ name }) => name)).toEqual(['trust is anchored in a root that the judge knows']);
	});

	test('another root with the very same name vouches for nobody', async () => {
		const stranger = await makeTestSite();
		const report = await judge(record, record.lines, { root: stranger.root.certificate.der });
		expect(report).toMatchObject({ class: 'INDETERMINATE', sub: 'NO_CERTIFICATE_CHAIN_FOUND' });
		expect(bad(report).some(({ name }) => name.endsWith('site root vouches for the signer'))).toBe(true);
	});

	test('a certificate that is nowhere: who signed cannot be told', async () => {
		const withoutSiteLog = record.lines.filter((_, i) => record.events[i]!.log === START_UP);
		const report = await judge(record, withoutSiteLog);
		expect(report).toMatchObject({ class: 'INDETERMINATE', sub: 'NO_SIGNING_CERTIFICATE_FOUND' });
	});

	test('a certificate revoked before it signed: its events are named', async () => {
		const certificate = record.tablets.signers.get('SupA T-1')!.certificate.fingerprint;
		const revocations = [{ certificate, at: at('07:00'), reason: 'device lost' as const }];
		const list = testTrustList(record.site, { sequence: 2, issued: '2026-05-14T08:00:00Z', revocations });
		const report = await judge(record, record.lines, { trustLists: [await signTrustList(list, record.site.root.key)] });
		expect(report).toMatchObject({ class: 'TOTAL-FAILED', sub: 'REVOKED' });
		const [revoked] = bad(report);
		expect(revoked?.because).toContain('T-1 number 6 (gate released, gate 1)');
	});

	test('a certificate that was not yet good when its holder began: the early events are named, the later are not', async () => {
		const early = await makeSignedRecord({ validFrom: { TechA: '2026-05-14T06:05:00Z' } }, record.site);
		const report = await judge(early);
		expect(report).toMatchObject({ class: 'TOTAL-FAILED', sub: 'NOT_YET_VALID' });
		expect(bad(report)).toHaveLength(1);
		expect(bad(report)[0]?.because).toContain('It is about T-1 number 2 (shift key).');
	});

	test('a trust list that the root did not sign is no trust list', async () => {
		const list = testTrustList(record.site, { sequence: 9 });
		const forged = await signTrustList(list, record.tablets.signers.get('Lead T-1')!.key);
		const report = await judge(record, record.lines, { trustLists: [forged] });
		expect(bad(report).map(({ name }) => name)).toEqual(['trust lists are signed by the root']);
	});

	test('long after the certificates ran out, without a proof of time: no longer certain', async () => {
		const report = await judge(record, record.lines, { now: '2031-01-01T00:00:00Z' });
		expect(report).toMatchObject({ class: 'INDETERMINATE', sub: 'OUT_OF_BOUNDS_NOT_REVOKED' });
		const proven = await judge(record, record.lines, { now: '2031-01-01T00:00:00Z', provenBy: '2026-06-01T00:00:00Z' });
		expect(proven.class).toBe('TOTAL-PASSED');
	});
});
