import { concat, utf8 } from '../../base';

type Bytes = Uint8Array<ArrayBuffer>;

/**
 * An sRGB display profile (ICC.1:2001-04, version 2.1; from memory, verify), made from the numbers of the standard so that
 * it needs no licence: primaries and white of IEC 61966-2-1 adapted to D50, and its curve as 1024 samples.
 */
export function srgbProfile(): Bytes {
	const curve = curveTag();
	const tags: readonly (readonly [string, Bytes])[] = [
		['desc', descriptionTag('sRGB IEC61966-2.1')],
		['cprt', concat(utf8('text'), zeros(4), utf8('No copyright, use freely\0'))],
		['wtpt', xyzTag([0.9642, 1, 0.8249])],
		['rXYZ', xyzTag([0.43607, 0.22249, 0.01392])],
		['gXYZ', xyzTag([0.38515, 0.71687, 0.09708])],
		['bXYZ', xyzTag([0.14307, 0.06061, 0.7141])],
		['rTRC', curve],
		['gTRC', curve],
		['bTRC', curve],
	];
	const places = new Map<Bytes, number>();
	let end = HEADER + 4 + tags.length * 12;
	const data: Bytes[] = [];
	for (const [, bytes] of tags) {
		if (places.has(bytes)) continue;
		places.set(bytes, end);
		const whole = padded(bytes);
		data.push(whole);
		end += whole.length;
	}
	const table = tags.map(([name, bytes]) => concat(utf8(name), u32(places.get(bytes) ?? 0), u32(bytes.length)));
	return concat(header(end), u32(tags.length), ...table, ...data);
}

function header(size: number): Bytes {
	return concat(
		u32(size),
		zeros(4),
		u32(0x02100000),
		utf8('mntrRGB XYZ '),
		// The date of the standard's second edition: a profile must say one, and ours never changes.
		...[1999, 10, 18, 0, 0, 0].map(u16),
		utf8('acsp'),
		zeros(24),
		zeros(4),
		...[0.9642, 1, 0.8249].map(fixed),
		zeros(48),
	);
}

const xyzTag = (values: readonly [number, number, number]): Bytes =>
	concat(utf8('XYZ '), zeros(4), ...values.map(fixed));

function curveTag(): Bytes {
	const samples = Array.from({ length: 1024 }, (_, i) => {
		const shown = i / 1023;
		const light = shown <= 0.04045 ? shown / 12.92 : ((shown + 0.055) / 1.055) ** 2.4;
		return u16(Math.round(light * 65535));
	});
	return concat(utf8('curv'), zeros(4), u32(samples.length), ...samples);
}

const descriptionTag = (text: string): Bytes =>
	concat(utf8('desc'), zeros(4), u32(text.length + 1), utf8(`${text}\0`), zeros(8), zeros(3), zeros(67));

const zeros = (length: number): Bytes => new Uint8Array(length);
const u32 = (value: number): Bytes => Uint8Array.of(value >>> 24, value >>> 16, value >>> 8, value);
const u16 = (value: number): Bytes => Uint8Array.of(value >>> 8, value);
/** A signed number with sixteen bits after the point. */
const fixed = (value: number): Bytes => u32(Math.round(value * 65536));
const padded = (bytes: Bytes): Bytes => concat(bytes, zeros((4 - (bytes.length % 4)) % 4));

const HEADER = 128;
