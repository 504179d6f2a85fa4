import { Unzlib } from 'fflate';
import { concat } from '../../base';
import { damaged } from './damage';
import type { PdfFile } from './pdf-file';
import { get, nameOf, type PdfObject } from './value';

type Bytes = Uint8Array<ArrayBuffer>;

/** What a stream holds, unpacked if it is packed: at most `room` bytes, because a small file can hold a very large one. */
export function streamBytes(file: PdfFile, { value, stream }: PdfObject, room: number): Bytes {
	if (stream === undefined) return damaged(value.from, 'a stream');
	const packed = file.bytes.slice(stream.from, stream.to);
	const filter = get(value, 'Filter');
	const filters = filter?.type === 'array' ? filter.items.map(nameOf) : filter === undefined ? [] : [nameOf(filter)];
	if (filters.length > 0 && filters.join() !== 'FlateDecode') damaged(value.from, 'FlateDecode and no other filter');
	const bytes = filters.length === 0 ? packed : inflate(packed, stream.from, room);
	return bytes.length > room ? damaged(stream.from, `at most ${room} bytes`) : bytes;
}

/** Counts while it unpacks, and stops. */
function inflate(packed: Bytes, at: number, room: number): Bytes {
	const parts: Uint8Array[] = [];
	let length = 0;
	const unpacking = new Unzlib((part) => {
		length += part.length;
		if (length > room) damaged(at, `at most ${room} bytes`);
		parts.push(part.slice());
	});
	try {
		for (let i = 0; i < packed.length; i += CHUNK) {
			unpacking.push(packed.subarray(i, i + CHUNK), i + CHUNK >= packed.length);
		}
	} catch (error) {
		// The library says what is wrong with packed bytes by errors that have a code.
		if (error instanceof Error && 'code' in error) return damaged(at, `packed bytes (${error.message})`);
		throw error;
	}
	return concat(...parts);
}

const CHUNK = 64 * 1024;
