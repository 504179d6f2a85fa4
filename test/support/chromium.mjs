import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium } from 'playwright-core';
import { canInstallPackages, installPackages, run, which } from './install.mjs';

/**
 * Finds a Chromium, or installs one; throws with the line that installs it where nothing works.
 *
 * @returns {string} the path of the browser
 */
export function ensureChromium() {
	const named = process.env.CHROME_PATH;
	if (named !== undefined && named !== '') {
		if (existsSync(named)) return named;
		throw new Error(`CHROME_PATH names ${named}, and there is nothing there.`);
	}
	const found = findChromium();
	if (found !== undefined) return found;
	if (canInstallPackages()) installPackages(['chromium']);
	else run(process.execPath, ['node_modules/playwright-core/cli.js', 'install', 'chromium']);
	const installed = findChromium();
	if (installed !== undefined) return installed;
	throw new Error(
		'The tests open the app in Chromium; none was found and none could be installed.\n' +
			'Install: sudo apt-get install -y chromium, or: npx playwright-core install chromium, or set CHROME_PATH.',
	);
}

function findChromium() {
	const bundled = chromium.executablePath();
	return (
		['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome', 'chrome']
			.map((program) => which(program))
			.find((path) => path !== undefined) ?? (existsSync(bundled) ? bundled : undefined)
	);
}

/**
 * Opens a browser with a fresh profile that can reach this machine alone, and hands over its one context.
 *
 * @template T
 * @param {(context: import('playwright-core').BrowserContext) => Promise<T>} use
 * @param {import('playwright-core').BrowserContextOptions} [options]
 */
export async function withChromium(use, options = {}) {
	const profile = mkdtempSync(join(tmpdir(), 'gatehold-profile-'));
	const context = await chromium.launchPersistentContext(profile, {
		executablePath: ensureChromium(),
		headless: true,
		args: FLAGS,
		...options,
	});
	try {
		return await use(context);
	} finally {
		await context.close();
		rmSync(profile, { recursive: true, force: true });
	}
}

/**
 * Starts a browser on a profile that outlives it, to be killed as a dying tablet kills it: the whole group at once, no
 * farewell, nothing flushed.
 *
 * @param {string} profile
 * @param {readonly string[]} [under] a program, with its arguments, that starts the browser and watches it
 */
export async function startChromium(profile, under = []) {
	for (const left of ['SingletonLock', 'SingletonSocket', 'SingletonCookie', 'DevToolsActivePort'])
		rmSync(join(profile, left), { force: true });
	const where = [`--user-data-dir=${profile}`, '--remote-debugging-port=0', 'about:blank'];
	const [program = '', ...args] = [...under, ensureChromium(), '--headless', ...FLAGS, ...where];
	const child = spawn(program, args, {
		stdio: ['ignore', 'ignore', 'pipe'],
		detached: true,
	});
	const ended = new Promise((resolve) => child.once('exit', resolve));
	const kill = async () => {
		if (child.pid !== undefined && child.exitCode === null && child.signalCode === null)
			process.kill(-child.pid, 'SIGKILL');
		await ended;
	};
	try {
		const browser = await chromium.connectOverCDP(await debuggerOf(child));
		const context = browser.contexts()[0];
		if (context === undefined) throw new Error('the browser has no context');
		return { context, kill };
	} catch (error) {
		await kill();
		throw error;
	}
}

/**
 * @param {import('node:child_process').ChildProcess} child
 * @returns {Promise<string>} the address that the browser prints when it is ready
 */
const debuggerOf = (child) =>
	new Promise((resolve, reject) => {
		let said = '';
		child.stderr?.on('data', (data) => {
			said += String(data);
			const address = /DevTools listening on (ws:\S+)/.exec(said)?.[1];
			if (address !== undefined) resolve(address);
		});
		child.once('exit', () => reject(new Error(`the browser ended before it was ready: ${said.slice(-400)}`)));
	});

/** A browser speaks to its maker by itself; these keep it silent, and the last keeps every other host out of reach. */
const QUIET = [
	'--disable-background-networking',
	'--disable-component-update',
	'--disable-default-apps',
	'--disable-domain-reliability',
	'--disable-sync',
	'--no-default-browser-check',
	'--no-first-run',
	'--no-pings',
	'--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE localhost, EXCLUDE 127.0.0.1',
];

const FLAGS = [...QUIET, ...(process.getuid?.() === 0 ? ['--no-sandbox'] : [])];
