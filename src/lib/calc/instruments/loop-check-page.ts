import type { CalculatorPage } from '../calculator';

const point = (applied: number, mA: number, direction: 'up' | 'down') => ({
	applied: { value: applied, unit: '%span' },
	current: { value: mA, unit: 'mA', U: 0.008 },
	direction,
});

export const LOOP_CHECK_PAGE: CalculatorPage = {
	area: 'instruments',
	findBy:
		'4-20 mA signal transmitter loop check calibration five points zero span hysteresis linear root square double',
	first: ['points', 'characteristic', 'allowedError'],
	results: ['largestError', 'zeroError', 'spanError', 'hysteresis'],
	formula: ['e = frac{I − 4 mA}{16 mA} − g(x)', 'g_linear = x', 'g_root = sqrt{x}'],
	explains: [
		'A known value is applied at five points upwards and five downwards, and the signal is read at each. Testing only upwards hides hysteresis; simulating the signal inside the transmitter does not test its sensor.',
		'A flow by difference pressure needs one root, in the transmitter or in the control system. Taken in both, a third of the span shows three quarters: with what the control system shows at each point, a root that was taken twice is seen here.',
		'The error is of the span, not of the reading. It is accepted where error and uncertainty together are within what is allowed.',
		'A signal below 3.8 or above 20.5 mA is a fault, not a measurement.',
	],
	cautions: [],
	example: {
		points: [
			...[point(0, 4.012, 'up'), point(25, 8.004, 'up'), point(50, 11.988, 'up'), point(75, 15.99, 'up')],
			...[point(100, 19.996, 'up'), point(75, 16.008, 'down'), point(50, 12.016, 'down'), point(25, 8.03, 'down')],
			point(0, 4.02, 'down'),
		],
		allowedError: { value: 0.5, unit: '%span' },
	},
};
