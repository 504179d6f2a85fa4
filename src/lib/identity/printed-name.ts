import { fail, ok, type Result } from '../base';

export type NameError =
	| { readonly kind: 'empty-name' }
	| { readonly kind: 'name-too-long'; readonly length: number; readonly atMost: number }
	| { readonly kind: 'forbidden-character'; readonly codePoint: string; readonly at: number }
	| { readonly kind: 'mixed-scripts'; readonly scripts: readonly string[] };

// X.520: upper bound of a common name.
const MAX_LENGTH = 64;

/**
 * The name of a person as it is printed beside a signature: normalised (NFC), of one script, and without characters that
 * hide, reorder or imitate others (Unicode TR 39, sections 4 and 5).
 */
export function printedName(typed: string): Result<string, NameError> {
	const name = typed.normalize('NFC').replace(/ +/g, ' ').trim();
	if (name === '') return fail({ kind: 'empty-name' });
	if (name.length > MAX_LENGTH) return fail({ kind: 'name-too-long', length: name.length, atMost: MAX_LENGTH });
	const at = name.search(/[^\p{L}\p{M}\p{Nd} .,'’()-]/u);
	if (at >= 0) return fail({ kind: 'forbidden-character', codePoint: codePoint(name, at), at });
	const hidden = name.search(/\p{Default_Ignorable_Code_Point}/u);
	if (hidden >= 0) return fail({ kind: 'forbidden-character', codePoint: codePoint(name, hidden), at: hidden });
	const scripts = SCRIPTS.filter(({ letters }) => letters.test(name)).map(({ script }) => script);
	if (scripts.length > 1 && !scripts.every((script) => JAPANESE.includes(script)))
		return fail({ kind: 'mixed-scripts', scripts });
	return ok(name);
}

const codePoint = (text: string, at: number): string =>
	`U+${(text.codePointAt(at) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`;

/** Letters of other scripts stand under "other": two of those in one name cannot be told apart here, and are not refused. */
const SCRIPTS = [
	{ script: 'Latin', letters: /\p{Script=Latin}/u },
	{ script: 'Greek', letters: /\p{Script=Greek}/u },
	{ script: 'Cyrillic', letters: /\p{Script=Cyrillic}/u },
	{ script: 'Han', letters: /\p{Script=Han}/u },
	{ script: 'Hiragana', letters: /\p{Script=Hiragana}/u },
	{ script: 'Katakana', letters: /\p{Script=Katakana}/u },
	{
		script: 'other',
		letters:
			/[^\P{L}\p{Script=Latin}\p{Script=Greek}\p{Script=Cyrillic}\p{Script=Han}\p{Script=Hiragana}\p{Script=Katakana}]/u,
	},
];

const JAPANESE = ['Han', 'Hiragana', 'Katakana'];
