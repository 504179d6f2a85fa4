import { expect, test } from 'vitest';
import { molarMass } from '../../../src/lib/calc/gas/molar-mass';
import {
	dryFromCooled,
	wetFromDry,
	wetFromDryBasis,
	wetFromHumidityRatio,
} from '../../../src/lib/calc/moisture/moisture-basis';
import { saturationPressure } from '../../../src/lib/calc/moisture/saturation-pressure';
import { agreesWith, agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

test('a quarter mole of water per mole of dry gas is 20 % of the wet gas', () => {
	expect(wetFromDryBasis(0.25)).toBeCloseTo(0.2, 15);
});

// Independent: PsychroLib 2.5.0, GetVapPresFromHumRatio (test/vectors/moisture). It uses 0.621945 for M_w/M_air.
test.each(vector('moisture/humidity-ratio-of-air.json') as { Y: number; p: number; p_w: number }[])(
	'air with $Y kg/kg has the vapour pressure that PsychroLib gives',
	({ Y, p, p_w }) => {
		expect(agreesWithin(wetFromHumidityRatio(Y, 28.966e-3) * p, p_w, 1e-4)).toBe(true);
	},
);

test('0.622 belongs to air: for 80 % carbon dioxide in nitrogen the ratio of molar masses is 0.44', () => {
	const dry = molarMass({ CO2: 0.8, N2: 0.2 });
	expect(agreesWith(18.01528e-3 / dry, '0.44')).toBe(true);
	expect(wetFromHumidityRatio(0.2, dry)).toBeGreaterThan(0.3);
	expect(wetFromHumidityRatio(0.2, 28.966e-3)).toBeLessThan(0.25);
});

// By hand: 8.00 % behind a 5 degC cooler at 101 325 Pa; p_s(5 degC) = 872.575 Pa (IAPWS R7-97), so 0.86116 % is water.
test('8.00 % read behind a 5 degC cooler is 8.06949 % dry, and 6.45559 % in a gas of 20 % moisture', () => {
	const saturation = saturationPressure(278.15);
	if (!saturation.ok) throw new Error(saturation.error.kind);
	const dry = dryFromCooled(0.08, saturation.value, 101_325);
	expect(agreesWith(dry * 100, '8.06949')).toBe(true);
	expect(agreesWith(wetFromDry(dry, 0.2) * 100, '6.45559')).toBe(true);
});
