import { expect, test } from 'vitest';
import { dryFlow, normalFlow } from '../../../src/lib/calc/flow/normal-flow';
import { gasDensity } from '../../../src/lib/calc/gas/gas-density';
import { agreesWith } from '../../support/printed';

// By hand, q_n = q_v (p/101325)(273.15/T): 50000 x 0.937577 x 0.752169 = 35260.80; x 0.75 = 26445.60.
// The molar mass of the gas cancels: any must give the same.
test.each([
	[50_000, 95_000, 363.15, 0.25, '35260.80', '26445.60'],
	[64_944.07, 98_500, 368.15, 0.2, '46842.01', '37473.61'],
	[50_000, 101_325, 273.15, 0, '50000.00', '50000.00'],
	[1000, 700_000, 293.15, 0, '6437.14', '6437.14'],
])('%d m3/h at %d Pa and %d K with %d water are %s m3/h normal, %s dry', (q, pressure, temperature, xw, wet, dry) => {
	for (const molarMass of [0.028, 0.044]) {
		const massFlow = q * gasDensity({ pressure, temperature, molarMass, compressibility: 1 });
		expect(agreesWith(normalFlow(massFlow, molarMass), wet)).toBe(true);
		expect(agreesWith(dryFlow(normalFlow(massFlow, molarMass), xw), dry)).toBe(true);
	}
});
