import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { exchangeRate } from '../../../src/lib/calc/purge/exchange-rate';
import { floor } from '../../../src/lib/calc/purge/floor';
import { leastInertFlow } from '../../../src/lib/calc/purge/least-inert-flow';
import { oxygenAfter } from '../../../src/lib/calc/purge/oxygen-after';
import { timeTo } from '../../../src/lib/calc/purge/time-to';
import checks from '../../vectors/purge/engineering-checks.json';

const close = (actual: number | null, expected: number): void => {
	expect(actual).not.toBeNull();
	expect(Math.abs((actual ?? 0) / expected - 1)).toBeLessThan(1e-9);
};

// Source: closed forms evaluated with numpy in an independent program; percent, m³ and m³/h, hours (engineering-checks.json).
describe.each(checks.A4_single_zone)('zone of $V m³, leak $Q_leak, inert $Q_inert m³/h', (zone) => {
	const settles = floor({ Q_I: zone.Q_inert, Q_L: zone.Q_leak, Ci: zone.C_inert / 100 });
	const rate = exchangeRate({ V: zone.V, K: 1, Q_I: zone.Q_inert, Q_L: zone.Q_leak });
	const sweep = { C0: zone.C0 / 100, floor: settles, rate };

	test(`settles at ${zone.floor} % and is at ${zone.C} % after ${zone.t_h} h`, () => {
		expect(settles * 100).toBeCloseTo(zone.floor, 12);
		close(oxygenAfter(zone.t_h, sweep) * 100, zone.C);
	});

	test.each([
		[10, zone.t_to_10],
		[8, zone.t_to_8],
		[5, zone.t_to_5],
	])('reaches %d %% after %s h', (target, hours) => {
		if (hours === null) expect(timeTo(target / 100, sweep)).toBeNull();
		else close(timeTo(target / 100, sweep), hours);
	});
});

// Source: as above.
test.each(checks.A4_min_inert)('leak $QL m³/h, target $Ct %, inert gas $Ci %: at least $QI_min m³/h', (row) => {
	close(leastInertFlow(row.Ct / 100, { Q_L: row.QL, Ci: row.Ci / 100 }), row.QI_min);
});

test('no flow is enough when the inert gas holds as much oxygen as the target', () => {
	expect(leastInertFlow(0.05, { Q_L: 100, Ci: 0.05 })).toBeNull();
});

test('a target at the floor is never reached: no infinity, no zero, no NaN', () => {
	expect(timeTo(0.04, { C0: 0.2095, floor: 0.04, rate: 1 })).toBeNull();
	expect(timeTo(0.03, { C0: 0.2095, floor: 0.04, rate: 1 })).toBeNull();
});

test('oxygen that is there already needs no time, even above a floor that lies higher', () => {
	expect(timeTo(0.08, { C0: 0.05, floor: 0.1, rate: 1 })).toBe(0);
});

const flow = fc.double({ min: 1e-3, max: 10, noNaN: true });
const oxygen = fc.double({ min: 0, max: 0.05, noNaN: true });

test('what enters is what leaves and stays: the oxygen balance closes at any time', () => {
	fc.assert(
		fc.property(flow, flow, oxygen, fc.double({ min: 1, max: 2000, noNaN: true }), (Q_I, Q_L, Ci, V) => {
			const rate = exchangeRate({ V, K: 1, Q_I, Q_L });
			const sweep = { C0: 0.2095, floor: floor({ Q_I, Q_L, Ci }), rate };
			const [t, dt] = [0.7 / rate, 1e-5 / rate];
			const C = oxygenAfter(t, sweep);
			const change = (V * (oxygenAfter(t + dt, sweep) - oxygenAfter(t - dt, sweep))) / (2 * dt);
			const balance = 0.2095 * Q_L + Ci * Q_I - (Q_I + Q_L) * C;
			expect(Math.abs(change - balance)).toBeLessThan(1e-8 * (Q_I + Q_L));
		}),
	);
});

test('the least inert flow has its floor exactly at the target', () => {
	fc.assert(
		fc.property(flow, oxygen, fc.double({ min: 0.06, max: 0.2, noNaN: true }), (Q_L, Ci, Ct) => {
			const Q_I = leastInertFlow(Ct, { Q_L, Ci })!;
			expect(floor({ Q_I, Q_L, Ci })).toBeCloseTo(Ct, 12);
		}),
	);
});
