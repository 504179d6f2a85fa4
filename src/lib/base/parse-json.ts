import type { Json } from './canonical-json';
import { fail, ok, type Result } from './result';

/** `at` is the offset of the character that was refused. */
export type JsonError =
	| { readonly kind: 'not-json'; readonly at: number; readonly expected: string }
	| { readonly kind: 'too-deep'; readonly at: number; readonly limit: number }
	| { readonly kind: 'duplicate-name'; readonly at: number; readonly name: string }
	| { readonly kind: 'forbidden-name'; readonly at: number; readonly name: string }
	| { readonly kind: 'number-too-large'; readonly at: number; readonly number: string }
	| { readonly kind: 'lone-surrogate'; readonly at: number };

/** Depth at which a nested document is refused: far above our formats, far below where structured clone fails. */
export const MAX_DEPTH = 64;

/**
 * Reads JSON text (RFC 8259) that came from outside. Unlike JSON.parse it names the place of a fault, and it refuses
 * what has no canonical form or means two things: duplicate names, numbers beyond a double, half characters; also
 * nesting beyond MAX_DEPTH and the names that reach an object's prototype.
 */
export function parseJson(text: string): Result<Json, JsonError> {
	try {
		return ok(new Reader(text).document());
	} catch (error) {
		if (error instanceof Refusal) return fail(error.error);
		throw error;
	}
}

/** Thrown from any depth, caught at the door. */
class Refusal extends Error {
	constructor(readonly error: JsonError) {
		super(error.kind);
	}
}

class Reader {
	#at = 0;
	readonly #text: string;

	constructor(text: string) {
		this.#text = text;
	}

	document(): Json {
		const value = this.#value(0);
		if (this.#next() !== '') this.#refuse('the end of the text');
		return value;
	}

	#value(depth: number): Json {
		switch (this.#next()) {
			case '{':
				return this.#object(depth + 1);
			case '[':
				return this.#array(depth + 1);
			case '"':
				return this.#string();
			case 't':
				return this.#literal('true', true);
			case 'f':
				return this.#literal('false', false);
			case 'n':
				return this.#literal('null', null);
			default:
				return this.#number();
		}
	}

	#object(depth: number): Json {
		this.#open(depth);
		const object: Record<string, Json> = {};
		if (this.#skip('}')) return object;
		do {
			if (this.#next() !== '"') this.#refuse('a name in double quotes');
			const at = this.#at;
			const name = this.#string();
			if (FORBIDDEN.has(name)) throw new Refusal({ kind: 'forbidden-name', at, name });
			if (Object.hasOwn(object, name)) throw new Refusal({ kind: 'duplicate-name', at, name });
			if (!this.#skip(':')) this.#refuse('":"');
			object[name] = this.#value(depth);
		} while (this.#skip(','));
		if (!this.#skip('}')) this.#refuse('"," or "}"');
		return object;
	}

	#array(depth: number): Json {
		this.#open(depth);
		const array: Json[] = [];
		if (this.#skip(']')) return array;
		do array.push(this.#value(depth));
		while (this.#skip(','));
		if (!this.#skip(']')) this.#refuse('"," or "]"');
		return array;
	}

	#open(depth: number): void {
		if (depth > MAX_DEPTH) throw new Refusal({ kind: 'too-deep', at: this.#at, limit: MAX_DEPTH });
		this.#at++;
	}

	#string(): string {
		const at = this.#at;
		const end = this.#endOfString();
		const quoted = this.#text.slice(at, end);
		const string = quoted.includes('\\') ? this.#unescaped(quoted) : quoted.slice(1, -1);
		if (!string.isWellFormed()) throw new Refusal({ kind: 'lone-surrogate', at });
		this.#at = end;
		return string;
	}

	/** By hand, since a regular expression with a choice in a repetition runs out of stack on a photo of some megabytes. */
	#endOfString(): number {
		for (let i = this.#at + 1; i < this.#text.length; i++) {
			const code = this.#text.charCodeAt(i);
			if (code === QUOTE) return i + 1;
			if (code === BACKSLASH) i++;
			else if (code < SPACE) {
				this.#at = i;
				this.#refuse('an escape instead of a control character');
			}
		}
		return this.#refuse('the closing quote of this text');
	}

	#unescaped(quoted: string): string {
		try {
			return JSON.parse(quoted) as string;
		} catch {
			return this.#refuse('a text with the escapes of JSON');
		}
	}

	#number(): number {
		NUMBER.lastIndex = this.#at;
		const number = NUMBER.exec(this.#text)?.[0];
		if (number === undefined) return this.#refuse('a value');
		const value = Number(number);
		if (!Number.isFinite(value)) throw new Refusal({ kind: 'number-too-large', at: this.#at, number });
		this.#at += number.length;
		return value;
	}

	#literal<T extends Json>(word: string, value: T): T {
		if (!this.#text.startsWith(word, this.#at)) this.#refuse(word);
		this.#at += word.length;
		return value;
	}

	/** The next character that is no blank, not yet taken; empty at the end. */
	#next(): string {
		while (BLANK.includes(this.#text.charAt(this.#at)) && this.#at < this.#text.length) this.#at++;
		return this.#text.charAt(this.#at);
	}

	#skip(char: string): boolean {
		if (this.#next() !== char) return false;
		this.#at++;
		return true;
	}

	#refuse(expected: string): never {
		throw new Refusal({ kind: 'not-json', at: this.#at, expected });
	}
}

const QUOTE = 0x22;
const BACKSLASH = 0x5c;
const SPACE = 0x20;
const BLANK = ' \t\n\r';
const NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
const FORBIDDEN = new Set(['__proto__', 'constructor', 'prototype']);
