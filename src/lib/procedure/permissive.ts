import { fromSi, isQuantityName, parseNumber, toSi, type QuantityName } from '../quantity';
import type { Basis, Plant } from '../plant';
import { readCondition, type ConditionFinding } from './condition';
import type { Permissive } from './schema';

export type WhyUnknown =
	'missing' | 'stale' | 'out of range' | 'wrong basis' | 'wrong quantity' | 'not a number' | 'measuring point unknown';

export type Unknown = { readonly unknown: WhyUnknown };

/** What is known now: a number in the unit that the permissive names, a truth, or why there is none. */
export type PermissiveInputs = {
	readonly readings: { readonly [name: string]: number | Unknown | undefined };
	readonly facts: { readonly [name: string]: boolean | undefined };
};

export type UnknownBecause =
	| { readonly kind: 'reading'; readonly name: string; readonly point: string; readonly why: WhyUnknown }
	| { readonly kind: 'fact'; readonly name: string }
	| { readonly kind: 'condition'; readonly finding: ConditionFinding };

export type PermissiveValue = {
	readonly value: 'TRUE' | 'FALSE' | 'unknown';
	readonly because: readonly UnknownBecause[];
};

/**
 * [P30] TRUE or FALSE only when every name of the permissive is known, and unknown otherwise, whatever && || and ! would
 * make of the rest: a missing reading is no reason to start anything.
 */
export function evaluatePermissive(permissive: Permissive, inputs: PermissiveInputs): PermissiveValue {
	const condition = readCondition(permissive);
	if (!condition.ok)
		return { value: 'unknown', because: condition.error.map((finding) => ({ kind: 'condition', finding })) };

	const because: UnknownBecause[] = [];
	const names: Record<string, number | boolean> = {};
	for (const [name, { point }] of Object.entries(permissive.readings)) {
		const reading = own(inputs.readings, name) ?? { unknown: 'missing' };
		if (typeof reading !== 'number') because.push({ kind: 'reading', name, point, why: reading.unknown });
		else if (!Number.isFinite(reading)) because.push({ kind: 'reading', name, point, why: 'not a number' });
		else names[name] = reading;
	}
	for (const name of Object.keys(permissive.facts ?? {})) {
		const fact = own(inputs.facts, name);
		if (fact === undefined) because.push({ kind: 'fact', name });
		else names[name] = fact;
	}
	if (because.length > 0) return { value: 'unknown', because };
	return { value: condition.value(names) ? 'TRUE' : 'FALSE', because };
}

/** The newest reading of a measuring point, as it was typed, and how old it is. */
export type NewestReading = {
	readonly typed: string;
	readonly unit: string;
	readonly basis?: Basis;
	readonly ageMinutes: number;
};

/** The number that a permissive may use, in its own unit, or why the reading counts as unknown. */
export function readingFor(
	use: Permissive['readings'][string],
	newest: NewestReading | undefined,
	plant: Plant,
): number | Unknown {
	const point = plant.points.find(({ tag }) => tag === use.point);
	if (point === undefined) return { unknown: 'measuring point unknown' };
	if (newest === undefined) return { unknown: 'missing' };
	if (use.basis !== point.basis || (newest.basis ?? point.basis) !== point.basis) return { unknown: 'wrong basis' };
	if (use.quantity !== point.quantity || !isQuantityName(use.quantity)) return { unknown: 'wrong quantity' };
	// As every age (ST4), this one has run out at exactly its number of minutes; a NaN has no age.
	if (!(newest.ageMinutes < use.notOlderThanMinutes)) return { unknown: 'stale' };
	const inPointUnit = shownIn(point.unit, newest, use.quantity);
	const inUseUnit = shownIn(use.unit, newest, use.quantity);
	if (inPointUnit === undefined || inUseUnit === undefined) return { unknown: 'not a number' };
	const { from, to } = point.range;
	return inPointUnit >= from && inPointUnit <= to ? inUseUnit : { unknown: 'out of range' };
}

/** The typed number itself where it was typed in that unit: a conversion there and back could move it over the limit. */
function shownIn(unit: string, { typed, unit: typedUnit }: NewestReading, quantity: QuantityName): number | undefined {
	const si = toSi({ value: typed, unit: typedUnit }, quantity);
	if (!si.ok) return undefined;
	const shown = unit === typedUnit ? parseNumber(typed) : fromSi(si.value.value, quantity, unit);
	return shown.ok ? shown.value : undefined;
}

const own = <T>(record: { readonly [name: string]: T }, name: string): T | undefined =>
	Object.hasOwn(record, name) ? record[name] : undefined;
