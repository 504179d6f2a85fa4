import { describe, expect, test } from 'vitest';
import { parseJson } from '../../src/lib/base';
import { runCalculator, type Refusal } from '../../src/lib/calc';
import { readShape, PlantSchema, type PlantFinding } from '../../src/lib/plant';
import { checkProcedure, type ProcedureFinding } from '../../src/lib/procedure';
import { toSi } from '../../src/lib/quantity';
import { parseEvents, parseTrend } from '../../src/lib/record';
import {
	sayEventError,
	sayJsonError,
	sayPlantFinding,
	sayProcedureFinding,
	sayQuantityError,
	sayRefusal,
	sayShapeError,
	sayTrendError,
	speaker,
} from '../../src/lib/wording';
import { PURGE_INPUTS, SMALL_PROCEDURE } from '../support/small-procedure';

const say = speaker('en');
const error = <E>(result: { readonly ok: boolean; readonly error?: E }): E => {
	if (result.error === undefined) throw new Error('the test expects a refusal');
	return result.error;
};

describe('what came from outside and is wrong is said with its place', () => {
	test.each([
		['{"a":1,"a":2}', 'at character 7, the name "a" stands twice in one object'],
		['{"a":', 'at character 5, a value was expected'],
		['[1e999]', 'at character 1, 1e999 is larger than any number that can be kept'],
		['{"__proto__":1}', 'at character 1, the name "__proto__" is not allowed'],
	])('JSON %s', (text, said) => {
		expect(sayJsonError(error(parseJson(text)), say)).toBe(said);
	});

	test.each([
		['{"v":1,"kind":"entry"}', 'Line 1, log: '],
		['{"v":7,"kind":"entry"}', 'Line 1: version 7 of an event is not known here'],
		['\n\nnot json', 'Line 3 is no JSON at character '],
		['{"text":"{ }"}', 'Line 1: its text is not in the canonical form that is hashed and signed'],
	])('event %j', (text, said) => {
		expect(sayEventError(error(parseEvents(text)), say)).toContain(said);
	});

	test.each([
		['-0.2', 'bar(a)', 'pressure-absolute', '-0.2 bar(a) is below a perfect vacuum'],
		['1,234', 'mbar(g)', 'pressure-gauge', '"1,234" can be read as 1.234, 1234: write it so that it means one number'],
		['7.4', 'bar(g)', 'pressure-absolute', 'bar(g) is a unit of pressure-gauge; pressure-absolute is asked for'],
		['-300', 'degC', 'temperature', '-300 degC is not above absolute zero'],
		['7.4', 'furlong', 'length', '"furlong" is no unit of length; known are m, mm, cm, um, in'],
	] as const)('%s %s as %s', (value, unit, quantity, said) => {
		expect(sayQuantityError(error(toSi({ value, unit }, quantity)), say)).toBe(said);
	});

	test('a trend that is cut off inside a line', () => {
		const trend = 'time;AT-212 [%]\n2026-05-14 08:00:00;7,4\n2026-05-14 08:01:00';
		expect(sayTrendError(error(parseTrend(trend, 120)), say)).toBe('Line 3 has 1 cells; the heading has 2');
	});

	test('a plant description without what it must have', () => {
		const [first] = error(readShape(PlantSchema, { format: 'gatehold-plant/1' }));
		expect(sayShapeError(first!, say)).toMatch(/^unit: .+ was expected, .+ stands there$/);
	});
});

describe('calculators', () => {
	const refused = (change: object): readonly string[] =>
		error(runCalculator('sweep-purge@1', JSON.parse(JSON.stringify({ ...PURGE_INPUTS, ...change })))).map((refusal) =>
			sayRefusal(refusal, say),
		);

	test('say which input is wrong, and how it would be right', () => {
		expect(refused({ pressure: { value: -5, unit: 'kPa(a)' } })).toEqual([
			'pressure: -5 kPa(a) is below a perfect vacuum',
		]);
		expect(refused({ pressur: 5 })).toEqual(['pressur: there is no such input']);
		expect(refused({ temperature: { value: '20', unit: 'bar' } })).toEqual([
			'temperature: bar is a unit of pressure-difference; temperature is asked for',
		]);
		expect(refused({ outlet: undefined })).toEqual(['outlet: it is missing']);
	});

	test('that say something of their own lose nothing of it', () => {
		const own: Refusal = { kind: 'three-corners', input: 'duct', corners: 3, tags: ['FT-1', 'FT-2'] };
		expect(sayRefusal(own, say)).toBe('duct: Three corners: corners 3, tags FT-1, FT-2.');
		expect(sayRefusal({ kind: 'out-of-range', input: 'x' }, say)).toBe('x: Out of range.');
	});

	test('a calculator that does not exist', () => {
		const [refusal] = error(runCalculator('crystal-ball@1', {}));
		expect(sayRefusal(refusal!, say)).toMatch(/^there is no calculator crystal-ball@1; known are .*sweep-purge@1/);
	});
});

test('a procedure with a circle says through which steps it goes', () => {
	const [l1, ...rest] = SMALL_PROCEDURE.steps;
	const circle = {
		...SMALL_PROCEDURE,
		steps: [{ ...l1!, redo: ['K1'] }, { ...rest[0]!, waits: ['L1'] }, ...rest.slice(1)],
	};
	const roles = ['shift supervisor', 'commissioning lead', 'technician', 'instrument engineer'];
	const said = checkProcedure(circle, { roles }).map((finding) => sayProcedureFinding(finding, say));
	expect(said.filter((line) => line.includes('circle'))).toEqual([
		expect.stringMatching(
			/^steps\[0\].*\(step L1\): a circle: L1 → K1 → L1\. None of these steps could ever be proved first$/,
		),
	]);
});

const place = { path: 'steps[3].x', step: 'S4' };

// One of each kind: a sentence with a hole would throw.
const FINDINGS: readonly ProcedureFinding[] = [
	{ ...place, kind: 'duplicate-id', id: 'S4', first: 'steps[0].id' },
	{ ...place, kind: 'gate-out-of-order', number: 3, expected: 2 },
	{ ...place, kind: 'gate-without-steps', gate: 2 },
	{ ...place, kind: 'relies-on-higher-gate', on: 'S9', gate: 2, higher: 3 },
	{ ...place, kind: 'until-below-own-gate', until: 1, gate: 2 },
	{ ...place, kind: 'age-without-until', ageMinutes: 30 },
	{ ...place, kind: 'until-without-age', until: 4 },
	{ ...place, kind: 'watch-on-another-kind', stepKind: 'confirm' },
	{ ...place, kind: 'watch-step-without-watch', validity: 'once' },
	{ ...place, kind: 'unknown-quantity', quantity: 'mood' },
	{ ...place, kind: 'unknown-unit', unit: 'm', quantity: 'time', known: ['s', 'min'] },
	{ ...place, kind: 'basis-disagrees', quantity: 'oxygen-dry', basis: 'wet' },
	{ ...place, kind: 'field-disagrees-with-point', point: 'AT-1', what: 'basis', field: 'wet', ofPoint: 'dry' },
	{ ...place, kind: 'limit-of-another-quantity', limit: 'L', quantity: 'time', ofLimit: 'mass' },
	{ ...place, kind: 'limit-without-source' },
	{ ...place, kind: 'limit-without-side' },
	{ ...place, kind: 'bad-value', value: '7 %', quantity: 'time', because: 'wrong-quantity' },
	{ ...place, kind: 'reads-nothing' },
	{ ...place, kind: 'required-not-a-choice', required: 'ajar', choices: ['open', 'shut'] },
	{ ...place, kind: 'no-option-passes' },
	{ ...place, kind: 'volume-without-row', volume: 'filter' },
	{ ...place, kind: 'unknown-input', calculator: 'c@1', input: 'x', known: ['y'] },
	{ ...place, kind: 'input-not-bound', calculator: 'c@1', input: 'x' },
	{ ...place, kind: 'unknown-output', calculator: 'c@1', output: 'x', known: ['y'] },
	{ ...place, kind: 'output-of-another-quantity', output: 'x', quantity: 'time', ofOutput: 'mass' },
	{ ...place, kind: 'binding-to-another-kind', from: 'series', stepKind: 'confirm' },
	{ ...place, kind: 'unknown-plant-path', plantPath: 'venturis/X', stopsAt: 'X' },
	{ ...place, kind: 'limit-lacks-side', limit: 'L', side: 'atMost' },
	{ ...place, kind: 'bound-to-higher-gate', to: 'S9', gate: 2, higher: 3 },
	{ ...place, kind: 'reading-disagrees-with-point', name: 'o2', point: 'AT-1', ofPoint: 'oxygen-dry' },
	{ ...place, kind: 'condition', finding: { kind: 'condition-unknown-name', at: 4, name: 'x', known: ['o2'] } },
	{ ...place, kind: 'oxygen-limit-above-allowed', limit: 'L', allowed: '7 %', limitingOxygen: '12 %' },
	{ ...place, kind: 'unknown-plant-event', name: 'rain', known: ['fan-stop'] },
	{ ...place, kind: 'unknown-step', name: 'S99' },
];

test.each(FINDINGS.map((finding) => [finding.kind, finding] as const))('procedure: %s', (_kind, finding) => {
	expect(sayProcedureFinding(finding, say)).toMatch(/^steps\[3\]\.x \(step S4\): [^{}]+$/);
});

const PLANT_FINDINGS: readonly PlantFinding[] = [
	{ path: 'p', kind: 'duplicate-id', id: 'x', first: 'q' },
	{ path: 'p', kind: 'unknown-place', id: 'x' },
	{ path: 'p', kind: 'unknown-point', tag: 'x' },
	{ path: 'p', kind: 'unknown-duct', id: 'x' },
	{ path: 'p', kind: 'unknown-instrument', id: 'x' },
	{ path: 'p', kind: 'instrument-of-another-point', instrument: 'x', point: 'y' },
	{ path: 'p', kind: 'not-an-inert-gas-meter', tag: 'x', medium: 'process gas' },
	{ path: 'p', kind: 'unconnected-volume', id: 'x' },
	{ path: 'p', kind: 'unknown-quantity', quantity: 'x' },
	{ path: 'p', kind: 'unknown-unit', unit: 'x', quantity: 'time', known: ['s'] },
	{ path: 'p', kind: 'bad-value', error: { kind: 'below-vacuum', value: -1, unit: 'Pa(a)' } },
	{ path: 'p', kind: 'basis-disagrees', quantity: 'time', basis: 'wet' },
	{ path: 'p', kind: 'range-reversed', from: 2, to: 1 },
	{ path: 'p', kind: 'throat-not-smaller', throat: '2 m', pipe: '1 m' },
	{ path: 'p', kind: 'no-such-day', day: '2026-02-31' },
	{ path: 'p', kind: 'limit-without-side', limit: 'x' },
	{ path: 'p', kind: 'guard-leaves-nothing', limit: 'x' },
	{ path: 'p', kind: 'limits-cross', point: 'x', atLeast: '2', atMost: '1' },
	{ path: 'p', kind: 'no-fuel-report' },
];

test.each(PLANT_FINDINGS.map((finding) => [finding.kind, finding] as const))('plant: %s', (_kind, finding) => {
	expect(sayPlantFinding(finding, say)).toMatch(/^p: [^{}]+$/);
});
