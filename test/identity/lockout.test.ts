import fc from 'fast-check';
import { expect, test } from 'vitest';
import { beginTry, mayTry, NO_TRIES, succeeded, type Tries } from '../../src/lib/identity';

const MINUTE = 60_000;

/** Wrong tries, each as early as it is allowed. */
function fail(times: number): Tries {
	let tries = NO_TRIES;
	let now = 1_000_000;
	for (let i = 0; i < times; i++) {
		const allowed = mayTry(tries, now);
		if (allowed.kind === 'wait') now += allowed.milliseconds;
		tries = beginTry(tries, now);
	}
	return tries;
}

test('three wrong PINs cost nothing, then each costs more time, and the tenth costs the key', () => {
	const waits = Array.from({ length: 11 }, (_, failures) => {
		const tries = fail(failures);
		const allowed = mayTry(tries, tries.latest);
		return allowed.kind === 'wait' ? allowed.milliseconds : allowed.kind;
	});
	const free = 'may-try';
	const delays = [MINUTE / 2, MINUTE, 5 * MINUTE, 15 * MINUTE, 30 * MINUTE, 60 * MINUTE, 60 * MINUTE];
	expect(waits).toEqual([free, free, free, ...delays, 'destroyed']);
});

test('the person is told how many tries are left', () => {
	expect(mayTry(NO_TRIES, 0)).toEqual({ kind: 'may-try', left: 10 });
	expect(mayTry(fail(6), 0)).toMatchObject({ kind: 'wait', left: 4 });
});

test('a right PIN forgets the wrong ones, but not what time it was', () => {
	const tries = succeeded(fail(6));
	expect(tries.failures).toBe(0);
	expect(tries.latest).toBe(fail(6).latest);
});

test('a clock that is set back shortens no wait, and none makes an eleventh try', () => {
	fc.assert(
		fc.property(
			fc.integer({ min: 3, max: 9 }),
			fc.integer({ min: 1, max: 10 * 365 * 24 * 60 * MINUTE }),
			(failures, back) => {
				const tries = fail(failures);
				const honest = mayTry(tries, tries.latest);
				expect(mayTry(tries, tries.latest - back)).toEqual(honest);
			},
		),
	);
	fc.assert(fc.property(fc.integer(), (now) => mayTry(fail(10), now).kind === 'destroyed'));
});

test('a try that was not allowed is a mistake of the program', () => {
	expect(() => beginTry(fail(3), fail(3).latest)).toThrow('wait');
	expect(() => beginTry(fail(10), Number.MAX_SAFE_INTEGER)).toThrow('destroyed');
});
