import { pressureOf } from '../gas/static-pressure';
import type { Numbers } from '../uncertainty';
import { dischargeCoefficient, type Coefficient } from './discharge-coefficient';
import { expansibility } from './expansibility';
import { massFlow, reynoldsNumber } from './mass-flow';
import { straightLength } from './straight-length';
import type { VenturiGas } from './venturi-gas';
import type { VenturiGiven } from './venturi-inputs';
import { diameters } from './venturi-model';
import { VENTURI_TYPES, type VenturiType } from './venturi-types';

/** The tube at work: geometry, gas and coefficient of one reading. */
export type WorkingPoint = {
	readonly D: number;
	readonly d: number;
	readonly beta: number;
	readonly dp: number;
	readonly p1: number;
	readonly density: number;
	readonly kappa: number;
	readonly epsilon: number;
	readonly coefficient: Coefficient;
	readonly reynolds: number;
	/** What the constant of the type would have given, for comparison where it does not hold. */
	readonly massFlowAtConstant: number;
};

export function workingPoint(given: VenturiGiven, gas: VenturiGas, values: Numbers): WorkingPoint {
	const { kappa, viscosity } = gas;
	const { density, temperature } = gas.at(values);
	const { dp = NaN } = values;
	const { D, d } = diameters(given, values, temperature);
	const expansion = { dp, p1: pressureOf(values), beta: d / D, kappa };
	const epsilon = expansibility(expansion);
	const flowWith = (C: number) => massFlow({ C, epsilon, d, D, dp, rho1: density });
	const reynoldsWith = (C: number) => reynoldsNumber(flowWith(C), viscosity, D);
	const { U, ...coefficient } = coefficientAtItsFlow(given.type, reynoldsWith);
	const { added } = straightLength(given, D);
	return {
		...expansion,
		D,
		d,
		density,
		epsilon,
		coefficient: U === undefined ? coefficient : { ...coefficient, U: U + added },
		reynolds: reynoldsWith(coefficient.C),
		massFlowAtConstant: flowWith(VENTURI_TYPES[given.type].C),
	};
}

/**
 * The coefficient at the flow that it gives itself. Inside the range it is constant; in the indicative table it rises with
 * the Reynolds number far more slowly than in proportion, so the steps close in on one point.
 */
function coefficientAtItsFlow(type: VenturiType, reynoldsWith: (C: number) => number): Coefficient {
	let coefficient = dischargeCoefficient(type, reynoldsWith(VENTURI_TYPES[type].C));
	for (let step = 0; step < 50 && coefficient.from === 'indicative table'; step++) {
		const next = dischargeCoefficient(type, reynoldsWith(coefficient.C));
		if (Math.abs(next.C - coefficient.C) < 1e-12) return next;
		coefficient = next;
	}
	return coefficient;
}
