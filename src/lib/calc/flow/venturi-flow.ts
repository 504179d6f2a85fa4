import { fail, ok, type Result } from '../../base';
import type { CalcNote, CalcResult, Refusal } from '../calculator';
import { defineCalculator } from '../define-calculator';
import { pressureOf, staticPressure } from '../gas/static-pressure';
import { propagate, type Numbers, type Uncertain } from '../uncertainty';
import { dischargeCoefficient, type Coefficient } from './discharge-coefficient';
import { expansibility, expansibilityUncertainty, TAU_MIN } from './expansibility';
import { massFlow, reynoldsNumber } from './mass-flow';
import { LOSS_BAND, permanentLoss } from './permanent-loss';
import { differencePressure } from './venturi-dp';
import { venturiGas, type VenturiGas } from './venturi-gas';
import { VENTURI_INPUTS, type VenturiGiven } from './venturi-inputs';
import { diameterInputs, diameters, venturiModel } from './venturi-model';
import { VENTURI_OUTPUTS, venturiValues } from './venturi-outputs';
import { venturiPlot } from './venturi-plot';
import { venturiScope } from './venturi-scope';
import { VENTURI_TYPES } from './venturi-types';

/**
 * What flows through a classical Venturi tube: mass, actual and normal flow, wet and dry, and the velocity in the duct.
 *
 *     q_m = C ε (π/4) d² √(2 Δp ρ₁) / √(1 − β⁴),   Re_D = 4 q_m / (π μ₁ D)
 *     (U_q/q)² = (U_C/C)² + (U_ε/ε)² + (2β⁴/(1−β⁴))² (U_D/D)² + (2/(1−β⁴))² (U_d/d)² + ¼ (U_Δp/Δp)² + ¼ (U_ρ/ρ)²
 *
 * Outside the limits of the type the result is shown and flagged: it proves no step. Below Re_D = 2·10⁵ the coefficient is
 * that of an indicative table, found by iteration, since it depends on the flow it gives.
 *
 * @param inputs D, d [m], β = d/D from 0.30 to 0.75 by type; Δp [Pa] ≤ 0.25 p₁; p₁ [Pa absolute], or gauge with barometer;
 *   T [K]; ρ₁ [kg/m³], μ₁ [Pa s], κ [1] ≥ 1, or the composition xᵢ [1] they follow from; Z [1]
 * @returns q_m [kg/s], q_v [m³/s], q_n wet and dry [m³(n)/s], velocities [m/s], Re_D, C, ε [1], permanent loss [Pa]
 *
 * Source: ISO 5167-1:2003, Eq. (1) and 8.2.2; ISO 5167-4:2003, 5.5 to 5.9 (clauses from memory, verify).
 * Checked against: fluids 1.0.22, 66 cases (test/calc/flow/venturi-flow.test.ts).
 */
export const venturiFlow = defineCalculator({
	id: 'venturi-flow',
	version: 1,
	title: 'Flow through a Venturi tube',
	answers: 'What flows through this Venturi tube?',
	sources: [
		'ISO 5167-1:2003, Eq. (1) and 8.2.2 (clauses from memory, verify)',
		'ISO 5167-4:2003, 5.5 to 5.9 and Annex B (limits second-hand and from memory, verify)',
		'IAPWS R7-97(2012) for the check that no liquid is present',
		'JCGM 100:2008, 5.1.2',
	],
	fields: VENTURI_INPUTS,
	outputs: VENTURI_OUTPUTS,
	compute,
});

type Computed = Omit<CalcResult, 'calc' | 'constants' | 'inputs'>;

function compute(given: VenturiGiven): Result<Computed, readonly Refusal[]> {
	const geometry = geometryRefusals(given);
	const upstream = staticPressure(given);
	const difference = differencePressure(given);
	const gas = upstream.ok ? venturiGas(given, upstream.value) : upstream;
	if (geometry.length > 0 || !difference.ok || !upstream.ok || !gas.ok) {
		const refusals = [difference, gas].flatMap((each) => (each.ok ? [] : each.error));
		return fail([...geometry, ...refusals]);
	}
	const { dp, notes } = difference.value;
	const measured = [...diameterInputs(given), dpInput(dp), ...upstream.value, ...gas.value.inputs];
	const tau = ratioRefusal(dp, valuesOf(measured));
	return tau === undefined ? ok(flowOf(given, gas.value, measured, [...notes, ...gas.value.notes])) : fail([tau]);
}

function flowOf(
	given: VenturiGiven,
	gas: VenturiGas,
	measured: readonly Uncertain[],
	readingNotes: readonly CalcNote[],
): Computed {
	const values = valuesOf(measured);
	const pressure = pressureOf(values);
	const { density } = gas.at(values);
	const { D, d } = diameters(given, values, given.temperature.value);
	const beta = d / D;
	const dp = values.dp ?? NaN;
	const expansion = { dp, p1: pressure, beta, kappa: gas.kappa };
	const epsilon = expansibility(expansion);
	const flowWith = (C: number) => massFlow({ C, epsilon, d, D, dp, rho1: density });
	const reynoldsOf = (flow: number) => reynoldsNumber(flow, gas.viscosity, D);
	const coefficient = solveCoefficient(given, (C) => reynoldsOf(flowWith(C)));

	const model = venturiModel(given, gas);
	const inputs = [
		...measured,
		relative({ name: 'dischargeCoefficient', symbol: 'C', value: coefficient.C, unit: '1' }, coefficient.U),
		relative(
			{ name: 'expansibility', symbol: 'epsilon', value: epsilon, unit: '1' },
			expansibilityUncertainty(expansion),
		),
	];
	const flow = model(valuesOf(inputs));
	const { U, budget, unstated } = propagate(model, inputs);
	const reynolds = reynoldsOf(flow.massFlow ?? NaN);
	const { C: constant } = VENTURI_TYPES[given.type];
	const facts = {
		D,
		beta,
		reynolds,
		dp,
		pressure,
		kappa: gas.kappa,
		coefficient,
		massFlowAtConstant: flowWith(constant),
	};
	const isFlowing = dp > 0;
	const notes = [
		...readingNotes,
		...(isFlowing ? venturiScope(given, facts) : []),
		...(isFlowing ? uncertaintyNotes(given, { flow, U, unstated }) : []),
	];
	const loss = permanentLoss(dp, beta, D);
	const all: { readonly [name: string]: number | undefined } = {
		...flow,
		beta,
		pressureRatio: 1 - dp / pressure,
		reynoldsNumber: reynolds,
		viscosity: gas.viscosity,
		isentropicExponent: gas.kappa,
		permanentLoss: loss,
		permanentLossLeast: LOSS_BAND.least * dp,
		permanentLossMost: LOSS_BAND.most * dp,
	};
	return {
		values: venturiValues(all, isFlowing ? U : {}),
		scope: notes.some((note) => note.level === 'outside scope') ? 'outside scope' : 'in scope',
		notes,
		budget: isFlowing ? budget.filter((row) => row.output === 'massFlow') : [],
		plots: [venturiPlot({ ...expansion, C: coefficient.C, d, D, density, span: given.dpSpan?.value })],
	};
}

/**
 * The coefficient at the flow that it gives itself. Inside the range it is constant; in the indicative table it rises with
 * the Reynolds number far more slowly than in proportion, so the steps close in on one point.
 */
function solveCoefficient(given: VenturiGiven, reynoldsWith: (C: number) => number): Coefficient {
	let coefficient = dischargeCoefficient(given.type, reynoldsWith(VENTURI_TYPES[given.type].C));
	if (coefficient.from !== 'indicative table') return coefficient;
	for (let step = 0; step < 50; step++) {
		const next = dischargeCoefficient(given.type, reynoldsWith(coefficient.C));
		// At the lower end of the table the point itself can fall out of it: then the table does not reach this flow.
		if (next.from !== 'indicative table' || Math.abs(next.C - coefficient.C) < 1e-12) return next;
		coefficient = next;
	}
	return coefficient;
}

function geometryRefusals({ crossSection, pipeDiameter, throatDiameter }: VenturiGiven): readonly Refusal[] {
	if (crossSection === 'rectangular') {
		return [
			{
				kind: 'rectangular-duct',
				input: 'crossSection',
				use: 'field traverse (ISO 3966, EN ISO 16911; from memory, verify)',
			},
		];
	}
	if (throatDiameter.value < pipeDiameter.value) return [];
	return [{ kind: 'throat-not-smaller', input: 'throatDiameter', d: throatDiameter.value, D: pipeDiameter.value }];
}

function ratioRefusal(dp: Uncertain, values: Numbers): Refusal | undefined {
	const pressure = pressureOf(values);
	if (dp.value >= pressure) return { kind: 'difference-above-pressure', input: dp.name, dp: dp.value, pressure };
	const tau = 1 - dp.value / pressure;
	return tau < TAU_MIN ? { kind: 'pressure-ratio-too-low', input: dp.name, tau, min: TAU_MIN } : undefined;
}

function uncertaintyNotes(
	given: VenturiGiven,
	{ flow, U, unstated }: { flow: Numbers; U: Numbers; unstated: readonly string[] },
): readonly CalcNote[] {
	const relativeU = U.massFlow === undefined ? undefined : U.massFlow / (flow.massFlow ?? NaN);
	const limit = given.uncertaintyLimit?.value;
	return [
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
		...(limit !== undefined && !(relativeU !== undefined && relativeU <= limit)
			? [{ kind: 'uncertainty-over-limit', level: 'outside scope', U: relativeU ?? null, limit } as const]
			: []),
	];
}

const dpInput = (dp: Uncertain): Uncertain => ({ ...dp, name: 'dp' });

const valuesOf = (inputs: readonly Uncertain[]): Numbers =>
	Object.fromEntries(inputs.map((input) => [input.name, input.value]));

const relative = (input: Uncertain, U: number | undefined): Uncertain =>
	U === undefined ? input : { ...input, U: U * input.value };
