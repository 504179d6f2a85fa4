/** An object of PDF (ISO 32000-1, 7.3) with the bytes it was read from: `from` inclusive, `to` exclusive. */
export type PdfValue = { readonly from: number; readonly to: number } & (
	| { readonly type: 'null' }
	| { readonly type: 'boolean'; readonly value: boolean }
	| { readonly type: 'number'; readonly value: number }
	| { readonly type: 'name'; readonly value: string }
	/** One character per byte. */
	| { readonly type: 'string'; readonly value: string }
	| { readonly type: 'array'; readonly items: readonly PdfValue[] }
	| { readonly type: 'dict'; readonly entries: ReadonlyMap<string, PdfValue> }
	| { readonly type: 'ref'; readonly number: number }
);

export type PdfDict = Extract<PdfValue, { type: 'dict' }>;

/** An indirect object; `stream` is where the bytes of its stream lie. */
export type PdfObject = {
	readonly number: number;
	readonly value: PdfValue;
	readonly stream?: { readonly from: number; readonly to: number };
	readonly from: number;
	readonly to: number;
};

export const get = (value: PdfValue | undefined, key: string): PdfValue | undefined =>
	value?.type === 'dict' ? value.entries.get(key) : undefined;

export const nameOf = (value: PdfValue | undefined): string | undefined =>
	value?.type === 'name' ? value.value : undefined;

export const numberOf = (value: PdfValue | undefined): number | undefined =>
	value?.type === 'number' ? value.value : undefined;

export const itemsOf = (value: PdfValue | undefined): readonly PdfValue[] =>
	value?.type === 'array' ? value.items : [];

export const refOf = (value: PdfValue | undefined): number | undefined =>
	value?.type === 'ref' ? value.number : undefined;

/** Same meaning, wherever it was written. */
export function sameValue(a: PdfValue | undefined, b: PdfValue | undefined): boolean {
	if (a === undefined || b === undefined) return a === b;
	if (a.type === 'null') return b.type === 'null';
	if (a.type === 'ref') return b.type === 'ref' && a.number === b.number;
	if (a.type === 'array') {
		return (
			b.type === 'array' && a.items.length === b.items.length && a.items.every((item, i) => sameValue(item, b.items[i]))
		);
	}
	if (a.type === 'dict') return b.type === 'dict' && differingKeys(a, b).length === 0;
	return a.type === b.type && a.value === b.value;
}

/** Keys that stand in one dictionary only, or with another value. */
export const differingKeys = (a: PdfDict, b: PdfDict): readonly string[] =>
	[...new Set([...a.entries.keys(), ...b.entries.keys()])].filter(
		(key) => !sameValue(a.entries.get(key), b.entries.get(key)),
	);

/** A text string (ISO 32000-1, 7.9.2.2): UTF-16BE behind a byte order mark, or one byte per character. */
export function textOf(value: PdfValue | undefined): string | undefined {
	if (value?.type !== 'string') return undefined;
	if (!value.value.startsWith('\xfe\xff')) return /^[\x20-\x7e]*$/.test(value.value) ? value.value : undefined;
	const units = value.value.slice(2);
	if (units.length % 2 !== 0) return undefined;
	let text = '';
	for (let i = 0; i < units.length; i += 2) {
		text += String.fromCharCode(units.charCodeAt(i) * 256 + units.charCodeAt(i + 1));
	}
	return text;
}
