import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll } from 'vitest';

/** A folder for the files of one test file, gone when it is done. */
export function aFolder(): {
	readonly path: string;
	readonly put: (name: string, content: string | Uint8Array) => string;
} {
	const path = mkdtempSync(join(tmpdir(), 'gatehold-'));
	afterAll(() => rmSync(path, { recursive: true }));
	return {
		path,
		put: (name, content) => {
			writeFileSync(join(path, name), content);
			return join(path, name);
		},
	};
}
