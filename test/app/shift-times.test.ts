import { expect, test } from 'vitest';
import { shiftTimes } from '../../src/lib/app';

const HOUR = 3_600_000;

test('a story moved in time keeps its hours apart, its offsets and its text', () => {
	const told = 'opened 2026-03-14T23:30:00+01:00, seen "2026-03-14T23:45:00", read 14.03.2026 23:50:10;20,99';
	expect(shiftTimes(told, HOUR)).toBe(
		'opened 2026-03-15T00:30:00+01:00, seen "2026-03-15T00:45:00", read 15.03.2026 00:50:10;20,99',
	);
});

test('a date that stands alone moves by whole days, and a name that holds one moves with it', () => {
	expect(shiftTimes('due 2026-06-30, FM-1/2026-03-14', 30 * 24 * HOUR + HOUR)).toBe('due 2026-07-30, FM-1/2026-04-13');
});
