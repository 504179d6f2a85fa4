import { fail, ok, type Result } from '../base';

/**
 * Stored events are never rewritten: an old version is lifted on reading, one step per version. Version 1 is the first;
 * a version that is not in the table is an error, never ignored.
 */
export function lift(json: unknown): Result<unknown, { readonly kind: 'unknown-version' }> {
	const version: unknown = typeof json === 'object' && json !== null ? (json as { v?: unknown }).v : undefined;
	if (typeof version !== 'number' || !Object.hasOwn(LIFTS, version)) return fail({ kind: 'unknown-version' });
	return ok(LIFTS[version as keyof typeof LIFTS](json));
}

const LIFTS = { 1: (event: unknown): unknown => event };
