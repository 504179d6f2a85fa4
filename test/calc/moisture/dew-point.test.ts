import fc from 'fast-check';
import { expect, test } from 'vitest';
import { dewPoint } from '../../../src/lib/calc/moisture/dew-point';
import { agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Independent: iapws 1.5.4, region 4 over water, R14-08 over ice (test/vectors/moisture/dew-point.json).
type Case = { x: number; p: number; T: number; kind: string };
test.each(vector('moisture/dew-point.json') as Case[])(
	'gas with $x of water at $p Pa has its $kind point at $T K',
	({ x, p, T, kind }) => {
		const found = dewPoint(x, p);
		expect(found.ok && found.value.kind).toBe(kind);
		expect(found.ok && found.value.kind !== 'none' && agreesWithin(found.value.temperature, T, 1e-8)).toBe(true);
	},
);

test('below 0.01 degC it is the frost point: liquid water is not extrapolated below freezing', () => {
	const found = dewPoint(0.005, 101_325);
	expect(found).toMatchObject({ ok: true, value: { kind: 'frost' } });
	// Supercooled water would have given about -2.5 degC (Magnus form over water); rime forms at -2.26 degC.
	expect(found.ok && found.value.kind === 'frost' && found.value.temperature - 273.15).toBeCloseTo(-2.2586, 3);
});

test('suction and altitude lower the dew point: the pressure counts', () => {
	const at = (p: number) => {
		const found = dewPoint(0.2, p);
		if (!found.ok || found.value.kind === 'none') throw new Error('no dew point');
		return found.value.temperature;
	};
	expect(at(101_325) - at(93_325)).toBeGreaterThan(1.7);
	expect(at(101_325) - at(93_325)).toBeLessThan(2.0);
});

test('a dry gas has no dew point', () => {
	expect(dewPoint(0, 101_325)).toEqual({ ok: true, value: { kind: 'none' } });
});

test('steam above the critical pressure has no dew point to give', () => {
	expect(dewPoint(1, 23e6)).toMatchObject({ ok: false, error: { kind: 'out-of-range' } });
});

test('more moisture never lowers the dew point, across freezing as well', () => {
	const temperature = (x: number) => {
		const found = dewPoint(x, 101_325);
		return found.ok && found.value.kind !== 'none' ? found.value.temperature : 0;
	};
	fc.assert(
		fc.property(
			fc.double({ min: 1e-5, max: 0.9, noNaN: true }),
			fc.double({ min: 1.000001, max: 1.1, noNaN: true }),
			(x, more) => {
				expect(temperature(x * more)).toBeGreaterThan(temperature(x));
			},
		),
	);
});
