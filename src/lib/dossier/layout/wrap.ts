import type { Voice } from '../../drawing';
import { measure } from '../fonts/faces';

export type Setting = { readonly voice: Voice; readonly size: number };

/**
 * A text as lines no wider than a column. It breaks at spaces and at hyphens between letters, never inside a tag or a number; a word that is wider than the column, such
 * as a hash, breaks anywhere. Line ends in the text are kept; tabs and other blank control characters count as spaces.
 */
export function wrap(text: string, width: number, setting: Setting): readonly string[] {
	return text
		.normalize('NFC')
		.split(/\r\n|[\n\r\u2028\u2029]/)
		.flatMap((paragraph) => wrapParagraph(paragraph.replace(/[\t\v\f ]+/g, ' ').trim(), width, setting));
}

function wrapParagraph(text: string, width: number, { voice, size }: Setting): readonly string[] {
	const fits = (line: string): boolean => measure(line, voice, size) <= width;
	const lines: string[] = [];
	let line = '';
	for (const piece of text.match(/ |[^ ]+?[A-Za-z]-(?=[A-Za-z])|[^ ]+/g) ?? []) {
		if (fits((line + piece).trimEnd())) {
			line += piece;
			continue;
		}
		if (line.trim() !== '') lines.push(line.trimEnd());
		line = piece === ' ' ? '' : piece;
		while (line.length > 1 && !fits(line.trimEnd())) {
			const letters = Array.from(line);
			let count = letters.length - 1;
			while (count > 1 && !fits(letters.slice(0, count).join(''))) count--;
			lines.push(letters.slice(0, count).join(''));
			line = letters.slice(count).join('');
		}
	}
	return [...lines, line.trimEnd()];
}
