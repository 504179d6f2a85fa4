import { fail, ok, type Result } from '../base';
import { parseNumber } from '../quantity';
import { MINUTE, type Millis } from './instants';

/** What a trend recorder or control system wrote, read into columns of numbers. Nothing is filled in: a gap stays a gap. */
export type Trend = {
	readonly separator: ';' | ',' | '\t';
	readonly decimalMark: ',' | '.';
	readonly columns: readonly TrendColumn[];
	readonly times: readonly Millis[];
	/** Cells without a value, by column and line: not read as zero, and shown. */
	readonly blanks: readonly { readonly column: string; readonly line: number }[];
	/** Longer than three times the usual interval between two lines. */
	readonly gaps: readonly { readonly after: Millis; readonly minutes: number; readonly line: number }[];
};

export type TrendColumn = {
	readonly name: string;
	readonly unit?: string;
	readonly basis?: 'wet' | 'dry';
	readonly values: readonly (number | undefined)[];
};

export type TrendError =
	| { readonly kind: 'no-table'; readonly lines: number }
	| { readonly kind: 'ragged-line'; readonly line: number; readonly expected: number; readonly found: number }
	| { readonly kind: 'not-a-time'; readonly line: number; readonly found: string; readonly expected: string }
	| { readonly kind: 'time-runs-back'; readonly line: number; readonly found: string; readonly before: string }
	| {
			readonly kind: 'not-a-number';
			readonly line: number;
			readonly column: string;
			readonly found: string;
			readonly expected: string;
	  }
	| { readonly kind: 'column-twice'; readonly column: string };

/**
 * Reads a trend as text: a heading line, then a time and numbers in every line. Separator, decimal mark and time format
 * are found from the whole file and said in the answer, so that a person can correct them; the first cell that does not
 * fit is refused with its line and column.
 *
 * @param utcOffsetMinutes plant local time, for times without an offset of their own
 */
export function parseTrend(text: string, utcOffsetMinutes: number): Result<Trend, TrendError> {
	const lines = text
		.replace(/^\ufeff/, '')
		.split(/\r\n|\r|\n/)
		.map((content, i) => ({ content, line: i + 1 }))
		.filter(({ content }) => content.trim() !== '' && !content.startsWith('#'));
	const [heading, ...rows] = lines;
	const separator = SEPARATORS.find((mark) => (heading?.content.split(mark).length ?? 0) > 1);
	if (heading === undefined || separator === undefined || rows.length === 0)
		return fail({ kind: 'no-table', lines: lines.length });
	const names = heading.content.split(separator).map(headingOf);
	const twice = names.find(({ name }, i) => names.findIndex((other) => other.name === name) !== i);
	if (twice !== undefined) return fail({ kind: 'column-twice', column: twice.name });
	const cells = rows.map(({ content, line }) => ({ line, cells: content.split(separator).map((cell) => cell.trim()) }));
	const ragged = cells.find((row) => row.cells.length !== names.length);
	if (ragged !== undefined)
		return fail({ kind: 'ragged-line', line: ragged.line, expected: names.length, found: ragged.cells.length });
	const decimalMark =
		separator !== ',' && cells.some((row) => row.cells.slice(1).some((cell) => /\d,\d/.test(cell))) ? ',' : '.';
	const times = readTimes(cells, utcOffsetMinutes);
	if (!times.ok) return times;
	const columns: TrendColumn[] = [];
	for (const [i, { name, ...unit }] of names.slice(1).entries()) {
		const values: (number | undefined)[] = [];
		for (const row of cells) {
			const cell = row.cells[i + 1] ?? '';
			const number = cell === '' ? ok(undefined) : parseNumber(cell, { decimalMark });
			if (!number.ok)
				return fail({
					kind: 'not-a-number',
					line: row.line,
					column: name,
					found: cell,
					expected: `a number with "${decimalMark}"`,
				});
			values.push(number.value);
		}
		columns.push({ name, ...unit, values });
	}
	const blanks = columns.flatMap(({ name, values }) =>
		values.flatMap((value, i) => (value === undefined ? [{ column: name, line: cells[i]?.line ?? 0 }] : [])),
	);
	return ok({ separator, decimalMark, columns, times: times.value, blanks, gaps: gapsIn(times.value, cells) });
}

/** "AT-211 [% wet]": a name, and in brackets a unit and a basis. */
function headingOf(cell: string): { readonly name: string; readonly unit?: string; readonly basis?: 'wet' | 'dry' } {
	const found = /^(.*?)\s*(?:\[([^\]]*)\]|\(([^)]*)\))$/.exec(cell.trim());
	if (found === null) return { name: cell.trim() };
	const inside = found[2] ?? found[3] ?? '';
	const basis = /\b(wet|dry)\b/.exec(inside)?.[1] as 'wet' | 'dry' | undefined;
	const unit = inside.replace(/\b(wet|dry)\b/, '').trim();
	return { name: found[1] ?? '', ...(unit === '' ? {} : { unit }), ...(basis === undefined ? {} : { basis }) };
}

function readTimes(
	rows: readonly { readonly line: number; readonly cells: readonly string[] }[],
	offset: number,
): Result<readonly Millis[], TrendError> {
	const times: Millis[] = [];
	for (const { line, cells } of rows) {
		const found = cells[0] ?? '';
		const time = readTime(found, offset);
		if (time === undefined)
			return fail({
				kind: 'not-a-time',
				line,
				found,
				expected: '2026-03-14T20:10:00+01:00, 2026-03-14 20:10:00 or 14.03.2026 20:10:00',
			});
		const before = times.at(-1);
		if (before !== undefined && time <= before)
			return fail({ kind: 'time-runs-back', line, found, before: rows[times.length - 1]?.cells[0] ?? '' });
		times.push(time);
	}
	return ok(times);
}

/** Day and time are both needed: a trend that crosses midnight must not be guessed at. */
function readTime(text: string, offset: number): Millis | undefined {
	const iso = /^(\d{4})-(\d\d)-(\d\d)[T ](\d\d):(\d\d)(?::(\d\d)(?:[.,](\d{1,3}))?)?(Z|[+-]\d\d:\d\d)?$/.exec(text);
	const dotted = /^(\d\d)\.(\d\d)\.(\d{4})[ T](\d\d):(\d\d)(?::(\d\d)(?:[.,](\d{1,3}))?)?$/.exec(text);
	const [year, month, day] = iso === null ? [dotted?.[3], dotted?.[2], dotted?.[1]] : [iso[1], iso[2], iso[3]];
	const [, , , , hour, minute, second = '00', fraction = '0'] = iso ?? dotted ?? [];
	if (year === undefined || month === undefined || day === undefined || hour === undefined || minute === undefined)
		return undefined;
	const local = Date.parse(`${year}-${month}-${day}T${hour}:${minute}:${second}.${fraction.padEnd(3, '0')}Z`);
	// Date.parse takes 31 April as 1 May in some engines: the day must come back as it was written.
	if (Number.isNaN(local) || new Date(local).getUTCDate() !== Number(day)) return undefined;
	const zone = iso?.[8];
	if (zone === undefined) return local - offset * MINUTE;
	return zone === 'Z' ? local : Date.parse(text.replace(' ', 'T').replace(',', '.'));
}

function gapsIn(times: readonly Millis[], rows: readonly { readonly line: number }[]): Trend['gaps'] {
	const steps = times.slice(1).map((time, i) => time - (times[i] ?? 0));
	const usual = [...steps].sort((a, b) => a - b)[Math.floor(steps.length / 2)] ?? 0;
	return steps.flatMap((step, i) =>
		step > 3 * usual ? [{ after: times[i] ?? 0, minutes: step / MINUTE, line: rows[i + 1]?.line ?? 0 }] : [],
	);
}

const SEPARATORS = [';', '\t', ','] as const;
