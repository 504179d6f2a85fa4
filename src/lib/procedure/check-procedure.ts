import type { Result } from '../base';
import { readShape, type ShapeError } from '../plant';
import { checkBindings } from './check-bindings';
import { checkFields } from './check-fields';
import { checkNames, type Against } from './check-names';
import { checkOrder } from './check-order';
import { checkOxygenLimits } from './check-oxygen-limits';
import { checkPermissives } from './check-permissives';
import { checkValidity } from './check-validity';
import type { ProcedureFinding } from './finding';
import { ProcedureSchema, type Procedure } from './schema';

export const parseProcedure = (document: unknown): Result<Procedure, readonly ShapeError[]> =>
	readShape(ProcedureSchema, document);

/**
 * Every mistake in a procedure of the right shape, each with its place: it is saved only when there is none. Without a
 * plant description its tags and limits are not looked up; everything else is.
 */
export const checkProcedure = (procedure: Procedure, against: Against): readonly ProcedureFinding[] => [
	...checkOrder(procedure),
	...checkNames(procedure, against),
	...checkValidity(procedure),
	...checkFields(procedure, against.plant),
	...checkBindings(procedure, against.plant),
	...checkPermissives(procedure, against.plant),
	...(against.plant === undefined ? [] : checkOxygenLimits(against.plant)),
];
