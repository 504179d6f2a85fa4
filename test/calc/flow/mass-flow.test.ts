import { expect, test } from 'vitest';
import { hotDiameter, massFlow, reynoldsNumber } from '../../../src/lib/calc/flow/mass-flow';
import { agreesWith } from '../../support/printed';

// By hand: 1 x 1 x (pi/4) 0.1^2 sqrt(2 x 1000 x 1.25)/sqrt(1 - 0.5^4) = 0.00785398 x 50/0.968246 = 0.405578.
test('worked by hand: 1 kPa over a 100 mm throat in a 200 mm pipe at 1.25 kg/m3', () => {
	const flow = massFlow({ C: 1, epsilon: 1, d: 0.1, D: 0.2, dp: 1000, rho1: 1.25 });
	expect(agreesWith(flow, '0.405578')).toBe(true);
});

// By hand: 4 x 0.405578/(pi x 18e-6 x 0.2) = 143443.
test('worked by hand: its Reynolds number at 18 uPa s is 1.434e5', () => {
	expect(agreesWith(reynoldsNumber(0.405578, 18e-6, 0.2), '1.434e5')).toBe(true);
});

// By hand: 1.2e-5 x 300 K = 0.36 %, and 0.72 % in the flow, which follows the square.
test('a steel tube 300 K hotter than its drawing is 0.36 % wider and lets 0.72 % more through', () => {
	const d = hotDiameter(0.72, 1.2e-5, 593.15);
	const D = hotDiameter(1.2, 1.2e-5, 593.15);
	expect(agreesWith(d / 0.72, '1.0036')).toBe(true);
	const meter = { C: 0.985, epsilon: 0.99, dp: 800, rho1: 0.6 };
	const grown = massFlow({ ...meter, d, D }) / massFlow({ ...meter, d: 0.72, D: 1.2 });
	expect(agreesWith(grown, '1.0072')).toBe(true);
});
