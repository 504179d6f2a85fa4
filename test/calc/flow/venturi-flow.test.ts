import { describe, expect, test } from 'vitest';
import { venturiFlow } from '../../../src/lib/calc/flow/venturi-flow';
import { dischargeCoefficient } from '../../../src/lib/calc/flow/discharge-coefficient';
import { agreesWithin } from '../../support/printed';
import { cases, vector } from '../../support/vectors';
import { factsOf, kindsOf, refusalsOf, run, valueOf } from './venturi-support';

// Independent: fluids 1.0.22, flow_meter.differential_pressure_meter_solver (test/vectors/venturi, test/reference/SOURCE.md).
type Case = {
	readonly type: 'as_cast' | 'machined' | 'rough_welded';
	readonly inputs: {
		readonly D: number;
		readonly d: number;
		readonly p1: number;
		readonly dp: number;
		readonly T: number;
		readonly rho1: number;
		readonly mu: number;
		readonly kappa: number;
		readonly x?: { readonly [gas: string]: number };
	};
	readonly expect: { readonly [name: string]: number } & { readonly outside: readonly string[] };
};

const inputsOf = ({ type, inputs }: Case) => ({
	type,
	pipeDiameter: inputs.D,
	throatDiameter: inputs.d,
	pressure: inputs.p1,
	dp: inputs.dp,
	temperature: inputs.T,
	density: inputs.rho1,
	viscosity: inputs.mu,
	isentropicExponent: inputs.kappa,
	...(inputs.x === undefined ? {} : { composition: inputs.x }),
});

const chosen = cases('venturi') as unknown as readonly (Case & { readonly name: string })[];
const random = (vector('venturi/random.json') as Case[]).map((each, i) => ({ ...each, name: `random ${i}` }));
const isLowReynolds = (each: Case) => each.expect.outside.includes('Re_D') && (each.expect.Re_D ?? 0) < 2e5;
const isRefused = (each: Case) => each.expect.outside.includes('tau');

const compared = [
	['massFlow', 'qm'],
	['volumeFlow', 'qv'],
	['ductVelocity', 'v'],
	['reynoldsNumber', 'Re_D'],
	['dischargeCoefficient', 'C'],
	['expansibility', 'epsilon'],
	['pressureRatio', 'tau'],
	['molarMass', 'M'],
	['normalFlowWet', 'qn_wet'],
	['normalFlowDry', 'qn_dry'],
] as const;

test('all 26 chosen cases and 40 random ones are there', () => {
	expect([chosen.length, random.length]).toEqual([26, 40]);
});

describe.each([...chosen, ...random].filter((each) => !isLowReynolds(each) && !isRefused(each)))('$name', (each) => {
	test('every flow agrees with fluids to 1e-9', () => {
		for (const [ours, theirs] of compared) {
			const expected = each.expect[theirs];
			if (expected === undefined) continue;
			expect(agreesWithin(valueOf(inputsOf(each), ours) ?? NaN, expected, 1e-9), ours).toBe(true);
		}
	});

	test('the limits of the standard that it leaves are named, and no others', () => {
		const result = run(inputsOf(each));
		const named = result.notes.flatMap((note) => (note.kind === 'outside-limit' ? [note.limit] : []));
		expect(named).toEqual(each.expect.outside);
		expect(result.scope).toBe(each.expect.outside.length > 0 ? 'outside scope' : 'in scope');
	});

	test('permanent loss agrees with the chart of fluids where the chart reaches', () => {
		const loss = valueOf(inputsOf(each), 'permanentLoss');
		const { D, d } = each.inputs;
		const isOnChart = D >= 0.065 && d / D >= 0.3 - 1e-9 && d / D <= 0.75 + 1e-9;
		if (!isOnChart) expect(loss).toBeNull();
		else expect(agreesWithin(loss ?? NaN, each.expect.permanent_loss ?? NaN, 1e-9)).toBe(true);
	});
});

// V11, V19 and V20: fluids keeps C constant below Re_D = 2e5, the standard does not. Ours is the indicative coefficient; the
// flow at the constant one is printed beside it and agrees with fluids.
describe.each(chosen.filter(isLowReynolds))('$name: below the Reynolds limit', (each) => {
	test('the flow at the constant coefficient is printed for comparison and agrees with fluids', () => {
		const note = factsOf(inputsOf(each), 'coefficient-not-of-the-standard');
		expect(agreesWithin(Number(note.massFlowAtConstant), each.expect.qm ?? NaN, 1e-9)).toBe(true);
	});

	test('the coefficient belongs to the Reynolds number that it gives, and proves no step', () => {
		const inputs = inputsOf(each);
		const reynolds = valueOf(inputs, 'reynoldsNumber') ?? NaN;
		expect(dischargeCoefficient(each.type, reynolds).C).toBeCloseTo(valueOf(inputs, 'dischargeCoefficient') ?? NaN, 10);
		expect(run(inputs).scope).toBe('outside scope');
		expect(kindsOf(inputs)).toContain('outside-limit');
	});
});

test('V15: a throat pressure below three quarters of the upstream pressure is refused', () => {
	const [v15] = chosen.filter(isRefused);
	if (v15 === undefined) throw new Error('V15 is missing');
	expect(refusalsOf(inputsOf(v15))).toEqual([{ kind: 'pressure-ratio-too-low', input: 'dp', tau: 0.7, min: 0.75 }]);
});

// By hand, the published anchor of V05: 0.985 x 0.9946876/0.932952 x 0.4071504 x sqrt(2 x 800 x 0.898841) = 16.2151.
test('the circuit gas of V05, worked by hand, is 16.215 kg/s', () => {
	const v05 = chosen.find((each) => each.name.startsWith('V05'));
	if (v05 === undefined) throw new Error('V05 is missing');
	expect(valueOf(inputsOf(v05), 'massFlow')).toBeCloseTo(16.2151, 3);
});

test('what the result says of itself: calculator, constants, and the inputs as they were given', () => {
	const inputs = inputsOf(chosen[2] as Case);
	const result = venturiFlow.run(inputs);
	expect(result).toMatchObject({ ok: true, value: { calc: 'venturi-flow@1', constants: 'constants@1', inputs } });
});

test('a value given as a measure in units of the trade gives the same flow as in SI units', () => {
	const si = inputsOf(chosen[4] as Case);
	const typed = {
		...si,
		pipeDiameter: { value: '1200', unit: 'mm' },
		throatDiameter: { value: '720,0', unit: 'mm' },
		pressure: { value: '985', unit: 'mbar(a)' },
		dp: { value: '8.00', unit: 'mbar' },
		temperature: { value: '95', unit: 'degC' },
		viscosity: { value: '19', unit: 'uPa s' },
	};
	expect(agreesWithin(valueOf(typed, 'massFlow') ?? NaN, valueOf(si, 'massFlow') ?? NaN, 1e-12)).toBe(true);
});
