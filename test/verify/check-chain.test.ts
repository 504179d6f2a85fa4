import fc from 'fast-check';
import { beforeAll, describe, expect, test } from 'vitest';
import { parseEventLine } from '../../src/lib/record';
import type { Check, Report } from '../../src/lib/verify';
import { judge, makeSignedRecord, type SignedRecord } from '../support/signed-record';

let record: SignedRecord;
beforeAll(async () => {
	record = await makeSignedRecord();
});

const failures = (report: Report): readonly Check[] => report.checks.filter(({ outcome }) => outcome === 'failed');
const names = (report: Report): readonly string[] => [...new Set(failures(report).map(({ name }) => name))];

/** Whether a finding names a place: the tablet and the number of an event. */
function isNamed(report: Report, { device, number }: { readonly device: string; readonly number: number }): boolean {
	const tellsOfIt = new RegExp(`\\b${device}\\b.*number(?:s \\d+ to)? ${number}\\b`);
	return failures(report).some(({ because }) => tellsOfIt.test(because));
}

/** Who the changed line says that it is: a flip in its very name gives it another. */
function claimedBy(line: Uint8Array): readonly { readonly device: string; readonly number: number }[] {
	try {
		const event = parseEventLine(new TextDecoder().decode(line));
		return event.ok ? [event.value] : [];
	} catch {
		return [];
	}
}

test('a record that nobody touched is whole, and met its procedure', async () => {
	const report = await judge(record);
	expect({ class: report.class, process: report.process, failed: report.checked.failed }).toEqual({
		class: 'TOTAL-PASSED',
		process: { result: 'met', because: [] },
		failed: 0,
	});
	expect(report.counts).toMatchObject({ events: 13, siteEvents: 9, tablets: 2, people: 5, entries: 4, gateActs: 2 });
});

describe('tampering with lines', () => {
	test('any byte of any line: found, and named by tablet and number, or by its line when it cannot be read', async () => {
		const bytes = record.lines.map((line) => new TextEncoder().encode(line));
		await fc.assert(
			fc.asyncProperty(
				fc.nat(record.lines.length - 1),
				fc.nat(),
				fc.integer({ min: 1, max: 255 }),
				async (line, place, flip) => {
					const changed = bytes.map((each) => each.slice());
					const inside = place % bytes[line]!.length;
					changed[line]![inside] = changed[line]![inside]! ^ flip;
					const whole = changed.flatMap((each) => [...each, 0x0a]);
					const report = await judge(record, [], { lines: [{ name: 'record.ndjson', bytes: new Uint8Array(whole) }] });
					expect(report.class).toBe('TOTAL-FAILED');
					const names = [record.events[line]!, ...claimedBy(changed[line]!)];
					const isLineNamed = failures(report).some(({ because }) =>
						because.startsWith(`Line ${line + 1} of record.ndjson`),
					);
					expect(isLineNamed || names.some((name) => isNamed(report, name))).toBe(true);
				},
			),
			{ numRuns: 80 },
		);
	});

	test('every line that is left out is missed', async () => {
		for (const [line, { kind, device, number, log }] of record.events.entries()) {
			const report = await judge(record, record.lines.toSpliced(line, 1));
			// The last event of a chain that nothing else speaks of: that there was one, nobody can tell.
			if (kind === 'sealed') expect(report.class).toBe('INDETERMINATE');
			else {
				const opening = 'site log is the one that the opening rests on';
				const isMissed = isNamed(report, { device, number }) || names(report).includes(log === 'site' ? opening : '');
				expect({ kind, class: report.class, isMissed }).toEqual({ kind, class: 'TOTAL-FAILED', isMissed: true });
			}
		}
	});

	test('a line that stands twice is named', async () => {
		for (const line of record.lines.keys()) {
			const report = await judge(record, record.lines.toSpliced(line, 0, record.lines[line]!));
			expect(names(report)).toEqual(['every event stands once']);
			expect(isNamed(report, record.events[line]!)).toBe(true);
		}
	});

	test('two lines of one log that changed places are named', async () => {
		const own = [...record.events.keys()].filter((i) => record.events[i]!.log !== 'site');
		await fc.assert(
			fc.asyncProperty(fc.shuffledSubarray(own, { minLength: 2, maxLength: 2 }), async ([a, b]) => {
				const lines = [...record.lines];
				[lines[a!], lines[b!]] = [lines[b!]!, lines[a!]!];
				const report = await judge(record, lines);
				expect(names(report)).toEqual(['lines stand in the order of the record']);
			}),
			{ numRuns: 12 },
		);
	});
});

describe('a tail that was cut off', () => {
	test('before the seal: the seal misses it by tablet and number', async () => {
		const last = record.events.findIndex(({ device, number }) => device === 'T-2' && number === 4);
		const report = await judge(record, record.lines.toSpliced(last, 1));
		expect(failures(report).map(({ facts }) => facts)).toContainEqual({
			kind: 'events missing',
			device: 'T-2',
			number: 4,
			to: 4,
		});
	});

	test('with the seal: the tablet countersigned how far its chain had got', async () => {
		const cut = await makeSignedRecord(
			{
				stopAfter: 'gate 1',
				more: (tablets) =>
					tablets.signHead('TechB', 'T-2', '2026-05-14T08:37:00+02:00').then(() => tablets.give('T-2', 'T-1')),
			},
			record.site,
		);
		const withoutEntry = cut.lines.filter((_, i) => !(cut.events[i]!.device === 'T-2' && cut.events[i]!.number === 3));
		const report = await judge(cut, withoutEntry);
		expect(failures(report).map(({ facts }) => facts)).toContainEqual(
			expect.objectContaining({ kind: 'events missing', device: 'T-2', number: 3 }),
		);
	});

	test('of a tablet that another one had copied: the copy knew its head', async () => {
		const open = await makeSignedRecord({ stopAfter: 'entries' }, record.site);
		const shortened = open.lines.filter((_, i) => open.events[i]!.device !== 'T-1' || open.events[i]!.number < 4);
		const report = await judge(open, shortened);
		expect(failures(report).map(({ facts }) => facts)).toContainEqual(
			expect.objectContaining({ kind: 'seen but missing', device: 'T-1' }),
		);
	});

	test('of a record that was never sealed: whether something is missing cannot be told, and that is said', async () => {
		const open = await makeSignedRecord({ stopAfter: 'gate 1' }, record.site);
		const report = await judge(open);
		expect(report.class).toBe('INDETERMINATE');
		expect(report.process).toEqual({ result: 'not met', because: ['gate 2 is ready', 'it is not sealed'] });
	});
});

test('one tablet that was copied and went on twice forks its chain: both events are named', async () => {
	const other = await makeSignedRecord({}, record.site);
	const twin = other.events.findIndex(({ device, number }) => device === 'T-2' && number === 2);
	const lines = [...record.lines, other.lines[twin]!];
	const report = await judge(record, lines);
	expect(report.class).toBe('TOTAL-FAILED');
	expect(failures(report).map(({ facts }) => facts)).toContainEqual(
		expect.objectContaining({ kind: 'chain forked', device: 'T-2', number: 2 }),
	);
});
