import type { CalculatorPage } from '../calculator';

export const ACID_PAGE: CalculatorPage = {
	area: 'moisture',
	findBy: 'sulphuric acid dew point SO3 SO2 H2SO4 corrosion attack cold wall filter stack',
	first: ['sulphurTrioxide', 'waterVapour', 'pressure', 'wall', 'sulphurTrioxideFrom'],
	results: ['higher', 'verhoff', 'okkes', 'apart', 'waterDewPoint', 'clearance'],
	formula: [
		'frac{1000}{T_VB} = 2.276 − 0.0294 ln p_w − 0.0858 ln p_a + 0.0062 ln p_w ln p_a',
		't_Ok = 203.25 + 27.6 lg p_w + 10.83 lg p_a + 1.06 (lg p_a + 8)^2.19',
	],
	explains: [
		'Where sulphur is burnt, a little of it becomes SO3, which takes up water and condenses as acid far above the dew point of water. Metal colder than that is attacked.',
		'Two correlations are shown side by side because neither is certain; the higher one is the careful one. The first takes pressures in mmHg and the second in atmospheres: taken the other way round, either is wrong by more than a hundred degrees.',
		'How much SO2 becomes SO3, one to five percent, is hardly ever known, and dominates everything. Ash that is alkaline binds acid, and the real dew point is then lower.',
		'It is a reason to look at the metal, and no proof of anything.',
	],
	cautions: [],
	example: {
		sulphurTrioxide: { value: 10, unit: 'ppm', U: 5 },
		waterVapour: { value: 15, unit: '%', U: 1 },
		pressure: { value: 985, unit: 'hPa(a)', U: 3 },
		wall: { value: 110, unit: 'degC', U: 2 },
	},
};
