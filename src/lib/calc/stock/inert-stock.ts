import { fail, ok, type Result } from '../../base';
import { answered } from '../answered';
import type { CalcNote, CalcResult, Refusal } from '../calculator';
import { MOLAR_MASS, NORMAL_DENSITY, R, V_M } from '../constants';
import { defineCalculator } from '../define-calculator';
import { propagate, type Numbers, type Uncertain } from '../uncertainty';
import { nitrogenCompressibility } from './nitrogen-compressibility';
import { STOCK_INPUTS, STOCK_OUTPUTS, type StockGiven } from './stock-inputs';
import { STOCK_PAGE } from './stock-page';

/**
 * Stock of inert gas in bottles: how much there is, how much of it can be used, and whether it is enough for this purge and
 * one repeat.
 *
 *     nitrogen: n = N V p/(Z R T), V_n = n V_m, usable = V_n(p) − V_n(p_min);   carbon dioxide: V_n = m/ρ_n
 *
 * @param inputs N bottles [1] of V [m³]; p and p_min [Pa gauge] with the barometer; T [K], 253 to 323; or m of CO2 [kg];
 *   gas of one purge, reserve [m³(n)], use at present [m³(n)/s]
 * @returns usable and all gas [m³(n)], its mass [kg], Z [1], what is left [m³(n)], how long it lasts [s], each with U
 *
 * Source: real gas law with Z of nitrogen from CoolProp 8.0.0; density of CO2 in the normal state from the same.
 * Checked against: CoolProp 8.0.0, bottles as wholes (test/calc/stock/inert-stock.test.ts).
 */
export const inertStock = defineCalculator({
	id: 'inert-stock',
	version: 1,
	title: 'Stock of inert gas in bottles',
	answers: 'How much inert gas is in these bottles, and is it enough for a purge and one repeat?',
	sources: [
		'Real gas law; compressibility of nitrogen by CoolProp 8.0.0 (Span et al. 2000)',
		'Density of carbon dioxide at 0 degC and 101 325 Pa by CoolProp 8.0.0',
		'JCGM 100:2008, 5.1.2',
	],
	fields: STOCK_INPUTS,
	outputs: STOCK_OUTPUTS,
	page: STOCK_PAGE,
	compute,
});

function compute(given: StockGiven): Result<Omit<CalcResult, 'calc' | 'constants' | 'inputs'>, readonly Refusal[]> {
	const inputs = given.gas === 'nitrogen' ? nitrogenInputs(given) : dioxideInputs(given);
	if (!inputs.ok) return inputs;
	const stock = given.gas === 'nitrogen' ? nitrogen : dioxide;
	const { reserve, purge, flow } = given;
	const model = (at: Numbers): Numbers => {
		const found = stock(at);
		const free = (found.usable ?? NaN) - reserve.value;
		return {
			...found,
			...(purge === undefined ? {} : { left: free - 2 * purge.value }),
			...(flow === undefined ? {} : { lasts: Math.max(0, free) / flow.value }),
		};
	};
	const at = Object.fromEntries(inputs.value.map(({ name, value }) => [name, value]));
	const values = model(at);
	const { U, budget, unstated } = propagate(model, inputs.value);
	return ok({
		values: answered(STOCK_OUTPUTS, values, U, BECAUSE),
		scope: 'in scope',
		notes: notesOf(given, values, unstated),
		budget: budget.filter((row) => row.output === 'usable'),
	});
}

function nitrogenInputs(given: StockGiven): Result<readonly Uncertain[], readonly Refusal[]> {
	const { waterVolume, pressure, leastPressure, barometer, temperature, bottles } = given;
	if (waterVolume === undefined || pressure === undefined) {
		const missing = { waterVolume, pressure };
		return fail(
			Object.entries(missing).flatMap(([input, value]) =>
				value === undefined ? [{ kind: 'missing-input', input, neededBy: 'nitrogen' }] : [],
			),
		);
	}
	if (leastPressure.value > pressure.value)
		return fail([
			{ kind: 'stop-above-pressure', input: 'leastPressure', least: leastPressure.value, pressure: pressure.value },
		]);
	return ok([
		{ ...waterVolume, name: 'waterVolume', symbol: 'V', unit: 'm3' },
		{ ...pressure, name: 'pressure', symbol: 'p', unit: 'Pa(g)' },
		{ U: 0, ...leastPressure, name: 'leastPressure', symbol: 'p_min', unit: 'Pa(g)' },
		// The weather is a thousandth of what is in a bottle.
		{ U: WEATHER, ...barometer, name: 'barometer', symbol: 'p_b', unit: 'Pa(a)' },
		{ ...temperature, name: 'temperature', symbol: 'T', unit: 'K' },
		{ U: 0, ...bottles, name: 'bottles', symbol: 'N', unit: '1' },
	]);
}

function dioxideInputs({ mass }: StockGiven): Result<readonly Uncertain[], readonly Refusal[]> {
	if (mass === undefined) return fail([{ kind: 'carbon-dioxide-by-weight', input: 'mass' }]);
	return ok([{ ...mass, name: 'mass', symbol: 'm', unit: 'kg' }]);
}

function nitrogen(at: Numbers): Numbers {
	const { waterVolume: V = NaN, bottles: N = NaN, temperature: T = NaN, barometer = NaN } = at;
	const [p, least] = [(at.pressure ?? NaN) + barometer, (at.leastPressure ?? NaN) + barometer];
	const content = amount(p, { V: N * V, T }) * V_M;
	return {
		content,
		usable: content - amount(least, { V: N * V, T }) * V_M,
		ideal: ((N * V * p) / (R * T)) * V_M,
		compressibility: Z(p, T),
		contentMass: (content / V_M) * MOLAR_MASS.N2,
	};
}

const dioxide = ({ mass: m = NaN }: Numbers): Numbers => ({
	content: m / NORMAL_DENSITY.CO2,
	usable: m / NORMAL_DENSITY.CO2,
	contentMass: m,
});

const amount = (p: number, { V, T }: { readonly V: number; readonly T: number }): number => (p * V) / (Z(p, T) * R * T);

/** Inputs are inside the fit; a slope is taken at its very edge by a hair beyond, where the fit is as good. */
function Z(p: number, T: number): number {
	const found = nitrogenCompressibility(p, Math.min(323.15, Math.max(253.15, T)));
	return found.ok ? found.value : NaN;
}

function notesOf(given: StockGiven, { usable = NaN }: Numbers, unstated: readonly string[]): readonly CalcNote[] {
	const { gas, purge, reserve } = given;
	const free = usable - reserve.value;
	const facts = purge === undefined ? undefined : { usable: free, purge: purge.value, ratio: free / purge.value };
	return [
		...(facts !== undefined && free < facts.purge
			? [{ kind: 'stock-too-small', level: 'warning', ...facts } as const]
			: facts !== undefined && free < 2 * facts.purge
				? [{ kind: 'stock-without-repeat', level: 'warning', ...facts } as const]
				: []),
		...(gas === 'carbon dioxide' ? [{ kind: 'carbon-dioxide-discharge', level: 'warning' } as const] : []),
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
		...(gas === 'nitrogen' ? [{ kind: 'bottles-at-rest', level: 'remark' } as const] : []),
	];
}

const WEATHER = 5e3;
const BECAUSE = {
	ideal: 'carbon dioxide is told by weight',
	compressibility: 'carbon dioxide is told by weight',
	left: 'no purge stated',
	lasts: 'no use stated',
};
