import { parseTrend, printInstant, type Trend } from '../../lib/record';
import { sayTrendError, speaker } from '../../lib/wording';
import { unusable, type Command, type Terminal } from '../command';
import { readText } from '../files';
import { readOptions } from '../options';

const say = speaker('en');

export const trend: Command = {
	usage: 'trend FILE [--offset MINUTES] [--json]',
	does: 'reads a trend of a recorder as a series would: columns, decimal mark, gaps and empty cells with their lines',
	run: async (args, terminal) => {
		const given = readOptions(args, { values: ['offset'], switches: ['json'] });
		const [file, ...more] = given.ok ? given.value.files : [];
		if (!given.ok || file === undefined || more.length > 0)
			return unusable(terminal, given.ok ? 'One trend file is asked for.' : given.error);
		const offset = Number(given.value.value('offset') ?? '0');
		if (!Number.isInteger(offset)) return unusable(terminal, '--offset takes whole minutes east of UTC.');
		const text = await readText(file);
		if (!text.ok) return unusable(terminal, text.error);
		const read = parseTrend(text.value, offset);
		if (!read.ok) return unusable(terminal, `${file}: ${sayTrendError(read.error, say)}`);
		if (given.value.has('json')) terminal.print(JSON.stringify(read.value, null, '\t'));
		else tell(terminal, file, read.value, offset);
		return 'passed';
	},
};

function tell(
	terminal: Terminal,
	file: string,
	{ columns, times, blanks, gaps, separator, decimalMark }: Trend,
	offset: number,
): void {
	const at = (time: number | undefined): string => printInstant(time ?? 0, offset);
	const between = separator === '\t' ? 'tab' : `"${separator}"`;
	terminal.print(
		`${file}: ${times.length} lines from ${at(times[0])} to ${at(times.at(-1))}, ${between} between columns, decimal mark "${decimalMark}"`,
	);
	for (const { name, unit, basis, values } of columns) {
		const read = values.filter((value) => value !== undefined);
		const range = read.length === 0 ? 'no value' : `${Math.min(...read)} to ${Math.max(...read)}`;
		const what = [unit ?? 'no unit stated', ...(basis === undefined ? [] : [basis])].join(' ');
		terminal.print(`  ${name} [${what}]: ${read.length} values, ${range}`);
	}
	for (const { column, line } of blanks) terminal.print(`  line ${line}: ${column} is empty; it stays empty`);
	for (const { after, minutes, line } of gaps)
		terminal.print(
			`  line ${line}: ${Number(minutes.toFixed(1))} min without a line after ${at(after)}; nothing is filled in`,
		);
}
