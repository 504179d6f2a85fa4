import fc from 'fast-check';
import { expect, test } from 'vitest';
import { parseNumber } from '../../src/lib/quantity';

test.each([
	['20.95', 20.95],
	['20,95', 20.95],
	[' 7.7 ', 7.7],
	['-3', -3],
	['−3,5', -3.5],
	['–0.4', -0.4],
	['+12', 12],
	['101 325', 101325],
	['101\u202f325', 101325],
	['1\u00a0013,25', 1013.25],
	['65 000.5', 65000.5],
	['1.234', 1.234],
	['0,234', 0.234],
	['1234,567', 1234.567],
	['2e5', 200000],
	['1.6E−3', 0.0016],
	['.5', 0.5],
	['5.', 5],
	['-0', 0],
	['007', 7],
])('"%s" as a technician types it is %d', (typed, value) => {
	expect(parseNumber(typed)).toEqual({ ok: true, value });
});

test.each([
	['1,234', 1, ['1.234', '1234']],
	['-12,500', 3, ['12.500', '12500']],
	['123,456', 3, ['123.456', '123456']],
	['1.234,5', 5, ['1234.5', '12345']],
	['1,234.5', 5, ['1234.5', '12345']],
	['1 234,567.8', 9, ['1234567.8', '12345678']],
])('"%s" could be two numbers and is refused at its place, with both', (text, at, readings) => {
	expect(parseNumber(text)).toEqual({ ok: false, error: { kind: 'ambiguous-number', text, at, readings } });
});

test.each([
	['7.x', 2],
	['abc', 0],
	['8 %', 2],
	['1.2.3', 3],
	['1,234,567', 5],
	['12 34', 3],
	['1234 567', 0],
	['1.234 567', 5],
	['--3', 1],
	['12 e5', 3],
	['NaN', 0],
	['Infinity', 0],
	['1e', 1],
	['e5', 0],
	['0x1F', 1],
	['.', 0],
	['- 3', 1],
])('"%s" is no number, and the character that does not fit is named', (text, at) => {
	expect(parseNumber(text)).toMatchObject({ ok: false, error: { kind: 'not-a-number', text, at } });
});

test('an empty field is said to be empty', () => {
	expect(parseNumber('  ')).toEqual({ ok: false, error: { kind: 'empty-number', text: '  ' } });
});

test('a number beyond what a computer holds is refused, not made infinite or zero', () => {
	expect(parseNumber('1e999')).toEqual({ ok: false, error: { kind: 'number-too-large', text: '1e999' } });
	expect(parseNumber('1e-999')).toEqual({ ok: false, error: { kind: 'number-too-small', text: '1e-999' } });
	expect(parseNumber('0e-999')).toEqual({ ok: true, value: 0 });
});

test('in a file with decimal commas "1,234" is no riddle, and a point is a mistake', () => {
	expect(parseNumber('1,234', { decimalMark: ',' })).toEqual({ ok: true, value: 1.234 });
	expect(parseNumber('1.234', { decimalMark: ',' })).toMatchObject({
		ok: false,
		error: { kind: 'not-a-number', at: 1 },
	});
	expect(parseNumber('20,95', { decimalMark: '.' })).toMatchObject({
		ok: false,
		error: { kind: 'not-a-number', at: 2 },
	});
});

test('every number a computer writes is read back as itself, with comma or point', () => {
	fc.assert(
		fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
			const typed = String(value);
			const plain = value === 0 ? 0 : value;
			expect(parseNumber(typed, { decimalMark: '.' })).toEqual({ ok: true, value: plain });
			expect(parseNumber(typed.replace('.', ','), { decimalMark: ',' })).toEqual({ ok: true, value: plain });
		}),
	);
});

test('whatever text arrives, the answer is a finite number or a refusal that keeps the text', () => {
	fc.assert(
		fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[-+0-9.,eE \u00a0]{0,14}$/)), (text) => {
			const read = parseNumber(text);
			expect(read.ok ? Number.isFinite(read.value) : read.error.text === text).toBe(true);
		}),
	);
});
