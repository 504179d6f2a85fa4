import type { CalculatorPage } from '../calculator';

export const SWING_PAGE: CalculatorPage = {
	area: 'purge',
	findBy: 'nitrogen N2 pressure swing vacuum purge cycles silo vessel pipe evacuate fill let down oxygen',
	first: [
		'lowPressure',
		'highPressure',
		'startOxygen',
		'inertOxygen',
		'target',
		'guard',
		'volume',
		'temperature',
		'swing',
	],
	results: ['swings', 'exactSwings', 'oxygenAfter', 'inertGas'],
	formula: [
		'C_n = C_i + (C_0 − C_i) (frac{p_low}{p_high})^{n/m}',
		'n = m frac{ln frac{C_t − C_i}{C_0 − C_i}}{ln frac{p_low}{p_high}}',
	],
	explains: [
		'Filling thins the oxygen by the ratio of the two absolute pressures, letting down takes the thinned gas away. Above the atmosphere it is a pressure swing, below it a vacuum swing: the formula is the same.',
		'A fast swing heats the gas while it is filled, so that less inert gas goes in than the pressure says: the exponent m is then the isentropic exponent, which asks for more swings. Take m = 1 only where each swing is held and topped up until its temperature has settled.',
		'All gas has to mix at every swing. A long dead-ended branch takes its own gas back again; it is not purged by this.',
		'Is the vessel made for the upper pressure, and for the vacuum? The formula does not know.',
	],
	cautions: ['inert', 'entry'],
	example: {
		lowPressure: { value: 1013, unit: 'mbar(a)', U: 3 },
		highPressure: { value: 3013, unit: 'mbar(a)', U: 20 },
		inertOxygen: { value: 0.1, unit: '%', U: 0.05 },
		target: { value: 5, unit: '%' },
		guard: { value: 0.3, unit: '%' },
		volume: { value: 20, unit: 'm3', U: 0.5 },
		temperature: { value: 20, unit: 'degC', U: 2 },
	},
};
