import type { CalculatorPage } from '../calculator';

export const FALSE_AIR_PAGE: CalculatorPage = {
	area: 'tightness',
	findBy: 'leak in-leakage false air ingress oxygen rise filter mill duct suction O2 tramp air tightness',
	first: ['oxygenBefore', 'oxygenAfter', 'flowBefore'],
	results: ['falseAir', 'falseAirOfOutlet', 'leak', 'flowAfter'],
	formula: [
		'r_1 = frac{q_L}{q_1} = frac{O_2 − O_1}{O_air − O_2}',
		'r_2 = frac{q_L}{q_2} = frac{O_2 − O_1}{O_air − O_1}',
	],
	explains: [
		'Air that leaks in carries oxygen: the more leaks in between two points, the more the oxygen rises. A percentage of false air means nothing without saying of which gas: of the gas before, or of the gas after.',
		'Both readings are dry, and of the same moment, in steady operation. A moist reading of a zirconia cell at one point and a dry reading at the other is no pair. Water that evaporates between the points does not matter on the dry basis.',
		'Oxygen that falls along the way is a disagreement of the analysers or of the moments, not a leak of zero: shown, and proof of nothing. Is the rise smaller than its uncertainty, it cannot be told from zero; that is not tightness.',
		'The points are read under the suction of operation: at rest the same holes leak less.',
	],
	cautions: ['inert', 'entry'],
	example: {
		oxygenBefore: { value: 6, unit: '%', U: 0.2 },
		oxygenAfter: { value: 7, unit: '%', U: 0.2 },
		flowBefore: { value: 26000, unit: 'm3(n)/h', U: 600 },
	},
};
