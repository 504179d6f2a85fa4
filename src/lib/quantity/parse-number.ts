import { fail, ok, type Result } from '../base';

export type NumberError =
	| { readonly kind: 'empty-number'; readonly text: string }
	/** `at` is the offset of the first character that does not fit. */
	| { readonly kind: 'not-a-number'; readonly text: string; readonly at: number; readonly expected: string }
	/** Could be read in more than one way: "1,234" is one and a bit, or more than a thousand. */
	| {
			readonly kind: 'ambiguous-number';
			readonly text: string;
			readonly at: number;
			readonly readings: readonly string[];
	  }
	| { readonly kind: 'number-too-large'; readonly text: string }
	| { readonly kind: 'number-too-small'; readonly text: string };

/** What is known about the writer: a file with decimal commas throughout says so once, and "1,234" is then no riddle. */
export type NumberStyle = { readonly decimalMark: ',' | '.' };

/**
 * Reads a number as a technician types it: decimal comma or point, spaces (also thin ones) between groups of three,
 * any minus sign, an exponent. What could mean two numbers is refused with its place, never guessed.
 */
export function parseNumber(text: string, style?: NumberStyle): Result<number, NumberError> {
	const start = text.length - text.trimStart().length;
	const typed = text.trim();
	if (typed === '') return fail({ kind: 'empty-number', text });
	const wrong = (at: number, expected: string) =>
		fail({ kind: 'not-a-number', text, at: start + at, expected } as const);

	const [, sign = '', mantissa = '', exponent = '', rest = ''] = FORM.exec(typed) ?? [];
	if (!/^[.,]?\d/.test(mantissa)) return wrong(sign.length, 'a digit');
	if (rest !== '') return wrong(typed.length - rest.length, 'a digit, one decimal mark, or an exponent');
	const marks = [...mantissa.matchAll(/[.,]/g)];
	const [mark, second] = marks;
	const markAt = mark === undefined ? mantissa.length : mark.index;
	if (second !== undefined) {
		if (second[0] === mark?.[0])
			return wrong(sign.length + second.index, 'one decimal mark only; write thousands with spaces');
		return ambiguous(text, start + sign.length + second.index, mantissa);
	}
	const whole = mantissa.slice(0, markAt);
	const decimals = mantissa.slice(markAt + 1);
	const odd = oddGroup(whole) ?? (SPACE.test(decimals) ? markAt + 1 + decimals.search(SPACE) : undefined);
	if (odd !== undefined)
		return wrong(sign.length + odd, 'groups of three digits between spaces, none after the decimal mark');
	if (style !== undefined && mark !== undefined && mark[0] !== style.decimalMark) {
		return wrong(sign.length + markAt, `the decimal mark of this file, "${style.decimalMark}"`);
	}
	if (style === undefined && mark?.[0] === ',' && /^[1-9]\d{0,2}$/.test(whole) && /^\d{3}$/.test(decimals)) {
		return ambiguous(text, start + sign.length + markAt, mantissa);
	}
	return finite(text, `${/[-−–]/.test(sign) ? '-' : ''}${digits(whole)}.${decimals}${exponent.replace(/[−–]/, '-')}`);
}

function finite(text: string, plain: string): Result<number, NumberError> {
	const value = Number(plain);
	if (!Number.isFinite(value)) return fail({ kind: 'number-too-large', text });
	if (value === 0 && /[1-9]/.test(plain.replace(/e.*/i, ''))) return fail({ kind: 'number-too-small', text });
	return ok(value === 0 ? 0 : value);
}

function ambiguous(text: string, at: number, mantissa: string): Result<never, NumberError> {
	const bare = digits(mantissa);
	const lastMark = Math.max(bare.lastIndexOf(','), bare.lastIndexOf('.'));
	const asDecimals = `${bare.slice(0, lastMark).replaceAll(/[.,]/g, '')}.${bare.slice(lastMark + 1)}`;
	return fail({ kind: 'ambiguous-number', text, at, readings: [asDecimals, bare.replaceAll(/[.,]/g, '')] });
}

const digits = (text: string): string => text.replaceAll(new RegExp(SPACE, 'g'), '');

/** Offset of the first group of digits that is not three long, when there are groups at all. */
function oddGroup(whole: string): number | undefined {
	const [first = '', ...rest] = whole.split(SPACE);
	if (rest.length === 0) return undefined;
	let at = first.length;
	if (first.length < 1 || first.length > 3) return 0;
	for (const group of rest) {
		if (group.length !== 3) return at + 1;
		at += group.length + 1;
	}
	return undefined;
}

const SPACE = /[ \u00a0\u2007\u2009\u202f]/;
const FORM = /^([-+−–]?)([\d.,\u0020\u00a0\u2007\u2009\u202f]*)(e[-+−–]?\d+)?(.*)$/is;
