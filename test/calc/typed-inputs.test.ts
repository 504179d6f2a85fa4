import { expect, test } from 'vitest';
import { CATALOGUE, inputsFrom, rowsTyped, runCalculator, typedFrom, usualUnit } from '../../src/lib/calc';

const venturi = CATALOGUE['venturi-flow@1']!;
const sweep = CATALOGUE['sweep-purge@1']!;

test('a number goes to the calculator as it was typed, with its unit and uncertainty; what is empty is left out', () => {
	const typed = {
		type: { text: 'machined' },
		dp: { text: '4,65', unit: 'mbar', U: '0,05' },
		pipeDiameter: { text: ' ', unit: 'm' },
		dpSeries: { text: '460; 465,5', unit: 'Pa' },
	};
	expect(inputsFrom(venturi, typed)).toEqual({
		type: 'machined',
		dp: { value: '4,65', unit: 'mbar', U: '0,05' },
		dpSeries: [
			{ value: '460', unit: 'Pa' },
			{ value: '465,5', unit: 'Pa' },
		],
	});
});

test('rows of a table and parts of an input are read from their places, in the order of the rows', () => {
	const typed = {
		'volumes[0].id': { text: 'MILL' },
		'volumes[0].title': { text: 'Mill' },
		'volumes[0].volume': { text: '60', unit: 'm3' },
		'volumes[1].id': { text: 'BYP' },
		'volumes[1].deadLeg': { text: 'yes' },
		'leak.flow': { text: '300', unit: 'm3(n)/h' },
		outlet: { text: 'Vent' },
	};
	expect(rowsTyped('volumes', typed)).toBe(2);
	expect(inputsFrom(sweep, typed)).toEqual({
		volumes: [
			{ id: 'MILL', title: 'Mill', volume: { value: '60', unit: 'm3' }, deadLeg: false },
			{ id: 'BYP', deadLeg: true },
		],
		leak: { flow: { value: '300', unit: 'm3(n)/h' } },
		outlet: 'Vent',
	});
});

test('a unit that nobody chose is the one the trade uses; a factor is no percentage', () => {
	expect(usualUnit({ quantity: 'temperature' })).toBe('degC');
	expect(usualUnit({ quantity: 'oxygen-wet' })).toBe('%');
	expect(usualUnit({ quantity: 'fraction' })).toBe('1');
	expect(usualUnit({ quantity: 'fraction', typedIn: '%' })).toBe('%');
});

test.each(Object.entries(CATALOGUE).filter(([, { page }]) => page.example !== undefined))(
	'the example of %s gives a result, and the fields it fills give the same inputs again',
	(idAtVersion, calculator) => {
		const example = calculator.page.example!;
		const result = runCalculator(idAtVersion, inputsFrom(calculator, typedFrom(calculator, example)));
		expect(result.ok ? [] : result.error).toEqual([]);
		const again = runCalculator(idAtVersion, example);
		expect(result.ok && again.ok && result.value.values).toEqual(again.ok && again.value.values);
	},
);

test.each(Object.entries(CATALOGUE))(
	'the page of %s names inputs that exist, and says what it assumes',
	(_, { inputs, page }) => {
		const names = inputs.map(({ name }) => name);
		for (const name of page.first) expect(names).toContain(name);
		expect(page.explains.length).toBeGreaterThan(0);
	},
);
