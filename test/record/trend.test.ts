import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { parseTrend } from '../../src/lib/record';

const HOUR = 60;

describe('a trend from a recorder', () => {
	test('with points and commas between columns is read as written', () => {
		const trend = parseTrend(
			'time,AT-211 [% wet],FT-241 [m3(n)/h]\n2026-03-14T20:10:00+01:00,20.9,0\n2026-03-14T20:10:10+01:00,18.25,890\n',
			HOUR,
		);
		expect(trend).toEqual({
			ok: true,
			value: {
				separator: ',',
				decimalMark: '.',
				columns: [
					{ name: 'AT-211', unit: '%', basis: 'wet', values: [20.9, 18.25] },
					{ name: 'FT-241', unit: 'm3(n)/h', values: [0, 890] },
				],
				times: [Date.UTC(2026, 2, 14, 19, 10, 0), Date.UTC(2026, 2, 14, 19, 10, 10)],
				blanks: [],
				gaps: [],
			},
		});
	});

	test('with decimal commas, plant local times and gaps keeps the gaps as gaps', () => {
		const trend = parseTrend(
			'Zeit;AT-211 [% wet]\r\n14.03.2026 20:10:00;20,9\r\n14.03.2026 20:10:10;\r\n14.03.2026 20:10:20;18,250\r\n14.03.2026 20:12:00;1 204,5\r\n',
			HOUR,
		);
		expect(trend.ok && trend.value).toMatchObject({
			separator: ';',
			decimalMark: ',',
			columns: [{ values: [20.9, undefined, 18.25, 1204.5] }],
			blanks: [{ column: 'AT-211', line: 3 }],
			gaps: [{ after: Date.UTC(2026, 2, 14, 19, 10, 20), minutes: 100 / 60, line: 5 }],
		});
	});

	test.each([
		['no table at all', 'just words', { kind: 'no-table', lines: 1 }],
		[
			'a line with a cell too many',
			't;a\n2026-03-14 20:00;1\n2026-03-14 20:01;1;2\n',
			{ kind: 'ragged-line', line: 3, expected: 2, found: 3 },
		],
		[
			'a word in a number column',
			't;a\n2026-03-14 20:00;1\n2026-03-14 20:01;bad\n',
			{ kind: 'not-a-number', line: 3, column: 'a', found: 'bad', expected: 'a number with "."' },
		],
		[
			'a point in a file of decimal commas',
			't;a\n2026-03-14 20:00;1,5\n2026-03-14 20:01;1.5\n',
			{ kind: 'not-a-number', line: 3, column: 'a', found: '1.5', expected: 'a number with ","' },
		],
		[
			'a time without its day',
			't;a\n20:00;1\n',
			{
				kind: 'not-a-time',
				line: 2,
				found: '20:00',
				expected: '2026-03-14T20:10:00+01:00, 2026-03-14 20:10:00 or 14.03.2026 20:10:00',
			},
		],
		[
			'a day that does not exist',
			't;a\n31.04.2026 20:00;1\n',
			{
				kind: 'not-a-time',
				line: 2,
				found: '31.04.2026 20:00',
				expected: '2026-03-14T20:10:00+01:00, 2026-03-14 20:10:00 or 14.03.2026 20:10:00',
			},
		],
		[
			'a time that runs back',
			't;a\n2026-03-14 20:00;1\n2026-03-14 19:59;1\n',
			{ kind: 'time-runs-back', line: 3, found: '2026-03-14 19:59', before: '2026-03-14 20:00' },
		],
		['one column twice', 't;a;a\n2026-03-14 20:00;1;1\n', { kind: 'column-twice', column: 'a' }],
	])('%s is refused with its place', (_, text, error) => {
		expect(parseTrend(text, HOUR)).toEqual({ ok: false, error });
	});

	test('the same values come back whatever the decimal mark', () => {
		const numbers = fc.array(
			fc.integer({ min: -250_000, max: 250_000 }).map((n) => n / 10_000),
			{ minLength: 2, maxLength: 20 },
		);
		fc.assert(
			fc.property(numbers, (values) => {
				const file = (mark: string): string =>
					[
						't;a [%]',
						...values.map(
							(value, i) => `2026-03-14T20:00:${String(i).padStart(2, '0')}Z;${value.toFixed(4).replace('.', mark)}`,
						),
					].join('\n');
				const read = (mark: string): unknown => {
					const trend = parseTrend(file(mark), 0);
					return trend.ok ? trend.value.columns[0]?.values : trend.error;
				};
				expect(read(',')).toEqual(values);
				expect(read('.')).toEqual(values);
			}),
		);
	});
});
