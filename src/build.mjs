/**
 * Builds the app (build/app) and the command line (build/cli). Run as a program it builds both;
 * `--if-stale app` or `--if-stale cli` builds, without a word, only what its sources have outrun.
 */
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** @typedef {'app' | 'cli'} Product */

const HOUSE = fileURLToPath(new URL('..', import.meta.url));
const LOCK = join(HOUSE, 'build/building');

/** What each product is made from: a change in any of these makes it stale. */
const SOURCES = {
	app: ['src', 'static', 'vite.config.ts', 'svelte.config.js', 'tsconfig.json', 'package-lock.json'],
	cli: ['src/cli', 'src/lib', 'vite.config.ts', 'package-lock.json'],
};

/** @param {Product} product */
const stampOf = (product) => join(HOUSE, `build/${product}.sources`);

/**
 * @param {Product} product
 * @returns {boolean} whether something was built
 */
export function buildIfStale(product) {
	if (isFresh(product)) return false;
	return alone(() => {
		if (isFresh(product)) return false;
		build(product, { quiet: true });
		return true;
	});
}

/** @param {Product} product */
const isFresh = (product) =>
	existsSync(stampOf(product)) && readFileSync(stampOf(product), 'utf8') === hashOfSources(product);

/**
 * @param {Product} product
 * @param {{ quiet: boolean }} manner
 */
function build(product, { quiet }) {
	const vite = join(HOUSE, 'node_modules/vite/bin/vite.js');
	if (!existsSync(vite)) throw new Error('The packages are not installed. Run: npm ci');
	const sources = hashOfSources(product);
	rmSync(stampOf(product), { force: true });
	const { status, stdout, stderr } = spawnSync(
		process.execPath,
		[vite, 'build', ...(product === 'cli' ? ['--mode', 'cli'] : []), ...(quiet ? ['--logLevel', 'error'] : [])],
		{
			cwd: HOUSE,
			stdio: quiet ? 'pipe' : 'inherit',
			encoding: 'utf8',
			// Whoever starts us: a test runner's own setting would make a build for development.
			env: { ...process.env, NODE_ENV: 'production', GATEHOLD_BUILD: sources.slice(0, 12) },
		},
	);
	if (status !== 0) throw new Error(`The build failed.\n${quiet ? stdout + stderr : ''}`);
	writeFileSync(stampOf(product), sources);
}

/** Content, not dates: a fresh clone gives every file the date of the clone. @param {Product} product */
function hashOfSources(product) {
	const hash = createHash('sha256').update(process.version);
	for (const file of SOURCES[product].flatMap(filesUnder))
		hash.update(`\0${file}\0`).update(readFileSync(join(HOUSE, file)));
	return hash.digest('hex');
}

/**
 * @param {string} path relative to the house
 * @returns {string[]}
 */
function filesUnder(path) {
	const full = join(HOUSE, path);
	if (!existsSync(full)) return [];
	if (!statSync(full).isDirectory()) return [path];
	return readdirSync(full)
		.sort()
		.flatMap((name) => filesUnder(`${path}/${name}`));
}

/**
 * Two commands started together must not build into the same folder: the second waits, then finds the work done.
 *
 * @template T
 * @param {() => T} work
 */
function alone(work) {
	mkdirSync(join(HOUSE, 'build'), { recursive: true });
	while (!take(LOCK)) Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 100);
	try {
		return work();
	} finally {
		rmSync(LOCK, { force: true });
	}
}

/** @param {string} lock a file that holds the number of the process which builds */
function take(lock) {
	try {
		writeFileSync(lock, String(process.pid), { flag: 'wx' });
		return true;
	} catch {
		if (!isAlive(lock)) rmSync(lock, { force: true });
		return false;
	}
}

/** @param {string} lock */
function isAlive(lock) {
	try {
		const pid = Number(readFileSync(lock, 'utf8'));
		// Between its making and its writing the file is empty: somebody is just taking it.
		return pid === 0 ? Date.now() - statSync(lock).mtimeMs < 10_000 : process.kill(pid, 0);
	} catch (error) {
		return /** @type {NodeJS.ErrnoException} */ (error).code === 'EPERM';
	}
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
	const [, , flag, product] = process.argv;
	try {
		if (flag === undefined)
			for (const each of /** @type {const} */ (['app', 'cli'])) alone(() => build(each, { quiet: false }));
		else if (flag === '--if-stale' && (product === 'app' || product === 'cli')) buildIfStale(product);
		else throw new Error('usage: node src/build.mjs [--if-stale app|cli]');
	} catch (error) {
		console.error(error instanceof Error ? error.message : error);
		process.exitCode = 4;
	}
}
