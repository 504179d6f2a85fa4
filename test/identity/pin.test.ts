import fc from 'fast-check';
import { expect, test } from 'vitest';
import { checkPin } from '../../src/lib/identity';

const alone = (pin: string, known: readonly string[] = []) => checkPin(pin, { mode: 'pin only', known });

test('alone, a PIN has 8 to 12 digits or 8 to 64 characters; with a badge, 6 digits do', () => {
	expect(alone('8392017')).toEqual({ ok: false, error: { kind: 'pin-too-short', length: 7, atLeast: 8 } });
	expect(alone('83920174')).toEqual({ ok: true, value: 'acceptable' });
	expect(alone('839201746051')).toEqual({ ok: true, value: 'acceptable' });
	expect(alone('8392017460519')).toEqual({ ok: false, error: { kind: 'pin-too-long', length: 13, atMost: 12 } });
	expect(alone('x'.repeat(3) + 'kiln door'.repeat(7))).toMatchObject({ error: { kind: 'pin-too-long', atMost: 64 } });
	expect(checkPin('839201', { mode: 'badge and pin', known: [] })).toEqual({ ok: true, value: 'acceptable' });
	expect(checkPin('83920', { mode: 'badge and pin', known: [] })).toMatchObject({
		error: { kind: 'pin-too-short', atLeast: 6 },
	});
	expect(checkPin('kiln 7', { mode: 'badge and pin', known: [] })).toMatchObject({
		error: { kind: 'pin-too-short', atLeast: 8 },
	});
});

test.each([
	['77777777', 'one character'],
	['12345678', 'a run'],
	['87654321', 'a run'],
	['78901234', 'a run'],
	['13579135', 'a run'],
	['abcdefgh', 'a run'],
	['48274827', 'a repeated block'],
	['909090909', undefined],
	['90909090', 'a repeated block'],
	['11335577', 'a repeated block'],
	['14051987', 'a date'],
	['05141987', 'a date'],
	['19870514', 'a date'],
	['25802580', 'a repeated block'],
	['14725836', 'common'],
	['Passwort1', 'common'],
	['QWERTZUI', 'common'],
	['kiln-door', undefined],
])('the PIN %s is too easy because it is %s', (pin, because) => {
	const expected =
		because === undefined ? { ok: true, value: 'acceptable' } : { ok: false, error: { kind: 'pin-too-easy', because } };
	expect(alone(pin)).toEqual(expected);
});

test('a PIN that holds what everybody knows of the person is refused', () => {
	expect(alone('83920174', ['3920'])).toEqual({ ok: false, error: { kind: 'pin-too-easy', because: 'known' } });
	expect(alone('exampleAda7', ['Example'])).toMatchObject({ error: { because: 'known' } });
	expect(alone('83920174', [''])).toEqual({ ok: true, value: 'acceptable' });
});

test('every run, every repetition of a block and every date of eight digits is refused', () => {
	const digit = fc.nat(9);
	fc.assert(
		fc.property(digit, digit, (first, step) => {
			const run = Array.from({ length: 8 }, (_, i) => (first + step * i) % 10).join('');
			expect(alone(run).ok).toBe(false);
		}),
	);
	fc.assert(
		fc.property(fc.integer({ min: 0, max: 9999 }), (block) => !alone(String(block).padStart(4, '0').repeat(2)).ok),
	);
	fc.assert(
		fc.property(fc.date({ min: new Date('1900-01-01'), max: new Date('2099-12-31'), noInvalidDate: true }), (date) => {
			const [year = '', month = '', day = ''] = date.toISOString().slice(0, 10).split('-');
			for (const pin of [day + month + year, month + day + year, year + month + day]) expect(alone(pin).ok).toBe(false);
		}),
	);
});
