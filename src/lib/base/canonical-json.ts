import canonicalize from 'canonicalize';

export type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json };

/**
 * The one byte form of a value that is hashed and signed: RFC 8785 (JSON Canonicalization Scheme).
 * Throws a TypeError on what JSON cannot carry: undefined, NaN, infinities, functions, lone surrogates.
 * Parse what comes from outside with `parseJson` first; this is for values that we made or checked.
 */
export function canonicalJson(value: Json): string {
	refuseWhatJsonCannotCarry(value, '');
	const text = canonicalize(value);
	if (text === undefined) throw new TypeError('value has no JSON form');
	return text;
}

function refuseWhatJsonCannotCarry(value: unknown, at: string): void {
	const refuse = (why: string): never => {
		throw new TypeError(`${at === '' ? 'value' : at}: ${why} has no JSON form`);
	};
	switch (typeof value) {
		case 'string':
			if (!value.isWellFormed()) refuse('a lone surrogate');
			return;
		case 'number':
			if (!Number.isFinite(value)) refuse(String(value));
			return;
		case 'boolean':
			return;
		case 'object':
			if (value === null) return;
			if (Array.isArray(value)) {
				// Not forEach: it passes over the holes of a list.
				for (const [i, item] of value.entries()) refuseWhatJsonCannotCarry(item, `${at}[${i}]`);
			} else {
				const prototype: unknown = Object.getPrototypeOf(value);
				if (prototype !== Object.prototype && prototype !== null) refuse('an object of a class');
				for (const [key, item] of Object.entries(value)) {
					if (!key.isWellFormed()) refuse('a lone surrogate in a name');
					refuseWhatJsonCannotCarry(item, `${at}.${key}`);
				}
			}
			return;
		default:
			refuse(typeof value);
	}
}
