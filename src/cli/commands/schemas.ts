import { mkdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { unusable, type Command } from '../command';
import { readOptions } from '../options';
import { PUBLISHED } from '../schemas';

/** Writes the published JSON Schemas; a test holds those in static/schemas against it. */
export const schemas: Command = {
	usage: 'schemas FOLDER',
	does: 'writes the JSON Schemas of procedure, plant description, event and standing',
	run: async (args, terminal) => {
		const given = readOptions(args, {});
		const [folder, ...more] = given.ok ? given.value.files : [];
		if (folder === undefined || more.length > 0)
			return unusable(terminal, given.ok ? 'One folder is asked for.' : given.error);
		await mkdir(folder, { recursive: true });
		for (const [file, schema] of Object.entries(PUBLISHED)) {
			await writeFile(join(folder, file), `${JSON.stringify(schema(), null, '\t')}\n`);
			terminal.print(join(folder, file));
		}
		return 'passed';
	},
};
