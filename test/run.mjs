/**
 * `npm test`: everything that must hold, in one run, with one honest line at the end. A stage that fails does not stop
 * the ones after it; only the missing judges and browser do, since without them the tests could not say what they say.
 */
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureChromium } from './support/chromium.mjs';
import { ensureJudges, findPyHanko, findVeraPdf } from './support/judges.mjs';

const HOUSE = join(import.meta.dirname, '..');
const REPORT = join(HOUSE, '.cache/vitest.json');

/** @typedef {{ name: string, passed: number, failed: number, skipped: number, note: string }} Result */

/** @type {readonly [string, () => Partial<Result>][]} */
const STAGES = [
	['judges', () => demand(ensureJudges)],
	['browser', () => demand(ensureChromium)],
	['types', () => script('types')],
	['lint', () => script('lint')],
	['format', () => script('format:check')],
	['unused code', () => script('unused')],
	['build', () => script('build')],
	['tests', vitest],
];

process.chdir(HOUSE);
/** @type {Result[]} */
const results = [];
for (const [name, stage] of STAGES) {
	console.log(`\n--- ${name}`);
	const result = { name, passed: 0, failed: 0, skipped: 0, note: '', ...stage() };
	results.push(result);
	if (result.failed > 0 && (name === 'judges' || name === 'browser')) break;
}
summarise(results);

/** @param {() => unknown} ensure */
function demand(ensure) {
	try {
		ensure();
		return { passed: 1, note: 'there' };
	} catch (error) {
		console.error(error instanceof Error ? error.message : error);
		return { failed: 1, note: 'missing' };
	}
}

/** @param {string} name a script of package.json */
function script(name) {
	const { status } = spawnSync('npm', ['run', '--silent', name], { stdio: 'inherit' });
	return status === 0 ? { passed: 1 } : { failed: 1, note: `npm run ${name}` };
}

function vitest() {
	mkdirSync(join(HOUSE, '.cache'), { recursive: true });
	rmSync(REPORT, { force: true });
	const { status } = spawnSync(
		process.execPath,
		['node_modules/vitest/vitest.mjs', 'run', '--reporter=default', '--reporter=json', `--outputFile.json=${REPORT}`],
		{ stdio: 'inherit' },
	);
	const { passed, failed, skipped } = readReport();
	// An error outside every test fails the run without failing a test.
	return { passed, failed: status !== 0 && failed === 0 ? 1 : failed, skipped, note: 'npm run test:fast' };
}

function readReport() {
	try {
		/** @type {{ numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number, testResults: { status: string, assertionResults: unknown[] }[] }} */
		const report = JSON.parse(readFileSync(REPORT, 'utf8'));
		const unloadable = report.testResults.filter(
			(file) => file.status === 'failed' && file.assertionResults.length === 0,
		);
		return {
			passed: report.numPassedTests,
			failed: report.numFailedTests + unloadable.length,
			skipped: report.numPendingTests + report.numTodoTests,
		};
	} catch {
		return { passed: 0, failed: 1, skipped: 0 };
	}
}

/** @param {readonly Result[]} results */
function summarise(results) {
	console.log('\n--- summary');
	for (const { name, passed, failed, note } of results) {
		console.log(
			`${failed === 0 ? 'passed' : 'FAILED'}  ${name}${passed + failed > 1 ? ` (${passed} of ${passed + failed})` : ''}${failed > 0 ? `: ${note}` : ''}`,
		);
	}
	const unasked = Object.entries({ pyHanko: findPyHanko(), veraPDF: findVeraPdf() }).filter(([, found]) => !found);
	if (unasked.length > 0)
		console.log(`Not asked, since not installed (npm run judges): ${unasked.map(([name]) => name).join(', ')}`);
	const notRun = STAGES.length - results.length;
	if (notRun > 0) console.log(`${notRun} stages were not run.`);
	/** @param {'passed' | 'failed' | 'skipped'} key */
	const sum = (key) => results.reduce((total, result) => total + result[key], 0);
	const skipped = sum('skipped');
	console.log(`${sum('passed')} passed, ${sum('failed')} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`);
	process.exitCode = sum('failed') === 0 ? 0 : 1;
}
