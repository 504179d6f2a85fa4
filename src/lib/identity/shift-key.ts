import { fail, ok, type Result } from '../base';
import { millisecondsOf, type Instant } from './instant';
import { fromJwk, type Jwk, type PublicKey } from './keys';

/**
 * What a gate key signs, as the body of a `shift key` event: for this shift, entries of the event's person on its tablet may
 * be signed with this other key. Nothing but entries: gate acts need the gate key itself.
 */
export type ShiftKey = {
	readonly publicKey: Jwk;
	readonly notBefore: Instant;
	readonly notAfter: Instant;
	readonly entriesOnly: true;
};

export type ShiftKeyError =
	| { readonly kind: 'shift-too-long'; readonly hours: number; readonly atMost: number }
	| { readonly kind: 'shift-ends-before-it-begins' }
	| { readonly kind: 'malformed-key'; readonly expected: 'a P-256 public key' };

export type OutsideShiftKey =
	| { readonly kind: 'other-person'; readonly person: string }
	| { readonly kind: 'other-device'; readonly device: string }
	| { readonly kind: 'outside-shift'; readonly notBefore: Instant; readonly notAfter: Instant };

const MAX_HOURS = 12;

/** Checked when it is made and again whenever it is relied on; the answer is the key that entries are checked with. */
export async function checkShiftKey(
	key: Omit<ShiftKey, 'publicKey'> & { readonly publicKey: unknown },
): Promise<Result<PublicKey, ShiftKeyError>> {
	const hours = (millisecondsOf(key.notAfter) - millisecondsOf(key.notBefore)) / 3_600_000;
	if (!(hours > 0)) return fail({ kind: 'shift-ends-before-it-begins' });
	if (hours > MAX_HOURS) return fail({ kind: 'shift-too-long', hours, atMost: MAX_HOURS });
	const publicKey = await fromJwk(key.publicKey);
	return publicKey === undefined ? fail({ kind: 'malformed-key', expected: 'a P-256 public key' }) : ok(publicKey);
}

type Signer = { readonly person: string; readonly device: string };

/** Whether an entry made by this person on this tablet at this time may be signed with the shift key of `owner`. */
export function coveredBy(
	key: Pick<ShiftKey, 'notBefore' | 'notAfter'>,
	owner: Signer,
	entry: Signer & { readonly entered: Instant },
): Result<'covered', OutsideShiftKey> {
	if (entry.person !== owner.person) return fail({ kind: 'other-person', person: owner.person });
	if (entry.device !== owner.device) return fail({ kind: 'other-device', device: owner.device });
	const at = millisecondsOf(entry.entered);
	const inside = at >= millisecondsOf(key.notBefore) && at <= millisecondsOf(key.notAfter);
	return inside ? ok('covered') : fail({ kind: 'outside-shift', notBefore: key.notBefore, notAfter: key.notAfter });
}
