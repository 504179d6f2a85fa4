import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { concat, toBase64, utf8 } from '../../src/lib/base';
import {
	enrolDevice,
	enrolPerson,
	fingerprintOf,
	fromPem,
	makeEntryKey,
	makeSiteRoot,
	openSiteRoot,
	readCertificate,
	readSiteRootFile,
	rootCertificate,
	toPem,
	webRandom,
	writeSiteRootFile,
	type OpenSiteRoot,
	type Role,
	type SiteRootFile,
} from '../../src/lib/identity';
import { ensureJudges } from '../support/judges.mjs';
import { value } from '../support/test-site';

const SITE = 'Invented Lime Works, Müllerfeld (demonstration)';
const PASSPHRASE = 'six words open an invented root';

let file: SiteRootFile;
let root: OpenSiteRoot;
let publicKey: string;
const folder = mkdtempSync(join(tmpdir(), 'gatehold-certificates-'));

beforeAll(async () => {
	ensureJudges();
	const how = { name: SITE, now: '2026-05-01T08:00:00+02:00', passphrase: PASSPHRASE, random: webRandom };
	file = value(await makeSiteRoot(how));
	root = value(await openSiteRoot(file, PASSPHRASE));
	({ publicKey } = await makeEntryKey());
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** What OpenSSL reads in the same bytes. */
function openssl(der: Uint8Array<ArrayBuffer>, ...args: readonly string[]): string {
	writeFileSync(join(folder, 'root.pem'), toPem(root.certificate.der));
	writeFileSync(join(folder, 'one.pem'), toPem(der));
	return execFileSync(
		'openssl',
		args.map((arg) => arg.replace('@', folder)),
		{ encoding: 'utf8' },
	);
}

const validity = { notBefore: '2026-05-02T00:00:00Z', notAfter: '2028-05-02T00:00:00Z' };
const technician = ['technician'] as const;

const enrol = (
	change: {
		person?: string;
		printedName?: string;
		roles?: readonly Role[];
		device?: string;
		publicKey?: string;
		validity?: typeof validity;
	} = {},
) =>
	enrolPerson(root, {
		person: 'P-01',
		printedName: 'Ada Example, jun.',
		roles: technician,
		device: 'T-1',
		publicKey,
		validity,
		random: webRandom,
		...change,
	});

test('[C1] a site root is a certificate authority for fifteen years, as OpenSSL reads it', () => {
	const { certificate } = root;
	expect(certificate.subject).toEqual({ kind: 'authority', name: SITE });
	expect([certificate.notBefore, certificate.notAfter]).toEqual(['2026-05-01T06:00:00Z', '2041-05-01T06:00:00Z']);
	const text = openssl(certificate.der, 'x509', '-in', '@/one.pem', '-noout', '-text');
	expect(text).toMatch(/X509v3 Basic Constraints: critical\s+CA:TRUE, pathlen:1\n/);
	expect(text).toMatch(/X509v3 Key Usage: critical\s+Certificate Sign, CRL Sign\n/);
	expect(text).toMatch(/ASN1 OID: prime256v1/);
	const keyId = /X509v3 Subject Key Identifier:\s+(\S+)/.exec(text)![1]!;
	expect(text).toMatch(new RegExp(`X509v3 Authority Key Identifier:\\s+${keyId}`));
});

test('a site root opens with its passphrase alone, and its certificate without one', async () => {
	expect(await openSiteRoot(file, 'six words open another invented root')).toEqual({
		ok: false,
		error: { kind: 'wrong-secret' },
	});
	expect(value(rootCertificate(file)).der).toEqual(root.certificate.der);
});

test('a site root goes through its file, and a damaged file says where', () => {
	const bytes = writeSiteRootFile(file);
	expect(readSiteRootFile(bytes)).toEqual({ ok: true, value: file });
	const text = new TextDecoder().decode(bytes);
	const placeOf = (damaged: Uint8Array) => {
		const read = readSiteRootFile(damaged);
		return read.ok ? undefined : [read.error.kind, 'at' in read.error ? read.error.at : ''];
	};
	expect(placeOf(utf8(text.slice(0, -1)))).toEqual(['unreadable-file', `character ${text.length - 1}`]);
	expect(placeOf(utf8(text.replace('"iterations":600000', '"iterations":"many"')))).toEqual([
		'unreadable-file',
		'key.iterations',
	]);
	expect(placeOf(utf8(text.replace('{', '{"extra":1,')))).toEqual(['unreadable-file', 'extra']);
	expect(placeOf(Uint8Array.of(0xff))).toEqual(['unreadable-file', 'its encoding']);
});

test('a key and a certificate that do not belong together open nothing', async () => {
	const how = { name: SITE, now: '2026-05-01T08:00:00Z', passphrase: PASSPHRASE, random: webRandom };
	const other = value(await makeSiteRoot(how));
	const mixed = await openSiteRoot({ ...file, certificate: other.certificate }, PASSPHRASE);
	expect(mixed).toEqual({ ok: false, error: { kind: 'not-a-site-root', at: 'key.of.publicKey' } });
});

test('a root with a short passphrase, another length of life or a hidden character in its name is not made', async () => {
	const how = { name: SITE, now: '2026-05-01T08:00:00Z', passphrase: PASSPHRASE, random: webRandom };
	expect(await makeSiteRoot({ ...how, passphrase: 'five words are not enough' })).toMatchObject({
		error: { kind: 'short-passphrase', words: 5 },
	});
	expect(await makeSiteRoot({ ...how, years: 9 })).toMatchObject({
		error: { kind: 'validity-out-of-range', min: 10, max: 15 },
	});
	expect(await makeSiteRoot({ ...how, name: 'Lime\u200DWorks' })).toMatchObject({
		error: { kind: 'forbidden-character' },
	});
});

test('[C2] the certificate of a person names them, their roles and their tablet in words that any viewer shows', async () => {
	const certificate = value(await enrol({ roles: ['shift supervisor', 'QA'] }));
	expect(certificate.subject).toEqual({
		kind: 'person',
		person: 'P-01',
		printedName: 'Ada Example, jun.',
		roles: ['shift supervisor', 'QA'],
		device: 'T-1',
		site: SITE,
	});
	// This form of OpenSSL shows commas as they are.
	const subject = openssl(
		certificate.der,
		'x509',
		'-in',
		'@/one.pem',
		'-noout',
		'-subject',
		'-nameopt',
		'utf8,sep_comma_plus',
	);
	expect(subject).toBe(`subject=CN=Ada Example, jun.,UID=P-01,title=shift supervisor,title=QA,host=T-1,O=${SITE}\n`);
});

test('OpenSSL follows the chain of a person to the root, for signing', async () => {
	const { der } = value(await enrol());
	const at = String(Date.parse('2026-06-01T00:00:00Z') / 1000);
	expect(
		openssl(
			der,
			'verify',
			'-attime',
			at,
			'-x509_strict',
			'-purpose',
			'smimesign',
			'-CAfile',
			'@/root.pem',
			'@/one.pem',
		),
	).toMatch(/: OK\n$/);
	const text = openssl(der, 'x509', '-in', '@/one.pem', '-noout', '-text');
	expect(text).toMatch(/X509v3 Basic Constraints: critical\s+CA:FALSE/);
	expect(text).toMatch(/X509v3 Key Usage: critical\s+Digital Signature, Non Repudiation\n/);
	expect(text).toMatch(/X509v3 Extended Key Usage: \n\s+E-mail Protection, 1\.3\.6\.1\.5\.5\.7\.3\.36\n/);
	expect(text).toMatch(/X509v3 Subject Key Identifier/);
	expect(text).toMatch(/X509v3 Authority Key Identifier/);
});

test('[C3] a tablet has a certificate of its own, without a person and without a purpose beyond signing', async () => {
	const device = { device: 'T-1', label: 'Tablet 1, mill', publicKey, validity, random: webRandom };
	const certificate = value(await enrolDevice(root, device));
	expect(certificate.subject).toEqual({ kind: 'device', device: 'T-1', label: 'Tablet 1, mill', site: SITE });
	expect(openssl(certificate.der, 'x509', '-in', '@/one.pem', '-noout', '-text')).not.toContain('Extended Key Usage');
});

test('[C2] a certificate lives two years at most, and not outside the life of its root', async () => {
	const bad = (expected: string) => ({ ok: false, error: { kind: 'bad-validity', expected } });
	const from = (notBefore: string, notAfter: string) => enrol({ validity: { notBefore, notAfter } });
	expect(await from('2026-05-02T00:00:00Z', '2028-05-02T00:00:01Z')).toEqual(bad('at most 2 years'));
	expect(await from('2026-05-02T00:00:00Z', '2026-05-02T00:00:00Z')).toEqual(bad('an end after the beginning'));
	expect(await from('2026-04-30T00:00:00Z', '2027-04-30T00:00:00Z')).toEqual(
		bad('not before the site root, 2026-05-01T06:00:00Z'),
	);
	expect(await from('2040-05-02T00:00:00Z', '2041-05-02T00:00:00Z')).toEqual(
		bad('not after the site root, 2041-05-01T06:00:00Z'),
	);
});

test('an enrolment without a usable id, name, role or key is refused by its field', async () => {
	expect(await enrol({ person: 'P 01' })).toMatchObject({ error: { kind: 'malformed-id', field: 'person' } });
	expect(await enrol({ device: '' })).toMatchObject({ error: { kind: 'malformed-id', field: 'device' } });
	expect(await enrol({ printedName: 'Adа Example' })).toMatchObject({ error: { kind: 'mixed-scripts' } });
	expect(await enrol({ roles: [] })).toMatchObject({ error: { kind: 'no-role' } });
	expect(await enrol({ publicKey: toBase64(utf8('no key')) })).toMatchObject({ error: { kind: 'malformed-key' } });
});

test('a certificate goes through PEM, and its fingerprint is the one that OpenSSL prints', async () => {
	const { der, fingerprint } = value(await enrol());
	expect(value(fromPem(utf8(toPem(der))))).toEqual(der);
	expect(value(fromPem(der))).toEqual(der);
	const printed = openssl(der, 'x509', '-in', '@/one.pem', '-noout', '-fingerprint', '-sha256');
	expect(printed.replace(/^.*=/, '').replaceAll(':', '').trim().toLowerCase()).toBe(fingerprint);
	expect(fingerprintOf(der)).toBe(fingerprint);
});

test('bytes that are no certificate, or one with more behind it, are refused', async () => {
	const { der } = value(await enrol());
	expect(readCertificate(utf8('-----'))).toMatchObject({ error: { kind: 'not-a-certificate' } });
	expect(readCertificate(new Uint8Array())).toMatchObject({ error: { kind: 'not-a-certificate' } });
	expect(readCertificate(concat(der, Uint8Array.of(0)))).toMatchObject({ error: { kind: 'not-a-certificate' } });
	expect(fromPem(utf8('-----BEGIN CERTIFICATE-----\n?\n-----END CERTIFICATE-----'))).toMatchObject({
		error: { kind: 'not-a-certificate' },
	});
});
