import { fail, ok, type Result } from '../../base';

/** A place in a file that cannot be read as it should; `at` counts bytes from its beginning. */
export type Damage = { readonly kind: 'damaged'; readonly at: number; readonly expected: string };

/**
 * How the reader leaves a file that it does not understand, from whatever depth. It never leaves this folder: `attempt`
 * stands at every door and makes a result of it.
 */
class Damaged extends Error {
	constructor(readonly damage: Damage) {
		super(`${damage.expected} expected at byte ${damage.at}`);
	}
}

export function damaged(at: number, expected: string): never {
	throw new Damaged({ kind: 'damaged', at, expected });
}

export function attempt<T>(read: () => T): Result<T, Damage> {
	try {
		return ok(read());
	} catch (error) {
		if (error instanceof Damaged) return fail(error.damage);
		throw error;
	}
}
