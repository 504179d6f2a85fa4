import { toJsonSchema } from '@valibot/to-json-schema';
import { describe, expect, test } from 'vitest';
import { CATALOGUE, latest, runCalculator } from '../../src/lib/calc';
import { isQuantityName, QUANTITIES } from '../../src/lib/quantity';

// Every calculator that was ever released. A line is only ever added: a record that names one must recompute for years.
const RELEASED = [
	'acid-dew-points@1',
	'dew-point-clearance@1',
	'false-air@1',
	'inert-stock@1',
	'loop-check@1',
	'pressure-decay@1',
	'purge-adequacy@1',
	'sweep-purge@1',
	'swing-purge@1',
	'venturi-flow@1',
];

test('a released calculator never vanishes, and a new one is put on the list of this test', () => {
	expect(Object.keys(CATALOGUE).toSorted()).toEqual(RELEASED);
});

test('the newest version of a calculator is found by its name, an unknown one is not', () => {
	expect(latest('venturi-flow')).toBe(CATALOGUE['venturi-flow@1']);
	expect(latest('orifice-flow')).toBeUndefined();
});

test('an unknown calculator or version is refused with those that exist, and so is a name from the prototype', () => {
	for (const calc of ['venturi-flow@2', 'venturi-flow', 'constructor', '__proto__']) {
		expect(runCalculator(calc, {})).toEqual({
			ok: false,
			error: [{ kind: 'unknown-calculator', calc, known: Object.keys(CATALOGUE) }],
		});
	}
});

describe.each(Object.entries(CATALOGUE))('%s', (idAtVersion, calculator) => {
	test('it says of itself what the catalogue calls it', () => {
		expect(`${calculator.id}@${calculator.version}`).toBe(idAtVersion);
		expect(calculator.answers).toMatch(/\?$/);
		expect(calculator.sources.length).toBeGreaterThan(0);
	});

	test('every input of the schema is described, every described input is in the schema, optional where it says so', () => {
		const schema = toJsonSchema(calculator.schema);
		expect(Object.keys(schema.properties ?? {}).toSorted()).toEqual(
			calculator.inputs.map(({ name }) => name).toSorted(),
		);
		const needed = calculator.inputs.filter(({ optional }) => optional !== true).map(({ name }) => name);
		expect([...(schema.required ?? [])].toSorted()).toEqual(needed.toSorted());
		expect(schema.additionalProperties).toBe(false);
	});

	test('every measured input names its quantity and the SI unit a bare number is read in, and what it means', () => {
		for (const input of calculator.inputs) {
			expect(input.means.length, input.name).toBeGreaterThan(5);
			const quantity = input.quantity.replace('list of ', '');
			if (isQuantityName(quantity)) expect(input.unit, input.name).toBe(QUANTITIES[quantity]);
		}
	});

	test('every output has a quantity of the trade and its SI unit, and a name of its own', () => {
		const names = calculator.outputs.map(({ name }) => name);
		expect(new Set(names).size).toBe(names.length);
		for (const { name, quantity, unit } of calculator.outputs) {
			if (isQuantityName(quantity)) expect(unit, name).toBe(QUANTITIES[quantity]);
		}
	});

	test('it is total: nothing, a number, a text and a stranger get refusals, not exceptions', () => {
		for (const inputs of [undefined, null, 5, 'x', [], { stranger: 1 }]) {
			const result = calculator.run(inputs);
			expect(result.ok).toBe(false);
			expect(!result.ok && result.error.length).toBeGreaterThan(0);
		}
	});
});
