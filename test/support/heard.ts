import type { Terminal } from '../../src/cli/command';

/** A terminal that keeps what was said to it, and hands in what a test types. */
export type Heard = { readonly terminal: Terminal; readonly printed: string[]; readonly complained: string[] };

export function heard(input = ''): Heard {
	const [printed, complained]: [string[], string[]] = [[], []];
	const terminal: Terminal = {
		print: (text) => printed.push(text),
		complain: (text) => complained.push(text),
		readInput: () => Promise.resolve(input),
	};
	return { terminal, printed, complained };
}
