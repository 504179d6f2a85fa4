/**
 * plant: the plant description (volumes, ducts, measuring points, limits, fuel), instruments and calibration.
 * Pure: a description is data, pinned by its hash in every start-up.
 * May import: base, quantity.
 */
export {
	BasisSchema,
	MeasureSchema,
	PlantSchema,
	SourceSchema,
	type Basis,
	type Measure,
	type Plant,
	type Source,
} from './schema';
export { readShape, type ShapeError } from './shape';
export { checkPlant, parsePlant } from './check-plant';
export type { PlantFinding } from './finding';
export { calibrationEnds, isInCalibration } from './calibration';
export { differenceOf } from './difference';
export { changedPoints, copyOf, itemsWithValues, replacedBy, type ValueList } from './copied';
export { objectionToValue, valuesOf, withValues, type PlantValue, type ValueObjection } from './values';
