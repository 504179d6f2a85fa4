import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { sha256Hex } from '../../src/lib/base';
import { fromPem } from '../../src/lib/identity';
import { findVeraPdf } from '../support/judges.mjs';
import { appendUnsigned, findObjects, flip, latin1, stream } from '../support/tamper';
import { PdfJudges } from '../support/pdf-judges';
import { value } from '../support/test-site';

// The whole way as a stranger walks it: the built program plays the start-up from its data files, other people's programs
// judge the PDF, and our verify reads it back.
const HOUSE = join(import.meta.dirname, '../..');
const FOLDER = mkdtempSync(join(tmpdir(), 'gatehold-demo-'));
const FILE = join(FOLDER, 'dossier.pdf');
const ROOT = `${FILE}.root.pem`;

const gatehold = (...args: readonly string[]): { readonly status: number | null; readonly out: string } => {
	const { status, stdout, stderr } = spawnSync('npm', ['run', '--silent', 'gatehold', '--', ...args], {
		cwd: HOUSE,
		encoding: 'utf8',
		maxBuffer: 64 << 20,
	});
	return { status, out: stdout + stderr };
};

let pdf: Uint8Array<ArrayBuffer>;
let judges: PdfJudges;

beforeAll(() => {
	const { status, out } = gatehold('demo', '--out', FILE);
	expect({ status, out }).toMatchObject({ status: 0 });
	pdf = new Uint8Array(readFileSync(FILE));
	judges = new PdfJudges(value(fromPem(new Uint8Array(readFileSync(ROOT)))));
}, 300_000);

afterAll(() => {
	judges.dismiss();
	rmSync(FOLDER, { recursive: true, force: true });
});

describe('the dossier of the demonstration start-up', () => {
	test('pdfsig, knowing the site root, finds three valid and trusted signatures, the last over the whole file', () => {
		const { text } = judges.pdfsig(pdf);
		expect(text.match(/Signature is Valid\./g)).toHaveLength(3);
		expect(text.match(/Certificate is Trusted\./g)).toHaveLength(3);
		expect(text.match(/Not total document signed/g)).toHaveLength(2);
		expect(text.match(/- Total document signed/g)).toHaveLength(1);
	});

	test('qpdf finds nothing wrong', () => {
		expect(judges.qpdf(pdf)).toMatchObject({ status: 0 });
	});

	test('verify says TOTAL-PASSED and, apart from that, what the procedure says', () => {
		const { status, out } = gatehold('verify', FILE, '--root', ROOT);
		expect({ status, out: out.slice(0, 2000) }).toMatchObject({ status: 0 });
		expect(out).toContain('TOTAL-PASSED');
		expect(out).toContain('Rules of the procedure: met');
	}, 120_000);

	test('without the root nothing vouches for the signers: indeterminate, not passed', () => {
		expect(gatehold('verify', FILE)).toMatchObject({ status: 2 });
	}, 120_000);

	test('a stranger reads who released the fuel feed, on which evidence, with which instrument', () => {
		const { stdout } = spawnSync('pdftotext', ['-layout', FILE, '-'], { encoding: 'utf8', maxBuffer: 64 << 20 });
		const page = stdout.split('\f').find((text) => text.includes('Feed release') && /Released .* by /.test(text)) ?? '';
		expect(page).toMatch(/Released 15.Mar.*07:0\d by Tove Arrensdal/);
		expect(page).toMatch(/commissioning lead/);
		expect(page).toMatch(/AT-213/);
		expect(stdout).toMatch(/asphyxiate/);
	});

	test('both photos of the story are drawn as they are attached, each with its hash, and the file keeps to PDF/A-3b', () => {
		const { stdout: images } = spawnSync('pdfimages', ['-list', FILE], { encoding: 'utf8' });
		const rows = images.trim().split('\n').slice(2);
		expect(rows).toHaveLength(2);
		for (const row of rows) expect(row).toMatch(/image\s+640\s+480\s+rgb\s+3\s+8\s+jpeg/);
		const { stdout } = spawnSync('pdftotext', ['-raw', FILE, '-'], { encoding: 'utf8', maxBuffer: 64 << 20 });
		for (const name of ['fire-fighting-and-vent.jpg', 'emergency-inerting-valve.jpg']) {
			const hash = sha256Hex(new Uint8Array(readFileSync(join(HOUSE, 'static/demo/photos', name))));
			// In two lines under its picture; again in the list of files.
			expect(stdout).toContain(`${hash.slice(0, 32)}\n${hash.slice(32)}`);
		}
		const [java, ...args] = findVeraPdf() ?? [];
		if (java === undefined) return;
		const judged = spawnSync(java, [...args, '--flavour', '3b', '--format', 'text', FILE], { encoding: 'utf8' });
		expect(judged.stdout).toMatch(/^PASS/m);
	}, 120_000);

	test('every page of it is marked as a demonstration or stands in a file that is', () => {
		const { stdout } = spawnSync('pdftotext', ['-l', '1', FILE, '-'], { encoding: 'utf8' });
		expect(stdout).toContain('DEMONSTRATION');
	});

	const tampered: readonly (readonly [name: string, reason: RegExp, make: () => Promise<Uint8Array<ArrayBuffer>>])[] = [
		[
			'one byte changed in its middle',
			/bytes are those that were signed/,
			() => Promise.resolve(flip(pdf, pdf.length >> 1)),
		],
		[
			'its last signature cut off',
			/sig_accepted/,
			() => Promise.resolve(pdf.slice(0, latin1(pdf).slice(0, -8).lastIndexOf('%%EOF') + 6)),
		],
		[
			'a page written over by an update that nobody signed',
			/update|last signature/,
			async () => {
				const { content } = await findObjects(pdf);
				return appendUnsigned(pdf, [{ number: content, body: stream('BT ET') }]);
			},
		],
		[
			'its record exchanged by an update that nobody signed',
			/update|last signature/,
			async () => {
				const { attachment } = await findObjects(pdf);
				return appendUnsigned(pdf, [{ number: attachment, body: stream('{}', '/Type /EmbeddedFile') }]);
			},
		],
		['cut in half', /./, () => Promise.resolve(pdf.slice(0, pdf.length >> 1))],
	];

	test.each(tampered)(
		'%s: verify fails it and says why',
		async (_, reason, make) => {
			const file = join(FOLDER, 'tampered.pdf');
			writeFileSync(file, await make());
			const { status, out } = gatehold('verify', file, '--root', ROOT);
			expect(status).toBe(1);
			expect(
				out
					.split('\n')
					.filter((line) => /fail|broken|does not/i.test(line))
					.join('\n'),
			).toMatch(reason);
		},
		120_000,
	);
});
