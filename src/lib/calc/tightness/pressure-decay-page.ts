import type { CalculatorPage } from '../calculator';

export const PRESSURE_DECAY_PAGE: CalculatorPage = {
	area: 'tightness',
	findBy: 'leak test tightness pressure drop hold test pipe gas train enclosure decay temperature barometer',
	first: [
		'gaugeStart',
		'barometerStart',
		'gaugeEnd',
		'barometerEnd',
		'temperatureStart',
		'temperatureEnd',
		'volume',
		'duration',
		'allowedLeak',
	],
	results: ['leak', 'correctedDrop', 'rawDrop', 'lost', 'hourlyRate'],
	formula: [
		'Δp_c = p_1 − p_2 frac{T_1}{T_2}',
		'q_L = frac{V}{t} frac{Δp_c}{p_1} frac{p_1}{p_n} frac{T_n}{T_1}',
		'T_f = frac{1}{t} (frac{p_1 T_2}{p_2 T_1} − 1)',
	],
	explains: [
		'The pressure of an enclosed gas falls when gas leaks out, and when the gas cools. At 1013 hPa and 20 °C a tenth of a degree is 35 Pa: often more than the leak. That is why both temperatures are needed, of the gas, not of the wall in the sun.',
		'A gauge pressure moves with the weather as well: each reading needs the barometer of its own moment.',
		'The walls have to be rigid: compensators and filter bags give way, and the volume is then another.',
		'A pressure that rises by more than its uncertainty is no tightness: the temperature does not belong to the gas, and the test is void. A change of more than 1 K voids it as well.',
		'The number is the leak at this test pressure. In suction, or hot, it is another.',
	],
	cautions: ['inert', 'entry'],
	example: {
		gaugeStart: { value: 1975, unit: 'Pa(g)', U: 5 },
		barometerStart: { value: 1013.25, unit: 'hPa(a)', U: 0.1 },
		gaugeEnd: { value: 1445, unit: 'Pa(g)', U: 5 },
		barometerEnd: { value: 1013.25, unit: 'hPa(a)', U: 0.1 },
		temperatureStart: { value: 20, unit: 'degC', U: 0.1 },
		temperatureEnd: { value: 20.4, unit: 'degC', U: 0.1 },
		volume: { value: 500, unit: 'm3', U: 15 },
		duration: { value: 60, unit: 'min' },
		allowedLeak: { value: 6, unit: 'm3(n)/h' },
	},
};
