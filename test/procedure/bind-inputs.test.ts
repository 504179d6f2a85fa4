import { describe, expect, test } from 'vitest';
import { runCalculator } from '../../src/lib/calc';
import { bindInputs, LIBRARY, type Lookup } from '../../src/lib/procedure';
import { demoPlant } from '../support/demo-files';
import { COVERAGE, purgeLookup } from '../support/purge-lookup';

const procedure = LIBRARY['inert-start-up']!;
const plant = demoPlant();

const calculation = (id: string) => {
	const step = procedure.steps.find((each) => each.id === id);
	if (step?.kind !== 'calculation') throw new Error(`${id} is no calculation`);
	return step;
};

const bound = (id: string, changes: Partial<Lookup> = {}) =>
	bindInputs(calculation(id), { procedure, plant, lookup: purgeLookup(changes) });

function run(id: string, changes: Partial<Lookup> = {}) {
	const inputs = bound(id, changes);
	if (!inputs.ok) throw new Error(JSON.stringify(inputs.error));
	const result = runCalculator(calculation(id).calculator, inputs.value);
	if (!result.ok) throw new Error(JSON.stringify(result.error));
	return result.value;
}

describe('[P24] every calculation of the library runs on what is known', () => {
	test('a purge that went well is judged adequate on its bound inputs', () => {
		expect(run('2.25').verdict).toEqual({ word: 'adequate', reasons: [] });
	});

	test('a volume without an answer in the coverage table cannot be shown, and is named', () => {
		const { verdict } = run('2.25', { rows: () => COVERAGE.filter(({ row }) => row !== 'by-pass') });
		expect(verdict?.word).toBe('cannot be shown');
		expect(verdict?.reasons).toMatchObject([{ kind: 'not-covered', volume: 'BY-21', deadLeg: true }]);
	});

	test('an outlet reading whose basis nobody knows is no reading', () => {
		const rows = COVERAGE.map((row) => {
			if (row.reading === undefined || row.row !== 'fan') return row;
			const { basis: _, ...reading } = row.reading;
			return { ...row, reading };
		});
		expect(run('2.25', { rows: () => rows }).verdict?.reasons).toMatchObject([
			{ kind: 'outlet-not-read', volume: 'RD-21' },
		]);
	});

	test('an analyser whose check has lapsed cannot show anything', () => {
		const standing = (step: string) => (step === '2.3' ? ('does not stand' as const) : ('stands' as const));
		expect(run('2.25', { standing }).verdict).toMatchObject({
			word: 'cannot be shown',
			reasons: [{ kind: 'check-does-not-stand', place: 'AT-213' }],
		});
	});

	test('an analyser that nobody said to be measuring cannot show anything', () => {
		const { reading } = purgeLookup();
		const silent: Lookup['reading'] = (step, field) => {
			const found = reading(step, field);
			if (found === undefined || step !== '2.22' || field !== 'AT-214') return found;
			const { mode: _, ...rest } = found;
			return rest;
		};
		expect(run('2.25', { reading: silent }).verdict?.reasons).toMatchObject([
			{ kind: 'not-measuring', place: 'AT-214', mode: 'not known' },
		]);
	});

	test('filter cleaning that was never seen running asks for more, not for a wrong answer', () => {
		const { observed } = purgeLookup();
		const never: Lookup['observed'] = (step) => (step === '2.17' ? undefined : observed(step));
		expect(run('2.25', { observed: never }).verdict).toMatchObject({
			word: 'not yet',
			reasons: [{ kind: 'cleaning-not-running' }],
		});
	});

	test('the in-leakage of that purge is bound to its suction', () => {
		const { values, notes } = run('2.27');
		// 889 m3(n)/h of nitrogen with 0.1 % oxygen against a floor of 4.21 %: 889 (4.21 - 0.1)/(20.95 - 4.21) = 218 m3(n)/h.
		expect(Math.round(((values.inLeakage?.value ?? 0) * 3600) / 5)).toBe(Math.round(218 / 5));
		expect(notes).toContainEqual(
			expect.objectContaining({ kind: 'in-leakage', suction: [{ tag: 'PT-202', at: 'ML-21', pressure: -310 }] }),
		);
	});

	test.each(['2.15', '2.16'])('the Venturi of step %s is inside its standard, with an uncertainty', (id) => {
		const { scope, values } = run(id);
		expect(scope).toBe('in scope');
		expect(values.volumeFlow?.U).toBeGreaterThan(0);
	});

	test.each(['4.9', '5.4'])('the dew-point clearance of step %s rests on the three named walls', (id) => {
		expect(run(id).verdict?.word).toBe('adequate');
		expect(run(id).notes).toContainEqual(
			expect.objectContaining({ kind: 'coldest-surface', name: 'Silo cone', of: 3 }),
		);
	});

	test('the stock is planned against the smaller margin only while the oxygen trip stands proved', () => {
		const kinds = (changes: Partial<Lookup>) => run('2.10', changes).notes.map(({ kind }) => kind);
		expect(kinds({})).not.toContain('above-allowed-oxygen');
		expect(kinds({ standing: () => 'not known' })).toContain('above-allowed-oxygen');
	});
});

describe('[P25] what is missing is named', () => {
	test('a reading that nobody has taken is named with its step and field', () => {
		const { reading } = purgeLookup();
		const without: Lookup['reading'] = (step, field) => (field === 'TT-201' ? undefined : reading(step, field));
		expect(bound('2.25', { reading: without })).toEqual({
			ok: false,
			error: [
				{
					kind: 'missing-input',
					input: 'temperature',
					binding: { from: 'field', step: '2.14', field: 'TT-201' },
				},
			],
		});
	});

	test('a purge without its series misses everything that is counted from its zero', () => {
		const inputs = bound('2.25', { series: () => undefined });
		const missing = inputs.ok ? [] : inputs.error.map(({ input }) => input);
		expect(missing).toEqual(['begins', 'series', 'coverage', 'outlet.seen.from', 'outlet.seen.to']);
	});

	test('an air reading that was not taken is left out, because the purge can show it in another way', () => {
		const { reading } = purgeLookup();
		const inputs = bound('2.25', { reading: (step, field) => (field === 'air' ? undefined : reading(step, field)) });
		const places = (inputs.ok ? inputs.value.places : []) as readonly object[];
		expect(places).toHaveLength(4);
		expect(places.filter((place) => 'airBefore' in place)).toEqual([]);
	});
});

describe('[P26] readings keep what was typed', () => {
	test('a reading carries the uncertainty of its measuring point as a difference in the unit that was typed', () => {
		const inputs = bound('2.15');
		expect(inputs.ok && inputs.value).toMatchObject({
			temperature: { value: '19.5', unit: 'degC', U: 1.5 },
			pressureGauge: { value: '-22', unit: 'mbar(g)', U: 0.5 },
		});
	});

	test('an instrument that has run out of calibration says so to the Venturi', () => {
		const late = Date.UTC(2026, 11, 15, 23);
		expect(bound('2.15', { now: late - 1 })).toMatchObject({ value: { dpCalibration: 'valid' } });
		expect(bound('2.15', { now: late })).toMatchObject({ value: { dpCalibration: 'none' } });
	});
});
