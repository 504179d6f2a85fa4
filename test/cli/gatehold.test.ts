import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { COMMANDS } from '../../src/cli/commands';

const HOUSE = join(import.meta.dirname, '../..');

test('npm run gatehold passes on the exit code, and nothing but the command speaks', () => {
	const { status, stdout, stderr } = spawnSync('npm', ['run', '--silent', 'gatehold', '--', 'no-such-command'], {
		cwd: HOUSE,
		encoding: 'utf8',
	});
	expect(status).toBe(3);
	expect(stdout).toBe('');
	expect(
		stderr.startsWith('There is no command "no-such-command".\n\nusage: npm run --silent gatehold -- COMMAND\n'),
	).toBe(true);
});

test('the README tells every command', () => {
	const readme = readFileSync(join(HOUSE, 'README.md'), 'utf8');
	const untold = Object.keys(COMMANDS).filter((name) => !readme.includes(`npm run --silent gatehold -- ${name}`));
	expect(untold).toEqual([]);
});
