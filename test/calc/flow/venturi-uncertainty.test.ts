import { expect, test } from 'vitest';
import { agreesWith, agreesWithin } from '../../support/printed';
import { CIRCUIT, factsOf, kindsOf, run } from './venturi-support';

/** A tube and a reading whose relative expanded uncertainties are these, in percent. U(epsilon) comes from dp/p1. */
const relativeCase = (each: {
	type: string;
	U: readonly [number, number, number, number, number];
	beta: number;
	D: number;
}) => {
	const [epsilon, D, d, dp, rho] = each.U;
	const pressure = 1e5;
	const difference = (pressure * epsilon) / (4 + 100 * each.beta ** 8);
	const withU = (value: number, unit: string, percent: number) => ({ value, unit, U: (value * percent) / 100 });
	return {
		type: each.type,
		pipeDiameter: withU(each.D, 'm', D),
		throatDiameter: withU(each.D * each.beta, 'm', d),
		pressure: withU(pressure, 'Pa(a)', 0.1),
		dp: withU(difference, 'Pa', dp),
		temperature: withU(363.15, 'K', 0.1),
		density: withU(1.2, 'kg/m3', rho),
		viscosity: 1.9e-5,
		isentropicExponent: 1.38,
	};
};

// By hand, ISO 5167-1:2003, 8.2.2 (from memory, verify), U in percent of C, epsilon, D, d, dp, rho1:
// sqrt(C^2 + e^2 + (2b^4/(1-b^4))^2 D^2 + (2/(1-b^4))^2 d^2 + dp^2/4 + rho^2/4).
test.each([
	{ type: 'rough_welded', C: 1.5, U: [0.05, 0.4, 0.1, 1, 1.5], beta: 0.6, D: 1.2, printed: '1.76974' },
	{ type: 'machined', C: 1, U: [0.05, 0.4, 0.1, 0.5, 1], beta: 0.6, D: 0.25, printed: '1.17558' },
	{ type: 'as_cast', C: 0.7, U: [0.05, 0.4, 0.1, 2, 2], beta: 0.75, D: 0.8, printed: '1.64779' },
	{ type: 'rough_welded', C: 1.5, U: [0.05, 0.5, 0.5, 3, 3], beta: 0.7, D: 1.2, printed: '2.92986' },
] as const)('with U of C $C %, epsilon, D, d, dp, rho $U % at beta $beta the flow is good to $printed %', (each) => {
	const result = run(relativeCase(each));
	const { value, U } = result.values.massFlow ?? {};
	expect(agreesWith(((U ?? NaN) / (value ?? NaN)) * 100, each.printed)).toBe(true);
});

// By hand, beta 0.6: 2 b^4/(1 - b^4) = 0.29779 for D, 2/(1 - b^4) = 2.29779 for d, one half for dp and density.
test('the budget gives each input its sensitivity, and the shares add up to one', () => {
	const result = run(relativeCase({ type: 'rough_welded', U: [0.05, 0.4, 0.1, 1, 1.5], beta: 0.6, D: 1.2 }));
	const flow = result.values.massFlow?.value ?? NaN;
	const relative = Object.fromEntries(
		(result.budget ?? []).map((row) => [row.input, (row.sensitivity * at(row.input, result)) / flow]),
	);
	expect(agreesWith(relative.pipeDiameter ?? NaN, '-0.29779')).toBe(true);
	expect(agreesWith(relative.throatDiameter ?? NaN, '2.29779')).toBe(true);
	expect(relative.dp).toBeCloseTo(0.5, 5);
	expect(relative.density).toBeCloseTo(0.5, 5);
	expect(relative.dischargeCoefficient).toBeCloseTo(1, 8);
	expect((result.budget ?? []).reduce((sum, row) => sum + row.share, 0)).toBeCloseTo(1, 9);
});

const at = (input: string, result: ReturnType<typeof run>): number =>
	({
		pipeDiameter: 1.2,
		throatDiameter: 0.72,
		dp: result.values.differencePressure?.value,
		density: 1.2,
		dischargeCoefficient: 0.985,
		expansibility: result.values.expansibility?.value,
	})[input] ?? NaN;

test('density from pressure, temperature and composition: the flow is as good as these, each by a half', () => {
	const result = run(CIRCUIT);
	const { value, U } = result.values.massFlow ?? {};
	// By hand, in percent: C 1.5; epsilon (4 + 1.68) x 0.8122 % = 0.046; D 0.29779 x 0.4; d 2.29779 x 0.1; dp 1/2; p 0.203/2;
	// T 0.543/2; Z 0.1/2; molar mass by each gas in place of nitrogen: CO2 15.996 x 0.5/27.932/2, O2 3.985 x 0.3/27.932/2,
	// H2O -9.998 x 2/27.932/2.
	const parts = [1.5, 0.0461, 0.119, 0.2298, 0.5, 0.1015, 0.2716, 0.05, 0.1432, 0.0214, 0.3579];
	expect(agreesWithin(((U ?? NaN) / (value ?? NaN)) * 100, Math.hypot(...parts), 1e-3)).toBe(true);
	expect(result.notes.map((note) => note.kind)).not.toContain('uncertainty-not-stated');
});

test('the dry normal flow is less certain than the wet one: the moisture counts twice', () => {
	const { normalFlowWet, normalFlowDry } = run(CIRCUIT).values;
	const relative = (each: typeof normalFlowWet) => (each?.U ?? NaN) / (each?.value ?? NaN);
	expect(relative(normalFlowDry)).toBeGreaterThan(relative(normalFlowWet) * 1.3);
});

test('where one uncertainty is not stated no total is given: a sum with a part missing would look too good', () => {
	const inputs = { ...CIRCUIT, dp: 800 };
	expect(run(inputs).values.massFlow).not.toHaveProperty('U');
	expect(run(inputs).values.density).toHaveProperty('U');
	expect(factsOf(inputs, 'uncertainty-not-stated').inputs).toEqual(['dp']);
});

test('an uncertainty that the standard supplied, not the site, is said', () => {
	expect(factsOf(CIRCUIT, 'uncertainty-by-default').inputs).toEqual([
		'pipeDiameter',
		'throatDiameter',
		'compressibility',
	]);
	const stated = { ...CIRCUIT, throatDiameter: { value: 0.72, unit: 'm', U: 0.0005 } };
	expect(factsOf(stated, 'uncertainty-by-default').inputs).toEqual(['pipeDiameter', 'compressibility']);
});

test('above the project limit of uncertainty, or with none known, the flow proves no step', () => {
	expect(run({ ...CIRCUIT, uncertaintyLimit: 0.02 }).scope).toBe('in scope');
	expect(factsOf({ ...CIRCUIT, uncertaintyLimit: 0.01 }, 'uncertainty-over-limit').level).toBe('outside scope');
	expect(factsOf({ ...CIRCUIT, dp: 800, uncertaintyLimit: 0.02 }, 'uncertainty-over-limit').U).toBeNull();
});

test('outside its Reynolds range the coefficient has no known uncertainty, and neither has the flow', () => {
	const nitrogen = {
		type: 'machined',
		pipeDiameter: 0.25,
		throatDiameter: 0.1875,
		pressure: { value: 12, unit: 'bar(a)', U: 0.01 },
		dp: { value: 300, unit: 'mbar', U: 1 },
		temperature: { value: 20, unit: 'degC', U: 1 },
		composition: { N2: 1 },
	};
	expect(run(nitrogen).values.massFlow).not.toHaveProperty('U');
	expect(kindsOf(nitrogen)).toContain('coefficient-not-of-the-standard');
});

// By hand: 760, 840, 760, 840 Pa scatter by 5 % about 800 Pa; twice the standard uncertainty of the mean of four is
// 2 x 0.05 x 799.5/sqrt(3) = 46.16 Pa, and with 8 Pa that all readings share 46.85 Pa.
test('a series is as uncertain as its instrument and its scatter together', () => {
	const { dp: _, ...inputs } = CIRCUIT;
	const series = [760, 840, 760, 840].map((value) => ({ value, unit: 'Pa', U: 8 }));
	const { differencePressure } = run({ ...inputs, dpSeries: series }).values;
	expect(agreesWith(differencePressure?.U ?? NaN, '46.85')).toBe(true);
	expect(run({ ...inputs, dpSeries: [760, 840, 760, 840] }).values.massFlow).not.toHaveProperty('U');
});

// By hand: 12 mA is half the span; 0.02 mA of 16 mA is 0.125 %, so 4 Pa of a 3200 Pa span sent linearly.
test('the uncertainty of a signal becomes one of the difference pressure, by the setting of the transmitter', () => {
	const { dp: _, ...inputs } = CIRCUIT;
	const signal = { ...inputs, signal: { value: 12, unit: 'mA', U: 0.02 }, dpSpan: 3200 };
	expect(run(signal).values.differencePressure).toMatchObject({ value: 1600, U: expect.closeTo(4, 6) as number });
	// Sent as a root, 12 mA is a quarter, and 2 x 0.5 x 0.125 % again 4 Pa.
	const root = run({ ...signal, transmitter: 'root' }).values.differencePressure;
	expect(root).toMatchObject({ value: 800, U: expect.closeTo(4, 6) as number });
});
