import type { CalcValue, OutputSpec } from '../calculator';
import type { Numbers } from '../uncertainty';

const output = (name: string, symbol: string, means: string, quantity: string, unit: string): OutputSpec => ({
	name,
	symbol,
	means,
	quantity,
	unit,
});

/** Everything `venturi-flow@1` answers, with the intermediate values that a recalculation is compared by. */
export const VENTURI_OUTPUTS: readonly OutputSpec[] = [
	output('massFlow', 'q_m', 'mass flow', 'mass-flow', 'kg/s'),
	output('volumeFlow', 'q_v', 'actual flow at the upstream tapping', 'volume-flow', 'm3/s'),
	output('normalFlowWet', 'q_n', 'normal flow, moisture included', 'volume-flow-normal-wet', 'm3(n)/s'),
	output('normalFlowDry', 'q_n,dry', 'normal flow of the dry gas', 'volume-flow-normal-dry', 'm3(n)/s'),
	output('ductVelocity', 'v', 'mean velocity in the pipe upstream', 'velocity', 'm/s'),
	output('throatVelocity', 'v_d', 'mean velocity in the throat at upstream density', 'velocity', 'm/s'),
	output('reynoldsNumber', 'Re_D', 'Reynolds number of the pipe', 'number', '1'),
	output('dischargeCoefficient', 'C', 'discharge coefficient used', 'number', '1'),
	output('expansibility', 'epsilon', 'expansibility factor', 'number', '1'),
	output('beta', 'beta', 'diameter ratio', 'number', '1'),
	output('pressureRatio', 'tau', 'throat to upstream pressure', 'number', '1'),
	output('differencePressure', 'dp', 'difference pressure used', 'pressure-difference', 'Pa'),
	output('pressure', 'p1', 'absolute pressure at the upstream tapping', 'pressure-absolute', 'Pa(a)'),
	output('density', 'rho1', 'density at the upstream tapping', 'density', 'kg/m3'),
	output('viscosity', 'mu1', 'dynamic viscosity used', 'viscosity', 'Pa s'),
	output('isentropicExponent', 'kappa', 'isentropic exponent used', 'number', '1'),
	output('molarMass', 'M', 'molar mass of the moist gas', 'molar-mass', 'kg/mol'),
	output('permanentLoss', 'dw', 'permanent pressure loss by the chart', 'pressure-difference', 'Pa'),
	output('permanentLossLeast', 'dw_min', 'permanent pressure loss, 5 % of dp', 'pressure-difference', 'Pa'),
	output('permanentLossMost', 'dw_max', 'permanent pressure loss, 20 % of dp', 'pressure-difference', 'Pa'),
];

/** Values in the order of the outputs; what is not known says why. */
export const venturiValues = (
	values: { readonly [name: string]: number | undefined },
	U: Numbers,
): { readonly [name: string]: CalcValue } =>
	Object.fromEntries(
		VENTURI_OUTPUTS.map(({ name, unit }): [string, CalcValue] => {
			const value = values[name];
			if (value === undefined) return [name, { value: null, unit, because: BECAUSE[name] ?? 'not known' }];
			return [name, { value, unit, ...(U[name] === undefined ? {} : { U: U[name] }) }];
		}),
	);

const BECAUSE: { readonly [name: string]: string } = {
	normalFlowWet: 'the density is not that of a gas at this state',
	normalFlowDry: 'the moisture is not stated, or the density is not that of a gas at this state',
	molarMass: 'the density is not that of a gas at this state',
	permanentLoss: 'outside the chart: beta 0.30 to 0.75, D from 65 mm',
};
