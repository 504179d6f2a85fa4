import { readFileSync } from 'node:fs';
import * as v from 'valibot';
import { describe, expect, test } from 'vitest';
import { standingCommand } from '../../../src/cli/commands/standing';
import { AnswerSchema, printEventLine } from '../../../src/lib/record';
import { aFolder } from '../../support/files';
import { heard } from '../../support/heard';
import { clock, minutesOf, NIGHT, tellNight } from '../../support/night';

const folder = aFolder();
const PROCEDURE = 'static/demo/night/procedure.json';
const night = tellNight();
const events = folder.put('events.ndjson', night.events.map(printEventLine).join('\n'));
const site = folder.put('site.ndjson', night.site.map(printEventLine).join('\n'));

async function run(...args: readonly string[]) {
	const { terminal, printed, complained } = heard();
	const outcome = await standingCommand.run(args, terminal);
	return { outcome, printed: printed.join('\n'), complained: complained.join('\n') };
}

const answerOf = (printed: string) => v.parse(AnswerSchema, JSON.parse(printed));

describe('what stands', () => {
	// Expected states: the independent simulator of the start-up night (test/vectors/record/SOURCE.md).
	test.each(NIGHT.expected.filter((_, i) => i % 9 === 4).map((row) => [row.no, row] as const))(
		'row %s of the night, from files',
		async (_no, row) => {
			const minutes = minutesOf(row.at);
			const tablet = minutes >= 780 ? 'T-2' : 'T-1';
			const asked = ['--site', site, '--at', clock(minutes), '--known-to', tablet, '--json'];
			const { outcome, printed } = await run(PROCEDURE, events, ...asked);
			const answer = answerOf(printed);
			expect({ outcome, gates: answer.gates.map(({ state }) => state) }).toEqual({
				outcome: 'passed',
				gates: row.gates,
			});
			expect(answer.reproof.steps).toEqual(row.reproof);
		},
	);

	test('it says that it checks no signatures, on standard error and in its answer', async () => {
		const { printed, complained } = await run(PROCEDURE, events, '--json');
		expect(complained).toContain('Signatures are not checked here');
		expect(answerOf(printed).checksSignatures).toBe(false);
	});

	test('without --at it is asked for the newest entry of the file', async () => {
		const newest = [...night.events].sort((a, b) => a.enteredAt - b.enteredAt).at(-1)!.entered;
		expect(answerOf((await run(PROCEDURE, events, '--json')).printed).at).toBe(newest);
	});

	test('a tablet that had not heard of the burner trip shows gate 4 as it knew it', async () => {
		const row = NIGHT.expected.find(({ no }) => no === 39)!;
		const asked = [PROCEDURE, events, '--site', site, '--at', clock(minutesOf(row.at)), '--json'];
		const gate4 = (printed: string) => answerOf(printed).gates[4]?.state;
		expect(gate4((await run(...asked, '--known-to', 'T-2')).printed)).toBe('released');
		expect(gate4((await run(...asked)).printed)).toBe('lapsed');
	});

	test('for people: gates, what does not stand and why, what to prove again', async () => {
		const { printed } = await run(PROCEDURE, events, '--site', site, '--at', clock(810));
		expect(printed).toMatch(/^Gate 4 Warm and dry: lapsed/m);
		expect(printed).toMatch(/^ {2}E1: lapsed; Burner tripped 04:59 to 05:03$/m);
		expect(printed).toMatch(/^To prove again: \d+ steps/m);
	});
});

describe('what cannot be read is named, and nothing is answered', () => {
	const lines = (): string[] => readFileSync(events, 'utf8').split('\n');

	test('a foreign record file: the first line is named with what was expected', async () => {
		const foreign = folder.put('foreign.ndjson', '{"time":"08:00","tag":"AT-211","value":7.4}\n');
		const { outcome, printed, complained } = await run(PROCEDURE, foreign);
		expect({ outcome, printed }).toEqual({ outcome: 'unusable-input', printed: '' });
		expect(complained).toMatch(
			/foreign\.ndjson is no record: Line 1, .+ was expected, .+ Correct that line, or leave it out/,
		);
	});

	test('one bad line among good ones: its number, its place, what was expected', async () => {
		const changed = lines();
		const stored = JSON.parse(changed[6]!) as { text: string };
		const envelope = JSON.parse(stored.text) as { clock: unknown };
		changed[6] = JSON.stringify({ ...envelope, clock: 'late' });
		const { complained } = await run(PROCEDURE, folder.put('bad.ndjson', changed.join('\n')));
		expect(complained).toContain('Line 7, clock: number was expected, "late" stands there');
	});

	test.each([
		['yesterday', '--at yesterday is no moment'],
		['2026-13-45T00:00:00Z', 'is no moment'],
	])('--at %s', async (at, because) => {
		const { outcome, complained } = await run(PROCEDURE, events, '--at', at);
		expect(outcome).toBe('unusable-input');
		expect(complained).toContain(because);
	});

	test('a missing file, a missing word, an unknown option', async () => {
		expect((await run(PROCEDURE)).complained).toBe('A procedure file and an event file are asked for.');
		expect((await run(PROCEDURE, `${folder.path}/gone`)).complained).toContain('there is no such file');
		expect((await run(PROCEDURE, events, '--when', 'now')).complained).toContain('--when');
	});
});
