import { fail, fromBase64, ok, toBase64, utf8, type Result } from '../base';
import { subtle, type Random } from './webcrypto';

/**
 * A few digits with which a person goes on entering after the screen was covered. They keep a colleague out of another's
 * name, no more: the key of a shift lies on the tablet as it is, signs entries only, and ends with the shift. Kept stretched,
 * so that nobody reads them off.
 */
export type ResumeCode = { readonly iterations: number; readonly salt: string; readonly check: string };

export type ResumeCodeError =
	| { readonly kind: 'resume-code-length'; readonly atLeast: number; readonly atMost: number }
	| { readonly kind: 'resume-code-easy' }
	/** Whoever saw it typed would know a part of the PIN. */
	| { readonly kind: 'resume-code-in-pin' };

export async function makeResumeCode(
	code: string,
	beside: { readonly pin: string; readonly random: Random },
): Promise<Result<ResumeCode, ResumeCodeError>> {
	if (!/^\d{4,8}$/.test(code)) return fail({ kind: 'resume-code-length', atLeast: 4, atMost: 8 });
	if (/^(\d)\1*$/.test(code) || '01234567890'.includes(code) || '09876543210'.includes(code))
		return fail({ kind: 'resume-code-easy' });
	if (beside.pin.includes(code)) return fail({ kind: 'resume-code-in-pin' });
	const salt = beside.random(16);
	const check = await stretched(code, salt, ITERATIONS);
	return ok({ iterations: ITERATIONS, salt: toBase64(salt), check });
}

export async function isResumeCode({ iterations, salt, check }: ResumeCode, code: string): Promise<boolean> {
	const bytes = fromBase64(salt);
	return bytes !== undefined && (await stretched(code, bytes, iterations)) === check;
}

async function stretched(code: string, salt: Uint8Array<ArrayBuffer>, iterations: number): Promise<string> {
	const typed = await subtle.importKey('raw', utf8(code), 'PBKDF2', false, ['deriveBits']);
	const bits = await subtle.deriveBits({ name: 'PBKDF2', hash: 'SHA-256', salt, iterations }, typed, 256);
	return toBase64(new Uint8Array(bits));
}

/** Ten thousand codes are tried in no time whatever stands here; the tablet takes three wrong ones and then wants the PIN. */
const ITERATIONS = 100_000;
