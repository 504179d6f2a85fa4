import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { parsePlant, type Plant } from '../../src/lib/plant';
import { guessedColumns, parseTrend, seriesBody, tableOf, trendKey, type Trend } from '../../src/lib/record';

const DEMO = join(import.meta.dirname, '../../static/demo');
const text = (name: string): string => readFileSync(join(DEMO, 'trends', name), 'utf8');
const plant = ((): Plant => {
	const parsed = parsePlant(JSON.parse(readFileSync(join(DEMO, 'plant.json'), 'utf8')));
	if (!parsed.ok) throw new Error('the demonstration has no plant');
	return parsed.value;
})();
const HOUR = 60;
const FILE = { hash: 'a'.repeat(64), name: 'trend.csv', mediaType: 'text/csv', bytes: 1 };
const read = (file: string, reading?: Parameters<typeof parseTrend>[2]): Trend => {
	const trend = parseTrend(file, HOUR, reading);
	if (!trend.ok) throw new Error(trend.error.kind);
	return trend.value;
};

describe('a trend that is read as a person says', () => {
	test('gives what is found in it, when the person says the same', () => {
		const file = text('purge-1-decimal-comma.csv');
		const said = { separator: ';', decimalMark: ',', timeColumn: 'time', time: 'day first' } as const;
		expect(read(file, said)).toEqual(read(file));
		const found = read(file);
		expect([found.blanks.length, found.gaps.length]).toEqual([5, 1]);
	});

	test('has another decimal mark: a file of whole numbers and thousands with a comma is no longer misread', () => {
		const file = 't;FT-201\n2026-03-14 20:00;1,5\n2026-03-14 20:01;2,5\n';
		expect(read(file).columns[0]?.values).toEqual([1.5, 2.5]);
		expect(parseTrend(file, HOUR, { decimalMark: '.' })).toMatchObject({
			error: { kind: 'not-a-number', line: 2, column: 'FT-201' },
		});
	});

	test('has its times in another column, days first with strokes', () => {
		const file = 'AT-211,when\n20.9,03/04/2026 20:10:00\n18.2,03/04/2026 20:10:10\n';
		expect(parseTrend(file, HOUR)).toMatchObject({ error: { kind: 'not-a-time', found: '20.9' } });
		const days = read(file, { timeColumn: 'when', time: 'day first' });
		expect(days.times[0]).toBe(Date.UTC(2026, 3, 3, 19, 10));
		const months = read(file, { timeColumn: 'when', time: 'month first' });
		expect(months.times[0]).toBe(Date.UTC(2026, 2, 4, 19, 10));
		expect(days.columns.map(({ name }) => name)).toEqual(['AT-211']);
	});

	test('is refused where it names a column of times that is not there, or a day that does not exist', () => {
		const file = 'when,AT-211\n31/04/2026 20:10:00,20.9\n';
		expect(parseTrend(file, HOUR, { timeColumn: 'time' })).toMatchObject({ error: { kind: 'no-time-column' } });
		expect(parseTrend(file, HOUR, { time: 'day first' })).toMatchObject({ error: { kind: 'not-a-time', line: 2 } });
	});

	test('shows its cells as they stand, even where it cannot be read', () => {
		expect(tableOf('when,AT-211\nnever,20.9\n')).toEqual({
			separator: ',',
			heading: ['when', 'AT-211'],
			rows: [{ line: 2, cells: ['never', '20.9'] }],
		});
	});
});

describe('R10: a series', () => {
	const trend = read(text('purge-1.csv'));

	test('takes every column for the point that it names, and keeps no reading where nothing was corrected', () => {
		const columns = guessedColumns(trend, plant);
		expect(columns.map(({ point }) => point)).toEqual(['AT-211', 'AT-212', 'AT-213', 'AT-214', 'FT-241', 'FT-201']);
		const found = seriesBody(trend, FILE, plant);
		expect(seriesBody(trend, FILE, plant, { columns, reading: {} })).toEqual(found);
		expect(found.ok && 'reading' in found.value).toBe(false);
		expect(found.ok && trendKey(found.value)).toBe(FILE.hash);
	});

	test('finds the tag in a heading that is written otherwise, and no point twice', () => {
		const other = read('t,at 211 O2,AT211 spare,room\n2026-03-14 20:00,1,2,3\n');
		expect(guessedColumns(other, plant)).toEqual([{ column: 'at 211 O2', point: 'AT-211' }]);
	});

	test('says which column is which point and in which unit, leaves the rest out, and how the file was read', () => {
		const reading = { decimalMark: '.' } as const;
		const columns = [{ column: 'AT-212', point: 'AT-211', unit: 'mol/mol' }];
		const body = seriesBody(trend, FILE, plant, { columns: [{ column: 'AT-212', point: 'AT-211' }], reading });
		expect(body).toMatchObject({
			value: { points: [{ point: 'AT-211', column: 'AT-212', unit: '%', basis: 'wet' }], reading },
		});
		expect(body.ok && trendKey(body.value)).toBe(`${FILE.hash} {"decimalMark":"."}`);
		expect(seriesBody(trend, FILE, plant, { columns })).toMatchObject({ error: { kind: 'other-unit' } });
	});

	test.each([
		['of another basis is refused', [{ column: 'dry', point: 'AT-211' }], 'other-basis'],
		['that is not there is refused', [{ column: 'AT-299', point: 'AT-211' }], 'no-such-column'],
		['for a point that the plant has not is refused', [{ column: 'AT-212', point: 'AT-999' }], 'no-such-point'],
		[
			'for a point that another column is already is refused',
			[
				{ column: 'AT-211', point: 'AT-211' },
				{ column: 'AT-212', point: 'AT-211' },
			],
			'point-twice',
		],
	])('a column %s', (_, columns, kind) => {
		const dry = read('t,dry [% dry],AT-211,AT-212\n2026-03-14 20:00,1,2,3\n');
		expect(seriesBody(dry, FILE, plant, { columns })).toMatchObject({ error: { kind } });
	});
});
