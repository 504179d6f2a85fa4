import type { Result } from '../../base';
import { attempt, damaged, type Damage } from './damage';
import { objectIn, resolve, type PdfFile } from './pdf-file';
import { streamBytes } from './stream-bytes';
import { get, itemsOf, nameOf, refOf, textOf, type PdfValue } from './value';

export type Attachment = {
	readonly name: string;
	readonly mediaType: string | undefined;
	readonly bytes: Uint8Array<ArrayBuffer>;
};

/**
 * The files that a dossier carries, out of its first state: a later update cannot put others in their place, because
 * nobody looks at what it brings.
 */
export function readAttachments(file: PdfFile): Result<readonly Attachment[], Damage> {
	return attempt(() => {
		const root = resolve(file, get(file.revisions[0]?.trailer, 'Root'), 0);
		const names = resolve(file, get(root, 'Names'), 0);
		const found = new Map<string, Attachment>();
		let room = MAX_BYTES;
		for (const specification of leaves(file, get(names, 'EmbeddedFiles'), new Set())) {
			const attachment = readFile(file, specification, room);
			if (found.has(attachment.name)) damaged(specification.from, `one attachment named ${attachment.name}`);
			found.set(attachment.name, attachment);
			room -= attachment.bytes.length;
		}
		return [...found.values()];
	});
}

/** Unpacked, all attachments together; some hundreds of photos. */
const MAX_BYTES = 256 * 1024 * 1024;
/** A tree of ours has one branch. */
const MAX_BRANCHES = 1000;

/** File specifications of a name tree (ISO 32000-1, 7.9.6), in which no branch is its own twig or that of two. */
function leaves(file: PdfFile, node: PdfValue | undefined, seen: Set<number>): readonly PdfValue[] {
	const dict = resolve(file, node, 0);
	if (dict === undefined) return [];
	if (seen.has(dict.from) || seen.size > MAX_BRANCHES) return damaged(dict.from, 'a tree');
	seen.add(dict.from);
	const pairs = itemsOf(resolve(file, get(dict, 'Names'), 0));
	const here = pairs.filter((_, i) => i % 2 === 1).map((value) => resolve(file, value, 0));
	const below = itemsOf(resolve(file, get(dict, 'Kids'), 0)).flatMap((kid) => leaves(file, kid, seen));
	return [...here.filter((value) => value !== undefined), ...below];
}

function readFile(file: PdfFile, specification: PdfValue, room: number): Attachment {
	const name = textOf(get(specification, 'UF')) ?? textOf(get(specification, 'F'));
	if (name === undefined) return damaged(specification.from, 'the name of an attachment');
	const embedded = resolve(file, get(specification, 'EF'), 0);
	const stream = objectIn(file, refOf(get(embedded, 'F') ?? get(embedded, 'UF')), 0);
	if (stream === undefined) return damaged(specification.from, `the bytes of ${name}`);
	return { name, mediaType: nameOf(get(stream.value, 'Subtype')), bytes: streamBytes(file, stream, room) };
}
