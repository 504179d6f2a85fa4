import { isQuantityName, toSi, type Measure, type QuantityName } from '../quantity';
import { differenceOf } from './difference';
import type { PlantFinding } from './finding';
import type { Plant } from './schema';

/** Limits that could never be met, and the missing fuel report, are said long before the first gate is at stake. */
export function checkLimits(plant: Plant): readonly PlantFinding[] {
	return [
		...(plant.fuel.limitingOxygen === undefined
			? [{ kind: 'no-fuel-report' as const, path: 'fuel.limitingOxygen' }]
			: []),
		...plant.limits.flatMap((limit, i) => checkSides(`limits[${i}]`, limit)),
		...plant.points.flatMap(({ tag }, i) => checkBetween(`points[${i}]`, tag, boundsOf(tag, plant))),
	];
}

type Limit = Plant['limits'][number];

function checkSides(path: string, { id, quantity, atMost, atLeast, guard }: Limit): readonly PlantFinding[] {
	if (atMost === undefined && atLeast === undefined) return [{ kind: 'limit-without-side', path, limit: id }];
	if (!isQuantityName(quantity)) return [];
	const [most, least, kept] = [
		valueOf(atMost, quantity),
		valueOf(atLeast, quantity),
		valueOf(guard, differenceOf(quantity)) ?? 0,
	];
	const isEmpty = kept < 0 || (most !== undefined && least !== undefined && !(least + kept <= most - kept));
	const isAboveAll = /^(oxygen|carbon-monoxide)-/.test(quantity) && most !== undefined && !(most - kept > 0);
	return isEmpty || isAboveAll ? [{ kind: 'guard-leaves-nothing', path, limit: id }] : [];
}

type Bound = { readonly name: string; readonly side: 'atMost' | 'atLeast'; readonly value: number };

/** Every bound of one point: the unit's limits that apply to it, and the fuel's maximum at the mill outlet. */
function boundsOf(tag: string, { limits, fuel }: Plant): readonly Bound[] {
	const ofLimits = limits
		.filter(({ appliesTo = [] }) => appliesTo.includes(tag))
		.flatMap((limit) =>
			(['atMost', 'atLeast'] as const).map((side) => ({
				name: limit.id,
				side,
				value: isQuantityName(limit.quantity) ? valueOf(limit[side], limit.quantity) : undefined,
			})),
		);
	const ofFuel = {
		name: 'fuel.maximumOutletTemperature',
		side: 'atMost' as const,
		value: fuel.outletPoint === tag ? valueOf(fuel.maximumOutletTemperature, 'temperature') : undefined,
	};
	return [...ofLimits, ofFuel].flatMap(({ value, ...bound }) => (value === undefined ? [] : [{ ...bound, value }]));
}

function checkBetween(path: string, point: string, bounds: readonly Bound[]): readonly PlantFinding[] {
	const least = bounds.filter(({ side }) => side === 'atLeast').sort((a, b) => b.value - a.value)[0];
	const most = bounds.filter(({ side }) => side === 'atMost').sort((a, b) => a.value - b.value)[0];
	if (least === undefined || most === undefined || least.value < most.value) return [];
	return [{ kind: 'limits-cross', path, point, atLeast: least.name, atMost: most.name }];
}

function valueOf(measure: Measure | undefined, quantity: QuantityName): number | undefined {
	if (measure === undefined) return undefined;
	const read = toSi(measure, quantity);
	return read.ok ? read.value.value : undefined;
}
