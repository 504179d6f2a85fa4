import { describe, expect, test } from 'vitest';
import { itemsWithValues, objectionToValue, valuesOf, withValues, type PlantValue } from '../../src/lib/plant';
import { demoPlant } from '../support/demo-files';

const plant = demoPlant();
const of = (item: string, path: string): PlantValue => valuesOf(plant, item).find((value) => value.path === path)!;

test('every item of the demonstration unit has values, each with its name', () => {
	const items = itemsWithValues(plant);
	expect(items).toContain('volumes/HG-21');
	expect(items.filter((item) => valuesOf(plant, item).length === 0)).toEqual([]);
});

test('an item shows what a person replaces, not how the plant is built', () => {
	expect(valuesOf(plant, 'volumes/HG-21')).toEqual([
		{ path: 'title', name: 'title', of: 'value', written: 'Hot gas generator casing', reads: 'text' },
		{ path: 'volume/value', name: 'volume', of: 'value', written: '26', reads: 'number', unit: 'm3' },
		{ path: 'volume/U', name: 'volume', of: 'U', written: '1.0', reads: 'number', unit: 'm3' },
	]);
	expect(of('points/AT-211', 'range/to')).toMatchObject({ reads: 'number', unit: '%' });
});

test('a value replaced as typed stands in the description, and nothing else changed', () => {
	const after = withValues(plant, 'volumes/HG-21', { 'volume/value': '31,5' });
	expect(after.volumes[0]).toEqual({ ...plant.volumes[0], volume: { value: '31,5', unit: 'm3', U: '1.0' } });
	expect({ ...after, volumes: plant.volumes }).toEqual(plant);
	const range = withValues(plant, 'points/AT-211', { 'range/to': '30' }).points.find(
		({ tag }) => tag === 'AT-211',
	)?.range;
	expect(range).toEqual({ from: 0, to: 30 });
});

describe('a value is not taken', () => {
	test.each([
		['volumes/HG-21', 'volume/value', '', 'empty'],
		['volumes/HG-21', 'volume/value', 'about 30', 'no number'],
		['volumes/HG-21', 'volume/value', '31,5', undefined],
		['instruments/AT-211', 'due', '2027-02-30', 'no day'],
		['instruments/AT-211', 'due', '2027-02-28', undefined],
		['instruments/AT-211', 'serial', 'DEMO-260137', 'still the demonstration'],
		['instruments/AT-211', 'serial', 'K 4711', undefined],
		['limits/oil-temperature', 'source/text', 'hazard study of the demonstration unit', 'still the demonstration'],
		['limits/oil-temperature', 'source/text', 'supplier, sheet 12 rev C', undefined],
	] as const)('%s %s typed as "%s": %s', (item, path, typed, objection) => {
		expect(objectionToValue(of(item, path), typed)).toBe(objection);
	});

	test('when its source is the demonstration and its words are left as they are', () => {
		const invented = plant.limits.find(({ source }) => source.kind === 'demonstration' && !/demo/i.test(source.text))!;
		const value = of(`limits/${invented.id}`, 'source/text');
		expect(objectionToValue(value, value.written)).toBe('still the demonstration');
	});
});
