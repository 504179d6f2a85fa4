import { damaged } from './damage';
import { match, parseValue } from './parse-value';
import { get, numberOf, type PdfDict } from './value';

/** One state of a file: the first as it was written, every further one as an update put behind it. */
export type Revision = {
	/** Bytes of this state alone: from the end of the one before to behind its own %%EOF. */
	readonly from: number;
	readonly to: number;
	readonly xrefAt: number;
	/** Where the objects lie that this state brought. */
	readonly objectAt: ReadonlyMap<number, number>;
	readonly trailer: PdfDict;
};

/** Follows the classic cross-reference tables from the last `startxref` back to the first. */
export function readRevisions(text: string): readonly Revision[] {
	if (!text.startsWith('%PDF-')) damaged(0, '%PDF-');
	const last = text.lastIndexOf('startxref');
	if (last < 0) damaged(text.length, 'startxref: the end of the file is missing');
	const found: Omit<Revision, 'from'>[] = [];
	let at: number | undefined = Number(
		match(START_XREF, text, last)?.[1] ?? damaged(last, 'the place of the cross-references'),
	);
	while (at !== undefined) {
		const section = readSection(text, at);
		const after = found[0];
		if (after !== undefined && section.to > after.xrefAt) damaged(at, 'cross-references of an earlier state');
		if (found.length >= MAX_REVISIONS) damaged(at, `at most ${MAX_REVISIONS} states`);
		found.unshift(section);
		at = previousOf(section.trailer);
	}
	return found.map((section, i) => ({ ...section, from: found[i - 1]?.to ?? 0 }));
}

function previousOf(trailer: PdfDict): number | undefined {
	const previous = trailer.entries.get('Prev');
	if (previous === undefined) return undefined;
	return numberOf(previous) ?? damaged(previous.from, 'the place of the earlier cross-references');
}

const MAX_REVISIONS = 64;

const START_XREF = /startxref\r?\n(\d{1,10})\r?\n%%EOF(?:\r\n|\n|\r)?/y;
const SUBSECTION = /(\d{1,10}) (\d{1,7})[ ]?\r?\n/y;
const ENTRY = /(\d{10}) (\d{5}) ([nf])(?: \n| \r|\r\n)/y;
const XREF = /xref\r?\n/y;
const TRAILER = /[\0\t\n\f\r ]*trailer[\0\t\n\f\r ]*/y;

function readSection(text: string, xrefAt: number): Omit<Revision, 'from'> {
	const opening = match(XREF, text, xrefAt) ?? damaged(xrefAt, 'xref');
	const objectAt = new Map<number, number>();
	let at = xrefAt + opening[0].length;
	for (let head = match(SUBSECTION, text, at); head !== undefined; head = match(SUBSECTION, text, at)) {
		at += head[0].length;
		const [first, count] = [Number(head[1]), Number(head[2])];
		for (let i = 0; i < count; i++) {
			const [entry, offset, generation, kind] = match(ENTRY, text, at) ?? damaged(at, 'a cross-reference entry');
			if (kind === 'n') {
				if (generation !== '00000') damaged(at, 'generation 0');
				if (objectAt.has(first + i)) damaged(at, `one entry for object ${first + i}`);
				objectAt.set(first + i, Number(offset));
			} else if (first + i !== 0) {
				damaged(at, `object ${first + i} in use: an update that takes an object away hides it from some readers`);
			}
			at += entry.length;
		}
	}
	const word = match(TRAILER, text, at) ?? damaged(at, 'trailer');
	const trailer = parseValue(text, at + word[0].length);
	if (trailer.type !== 'dict') return damaged(at, 'the dictionary of the trailer');
	if (get(trailer, 'XRefStm') !== undefined) damaged(trailer.from, 'no cross-reference stream beside the table');
	const end = match(END, text, trailer.to) ?? damaged(trailer.to, 'startxref and %%EOF');
	if (Number(end[1]) !== xrefAt) damaged(trailer.to, `startxref ${xrefAt}`);
	return { xrefAt, objectAt, trailer, to: trailer.to + end[0].length };
}

const END = /[\0\t\n\f\r ]*startxref\r?\n(\d{1,10})\r?\n%%EOF(?:\r\n|\n|\r)?/y;
