import type { CalculatorPage } from '../calculator';

export const VENTURI_PAGE: CalculatorPage = {
	area: 'flow',
	findBy: 'venturi flow meter fan circuit gas duct velocity differential pressure dp mass volume normal m3/h',
	first: ['dp', 'pressure', 'temperature', 'composition', 'waterVapour', 'throatDiameter', 'pipeDiameter', 'type'],
	results: ['volumeFlow', 'normalFlowWet', 'massFlow', 'ductVelocity', 'reynoldsNumber', 'permanentLoss'],
	formula: [
		'q_m = frac{C ε}{sqrt{1 − β^4}} frac{π}{4} d^2 sqrt{2 Δp ρ_1}',
		'q_v = frac{q_m}{ρ_1}',
		'q_n = q_m frac{V_m}{M}',
	],
	explains: [
		'The throat makes the gas faster, and what it gains in speed it lacks in pressure: the flow goes with the root of the difference pressure.',
		'The discharge coefficient C belongs to the way the tube was made. Its uncertainty, and that of the difference pressure, make most of the uncertainty of the flow; the table shows how much.',
		'Pressure and temperature are those before the tube, and the pressure is absolute: a gauge pressure needs the barometer. If the gas is moist, its water belongs into the composition.',
		'Outside the limits of the standard the number is shown and marked; it then proves no step. Never read m³(n)/h as m³/h: at 90 °C they differ by a third.',
	],
	cautions: [],
	example: {
		type: 'rough_welded',
		pipeDiameter: { value: 1000, unit: 'mm', U: 4 },
		throatDiameter: { value: 600, unit: 'mm', U: 1.5 },
		dp: { value: 462, unit: 'Pa', U: 7.4 },
		pressure: { value: 98620, unit: 'Pa(a)', U: 300 },
		temperature: { value: 24.2, unit: 'degC', U: 1 },
		composition: {
			N2: { value: 91.4, unit: '%', U: 0.3 },
			O2: { value: 7.4, unit: '%', U: 0.3 },
			H2O: { value: 1.2, unit: '%', U: 0.2 },
		},
	},
};
