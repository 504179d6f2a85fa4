export const utf8 = (text: string): Uint8Array<ArrayBuffer> => new TextEncoder().encode(text);

/** Refuses bytes that are not UTF-8 by throwing a TypeError; a byte order mark is kept, so that bytes survive a round trip. */
export const fromUtf8 = (bytes: Uint8Array): string =>
	new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes);

export const toHex = (bytes: Uint8Array): string =>
	Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');

/** @returns undefined when the text is not an even number of hexadecimal digits */
export function fromHex(text: string): Uint8Array<ArrayBuffer> | undefined {
	if (text.length % 2 !== 0 || !/^[0-9a-f]*$/i.test(text)) return undefined;
	return Uint8Array.from({ length: text.length / 2 }, (_, i) => parseInt(text.slice(2 * i, 2 * i + 2), 16));
}

export function toBase64(bytes: Uint8Array): string {
	let binary = '';
	for (let i = 0; i < bytes.length; i += 0x8000) binary += String.fromCharCode(...bytes.subarray(i, i + 0x8000));
	return btoa(binary);
}

/** @returns undefined when the text is not base64 (RFC 4648 section 4, with padding) */
export function fromBase64(text: string): Uint8Array<ArrayBuffer> | undefined {
	if (!/^(?:[A-Za-z0-9+/]{4})*(?:[A-Za-z0-9+/]{2}==|[A-Za-z0-9+/]{3}=)?$/.test(text)) return undefined;
	return Uint8Array.from(atob(text), (char) => char.charCodeAt(0));
}

export function concat(...parts: readonly Uint8Array[]): Uint8Array<ArrayBuffer> {
	const whole = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
	let at = 0;
	for (const part of parts) {
		whole.set(part, at);
		at += part.length;
	}
	return whole;
}

export const sameBytes = (a: Uint8Array, b: Uint8Array): boolean =>
	a.length === b.length && a.every((byte, i) => byte === b[i]);
