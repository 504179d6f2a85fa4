import { describe, expect, test } from 'vitest';
import { trend } from '../../../src/cli/commands/trend';
import { aFolder } from '../../support/files';
import { heard } from '../../support/heard';

const folder = aFolder();

async function run(...args: readonly string[]) {
	const { terminal, printed, complained } = heard();
	const outcome = await trend.run(args, terminal);
	return { outcome, printed: printed.join('\n'), complained: complained.join('\n') };
}

describe('a trend file', () => {
	test('with decimal commas, empty cells and a gap: each is told with its line, and nothing is filled in', async () => {
		const { outcome, printed } = await run('static/demo/trends/purge-1-decimal-comma.csv', '--offset', '60');
		expect(outcome).toBe('passed');
		expect(printed).toMatch(/";" between columns, decimal mark ","/);
		expect(printed.match(/line \d+: \S+ is empty; it stays empty/g)).toHaveLength(5);
		expect(
			printed.match(/line \d+: [\d.]+ min without a line after 2026-03-14T.*; nothing is filled in/g),
		).toHaveLength(1);
	});

	test('with a word among its numbers: line and column are named, and nothing is read', async () => {
		const file = folder.put('bad.csv', 'time;AT-211 [% wet]\n2026-03-14 20:00;20,9\n2026-03-14 20:01;bad\n');
		const { outcome, printed, complained } = await run(file);
		expect(outcome).toBe('unusable-input');
		expect(printed).toBe('');
		expect(complained).toMatch(/bad\.csv: .*[Ll]ine 3.*AT-211/);
	});
});
