import type { Command, Outcome, Terminal } from './command';

/** Chooses the command that the first word names and runs it; explains itself when there is none. */
export async function main(
	args: readonly string[],
	commands: { readonly [name: string]: Command },
	terminal: Terminal,
): Promise<Outcome> {
	const [name, ...rest] = args;
	if (name === 'help' || name === '--help') {
		terminal.print(usage(commands));
		return 'passed';
	}
	const command = name !== undefined && Object.hasOwn(commands, name) ? commands[name] : undefined;
	if (command === undefined) {
		terminal.complain(name === undefined ? usage(commands) : `There is no command "${name}".\n\n${usage(commands)}`);
		return 'unusable-input';
	}
	return command.run(rest, terminal);
}

const usage = (commands: { readonly [name: string]: Command }): string =>
	[
		'usage: npm run --silent gatehold -- COMMAND',
		'',
		...Object.values(commands).flatMap((command) => [`  ${command.usage}`, `      ${command.does}`]),
		'',
		'Exit code: 0 passed, 1 failed, 2 indeterminate, 3 unusable input.',
	].join('\n');
