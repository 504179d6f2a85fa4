import { damaged } from './damage';

/** One element of DER (X.690): tag, content, and all of it. */
export type Der = {
	readonly tag: number;
	readonly at: number;
	readonly content: Uint8Array<ArrayBuffer>;
	readonly whole: Uint8Array<ArrayBuffer>;
};

export const TAG = {
	integer: 0x02,
	octets: 0x04,
	oid: 0x06,
	sequence: 0x30,
	set: 0x31,
	context0: 0xa0,
	context1: 0xa1,
} as const;

/** The element that begins here. Only the one DER form of a length is read: definite, and as short as it can be. */
export function readDer(bytes: Uint8Array<ArrayBuffer>, at = 0): Der {
	const [tag, first] = [bytes[at], bytes[at + 1]];
	if (tag === undefined || first === undefined) return damaged(at, 'an element');
	if ((tag & 0x1f) === 0x1f) return damaged(at, 'a tag of one byte');
	const digits = first < 0x80 ? 0 : first & 0x7f;
	if (first === 0x80 || digits > 4) return damaged(at + 1, 'a definite length');
	const length =
		digits === 0 ? first : bytes.subarray(at + 2, at + 2 + digits).reduce((sum, byte) => sum * 256 + byte, 0);
	if (digits > 0 && length < (digits === 1 ? 0x80 : 256 ** (digits - 1))) return damaged(at + 1, 'the shortest length');
	const from = at + 2 + digits;
	if (from + length > bytes.length) return damaged(at, `${length} bytes of content`);
	return { tag, at, content: bytes.subarray(from, from + length), whole: bytes.subarray(at, from + length) };
}

/** The elements inside one, which has this tag. */
export function children(element: Der | undefined, tag: number, what: string): readonly Der[] {
	const found = expect(element, tag, what);
	const inside: Der[] = [];
	for (let at = 0; at < found.content.length;) {
		const child = readDer(found.content, at);
		inside.push(child);
		at += child.whole.length;
	}
	return inside;
}

export function expect(element: Der | undefined, tag: number, what: string): Der {
	return element?.tag === tag ? element : damaged(element?.at ?? 0, what);
}

/** "1.2.840.113549.1.7.2" */
export function oidOf(element: Der | undefined, what: string): string {
	const { content, at } = expect(element, TAG.oid, what);
	const arcs: number[] = [];
	let arc = 0;
	for (const byte of content) {
		arc = arc * 128 + (byte & 0x7f);
		if (arc > Number.MAX_SAFE_INTEGER / 256) return damaged(at, what);
		if (byte < 0x80) {
			arcs.push(arc);
			arc = 0;
		}
	}
	const [first = 0, ...rest] = arcs;
	const root = Math.min(2, Math.floor(first / 40));
	return [root, first - root * 40, ...rest].join('.');
}
