import { toJsonSchema, type JsonSchema } from '@valibot/to-json-schema';
import * as v from 'valibot';
import type { Calculator } from '../lib/calc';
import { PlantSchema } from '../lib/plant';
import { ProcedureSchema } from '../lib/procedure';
import { AnswerSchema, EnvelopeSchema, SITE_BODIES, START_UP_BODIES } from '../lib/record';

/** The formats that other people's programs read and write, under the names of their files in static/schemas. */
export const PUBLISHED: { readonly [file: string]: () => JsonSchema } = {
	'procedure.schema.json': () => document('Procedure (gatehold-procedure/1)', ProcedureSchema),
	'plant.schema.json': () => document('Plant description (gatehold-plant/1)', PlantSchema),
	'event.schema.json': () => document('Event of a record: envelope and body, by kind', eventSchema()),
	'standing.schema.json': () => document('What stands (gatehold-standing/1)', AnswerSchema),
};

/** What Valibot checks beyond the shape (a day that the calendar has) has no word in JSON Schema and is left out. */
const document = (title: string, schema: v.GenericSchema): JsonSchema => ({
	$schema: 'https://json-schema.org/draft/2020-12/schema',
	title,
	...withoutDialect(toJsonSchema(schema, { target: 'draft-2020-12', errorMode: 'ignore' })),
});

const withoutDialect = ({ $schema: _, ...schema }: JsonSchema): JsonSchema => schema;

export const inputsSchema = ({ schema }: Calculator): JsonSchema =>
	withoutDialect(toJsonSchema(schema, { target: 'draft-2020-12', errorMode: 'ignore' }));

function eventSchema(): v.GenericSchema {
	const kinds = Object.entries({ ...START_UP_BODIES, ...SITE_BODIES }).map(([kind, body]) =>
		v.strictObject({ ...EnvelopeSchema.entries, kind: v.literal(kind), body }),
	);
	return v.union(kinds);
}
