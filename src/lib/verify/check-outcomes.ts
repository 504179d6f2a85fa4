import { unreachable } from '../base';
import type { Step } from '../procedure';
import { allOf, isOf, type BodyOf, type EventOf, type RecordEvent } from '../record';
import { aboutEvent, nameOf, offences } from './about-event';
import type { Documents } from './check-documents';
import { judgeValue, type Field, type Judged, type Reading } from './judge-value';
import { failed, undecided, type Check } from './pdf/check';

type Entry = BodyOf<'entry'>;
type Fault = { readonly because: string; readonly outcome: 'failed' | 'undecided' };

const NAME = 'passes follow from what was recorded';

/** An entry that says "pass" holds everything that its step asks for, and every value keeps its limit and guard. */
export function checkOutcomes(events: readonly RecordEvent[], { procedure, plant }: Documents): readonly Check[] {
	if (procedure === undefined) return [undecided(NAME, 'The record holds no procedure that can be read.')];
	const byId = new Map(events.map((event) => [event.id, event]));
	const steps = new Map(procedure.steps.map((step) => [step.id, step]));
	const passes = allOf(events, 'entry').filter(({ body }) => body.outcome === 'pass');
	const bad = passes.flatMap((event) => {
		const step = steps.get(event.body.step);
		const faults =
			step === undefined
				? [fault(`the procedure has no step ${event.body.step}`)]
				: faultsOf(step, event.body, { judge: (reading, field) => judgeValue(reading, field, plant), byId });
		return faults.map((found) => said(event, found));
	});
	return offences(NAME, bad, `${passes.length} passes judged again.`);
}

function said(event: EventOf<'entry'>, { because, outcome }: Fault): Check {
	const facts = { ...aboutEvent(event), step: event.body.step, because };
	return outcome === 'failed'
		? failed(NAME, `${nameOf(event)} says pass, but ${because}.`, { facts })
		: undecided(NAME, `${nameOf(event)} says pass; ${because}.`, { facts });
}

const fault = (because: string): Fault => ({ because, outcome: 'failed' });
const doubt = (because: string): Fault => ({ because, outcome: 'undecided' });

type Judging = {
	readonly judge: (reading: Reading, field: Field) => Judged;
	readonly byId: ReadonlyMap<string, RecordEvent>;
};

function faultsOf(step: Step, entry: Entry, judging: Judging): readonly Fault[] {
	const photo = step.kind === 'photo' || step.photo === 'needed';
	const noPhoto = photo && (entry.attachments ?? []).length === 0 ? [fault('it holds no photo')] : [];
	return [...noPhoto, ...faultsOfKind(step, entry, judging)];
}

function faultsOfKind(step: Step, entry: Entry, judging: Judging): readonly Fault[] {
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
function faultsOfRows(entry: Entry, faultsOfRow: (row: Row) => readonly Fault[]): readonly Fault[] {
	const rows = entry.rows ?? [];
	if (rows.length === 0) return [fault('it holds no row of its table')];
	return rows.flatMap((row) => (row.passes ? faultsOfRow(row) : [fault(`row ${row.row} does not`)]));
}

function faultOfField(field: Field, entry: Entry, { judge }: Judging): readonly Fault[] {
	const readings = (entry.values ?? []).filter((value) => isOfField(value, field));
	if (readings.length === 0) return [fault(`it holds no value for ${field.id}`)];
	return readings.flatMap((reading) =>
		saidOf(`${field.id} is ${reading.typed} ${reading.unit}`, judge(reading, field)),
	);
}

const isOfField = ({ field, point }: Reading, { id, point: own }: Field): boolean =>
	field === undefined ? point !== undefined && point === own : field === id;

function saidOf(value: string, judged: Judged): readonly Fault[] {
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
): readonly Fault[] {
	const stored = entry.calculation as
		| {
				calc?: unknown;
				scope?: unknown;
				verdict?: { word?: unknown };
				values?: { [name: string]: { value?: unknown; unit?: unknown } };
		  }
		| undefined;
	if (stored === undefined) return [fault('it holds no calculation')];
	if (stored.calc !== calculator) return [fault(`it calculated with ${String(stored.calc)}, not with ${calculator}`)];
	if (stored.scope !== 'in scope') return [fault('the calculation is outside the scope of its method')];
	if (proves === 'verdict') {
		const word = stored.verdict?.word;
		return word === 'adequate' ? [] : [fault(`the verdict is "${String(word)}"`)];
	}
	const { value, unit } = stored.values?.[proves.output] ?? {};
	if (typeof value !== 'number' || typeof unit !== 'string') return [fault(`the calculation has no ${proves.output}`)];
	const { quantity, limit, output } = proves;
	const field: Field = { id: output, title: output, quantity, unit: proves.unit, limit };
	return saidOf(`${output} is ${value} ${unit}`, judge({ typed: String(value), unit }, field));
}

type SeriesStep = Extract<Step, { readonly kind: 'series' }>;

function faultsOfSeries(step: SeriesStep, entry: Entry, byId: ReadonlyMap<string, RecordEvent>): readonly Fault[] {
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
