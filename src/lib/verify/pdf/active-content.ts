import type { PdfFile } from './pdf-file';
import { get, nameOf, type PdfValue } from './value';

/** Where a file can do more than be looked at: programs, other files, encryption, objects packed out of sight. */
export function findActiveContent(file: PdfFile): readonly { readonly object: number; readonly what: string }[] {
	const inObjects = file.objects.flatMap((objects) =>
		[...objects.values()].flatMap(({ number, value }) => activeNames(value).map((what) => ({ object: number, what }))),
	);
	const encrypted = file.revisions.some(({ trailer }) => trailer.entries.has('Encrypt'));
	return encrypted ? [...inObjects, { object: 0, what: 'Encrypt' }] : inObjects;
}

function activeNames(value: PdfValue): readonly string[] {
	if (value.type === 'array') return value.items.flatMap(activeNames);
	if (value.type !== 'dict') return [];
	const keys = [...value.entries.keys()].filter((key) => KEYS.has(key));
	const kinds = [nameOf(get(value, 'S')), nameOf(get(value, 'Type')), nameOf(get(value, 'Subtype'))];
	const named = kinds.filter((kind) => kind !== undefined && KINDS.has(kind)) as readonly string[];
	return [...keys, ...named, ...[...value.entries.values()].flatMap(activeNames)];
}

// ISO 19005-3, 6.6.1 and 6.1.3: what an archive file may not hold. Packed objects our strict reader does not open.
const KEYS = new Set(['JS', 'AA', 'XFA', 'RichMediaContent']);
const KINDS = new Set([
	'JavaScript',
	'Launch',
	'ImportData',
	'SubmitForm',
	'ResetForm',
	'GoToR',
	'GoToE',
	'Rendition',
	'RichMedia',
	'Movie',
	'ObjStm',
	'XRef',
]);
