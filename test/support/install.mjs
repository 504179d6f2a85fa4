import { spawnSync } from 'node:child_process';
import { accessSync, constants, existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';

/**
 * @param {string} program
 * @returns {string | undefined} where the program lies on the PATH
 */
export const which = (program) =>
	(process.env.PATH ?? '')
		.split(delimiter)
		.map((folder) => join(folder, program))
		.find(isExecutable);

/** Installing asks nobody only where that is usual: as root on a Debian, which is what a build machine is. */
export const canInstallPackages = () =>
	process.getuid?.() === 0 && which('apt-get') !== undefined && existsSync('/etc/debian_version');

/**
 * @param {readonly string[]} packages Debian packages
 * @returns {boolean} whether apt-get says that they are there now
 */
export function installPackages(packages) {
	console.log(`installing ${packages.join(' ')} (apt-get)`);
	return (
		run('apt-get', ['update', '-qq']) &&
		run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', ...packages])
	);
}

/**
 * @param {string} program
 * @param {readonly string[]} args
 */
export function run(program, args) {
	const { status, stderr, error } = spawnSync(program, args, {
		stdio: ['ignore', 'ignore', 'pipe'],
		encoding: 'utf8',
		env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
	});
	if (status !== 0) console.error(`${[program, ...args].join(' ')}\n${error?.message ?? stderr}`);
	return status === 0;
}

/** @param {string} file */
function isExecutable(file) {
	try {
		accessSync(file, constants.X_OK);
		return true;
	} catch {
		return false;
	}
}
