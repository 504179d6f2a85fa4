import type { Box, Shape } from '../../drawing';

const MM = 72 / 25.4;

/** A4, upright (ISO 216), in points; y grows downwards as in every drawing. */
export const PAPER = { width: 210 * MM, height: 297 * MM } as const;

/** The frame of a drawing sheet: the filing margin on the left, the others narrow. */
export const FRAME: Box = { x: 18 * MM, y: 9 * MM, width: 183 * MM, height: 279 * MM };

export const TITLE_BLOCK_HEIGHT = 64;

/** Where content stands, inside the frame and above the title block. */
export const AREA: Box = {
	x: FRAME.x + 6 * MM,
	y: FRAME.y + 6 * MM,
	width: FRAME.width - 12 * MM,
	height: FRAME.height - TITLE_BLOCK_HEIGHT - 9 * MM,
};

/** The place of a signature. */
export type FieldBox = { readonly name: string; readonly title: string; readonly box: Box };

/** A photo as it lies among the attachments, drawn small. */
export type PictureBox = {
	readonly hash: string;
	readonly bytes: Uint8Array<ArrayBuffer>;
	/** In its own pixels. */
	readonly width: number;
	readonly height: number;
	readonly colours: 'DeviceGray' | 'DeviceRGB';
	readonly box: Box;
};

export type Sheet = {
	readonly title: string;
	readonly shapes: readonly Shape[];
	readonly fields: readonly FieldBox[];
	readonly pictures: readonly PictureBox[];
};
