import type { Json } from './canonical-json';
import { fail, ok, type Result } from './result';

export type JsonError =
	| { readonly kind: 'not-json'; readonly at: number; readonly expected: string }
	| { readonly kind: 'too-deep'; readonly at: number; readonly limit: number }
	| { readonly kind: 'duplicate-name'; readonly at: number; readonly name: string }
	| { readonly kind: 'forbidden-name'; readonly at: number; readonly name: string };

/** Depth at which a nested document is refused: far above our formats, far below where structured clone fails. */
export const MAX_DEPTH = 64;

/**
 * Reads JSON text (RFC 8259) that came from outside. Unlike JSON.parse it refuses duplicate names, the names that reach
 * an object's prototype, and nesting beyond MAX_DEPTH; `at` is the offset of the character that was refused.
 */
export function parseJson(text: string): Result<Json, JsonError> {
	const found = scan(text);
	if (found !== undefined) return fail(found);
	try {
		return ok(JSON.parse(text) as Json);
	} catch (error) {
		const at = /position (\d+)/.exec(String(error))?.[1];
		return fail({ kind: 'not-json', at: at === undefined ? text.length : Number(at), expected: 'JSON' });
	}
}

/** One pass over the text for what JSON.parse accepts and we do not. It need not understand broken JSON: that comes after. */
function scan(text: string): JsonError | undefined {
	const open: { names: Set<string> | undefined; expectsName: boolean }[] = [];
	for (let i = 0; i < text.length; i++) {
		const top = open.at(-1);
		switch (text.charAt(i)) {
			case '{':
			case '[':
				if (open.length >= MAX_DEPTH) return { kind: 'too-deep', at: i, limit: MAX_DEPTH };
				open.push({ names: text[i] === '{' ? new Set() : undefined, expectsName: text[i] === '{' });
				break;
			case '}':
			case ']':
				open.pop();
				break;
			case ',':
				if (top?.names !== undefined) top.expectsName = true;
				break;
			case '"': {
				const end = endOfString(text, i);
				if (end === undefined) return { kind: 'not-json', at: i, expected: 'the end of this text' };
				if (top?.names !== undefined && top.expectsName) {
					const name = nameAt(text.slice(i, end + 1));
					if (name !== undefined && FORBIDDEN.has(name)) return { kind: 'forbidden-name', at: i, name };
					if (name !== undefined && top.names.has(name)) return { kind: 'duplicate-name', at: i, name };
					if (name !== undefined) top.names.add(name);
					top.expectsName = false;
				}
				i = end;
				break;
			}
		}
	}
	return undefined;
}

function endOfString(text: string, start: number): number | undefined {
	for (let i = start + 1; i < text.length; i++) {
		if (text[i] === '\\') i++;
		else if (text[i] === '"') return i;
	}
	return undefined;
}

function nameAt(quoted: string): string | undefined {
	try {
		return JSON.parse(quoted) as string;
	} catch {
		return undefined;
	}
}

const FORBIDDEN = new Set(['__proto__', 'constructor', 'prototype']);
