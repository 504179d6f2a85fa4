import { expect, test } from 'vitest';
import { rise } from '../../../src/lib/calc/purge/rise';

const times = [0, 30, 60, 90, 120, 150, 180, 210, 240];
const samples = (C: readonly number[]) => C.map((value, i) => ({ t: times[i] ?? 0, C: value }));

// Source: scipy 1.17.1, scipy.stats.linregress(t, C); slope − t.ppf(0.975, 7) · stderr.
test.each([
	{
		what: 'creeps up and is seen to rise',
		C: [7.42, 7.45, 7.4, 7.47, 7.49, 7.46, 7.52, 7.5, 7.55],
		slope: '0.0004999999999999987',
		low: '0.00024199834230827997',
	},
	{
		what: 'only scatters',
		C: [7.5, 7.4, 7.6, 7.45, 7.5, 7.55, 7.4, 7.6, 7.5],
		slope: '0.00016666666666666606',
		low: '-0.0006354930858719772',
	},
])('oxygen that $what', ({ C, slope, low }) => {
	const found = rise(samples(C));
	expect(found!.slope / Number(slope)).toBeCloseTo(1, 9);
	expect(found!.low / Number(low)).toBeCloseTo(1, 9);
});

test('two times do not tell a rise', () => {
	expect(rise(samples([7.5, 7.6]))).toBeNull();
});
