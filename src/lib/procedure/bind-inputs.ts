import { fail, ok, unreachable, type Result } from '../base';
import { CATALOGUE } from '../calc';
import { differenceOf, isInCalibration, type Measure, type Plant } from '../plant';
import { fromSi, isQuantityName, toSi } from '../quantity';
import type { Binding } from './binding';
import { fieldsOf } from './fields';
import type { BoundReading, BoundRow, BoundSeries, Lookup } from './lookup';
import { atPlantPath } from './plant-path';
import type { Procedure, Step } from './schema';

type Calculation = Extract<Step, { readonly kind: 'calculation' }>;

/** What the calculation still waits for: the place in its inputs, and the binding that found nothing. */
export type MissingInput = { readonly kind: 'missing-input'; readonly input: string; readonly binding: Binding };

export type Around = { readonly procedure: Procedure; readonly plant: Plant; readonly lookup: Lookup };

/**
 * The inputs of a calculation step as its calculator takes them, from the record, the plant description and the procedure.
 * Everything that is missing is named at once; an input that the calculator does without is left out.
 */
export function bindInputs(
	step: Calculation,
	around: Around,
): Result<{ readonly [input: string]: unknown }, readonly MissingInput[]> {
	const specs = CATALOGUE[step.calculator]?.inputs ?? [];
	const inputs: Record<string, unknown> = {};
	const missing: MissingInput[] = [];
	for (const [name, binding] of Object.entries(step.bind)) {
		const bound = bind(binding, name, around);
		if (bound.ok) inputs[name] = bound.value;
		else if (!specs.some((spec) => spec.name === name && spec.optional === true)) missing.push(...bound.error);
	}
	return missing.length > 0 ? fail(missing) : ok(inputs);
}

type Bound = Result<unknown, readonly MissingInput[]>;

function bind(binding: Binding, input: string, around: Around): Bound {
	switch (binding.from) {
		case 'group':
			return bindGroup(binding.of, input, around);
		case 'list':
			return bindList(binding.of, input, around);
		default: {
			const value = valueOf(binding, input, around);
			return value === undefined ? fail([{ kind: 'missing-input', input, binding }]) : ok(value);
		}
	}
}

function bindGroup(of: { readonly [name: string]: Binding }, input: string, around: Around): Bound {
	const object: Record<string, unknown> = {};
	const missing: MissingInput[] = [];
	for (const [name, part] of Object.entries(of)) {
		const bound = bind(part, `${input}.${name}`, around);
		if (bound.ok) object[name] = bound.value;
		else if (!(part.from === 'group' && part.optional === true)) missing.push(...bound.error);
	}
	return missing.length > 0 ? fail(missing) : ok(object);
}

function bindList(of: readonly Binding[], input: string, around: Around): Bound {
	const bound = of.map((part, k) => bind(part, `${input}[${k}]`, around));
	const missing = bound.flatMap((each) => (each.ok ? [] : each.error));
	return missing.length > 0 ? fail(missing) : ok(bound.map((each) => (each.ok ? each.value : undefined)));
}

type Single = Exclude<Binding, { readonly from: 'group' | 'list' }>;

/** The value that one binding finds; undefined while there is nothing. */
function valueOf(binding: Single, input: string, { procedure, plant, lookup }: Around): unknown {
	switch (binding.from) {
		case 'field': {
			const reading = lookup.reading(binding.step, binding.field);
			return reading && measureOf(reading, pointOf(binding, procedure, plant));
		}
		case 'age': {
			const reading = lookup.reading(binding.step, binding.field);
			return reading && { value: (lookup.now - reading.at) / 1000, unit: 's' };
		}
		case 'mode':
			return lookup.reading(binding.step, binding.field)?.mode ?? 'not known';
		case 'series':
			return lookup.series(binding.step)?.byTag;
		case 'zero':
			return lookup.series(binding.step)?.zero;
		case 'observed': {
			const series = lookup.series(binding.zero);
			const at = lookup.observed(binding.step);
			return series === undefined || at === undefined ? binding.otherwise : secondsAfter(series, at);
		}
		case 'person':
			return lookup.person(binding.step);
		case 'standing': {
			const standing = lookup.standing(binding.step);
			const { says } = binding;
			return says === undefined ? standing : standing === 'stands' ? says.stands : says.otherwise;
		}
		case 'coverage': {
			const series = lookup.series(binding.zero);
			const rows = lookup.rows(binding.step);
			const step = procedure.steps.find(({ id }) => id === binding.step);
			return series && rows && step?.kind === 'coverage' ? coverageOf(step, { rows, series, plant }) : undefined;
		}
		case 'result': {
			const found = lookup.result(binding.step)?.values[binding.output];
			return found?.value === null || found === undefined ? undefined : { ...found, value: found.value };
		}
		case 'plant': {
			const found = atPlantPath(plant, binding.path);
			return found.ok ? found.value : undefined;
		}
		case 'limit':
			return plant.limits.find(({ id }) => id === binding.limit)?.[binding.side];
		case 'calibration': {
			const instrument = plant.instruments.find(({ id }) => id === binding.instrument);
			return instrument && (isInCalibration(instrument, plant, lookup.now) ? 'valid' : 'none');
		}
		case 'procedure':
			return binding.value;
		case 'typed':
			return lookup.typed(input);
		default:
			return unreachable(binding);
	}
}

type Point = Plant['points'][number];

/** The measuring point that a field reads; undefined for a value that was worked out. */
function pointOf(
	{ step, field }: { readonly step: string; readonly field: string },
	{ steps }: Procedure,
	{ points }: Plant,
): Point | undefined {
	const bound = steps.find(({ id }) => id === step);
	const tag = bound && fieldsOf(bound).find(({ id }) => id === field)?.point;
	return points.find((point) => point.tag === tag);
}

/** A reading as typed, with the expanded uncertainty of its measuring point in the unit that was typed. */
function measureOf({ typed, unit }: BoundReading, point?: Point): Measure {
	const U = point?.uncertainty;
	if (point === undefined || U === undefined || !isQuantityName(point.quantity)) return { value: typed, unit };
	const difference = differenceOf(point.quantity);
	const inSi = toSi(U, difference);
	const shown = inSi.ok ? fromSi(inSi.value.value, difference, unit.replace(/\([ag]\)$/, '')) : inSi;
	return { value: typed, unit, ...(shown.ok ? { U: shown.value } : {}) };
}

const secondsAfter = ({ zeroAt }: BoundSeries, at: number): number => (at - zeroAt) / 1000;

type Answers = { readonly rows: readonly BoundRow[]; readonly series: BoundSeries; readonly plant: Plant };

/** Every row of the table as the purge calculator asks for it; a row without an answer is handed on as blank. */
const coverageOf = (step: Extract<Step, { readonly kind: 'coverage' }>, answers: Answers): readonly unknown[] =>
	step.rows.map((row) => {
		const answer = answers.rows.find((each) => each.row === row.id);
		const { volume } = row;
		switch (answer?.found) {
			case 'measured':
				return { volume, answer: answer.found, place: row.point ?? '' };
			case 'swept, outlet read': {
				const outlet = gasOf(answer.reading, answers);
				return { volume, answer: answer.found, ...(outlet && { outlet }) };
			}
			case 'shut off, inerted by itself': {
				const reading = gasOf(answer.reading, answers);
				return { volume, answer: answer.found, inertedBy: row.inertedBy ?? '', ...(reading && { reading }) };
			}
			default:
				return { volume, answer: '' };
		}
	});

/** A gas reading without a basis is no reading: whether it is wet or dry belongs to what it was read with. */
function gasOf(reading: BoundReading | undefined, { series, plant }: Answers) {
	const basis = reading?.basis ?? plant.points.find(({ tag }) => tag === reading?.tag)?.basis;
	if (reading?.tag === undefined || basis === undefined) return undefined;
	return { tag: reading.tag, basis, t: secondsAfter(series, reading.at), oxygen: measureOf(reading) };
}
