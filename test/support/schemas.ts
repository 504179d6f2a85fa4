import { toJsonSchema } from '@valibot/to-json-schema';
import * as v from 'valibot';
import type { GenericSchema } from 'valibot';
import { MeasureSchema, PlantSchema, SourceSchema } from '../../src/lib/plant';
import {
	BindingSchema,
	FieldSchema,
	LapsedBySchema,
	LimitUseSchema,
	ProcedureSchema,
	ValiditySchema,
} from '../../src/lib/procedure';
import { AnswerSchema, EnvelopeSchema, SITE_BODIES, START_UP_BODIES } from '../../src/lib/record';

/**
 * The JSON Schemas that are published in static/schemas, by file, made from the schemas that the rooms read with: nobody
 * keeps them by hand. `npm run schemas` writes them; a test compares.
 */
export const SCHEMAS: { readonly [file: string]: object } = {
	'plant.schema.json': published('Plant description, format gatehold-plant/1', PlantSchema, {
		measure: MeasureSchema,
		source: SourceSchema,
	}),
	'procedure.schema.json': published('Procedure, format gatehold-procedure/1', ProcedureSchema, {
		binding: BindingSchema,
		field: FieldSchema,
		lapsedBy: LapsedBySchema,
		limit: LimitUseSchema,
		measure: MeasureSchema,
		source: SourceSchema,
		validity: ValiditySchema,
	}),
	'event.schema.json': published('Event of a record: its envelope with the body of its kind', eventSchema(), {
		eventId: EnvelopeSchema.entries.previous.wrapped,
		instant: EnvelopeSchema.entries.entered,
		reading: START_UP_BODIES.entry.entries.values.wrapped.item,
		statement: START_UP_BODIES['gate released'].entries.statement.wrapped,
	}),
	'standing.schema.json': published('What stands, format gatehold-standing/1', AnswerSchema, {
		cause: AnswerSchema.entries.steps.item.entries.why.item,
		instant: AnswerSchema.entries.at,
	}),
};

function eventSchema(): GenericSchema {
	const kinds = Object.entries({ ...START_UP_BODIES, ...SITE_BODIES });
	return v.union(
		kinds.map(([kind, body]) => v.strictObject({ ...EnvelopeSchema.entries, kind: v.literal(kind), body })),
	);
}

/** @param definitions shapes that occur often or contain themselves, by the name under which they are referred to */
function published(
	title: string,
	schema: GenericSchema,
	definitions?: { readonly [name: string]: GenericSchema },
): object {
	const { $schema, ...rest } = toJsonSchema(schema, {
		target: 'draft-2020-12',
		errorMode: 'throw',
		// That the calendar has a day has no word in JSON Schema.
		ignoreActions: ['check'],
		...(definitions === undefined ? {} : { definitions: { ...definitions } }),
	});
	return { $schema, title, ...rest };
}

export const printSchema = (schema: object): string => `${JSON.stringify(schema, null, '\t')}\n`;
