import { expect, test } from 'vitest';
import { openStore } from '../../src/lib/store';
import { NOON } from '../support/kept-events';

test('a browser that forbids storage is told apart from one whose storage failed', async () => {
	expect(await openStore('tablet', { now: NOON })).toEqual({ ok: false, error: { kind: 'storage-missing' } });
});
