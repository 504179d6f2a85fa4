import { fail, ok, type Result } from '../../base';
import type { NoGlyph } from '../sign/ink';

/** A font as `npm run fonts` measured it: ready to be embedded, every width and pair of letters in thousandths of the size. */
export type FaceData = {
	readonly name: string;
	readonly ascent: number;
	readonly descent: number;
	readonly capHeight: number;
	readonly box: readonly number[];
	readonly stem: number;
	/** Length of the font once inflated. */
	readonly bytes: number;
	/** "code glyph width", in base 36, with commas between. */
	readonly glyphs: string;
	/** "AV-38": two letters and what is added between them. */
	readonly kerning: string;
	/** The TrueType file, deflated, as base64. */
	readonly deflated: string;
};

export type Glyph = { readonly id: number; readonly width: number };

/** Glyphs of a text in order, each with what is added after it, and the width of the whole in thousandths of the size. */
export type SetText = {
	readonly glyphs: readonly { readonly id: number; readonly after: number }[];
	readonly width: number;
};

export class Face {
	readonly data: FaceData;
	readonly #glyphs: ReadonlyMap<number, Glyph>;
	readonly #kerning: ReadonlyMap<string, number>;

	constructor(data: FaceData) {
		this.data = data;
		this.#glyphs = new Map(
			data.glyphs.split(',').map((entry) => {
				const [code = 0, id = 0, width = 0] = entry.split(' ').map((part) => parseInt(part, 36));
				return [code, { id, width }];
			}),
		);
		this.#kerning = new Map(
			data.kerning.split(' ').map((pair) => {
				const letters = Array.from(pair).slice(0, 2).join('');
				return [letters, Number(pair.slice(letters.length))];
			}),
		);
	}

	/** Every letter that it has, by code point. */
	get letters(): ReadonlyMap<number, Glyph> {
		return this.#glyphs;
	}

	/** @param tracking added after every letter, in thousandths of the size */
	set(text: string, tracking = 0): Result<SetText, NoGlyph> {
		const letters = Array.from(text);
		const glyphs: { id: number; after: number }[] = [];
		let width = 0;
		for (const [i, letter] of letters.entries()) {
			const glyph = this.#glyphs.get(letter.codePointAt(0) ?? 0);
			if (glyph === undefined) return fail({ kind: 'no-glyph', codePoint: codePointOf(letter), text });
			const after = tracking + (this.#kerning.get(letter + (letters[i + 1] ?? '')) ?? 0);
			glyphs.push({ id: glyph.id, after });
			width += glyph.width + after;
		}
		return ok({ glyphs, width });
	}

	/** Width in thousandths of the size. A letter that is missing is as wide as an n here, and refused when it is written. */
	measure(text: string, tracking = 0): number {
		const letters = Array.from(text);
		const usual = this.#glyphs.get(0x6e)?.width ?? 500;
		return letters.reduce((width, letter, i) => {
			const glyph = this.#glyphs.get(letter.codePointAt(0) ?? 0);
			return width + (glyph?.width ?? usual) + tracking + (this.#kerning.get(letter + (letters[i + 1] ?? '')) ?? 0);
		}, 0);
	}
}

const codePointOf = (letter: string): string =>
	`U+${(letter.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`;
