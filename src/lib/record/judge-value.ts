import { differenceOf, type Basis, type Measure, type Plant } from '../plant';
import type { LimitUse, Step } from '../procedure';
import { isQuantityName, toSi, type QuantityName } from '../quantity';
import type { BodyOf } from './event';

export type Reading = NonNullable<BodyOf<'entry'>['values']>[number];
export type Field = Extract<Step, { readonly kind: 'reading' }>['fields'][number];

/** Whether a value keeps its limit with the guard band between them, said anew from the value as it was typed. */
export type Judged =
	| { readonly kind: 'inside' | 'no limit' }
	| { readonly kind: 'outside'; readonly side: 'at most' | 'at least'; readonly limit: string; readonly guard: string }
	| { readonly kind: 'cannot tell'; readonly because: string };

type Limit = {
	readonly atMost?: Measure;
	readonly atLeast?: Measure;
	readonly guard?: Measure;
	readonly basis?: Basis;
};

/** @param U expanded uncertainty of a computed value: kept from the limit where it is larger than the guard */
export function judgeValue(reading: Reading, field: Field, plant: Plant | undefined, U?: Measure): Judged {
	if (field.limit === undefined) return { kind: 'no limit' };
	const limit = limitOf(field.limit, plant);
	if (limit === undefined) return cannotTell('its limit is not in the plant description of the record');
	const { quantity } = field;
	if (!isQuantityName(quantity)) return cannotTell(`the quantity ${quantity} is not known here`);
	const value = toSi({ value: reading.typed, unit: reading.unit }, quantity);
	if (!value.ok) return cannotTell(`${reading.typed} ${reading.unit} is no ${quantity} (${value.error.kind})`);
	if (basisDisagrees(basisOf(reading, field, plant), limit))
		return cannotTell('reading and limit are not of one basis, wet or dry');
	return judge(value.value.value, limit, quantity, U);
}

function judge(value: number, limit: Limit, quantity: QuantityName, U: Measure | undefined): Judged {
	const [atMost, atLeast] = [inSi(limit.atMost, quantity), inSi(limit.atLeast, quantity)];
	const own = inSi(limit.guard, differenceOf(quantity)) ?? 0;
	const guard = Math.max(own, inSi(U, differenceOf(quantity)) ?? 0);
	if ([atMost, atLeast, guard].some((number) => Number.isNaN(number))) return cannotTell('the limit cannot be read');
	// A reading passes at the limit less the guard; this is the last bit of that difference, not a concession.
	const slack = (bound: number): number => 1e-12 * Math.max(Math.abs(bound), guard);
	const outside = (side: 'at most' | 'at least', bound: Measure | undefined): Judged => ({
		kind: 'outside',
		side,
		limit: printed(bound),
		guard: guard > own ? printed(U) : printed(limit.guard),
	});
	if (atMost !== undefined && !(value <= atMost - guard + slack(atMost))) return outside('at most', limit.atMost);
	if (atLeast !== undefined && !(value >= atLeast + guard - slack(atLeast))) return outside('at least', limit.atLeast);
	return { kind: 'inside' };
}

const cannotTell = (because: string): Judged => ({ kind: 'cannot tell', because });

const limitOf = (use: LimitUse, plant: Plant | undefined): Limit | undefined =>
	'limit' in use ? plant?.limits.find(({ id }) => id === use.limit) : use;

/** The basis belongs to the measuring point; the reading says its own, the field speaks where there is no point. */
function basisOf(reading: Reading, field: Field, plant: Plant | undefined): Basis | undefined {
	const tag = reading.point ?? field.point;
	return reading.basis ?? plant?.points.find((point) => point.tag === tag)?.basis ?? field.basis;
}

/** A dry reading is never below the wet one: against a wet maximum it is compared as it is, on the safe side. */
const basisDisagrees = (basis: Basis | undefined, limit: Limit): boolean =>
	basis !== undefined &&
	limit.basis !== undefined &&
	basis !== limit.basis &&
	!(basis === 'dry' && limit.atLeast === undefined);

/** NaN when it is there and cannot be read: every comparison with it fails. */
function inSi(measure: Measure | undefined, quantity: QuantityName): number | undefined {
	if (measure === undefined) return undefined;
	const read = toSi(measure, quantity);
	return read.ok ? read.value.value : NaN;
}

const printed = (measure: Measure | undefined): string =>
	measure === undefined ? '' : `${measure.value} ${measure.unit}`;
