import { unreachable } from '../base';

/** Wrong tries in a row on one key, kept on the tablet. Written before the try, so that pulling the plug undoes none. */
export type Tries = {
	readonly failures: number;
	/** Latest moment known, in milliseconds: the clock does not run backwards past it. */
	readonly latest: number;
};

export const NO_TRIES: Tries = { failures: 0, latest: 0 };

export type MayTry =
	| { readonly kind: 'may-try'; readonly left: number }
	| { readonly kind: 'wait'; readonly milliseconds: number; readonly left: number }
	/** The wrapped key is to be destroyed; its owner enrols again, in person. */
	| { readonly kind: 'destroyed' };

export function mayTry(tries: Tries, now: number): MayTry {
	const left = MAX_FAILURES - tries.failures;
	if (left <= 0) return { kind: 'destroyed' };
	const delay = DELAYS[tries.failures] ?? 0;
	// A clock that was set back has not waited.
	const waited = Math.max(0, now - tries.latest);
	return waited >= delay ? { kind: 'may-try', left } : { kind: 'wait', milliseconds: delay - waited, left };
}

/** Counts the try as failed before it is made. `succeeded` takes it back. */
export function beginTry(tries: Tries, now: number): Tries {
	const allowed = mayTry(tries, now);
	switch (allowed.kind) {
		case 'may-try':
			return { failures: tries.failures + 1, latest: Math.max(tries.latest, now) };
		case 'wait':
		case 'destroyed':
			throw new Error(`a try was begun that is not allowed: ${allowed.kind}`);
		default:
			return unreachable(allowed);
	}
}

export const succeeded = (tries: Tries): Tries => ({ failures: 0, latest: tries.latest });

// NIST SP 800-63B-4, activation secrets: at most ten consecutive failures (from memory, verify). The delays are common practice.
const MAX_FAILURES = 10;
const SECOND = 1_000;
const MINUTE = 60 * SECOND;

/** Delay before the next try, by the number of failures so far: three tries are free. */
const DELAYS: { readonly [failures: number]: number } = {
	3: 30 * SECOND,
	4: MINUTE,
	5: 5 * MINUTE,
	6: 15 * MINUTE,
	7: 30 * MINUTE,
	8: 60 * MINUTE,
	9: 60 * MINUTE,
};
