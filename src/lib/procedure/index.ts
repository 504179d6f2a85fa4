/**
 * procedure: the controlled template of gates, steps and hold points: its schema, how it is parsed and checked, the library.
 * Pure: a procedure is data; SPEC.md says what every field means.
 * May import: base, quantity, calc, plant.
 */
export {
	ProcedureSchema,
	type Gate,
	type LapsedBy,
	type LimitUse,
	type Permissive,
	type PlantEventKind,
	type Procedure,
	type StartType,
	type Step,
	type StepKind,
	type Validity,
} from './schema';
export { BindingSchema, type Binding } from './binding';
export { FieldSchema, LimitUseSchema } from './step';
export { LapsedBySchema, ValiditySchema } from './validity';
export { readCondition, type Condition, type ConditionFinding } from './condition';
export {
	evaluatePermissive,
	readingFor,
	type NewestReading,
	type PermissiveInputs,
	type PermissiveValue,
	type Unknown,
	type UnknownBecause,
	type WhyUnknown,
} from './permissive';
export { checkProcedure, parseProcedure } from './check-procedure';
export type { Against } from './check-names';
export type { ProcedureFinding, UnknownThing } from './finding';
export { fieldsOf, type Field } from './fields';
export { bindInputs, type Around, type MissingInput } from './bind-inputs';
export type { BoundReading, BoundRow, BoundSeries, Lookup } from './lookup';
export { atPlantPath } from './plant-path';
export { LIBRARY, libraryFor } from './library';
export { GERMAN } from './library/inert-start-up/german';
