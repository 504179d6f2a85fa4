import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { beforeAll, describe, expect, test } from 'vitest';
import { buildDossier, type DossierInput } from '../../src/lib/dossier';
import { sha256Hex } from '../../src/lib/base';
import { allOf, parseEventLine, type RecordEvent } from '../../src/lib/record';
import { findVeraPdf } from '../support/judges.mjs';
import { nightInput, PLANT } from '../support/night-dossier';
import { value } from '../support/test-site';

const folder = mkdtempSync(join(tmpdir(), 'dossier-'));
const file = join(folder, 'night.pdf');
const run = (program: string, ...args: readonly string[]): string =>
	execFileSync(program, args, { encoding: 'utf8', maxBuffer: 1e8 });

let input: DossierInput;
let events: readonly RecordEvent[];
let pdf: Uint8Array;
/** Words of the whole dossier, in reading order, every blank one space. */
let words: string;

beforeAll(async () => {
	input = await nightInput();
	events = input.lines.map((line) => value(parseEventLine(line)));
	pdf = value(await buildDossier(input));
	writeFileSync(file, pdf);
	words = run('pdftotext', '-raw', file, '-').replace(/\s+/g, ' ');
}, 120_000);

/** Text as it is searched: blanks do not matter, since lines break in columns. */
const without = (text: string): string => text.replace(/[\s\u00a0]+/g, '');

describe('[D1] the file', () => {
	test('written again from the same record it is the same to the last byte', async () => {
		expect(sha256Hex(value(await buildDossier(input)))).toBe(sha256Hex(pdf));
	});

	test('the order in which certificates and files are handed in has no say in the bytes', async () => {
		const more = [...input.files, { name: 'b.csv', mediaType: 'text/csv', bytes: new Uint8Array([1, 2]) }];
		const one = value(await buildDossier({ ...input, files: more, certificates: [input.root] }));
		const other = value(
			await buildDossier({ ...input, files: [...more].reverse(), certificates: [input.root, input.root] }),
		);
		expect(sha256Hex(other)).toBe(sha256Hex(one));
	});

	test('qpdf finds nothing to say about it', () => {
		expect(run('qpdf', '--check', file)).toContain('No syntax or stream encoding errors found');
	});

	test('every font is embedded, with a map to Unicode', () => {
		const rows = run('pdffonts', file).trim().split('\n').slice(2);
		expect(rows).toHaveLength(4);
		for (const row of rows) expect(row).toMatch(/^GATEHD\+\S+\s+CID TrueType\s+Identity-H\s+yes yes yes/);
	});

	test('the cross-references are classic, and no object stream hides an object', () => {
		const text = new TextDecoder('latin1').decode(pdf);
		expect(text).toMatch(/^%PDF-1\.7/);
		expect(text).toMatch(/\nxref\n0 \d+\n/);
		expect(text).not.toContain('/ObjStm');
	});

	test.skipIf(findVeraPdf() === undefined)('veraPDF passes it as PDF/A-3b', () => {
		const [java = '', ...args] = findVeraPdf() ?? [];
		expect(run(java, ...args, '--flavour', '3b', '--format', 'text', file)).toMatch(/^PASS/m);
	});
});

describe('[D2] what travels inside', () => {
	const attachment = (name: string): string => run('qpdf', `--show-attachment=${name}`, file);

	test('the record is there line by line as it was stored, and the manifest names it by its hash', () => {
		const record = attachment('record.ndjson');
		expect(record.trimEnd().split('\n').sort()).toEqual([...input.lines].sort());
		const manifest = JSON.parse(attachment('manifest.json')) as {
			files: { name: string; bytes: number; sha256: string }[];
		};
		const named = manifest.files.find(({ name }) => name === 'record.ndjson')!;
		expect(named).toMatchObject({ sha256: sha256Hex(record), bytes: Buffer.byteLength(record) });
		expect(manifest.files.map(({ name }) => name)).toEqual([
			`attachment-${sha256Hex(input.files[0]!.bytes)}.csv`,
			'plant.json',
			'procedure.json',
			'record.ndjson',
			'root.pem',
			'site.ndjson',
		]);
	});

	test('its identifier and the code on every sheet are those of the manifest', () => {
		const digest = sha256Hex(attachment('manifest.json'));
		const text = new TextDecoder('latin1').decode(pdf);
		expect(text).toContain(`<${digest.slice(0, 32)}>`);
		expect(without(words)).toContain(digest);
	});

	test('openssl reads the site root that came along', () => {
		writeFileSync(join(folder, 'root.pem'), attachment('root.pem'));
		expect(run('openssl', 'x509', '-in', join(folder, 'root.pem'), '-noout', '-subject')).toContain(
			'Invented Lime Works',
		);
	});
});

describe('[D3] the pages', () => {
	test('every value is printed as it was typed, decimal comma and all', () => {
		const printed = without(words);
		const typed = allOf(events, 'entry').flatMap(({ body }) => (body.values ?? []).map((reading) => reading.typed));
		expect(typed.length).toBeGreaterThan(90);
		expect([...new Set(typed)].filter((each) => !printed.includes(without(each)))).toEqual([]);
		expect(printed).toContain('-3,1');
	});

	test('every entry is there with who made it and when it was typed in', () => {
		const entries = allOf(events, 'entry');
		const told = words.match(/, T-\d, entered \d+ Mar \d\d:\d\d/g) ?? [];
		expect(told.length).toBeGreaterThanOrEqual(entries.length);
	});

	test.each([
		[
			'who released the feed, with role, time, tablet and code',
			/Released 15 Mar 07:10 by Tove Arrensdal Person Tove Arrensdal Role commissioning lead Meaning released Time 15 March 2026, 07:10 \+01:00 Tablet T-2 Code of the statement 5021-/,
		],
		['the refusal', /hopper 7\.6 against 7\.7; have AT-213 looked at 15 Mar 01:58, Nuria/],
		['its answer', /AT-213 adjusted and checked, F1 read/],
		[
			'the refused attempts of 18:45, 01:22 and 02:40',
			/14 Mar 18:45 Edda Varnholt.*15 Mar 01:22 Nuria Halvebrink.*15 Mar 02:40 Jaro Pelkonde/,
		],
		['the fan stop with its interval', /Process-gas fan stopped 15 Mar 02:11 to 02:16/],
		['that the fan stop came 13 minutes late', /entered 15 Mar 02:24; late .*by 13 min/],
		['that the burner trip came 14 minutes late', /late by 14 min/],
		['the burner trip that T-1 knew alone', /Burner tripped 15 Mar 04:59 to 05:03/],
		['the feed stop', /Fuel feed stopped 15 Mar 09:12 to 09:20/],
		['the fact of the burner purge', /burner-purge \(HV-11 seen shut\)/],
		[
			'the value that rested on AT-213 with its error taken off',
			/Rested on AT-213: 7\.6 % as typed, 8\.2 % with its error taken off, limit 8\.0/,
		],
		['what was not known on the tablet that released', /Burner tripped 04:59 was not known on T-2/],
		['that T-1 had not been heard', /Tablet T-1: last known number 80, head QW3RTY, last heard 15 Mar 04:50/],
		[
			'the flow reading that came 18 minutes late',
			/FT-201 52 400 m³\/h; Jaro Pelkonde, T-1, entered 15 Mar 02:27; late by 18 min/,
		],
		['both watch gaps', /14 Mar 22:55 14 Mar 23:05.*15 Mar 02:15 15 Mar 02:20/],
		['the try of the purge at 21:20 with its reasons', /14 Mar 21:20, Edda Varnholt: try, no proof Not yet/],
		['the damper that was first found open', /HV-14 stands open, hand wheel stiff/],
		['the instrument finding with its sign', /found bad: as-found error -0\.6 %, tolerance 0\.2/],
		['that adequate is a statement', /[Aa]dequate is a statement about these readings/],
	])('they show %s', (_what, pattern) => {
		expect(pattern.test(words)).toBe(true);
	});

	test('they show every gate act, under both kinds of knowledge', () => {
		const acts = allOf(events, 'gate released').length + allOf(events, 'gate refused').length;
		expect(acts).toBe(15);
		expect(words.match(/(?:Released|Refused) 1[45] Mar \d\d:\d\d by /g)).toHaveLength(acts);
		expect(words.match(/As known when signed As known at sealing/g)!.length).toBeGreaterThanOrEqual(acts);
	});

	test('a stranger finds who released the fuel feed and on which sheet its evidence stands', () => {
		const [, sheet] =
			/Feed release: the release of fuel feed Tove Arrensdal, commissioning lead 15 Mar 07:10 sheet (\d+)/.exec(
				words,
			) ?? [];
		const page = run('pdftotext', '-f', sheet ?? '0', '-l', sheet ?? '0', file, '-');
		expect(page).toContain('Gate 5; its release lets happen: the release of fuel feed');
	});

	test('every sheet carries its number, the digest code and the seal', () => {
		const pages = run('pdftotext', '-layout', file, '-').split('\f').slice(0, -1);
		const code = /[0-9A-Z]{4}(?:-[0-9A-Z]{4}){3}/;
		pages.forEach((page, i) => {
			expect(page).toMatch(new RegExp(`${i + 1} / ${pages.length}`));
			expect(page).toMatch(code);
			expect(page).toContain('Demonstration lime works');
		});
	});

	test('a demonstration says so on its first sheet', () => {
		expect(run('pdftotext', '-l', '1', file, '-')).toContain('DEMONSTRATION');
	});

	test('our own words never say passed alone, safe to enter, gas-tight, or that anything is inert', () => {
		const own = words.replaceAll('TOTAL-PASSED', '');
		expect(own).not.toMatch(/\bpassed\b/i);
		expect(own).not.toMatch(/safe to enter|gas-tight|\bis inert\b|\bare inert\b/i);
	});

	test('the cautions stand in it in full', () => {
		for (const caution of [
			'It trips nothing, interlocks nothing',
			'asphyxiate without warning',
			'ignition sources',
			'not permission',
			'eIDAS',
		])
			expect(words).toContain(caution);
	});
});

describe('[D4] what cannot be a dossier', () => {
	test('a character that no font has is refused by its code point and its text', async () => {
		const plant = { ...PLANT, site: 'Works 🔥' };
		expect(await buildDossier({ ...input, plant })).toEqual({
			ok: false,
			error: { kind: 'no-glyph', codePoint: 'U+1F525', text: 'Works 🔥' },
		});
	});

	test('a record that is not sealed', async () => {
		const lines = input.lines.filter((line) => !line.includes('\\"kind\\":\\"sealed\\"'));
		expect(await buildDossier({ ...input, lines })).toEqual({ ok: false, error: { kind: 'not-sealed' } });
	});

	test('an event that the seal does not cover', async () => {
		const seal = allOf(events, 'sealed')[0]!;
		const { text: _, id: __, enteredAt: ___, observedAt: ____, ...envelope } = seal;
		const late = {
			...envelope,
			kind: 'addendum',
			body: { text: 'a photo' },
			number: seal.number + 1,
			previous: seal.id,
			clock: seal.clock + 1,
		};
		const result = await buildDossier({ ...input, lines: [...input.lines, JSON.stringify(late)] });
		expect(result).toMatchObject({ ok: false, error: { kind: 'after-the-seal' } });
	});

	test('a line that is no event, with its log and its number', async () => {
		const result = await buildDossier({ ...input, siteLines: ['{"v":1}'] });
		expect(result).toMatchObject({ ok: false, error: { log: 'site', line: 1 } });
	});

	test('a file without a closing signature', async () => {
		expect(await buildDossier({ ...input, signatures: [] })).toEqual({
			ok: false,
			error: { kind: 'no-signature-asked-for' },
		});
	});
});

test('[D5] every closing role has an open field, and only the last one locks the file', () => {
	const fields = JSON.parse(run('qpdf', '--json', '--json-key=acroform', file)) as {
		acroform: { fields: { fullname: string; fieldtype: string }[] };
	};
	expect(fields.acroform.fields.map(({ fullname }) => fullname)).toEqual([
		'sig_performed',
		'sig_reviewed',
		'sig_accepted',
	]);
	expect(new TextDecoder('latin1').decode(pdf).match(/\/SigFieldLock/g)).toHaveLength(1);
	expect(readFileSync(file).length).toBe(pdf.length);
});
