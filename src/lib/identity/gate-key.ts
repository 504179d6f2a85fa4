import { fail, ok, type Result } from '../base';
import { exportPublicKey, makeKeyPair, type PublicKey, type SigningKey } from './keys';
import { checkPin, type PinError } from './pin';
import type { Random } from './webcrypto';
import { unwrapKey, wrapKey, type UnwrapError, type WrappedKey } from './wrap';

/** A person's gate key on one tablet: made there, kept only wrapped, opened by the PIN for one signature at a time. */
export type GateKey = { readonly publicKey: PublicKey; readonly wrapped: WrappedKey };

export type OpenGateKeyError = Exclude<UnwrapError, { readonly kind: 'wrong-secret' }> | { readonly kind: 'wrong-pin' };

export async function makeGateKey(of: {
	readonly person: string;
	readonly device: string;
	readonly pin: string;
	/** Things that everybody knows about this person: a personnel number, a telephone extension. */
	readonly known?: readonly string[];
	readonly iterations?: number;
	readonly random: Random;
}): Promise<Result<GateKey, PinError>> {
	const pin = checkPin(of.pin, { mode: 'pin only', known: of.known ?? [] });
	if (!pin.ok) return pin;
	const pair = await makeKeyPair();
	const publicKey = await exportPublicKey(pair.publicKey);
	const wrapped = await wrapKey(pair.privateKey, {
		secret: of.pin,
		of: { key: 'gate key', person: of.person, device: of.device, publicKey, unlock: 'PIN only' },
		random: of.random,
		...(of.iterations === undefined ? {} : { iterations: of.iterations }),
	});
	return ok({ publicKey, wrapped });
}

/** The PIN decrypts, it is not compared: nothing stored can tell it. How many tries are left is the caller's to keep. */
export async function openGateKey(key: GateKey, pin: string): Promise<Result<SigningKey, OpenGateKeyError>> {
	if (key.wrapped.of.publicKey !== key.publicKey) {
		return fail({ kind: 'damaged-wrap', at: 'of.publicKey', expected: 'the public key that stands beside it' });
	}
	const opened = await unwrapKey(key.wrapped, pin);
	if (opened.ok) return ok({ alg: 'ES256', publicKey: key.publicKey, privateKey: opened.value });
	return opened.error.kind === 'wrong-secret' ? fail({ kind: 'wrong-pin' }) : fail(opened.error);
}
