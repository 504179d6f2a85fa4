import { expect, test } from 'vitest';
import { print } from '../../src/lib/quantity';

test.each([
	[7.65, '%', 1, '7.7\u00a0%'],
	[64944.07, 'm3/h', 0, '64\u00a0944\u00a0m³/h'],
	[1234567.891, 'Pa(a)', 2, '1\u00a0234\u00a0567.89\u00a0Pa(a)'],
	[1013.25, 'hPa(a)', 2, '1013.25\u00a0hPa(a)'],
	[-3.04, 'mbar(g)', 1, '\u22123.0\u00a0mbar(g)'],
	[-0.04, 'mbar(g)', 1, '0.0\u00a0mbar(g)'],
	[59.7, 'degC', 1, '59.7\u00a0°C'],
	[0.985, '1', 3, '0.985'],
	[80, 'mmH2O', 0, '80\u00a0mmH₂O'],
])('%d %s with %d decimals reads "%s"', (value, unit, decimals, text) => {
	expect(print(value, unit, decimals)).toBe(text);
});

test('with a decimal comma for those who write so', () => {
	expect(print(20.95, '%', 2, ',')).toBe('20,95\u00a0%');
});

test('what is no number is not printed', () => {
	expect(() => print(Number.POSITIVE_INFINITY, 'Pa', 0)).toThrow(TypeError);
});
