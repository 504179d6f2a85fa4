import { describe, expect, test } from 'vitest';
import { saturationPressure } from '../../../src/lib/calc/moisture/saturation-pressure';
import { saturationTemperature } from '../../../src/lib/calc/moisture/saturation-temperature';
import { agreesWith, agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Source: IAPWS R7-97(2012), Table 35, "Saturation pressures", printed in MPa.
const table35 = [
	{ T: 300, printed: '0.353658941e-2' },
	{ T: 500, printed: '0.263889776e1' },
	{ T: 600, printed: '0.123443146e2' },
];
test.each(table35)('IAPWS R7-97 Table 35 at $T K: $printed MPa', ({ T, printed }) => {
	const p = saturationPressure(T);
	expect(p.ok && agreesWith(p.value / 1e6, printed)).toBe(true);
});

// Independent: iapws 1.5.4, iapws97._PSat_T (test/vectors/moisture/saturation-pressure.json).
test.each(vector('moisture/saturation-pressure.json') as { T: number; p: number }[])(
	'over water at $T K the saturation pressure is $p Pa',
	({ T, p }) => {
		const found = saturationPressure(T);
		expect(found.ok && agreesWithin(found.value, p, 1e-9)).toBe(true);
	},
);

describe('limits', () => {
	test('below 0 degC the equation for liquid water is refused, not extrapolated', () => {
		expect(saturationPressure(273.14)).toEqual({
			ok: false,
			error: { kind: 'out-of-range', input: 'temperature', value: 273.14, min: 273.15, max: 647.096, unit: 'K' },
		});
	});

	test('above the critical point and for NaN there is no answer', () => {
		expect(saturationPressure(647.1).ok).toBe(false);
		expect(saturationPressure(Number.NaN).ok).toBe(false);
	});

	test('temperature to pressure and back is the same temperature within a millionth of a kelvin', () => {
		for (let T = 273.16; T < 647; T += 1.7) {
			const p = saturationPressure(T);
			const back = p.ok ? saturationTemperature(p.value) : p;
			expect(back.ok && Math.abs(back.value - T)).toBeLessThan(1e-6);
		}
	});
});
