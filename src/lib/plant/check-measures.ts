import { isQuantityName, toSi, unitsFor, quantitiesIn, type Measure, type QuantityName } from '../quantity';
import { isDay } from './calibration';
import { differenceOf } from './difference';
import type { PlantFinding } from './finding';
import type { Plant } from './schema';

/** Every value reads as the quantity that it must be; every point says quantity, unit and basis that go together. */
export function checkMeasures(plant: Plant): readonly PlantFinding[] {
	return [
		...measuresOf(plant).flatMap(([path, measure, quantity]) => checkMeasure(path, measure, quantity)),
		...plant.points.flatMap((point, i) => checkPoint(`points[${i}]`, point)),
		...plant.limits.flatMap((limit, i) => checkQuantity(`limits[${i}]`, limit)),
		...plant.venturis.flatMap((venturi, i) => checkThroat(`venturis[${i}]`, venturi)),
		...plant.instruments.flatMap(({ due }, i) =>
			isDay(due) ? [] : [{ kind: 'no-such-day' as const, path: `instruments[${i}].due`, day: due }],
		),
	];
}

type Typed = readonly [path: string, measure: Measure | undefined, quantity: QuantityName];

const measuresOf = (plant: Plant): readonly Typed[] => [
	['altitude', plant.altitude, 'length'],
	['purge.filterCleaningCycle', plant.purge?.filterCleaningCycle, 'time'],
	['purge.circuitGasFlow', plant.purge?.circuitGasFlow, 'volume-flow'],
	['purge.inertGasFlow', plant.purge?.inertGasFlow, 'volume-flow-normal-wet'],
	...plant.volumes.map(({ volume }, i): Typed => [`volumes[${i}].volume`, volume, 'volume']),
	...plant.ducts.flatMap(({ diameter, length }, i): readonly Typed[] => [
		[`ducts[${i}].diameter`, diameter, 'length'],
		[`ducts[${i}].length`, length, 'length'],
	]),
	...plant.points.flatMap(({ lag, t90, resolution, uncertainty, quantity }, i): readonly Typed[] => [
		[`points[${i}].lag`, lag, 'time'],
		[`points[${i}].t90`, t90, 'time'],
		...(isQuantityName(quantity)
			? ([
					[`points[${i}].resolution`, resolution, differenceOf(quantity)],
					[`points[${i}].uncertainty`, uncertainty, differenceOf(quantity)],
				] as const)
			: []),
	]),
	...plant.venturis.flatMap(({ pipeDiameter, throatDiameter, span }, i): readonly Typed[] => [
		[`venturis[${i}].pipeDiameter`, pipeDiameter, 'length'],
		[`venturis[${i}].throatDiameter`, throatDiameter, 'length'],
		[`venturis[${i}].span`, span, 'pressure-difference'],
	]),
	...plant.inertSources.flatMap(({ oxygen, stock }, i): readonly Typed[] => [
		[`inertSources[${i}].oxygen`, oxygen, 'oxygen-wet'],
		[`inertSources[${i}].stock.content`, stock.content, 'volume-normal'],
		[`inertSources[${i}].stock.reserve`, stock.reserve, 'volume-normal'],
		[`inertSources[${i}].stock.minimumPressure`, stock.minimumPressure, 'pressure-gauge'],
	]),
	['fuel.feedRate', plant.fuel.feedRate, 'mass-flow'],
	['fuel.moisture.feed', plant.fuel.moisture?.feed, 'fraction'],
	['fuel.moisture.product', plant.fuel.moisture?.product, 'fraction'],
	['fuel.maximumOutletTemperature', plant.fuel.maximumOutletTemperature, 'temperature'],
	...limitMeasures(plant),
];

const limitMeasures = (plant: Plant): readonly Typed[] => [
	...(plant.fuel.limitingOxygen === undefined
		? []
		: [
				[
					'fuel.limitingOxygen.value',
					plant.fuel.limitingOxygen.value,
					`oxygen-${plant.fuel.limitingOxygen.basis}`,
				] as const,
			]),
	...plant.limits.flatMap(({ quantity, atMost, atLeast, guard }, i): readonly Typed[] =>
		isQuantityName(quantity)
			? [
					[`limits[${i}].atMost`, atMost, quantity],
					[`limits[${i}].atLeast`, atLeast, quantity],
					[`limits[${i}].guard`, guard, differenceOf(quantity)],
				]
			: [],
	),
];

function checkMeasure(path: string, measure: Measure | undefined, quantity: QuantityName): readonly PlantFinding[] {
	if (measure === undefined) return [];
	const read = toSi(measure, quantity);
	return read.ok ? [] : [{ kind: 'bad-value', path, error: read.error }];
}

function checkPoint(path: string, point: Plant['points'][number]): readonly PlantFinding[] {
	const { quantity, unit, range } = point;
	const reversed: readonly PlantFinding[] =
		range.from < range.to ? [] : [{ kind: 'range-reversed', path: `${path}.range`, ...range }];
	const findings = [...checkQuantity(path, point), ...reversed];
	if (!isQuantityName(quantity) || quantitiesIn(unit).includes(quantity)) return findings;
	return [...findings, { kind: 'unknown-unit', path: `${path}.unit`, unit, quantity, known: unitsFor(quantity) }];
}

/** Oxygen and carbon monoxide have no meaning without their basis; nothing may claim a basis other than its quantity's. */
function checkQuantity(
	path: string,
	{ quantity, basis }: Pick<Plant['points'][number], 'quantity' | 'basis'>,
): readonly PlantFinding[] {
	if (!isQuantityName(quantity)) return [{ kind: 'unknown-quantity', path: `${path}.quantity`, quantity }];
	const own = /-(wet|dry)$/.exec(quantity)?.[1];
	const isConcentration = /^(oxygen|carbon-monoxide)-/.test(quantity);
	const agrees = basis === undefined ? !isConcentration : basis === own;
	return agrees ? [] : [{ kind: 'basis-disagrees', path: `${path}.basis`, quantity, basis: basis ?? 'none' }];
}

function checkThroat(path: string, venturi: Plant['venturis'][number]): readonly PlantFinding[] {
	const throat = toSi(venturi.throatDiameter, 'length');
	const pipe = toSi(venturi.pipeDiameter, 'length');
	if (!throat.ok || !pipe.ok || throat.value.value < pipe.value.value) return [];
	const said = ({ value, unit }: Measure): string => `${value} ${unit}`;
	return [
		{
			kind: 'throat-not-smaller',
			path: `${path}.throatDiameter`,
			throat: said(venturi.throatDiameter),
			pipe: said(venturi.pipeDiameter),
		},
	];
}
