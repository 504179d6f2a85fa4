import { expect, test } from 'vitest';
import { lastTimeAt } from '../../src/lib/record';

const now = Date.parse('2026-03-15T02:30:00+01:00');

test('a time that the clock has shown today is today', () => {
	expect(lastTimeAt('02:11', now, 60)).toBe(Date.parse('2026-03-15T02:11:00+01:00'));
});

test('a time that lies ahead on the clock was yesterday, across midnight', () => {
	expect(lastTimeAt('23:50', now, 60)).toBe(Date.parse('2026-03-14T23:50:00+01:00'));
});

test('what is no time of the clock is none', () => {
	expect(lastTimeAt('', now, 60)).toBeUndefined();
});
