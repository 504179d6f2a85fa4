/**
 * Makes the record files that do not belong to the demonstration site (static/demo): a foreign one, and the same damaged in
 * three places. `node test/support/make-demo-records.mjs` writes both; `--damage` only damages the foreign one again.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const OUT = join(import.meta.dirname, '../../static/demo');

/**
 * What hands, tools and transport do to a file: a byte of the oxygen reading flipped, the line of the cleared area cut
 * off, the seal moved up before the reading.
 *
 * @param {string} record lines of events
 */
export function damaged(record) {
	const lines = record.trimEnd().split('\n');
	const reading = lineWith(lines, '8,2');
	const cleared = lineWith(lines, 'confirmed');
	const seal = lineWith(lines, 'sealed');
	const changed = lines.map((line, i) =>
		i === reading ? line.replace('8,2', '8,0') : i === cleared ? line.slice(0, 300) : line,
	);
	const [last = ''] = changed.splice(seal, 1);
	return `${changed.toSpliced(reading, 0, last).join('\n')}\n`;
}

/**
 * @param {string[]} lines
 * @param {string} part
 */
function lineWith(lines, part) {
	const at = lines.findIndex((line) => line.includes(part));
	if (at === -1) throw new Error(`no line holds ${part}`);
	return at;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
	const foreign = process.argv.includes('--damage')
		? readFileSync(join(OUT, 'foreign-record.ndjson'), 'utf8')
		: await make();
	writeFileSync(join(OUT, 'foreign-record.ndjson'), foreign);
	writeFileSync(join(OUT, 'damaged-record.ndjson'), damaged(foreign));
}

/** The story is told in TypeScript: the build tool runs it. @returns {Promise<string>} */
async function make() {
	const { createServer } = await import('vite');
	const server = await createServer({ appType: 'custom', logLevel: 'error', server: { middlewareMode: true } });
	try {
		/** @type {unknown} */
		const story = await server.ssrLoadModule('/test/support/foreign-start-up.ts');
		return await /** @type {typeof import('./foreign-start-up')} */ (story).foreignRecord();
	} finally {
		await server.close();
	}
}
