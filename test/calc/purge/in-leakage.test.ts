import { expect, test } from 'vitest';
import { inLeakage, leakAtSuction } from '../../../src/lib/calc/purge/in-leakage';
import checks from '../../vectors/purge/engineering-checks.json';

// Source: the floors of engineering-checks.json, which were made from these leaks.
test.each(checks.A4_single_zone)(
	'a floor of $floor % under $Q_inert m³/h of inert gas is a leak of $Q_leak m³/h',
	(zone) => {
		const leak = inLeakage(zone.floor / 100, { Q_I: zone.Q_inert, Ci: zone.C_inert / 100 });
		expect(leak).toBeCloseTo(zone.Q_leak, 8);
	},
);

test('a floor of air has no leak that explains it', () => {
	expect(inLeakage(0.2095, { Q_I: 1, Ci: 0 })).toBeNull();
});

test('a floor below the inert gas gives a negative leak, which is a sensor to check', () => {
	expect(inLeakage(0.004, { Q_I: 1, Ci: 0.005 })).toBeLessThan(0);
});

// Source: √(60/3) = 4.472; engineering section A.8 "3 to 60 mbar is 4.5 times".
test('from 3 to 60 mbar of suction the leak grows 4.5 times', () => {
	expect(leakAtSuction(1, { found: 300, now: 6000 }).toFixed(1)).toBe('4.5');
});
