import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';

const HOUSE = join(import.meta.dirname, '../..');

/** Checks a component by the settings of the house, in a folder of its own that is nobody's source. */
function checked(component: string): { readonly status: number | null; readonly stdout: string } {
	mkdirSync(join(HOUSE, '.cache'), { recursive: true });
	const folder = mkdtempSync(join(HOUSE, '.cache/planted-'));
	try {
		writeFileSync(join(folder, 'Planted.svelte'), component);
		writeFileSync(join(folder, 'tsconfig.json'), '{ "extends": "../../tsconfig.json", "include": ["Planted.svelte"] }');
		return spawnSync(
			process.execPath,
			[
				join(HOUSE, 'node_modules/svelte-check/bin/svelte-check'),
				'--workspace',
				folder,
				'--tsconfig',
				join(folder, 'tsconfig.json'),
			],
			{ cwd: HOUSE, encoding: 'utf8' },
		);
	} finally {
		rmSync(folder, { recursive: true, force: true });
	}
}

const component = (limit: string): string =>
	`<script lang="ts">\n\tconst limits: readonly number[] = [8];\n\tconst limit: number = ${limit};\n</script>\n{limit + limits.length}\n`;

test('the type check passes a sound component', () => {
	expect(checked(component('limits[0] ?? 0')).status).toBe(0);
});

test('the type check finds an error planted in a component: a list may have no first entry', () => {
	const { status, stdout } = checked(component('limits[0]'));
	expect(status).toBe(1);
	expect(stdout).toContain("Type 'number | undefined' is not assignable to type 'number'");
});
