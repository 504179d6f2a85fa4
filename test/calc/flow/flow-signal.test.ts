import { expect, test } from 'vitest';
import { characteristicSeen, differencePressureOf } from '../../../src/lib/calc/flow/flow-signal';
import { agreesWith } from '../../support/printed';

// By hand: dp/span = (I - 4)/16 for a linear transmitter, and the flow is its root.
test.each([
	[4, '0', '0'],
	[4.16, '1', '10'],
	[4.64, '4', '20'],
	[5, '6.25', '25'],
	[6, '12.5', '35.3553'],
	[8, '25', '50'],
	[12, '50', '70.7107'],
	[16, '75', '86.6025'],
	[20, '100', '100'],
	[20.4, '102.5', '101.2423'],
])('%d mA is %s %% of difference pressure and %s %% of flow', (mA, dp, flow) => {
	const part = differencePressureOf(mA * 1e-3, 1, 'linear');
	expect(agreesWith(part * 100, dp)).toBe(true);
	expect(agreesWith(Math.sqrt(part) * 100, flow)).toBe(true);
});

test('a root-extracting transmitter at 12 mA stands at half the flow, a quarter of the difference pressure', () => {
	expect(differencePressureOf(12e-3, 1000, 'root')).toBeCloseTo(250, 9);
});

test('below 4 mA the difference pressure is negative with either setting: a root does not hide it', () => {
	expect(differencePressureOf(3.9e-3, 1000, 'linear')).toBeLessThan(0);
	expect(differencePressureOf(3.9e-3, 1000, 'root')).toBeLessThan(0);
});

// By hand: at a quarter of the span the linear signal is 8 mA, the root 12 mA, the root of the root 15.31 mA.
test.each([
	[8, 'linear'],
	[12, 'root'],
	[15.31, 'root twice'],
	[18, 'neither'],
])('%d mA while a gauge shows a quarter of the span: %s', (mA, seen) => {
	expect(characteristicSeen(mA * 1e-3, 1000, 250)).toBe(seen);
});

test('near zero and near the end of the span nothing can be told', () => {
	expect(characteristicSeen(4.1e-3, 1000, 10)).toBe('cannot tell');
	expect(characteristicSeen(19.9e-3, 1000, 990)).toBe('cannot tell');
});
