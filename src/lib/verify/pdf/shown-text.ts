import { attempt } from './damage';
import { objectIn, resolve, type PdfFile } from './pdf-file';
import { streamBytes } from './stream-bytes';
import { get, nameOf, refOf, type PdfObject, type PdfValue } from './value';

/**
 * The texts that an appearance of ours paints, as a person reads them: each hexadecimal string under `Tj`, by the font set
 * before it. Undefined when a font does not say what its glyphs mean.
 */
export function shownTexts(file: PdfFile, appearance: PdfObject, revision: number): readonly string[] | undefined {
	const { stream, value } = appearance;
	if (stream === undefined) return undefined;
	const fonts = resolve(file, get(resolve(file, get(value, 'Resources'), revision), 'Font'), revision);
	const tokens = file.text.slice(stream.from, stream.to).split(/[\0\t\n\f\r ]+/);
	const texts: string[] = [];
	let letters: Letters | undefined;
	for (const [i, token] of tokens.entries()) {
		if (token === 'Tf') letters = lettersOf(file, get(fonts, (tokens[i - 2] ?? '').slice(1)), revision);
		if (token !== 'Tj') continue;
		const text = letters === undefined ? undefined : read(tokens[i - 1] ?? '', letters);
		if (text === undefined) return undefined;
		texts.push(text);
	}
	return texts;
}

/** Hexadecimal digits of a glyph code, and the letter of each. */
type Letters = { readonly digits: number; readonly letter: (code: string) => string | undefined };

function read(hex: string, { digits, letter }: Letters): string | undefined {
	const codes = hex.slice(1, -1).toUpperCase();
	let text = '';
	for (let i = 0; i < codes.length; i += digits) {
		const found = letter(codes.slice(i, i + digits));
		if (found === undefined) return undefined;
		text += found;
	}
	return text;
}

function lettersOf(file: PdfFile, font: PdfValue | undefined, revision: number): Letters | undefined {
	const dict = resolve(file, font, revision);
	const map = objectIn(file, refOf(get(dict, 'ToUnicode')), revision);
	if (map !== undefined) return { digits: 4, letter: readMap(file, map) };
	// One of the fourteen fonts that every reader has: a code is its ASCII character.
	if (nameOf(get(dict, 'Subtype')) !== 'Type1') return undefined;
	return { digits: 2, letter: (code) => (/^[2-7]/.test(code) ? String.fromCharCode(parseInt(code, 16)) : undefined) };
}

/** The single entries of a ToUnicode map (ISO 32000-1, 9.10.3): "<0024> <0041>". */
function readMap(file: PdfFile, map: PdfObject): Letters['letter'] {
	const bytes = attempt(() => streamBytes(file, map, MAX_MAP));
	const text = bytes.ok ? new TextDecoder('latin1').decode(bytes.value) : '';
	const entries = [...text.matchAll(/^<([0-9A-Fa-f]{4})> <([0-9A-Fa-f]{4})>$/gm)];
	const letters = new Map(entries.map(([, code = '', letter = '']) => [code.toUpperCase(), letter]));
	return (code) => {
		const letter = letters.get(code);
		return letter === undefined ? undefined : String.fromCharCode(parseInt(letter, 16));
	};
}

const MAX_MAP = 1024 * 1024;
