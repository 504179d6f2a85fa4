import { unreachable } from '../base';
import type { Measure, Plant } from '../plant';
import type { Step } from '../procedure';
import { isOf, type BodyOf, type RecordEvent } from './event';
import { judgeValue, type Field, type Judged, type Reading } from './judge-value';

type Entry = BodyOf<'entry'>;

/** Why an entry must not say "pass", or why that cannot be judged here. */
export type EntryFault = { readonly because: string; readonly kind: 'does not pass' | 'cannot tell' };

/**
 * Whether an entry holds everything that its step asks for, with every value inside its limit and guard. Where a limit or
 * a verdict decides, nobody chooses the outcome: who writes an entry asks here, and who reads it back asks again.
 *
 * @param byId the events that the entry may name: its series
 */
export function judgeEntry(
	step: Step,
	entry: Entry,
	around: { readonly plant: Plant | undefined; readonly byId: ReadonlyMap<string, RecordEvent> },
): readonly EntryFault[] {
	return faultsOf(step, entry, {
		judge: (reading, field, U) => judgeValue(reading, field, around.plant, U),
		byId: around.byId,
	});
}

const fault = (because: string): EntryFault => ({ because, kind: 'does not pass' });
const doubt = (because: string): EntryFault => ({ because, kind: 'cannot tell' });

type Judging = {
	readonly judge: (reading: Reading, field: Field, U?: Measure) => Judged;
	readonly byId: ReadonlyMap<string, RecordEvent>;
};

function faultsOf(step: Step, entry: Entry, judging: Judging): readonly EntryFault[] {
	const photo = step.kind === 'photo' || step.photo === 'needed';
	const noPhoto = photo && (entry.attachments ?? []).length === 0 ? [fault('it holds no photo')] : [];
	return [...noPhoto, ...faultsOfKind(step, entry, judging)];
}

function faultsOfKind(step: Step, entry: Entry, judging: Judging): readonly EntryFault[] {
	switch (step.kind) {
		case 'confirm': {
			const open = step.confirms.filter(({ id }) => entry.confirmed?.includes(id) !== true).map(({ id }) => id);
			return open.length === 0 ? [] : [fault(`it does not confirm ${open.join(', ')}`)];
		}
		case 'reading':
		case 'quick sheet':
		case 'watch':
			return step.fields.flatMap((field) => faultOfField(field, entry, judging));
		case 'timed hold':
			return (step.fields ?? []).flatMap((field) => faultOfField(field, entry, judging));
		case 'line-up':
			return faultsOfRows(entry, (row) => {
				const required = step.rows.find(({ id }) => id === row.row)?.required;
				if (required === undefined) return [fault(`the table has no row ${row.row}`)];
				return row.found === required ? [] : [fault(`${row.row} was found "${row.found}"; required is "${required}"`)];
			});
		case 'coverage':
			return faultsOfRows(entry, (row) => {
				const answers: readonly string[] = step.rows.find(({ id }) => id === row.row)?.answers ?? [];
				return answers.includes(row.found) ? [] : [fault(`"${row.found}" is no answer for ${row.row}`)];
			});
		case 'choice': {
			const option = step.options.find(({ id }) => id === entry.choice);
			return option?.passes === true ? [] : [fault(`the choice "${entry.choice ?? ''}" does not pass`)];
		}
		case 'calculation':
			return faultsOfCalculation(step, entry, judging);
		case 'series':
			return faultsOfSeries(step, entry, judging.byId);
		case 'photo':
		case 'witness point':
		case 'review point':
			return [];
		default:
			return unreachable(step);
	}
}

type Row = NonNullable<Entry['rows']>[number];

/** A table may be looked at again in part; what was looked at passes. */
function faultsOfRows(entry: Entry, faultsOfRow: (row: Row) => readonly EntryFault[]): readonly EntryFault[] {
	const rows = entry.rows ?? [];
	if (rows.length === 0) return [fault('it holds no row of its table')];
	return rows.flatMap((row) => (row.passes ? faultsOfRow(row) : [fault(`row ${row.row} does not`)]));
}

function faultOfField(field: Field, entry: Entry, { judge }: Judging): readonly EntryFault[] {
	const readings = (entry.values ?? []).filter((value) => isOfField(value, field));
	if (readings.length === 0) return [fault(`it holds no value for ${field.id}`)];
	return readings.flatMap((reading) =>
		saidOf(`${field.id} is ${reading.typed} ${reading.unit}`, judge(reading, field)),
	);
}

const isOfField = ({ field, point }: Reading, { id, point: own }: Field): boolean =>
	field === undefined ? point !== undefined && point === own : field === id;

function saidOf(value: string, judged: Judged): readonly EntryFault[] {
	switch (judged.kind) {
		case 'inside':
		case 'no limit':
			return [];
		case 'outside': {
			const guard = judged.guard === '' ? '' : `, guard ${judged.guard}`;
			return [fault(`${value}; allowed is ${judged.side} ${judged.limit}${guard}`)];
		}
		case 'cannot tell':
			return [doubt(`${value}, which cannot be judged: ${judged.because}`)];
	}
}

type CalculationStep = Extract<Step, { readonly kind: 'calculation' }>;

function faultsOfCalculation(
	{ calculator, proves }: CalculationStep,
	entry: Entry,
	{ judge }: Judging,
): readonly EntryFault[] {
	const stored = entry.calculation as
		| {
				calc?: unknown;
				scope?: unknown;
				verdict?: { word?: unknown };
				values?: { [name: string]: { value?: unknown; unit?: unknown; U?: unknown } };
		  }
		| undefined;
	if (stored === undefined) return [fault('it holds no calculation')];
	if (stored.calc !== calculator) return [fault(`it calculated with ${String(stored.calc)}, not with ${calculator}`)];
	if (stored.scope !== 'in scope') return [fault('the calculation is outside the scope of its method')];
	if (proves === 'verdict') {
		const word = stored.verdict?.word;
		return word === 'adequate' ? [] : [fault(`the verdict is "${String(word)}"`)];
	}
	const { value, unit, U } = stored.values?.[proves.output] ?? {};
	if (typeof value !== 'number' || typeof unit !== 'string') return [fault(`the calculation has no ${proves.output}`)];
	const { quantity, limit, output } = proves;
	const field: Field = { id: output, title: output, quantity, unit: proves.unit, limit };
	return saidOf(
		`${output} is ${value} ${unit}`,
		judge({ typed: String(value), unit }, field, typeof U === 'number' ? { value: U, unit } : undefined),
	);
}

type SeriesStep = Extract<Step, { readonly kind: 'series' }>;

function faultsOfSeries(step: SeriesStep, entry: Entry, byId: ReadonlyMap<string, RecordEvent>): readonly EntryFault[] {
	const series = (entry.series ?? []).flatMap((id) => {
		const event = byId.get(id);
		return event !== undefined && isOf(event, 'series attached') ? [event.body] : [];
	});
	const points = new Set(series.flatMap((body) => body.points.map(({ point }) => point)));
	const missing = [...step.points, ...step.flows].filter((point) => !points.has(point));
	if (missing.length > 0) return [fault(`no series is attached of ${missing.join(', ')}`)];
	const short = series.filter(({ samples }) => samples < step.atLeastSamples);
	return short.map(({ samples }) => fault(`a series has ${samples} samples; ${step.atLeastSamples} are asked for`));
}
