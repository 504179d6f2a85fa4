/** Writes static/schemas from the schemas of the rooms: `npm run schemas`. */
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runnerImport } from 'vite';

const HOUSE = join(import.meta.dirname, '../..');
const OUT = join(HOUSE, 'static/schemas');

/** @type {{ module: typeof import('./schemas.ts') }} */
const { module } = await runnerImport(join(import.meta.dirname, 'schemas.ts'), { root: HOUSE, configFile: false });
mkdirSync(OUT, { recursive: true });
for (const [file, schema] of Object.entries(module.SCHEMAS)) {
	writeFileSync(join(OUT, file), module.printSchema(schema));
	console.log(`static/schemas/${file}`);
}
