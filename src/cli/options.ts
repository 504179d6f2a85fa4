import { parseArgs } from 'node:util';
import { fail, ok, type Result } from '../lib/base';

/** What a command takes besides files: switches ("--json") and options with a value ("--plant FILE"). */
export type Wanted = { readonly switches?: readonly string[]; readonly values?: readonly string[] };

export type Given = {
	readonly files: readonly string[];
	readonly has: (name: string) => boolean;
	readonly value: (name: string) => string | undefined;
};

/** @returns why the words are not understood, as a sentence */
export function readOptions(args: readonly string[], wanted: Wanted): Result<Given, string> {
	const options = Object.fromEntries<{ readonly type: 'boolean' | 'string' }>([
		...(wanted.switches ?? []).map((name) => [name, { type: 'boolean' }] as const),
		...(wanted.values ?? []).map((name) => [name, { type: 'string' }] as const),
	]);
	try {
		const parsed = parseArgs({ args: [...args], options, allowPositionals: true, strict: true });
		const values: { readonly [name: string]: unknown } = parsed.values;
		return ok({
			files: parsed.positionals,
			has: (name) => values[name] === true,
			value: (name) => {
				const value = values[name];
				return typeof value === 'string' ? value : undefined;
			},
		});
	} catch (error) {
		return fail(error instanceof Error ? error.message : String(error));
	}
}
