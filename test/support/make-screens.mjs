/**
 * Pictures of every screen in three sizes and three looks, and a page that shows them: `npm run screens`.
 * `npm run screens -- --out FOLDER --sizes tablet,phone --looks day --only lapsed` takes fewer.
 */
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { runnerImport } from 'vite';

const HOUSE = join(import.meta.dirname, '../..');
process.chdir(HOUSE);
const { values } = parseArgs({
	options: {
		out: { type: 'string', default: '.cache/screens' },
		sizes: { type: 'string', default: 'tablet,upright,phone' },
		looks: { type: 'string', default: 'day,night,glare' },
		only: { type: 'string' },
	},
});
/** @type {{ module: typeof import('./screens.ts') }} */
const { module } = await runnerImport(join(import.meta.dirname, 'screens.ts'), { root: HOUSE });
/** @template {string} Name @param {string} said @param {readonly Name[]} known */
const chosen = (said, known) => known.filter((name) => said.split(',').includes(name));
await module.takeScreens({
	folder: values.out,
	sizes: chosen(values.sizes, /** @type {(keyof typeof module.SIZES)[]} */ (Object.keys(module.SIZES))),
	looks: chosen(values.looks, module.LOOKS),
	only: values.only,
});
console.log(`${values.out}/index.html`);
