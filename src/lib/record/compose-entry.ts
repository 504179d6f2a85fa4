import { fail, ok, type Result } from '../base';
import { runCalculator, type CalcResult, type Refusal } from '../calc';
import type { Plant } from '../plant';
import { bindInputs, fieldsOf, type MissingInput, type Procedure, type Step } from '../procedure';
import type { BodyOf, RecordEvent } from './event';
import type { Standing } from './answer';
import { judgeEntry } from './judge-entry';
import { lookupIn } from './lookup';
import type { Trend } from './trend';

type Entry = BodyOf<'entry'>;
type Reading = NonNullable<Entry['values']>[number];

/** A value as a person gives it: the text, and what is not as the plant description says. */
export type TypedValue = { readonly typed: string } & Partial<
	Pick<Reading, 'unit' | 'instrument' | 'readBy' | 'where' | 'analyserMode' | 'observed' | 'raw'>
>;

export type TypedRow = {
	readonly found: string;
	readonly note?: string;
	readonly lookedBy?: string;
	/** For a swept volume: what was read at its outlet, and with what tag. */
	readonly reading?: Pick<Reading, 'typed' | 'unit' | 'basis' | 'observed'> & { readonly tag: string };
};

/** What a person says beside the values, whatever the kind of step. */
export type Said = Pick<Partial<Entry>, 'note' | 'reason' | 'from' | 'attachments' | 'supersedes' | 'series'>;

/** What a person typed, chose and confirmed on a step. Units, basis and instruments come from the procedure and the plant. */
export type Typed = Said & {
	readonly values?: { readonly [field: string]: string | TypedValue };
	readonly rows?: { readonly [row: string]: string | TypedRow };
	/** Ids of what was confirmed. */
	readonly confirmed?: readonly string[];
	readonly choice?: string;
	readonly flow?: NonNullable<Entry['flow']>;
	/** Only for what no limit decides. */
	readonly outcome?: 'cannot do' | 'not applicable' | 'fail';
};

export type ComposeError =
	| { readonly kind: 'no-such-field'; readonly step: string; readonly field: string }
	| { readonly kind: 'no-rows-here'; readonly step: string }
	| { readonly kind: 'calculates-nothing'; readonly step: string }
	| { readonly kind: 'inputs-missing'; readonly step: string; readonly missing: readonly MissingInput[] }
	| { readonly kind: 'calculation-refused'; readonly step: string; readonly refusals: readonly Refusal[] };

/** What an entry becomes: values as typed with unit, basis and instrument, and an outcome that the limits decide. */
export function enteredBody(
	step: Step,
	typed: Typed,
	around: { readonly plant: Plant; readonly known: readonly RecordEvent[] },
): Result<Entry, ComposeError> {
	const values = valuesOf(step, typed, around.plant);
	if (!values.ok) return values;
	const rows = rowsOf(step, typed);
	if (!rows.ok) return rows;
	const limit = limitWords(step, around.plant);
	const body: Entry = {
		step: step.id,
		outcome: 'pass',
		...(values.value.length === 0 ? {} : { values: values.value }),
		...(rows.value.length === 0 ? {} : { rows: rows.value }),
		...(typed.confirmed === undefined ? {} : { confirmed: typed.confirmed }),
		...(typed.choice === undefined ? {} : { choice: typed.choice }),
		...(typed.flow === undefined ? {} : { flow: typed.flow }),
		...(limit === '' ? {} : { limit }),
		...saidIn(typed),
	};
	return ok({ ...body, outcome: typed.outcome ?? outcomeOf(step, body, around.plant, around.known) });
}

/** Runs a calculation step on what stands, and lets its own verdict decide: adequate passes, anything short of it is a try. */
export function calculatedBody(
	step: Step,
	said: Said & { readonly typed?: { readonly [input: string]: unknown } },
	around: {
		readonly procedure: Procedure;
		readonly plant: Plant;
		readonly events: readonly RecordEvent[];
		readonly standing: Standing;
		readonly trends: ReadonlyMap<string, Trend>;
	},
): Result<Entry, ComposeError> {
	if (step.kind !== 'calculation') return fail({ kind: 'calculates-nothing', step: step.id });
	const { procedure, plant, events } = around;
	const lookup = lookupIn({ ...around, typed: said.typed ?? {} });
	const inputs = bindInputs(step, { procedure, plant, lookup });
	if (!inputs.ok) return fail({ kind: 'inputs-missing', step: step.id, missing: inputs.error });
	const result = runCalculator(step.calculator, inputs.value);
	if (!result.ok) return fail({ kind: 'calculation-refused', step: step.id, refusals: result.error });
	const begins = beginOfHold(result.value, lookup.series(seriesStepOf(step)));
	const body: Entry = {
		step: step.id,
		outcome: 'pass',
		calculation: JSON.parse(JSON.stringify(result.value)) as { [name: string]: unknown },
		...saidIn(said),
		...(begins === undefined ? {} : { from: begins }),
	};
	const short = step.proves === 'verdict' && result.value.verdict?.word !== 'adequate';
	return ok({ ...body, outcome: short ? 'try' : outcomeOf(step, body, plant, events) });
}

/** Nobody chooses the outcome where a limit or a verdict decides. */
function outcomeOf(step: Step, body: Entry, plant: Plant, known: readonly RecordEvent[]): Entry['outcome'] {
	const byId = new Map(known.map((event) => [event.id, event]));
	return judgeEntry(step, body, { plant, byId }).length === 0 ? 'pass' : 'fail';
}

const saidIn = ({ note, reason, from, attachments, supersedes, series }: Said): Said => ({
	...(from === undefined ? {} : { from }),
	...(note === undefined ? {} : { note }),
	...(attachments === undefined ? {} : { attachments }),
	...(series === undefined ? {} : { series }),
	...(supersedes === undefined ? {} : { supersedes }),
	...(reason === undefined ? {} : { reason }),
});

function valuesOf(step: Step, { values = {} }: Typed, plant: Plant): Result<readonly Reading[], ComposeError> {
	const readings: Reading[] = [];
	for (const [id, value] of Object.entries(values)) {
		const field = fieldsOf(step).find((one) => one.id === id);
		if (field === undefined) return fail({ kind: 'no-such-field', step: step.id, field: id });
		const point = plant.points.find(({ tag }) => tag === field.point);
		const { typed, instrument = point?.instrument, ...said } = typeof value === 'string' ? { typed: value } : value;
		const basis = point?.basis ?? field.basis;
		readings.push({
			field: id,
			...(field.point === undefined ? {} : { point: field.point }),
			typed,
			unit: field.unit,
			...(basis === undefined ? {} : { basis }),
			...(instrument === undefined ? {} : { instrument }),
			...said,
		});
	}
	return ok(readings);
}

type Row = NonNullable<Entry['rows']>[number];

function rowsOf(step: Step, { rows }: Typed): Result<readonly Row[], ComposeError> {
	if (rows === undefined) return ok([]);
	if (step.kind !== 'line-up' && step.kind !== 'coverage') return fail({ kind: 'no-rows-here', step: step.id });
	const good = new Map<string, readonly string[]>(
		step.rows.map((row) => [row.id, 'required' in row ? [row.required] : row.answers]),
	);
	return ok(
		Object.entries(rows).map(([row, value]) => {
			const { found, reading, ...said } = typeof value === 'string' ? { found: value } : value;
			const passes = good.get(row)?.includes(found) === true;
			return { row, found, passes, ...said, ...(reading === undefined ? {} : { reading: rowReading(reading) }) };
		}),
	);
}

/** A tag that is an instrument of its own (a portable) is named as one. */
const rowReading = ({ tag, ...reading }: NonNullable<TypedRow['reading']>): Reading => ({
	...(tag.startsWith('PG-') ? { instrument: tag, where: 'portable' } : { point: tag }),
	...reading,
});

/** Limits of a step in one line: "at most 8.0 %, guard 0.3 %". */
function limitWords(step: Step, plant: Plant): string {
	const words = fieldsOf(step).flatMap((field) => {
		if (field.limit === undefined) return [];
		const use = field.limit;
		const { atMost, atLeast, guard } = 'limit' in use ? (plant.limits.find(({ id }) => id === use.limit) ?? {}) : use;
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
