import { sha256 as digest } from '@noble/hashes/sha2.js';
import { toHex, utf8 } from './bytes';

/** SHA-256 (FIPS 180-4) of bytes, or of the UTF-8 form of a text. Synchronous, so that replay and ids stay pure functions. */
export const sha256 = (data: Uint8Array | string): Uint8Array<ArrayBuffer> =>
	new Uint8Array(digest(typeof data === 'string' ? utf8(data) : data));

export const sha256Hex = (data: Uint8Array | string): string => toHex(sha256(data));
