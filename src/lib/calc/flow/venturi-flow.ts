import { fail, ok, type Result } from '../../base';
import type { CalcNote, CalcResult, Refusal } from '../calculator';
import { defineCalculator } from '../define-calculator';
import { pressureOf, staticPressure } from '../gas/static-pressure';
import { propagate, type Numbers, type Propagated, type Uncertain } from '../uncertainty';
import { expansibilityUncertainty, TAU_MIN } from './expansibility';
import { LOSS_BAND, permanentLoss } from './permanent-loss';
import { differencePressure } from './venturi-dp';
import { venturiGas, type VenturiGas } from './venturi-gas';
import { VENTURI_INPUTS, type VenturiGiven } from './venturi-inputs';
import { diameterInputs, venturiModel } from './venturi-model';
import { VENTURI_OUTPUTS, venturiValues } from './venturi-outputs';
import { venturiPlot } from './venturi-plot';
import { venturiScope } from './venturi-scope';
import { workingPoint } from './working-point';
import { VENTURI_PAGE } from './venturi-page';

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
	page: VENTURI_PAGE,
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
	const point = workingPoint(given, gas, valuesOf(measured));
	const { dp, p1, beta, D, coefficient } = point;
	const model = venturiModel(given, gas);
	const inputs = [
		...measured,
		withRelative({ name: 'dischargeCoefficient', symbol: 'C', value: coefficient.C, unit: '1' }, coefficient.U),
		withRelative(
			{ name: 'expansibility', symbol: 'epsilon', value: point.epsilon, unit: '1' },
			expansibilityUncertainty(point),
		),
	];
	const flow = model(valuesOf(inputs));
	const isFlowing = dp > 0;
	const { U, budget, unstated } = isFlowing ? propagate(model, inputs) : NOTHING;
	const notes = [
		...readingNotes,
		...(isFlowing ? venturiScope(given, point) : []),
		...(isFlowing ? uncertaintyNotes(given, { flow, U, unstated }) : []),
	];
	const values = {
		...flow,
		beta,
		pressureRatio: 1 - dp / p1,
		reynoldsNumber: point.reynolds,
		viscosity: gas.viscosity,
		isentropicExponent: gas.kappa,
		permanentLoss: permanentLoss(dp, beta, D),
		permanentLossLeast: LOSS_BAND.least * dp,
		permanentLossMost: LOSS_BAND.most * dp,
	};
	return {
		values: venturiValues(values, U),
		scope: notes.some((note) => note.level === 'outside scope') ? 'outside scope' : 'in scope',
		notes,
		budget: budget.filter((row) => row.output === 'massFlow'),
		plots: [venturiPlot(point, given.dpSpan?.value)],
	};
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
	const byDefault = (['pipeDiameter', 'throatDiameter', 'compressibility'] as const).filter(
		(name) => given[name].U === undefined,
	);
	return [
		...(byDefault.length > 0 ? [{ kind: 'uncertainty-by-default', level: 'remark', inputs: byDefault } as const] : []),
		...(unstated.length > 0 ? [{ kind: 'uncertainty-not-stated', level: 'warning', inputs: unstated } as const] : []),
		...(limit !== undefined && !(relativeU !== undefined && relativeU <= limit)
			? [{ kind: 'uncertainty-over-limit', level: 'outside scope', U: relativeU ?? null, limit } as const]
			: []),
	];
}

const dpInput = (dp: Uncertain): Uncertain => ({ ...dp, name: 'dp' });

const valuesOf = (inputs: readonly Uncertain[]): Numbers =>
	Object.fromEntries(inputs.map((input) => [input.name, input.value]));

const withRelative = (input: Uncertain, U: number | undefined): Uncertain =>
	U === undefined ? input : { ...input, U: U * input.value };

/** Without flow there is nothing to be uncertain about: the result is outside scope anyway. */
const NOTHING: Propagated = { U: {}, budget: [], unstated: [] };
