import { fail, ok, type Result } from '../../base';
import { answered } from '../answered';
import type { CalcNote, CalcResult, Plot, Refusal } from '../calculator';
import { P_N, T_N } from '../constants';
import { defineCalculator } from '../define-calculator';
import { propagate, type Numbers, type Uncertain } from '../uncertainty';
import { SWING_INPUTS, SWING_OUTPUTS, type SwingGiven } from './swing-inputs';
import { SWING_PAGE } from './swing-page';

/**
 * Purging by swings of the pressure: how many times a vessel is filled and let down, or evacuated and filled, until the
 * oxygen is at its line.
 *
 *     C_n = Ci + (C0 − Ci)(p_low/p_high)^(n/m),   n = m ln((Ct − Ci)/(C0 − Ci))/ln(p_low/p_high), rounded up
 *     inert gas = n V (p_high − p_low)/p_n · T_n/T
 *
 * The exponent m is 1 where each swing is held until its temperature has settled; else it is κ, which asks for more swings.
 *
 * @param inputs p_low < p_high [Pa absolute]; C0, Ci, Ct [1], Ci < Ct < C0 ≤ 0.25; V > 0 [m³], T [K]
 * @returns swings n whole and exact [1], C_n after them [1], inert gas [m³(n)], each with U
 *
 * Source: CEN/TR 15281:2022, annex A, formulas A.1 and A.2 (second-hand); 1/κ as in NFPA 69, annex (from memory, verify).
 * Checked against: Branan, Rules of Thumb for Chemical Engineers, purging: 2 swings to 0.84 %, 5 swings to 0.66 %
 * (test/calc/purge/swing-purge.test.ts).
 */
export const swingPurge = defineCalculator({
	id: 'swing-purge',
	version: 1,
	title: 'Purge by pressure or vacuum swings',
	answers: 'How many times must this vessel be filled and let down, and what does it take in inert gas?',
	sources: [
		'CEN/TR 15281:2022, annex A, formulas A.1 and A.2 (second-hand, verify)',
		'NFPA 69, annex, exponent of a fast swing (from memory, verify)',
		'JCGM 100:2008, 5.1.2',
	],
	fields: SWING_INPUTS,
	outputs: SWING_OUTPUTS,
	page: SWING_PAGE,
	compute,
});

function compute(given: SwingGiven): Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]> {
	const refusals = refusalsOf(given);
	if (refusals.length > 0) return fail(refusals);
	const exponent = given.swing === 'held' ? 1 : KAPPA[given.gas];
	const inputs: readonly Uncertain[] = [
		{ ...given.lowPressure, name: 'lowPressure', symbol: 'p_low', unit: 'Pa(a)' },
		{ ...given.highPressure, name: 'highPressure', symbol: 'p_high', unit: 'Pa(a)' },
		{ U: 0, ...given.startOxygen, name: 'startOxygen', symbol: 'C0', unit: '1' },
		{ ...given.inertOxygen, name: 'inertOxygen', symbol: 'Ci', unit: '1' },
		{ ...given.volume, name: 'volume', symbol: 'V', unit: 'm3' },
		{ ...given.temperature, name: 'temperature', symbol: 'T', unit: 'K' },
	];
	const line = given.target.value - given.guard.value;
	const at = Object.fromEntries(inputs.map(({ name, value }) => [name, value]));
	const needed = swingsTo(line, at, exponent);
	const swings = Math.ceil(needed - ROUNDING);
	const model = (values: Numbers): Numbers => ({
		exactSwings: swingsTo(line, values, exponent),
		oxygenAfter: oxygenAfter(swings, values, exponent),
		inertGas: swings * gasOfOne(values),
	});
	const values: Numbers = { swings, ...model(at) };
	const { U, budget, unstated } = propagate(model, inputs);
	return ok({
		values: answered(SWING_OUTPUTS, values, U),
		scope: 'in scope',
		notes: notesOf(given, { swings, needed, after: values.oxygenAfter ?? NaN, U: U.oxygenAfter, line, unstated }),
		budget: budget.filter((row) => row.output === 'oxygenAfter'),
		plots: [plotOf(given, { swings, at, exponent })],
	});
}

const ratioOf = ({ lowPressure = NaN, highPressure = NaN }: Numbers): number => lowPressure / highPressure;

function swingsTo(line: number, at: Numbers, exponent: number): number {
	const { startOxygen: C0 = NaN, inertOxygen: Ci = NaN } = at;
	return (exponent * Math.log((line - Ci) / (C0 - Ci))) / Math.log(ratioOf(at));
}

function oxygenAfter(n: number, at: Numbers, exponent: number): number {
	const { startOxygen: C0 = NaN, inertOxygen: Ci = NaN } = at;
	return Ci + (C0 - Ci) * ratioOf(at) ** (n / exponent);
}

function gasOfOne({ lowPressure = NaN, highPressure = NaN, volume = NaN, temperature = NaN }: Numbers): number {
	return (volume * (highPressure - lowPressure) * T_N) / (P_N * temperature);
}

function refusalsOf({
	lowPressure,
	highPressure,
	startOxygen,
	inertOxygen,
	target,
	guard,
}: SwingGiven): readonly Refusal[] {
	const line = target.value - guard.value;
	const refusals: readonly (Refusal | undefined)[] = [
		lowPressure.value < highPressure.value
			? undefined
			: { kind: 'no-swing', input: 'highPressure', low: lowPressure.value, high: highPressure.value },
		line > 0 ? undefined : { kind: 'guard-leaves-nothing', input: 'guard', limit: target.value, guard: guard.value },
		line < startOxygen.value
			? undefined
			: { kind: 'target-not-below-start', input: 'target', target: line, start: startOxygen.value },
		inertOxygen.value < line
			? undefined
			: { kind: 'inert-gas-above-target', input: 'inertOxygen', inert: inertOxygen.value, target: line },
	];
	return refusals.filter((refusal) => refusal !== undefined);
}

type Facts = {
	readonly swings: number;
	readonly needed: number;
	readonly after: number;
	readonly U: number | undefined;
	readonly line: number;
	readonly unstated: readonly string[];
};

function notesOf(given: SwingGiven, { swings, needed, after, U, line, unstated }: Facts): readonly CalcNote[] {
	return [
		...(given.swing === 'held' ? [{ kind: 'swing-held', level: 'warning' } as const] : []),
		...(given.branches === 'present' ? [{ kind: 'branches-not-swept', level: 'warning' } as const] : []),
		...(U !== undefined && after + U > line
			? [{ kind: 'one-swing-more', level: 'warning', after, U, line } as const]
			: []),
		...(given.gas === 'carbon dioxide' ? [{ kind: 'carbon-dioxide-discharge', level: 'warning' } as const] : []),
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
		{ kind: 'swings-rounded-up', level: 'remark', swings, needed },
	];
}

function plotOf(
	{ target, guard }: SwingGiven,
	{ swings, at, exponent }: { swings: number; at: Numbers; exponent: number },
): Plot {
	const x = Array.from({ length: Math.min(swings + 2, 60) }, (_, n) => n);
	return {
		id: 'oxygen',
		title: 'Oxygen after each swing',
		x: { label: 'swings', unit: '' },
		y: { label: 'oxygen', unit: '1' },
		curves: [
			{
				...{ id: 'oxygen', label: 'oxygen', kind: 'steps', decides: true, x },
				y: x.map((n) => oxygenAfter(n, at, exponent)),
			},
		],
		marks: [
			{ kind: 'limit', label: 'limit', axis: 'y', at: target.value },
			...(guard.value > 0
				? [{ kind: 'guard', label: 'limit less guard', axis: 'y', at: target.value - guard.value } as const]
				: []),
		],
	};
}

// Isentropic exponents at room temperature (from memory, verify): nitrogen and air 1.40, carbon dioxide 1.30.
const KAPPA = { nitrogen: 1.4, 'carbon dioxide': 1.3 } as const;
/** What rounding of the processor may add to a whole number of swings. */
const ROUNDING = 1e-9;
