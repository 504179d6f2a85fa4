import { concat, utf8 } from '../../base';

type Bytes = Uint8Array<ArrayBuffer>;

/** One object of an update: its number, and what stands between `obj` and `endobj`. */
export type ChangedObject = { readonly number: number; readonly body: Bytes };

export type Update = {
	/** The file that is added to. Its bytes stay as they are. */
	readonly before: Bytes;
	readonly previousXref: number;
	readonly objects: readonly ChangedObject[];
	/** Entries of the trailer besides /Prev: "/Size 40 /Root 1 0 R ...". */
	readonly trailer: string;
};

/** An incremental update (ISO 32000-1, 7.5.6) with a classic cross-reference table, and where each object's body begins. */
export function appendUpdate(update: Update): { readonly bytes: Bytes; readonly bodyAt: ReadonlyMap<number, number> } {
	const objects = [...update.objects].sort((a, b) => a.number - b.number);
	const parts: Bytes[] = [update.before, utf8('\n')];
	let length = update.before.length + 1;
	const push = (part: Bytes) => {
		parts.push(part);
		length += part.length;
	};
	const objectAt = new Map<number, number>();
	const bodyAt = new Map<number, number>();
	for (const { number, body } of objects) {
		objectAt.set(number, length);
		push(utf8(`${number} 0 obj\n`));
		bodyAt.set(number, length);
		push(body);
		push(utf8('\nendobj\n'));
	}
	const xref = length;
	push(utf8(`xref\n${sections(objectAt)}trailer\n<< ${update.trailer} /Prev ${update.previousXref} >>\n`));
	push(utf8(`startxref\n${xref}\n%%EOF\n`));
	return { bytes: concat(...parts), bodyAt };
}

/** Runs of neighbouring numbers, each under its first number and its length; entries are 20 bytes long. */
function sections(objectAt: ReadonlyMap<number, number>): string {
	const runs: { first: number; entries: string[] }[] = [];
	for (const [number, at] of objectAt) {
		const entry = `${String(at).padStart(10, '0')} 00000 n \n`;
		const last = runs.at(-1);
		if (last !== undefined && number === last.first + last.entries.length) last.entries.push(entry);
		else runs.push({ first: number, entries: [entry] });
	}
	return runs.map(({ first, entries }) => `${first} ${entries.length}\n${entries.join('')}`).join('');
}
