declare module 'subset-font' {
	/** A font with only the glyphs that the text needs. */
	export default function subsetFont(
		font: Uint8Array,
		text: string,
		options?: {
			readonly targetFormat?: 'woff2' | 'truetype';
			/** OpenType features that stay: `kern`. */
			readonly keepFeatures?: readonly string[];
			readonly noHinting?: boolean;
			readonly dropTables?: readonly string[];
		},
	): Promise<Uint8Array>;
}
