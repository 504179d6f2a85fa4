import type { Numbers, Uncertain } from '../uncertainty';
import { dryFlow, normalFlow } from './normal-flow';
import { hotDiameter, massFlow } from './mass-flow';
import type { VenturiGas } from './venturi-gas';
import type { VenturiGiven } from './venturi-inputs';

/**
 * All flows of a Venturi tube as one function of what was measured, so that values, uncertainties and budget come from
 * the same place. C and the expansibility are inputs of their own: ISO 5167-1, 8.2.2 takes them as independent.
 */
export const venturiModel =
	(given: VenturiGiven, gas: VenturiGas) =>
	(values: Numbers): Numbers => {
		const { dischargeCoefficient: C = NaN, expansibility: epsilon = NaN, dp = NaN } = values;
		const state = gas.at(values);
		const { D, d } = diameters(given, values, state.temperature);
		const flow = massFlow({ C, epsilon, d, D, dp, rho1: state.density });
		const volumeFlow = flow / state.density;
		const wet = state.molarMass === undefined ? undefined : normalFlow(flow, state.molarMass);
		const dry = wet === undefined || state.waterVapour === undefined ? undefined : dryFlow(wet, state.waterVapour);
		return {
			massFlow: flow,
			volumeFlow,
			...(wet === undefined ? {} : { normalFlowWet: wet }),
			...(dry === undefined ? {} : { normalFlowDry: dry }),
			ductVelocity: volumeFlow / ((Math.PI / 4) * D ** 2),
			throatVelocity: volumeFlow / ((Math.PI / 4) * d ** 2),
			differencePressure: dp,
			dischargeCoefficient: C,
			expansibility: epsilon,
			density: state.density,
			pressure: state.pressure,
			...(state.molarMass === undefined ? {} : { molarMass: state.molarMass }),
		};
	};

/** Diameters at working temperature: grown from the drawing's 20 degC where an expansion coefficient is given. */
export function diameters(given: VenturiGiven, values: Numbers, temperature: number): { D: number; d: number } {
	const { pipeDiameter: D = NaN, throatDiameter: d = NaN } = values;
	const expansion = given.thermalExpansion?.value;
	if (expansion === undefined) return { D, d };
	return { D: hotDiameter(D, expansion, temperature), d: hotDiameter(d, expansion, temperature) };
}

/** The diameters as inputs of the model; where nobody stated how well they are known, the standard's largest values. */
export const diameterInputs = ({ pipeDiameter, throatDiameter }: VenturiGiven): readonly Uncertain[] => [
	// ISO 5167-1:2003, 8.2.2.3 (from memory, verify): 0.4 % for D and 0.1 % for d where the tube meets the standard.
	{ U: 0.004 * pipeDiameter.value, ...pipeDiameter, name: 'pipeDiameter', symbol: 'D', unit: 'm' },
	{ U: 0.001 * throatDiameter.value, ...throatDiameter, name: 'throatDiameter', symbol: 'd', unit: 'm' },
];
