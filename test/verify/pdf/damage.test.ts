import fc from 'fast-check';
import { beforeAll, expect, test } from 'vitest';
import { concat, utf8 } from '../../../src/lib/base';
import { checkPdf, readPdf } from '../../../src/lib/verify';
import { makeSigners, RECORD, signThree } from '../../support/small-dossier';
import { appendUnsigned, latin1, stream } from '../../support/tamper';
import { makeTestSite, testTrustList, type TestSite } from '../../support/test-site';

type Bytes = Uint8Array<ArrayBuffer>;

let site: TestSite;
let dossier: Bytes;

beforeAll(async () => {
	site = await makeTestSite();
	[, , , dossier] = await signThree(site, await makeSigners(site));
});

const judge = (bytes: Bytes) =>
	checkPdf(readPdf(bytes), {
		root: site.root.certificate.der,
		trustList: testTrustList(site),
		now: '2026-06-01T00:00:00Z',
	});

const bytesOf = (text: string): Bytes => new Uint8Array(Buffer.from(text, 'latin1'));

/** Every occurrence, and as many bytes as before. */
const edit = (from: string, to: string): Bytes => bytesOf(latin1(dossier).replaceAll(from, to));

test('a dossier cut off at any sixty-fourth of its length fails, and says at which byte it ends too early', async () => {
	for (let part = 1; part < 64; part++) {
		const report = await judge(dossier.slice(0, Math.floor((dossier.length * part) / 64)));
		expect(report).toMatchObject({ class: 'TOTAL-FAILED', sub: 'FORMAT_FAILURE', outcome: 'failed' });
		const [first] = report.checks.filter(({ outcome }) => outcome !== 'passed');
		expect(first?.because).toMatch(/^At byte \d+ it is damaged: .+ expected\.$|^\d+ bytes follow the last %%EOF\.$/);
	}
});

test('[PS9] a dossier with any one byte changed never passes', async () => {
	await fc.assert(
		fc.asyncProperty(fc.nat(dossier.length - 1), fc.integer({ min: 1, max: 255 }), async (at, mask) => {
			const changed = dossier.slice();
			changed[at] = changed[at]! ^ mask;
			const report = await judge(changed);
			expect(report.class).not.toBe('TOTAL-PASSED');
			expect(report.checks.some(({ outcome }) => outcome !== 'passed')).toBe(true);
		}),
		{ numRuns: Number(process.env.FUZZ_RUNS ?? 250) },
	);
});

test('a dossier with a piece taken out, doubled or filled with noise never passes', async () => {
	const piece = fc.tuple(
		fc.nat(dossier.length - 1),
		fc.integer({ min: 1, max: 2000 }),
		fc.uint8Array({ maxLength: 200 }),
	);
	await fc.assert(
		fc.asyncProperty(piece, fc.constantFrom('out', 'twice', 'noise'), async ([at, length, noise], how) => {
			const [before, here, after] = [
				dossier.subarray(0, at),
				dossier.subarray(at, at + length),
				dossier.subarray(at + length),
			];
			const middle = { out: new Uint8Array(), twice: concat(here, here), noise: Uint8Array.from(noise) }[how];
			fc.pre(Buffer.compare(middle, here) !== 0);
			expect((await judge(concat(before, middle, after))).class).not.toBe('TOTAL-PASSED');
		}),
		{ numRuns: 200 },
	);
});

test('bytes that are no PDF are told apart from a damaged one', () => {
	expect(readPdf(utf8('{"kind":"start-up opened"}'))).toMatchObject({ isPdf: false, attachments: [] });
	expect(readPdf(new Uint8Array())).toMatchObject({ isPdf: false });
	expect(readPdf(utf8('%PDF-1.7\n'))).toMatchObject({ isPdf: true, file: undefined });
});

/** Where reading stopped and why. */
const stopped = (bytes: Bytes) => readPdf(bytes).checks[0];

test('cross-references that lead in a circle are refused where they turn back', () => {
	const text = latin1(dossier);
	const last = Number(/startxref\n(\d+)\n%%EOF\n$/.exec(text)![1]);
	const previous = /\/Prev (\d+)/.exec(text.slice(last))![1]!;
	const circle =
		text.slice(0, last) +
		text.slice(last).replace(`/Prev ${previous}`, `/Prev ${String(last).padEnd(previous.length)}`);
	expect(stopped(bytesOf(circle))).toMatchObject({
		outcome: 'failed',
		facts: { expected: 'cross-references of an earlier state' },
	});
});

test('[PS9] an update that takes an object away is refused', () => {
	const update = appendUnsigned(dossier, [{ number: 5, body: 'null' }]);
	const hidden = bytesOf(
		latin1(update).replace(/(\d{10}) 00000 n \ntrailer(?![\s\S]*trailer)/, '0000000000 00001 f \ntrailer'),
	);
	expect(stopped(hidden)?.because).toContain('takes an object away');
});

test('[PS9] an object that no cross-reference names is refused, wherever it lies', () => {
	const update = latin1(
		appendUnsigned(dossier, [
			{ number: 90, body: '<< /Hidden true >>' },
			{ number: 91, body: 'null' },
		]),
	);
	const unnamed = (number: number) =>
		stopped(bytesOf(update.replace(new RegExp(`${number} 1\\n\\d{10} 00000 n \\n`), '')));
	expect(unnamed(90)?.because).toMatch(/object 91, which the cross-references put at byte \d+ expected/);
	expect(unnamed(91)?.because).toMatch(/the cross-references, which startxref puts at byte \d+ expected/);
});

test('nesting beyond sixty-four levels is refused, however deep it goes', () => {
	const deep = `${'['.repeat(100_000)}${']'.repeat(100_000)}`;
	expect(stopped(appendUnsigned(dossier, [{ number: 90, body: deep }]))?.facts.expected).toBe('nesting of at most 64');
});

test('[PS9] a dictionary with a key twice is refused: two readers would read two things', () => {
	expect(stopped(appendUnsigned(dossier, [{ number: 90, body: '<< /A 1 /A 2 >>' }]))?.facts.expected).toBe(
		'no second key A',
	);
});

test('a stream whose length is the length of another stream is refused', () => {
	const turned = [
		{ number: 90, body: stream('x').replace('/Length 1', '/Length 91 0 R') },
		{ number: 91, body: stream('x').replace('/Length 1', '/Length 90 0 R') },
	];
	expect(stopped(appendUnsigned(dossier, turned))?.facts.expected).toBe('the length of a stream');
});

/** A whole file of these objects, the first of which is the root: what a stranger may hand in. */
function fileOf(...bodies: readonly string[]): Bytes {
	let text = '%PDF-1.7\n';
	const entries = bodies.map((body, i) => {
		const entry = `${String(text.length).padStart(10, '0')} 00000 n \n`;
		text += `${i + 1} 0 obj\n${body}\nendobj\n`;
		return entry;
	});
	const xref = `xref\n0 ${bodies.length + 1}\n0000000000 65535 f \n${entries.join('')}`;
	return bytesOf(
		`${text}${xref}trailer\n<< /Size ${bodies.length + 1} /Root 1 0 R >>\nstartxref\n${text.length}\n%%EOF\n`,
	);
}

const attachmentsOf = (bytes: Bytes) => readPdf(bytes).checks.find(({ name }) => name === 'attachments');

test('[PS8] a tree of attachments that grows into itself is refused, and not climbed for ever', () => {
	const kids = `<< /Kids [${'2 0 R '.repeat(50)}] >>`;
	const circle = fileOf('<< /Names << /EmbeddedFiles 2 0 R >> >>', kids);
	expect(attachmentsOf(circle)).toMatchObject({ outcome: 'failed', facts: { expected: 'a tree' } });
	const twice = fileOf('<< /Names << /EmbeddedFiles << /Kids [2 0 R 2 0 R] >> >> >>', '<< /Names [] >>');
	expect(attachmentsOf(twice)).toMatchObject({ outcome: 'failed', facts: { expected: 'a tree' } });
});

test('[PS8] two attachments of one name, one without bytes and one packed in an unknown way are refused', () => {
	const naming = (specifications: string) => `<< /Names << /EmbeddedFiles << /Names [${specifications}] >> >> >>`;
	const good = '(a) << /UF (a.txt) /EF << /F 2 0 R >> >>';
	expect(readPdf(fileOf(naming(good), stream('hello'))).attachments).toEqual([
		{ name: 'a.txt', mediaType: undefined, bytes: utf8('hello') },
	]);
	expect(attachmentsOf(fileOf(naming(`${good} ${good}`), stream('hello')))?.facts.expected).toBe(
		'one attachment named a.txt',
	);
	expect(attachmentsOf(fileOf(naming(good.replace('2 0 R', '9 0 R')), stream('hello')))?.facts.expected).toBe(
		'the bytes of a.txt',
	);
	const packed = fileOf(naming(good), stream('hello', '/Filter /LZWDecode'));
	expect(attachmentsOf(packed)?.facts.expected).toBe('FlateDecode and no other filter');
	const torn = fileOf(naming(good), stream('hello', '/Filter /FlateDecode'));
	expect(attachmentsOf(torn)?.facts.expected).toMatch(/^packed bytes/);
});

test('[PS1] a file with a form of another kind, or without fields, is no dossier', async () => {
	const none = await judge(fileOf('<< /Type /Catalog >>'));
	expect(none).toMatchObject({ class: 'TOTAL-FAILED', signatures: [] });
	expect(none.checks.find(({ name }) => name === 'a signature is asked for')).toMatchObject({ outcome: 'failed' });
	const text = fileOf('<< /AcroForm << /Fields [2 0 R] >> >>', '<< /FT /Tx /T (name) >>');
	expect(
		readPdf(text).checks.find(({ name }) => name === 'form holds signature fields and nothing else')?.outcome,
	).toBe('failed');
});

test('[PS1] a program, a launch, a form script and encryption are named with the object that holds them', () => {
	for (const [body, what] of [
		['<< /S /JavaScript /JS (app.alert) >>', 'JS in object 90, JavaScript in object 90'],
		['<< /S /Launch /F (calc) >>', 'Launch in object 90'],
		['<< /AA << >> >>', 'AA in object 90'],
		[stream('1 0 << >>', '/Type /ObjStm /N 1 /First 4'), 'ObjStm in object 90'],
	] as const) {
		const active = readPdf(appendUnsigned(dossier, [{ number: 90, body }])).checks;
		expect(active.find(({ name }) => name === 'nothing in it acts')).toMatchObject({
			outcome: 'failed',
			facts: { found: what },
		});
	}
});

test('[PS4] a signature of other bytes than the whole file fails by its range', async () => {
	const text = latin1(dossier);
	const range = /\/ByteRange \[0 (\d+) +(\d+) +(\d+) +\]/.exec(text)!;
	const shorter = range[0].replace(range[3]!, String(Number(range[3]) - 1));
	const report = await judge(edit(range[0], shorter));
	expect(report.signatures[0]?.checks[0]).toMatchObject({
		name: 'covers the whole file as it was signed',
		outcome: 'failed',
	});
});

test('[PS8] the record comes out of the dossier byte for byte', () => {
	expect(readPdf(dossier).attachments).toEqual([
		{ name: 'record.ndjson', mediaType: 'application/x-ndjson', bytes: RECORD },
	]);
});
