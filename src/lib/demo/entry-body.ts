import { sha256Hex } from '../base';
import { runCalculator, type CalcResult } from '../calc';
import type { Plant } from '../plant';
import { bindInputs, fieldsOf, type Procedure, type Step } from '../procedure';
import { judgeEntry, lookupIn, type BodyOf, type RecordEvent, type Standing, type Trend } from '../record';
import { DemoStopped, must } from './must';
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

/** What a technician's entry becomes: values as typed with unit, basis and instrument, and an outcome that the limits decide. */
export function enteredBody(act: Enter, step: Step, around: Around, known: readonly RecordEvent[]): Entry {
	const values = valuesOf(act, step, around);
	const rows = rowsOf(act, step, around);
	const limit = limitWords(step, around.plant);
	const body: Entry = {
		step: step.id,
		outcome: 'pass',
		...(values.length === 0 ? {} : { values }),
		...(rows.length === 0 ? {} : { rows }),
		...(step.kind === 'confirm' ? { confirmed: act.confirmed ?? step.confirms.map(({ id }) => id) } : {}),
		...(act.choice === undefined ? {} : { choice: act.choice }),
		...(act.flow === undefined ? {} : { flow: act.flow }),
		...(limit === '' ? {} : { limit }),
		...shared(act, around),
		...(act.reason === undefined ? {} : { reason: act.reason }),
	};
	if (act.outcome !== undefined) return { ...body, outcome: act.outcome };
	return { ...body, outcome: outcomeOf(step, body, around.plant, known) };
}

/** Nobody chooses the outcome where a limit or a verdict decides. */
function outcomeOf(step: Step, body: Entry, plant: Plant, known: readonly RecordEvent[]): Entry['outcome'] {
	const byId = new Map(known.map((event) => [event.id, event]));
	return judgeEntry(step, body, { plant, byId }).length === 0 ? 'pass' : 'fail';
}

function shared(act: Enter | Calculate | Extract<Act, { do: 'attach' }>, { files, instant }: Around): Partial<Entry> {
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

function valuesOf(act: Enter, step: Step, { plant, instant }: Around): NonNullable<Entry['values']> {
	return Object.entries(act.values ?? {}).map(([id, value]) => {
		const field = fieldsOf(step).find((one) => one.id === id);
		if (field === undefined) throw new DemoStopped(`step ${step.id} has no field ${id}`);
		const point = plant.points.find(({ tag }) => tag === field.point);
		const said = typeof value === 'string' ? { typed: value } : value;
		const basis = point?.basis ?? field.basis;
		const instrument = said.instrument ?? point?.instrument;
		return {
			field: id,
			...(field.point === undefined ? {} : { point: field.point }),
			typed: said.typed,
			unit: field.unit,
			...(basis === undefined ? {} : { basis }),
			...(instrument === undefined ? {} : { instrument }),
			...(said.readBy === undefined ? {} : { readBy: said.readBy }),
			...(said.where === undefined ? {} : { where: said.where }),
			...(said.mode === undefined ? {} : { analyserMode: said.mode }),
			...(said.observed === undefined ? {} : { observed: instant(said.observed) }),
		};
	});
}

function rowsOf(act: Enter, step: Step, { instant }: Around): NonNullable<Entry['rows']> {
	if (act.rows === undefined) return [];
	if (step.kind !== 'line-up' && step.kind !== 'coverage') throw new DemoStopped(`step ${step.id} has no rows`);
	const good = new Map(step.rows.map((row) => [row.id, 'required' in row ? [row.required] : [...row.answers]]));
	return Object.entries(act.rows).map(([row, value]) => {
		const said = typeof value === 'string' ? { found: value } : value;
		const reading = said.reading;
		return {
			row,
			found: said.found,
			passes: (good.get(row) as readonly string[] | undefined)?.includes(said.found) === true,
			...(said.note === undefined ? {} : { note: said.note }),
			...(reading === undefined ? {} : { reading: rowReading(reading, instant) }),
		};
	});
}

type Row = Exclude<NonNullable<Enter['rows']>[string], string>;

/** A tag that is an instrument of its own (a portable) is named as one. */
function rowReading(
	{ tag, typed, unit, basis, observed }: NonNullable<Row['reading']>,
	instant: (local: string) => string,
) {
	return {
		...(tag.startsWith('PG-') ? { instrument: tag, where: 'portable' as const } : { point: tag }),
		typed,
		unit,
		...(basis === undefined ? {} : { basis }),
		...(observed === undefined ? {} : { observed: instant(observed) }),
	};
}

/** Limits of a step in one line: "at most 8.0 %, guard 0.3 %". */
function limitWords(step: Step, plant: Plant): string {
	const words = fieldsOf(step).flatMap((field) => {
		if (field.limit === undefined) return [];
		const use = field.limit;
		const limit = 'limit' in use ? plant.limits.find(({ id }) => id === use.limit) : use;
		const { atMost, atLeast, guard } = limit ?? {};
		return [
			[
				...(atLeast === undefined ? [] : [`at least ${String(atLeast.value)} ${atLeast.unit}`]),
				...(atMost === undefined ? [] : [`at most ${String(atMost.value)} ${atMost.unit}`]),
				...(guard === undefined ? [] : [`guard ${String(guard.value)} ${guard.unit}`]),
			].join(', '),
		];
	});
	return [...new Set(words)].join('; ');
}

/** Runs a calculation step on what stands, and lets its own verdict decide: adequate passes, anything short of it is a try. */
export function calculatedBody(
	act: Calculate,
	step: Step,
	around: Around,
	record: {
		readonly events: readonly RecordEvent[];
		readonly standing: Standing;
		readonly trends: ReadonlyMap<string, Trend>;
	},
): Entry {
	if (step.kind !== 'calculation') throw new DemoStopped(`step ${step.id} calculates nothing`);
	const lookup = lookupIn({ ...record, typed: act.typed ?? {} });
	const inputs = must(
		bindInputs(step, { procedure: around.procedure, plant: around.plant, lookup }),
		`inputs of ${step.id}`,
	);
	const result = must(runCalculator(step.calculator, inputs), `calculation of ${step.id}`);
	const begins = beginOfHold(result, lookup.series(seriesStepOf(step)));
	const body: Entry = {
		step: step.id,
		outcome: 'pass',
		calculation: JSON.parse(JSON.stringify(result)) as { [name: string]: unknown },
		...shared(act, around),
		...(begins === undefined ? {} : { from: begins }),
	};
	const short = step.proves === 'verdict' && result.verdict?.word !== 'adequate';
	return { ...body, outcome: short ? 'try' : outcomeOf(step, body, around.plant, record.events) };
}

const seriesStepOf = (step: Step): string => {
	const found = JSON.stringify(step.kind === 'calculation' ? step.bind : {});
	return /"from":"series","step":"([^"]+)"/.exec(found)?.[1] ?? '';
};

/** A purge rests on its whole hold window: the first sample of it is the oldest reading that the proof needs (ST2). */
function beginOfHold(result: CalcResult, series: { readonly zeroAt: number } | undefined): string | undefined {
	const since = result.values.adequateSince?.value;
	if (result.verdict?.word !== 'adequate' || typeof since !== 'number' || series === undefined) return undefined;
	return new Date(series.zeroAt + since * 1000).toISOString().replace(/\.\d+Z$/, 'Z');
}
