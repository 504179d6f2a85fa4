import { expect, test } from 'vitest';
import { fail, ok, unreachable } from '../../src/lib/base';

test('a value and an error are data that can be compared', () => {
	expect(ok(8)).toEqual({ ok: true, value: 8 });
	expect(fail({ kind: 'out-of-range' })).toEqual({ ok: false, error: { kind: 'out-of-range' } });
});

test('a case that should not exist stops the program and says what it was', () => {
	expect(() => unreachable({ type: 'step-vanished' } as never)).toThrow(
		new Error('unreachable: {"type":"step-vanished"}'),
	);
});
