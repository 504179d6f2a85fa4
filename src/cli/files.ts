import { readFile } from 'node:fs/promises';
import { fail, fromUtf8, ok, parseJson, type Json, type Result } from '../lib/base';
import { sayJsonError, speaker } from '../lib/wording';

type Bytes = Uint8Array<ArrayBuffer>;

const say = speaker('en');

/** @returns why the file cannot be read, as a sentence that names it */
export async function readBytes(file: string): Promise<Result<Bytes, string>> {
	try {
		return ok(new Uint8Array(await readFile(file)));
	} catch (error) {
		const code = (error as NodeJS.ErrnoException).code ?? String(error);
		return fail(`${file} cannot be read: ${REASONS[code] ?? code}.`);
	}
}

const REASONS: { readonly [code: string]: string } = {
	ENOENT: 'there is no such file',
	EACCES: 'it may not be opened',
	EISDIR: 'it is a folder',
};

export async function readText(file: string): Promise<Result<string, string>> {
	const bytes = await readBytes(file);
	if (!bytes.ok) return bytes;
	try {
		// Editors of some systems put a mark before the text; it is no part of it.
		return ok(fromUtf8(bytes.value).replace(/^\ufeff/, ''));
	} catch {
		return fail(`${file} is no text in UTF-8.`);
	}
}

export async function readJson(file: string): Promise<Result<Json, string>> {
	const text = await readText(file);
	return text.ok ? jsonIn(text.value, file) : text;
}

export function jsonIn(text: string, file: string): Result<Json, string> {
	const json = parseJson(text);
	return json.ok ? json : fail(`${file} is no JSON: ${sayJsonError(json.error, say)}${placeOf(text, json.error.at)}.`);
}

/** " (line 12, column 3)": what an editor shows. */
function placeOf(text: string, at: number): string {
	const before = text.slice(0, at).split('\n');
	return ` (line ${before.length}, column ${(before.at(-1) ?? '').length + 1})`;
}
