import { expect, test } from 'vitest';
import { permanentLoss } from '../../../src/lib/calc/flow/permanent-loss';
import { agreesWith } from '../../support/printed';

// Source: documentation of fluids, example of dP_venturi_tube, printed 1788.5717754177406.
test('the printed example: 17 kPa over a 50 mm throat in a 73.66 mm pipe costs 1788.57 Pa', () => {
	expect(agreesWith(permanentLoss(17_000, 0.05 / 0.07366, 0.07366) ?? NaN, '1788.5717754')).toBe(true);
});

// Independent: fluids 1.0.22, measured at beta 0.6.
test.each([
	[0.065, '12.43'],
	[0.2, '10.45'],
	[0.5, '6.06'],
	[1.2, '6.06'],
])('at beta 0.6 and D %d m it is %s %% of the difference pressure', (D, printed) => {
	expect(agreesWith(permanentLoss(100, 0.6, D) ?? NaN, printed)).toBe(true);
});

test('outside the chart there is no value: pipes below 65 mm, beta outside 0.30 to 0.75', () => {
	expect(permanentLoss(100, 0.5, 0.05)).toBeUndefined();
	expect(permanentLoss(100, 0.25, 0.5)).toBeUndefined();
	expect(permanentLoss(100, 0.78, 1)).toBeUndefined();
	expect(permanentLoss(100, Number.NaN, 1)).toBeUndefined();
});
