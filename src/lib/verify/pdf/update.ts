import { objectIn, type PdfFile } from './pdf-file';
import { appearanceOf, signatureFields, type SignatureField } from './signature-field';
import { differingKeys, get, itemsOf, nameOf, numberOf, sameValue, type PdfDict, type PdfObject } from './value';

/** What one update of a file did, measured against the only thing that an update may do. */
export type Update = {
	/** The field that it filled. */
	readonly field: SignatureField | undefined;
	/** Its signature dictionary. */
	readonly signature: PdfDict | undefined;
	/** Whatever it did besides, in words; empty when it is one signature and nothing else. */
	readonly trespasses: readonly string[];
};

/**
 * An update may fill one signature field that was open: a signature dictionary and an appearance, both new, and the field
 * with /V and /AP pointing to them. Everything else, however harmless it looks, makes another document of it.
 */
export function readUpdate(file: PdfFile, revision: number): Update {
	const objects = file.objects[revision] ?? new Map<number, PdfObject>();
	const before = signatureFields(file, revision - 1) ?? [];
	const now = signatureFields(file, revision) ?? [];
	const open = before.filter(({ value }) => value === undefined);
	const filled = open.filter(({ object }) => objects.has(object));
	const field = now.find(({ name, value }) => name === filled[0]?.name && value !== undefined);
	const signature = objectIn(file, field?.value, revision);
	const dict =
		signature !== undefined && objects.has(signature.number) && signature.value.type === 'dict'
			? signature.value
			: undefined;
	const trespasses = [
		...trailerTrespasses(file, revision),
		...[...objects.keys()].flatMap((number) => strayObject(file, revision, number, filled, field)),
		...(filled.length > 1 ? [`it fills ${filled.length} signature fields at once`] : []),
		...(field === undefined ? ['it fills no open signature field'] : fieldTrespasses(file, revision, filled[0], field)),
		...(field !== undefined && dict === undefined ? ['it brings no signature dictionary'] : []),
		...(dict === undefined ? [] : dictionaryTrespasses(dict, field)),
	];
	return { field, signature: dict, trespasses };
}

/** An object that is neither the field nor one of the two new ones. */
function strayObject(
	file: PdfFile,
	revision: number,
	number: number,
	filled: readonly SignatureField[],
	field: SignatureField | undefined,
): readonly string[] {
	if (filled.some(({ object }) => object === number)) return [];
	const existed = objectIn(file, number, revision - 1) !== undefined || number < sizeOf(file, revision - 1);
	if (existed) return [`it changes object ${number}, which is no open signature field`];
	const appearance = field === undefined ? undefined : appearanceOf(file, field, revision)?.number;
	const expected = number === field?.value || number === appearance;
	return expected ? [] : [`it adds object ${number}, which no signature needs`];
}

function fieldTrespasses(
	file: PdfFile,
	revision: number,
	before: SignatureField | undefined,
	now: SignatureField,
): readonly string[] {
	if (before === undefined) return [];
	const changed = differingKeys(before.dict, now.dict).filter((key) => key !== 'V' && key !== 'AP');
	const trespasses = changed.map((key) => `it changes /${key} of the field ${now.name}`);
	const [was, is] = [appearanceOf(file, before, revision - 1), appearanceOf(file, now, revision)];
	const keys = get(now.dict, 'AP')?.type === 'dict' ? [...(get(now.dict, 'AP') as PdfDict).entries.keys()].join() : '';
	if (keys !== 'N' || is === undefined || was === undefined || file.objects[revision]?.has(is.number) !== true) {
		return [...trespasses, `the field ${now.name} shows something that is not an appearance of its own`];
	}
	if (is.value.type !== 'dict' || was.value.type !== 'dict') return [...trespasses, 'the appearance is no stream'];
	const other = differingKeys(was.value, is.value).filter((key) => key !== 'Length' && key !== 'Filter');
	if (other.length > 0) trespasses.push(`the appearance of ${now.name} differs in /${other.join(', /')}`);
	if (!isInk(file, is)) trespasses.push(`the appearance of ${now.name} holds more than text and strokes`);
	return trespasses;
}

/** Lines and text in the fonts of the base revision, unpacked: no pictures, no forms, nothing marked as optional. */
function isInk(file: PdfFile, { stream, value }: PdfObject): boolean {
	if (stream === undefined || get(value, 'Filter') !== undefined) return false;
	const tokens = file.text.slice(stream.from, stream.to).split(/[\0\t\n\f\r ]+/);
	return tokens.every((token) => token === '' || OPERATORS.has(token) || OPERAND.test(token));
}

const OPERATORS = new Set(['q', 'Q', 'RG', 'rg', 'w', 'J', 'j', 'm', 'l', 'S', 'BT', 'ET', 'Tf', 'Td', 'Tj']);
const OPERAND = /^(?:-?\d+(?:\.\d+)?|\/[A-Za-z0-9]+|<[0-9A-Fa-f]*>)$/;

function dictionaryTrespasses(dict: PdfDict, field: SignatureField | undefined): readonly string[] {
	const locks = field?.dict.entries.has('Lock') === true;
	const known = [...REQUIRED, ...(locks ? ['Reference'] : []), 'Type'];
	const trespasses = [...dict.entries.keys()]
		.filter((key) => !known.includes(key))
		.map((key) => `the signature dictionary holds /${key}`);
	const missing = REQUIRED.filter((key) => !dict.entries.has(key));
	if (missing.length > 0) trespasses.push(`the signature dictionary lacks /${missing.join(', /')}`);
	const form = `${nameOf(get(dict, 'Filter')) ?? '?'}, ${nameOf(get(dict, 'SubFilter')) ?? '?'}`;
	if (form !== 'Adobe.PPKLite, ETSI.CAdES.detached') trespasses.push(`the signature is of the form ${form}`);
	if (locks && !locksAll(dict)) trespasses.push('the last signature does not lock the fields');
	return trespasses;
}

const REQUIRED = ['Filter', 'SubFilter', 'Name', 'Reason', 'M', 'ByteRange', 'Contents'];

/** ISO 32000-1, 12.8.2.4: the lock of the field is repeated in the signature, over all fields. */
function locksAll(dict: PdfDict): boolean {
	const [reference, second] = itemsOf(get(dict, 'Reference'));
	const action = nameOf(get(get(reference, 'TransformParams'), 'Action'));
	return second === undefined && nameOf(get(reference, 'TransformMethod')) === 'FieldMDP' && action === 'All';
}

/** The trailer names the same document: same root, same first half of /ID, right behind the state before. */
function trailerTrespasses(file: PdfFile, revision: number): readonly string[] {
	const [before, now] = [file.revisions[revision - 1], file.revisions[revision]];
	if (before === undefined || now === undefined) return [];
	const trespasses = ['Root', 'Info', 'Encrypt']
		.filter((key) => !sameValue(before.trailer.entries.get(key), now.trailer.entries.get(key)))
		.map((key) => `it changes /${key} of the trailer`);
	const [was, is] = [itemsOf(get(before.trailer, 'ID')), itemsOf(get(now.trailer, 'ID'))];
	if (!sameValue(was[0], is[0])) trespasses.push('it names another document in /ID');
	const unknown = [...now.trailer.entries.keys()].filter((key) => !TRAILER_KEYS.includes(key));
	if (unknown.length > 0) trespasses.push(`its trailer holds /${unknown.join(', /')}`);
	if (numberOf(get(now.trailer, 'Prev')) !== before.xrefAt) trespasses.push('its trailer leaves out a state');
	const highest = [...(file.objects[revision]?.keys() ?? [])].reduce((max, number) => Math.max(max, number), 0);
	const size = Math.max(sizeOf(file, revision - 1), highest + 1);
	if (sizeOf(file, revision) !== size)
		trespasses.push(`its trailer counts ${sizeOf(file, revision)} objects, not ${size}`);
	return trespasses;
}

const TRAILER_KEYS = ['Size', 'Root', 'Info', 'ID', 'Prev', 'Encrypt'];

const sizeOf = (file: PdfFile, revision: number): number =>
	numberOf(get(file.revisions[revision]?.trailer, 'Size')) ?? 0;
