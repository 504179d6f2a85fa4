import { describe, expect, test } from 'vitest';
import { EXIT_CODES, type Command, type Terminal } from '../../src/cli/command';
import { main } from '../../src/cli/main';

const proof: Command = {
	usage: 'proof FILE [--json]',
	does: 'says whether a proof stands',
	run: async (args, terminal) => {
		terminal.print(`${args.join(' ')}, ${await terminal.readInput()}`);
		return 'indeterminate';
	},
};

function heard(): { terminal: Terminal; printed: string[]; complained: string[] } {
	const [printed, complained]: [string[], string[]] = [[], []];
	const terminal: Terminal = {
		print: (text) => printed.push(text),
		complain: (text) => complained.push(text),
		readInput: () => Promise.resolve('7.4 %'),
	};
	return { terminal, printed, complained };
}

describe('the command line', () => {
	test('hands the words after the name to the command and passes on how it ended', async () => {
		const { terminal, printed, complained } = heard();
		expect(await main(['proof', 'a.json', '--json'], { proof }, terminal)).toBe('indeterminate');
		expect({ printed, complained }).toEqual({ printed: ['a.json --json, 7.4 %'], complained: [] });
	});

	test.each(['prove', '', '__proto__', 'toString'])('does not know "%s": usage on standard error', async (name) => {
		const { terminal, printed, complained } = heard();
		expect(await main([name], { proof }, terminal)).toBe('unusable-input');
		expect(printed).toEqual([]);
		expect(complained.join()).toContain(`There is no command "${name}".`);
		expect(complained.join()).toContain('proof FILE [--json]');
	});

	test('without a word it explains itself, and has done nothing', async () => {
		const { terminal, complained } = heard();
		expect(await main([], { proof }, terminal)).toBe('unusable-input');
		expect(complained.join()).toContain('says whether a proof stands');
	});

	test('asked for help it explains itself', async () => {
		const { terminal, printed } = heard();
		expect(await main(['help'], { proof }, terminal)).toBe('passed');
		expect(printed.join()).toContain('proof FILE [--json]');
	});

	test('tells failed from indeterminate from unusable by its exit code', () => {
		expect(EXIT_CODES).toEqual({ passed: 0, failed: 1, indeterminate: 2, 'unusable-input': 3 });
	});
});
