import { text } from 'node:stream/consumers';
import { EXIT_CODES, type Outcome, type Terminal } from './command';
import { COMMANDS } from './commands';
import { main } from './main';

const terminal: Terminal = {
	print: (line) => process.stdout.write(`${line}\n`),
	complain: (line) => process.stderr.write(`${line}\n`),
	readInput: () => text(process.stdin),
};

// A reader that has seen enough (head) closes the pipe: no fault of the command.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
	if (error.code !== 'EPIPE') throw error;
});

// Not process.exit: what was printed into a pipe must still arrive.
process.exitCode = EXIT_CODES[await main(process.argv.slice(2), COMMANDS, terminal).catch(notJudged)];

/** A fault of ours is neither "passed" nor "failed": nothing was judged. */
function notJudged(error: unknown): Outcome {
	terminal.complain(error instanceof Error ? (error.stack ?? error.message) : String(error));
	return 'indeterminate';
}
