import fc from 'fast-check';
import { beforeAll, describe, expect, test } from 'vitest';
import { canonicalJson, utf8, type Json } from '../../src/lib/base';
import { verifyRecord } from '../../src/lib/verify';
import { judge, makeSignedRecord, NOW, type SignedRecord } from '../support/signed-record';

let record: SignedRecord;
beforeAll(async () => {
	record = await makeSignedRecord();
});

describe('whatever comes, there is an answer', () => {
	test('any bytes at all fail, and no line of them is passed over', async () => {
		await fc.assert(
			fc.asyncProperty(fc.uint8Array({ minLength: 1, maxLength: 400 }), async (bytes) => {
				const report = await verifyRecord({ lines: [{ name: 'any', bytes: Uint8Array.from(bytes) }], now: NOW });
				expect(report.class).toBe('TOTAL-FAILED');
			}),
			{ numRuns: 100 },
		);
	});

	test('nothing at all fails', async () => {
		const report = await verifyRecord({ lines: [], now: NOW });
		expect(report).toMatchObject({ class: 'TOTAL-FAILED', process: { result: 'not judged' } });
	});

	test.each([
		['a procedure', '{"format":"gatehold-procedure/1","id":"X"}'],
		['rows of a spreadsheet', 'time;O2;unit\n08:00;7,4;%'],
		['events of another program', '{"timestamp":"2026-05-14T08:00:00Z","event":"valve opened"}'],
		['an event of a version to come', '{"v":2,"kind":"note","body":{}}'],
		['an event of a kind to come', JSON.stringify({ text: '{"v":1,"kind":"valve sang"}' })],
	])('%s is not a record, and the line is named', async (_what, text) => {
		const report = await verifyRecord({ lines: [{ name: 'foreign', bytes: utf8(text) }], now: NOW });
		expect(report.class).toBe('TOTAL-FAILED');
		expect(report.checks[0]?.because.startsWith('Line 1 of foreign')).toBe(true);
	});

	test('values put in place of others anywhere in an event never break the judge, and never pass', async () => {
		const strange = fc.oneof(
			fc.constantFrom<Json>(null, true, -1, 0, 1e308, '', 'T-9', [], {}, '0'.repeat(64), '2026-02-30T25:00Z'),
			fc.jsonValue({ maxDepth: 2 }) as fc.Arbitrary<Json>,
		);
		await fc.assert(
			fc.asyncProperty(fc.nat(record.lines.length - 1), fc.array(fc.tuple(fc.nat(), strange)), async (line, bends) => {
				const bent = bends.reduce((text, [place, value]) => bend(text, place, value), record.lines[line]!);
				const lines = record.lines.with(line, bent);
				if (lines[line] === record.lines[line]) return;
				expect((await judge(record, lines)).class).toBe('TOTAL-FAILED');
			}),
			{ numRuns: 100 },
		);
	});
});

/** One value of the signed text replaced, the text made canonical again, the old signature kept. */
function bend(line: string, place: number, value: Json): string {
	const stored = JSON.parse(line) as { text: string; signature: string };
	const envelope = JSON.parse(stored.text) as Json;
	const paths = pathsOf(envelope);
	const path = paths[place % paths.length]!;
	return JSON.stringify({ ...stored, text: canonicalJson(replaced(envelope, path, value)) });
}

type Path = readonly (string | number)[];

const pathsOf = (json: Json, path: Path = []): readonly Path[] =>
	typeof json === 'object' && json !== null
		? Object.entries(json)
				.flatMap(([name, inner]) => pathsOf(inner, [...path, name]))
				.concat(path.length > 0 ? [path] : [])
		: [path];

function replaced(json: Json, [name, ...rest]: Path, value: Json): Json {
	if (name === undefined) return value;
	if (Array.isArray(json))
		return json.map((item: Json, i) => (String(i) === name ? replaced(item, rest, value) : item));
	const table = json as { readonly [name: string]: Json };
	return { ...table, [name]: replaced(table[name]!, rest, value) };
}

test('the report says how many checks came out how, and says the same each time', async () => {
	const [one, two] = [await judge(record), await judge(record)];
	expect(one).toEqual(two);
	expect(one.checked.passed + one.checked.failed + one.checked.undecided).toBe(one.checks.length);
	expect(one.checks.every(({ because }) => because.length > 0)).toBe(true);
});
