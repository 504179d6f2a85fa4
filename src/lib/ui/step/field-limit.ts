import type { Measure, Plant } from '../../plant';
import { differenceOf } from '../../plant';
import type { Field, LimitUse } from '../../procedure';
import { fromSi, isQuantityName, parseNumber, toSi, type QuantityName } from '../../quantity';
import { judgeEntry } from '../../record';

/** A limit as numbers in the unit of its field, for the bar. */
export type BarLimit = { readonly atMost?: number; readonly atLeast?: number; readonly guard: number };

export function barLimit(
	use: LimitUse | undefined,
	quantity: string,
	unit: string,
	plant: Plant,
): BarLimit | undefined {
	const limit = use === undefined ? undefined : 'limit' in use ? plant.limits.find(({ id }) => id === use.limit) : use;
	if (limit === undefined || !isQuantityName(quantity)) return undefined;
	const atMost = inUnit(limit.atMost, quantity, unit);
	const atLeast = inUnit(limit.atLeast, quantity, unit);
	if (atMost === undefined && atLeast === undefined) return undefined;
	return {
		...(atMost === undefined ? {} : { atMost }),
		...(atLeast === undefined ? {} : { atLeast }),
		guard: spanIn(limit.guard, quantity, unit) ?? 0,
	};
}

function inUnit(measure: Measure | undefined, quantity: QuantityName, unit: string): number | undefined {
	if (measure === undefined) return undefined;
	const read = toSi(measure, quantity);
	const shown = read.ok ? fromSi(read.value.value, quantity, unit) : read;
	return shown.ok ? tidy(shown.value) : undefined;
}

/** A difference in the unit of the field: two values so far apart. */
function spanIn(measure: Measure | undefined, quantity: QuantityName, unit: string): number | undefined {
	if (measure === undefined) return undefined;
	const span = toSi(measure, differenceOf(quantity));
	const [from, to] = span.ok ? [fromSi(BASE, quantity, unit), fromSi(BASE + span.value.value, quantity, unit)] : [];
	return from?.ok === true && to?.ok === true ? tidy(to.value - from.value) : undefined;
}

/** What conversion leaves behind the twelfth digit is no measurement. */
const tidy = (value: number): number => Number(value.toPrecision(10));
const BASE = 300;

export type FieldVerdict =
	| { readonly kind: 'empty' | 'no limit' | 'stands' }
	| { readonly kind: 'outside' | 'undecided' | 'unreadable'; readonly because: string };

/** What the record will say of a value, by the same rule that judges the entry. Nobody chooses it. */
export function fieldVerdict(stepId: string, field: Field, typed: string, plant: Plant): FieldVerdict {
	if (typed.trim() === '') return { kind: 'empty' };
	const number = parseNumber(typed);
	if (!number.ok) return { kind: 'unreadable', because: number.error.kind };
	if (field.limit === undefined) return { kind: 'no limit' };
	const step = { ...SHELL, id: stepId, fields: [field] };
	const value = {
		field: field.id,
		typed,
		unit: field.unit,
		...(field.point === undefined ? {} : { point: field.point }),
	};
	const [fault] = judgeEntry(step, { step: stepId, outcome: 'pass', values: [value] }, { plant, byId: new Map() });
	if (fault === undefined) return { kind: 'stands' };
	return { kind: fault.kind === 'cannot tell' ? 'undecided' : 'outside', because: fault.because };
}

/** The frame of a step around the one field that is judged. */
const SHELL = {
	kind: 'reading',
	gate: 0,
	group: 'field',
	title: 'field',
	minutes: 0,
	validity: { kind: 'once' },
	lapsedBy: [],
	redo: [],
	waits: [],
	instruments: [],
} as const;
