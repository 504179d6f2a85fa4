/**
 * plant: the plant description (volumes, ducts, measuring points, limits, fuel), instruments and calibration.
 * Pure: a description is data, pinned by its hash in every start-up.
 * May import: base, quantity.
 */
export { BasisSchema, MeasureSchema, PlantSchema, SourceSchema, type Basis, type Measure, type Plant, type Source } from './schema';
