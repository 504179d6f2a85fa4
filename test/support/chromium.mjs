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
		args: [...QUIET, ...(process.getuid?.() === 0 ? ['--no-sandbox'] : [])],
		...options,
	});
	try {
		return await use(context);
	} finally {
		await context.close();
		rmSync(profile, { recursive: true, force: true });
	}
}

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
