import type { CalculatorPage } from '../calculator';

export const CLEARANCE_PAGE: CalculatorPage = {
	area: 'moisture',
	findBy: 'dew point condensation wet filter bag hopper cone cold metal dripping rust acid SO3 moisture water',
	first: ['surfaces', 'waterVapour', 'predictedWaterVapour', 'pressure', 'margin'],
	results: ['leastClearance', 'clearance', 'predictedClearance', 'dewPoint', 'predictedDewPoint', 'coldestTemperature'],
	formula: ['ΔT = T_s − T_dp', 'p_sat(T_dp) = x_w p', 'ΔT − U ≥ ΔT_margin'],
	explains: [
		'Gas that meets metal colder than its dew point leaves water there: dust cakes, steel rusts, a cold hopper smoulders unseen. The coldest surface decides, not the gas temperature.',
		'With feed on the gas takes up the water of the fuel: that state is judged as well as the present one, and the smaller clearance decides.',
		'Moisture may be given wet (per mole of wet gas), dry, or by mass of dry gas; they differ, and each is asked for by its own name.',
		'An acid dew point lies far higher. Where sulphur is in play it is shown as a remark, by two correlations, and proves nothing.',
	],
	cautions: [],
	example: {
		surfaces: [
			{ name: 'Hopper cone', temperature: { value: 68, unit: 'degC', U: 1.5 }, age: { value: 2, unit: 'min' } },
			{ name: 'Filter roof', temperature: { value: 74, unit: 'degC', U: 1.5 }, age: { value: 2, unit: 'min' } },
		],
		waterVapour: { value: 8, unit: '%', U: 0.5 },
		predictedWaterVapour: { value: 14, unit: '%', U: 1 },
		pressure: { value: 985, unit: 'hPa(a)', U: 3 },
		gasTemperature: { value: 92, unit: 'degC' },
		margin: { value: 10, unit: 'K' },
		filter: 'preheated',
	},
};
