import { execFileSync } from 'node:child_process';
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import { BUILD } from '../../src/lib/demo';
import { buildDossier, rebuildDossier } from '../../src/lib/dossier';
import { verifyDossier } from '../../src/lib/verify';
import { nightInput } from '../support/night-dossier';
import { makeSignedDossier } from '../support/signed-dossier';
import { makeSignedRecord } from '../support/signed-record';
import { value } from '../support/test-site';

test('a dossier in German is written again in German, and passes every check', async () => {
	const record = await makeSignedRecord();
	const pdf = await makeSignedDossier(record, { language: 'de' });
	const report = await verifyDossier(pdf, {
		root: record.site.root.certificate.der,
		now: '2026-05-14T12:00:00+02:00',
		rebuild: { writer: BUILD, build: rebuildDossier },
	});
	expect(report.checks.filter(({ outcome }) => outcome !== 'passed')).toEqual([]);
	expect(report.class).toBe('TOTAL-PASSED');
}, 60_000);

describe('the dossier of the night in German', () => {
	let words = '';

	beforeAll(async () => {
		const file = join(mkdtempSync(join(tmpdir(), 'dossier-')), 'night.pdf');
		writeFileSync(file, value(await buildDossier({ ...(await nightInput()), language: 'de' })));
		words = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8', maxBuffer: 1e8 });
	}, 120_000);

	test('speaks German on its sheets, with German dates and decimal commas', () => {
		for (const said of ['Haltepunkte', 'Anlagenereignisse', 'Schichtleiter', 'Wie diese Datei geprüft wird'])
			expect(words).toContain(said);
		expect(words).toMatch(/\d{1,2}\.\s(?:März|Mai|Dezember) 2026/);
		expect(words).toMatch(/Stickstoff und Kohlendioxid ersticken ohne Warnung/);
	});

	test('says what a person typed as it was typed, and a signed sentence in the language in which it was signed', () => {
		expect(words).toContain('I release gate 0, Authority and area.');
		expect(words).toContain('seen at the plant');
	});
});
