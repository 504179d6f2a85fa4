import type { Result } from '../../base';

/**
 * How to write with a font that the base revision embeds. The glyphs were chosen when the dossier was written: what the
 * font lacks is refused by name, never dropped.
 */
export type Ink = {
	/** Its name under /Font in the resources of every signature field's appearance. */
	readonly resource: string;
	/** The text as the hexadecimal glyph codes of a PDF string, and its width in thousandths of the font size. */
	readonly encode: (
		text: string,
	) => Result<{ readonly hex: string; readonly width: number }, { readonly codePoint: string }>;
};

export type Inks = { readonly regular: Ink; readonly strong: Ink };

export type NoGlyph = { readonly kind: 'no-glyph'; readonly codePoint: string; readonly text: string };
