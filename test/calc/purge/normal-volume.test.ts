import { expect, test } from 'vitest';
import { normalVolume } from '../../../src/lib/calc/purge/normal-volume';
import { kelvin, pascalAbsolute } from '../../../src/lib/quantity';

// Source: 600 · 273.15/353.15 by hand calculator; engineering check value A5 "hot loop".
test('600 m³ at 80 °C and 1013.25 hPa hold 464.080 m³ in the normal state', () => {
	expect(normalVolume(600, { temperature: kelvin(353.15), pressure: pascalAbsolute(101_325) })).toBeCloseTo(464.08, 3);
});
