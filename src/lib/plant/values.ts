import { parseNumber } from '../quantity';
import { isDay } from './calibration';
import type { Plant } from './schema';

export type ValueName = (typeof VALUE_NAMES)[number];

/** One value of an item that a person of the site can replace: where it stands, as written, and what it must read as. */
export type PlantValue = {
	/** Inside its item: `volume/value`, `source/text`. */
	readonly path: string;
	/** What it is called: `volume`, `range/from`. */
	readonly name: ValueName;
	/** Whether it is the value or its expanded uncertainty. */
	readonly of: 'value' | 'U';
	readonly written: string;
	readonly reads: 'number' | 'day' | 'text';
	readonly unit?: string;
	/** Its source is the demonstration itself: it is replaced, or it stays one. */
	readonly isInvented?: true;
};

/** Names and references between items, and where things are drawn: the build of the plant, not its values. */
const BUILD = new Set(
	(
		'id tag sketch tap side at from to medium outline deadLeg walls points duct instrument appliesTo basis quantity unit ' +
		'kind variant gas meter calibrated outletPoint point enteredBy'
	).split(' '),
);

/** Every value of an item, in the order in which it is written. An item that the description has not has none. */
export function valuesOf(plant: Plant, item: string): readonly PlantValue[] {
	const found = itemAt(plant, item);
	if (typeof found !== 'object' || found === null) return [];
	const unit = unitOf(found);
	return within(found, [], item).map((value) =>
		value.name.startsWith('range/') && unit !== undefined ? { ...value, unit } : value,
	);
}

function within(object: object, path: readonly string[], item: string): readonly PlantValue[] {
	const unit = unitOf(object);
	return Object.entries(object).flatMap(([key, value]: [string, unknown]): readonly PlantValue[] => {
		const here = [...path, key];
		// Ends of a range are values, ends of a duct are not.
		if (BUILD.has(key) && path.at(-1) !== 'range') return [];
		if (typeof value === 'object' && value !== null && !Array.isArray(value)) return within(value, here, item);
		if (typeof value !== 'string' && typeof value !== 'number') return [];
		const isMeasure = key === 'value' || key === 'U';
		const name = nameFrom(isMeasure ? path.join('/') || item : here.join('/'));
		return [
			{
				path: here.join('/'),
				name,
				of: key === 'U' ? 'U' : 'value',
				written: String(value),
				reads: isMeasure || typeof value === 'number' ? 'number' : DAYS.has(key) ? 'day' : 'text',
				...(isMeasure && unit !== undefined ? { unit } : {}),
				...('kind' in object && object.kind === 'demonstration' ? { isInvented: true as const } : {}),
			},
		];
	});
}

function nameFrom(text: string): ValueName {
	const name = VALUE_NAMES.find((each) => each === text);
	if (name === undefined) throw new TypeError(`a value without a name: ${text}`);
	return name;
}

const DAYS = new Set(['due', 'date']);

const unitOf = (object: object): string | undefined =>
	'unit' in object && typeof object.unit === 'string' ? object.unit : undefined;

function itemAt(plant: Plant, item: string): unknown {
	const [list = '', name] = item.split('/');
	const found: unknown = Object.hasOwn(plant, list) ? plant[list as keyof Plant] : undefined;
	if (name === undefined) return found;
	return Array.isArray(found)
		? found.find((each: { readonly id?: string; readonly tag?: string }) => each.id === name || each.tag === name)
		: undefined;
}

/** The description with values of one item replaced, as typed, by their paths inside it. */
export function withValues(plant: Plant, item: string, typed: { readonly [path: string]: string }): Plant {
	const copy = structuredClone<Plant>(plant);
	const found = itemAt(copy, item);
	for (const [path, text] of Object.entries(typed)) put(found, path.split('/'), text);
	return copy;
}

function put(here: unknown, [key, ...rest]: readonly string[], text: string): void {
	if (key === undefined || typeof here !== 'object' || here === null || !Object.hasOwn(here, key)) return;
	const fields = here as Record<string, unknown>;
	if (rest.length > 0) return put(fields[key], rest, text);
	// What is written as a number stays one; what does not read as one was objected to before.
	fields[key] = typeof fields[key] === 'number' ? numberFrom(text, fields[key]) : text.trim();
}

function numberFrom(text: string, before: number): number {
	const number = parseNumber(text);
	return number.ok ? number.value : before;
}

export type ValueObjection = 'empty' | 'no number' | 'no day' | 'still the demonstration';

/** Why a value cannot be taken as one of this unit. */
export function objectionToValue(value: PlantValue, typed: string): ValueObjection | undefined {
	const text = typed.trim();
	if (text === '') return 'empty';
	if (value.reads === 'number') return parseNumber(text).ok ? undefined : 'no number';
	if (value.reads === 'day' && !(/^\d{4}-\d\d-\d\d$/.test(text) && isDay(text))) return 'no day';
	if (value.isInvented === true && text === value.written) return 'still the demonstration';
	return /\bdemo/i.test(text) || /\binvented\b/i.test(text) ? 'still the demonstration' : undefined;
}

/** What values are called, all of them: a new field of the description needs its name here, and its words. */
const VALUE_NAMES = [
	'altitude',
	'filterCleaningCycle',
	'circuitGasFlow',
	'inertGasFlow',
	'minimumVolumeChanges',
	'outlet',
	'title',
	'limitingOxygen/value',
	'limitingOxygen/inertGas',
	'limitingOxygen/particleSize',
	'limitingOxygen/igniter',
	'limitingOxygen/temperature',
	'limitingOxygen/report',
	'limitingOxygen/date',
	'moisture/feed',
	'moisture/product',
	'feedRate',
	'maximumOutletTemperature',
	'volume',
	'diameter',
	'length',
	'range/from',
	'range/to',
	'resolution',
	'uncertainty',
	'principle',
	'lag',
	't90',
	'pipeDiameter',
	'throatDiameter',
	'expansion',
	'span',
	'drawing',
	'certificate',
	'oxygen',
	'stock/content',
	'stock/reserve',
	'stock/minimumPressure',
	'serial',
	'accuracy',
	'due',
	'atMost',
	'atLeast',
	'guard',
	'source/text',
	'source/edition',
] as const;
