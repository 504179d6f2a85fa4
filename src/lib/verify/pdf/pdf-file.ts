import { damaged } from './damage';
import { parseObject, parseValue, match, skipWhite } from './parse-value';
import { readRevisions, type Revision } from './revisions';
import type { PdfObject, PdfValue } from './value';

/** A file that was read to the last byte: every object of every state. */
export type PdfFile = {
	readonly bytes: Uint8Array<ArrayBuffer>;
	/** The same, one character per byte. */
	readonly text: string;
	readonly revisions: readonly Revision[];
	/** The objects that each state brought, by number, in the order of the file. */
	readonly objects: readonly ReadonlyMap<number, PdfObject>[];
};

/**
 * Reads all of a file. In every state the objects follow each other without a gap, and nothing stands between, before or
 * behind them but white space: there is no place for content that a later update could bring to light.
 */
export function readPdfFile(bytes: Uint8Array<ArrayBuffer>): PdfFile {
	const text = oneCharacterPerByte(bytes);
	const revisions = readRevisions(text);
	const objects = revisions.map((revision, i) => readObjects(text, revision, revisions.slice(0, i + 1)));
	return { bytes, text, revisions, objects };
}

/** An object as it stood in a state: the newest not newer than that. */
export function objectIn(file: PdfFile, number: number | undefined, revision: number): PdfObject | undefined {
	if (number === undefined) return undefined;
	for (let i = revision; i >= 0; i--) {
		const found = file.objects[i]?.get(number);
		if (found !== undefined) return found;
	}
	return undefined;
}

/** The value itself, or what it refers to. */
export const resolve = (file: PdfFile, value: PdfValue | undefined, revision: number): PdfValue | undefined =>
	value?.type === 'ref' ? objectIn(file, value.number, revision)?.value : value;

function readObjects(text: string, revision: Revision, known: readonly Revision[]): ReadonlyMap<number, PdfObject> {
	const places = [...revision.objectAt].sort(([, a], [, b]) => a - b);
	let at = skipHeader(text, revision.from);
	const objects = new Map<number, PdfObject>();
	for (const [number, offset] of places) {
		at = skipWhite(text, at);
		if (offset !== at) damaged(at, `object ${number}, which the cross-references put at byte ${offset}`);
		const object = parseObject(text, at, (length) => readLength(text, length, known));
		if (object.number !== number) damaged(at, `object ${number}`);
		at = object.to;
		objects.set(number, object);
	}
	at = skipWhite(text, at);
	if (at !== revision.xrefAt) damaged(at, `the cross-references, which startxref puts at byte ${revision.xrefAt}`);
	return objects;
}

/** "%PDF-1.7", and the comment of four high bytes that says the file is not text. */
function skipHeader(text: string, from: number): number {
	return from + (from === 0 ? (match(HEADER, text, 0) ?? damaged(0, 'the header of a PDF'))[0].length : 0);
}

const HEADER = /%PDF-[12]\.\d\r?\n(?:%[\x80-\xff]{4,8}\r?\n)?/y;

/** The length of a stream when it is an object of its own: a number, and nothing that could lead further. */
function readLength(text: string, number: number, known: readonly Revision[]): number | undefined {
	const at = known.findLast((revision) => revision.objectAt.has(number))?.objectAt.get(number);
	const head = at === undefined ? undefined : match(/\d+ 0 obj/y, text, at);
	if (at === undefined || head === undefined) return undefined;
	const value = parseValue(text, at + head[0].length);
	return value.type === 'number' ? value.value : undefined;
}

function oneCharacterPerByte(bytes: Uint8Array): string {
	let text = '';
	for (let i = 0; i < bytes.length; i += 0x8000) text += String.fromCharCode(...bytes.subarray(i, i + 0x8000));
	return text;
}
