import type { Result } from '../base';
import { checkConnections } from './check-connections';
import { checkLimits } from './check-limits';
import { checkMeasures } from './check-measures';
import { checkReferences } from './check-references';
import type { PlantFinding } from './finding';
import { PlantSchema, type Plant } from './schema';
import { readShape, type ShapeError } from './shape';

export const parsePlant = (document: unknown): Result<Plant, readonly ShapeError[]> => readShape(PlantSchema, document);

/** Everything that contradicts itself in a description of the right shape; all of it, so that it is corrected once. */
export const checkPlant = (plant: Plant): readonly PlantFinding[] => [
	...checkReferences(plant),
	...checkMeasures(plant),
	...checkConnections(plant),
	...checkLimits(plant),
];
