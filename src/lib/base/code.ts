import { fromHex } from './bytes';

/**
 * The first `length` characters of a hash in Crockford's base32, in groups of four: to be read aloud and compared.
 * 16 characters name a statement or a record, 8 are read by voice, 6 are a head code.
 *
 * Source: Crockford, Base 32 (no I, L, O, U).
 */
export function readableCode(sha256Hex: string, length: 16 | 8 | 6): string {
	const bytes = fromHex(sha256Hex);
	if (bytes === undefined || bytes.length * 8 < length * 5) throw new TypeError(`no hash: ${sha256Hex}`);
	let bits = 0n;
	for (const byte of bytes) bits = (bits << 8n) | BigInt(byte);
	const total = BigInt(bytes.length * 8);
	let code = '';
	for (let i = 1n; i <= BigInt(length); i++) code += ALPHABET.charAt(Number((bits >> (total - 5n * i)) & 31n));
	return length === 6 ? code : (code.match(/.{4}/g) ?? []).join('-');
}

const ALPHABET = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
