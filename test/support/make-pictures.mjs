// Draws the pictures of the README from the demonstration's dossier and from the app's screens: `npm run pictures`.
import { spawnSync } from 'node:child_process';
import { copyFileSync, mkdtempSync, renameSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { runnerImport } from 'vite';

const HOUSE = fileURLToPath(new URL('../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'gatehold-pictures-'));
const file = join(folder, 'dossier.pdf');

/**
 * @param {string} program
 * @param {readonly string[]} args
 * @returns {string} what it printed
 */
function run(program, args) {
	const { status, stdout, stderr } = spawnSync(program, args, { cwd: HOUSE, encoding: 'utf8', maxBuffer: 64 << 20 });
	if (status !== 0) throw new Error(`${program}: ${stderr}`);
	return stdout;
}

/** Sheets by what stands on them. */
const PICTURES = [
	{ name: 'dossier-cover', on: /Record of a start-up/ },
	{ name: 'dossier-hold-points', on: /Hold points[\s\S]*Process sketch/ },
	{ name: 'dossier-timeline', on: /Timeline/ },
	{ name: 'dossier-feed-release', on: /Gate 5, Feed release/ },
	{ name: 'dossier-purge', on: /Judgement on the purge[\s\S]*Oxygen at every place/ },
];

run('npm', ['run', '--silent', 'gatehold', '--', 'demo', '--out', file]);
const sheets = run('pdftotext', ['-layout', file, '-']).split('\f');
for (const { name, on } of PICTURES) {
	const sheet = sheets.findIndex((text) => on.test(text)) + 1;
	if (sheet === 0) throw new Error(`no sheet for ${name}`);
	const at = String(sheet);
	run('pdftoppm', ['-r', '80', '-f', at, '-l', at, '-singlefile', '-png', file, join(folder, name)]);
	renameSync(join(folder, `${name}.png`), join(HOUSE, 'static/pictures', `${name}.png`));
}
/** Screens by the stop of the tour where they are taken. */
const SCREENS = { 'app-line': 'line.tablet.day', 'app-phone': 'line.phone.day' };

process.chdir(HOUSE);
/** @type {{ module: typeof import('./screens.ts') }} */
const { module } = await runnerImport(join(HOUSE, 'test/support/screens.ts'), { root: HOUSE });
await module.takeScreens({ folder, sizes: ['tablet', 'phone'], looks: ['day'], only: 'line' });
for (const [name, screen] of Object.entries(SCREENS))
	copyFileSync(join(folder, `${screen}.png`), join(HOUSE, 'static/pictures', `${name}.png`));
rmSync(folder, { recursive: true });
