import { expect, test } from 'vitest';
import { sublimationPressure } from '../../../src/lib/calc/moisture/sublimation-pressure';
import { agreesWith, agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Source: IAPWS R14-08(2011), Table 3, printed for 230 K: 8.947 35 Pa.
test('IAPWS R14-08 Table 3 at 230 K: 8.947 35 Pa', () => {
	const p = sublimationPressure(230);
	expect(p.ok && agreesWith(p.value, '8.94735')).toBe(true);
});

// Source: the same release: the curve ends in the triple point, 273.16 K and 611.657 Pa.
test('ice, water and vapour meet at 273.16 K and 611.657 Pa', () => {
	const p = sublimationPressure(273.16);
	expect(p.ok && agreesWith(p.value, '611.657')).toBe(true);
});

// Independent: iapws 1.5.4, _iapws._Sublimation_Pressure (test/vectors/moisture/sublimation-pressure.json).
test.each(vector('moisture/sublimation-pressure.json') as { T: number; p: number }[])(
	'over ice at $T K the pressure is $p Pa',
	({ T, p }) => {
		const found = sublimationPressure(T);
		expect(found.ok && agreesWithin(found.value, p, 1e-9)).toBe(true);
	},
);

test('outside 50 to 273.16 K there is no answer', () => {
	for (const T of [49.9, 273.17, Number.NaN]) {
		expect(sublimationPressure(T)).toMatchObject({ ok: false, error: { kind: 'out-of-range', min: 50, max: 273.16 } });
	}
});
