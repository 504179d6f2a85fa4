import { damaged } from './damage';
import type { PdfObject, PdfValue } from './value';

/**
 * Reads objects strictly: no comments between tokens, no duplicate keys, no generation but 0. Two readers that are lenient
 * in different ways see two documents in one file; this one refuses what it would have to guess.
 *
 * @param text the file, one character per byte
 */
export function parseValue(text: string, start: number, depth = 0): PdfValue {
	if (depth > MAX_DEPTH) damaged(start, `nesting of at most ${MAX_DEPTH}`);
	const from = skipWhite(text, start);
	switch (text[from]) {
		case '/':
			return parseName(text, from);
		case '(':
			return parseLiteral(text, from);
		case '[':
			return parseArray(text, from, depth);
		case '<':
			return text[from + 1] === '<' ? parseDict(text, from, depth) : parseHex(text, from);
		default:
			return parseSimple(text, from);
	}
}

/** An object from its number to `endobj`. `lengthOf` answers for a stream whose length stands in another object. */
export function parseObject(text: string, from: number, lengthOf: (object: number) => number | undefined): PdfObject {
	const head = match(OBJECT, text, from) ?? damaged(from, 'an object');
	const number = Number(head[1]);
	const value = parseValue(text, from + head[0].length);
	const opening = match(STREAM, text, value.to);
	if (opening === undefined) {
		const end = match(END_OBJECT, text, value.to) ?? damaged(value.to, 'endobj');
		return { number, value, from, to: value.to + end[0].length };
	}
	if (value.type !== 'dict') return damaged(value.from, 'the dictionary of a stream');
	const length = value.entries.get('Length');
	const bytes = length?.type === 'ref' ? lengthOf(length.number) : length?.type === 'number' ? length.value : undefined;
	if (bytes === undefined || !Number.isSafeInteger(bytes) || bytes < 0)
		return damaged(value.from, 'the length of a stream');
	const start = value.to + opening[0].length;
	const end = match(END_STREAM, text, start + bytes) ?? damaged(start + bytes, 'endstream');
	return { number, value, stream: { from: start, to: start + bytes }, from, to: start + bytes + end[0].length };
}

export const skipWhite = (text: string, from: number): number => from + (match(WHITE, text, from)?.[0].length ?? 0);

/** The match that begins exactly here. */
export function match(pattern: RegExp, text: string, at: number): RegExpExecArray | undefined {
	pattern.lastIndex = at;
	return pattern.exec(text) ?? undefined;
}

const MAX_DEPTH = 64;

const WHITE = /[\0\t\n\f\r ]*/y;
const OBJECT = /([1-9]\d{0,9}) 0 obj(?=[\0\t\n\f\r <([/])/y;
const STREAM = /[\0\t\n\f\r ]*stream\r?\n/y;
const END_STREAM = /(?:\r\n|\n|\r)?endstream[\0\t\n\f\r ]*endobj/y;
const END_OBJECT = /[\0\t\n\f\r ]*endobj/y;
const NAME = /\/((?:[^\0\t\n\f\r ()<>[\]{}/%#]|#[0-9A-Fa-f]{2})*)/y;
const HEX = /<([0-9A-Fa-f\0\t\n\f\r ]*)>/y;
const REF = /([1-9]\d{0,9}) 0 R(?![^\0\t\n\f\r ()<>[\]{}/%])/y;
const NUMBER = /[+-]?(?:\d+\.?\d*|\.\d+)(?![^\0\t\n\f\r ()<>[\]{}/%])/y;
const WORD = /(?:true|false|null)(?![^\0\t\n\f\r ()<>[\]{}/%])/y;

function parseSimple(text: string, from: number): PdfValue {
	const ref = match(REF, text, from);
	if (ref !== undefined) return { type: 'ref', number: Number(ref[1]), from, to: from + ref[0].length };
	const number = match(NUMBER, text, from);
	if (number !== undefined) return { type: 'number', value: Number(number[0]), from, to: from + number[0].length };
	const word = match(WORD, text, from)?.[0] ?? damaged(from, 'a value');
	const to = from + word.length;
	return word === 'null' ? { type: 'null', from, to } : { type: 'boolean', value: word === 'true', from, to };
}

function parseName(text: string, from: number): PdfValue {
	const [whole, name = ''] = match(NAME, text, from) ?? damaged(from, 'a name');
	const value = name.replace(/#(..)/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)));
	return { type: 'name', value, from, to: from + whole.length };
}

function parseHex(text: string, from: number): PdfValue {
	const [whole, digits = ''] = match(HEX, text, from) ?? damaged(from, 'a hexadecimal string');
	const packed = digits.replace(/[^0-9A-Fa-f]/g, '');
	const pairs = (packed.length % 2 === 0 ? packed : `${packed}0`).match(/../g) ?? [];
	const value = pairs.map((pair) => String.fromCharCode(parseInt(pair, 16))).join('');
	return { type: 'string', value, from, to: from + whole.length };
}

function parseLiteral(text: string, from: number): PdfValue {
	let value = '';
	let open = 0;
	for (let at = from; at < text.length; at++) {
		const character = text[at] ?? '';
		if (character === '\\') {
			const [escape, meaning] = readEscape(text, at);
			value += meaning;
			at += escape.length - 1;
			continue;
		}
		if (character === '(' && open++ === 0) continue;
		if (character === ')' && --open === 0) return { type: 'string', value, from, to: at + 1 };
		value += character;
	}
	return damaged(from, 'the end of a text');
}

function readEscape(text: string, at: number): readonly [escape: string, meaning: string] {
	const [escape, octal] = match(/\\(?:([0-7]{1,3})|\r\n|[\s\S])/y, text, at) ?? damaged(at, 'an escape');
	if (octal !== undefined) return [escape, String.fromCharCode(parseInt(octal, 8) & 0xff)];
	const sign = escape.slice(1);
	return [escape, ESCAPES[sign] ?? sign];
}

const ESCAPES: { readonly [sign: string]: string } = {
	n: '\n',
	r: '\r',
	t: '\t',
	b: '\b',
	f: '\f',
	'\n': '',
	'\r': '',
	'\r\n': '',
};

function parseArray(text: string, from: number, depth: number): PdfValue {
	const items: PdfValue[] = [];
	let at = skipWhite(text, from + 1);
	while (text[at] !== ']') {
		const item = parseValue(text, at, depth + 1);
		items.push(item);
		at = skipWhite(text, item.to);
	}
	return { type: 'array', items, from, to: at + 1 };
}

function parseDict(text: string, from: number, depth: number): PdfValue {
	const entries = new Map<string, PdfValue>();
	let at = skipWhite(text, from + 2);
	while (!text.startsWith('>>', at)) {
		const key = parseValue(text, at, depth + 1);
		if (key.type !== 'name') return damaged(at, 'a key');
		if (entries.has(key.value)) return damaged(at, `no second key ${key.value}`);
		const value = parseValue(text, key.to, depth + 1);
		entries.set(key.value, value);
		at = skipWhite(text, value.to);
	}
	return { type: 'dict', entries, from, to: at + 2 };
}
