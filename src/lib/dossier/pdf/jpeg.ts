type Bytes = Uint8Array<ArrayBuffer>;

/** What a PDF must know of a picture that it takes as it is (ISO 32000-1, 7.4.8: DCTDecode). */
export type Jpeg = { readonly width: number; readonly height: number; readonly colours: 'DeviceGray' | 'DeviceRGB' };

/**
 * Reads the frame header of a JPEG (ITU-T T.81, B.2.2). Pictures of four inks are left out: they would break the output
 * intent of the file.
 */
export function readJpeg(bytes: Bytes): Jpeg | undefined {
	if (bytes[0] !== 0xff || bytes[1] !== 0xd8) return undefined;
	const word = (at: number): number => ((bytes[at] ?? 0) << 8) | (bytes[at + 1] ?? 0);
	let at = 2;
	while (at + 9 < bytes.length && bytes[at] === 0xff) {
		const marker = bytes[at + 1] ?? 0;
		if (isFrame(marker)) {
			const [depth, components] = [bytes[at + 4], bytes[at + 9]];
			const [height, width] = [word(at + 5), word(at + 7)];
			if (depth !== 8 || width === 0 || height === 0 || (components !== 1 && components !== 3)) return undefined;
			return { width, height, colours: components === 1 ? 'DeviceGray' : 'DeviceRGB' };
		}
		at += 2 + word(at + 2);
	}
	return undefined;
}

/** Baseline, extended and progressive frames in Huffman coding: those that every reader of PDF decodes. */
const isFrame = (marker: number): boolean => marker >= 0xc0 && marker <= 0xc2;
