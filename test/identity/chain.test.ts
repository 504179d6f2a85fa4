import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import { utf8 } from '../../src/lib/base';
import { checkChain, fromPem, type ChainQuestion, type TrustList } from '../../src/lib/identity';
import { makeTestSite, testTrustList, value, type TestSigner, type TestSite } from '../support/test-site';

/** Certificates that OpenSSL made; see SOURCE.md beside them. */
const made = (name: string) =>
	value(fromPem(new Uint8Array(readFileSync(join(import.meta.dirname, `../vectors/chain/${name}.pem`)))));

/** Class, sub-indication, and the rules that did not pass. */
async function judge(question: ChainQuestion) {
	const answer = await checkChain(question);
	const broken = answer.findings
		.filter(({ outcome }) => outcome !== 'passed')
		.map(({ rule, outcome }) => `${rule}: ${outcome}`);
	return [answer.class, answer.sub, ...broken];
}

describe('[C4] chains made by OpenSSL', () => {
	const list: TrustList = {
		kind: 'trust list',
		v: 1,
		site: 'Invented Lime Works',
		sequence: 1,
		issued: '2030-01-01T00:00:00Z',
		nextUpdate: '2030-01-08T00:00:00Z',
		certificates: [],
		revocations: [],
	};
	const issuers = [
		made('crl-registrar'),
		made('narrow-registrar'),
		made('registrar'),
		made('second-registrar'),
		made('good'),
	];
	const ask = (name: string, root = 'root') =>
		judge({
			certificate: made(name),
			root: made(root),
			issuers,
			times: { claimed: '2030-01-02T00:00:00Z', now: '2030-02-01T00:00:00Z' },
			trustList: list,
		});

	test('a person directly under the root, and one under its registrar, are vouched for', async () => {
		expect(await ask('good')).toEqual(['TOTAL-PASSED', undefined]);
		expect(await ask('under-registrar')).toEqual(['TOTAL-PASSED', undefined]);
	});

	test('under a root with the same name and another key there is no chain', async () => {
		expect(await ask('good', 'false-root')).toEqual(['INDETERMINATE', 'NO_CERTIFICATE_CHAIN_FOUND', 'path: undecided']);
	});

	test('more issuers than the root allows are no chain', async () => {
		expect(await ask('under-second')).toEqual(['INDETERMINATE', 'NO_CERTIFICATE_CHAIN_FOUND', 'path: undecided']);
	});

	test.each(['by-a-person', 'under-crl', 'unknown-extension', 'encipherment', 'root', 'registrar'])(
		'%s: a certificate used for what it is not for fails its constraints',
		async (name) => {
			expect(await ask(name)).toEqual(['INDETERMINATE', 'CHAIN_CONSTRAINTS_FAILURE', 'constraints: failed']);
		},
	);

	test.each(['rsa-signer', 'p384-signer', 'sha1'])('%s: an algorithm that is not on the list fails', async (name) => {
		expect(await ask(name)).toEqual(['INDETERMINATE', 'CRYPTO_CONSTRAINTS_FAILURE', 'algorithms: failed']);
	});

	test('a registrar under a root that may not have registrars fails the constraints', async () => {
		expect(await ask('under-narrow', 'narrow-root')).toEqual([
			'INDETERMINATE',
			'CHAIN_CONSTRAINTS_FAILURE',
			'constraints: failed',
		]);
	});

	test('bytes that are no certificate leave nobody to vouch for', async () => {
		const times = { claimed: '2030-01-02T00:00:00Z', now: '2030-02-01T00:00:00Z' };
		const nobody = await judge({ certificate: utf8('no certificate'), root: made('root'), times });
		expect(nobody).toEqual(['INDETERMINATE', 'NO_SIGNING_CERTIFICATE_FOUND', 'certificate: undecided']);
		const noRoot = await judge({ certificate: made('good'), root: utf8('no root'), times, trustList: list });
		expect(noRoot).toEqual(['INDETERMINATE', 'NO_CERTIFICATE_CHAIN_FOUND', 'path: undecided']);
	});
});

describe('[C5] [C6] a person with a certificate from 1 February 2026 to 31 January 2028', () => {
	let site: TestSite;
	let ada: TestSigner;

	beforeAll(async () => {
		site = await makeTestSite();
		ada = await site.enrol({ person: 'P-01', printedName: 'Ada Example', roles: ['technician'] });
	});

	const SIGNED = '2026-05-14T17:21:40Z';
	const NOW = '2026-06-01T00:00:00Z';

	const ask = (times: Partial<ChainQuestion['times']>, more: Partial<ChainQuestion> = {}) =>
		judge({
			certificate: ada.certificate.der,
			root: site.root.certificate.der,
			times: { claimed: SIGNED, now: NOW, ...times },
			trustList: testTrustList(site),
			...more,
		});

	test('in its time and on no list of revocations: TOTAL-PASSED', async () => {
		expect(await ask({})).toEqual(['TOTAL-PASSED', undefined]);
	});

	test('claiming a time before the certificate: TOTAL-FAILED, NOT_YET_VALID', async () => {
		expect(await ask({ claimed: '2026-01-31T23:59:59Z' })).toEqual([
			'TOTAL-FAILED',
			'NOT_YET_VALID',
			'validity: failed',
		]);
		expect(await ask({ claimed: '2026-02-01T00:00:00Z' })).toEqual(['TOTAL-PASSED', undefined]);
	});

	test('proven to exist before the certificate did: TOTAL-FAILED, NOT_YET_VALID', async () => {
		expect(await ask({ provenBy: '2026-01-15T00:00:00Z' })).toEqual([
			'TOTAL-FAILED',
			'NOT_YET_VALID',
			'validity: failed',
		]);
	});

	test('claiming a time after the certificate, or proven to be from after it: TOTAL-FAILED, EXPIRED', async () => {
		const late = { now: '2028-06-01T00:00:00Z' };
		const trustList = testTrustList(site, { nextUpdate: '2028-05-01T00:00:00Z' });
		expect(await ask({ ...late, claimed: '2028-01-31T00:00:01Z' }, { trustList })).toEqual([
			'TOTAL-FAILED',
			'EXPIRED',
			'validity: failed',
		]);
		expect(await ask({ ...late, provenAfter: '2028-02-01T00:00:00Z' })).toEqual([
			'TOTAL-FAILED',
			'EXPIRED',
			'validity: failed',
		]);
	});

	test('judged after it expired, with no proof of time: undecided; with an archive receipt: TOTAL-PASSED', async () => {
		const later = { now: '2036-06-01T00:00:00Z' };
		expect(await ask(later)).toEqual(['INDETERMINATE', 'OUT_OF_BOUNDS_NOT_REVOKED', 'validity: undecided']);
		expect(await ask({ ...later, provenBy: '2026-05-20T00:00:00Z' })).toEqual(['TOTAL-PASSED', undefined]);
		const unknown = await ask(later, { trustList: undefined });
		expect(unknown).toEqual(['INDETERMINATE', 'OUT_OF_BOUNDS_NO_POE', 'validity: undecided', 'revocation: undecided']);
	});

	test('judged after the root itself expired, with no proof of time: undecided', async () => {
		const times = { now: '2042-06-01T00:00:00Z', provenBy: '2041-06-01T00:00:00Z' };
		expect(await ask(times)).toEqual(['INDETERMINATE', 'OUT_OF_BOUNDS_NOT_REVOKED', 'validity: undecided']);
	});

	test('with no trust list, or with one that had run out when it was signed: TRY_LATER', async () => {
		expect(await ask({}, { trustList: undefined })).toEqual(['INDETERMINATE', 'TRY_LATER', 'revocation: undecided']);
		const stale = testTrustList(site, { issued: '2026-05-01T00:00:00Z', nextUpdate: '2026-05-08T00:00:00Z' });
		expect(await ask({}, { trustList: stale })).toEqual(['INDETERMINATE', 'TRY_LATER', 'revocation: undecided']);
		const newer = testTrustList(site, {
			sequence: 2,
			issued: '2026-05-20T00:00:00Z',
			nextUpdate: '2026-05-27T00:00:00Z',
		});
		expect(await ask({}, { trustList: newer })).toEqual(['TOTAL-PASSED', undefined]);
	});

	const revoked = (at: string) =>
		testTrustList(site, { revocations: [{ certificate: ada.certificate.fingerprint, at, reason: 'device lost' }] });

	test('revoked before the time that it claims: TOTAL-FAILED, REVOKED', async () => {
		const trustList = revoked('2026-05-14T17:21:40Z');
		expect(await ask({}, { trustList })).toEqual(['TOTAL-FAILED', 'REVOKED', 'revocation: failed']);
	});

	test('revoked after the time that it claims, and nothing proves the claim: REVOKED_NO_POE', async () => {
		const trustList = revoked('2026-05-15T00:00:00Z');
		expect(await ask({}, { trustList })).toEqual(['INDETERMINATE', 'REVOKED_NO_POE', 'revocation: undecided']);
	});

	test('revoked, and proven to have signed before: TOTAL-PASSED; proven to have signed after: REVOKED', async () => {
		const trustList = revoked('2026-05-15T00:00:00Z');
		expect(await ask({ provenBy: '2026-05-14T22:00:00Z' }, { trustList })).toEqual(['TOTAL-PASSED', undefined]);
		expect(await ask({ provenBy: '2026-05-15T00:00:00Z' }, { trustList })).toEqual([
			'INDETERMINATE',
			'REVOKED_NO_POE',
			'revocation: undecided',
		]);
		expect(await ask({ provenAfter: '2026-05-16T00:00:00Z' }, { trustList })).toEqual([
			'TOTAL-FAILED',
			'REVOKED',
			'revocation: failed',
		]);
	});

	test('a time that has not come yet is not believed, beyond ten minutes of clock error', async () => {
		expect(await ask({ now: '2026-05-14T17:11:40Z' })).toEqual(['TOTAL-PASSED', undefined]);
		expect(await ask({ now: '2026-05-14T17:11:39Z' })).toEqual([
			'INDETERMINATE',
			'SIG_CONSTRAINTS_FAILURE',
			'claimed time: undecided',
		]);
	});

	test('another role, person or tablet than the act needs: SIG_CONSTRAINTS_FAILURE', async () => {
		for (const scope of [{ roles: ['QA'] as const }, { person: 'P-02' }, { device: 'T-2' }]) {
			expect(await ask({}, { scope })).toEqual(['INDETERMINATE', 'SIG_CONSTRAINTS_FAILURE', 'scope: failed']);
		}
		const scope = { roles: ['QA', 'technician'] as const, person: 'P-01', device: 'T-1' };
		expect(await ask({}, { scope })).toEqual(['TOTAL-PASSED', undefined]);
	});

	test('a certificate that was altered after the root signed it is a forgery, not an unknown', async () => {
		const forged = ada.certificate.der.slice();
		const at = Buffer.from(forged).indexOf('technician');
		forged.set(utf8('technicien'), at);
		const question = { certificate: forged, root: site.root.certificate.der, trustList: testTrustList(site) };
		const answer = await judge({ ...question, times: { claimed: SIGNED, now: NOW } });
		// The word is no role of ours, so nobody is named by it at all.
		expect(answer).toEqual(['INDETERMINATE', 'NO_SIGNING_CERTIFICATE_FOUND', 'certificate: undecided']);
		forged.set(utf8('technician'), at);
		forged.set(utf8('Eve'), Buffer.from(forged).indexOf('Ada'));
		expect(await judge({ ...question, certificate: forged, times: { claimed: SIGNED, now: NOW } })).toEqual([
			'TOTAL-FAILED',
			'SIG_CRYPTO_FAILURE',
			'path: failed',
		]);
	});
});
