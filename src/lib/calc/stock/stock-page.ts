import type { CalculatorPage } from '../calculator';

export const STOCK_PAGE: CalculatorPage = {
	area: 'stock',
	findBy:
		'nitrogen N2 bottle cylinder bundle stock how much left bar enough repeat CO2 weight reserve minutes real gas',
	first: ['gas', 'bottles', 'waterVolume', 'pressure', 'leastPressure', 'temperature', 'purge', 'reserve', 'flow'],
	results: ['usable', 'left', 'lasts', 'content', 'ideal', 'contentMass'],
	formula: ['V_n = frac{N V p}{Z R T} V_m', 'V_u = V_n(p) − V_n(p_min)', 'V_n = frac{m}{ρ_n}'],
	explains: [
		'A bottle holds less than pressure times volume: at 200 bar a twentieth less, at 300 bar an eighth. What the regulator leaves behind is not usable, and the emergency reserve is not for purging.',
		'Pressure and temperature belong together, at rest: a bundle in the sun reads more, one that has just been drawn from is cold and reads less than it will after an hour.',
		'Carbon dioxide is liquid in the bottle: its pressure is the same full or nearly empty. Only the scale tells how much there is.',
		'One purge may fail: plan for one repeat.',
	],
	cautions: ['inert', 'entry'],
	example: {
		bottles: 12,
		waterVolume: { value: 50, unit: 'L', U: 0.5 },
		pressure: { value: 185, unit: 'bar(g)', U: 3 },
		leastPressure: { value: 5, unit: 'bar(g)' },
		temperature: { value: 15, unit: 'degC', U: 2 },
		purge: { value: 40, unit: 'm3(n)' },
		reserve: { value: 10, unit: 'm3(n)' },
		flow: { value: 100, unit: 'm3(n)/h' },
	},
};
