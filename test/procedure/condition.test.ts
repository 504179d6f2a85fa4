import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { evaluatePermissive, readCondition, readingFor, type Permissive } from '../../src/lib/procedure';
import { demoPlant } from '../support/demo-files';

const oxygen = (point: string) =>
	({ point, quantity: 'oxygen-wet', unit: '%', basis: 'wet', notOlderThanMinutes: 30 }) as const;

const permissive = (condition: string): Permissive => ({
	id: 'low',
	title: 'Oxygen is low everywhere',
	condition,
	readings: { a: oxygen('AT-211'), b: oxygen('AT-212') },
	facts: { fan: { notGoingOn: 'fan-stop' } },
});

const evaluate = (condition: string, a: number, b: number, fan = true) =>
	evaluatePermissive(permissive(condition), { readings: { a, b }, facts: { fan } }).value;

describe('[P29] a condition says about readings what it says in plain words', () => {
	test.each([
		['a <= 7.7 && b <= 7.7 && fan', 7.7, 7.6, 'TRUE'],
		['a <= 7.7 && b <= 7.7 && fan', 7.71, 7.6, 'FALSE'],
		['(a < 8.0 || b < 8.0) && fan', 9, 7, 'TRUE'],
		['!(a >= 8.0) && b < 8 && fan', 7, 7, 'TRUE'],
		['fan ? a < b : a < 5.0', 6, 7, 'TRUE'],
		['[a, b].all(x, x <= 7.7) && fan', 7, 7.8, 'FALSE'],
		['[a, b].exists(x, x > 9) && fan', 7, 9.5, 'TRUE'],
		['-1 < a && a != b && fan', 0, 1, 'TRUE'],
	])('%s with %d and %d is %s', (condition, a, b, value) => {
		expect(evaluate(condition, a, b)).toBe(value);
	});

	test('a fact that does not hold makes it FALSE', () => {
		expect(evaluate('a < 8.0 && b < 8.0 && fan', 7, 7, false)).toBe('FALSE');
	});

	test('a name of JavaScript is no name of the permissive', () => {
		const read = readCondition(permissive('a < 8.0 && b < 8.0 && fan && constructor'));
		expect(read).toMatchObject({ ok: false, error: [{ kind: 'condition-unknown-name', name: 'constructor' }] });
	});
});

describe('[P30] what is not known never opens a gate', () => {
	test.each(['a < 8.0 || b < 8.0 || fan', '!(a >= 8.0) || b < 8.0 || fan', 'fan || a < 8.0 || b < 8.0'])(
		'%s is unknown as soon as one name is, whatever the others say',
		(condition) => {
			expect(
				evaluatePermissive(permissive(condition), {
					readings: { a: { unknown: 'stale' }, b: 3 },
					facts: { fan: true },
				}),
			).toEqual({ value: 'unknown', because: [{ kind: 'reading', name: 'a', point: 'AT-211', why: 'stale' }] });
		},
	);

	test('a reading that is not a number is unknown, and !(a >= 8) does not make it TRUE', () => {
		expect(evaluate('!(a >= 8.0) && b < 8.0 && fan', Number.NaN, 3)).toBe('unknown');
		expect(evaluate('a < 8.0 && b < 8.0 && fan', -Infinity, 3)).toBe('unknown');
	});

	test('a condition that the checker refuses is unknown, and says why', () => {
		expect(evaluatePermissive(permissive('a <'), { readings: { a: 1, b: 1 }, facts: { fan: true } })).toMatchObject({
			value: 'unknown',
			because: [{ kind: 'condition', finding: { kind: 'condition-unreadable', at: 3 } }],
		});
	});

	/** Conditions of every form that the checker takes, over the three names. */
	const { tree } = fc.letrec<{ tree: string }>((tie) => ({
		tree: fc.oneof(
			{ maxDepth: 4 },
			fc.constant('fan'),
			fc
				.tuple(
					fc.constantFrom('a', 'b'),
					fc.constantFrom('<', '<=', '>', '>=', '==', '!='),
					fc.constantFrom('a', 'b', '7', '8.5', '-1.0'),
				)
				.map(([left, operator, right]) => `${left} ${operator} ${right}`),
			fc.constantFrom('[a, b].all(x, x < 8.0)', '[a, b].exists(x, x < 8.0)'),
			fc.tuple(tie('tree'), fc.constantFrom('&&', '||'), tie('tree')).map(([l, op, r]) => `(${l} ${op} ${r})`),
			tie('tree').map((inner) => `!(${inner})`),
			fc.tuple(tie('tree'), tie('tree'), tie('tree')).map(([c, y, n]) => `(${c} ? ${y} : ${n})`),
		),
	}));
	const everyName = tree.map((inner) => `(${inner}) || a < b || fan`);
	const number = fc.double({ min: 0, max: 25, noNaN: true });

	test('no condition of any form is TRUE while one of its names is unknown', () => {
		fc.assert(
			fc.property(everyName, number, fc.constantFrom('a', 'b', 'fan'), (condition, value, missing) => {
				const known = { a: value, b: value, [missing]: undefined };
				const inputs = { readings: known, facts: missing === 'fan' ? {} : { fan: true } };
				return evaluatePermissive(permissive(condition), inputs).value === 'unknown';
			}),
		);
	});

	test('every one of these conditions has an answer once all names are known', () => {
		fc.assert(
			fc.property(everyName, number, number, fc.boolean(), (condition, a, b, fan) => {
				return evaluate(condition, a, b, fan) !== 'unknown';
			}),
		);
	});
});

describe('[P31] a permissive takes a reading only as its measuring point gives it', () => {
	const plant = demoPlant();
	const newest = { typed: '7,6', unit: '%', basis: 'wet', ageMinutes: 12 } as const;

	test('the number is the one that was typed, in the unit of the permissive', () => {
		expect(readingFor(oxygen('AT-211'), newest, plant)).toBe(7.6);
		expect(readingFor({ ...oxygen('AT-211'), unit: 'ppm' }, newest, plant)).toBeCloseTo(76_000, 6);
	});

	test.each([
		['nobody has read the point', undefined, {}, 'missing'],
		['it has just reached its age', { ...newest, ageMinutes: 30 }, {}, 'stale'],
		['nobody knows its age', { ...newest, ageMinutes: Number.NaN }, {}, 'stale'],
		['it was said to be dry', { ...newest, basis: 'dry' }, {}, 'wrong basis'],
		['the permissive asks for dry', newest, { basis: 'dry' }, 'wrong basis'],
		['the permissive asks for a temperature', newest, { quantity: 'temperature' }, 'wrong quantity'],
		['it lies above the range of the analyser', { ...newest, typed: '25.1' }, {}, 'out of range'],
		['it lies below the range of the analyser', { ...newest, typed: '-0.1' }, {}, 'out of range'],
		['it is no number', { ...newest, typed: 'about 7' }, {}, 'not a number'],
		['it could be two numbers', { ...newest, typed: '7,600' }, {}, 'not a number'],
		['it was typed in mbar', { ...newest, unit: 'mbar' }, {}, 'not a number'],
		['the unit has no such point', newest, { point: 'AT-299' }, 'measuring point unknown'],
	] as const)('it is unknown when %s', (_, reading, change, unknown) => {
		expect(readingFor({ ...oxygen('AT-211'), ...change }, reading, plant)).toEqual({ unknown });
	});
});
