import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { printSchema, SCHEMAS } from '../support/schemas';

const FOLDER = join(import.meta.dirname, '../../static/schemas');

test.each(Object.entries(SCHEMAS))(
	'[P36] the published %s is the schema that documents are read with',
	(file, schema) => {
		expect(readFileSync(join(FOLDER, file), 'utf8')).toBe(printSchema(schema));
	},
);

test('[P36] nothing else is published as a schema', () => {
	expect(readdirSync(FOLDER).sort()).toEqual(Object.keys(SCHEMAS).sort());
});
