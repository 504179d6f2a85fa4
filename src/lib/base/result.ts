/** What a person can act on: a value, or an error that is data with a `kind`. */
export type Result<T, E> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly error: E };

export const ok = <T>(value: T): { readonly ok: true; readonly value: T } => ({ ok: true, value });

export const fail = <E>(error: E): { readonly ok: false; readonly error: E } => ({ ok: false, error });

/** Ends every switch over a union: a new member does not compile until it is handled. */
export function unreachable(value: never): never {
	throw new Error(`unreachable: ${JSON.stringify(value)}`);
}
