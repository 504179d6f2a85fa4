import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { checkFile } from '../../src/lib/app';

const demo = async (name: string) =>
	new Uint8Array(await readFile(join(import.meta.dirname, '../../static/demo', name)));

test('a damaged record that is brought to the archive fails', async () => {
	const name = 'damaged-record.ndjson';
	const { outcome } = await checkFile({ name, bytes: await demo(name), root: undefined, now: '2026-12-01T12:00:00Z' });
	expect(outcome).toBe('failed');
});

test('a file that is neither a dossier nor a record passes nothing', async () => {
	const bytes = new TextEncoder().encode('%PDF-1.7 torn off');
	const { outcome } = await checkFile({ name: 'x.pdf', bytes, root: undefined, now: '2026-12-01T12:00:00Z' });
	expect(outcome).toBe('failed');
});
