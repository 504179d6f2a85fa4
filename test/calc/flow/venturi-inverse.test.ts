import fc from 'fast-check';
import { expect, test } from 'vitest';
import { expansibility } from '../../../src/lib/calc/flow/expansibility';
import { massFlow } from '../../../src/lib/calc/flow/mass-flow';
import { differencePressureForFlow, throatForRange } from '../../../src/lib/calc/flow/venturi-inverse';
import { agreesWithin } from '../../support/printed';
import { vector } from '../../support/vectors';

// Independent: fluids 1.0.22, differential_pressure_meter_solver solved for P2 and for D2 (test/vectors/venturi/inverse.json).
type Case = {
	of: string;
	C: number;
	inputs: { D: number; d: number; p1: number; dp: number; rho1: number; kappa: number };
	qm: number;
	dp: number;
	d: number;
};
test.each(vector('venturi/inverse.json') as Case[])(
	'80 % of the flow of $of needs $dp Pa, or a throat of $d m at the same difference pressure',
	({ C, inputs, qm, dp, d }) => {
		const duty = { massFlow: qm, C, D: inputs.D, rho1: inputs.rho1, p1: inputs.p1, kappa: inputs.kappa };
		const found = differencePressureForFlow(duty, inputs.d);
		const throat = throatForRange(duty, inputs.dp);
		expect(found.ok && agreesWithin(found.value, dp, 1e-8)).toBe(true);
		expect(throat.ok && agreesWithin(throat.value, d, 1e-8)).toBe(true);
	},
);

test('80 % of the flow is not quite 64 % of the difference pressure: the expansibility changes too', () => {
	const [v05] = vector('venturi/inverse.json') as Case[];
	expect((v05?.dp ?? 0) / 800).toBeLessThan(0.638);
});

test('a flow that would need too low a throat pressure is refused, and so is one that no throat gives', () => {
	const duty = { massFlow: 1000, C: 0.985, D: 1.2, rho1: 0.9, p1: 98_500, kappa: 1.37 };
	expect(differencePressureForFlow(duty, 0.72)).toMatchObject({ ok: false, error: { kind: 'flow-beyond-meter' } });
	expect(differencePressureForFlow({ ...duty, massFlow: -1 }, 0.72).ok).toBe(false);
	expect(throatForRange(duty, 800)).toMatchObject({ ok: false, error: { kind: 'no-throat-fits' } });
	expect(throatForRange(duty, 90_000)).toMatchObject({ ok: false, error: { kind: 'pressure-ratio-too-low' } });
});

test('there and back: the difference pressure of a flow gives that flow', () => {
	fc.assert(
		fc.property(
			fc.double({ min: 0.3, max: 0.75, noNaN: true }),
			fc.double({ min: 0.0005, max: 0.24, noNaN: true }),
			fc.double({ min: 1.05, max: 1.6, noNaN: true }),
			(beta, part, kappa) => {
				const [D, p1, rho1, C] = [0.8, 1e5, 0.9, 0.984];
				const epsilon = expansibility({ dp: part * p1, p1, beta, kappa });
				const flow = massFlow({ C, epsilon, d: beta * D, D, dp: part * p1, rho1 });
				const dp = differencePressureForFlow({ massFlow: flow, C, D, rho1, p1, kappa }, beta * D);
				expect(dp.ok && agreesWithin(dp.value, part * p1, 1e-9)).toBe(true);
			},
		),
	);
});
