import { expect, test } from 'vitest';
import { nitrogenCompressibility } from '../../../src/lib/calc/stock/nitrogen-compressibility';
import { agreesWithin } from '../../support/printed';
import cases from '../../vectors/stock/nitrogen-compressibility.json';

// Independent: CoolProp 8.0.0, PropsSI('Dmolar', 'T', T, 'P', p, 'Nitrogen') (test/vectors/stock/nitrogen-compressibility.json).
test.each(cases)('Z of nitrogen at $p Pa and $T K is $Z', ({ p, T, Z }) => {
	const found = nitrogenCompressibility(p, T);
	expect(found.ok && agreesWithin(found.value, Z, 2.5e-4)).toBe(true);
});

test.each([
	[3.2e7, 293.15, 'pressure'],
	[0, 293.15, 'pressure'],
	[1e7, 253, 'temperature'],
	[1e7, 324, 'temperature'],
	[Number.NaN, 293.15, 'pressure'],
])('outside the fit, %d Pa and %d K, nothing is said', (p, T, input) => {
	expect(nitrogenCompressibility(p, T)).toMatchObject({ ok: false, error: { kind: 'out-of-range', input } });
});
