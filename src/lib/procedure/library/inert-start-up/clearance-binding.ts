import type { Binding } from '../../binding';
import type { Step } from '../../schema';

const WALLS = [
	{ field: 'TT-225', wall: 'volumes/FH-21/walls/FH-21-cone/title' },
	{ field: 'TT-226', wall: 'volumes/SI-21/walls/SI-21-cone/title' },
	{ field: 'TT-227', wall: 'volumes/BF-21/walls/BF-21-roof/title' },
] as const;

/** The dew-point clearance of the named walls, from the readings of one step. */
export const clearance = (
	step: string,
): Pick<Extract<Step, { readonly kind: 'calculation' }>, 'kind' | 'calculator' | 'bind' | 'proves'> => {
	const field = (name: string): Binding => ({ from: 'field', step, field: name });
	return {
		kind: 'calculation',
		calculator: 'dew-point-clearance@1',
		bind: {
			surfaces: {
				from: 'list',
				of: WALLS.map(({ field: name, wall }) => ({
					from: 'group',
					of: {
						name: { from: 'plant', path: wall },
						temperature: field(name),
						age: { from: 'age', step, field: name },
					},
				})),
			},
			waterVapour: field('now'),
			predictedWaterVapour: field('predicted'),
			pressureGauge: field('PT-201'),
			barometer: { from: 'field', step: '2.8', field: 'PT-299' },
			margin: { from: 'limit', limit: 'dew-point-margin', side: 'atLeast' },
			filter: { from: 'procedure', value: 'preheated', why: 'the hold at warm-up temperature stands' },
		},
		proves: 'verdict',
	};
};
