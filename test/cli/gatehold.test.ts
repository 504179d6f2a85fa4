import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { COMMANDS } from '../../src/cli/commands';
import { BUILD } from '../../src/lib/demo';
import { CATALOGUE } from '../../src/lib/calc';
import { PURGE_INPUTS } from '../support/small-procedure';

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

const gatehold = (args: readonly string[], input = '') =>
	spawnSync('npm', ['run', '--silent', 'gatehold', '--', ...args], { cwd: HOUSE, encoding: 'utf8', input });

test('the built command line calculates from standard input, and refuses with code 3', () => {
	const { status, stdout, stderr } = gatehold(['calc', 'sweep-purge'], JSON.stringify(PURGE_INPUTS));
	expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
	expect(JSON.parse(stdout)).toMatchObject({ calc: 'sweep-purge@1', scope: 'in scope' });
	expect(gatehold(['calc', 'sweep-purge'], '{}').status).toBe(3);
});

test('a long answer arrives whole through a pipe', () => {
	const { status, stdout } = gatehold(['calc', '--list', '--json']);
	expect(status).toBe(0);
	// More than a pipe holds at once.
	expect(stdout.length).toBeGreaterThan(65_536);
	expect((JSON.parse(stdout) as object[]).length).toBe(Object.keys(CATALOGUE).length);
});

test('what stands is told from files, with code 0; a foreign file has code 3; a missing procedure too', () => {
	const night = ['static/demo/night/procedure.json', 'static/demo/night/events.ndjson'];
	const { status, stdout } = gatehold(['standing', ...night, '--site', 'static/demo/night/site.ndjson', '--json']);
	expect({ status, format: (JSON.parse(stdout) as { format: string }).format }).toEqual({
		status: 0,
		format: 'gatehold-standing/1',
	});
	expect(gatehold(['standing', night[0]!, 'package.json']).status).toBe(3);
	expect(gatehold(['check-procedure', 'no-such-file.json']).status).toBe(3);
});

test('the name of the build is the version of the package', () => {
	const { version } = JSON.parse(readFileSync(join(HOUSE, 'package.json'), 'utf8')) as { version: string };
	expect(BUILD).toBe(`Gatehold ${version}`);
});

test('the README tells every command', () => {
	const readme = readFileSync(join(HOUSE, 'README.md'), 'utf8');
	const untold = Object.keys(COMMANDS).filter((name) => !readme.includes(`npm run --silent gatehold -- ${name}`));
	expect(untold).toEqual([]);
});
