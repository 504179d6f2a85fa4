import { sha256Hex } from '../base';
import type { Plant } from '../plant';
import type { Procedure, Step } from '../procedure';
import * as record from '../record';
import type { BodyOf, RecordEvent, Standing, Trend, Typed, TypedRow, TypedValue } from '../record';
import { must } from './must';
import type { Act } from './play-file';

type Entry = BodyOf<'entry'>;
type Enter = Extract<Act, { do: 'enter' }>;
type Calculate = Extract<Act, { do: 'calculate' }>;

export type Files = {
	/** Bytes of a file beside the start-up's. */
	readonly read: (name: string) => Uint8Array<ArrayBuffer>;
};

export type Around = {
	readonly procedure: Procedure;
	readonly plant: Plant;
	readonly files: Files;
	readonly instant: (local: string) => string;
};

/** What a technician's entry becomes. In the file everything that a step asks to confirm is confirmed, unless it says less. */
export function enteredBody(act: Enter, step: Step, around: Around, known: readonly RecordEvent[]): Entry {
	const { outcome, choice, flow, reason } = act;
	const all = step.kind === 'confirm' ? step.confirms.map(({ id }) => id) : undefined;
	const confirmed = step.kind === 'confirm' ? (act.confirmed ?? all) : undefined;
	const typed: Typed = {
		...(act.values === undefined ? {} : { values: mapped(act.values, (value) => valueOf(value, around)) }),
		...(act.rows === undefined ? {} : { rows: mapped(act.rows, (row) => rowOf(row, around)) }),
		...(confirmed === undefined ? {} : { confirmed }),
		...(choice === undefined ? {} : { choice }),
		...(flow === undefined ? {} : { flow }),
		...(outcome === undefined ? {} : { outcome }),
		...(reason === undefined ? {} : { reason }),
		...shared(act, around),
	};
	return must(record.enteredBody(step, typed, { plant: around.plant, known }), `entry on ${step.id}`);
}

export function calculatedBody(
	act: Calculate,
	step: Step,
	around: Around,
	known: {
		readonly events: readonly RecordEvent[];
		readonly standing: Standing;
		readonly trends: ReadonlyMap<string, Trend>;
	},
): Entry {
	const said = { ...(act.typed === undefined ? {} : { typed: act.typed }), ...shared(act, around) };
	return must(record.calculatedBody(step, said, { ...around, ...known }), `calculation of ${step.id}`);
}

function shared(act: Enter | Calculate, { files, instant }: Around): Pick<Typed, 'from' | 'note' | 'attachments'> {
	return {
		...(act.from === undefined ? {} : { from: instant(act.from) }),
		...(act.note === undefined ? {} : { note: act.note }),
		...(act.photo === undefined ? {} : { attachments: [attachment(act.photo, files)] }),
	};
}

export function attachment(name: string, files: Files): NonNullable<Entry['attachments']>[number] {
	const bytes = files.read(name);
	return {
		hash: sha256Hex(bytes),
		name: name.replace(/^.*\//, ''),
		mediaType: MEDIA[name.replace(/^.*\./, '')] ?? 'application/octet-stream',
		bytes: bytes.length,
	};
}

const MEDIA: { readonly [ending: string]: string } = { csv: 'text/csv', jpg: 'image/jpeg' };

function valueOf(value: NonNullable<Enter['values']>[string], { instant }: Around): string | TypedValue {
	if (typeof value === 'string') return value;
	const { mode, observed, ...said } = value;
	return {
		...said,
		...(mode === undefined ? {} : { analyserMode: mode }),
		...(observed === undefined ? {} : { observed: instant(observed) }),
	};
}

function rowOf(row: NonNullable<Enter['rows']>[string], { instant }: Around): string | TypedRow {
	if (typeof row === 'string' || row.reading === undefined) return row;
	const { observed, ...reading } = row.reading;
	return { ...row, reading: { ...reading, ...(observed === undefined ? {} : { observed: instant(observed) }) } };
}

const mapped = <From, To>(of: { readonly [name: string]: From }, to: (from: From) => To): { [name: string]: To } =>
	Object.fromEntries(Object.entries(of).map(([name, value]) => [name, to(value)]));
