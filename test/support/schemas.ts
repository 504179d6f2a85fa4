import { toJsonSchema } from '@valibot/to-json-schema';
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
};

/** @param definitions shapes that occur often or contain themselves, by the name under which they are referred to */
function published(
	title: string,
	schema: GenericSchema,
	definitions?: { readonly [name: string]: GenericSchema },
): object {
	const { $schema, ...rest } = toJsonSchema(schema, {
		errorMode: 'throw',
		...(definitions === undefined ? {} : { definitions: { ...definitions } }),
	});
	return { $schema, title, ...rest };
}

export const printSchema = (schema: object): string => `${JSON.stringify(schema, null, '\t')}\n`;
