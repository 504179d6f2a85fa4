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
	| { readonly kind: 'column-twice'; readonly column: string }
	| { readonly kind: 'no-time-column'; readonly column: string };

/** How a person says that a file is to be read, where what would be found in it is not so. Kept with the series. */
export type TrendReading = {
	readonly separator?: Trend['separator'];
	readonly decimalMark?: Trend['decimalMark'];
	/** Heading of the column that holds the times; absent: the first. */
	readonly timeColumn?: string;
	/** Order of day and month; absent: years first, or days first with points. */
	readonly time?: 'year first' | 'day first' | 'month first';
};

/**
 * Reads a trend as text: a heading line, then a time and numbers in every line. Separator, decimal mark and time format
 * are found from the whole file and said in the answer, so that a person can correct them; the first cell that does not
 * fit is refused with its line and column.
 *
 * @param utcOffsetMinutes plant local time, for times without an offset of their own
 * @param reading what a person corrected; absent: everything is found
 */
export function parseTrend(
	text: string,
	utcOffsetMinutes: number,
	reading: TrendReading = {},
): Result<Trend, TrendError> {
	const table = tableOf(text, reading.separator);
	if (table === undefined) return fail({ kind: 'no-table', lines: linesOf(text).length });
	const { separator, rows } = table;
	const names = table.heading.map(headingOf);
	const twice = names.find(({ name }, i) => names.findIndex((other) => other.name === name) !== i);
	if (twice !== undefined) return fail({ kind: 'column-twice', column: twice.name });
	const ragged = rows.find(({ cells }) => cells.length !== names.length);
	if (ragged !== undefined)
		return fail({ kind: 'ragged-line', line: ragged.line, expected: names.length, found: ragged.cells.length });
	const timeAt = reading.timeColumn === undefined ? 0 : names.findIndex(({ name }) => name === reading.timeColumn);
	if (timeAt === -1) return fail({ kind: 'no-time-column', column: reading.timeColumn ?? '' });
	const hasComma = rows.some(({ cells }) => cells.some((cell, i) => i !== timeAt && /\d,\d/.test(cell)));
	const decimalMark = reading.decimalMark ?? (separator !== ',' && hasComma ? ',' : '.');
	const times = readTimes(
		rows.map(({ line, cells }) => ({ line, cell: cells[timeAt] ?? '' })),
		utcOffsetMinutes,
		reading.time,
	);
	if (!times.ok) return times;
	const columns: TrendColumn[] = [];
	for (const [i, { name, ...unit }] of names.entries()) {
		if (i === timeAt) continue;
		const values: (number | undefined)[] = [];
		for (const { cells, line } of rows) {
			const cell = cells[i] ?? '';
			const number = cell === '' ? ok(undefined) : parseNumber(cell, { decimalMark });
			if (!number.ok)
				return fail({
					kind: 'not-a-number',
					line,
					column: name,
					found: cell,
					expected: `a number with "${decimalMark}"`,
				});
			values.push(number.value);
		}
		columns.push({ name, ...unit, values });
	}
	const blanks = columns.flatMap(({ name, values }) =>
		values.flatMap((value, i) => (value === undefined ? [{ column: name, line: rows[i]?.line ?? 0 }] : [])),
	);
	return ok({ separator, decimalMark, columns, times: times.value, blanks, gaps: gapsIn(times.value, rows) });
}

/** The cells of a file as they stand in it, before anything is read from them: what a person looks at to correct a reading. */
export type TrendTable = {
	readonly separator: Trend['separator'];
	readonly heading: readonly string[];
	readonly rows: readonly { readonly line: number; readonly cells: readonly string[] }[];
};

export function tableOf(text: string, given?: Trend['separator']): TrendTable | undefined {
	const [heading, ...rows] = linesOf(text);
	if (heading === undefined || rows.length === 0) return undefined;
	const found = given ?? SEPARATORS.find((mark) => heading.content.split(mark).length > 1);
	if (found === undefined) return undefined;
	const cellsOf = (content: string): readonly string[] => content.split(found).map((cell) => cell.trim());
	const names = cellsOf(heading.content);
	if (names.length < 2) return undefined;
	return {
		separator: found,
		heading: names,
		rows: rows.map(({ content, line }) => ({ line, cells: cellsOf(content) })),
	};
}

/** The name of a column as its heading says it, without unit and basis. */
export const columnName = (heading: string): string => headingOf(heading).name;

const linesOf = (text: string): readonly { readonly content: string; readonly line: number }[] =>
	text
		.replace(/^\ufeff/, '')
		.split(/\r\n|\r|\n/)
		.map((content, i) => ({ content, line: i + 1 }))
		.filter(({ content }) => content.trim() !== '' && !content.startsWith('#'));

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
	rows: readonly { readonly line: number; readonly cell: string }[],
	offset: number,
	order: TrendReading['time'],
): Result<readonly Millis[], TrendError> {
	const times: Millis[] = [];
	for (const { line, cell: found } of rows) {
		const time = readTime(found, offset, order);
		if (time === undefined) return fail({ kind: 'not-a-time', line, found, expected: EXPECTED_TIMES[order ?? 'any'] });
		const before = times.at(-1);
		if (before !== undefined && time <= before)
			return fail({ kind: 'time-runs-back', line, found, before: rows[times.length - 1]?.cell ?? '' });
		times.push(time);
	}
	return ok(times);
}

const EXPECTED_TIMES = {
	any: '2026-03-14T20:10:00+01:00, 2026-03-14 20:10:00 or 14.03.2026 20:10:00',
	'year first': '2026-03-14T20:10:00+01:00 or 2026/03/14 20:10:00',
	'day first': '14.03.2026 20:10:00, 14/03/2026 20:10:00 or 14-03-2026 20:10:00',
	'month first': '03/14/2026 20:10:00 or 03-14-2026 20:10:00',
} as const;

/** Day and time are both needed: a trend that crosses midnight must not be guessed at. */
function readTime(text: string, offset: number, order: TrendReading['time']): Millis | undefined {
	const day = DAYS[order ?? 'any'].map((pattern) => pattern.exec(text)).find((found) => found !== null)?.groups;
	const time = /[T ](\d\d?):(\d\d)(?::(\d\d)(?:[.,](\d{1,3}))?)?(Z|[+-]\d\d:\d\d)?$/.exec(text);
	if (day === undefined || time === null) return undefined;
	const [, hour = '', minute = '', second = '00', fraction = '0', zone] = time;
	const [y = '', m = '', d = ''] = [day.year, day.month?.padStart(2, '0'), day.day?.padStart(2, '0')];
	const clock = `${hour.padStart(2, '0')}:${minute}:${second}.${fraction.padEnd(3, '0')}`;
	const local = Date.parse(`${y}-${m}-${d}T${clock}Z`);
	// Date.parse takes 31 April as 1 May in some engines: the day must come back as it was written.
	if (Number.isNaN(local) || new Date(local).getUTCDate() !== Number(d)) return undefined;
	return zone === undefined ? local - offset * MINUTE : Date.parse(`${y}-${m}-${d}T${clock}${zone}`);
}

const TIME = String.raw`[T ]\d\d?:\d\d(?::\d\d(?:[.,]\d{1,3})?)?`;
const ZONE = String.raw`(?:Z|[+-]\d\d:\d\d)?`;
const ISO = new RegExp(
	String.raw`^(?<year>\d{4})-(?<month>\d\d)-(?<day>\d\d)[T ]\d\d:\d\d(?::\d\d(?:[.,]\d{1,3})?)?${ZONE}$`,
);
const DOTTED = new RegExp(
	String.raw`^(?<day>\d\d)\.(?<month>\d\d)\.(?<year>\d{4})[T ]\d\d:\d\d(?::\d\d(?:[.,]\d{1,3})?)?$`,
);
const MARK = String.raw`([./-])`;

/** What nobody corrected is read in two ways alone, which cannot be mistaken for each other. */
const DAYS = {
	any: [ISO, DOTTED],
	'year first': [new RegExp(String.raw`^(?<year>\d{4})${MARK}(?<month>\d\d?)\2(?<day>\d\d?)${TIME}${ZONE}$`)],
	'day first': [new RegExp(String.raw`^(?<day>\d\d?)${MARK}(?<month>\d\d?)\2(?<year>\d{4})${TIME}$`)],
	'month first': [new RegExp(String.raw`^(?<month>\d\d?)${MARK}(?<day>\d\d?)\2(?<year>\d{4})${TIME}$`)],
} as const;

function gapsIn(times: readonly Millis[], rows: readonly { readonly line: number }[]): Trend['gaps'] {
	const steps = times.slice(1).map((time, i) => time - (times[i] ?? 0));
	const usual = [...steps].sort((a, b) => a - b)[Math.floor(steps.length / 2)] ?? 0;
	return steps.flatMap((step, i) =>
		step > 3 * usual ? [{ after: times[i] ?? 0, minutes: step / MINUTE, line: rows[i + 1]?.line ?? 0 }] : [],
	);
}

const SEPARATORS = [';', '\t', ','] as const;
