// x509 reads metadata that must exist before it loads.
import 'reflect-metadata/lite';
import { Name } from '@peculiar/x509';
import { toHex } from '../base';
import type { Random } from './webcrypto';

export * as x509 from '@peculiar/x509';

/** One attribute after the other, as UTF-8 text: values are never parsed out of a string, so no comma needs escaping. */
export const distinguishedName = (attributes: readonly (readonly [oid: string, value: string])[]): Name =>
	new Name(attributes.map(([oid, value]) => ({ [oid]: [{ utf8String: value }] })));

/** 16 random bytes, positive and of full length (RFC 5280, section 4.1.2.2). */
export function serialFrom(random: Random): string {
	const [first = 0, ...rest] = random(16);
	return toHex(Uint8Array.of((first & 0x3f) | 0x40, ...rest));
}
