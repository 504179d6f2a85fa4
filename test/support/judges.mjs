/**
 * The judges: programs of other people that read our PDF. The tests do not pass without the four of `ensureJudges`.
 * pyHanko and veraPDF are further opinions, installed into .cache/ by `npm run judges`.
 */
import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { canInstallPackages, installPackages, run, which } from './install.mjs';

/** Each judge and the Debian package that brings it. */
const JUDGES = { pdfsig: 'poppler-utils', qpdf: 'qpdf', openssl: 'openssl', certutil: 'libnss3-tools' };

/** Installs what is missing where that can be done without asking; else throws with the line that installs it. */
export function ensureJudges() {
	const missing = () => Object.entries(JUDGES).filter(([program]) => which(program) === undefined);
	if (missing().length === 0) return;
	if (canInstallPackages()) installPackages(missing().map(([, name]) => name));
	const still = missing();
	if (still.length === 0) return;
	throw new Error(
		`The tests ask other people's programs about our PDF; ${still.map(([program]) => program).join(', ')} not found.\n` +
			`Install: sudo apt-get update && sudo apt-get install -y ${still.map(([, name]) => name).join(' ')}`,
	);
}

const CACHE = join(import.meta.dirname, '../../.cache');
const PYHANKO = join(CACHE, 'pyhanko');
const VERAPDF = join(CACHE, 'verapdf');

/** @returns {string | undefined} the pyHanko program: `pyhanko sign validate --pretty-print --trust ROOT FILE` */
export const findPyHanko = () => [join(PYHANKO, 'bin/pyhanko')].find((file) => existsSync(file));

/** @returns {readonly string[] | undefined} the words that start veraPDF: `... --flavour 3b --format text FILE` */
export const findVeraPdf = () =>
	existsSync(join(VERAPDF, 'lib')) && which('java') !== undefined
		? ['java', '-cp', join(VERAPDF, 'lib', '*'), 'org.verapdf.apps.GreenfieldCliWrapper']
		: undefined;

function installPyHanko() {
	return (
		which('python3') !== undefined &&
		run('python3', ['-m', 'venv', PYHANKO]) &&
		run(join(PYHANKO, 'bin/pip'), ['install', '--quiet', 'pyhanko==0.38.0', 'pyhanko-cli==0.6.0'])
	);
}

function installVeraPdf() {
	if (which('java') === undefined || which('mvn') === undefined) return false;
	mkdirSync(VERAPDF, { recursive: true });
	writeFileSync(join(VERAPDF, 'pom.xml'), POM);
	return run('mvn', ['-q', '-B', '-f', VERAPDF, 'dependency:copy-dependencies', '-DoutputDirectory=lib']);
}

const POM = `<project xmlns="http://maven.apache.org/POM/4.0.0">
	<modelVersion>4.0.0</modelVersion>
	<groupId>judges</groupId><artifactId>verapdf</artifactId><version>1</version>
	<dependencies><dependency>
		<groupId>org.verapdf.apps</groupId><artifactId>greenfield-apps</artifactId><version>1.28.2</version>
	</dependency></dependencies>
</project>
`;

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) {
	ensureJudges();
	console.log(`${Object.keys(JUDGES).join(', ')}: installed`);
	const pyHanko = findPyHanko() !== undefined || installPyHanko();
	console.log(`pyHanko: ${pyHanko ? 'installed' : 'not available (needs python3 with venv, and pip)'}`);
	const veraPdf = findVeraPdf() !== undefined || installVeraPdf();
	console.log(`veraPDF: ${veraPdf ? 'installed' : 'not available (needs java and mvn)'}`);
	if (!pyHanko || !veraPdf) process.exitCode = 1;
}
