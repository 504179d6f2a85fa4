import * as v from 'valibot';
import { fail, fromUtf8, ok, parseJson, type Result } from '../base';

/** Bytes that are not the file they should be; `at` names the place inside. */
export type UnreadableFile = { readonly kind: 'unreadable-file'; readonly at: string; readonly expected: string };

export function readJsonFile<T>(bytes: Uint8Array, schema: v.GenericSchema<unknown, T>): Result<T, UnreadableFile> {
	let text: string;
	try {
		text = fromUtf8(bytes);
	} catch {
		return fail({ kind: 'unreadable-file', at: 'its encoding', expected: 'UTF-8' });
	}
	const json = parseJson(text);
	if (!json.ok) return fail({ kind: 'unreadable-file', at: `character ${json.error.at}`, expected: json.error.kind });
	const read = v.safeParse(schema, json.value, { abortEarly: true });
	if (read.success) return ok(read.output);
	const [issue] = read.issues;
	return fail({
		kind: 'unreadable-file',
		at: v.getDotPath(issue) ?? 'its root',
		expected: issue.expected ?? issue.message,
	});
}
