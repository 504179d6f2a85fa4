/** How a command ended; each has its own exit code, so that a script can tell "failed" from "could not be judged". */
export type Outcome = 'passed' | 'failed' | 'indeterminate' | 'unusable-input';

export const EXIT_CODES: { readonly [outcome in Outcome]: number } = {
	passed: 0,
	failed: 1,
	indeterminate: 2,
	'unusable-input': 3,
};

/** What a command may touch of the terminal: handed in, so that a test can listen. */
export type Terminal = {
	/** Results: standard output. */
	readonly print: (text: string) => void;
	/** What went wrong and usage: standard error. */
	readonly complain: (text: string) => void;
	readonly readInput: () => Promise<string>;
};

export type Command = {
	/** One line, as typed after the program's name: `verify FILE... [--json]`. */
	readonly usage: string;
	/** One line for people. */
	readonly does: string;
	readonly run: (args: readonly string[], terminal: Terminal) => Promise<Outcome>;
};

/** What was given cannot be worked with: says what happened, what is safe and what to do. */
export function unusable(terminal: Terminal, because: string): Outcome {
	terminal.complain(because);
	return 'unusable-input';
}
