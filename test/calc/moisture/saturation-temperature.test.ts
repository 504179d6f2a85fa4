import { expect, test } from 'vitest';
import { saturationTemperature } from '../../../src/lib/calc/moisture/saturation-temperature';
import { agreesWith, agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Source: IAPWS R7-97(2012), Table 36, "Saturation temperatures", pressures in MPa, printed in K.
const table36 = [
	{ MPa: 0.1, printed: '0.372755919e3' },
	{ MPa: 1, printed: '0.453035632e3' },
	{ MPa: 10, printed: '0.584149488e3' },
];
test.each(table36)('IAPWS R7-97 Table 36 at $MPa MPa: $printed K', ({ MPa, printed }) => {
	const T = saturationTemperature(MPa * 1e6);
	expect(T.ok && agreesWith(T.value, printed)).toBe(true);
});

// Independent: iapws 1.5.4, iapws97._TSat_P (test/vectors/moisture/saturation-temperature.json).
test.each(vector('moisture/saturation-temperature.json') as { T: number; p: number }[])(
	'vapour of $p Pa condenses at $T K',
	({ T, p }) => {
		const found = saturationTemperature(p);
		expect(found.ok && agreesWithin(found.value, T, 1e-9)).toBe(true);
	},
);

test('outside 611.213 Pa to 22.064 MPa there is no answer', () => {
	for (const p of [611.2, 22.065e6, Number.NaN, -1]) {
		expect(saturationTemperature(p)).toMatchObject({ ok: false, error: { kind: 'out-of-range', input: 'pressure' } });
	}
});
