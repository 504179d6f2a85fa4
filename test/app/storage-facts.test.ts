import 'fake-indexeddb/auto';
import { expect, test } from 'vitest';
import { lookAtStorage, ThisTablet } from '../../src/lib/app';
import { isScarce } from '../../src/lib/app/storage-facts';
import { tab } from '../support/open-stores';
import { TestClock } from '../support/tablet-clock';
import { value } from '../support/test-site';

const GIGABYTE = 1_000_000_000;

test.each([
	['half of a gigabyte is used', 0.5 * GIGABYTE, GIGABYTE, false],
	['one byte more than a tenth is left', 0.9 * GIGABYTE - 1, GIGABYTE, false],
	['less than a tenth is left', 0.9 * GIGABYTE + 1, GIGABYTE, true],
	['a small browser has less left than a dossier needs', 60_000_000, 100_000_000, true],
	['the browser does not say', undefined, undefined, false],
])('room is scarce or not: %s', (_, usage, quota, scarce) => {
	expect(isScarce(usage, quota)).toBe(scarce);
});

test('a tablet whose storage was erased says since when it had kept something', async () => {
	const kept = new Map([['birth', JSON.stringify({ id: 'gone', made: '2026-03-01T08:00:00Z' })]]);
	const memory = { read: () => kept.get('birth') ?? null, write: (text: string) => void kept.set('birth', text) };
	const store = await tab('erased tablet', { memory });
	const here = await ThisTablet.on(store, new TestClock(Date.parse('2026-03-14T12:00:00Z')));
	const facts = value(await lookAtStorage(here));
	expect(facts.erased).toBe('2026-03-01T08:00:00Z');
	expect(facts.copies).toEqual([]);
});
