import { expect, test } from 'vitest';
import { seenBy } from '../../../src/lib/calc/instruments/seen-characteristic';

// By hand: at a quarter of the span linear shows 0.25, the root 0.5, the root taken twice 0.7071.
test.each([
	[0.25, 'linear'],
	[0.5, 'root'],
	[0.7071, 'root twice'],
	[0.6, 'neither'],
])('a quarter of the span that shows %d is %s', (y, seen) => {
	expect(seenBy([{ x: 0.25, y }])).toBe(seen);
});

test('all points have to fit, and near the ends of the span nothing can be told', () => {
	expect(
		seenBy([
			{ x: 0.25, y: 0.25 },
			{ x: 0.5, y: 0.7071 },
		]),
	).toBe('neither');
	expect(
		seenBy([
			{ x: 0.01, y: 0.1 },
			{ x: 0.9, y: 0.95 },
		]),
	).toBe('cannot tell');
	expect(seenBy([])).toBe('cannot tell');
});
