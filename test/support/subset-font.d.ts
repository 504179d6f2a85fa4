declare module 'subset-font' {
	/** A font with only the glyphs that the text needs. */
	export default function subsetFont(
		font: Uint8Array,
		text: string,
		options?: { readonly targetFormat?: 'woff2' | 'truetype' },
	): Promise<Uint8Array>;
}
