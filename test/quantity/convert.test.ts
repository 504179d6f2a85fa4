import { expect, test } from 'vitest';
import {
	absolutePressure,
	carbonMonoxideByMass,
	carbonMonoxideByVolume,
	fromSi,
	kelvin,
	molarVolume,
	pascalAbsolute,
	pascalGauge,
	si,
	STATES,
	toSi,
} from '../../src/lib/quantity';
import { agreesWith } from '../support/printed';

test('a gauge pressure offered where an absolute one is asked for is refused by name', () => {
	expect(toSi({ value: '5', unit: 'bar(g)' }, 'pressure-absolute')).toEqual({
		ok: false,
		error: { kind: 'wrong-quantity', unit: 'bar(g)', quantity: 'pressure-absolute', isFor: ['pressure-gauge'] },
	});
});

test('a bare mbar is a difference: it is neither gauge nor absolute', () => {
	for (const quantity of ['pressure-absolute', 'pressure-gauge'] as const) {
		expect(toSi({ value: 3, unit: 'mbar' }, quantity)).toEqual({
			ok: false,
			error: { kind: 'wrong-quantity', unit: 'mbar', quantity, isFor: ['pressure-difference'] },
		});
	}
});

test('a gauge pressure becomes absolute only with a barometer', () => {
	expect(absolutePressure(pascalGauge(-8000), pascalAbsolute(98_500))).toEqual({ ok: true, value: 90_500 });
	expect(absolutePressure(pascalGauge(-101_000), pascalAbsolute(98_500))).toEqual({
		ok: false,
		error: { kind: 'below-vacuum', value: -2500, unit: 'Pa(a)' },
	});
});

test('an unknown unit is refused with the units that would do', () => {
	expect(toSi({ value: 8, unit: 'furlong' }, 'humidity-ratio')).toEqual({
		ok: false,
		error: { kind: 'unknown-unit', unit: 'furlong', quantity: 'humidity-ratio', known: ['kg/kg', 'g/kg'] },
	});
});

test('nothing is colder than absolute zero', () => {
	expect(toSi({ value: '-273.15', unit: 'degC' }, 'temperature')).toEqual({
		ok: false,
		error: { kind: 'below-absolute-zero', value: -273.15, unit: 'degC' },
	});
	expect(toSi({ value: 0, unit: 'K' }, 'temperature').ok).toBe(false);
	expect(toSi({ value: 0, unit: 'K' }, 'temperature-difference').ok).toBe(true);
});

test('a negative absolute pressure is refused', () => {
	expect(toSi({ value: -1, unit: 'mbar(a)' }, 'pressure-absolute')).toEqual({
		ok: false,
		error: { kind: 'below-vacuum', value: -1, unit: 'mbar(a)' },
	});
});

test('what is typed wrongly is refused with the part it stands in', () => {
	expect(toSi({ value: '1,234', unit: 'Pa' }, 'pressure-difference')).toMatchObject({
		ok: false,
		error: { kind: 'ambiguous-number', part: 'value' },
	});
	expect(toSi({ value: 800, unit: 'Pa', U: 'x' }, 'pressure-difference')).toMatchObject({
		ok: false,
		error: { kind: 'not-a-number', part: 'U' },
	});
	expect(toSi({ value: Number.NaN, unit: 'Pa' }, 'pressure-difference')).toMatchObject({
		ok: false,
		error: { kind: 'not-a-number', part: 'value', text: 'NaN' },
	});
	expect(toSi({ value: 800, unit: 'Pa', U: -1 }, 'pressure-difference')).toEqual({
		ok: false,
		error: { kind: 'negative-uncertainty', U: -1 },
	});
});

test('a number that overflows in the SI unit is refused', () => {
	expect(toSi({ value: 1e308, unit: 'MPa' }, 'pressure-difference')).toMatchObject({
		ok: false,
		error: { kind: 'number-too-large' },
	});
});

test('a value is shown in another unit only where that unit belongs', () => {
	expect(fromSi(293.15, 'temperature', 'degC')).toEqual({ ok: true, value: 20 });
	expect(fromSi(20, 'temperature-difference', 'degC')).toEqual({ ok: true, value: 20 });
	expect(fromSi(1, 'volume-flow', 'm3(n)/h')).toMatchObject({ ok: false, error: { kind: 'wrong-quantity' } });
});

test('a number that is not finite gets no meaning: a mistake of the program', () => {
	expect(() => si('oxygen-wet', Number.NaN)).toThrow(TypeError);
});

// Source: CODATA 2018, molar volume of an ideal gas (273.15 K, 101.325 kPa), printed cut off as 22.413 969 54... e-3 m3/mol.
test('a kilomole of gas in the normal state takes 22.413 969 5 m3', () => {
	expect(agreesWith(molarVolume(STATES.normal) * 1e3, '22.4139695')).toBe(true);
});

// Source: Directive 2004/37/EC Annex III as amended by (EU) 2022/431, printed for 20 degC and 101.3 kPa: CO 20 ppm = 23 mg/m3.
test('20 ppm of carbon monoxide at 20 degC is 23 mg/m3', () => {
	const byMass = carbonMonoxideByMass(si('carbon-monoxide-dry', 20e-6), STATES['20 degC']);
	expect(agreesWith(byMass * 1e6, '23')).toBe(true);
});

// Source: NIOSH Pocket Guide conversion factor for CO, 1 ppm = 1.15 mg/m3 at 25 degC and 1 atm (from memory, verify).
test('one ppm of carbon monoxide at 25 degC is 1.15 mg/m3, in the normal state 1.25', () => {
	const one = si('carbon-monoxide-wet', 1e-6);
	expect(agreesWith(carbonMonoxideByMass(one, STATES['25 degC']) * 1e6, '1.145')).toBe(true);
	expect(agreesWith(carbonMonoxideByMass(one, STATES.normal) * 1e6, '1.25')).toBe(true);
});

test('the way back from mass names its basis and gives the same fraction', () => {
	const hot = { temperature: kelvin(368.15), pressure: pascalAbsolute(98_500) };
	const x = si('carbon-monoxide-wet', 250e-6);
	expect(carbonMonoxideByVolume('carbon-monoxide-wet', carbonMonoxideByMass(x, hot), hot)).toBeCloseTo(250e-6, 15);
});
