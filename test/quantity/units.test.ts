import fc from 'fast-check';
import Qty from 'js-quantities';
import { describe, expect, test } from 'vitest';
import { fromSi, QUANTITIES, quantitiesIn, toSi, unitsFor, type QuantityName } from '../../src/lib/quantity';
import { agreesWith } from '../support/printed';

const names = Object.keys(QUANTITIES) as QuantityName[];

function factor(quantity: QuantityName, unit: string): number {
	const one = toSi({ value: 1, unit }, quantity);
	if (!one.ok) throw new Error(JSON.stringify(one.error));
	return one.value.value;
}

// Source: NIST SP 811 (2008), Appendix B.8, printed as "x.xxx xxx E+nn"; read in public copies of the table.
const appendixB8: [QuantityName, string, string][] = [
	['pressure-difference', 'bar', '1.0E+05'],
	['pressure-difference', 'mbar', '1.0E+02'],
	['pressure-difference', 'mmH2O', '9.80665E+00'],
	['pressure-difference', 'inH2O', '2.490889E+02'],
	['pressure-difference', 'mmHg', '1.333224E+02'],
	['pressure-difference', 'psi', '6.894757E+03'],
	['pressure-absolute', 'mmHg(a)', '1.333224E+02'],
	['pressure-gauge', 'psi(g)', '6.894757E+03'],
];
// Source: the same table, these rows from memory, verify.
const appendixB8FromMemory: [QuantityName, string, string][] = [
	['volume', 'L', '1.0E-03'],
	['mass', 't', '1.0E+03'],
	['length', 'in', '2.54E-02'],
	['time', 'min', '6.0E+01'],
	['time', 'h', '3.6E+03'],
	['time', 'd', '8.64E+04'],
	['viscosity', 'mPa s', '1.0E-03'],
	['density', 'g/cm3', '1.0E+03'],
];
test.each([...appendixB8, ...appendixB8FromMemory])(
	'a %s of one %s is %s in SI units, as NIST SP 811 prints it',
	(q, unit, printed) => {
		expect(agreesWith(factor(q, unit), printed)).toBe(true);
	},
);

// Source: NIST SP 811 (2008), B.8: T/K = t/degC + 273.15 and T/K = (t/degF + 459.67)/1.8. Fixed points: SI brochure; 212 degF = 100 degC.
test('water boils at 212 degF and a cold store stands at 250 K', () => {
	const boiling = toSi({ value: 212, unit: 'degF' }, 'temperature');
	expect(boiling.ok && boiling.value.value).toBeCloseTo(373.15, 12);
	const cold = toSi({ value: '-23,15', unit: '°C' }, 'temperature');
	expect(cold.ok && cold.value.value).toBeCloseTo(250, 12);
});

test('a margin of 18 degF is 10 K, and one of 5 degC is 5 K: a difference has no zero point', () => {
	expect(toSi({ value: 18, unit: 'degF' }, 'temperature-difference')).toEqual({ ok: true, value: { value: 10 } });
	expect(toSi({ value: 5, unit: 'degC' }, 'temperature-difference')).toEqual({ ok: true, value: { value: 5 } });
});

// Oracle: js-quantities 1.8.0. It carries psi and water columns to six digits only, hence their tolerance.
const oracle: [QuantityName, string, string, number][] = [
	['pressure-difference', 'hPa', 'hPa', 1e-14],
	['pressure-difference', 'mbar', 'mbar', 1e-14],
	['pressure-difference', 'kPa', 'kPa', 1e-14],
	['pressure-difference', 'MPa', 'MPa', 1e-14],
	['pressure-difference', 'bar', 'bar', 1e-14],
	['pressure-difference', 'psi', 'psi', 1e-6],
	['pressure-difference', 'inH2O', 'inH2O', 3e-5],
	['pressure-difference', 'mmHg', 'mmHg', 1e-6],
	['temperature', 'degC', 'tempC', 1e-14],
	['temperature', 'degF', 'tempF', 1e-14],
	['temperature-difference', 'degF', 'degF', 1e-14],
	['volume-flow', 'm3/h', 'm3/h', 1e-14],
	['volume-flow', 'm3/min', 'm3/min', 1e-14],
	['volume-flow', 'L/min', 'L/min', 1e-14],
	['mass-flow', 'kg/h', 'kg/h', 1e-14],
	['mass-flow', 't/h', 'tonne/h', 1e-14],
	['mass-concentration', 'mg/m3', 'mg/m3', 1e-14],
	['mass-concentration', 'g/m3', 'g/m3', 1e-14],
	['oxygen-wet', '%', '%', 1e-14],
	['carbon-monoxide-dry', 'ppm', 'ppm', 1e-14],
	['length', 'mm', 'mm', 1e-14],
	['length', 'in', 'in', 1e-14],
	['volume', 'L', 'L', 1e-14],
	['time', 'h', 'h', 1e-14],
	['rate', '1/min', '1/min', 1e-14],
	['rate', '1/h', '1/h', 1e-14],
	['current', 'mA', 'mA', 1e-14],
	['velocity', 'mm/s', 'mm/s', 1e-14],
	['viscosity', 'uPa s', 'uPa*s', 1e-14],
	['area', 'mm2', 'mm2', 1e-14],
];
test.each(oracle)('one %s in %s is what js-quantities makes of one %s', (quantity, unit, theirs, tolerance) => {
	// js-quantities has the gram, not the kilogram, at the bottom of some results: toBase() is SI with kg.
	const expected = Qty(1, theirs).toBase().scalar;
	expect(Math.abs(factor(quantity, unit) / expected - 1)).toBeLessThan(tolerance);
});

test('20.95 % of oxygen is exactly 0.2095', () => {
	expect(toSi({ value: '20.95', unit: '%' }, 'oxygen-wet')).toEqual({ ok: true, value: { value: 0.2095 } });
});

describe('laws', () => {
	const anyUnit = fc
		.constantFrom(...names)
		.chain((quantity) => fc.record({ quantity: fc.constant(quantity), unit: fc.constantFrom(...unitsFor(quantity)) }));

	test('what is converted and converted back is what was typed', () => {
		fc.assert(
			fc.property(anyUnit, fc.double({ min: 1, max: 1e6, noNaN: true }), ({ quantity, unit }, value) => {
				const inside = toSi({ value, unit }, quantity);
				if (!inside.ok) throw new Error(inside.error.kind);
				const back = fromSi(inside.value.value, quantity, unit);
				expect(back.ok && Math.abs(back.value / value - 1)).toBeLessThan(1e-12);
			}),
		);
	});

	test('an uncertainty is converted as a difference, never with a zero point', () => {
		fc.assert(
			fc.property(
				anyUnit,
				fc.double({ min: 1, max: 1e3, noNaN: true }),
				fc.double({ min: 0, max: 10, noNaN: true }),
				({ quantity, unit }, value, U) => {
					const at = (v: number) => {
						const read = toSi({ value: v, unit, U }, quantity);
						if (!read.ok) throw new Error(read.error.kind);
						return read.value;
					};
					const spread = (at(value + 1).value - at(value).value) * U;
					expect(Math.abs((at(value).U ?? NaN) - spread)).toBeLessThanOrEqual(1e-9 * Math.max(spread, at(value).value));
				},
			),
		);
	});

	test('the first unit of every quantity is the SI unit it is kept in', () => {
		for (const name of names) {
			expect(unitsFor(name)[0]).toBe(QUANTITIES[name]);
			expect(factor(name, QUANTITIES[name])).toBe(1);
		}
	});
});

test('absolute, gauge and difference pressures, and actual and normal volumes, share no unit', () => {
	const apart: [string, string[]][] = [
		['mbar(g)', ['pressure-gauge']],
		['bara', ['pressure-absolute']],
		['mbar', ['pressure-difference']],
		['m3/h', ['volume-flow']],
		['m3(n)/h', ['volume-flow-normal-wet', 'volume-flow-normal-dry']],
		['mg/m3', ['mass-concentration']],
		['mg/m3(n)', ['mass-concentration-normal']],
	];
	for (const [unit, quantities] of apart) expect(quantitiesIn(unit)).toEqual(quantities);
});

test('a unit is known in every honest spelling, and its letters keep their case', () => {
	expect(toSi({ value: 36, unit: 'm³ / h' }, 'volume-flow')).toEqual({ ok: true, value: { value: 0.01 } });
	expect(toSi({ value: 1, unit: 'Nm³/h' }, 'volume-flow-normal-dry').ok).toBe(true);
	expect(toSi({ value: 19, unit: 'µPa·s' }, 'viscosity').ok).toBe(true);
	expect(toSi({ value: 1, unit: 'mPa' }, 'pressure-difference')).toMatchObject({
		ok: false,
		error: { kind: 'unknown-unit' },
	});
	expect(toSi({ value: 1, unit: 'Sm3/h' }, 'volume-flow-normal-dry')).toMatchObject({
		ok: false,
		error: { kind: 'unknown-unit' },
	});
});
