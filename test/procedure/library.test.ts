import { describe, expect, test } from 'vitest';
import { ROLES } from '../../src/lib/identity';
import { checkPlant, copyOf, type Plant } from '../../src/lib/plant';
import {
	checkProcedure,
	fieldsOf,
	LIBRARY,
	libraryFor,
	parseProcedure,
	type Procedure,
	type Step,
} from '../../src/lib/procedure';
import { demoPlant } from '../support/demo-files';

const procedure = LIBRARY['inert-start-up']!;
const byId = new Map(procedure.steps.map((step) => [step.id, step]));
const required = (startType: string): readonly Step[] => {
	const without = procedure.startTypes.find(({ id }) => id === startType)?.without ?? [];
	return procedure.steps.filter(({ id }) => !without.includes(id));
};

/** Every text that a person reads in a procedure, with where it stands. */
function textsOf({
	steps,
	gates,
	plantEvents,
	permissives = [],
	startTypes,
}: Procedure): readonly (readonly [string, string])[] {
	return [
		...steps.flatMap((step) => everyText(step).map((text) => [step.id, text] as const)),
		...[...gates, ...plantEvents, ...permissives, ...startTypes].flatMap((each) =>
			everyText(each).map((text) => [each.title, text] as const),
		),
	];
}

/** What only programs read. */
const NAMES = new Set(
	'id from step field path kind lapsedBy redo waits validity calculator limit condition readings facts'.split(' '),
);
function everyText(value: unknown, name = ''): readonly string[] {
	if (typeof value === 'string') return NAMES.has(name) ? [] : [value];
	if (Array.isArray(value)) return value.flatMap((item) => everyText(item, name));
	if (typeof value !== 'object' || value === null) return [];
	return Object.entries(value).flatMap(([key, item]) => (NAMES.has(key) ? [] : everyText(item, key)));
}

describe('every procedure of the library', () => {
	test.each(Object.entries(LIBRARY))('%s has no mistake against the demonstration unit', (_, each) => {
		const plant = demoPlant();
		expect(checkPlant(plant)).toEqual([]);
		expect(checkProcedure(each, { roles: ROLES, plant })).toEqual([]);
	});

	test.each(Object.entries(LIBRARY))('%s is the same after it was written as JSON and read back', (_, each) => {
		expect(parseProcedure(JSON.parse(JSON.stringify(each)))).toEqual({ ok: true, value: each });
	});

	test.each(Object.entries(LIBRARY))('%s claims nothing that readings cannot show', (_, each) => {
		const claims =
			/\bsafe(ly|ty)?\b|gas.?tight|\b(CO|carbon monoxide) (is )?steady|(?<!self-)\binert(?! gas|ed by itself| start)\b/i;
		expect(textsOf(each).filter(([, text]) => claims.test(text))).toEqual([]);
	});

	test.each(Object.entries(LIBRARY))('%s says with every step what to do and why', (_, each) => {
		const silent = each.steps.filter(
			({ does, why, minutes }) => does === undefined || why === undefined || minutes <= 0,
		);
		expect(silent.map(({ id }) => id)).toEqual([]);
	});

	test.each(Object.entries(LIBRARY))('%s gives a source for every demand that has no limit of its own', (_, each) => {
		const sourceless = each.steps.filter(
			(step) =>
				step.source === undefined &&
				step.kind !== 'calculation' &&
				!fieldsOf(step).some(({ limit }) => limit !== undefined),
		);
		expect(sourceless.map(({ id }) => id)).toEqual([]);
	});
});

describe('the inert start-up', () => {
	test('has between 75 and 95 steps for a first start, and far fewer after a trip', () => {
		expect(required('first-start').length).toBeGreaterThanOrEqual(75);
		expect(required('first-start').length).toBeLessThanOrEqual(95);
		expect(required('after-trip').length).toBeLessThan(50);
	});

	test('uses every kind of step', () => {
		expect(new Set(procedure.steps.map(({ kind }) => kind)).size).toBe(13);
	});

	test('works through its gates in order', () => {
		const gates = procedure.steps.map(({ gate }) => gate);
		expect(gates).toEqual([...gates].sort((a, b) => a - b));
	});

	test('[P35] asks in every start type whether fuel burns inside, and no age ever closes that', () => {
		const block = procedure.steps.filter(({ group }) => group === 'Fuel inside');
		expect(block).toHaveLength(4);
		for (const { id: startType } of procedure.startTypes) {
			const ids = required(startType).map(({ id }) => id);
			expect(ids).toEqual(expect.arrayContaining(block.map(({ id }) => id)));
		}
		for (const step of block) {
			expect(step.validity).toEqual({ kind: 'once' });
			expect(step.lapsedBy).toContain('trip-with-fuel');
		}
	});

	test('[P35] does not take temperature or carbon monoxide for an answer to it', () => {
		const burning = byId.get('0.11');
		const options = burning?.kind === 'choice' ? burning.options : [];
		expect(options.find(({ id }) => id === 'trend')?.passes).toBe(false);
		expect(options.find(({ id }) => id === 'late')?.passes).toBe(false);
	});

	test('lets no fan run before that is answered', () => {
		expect(byId.get('2.14')?.waits).toContain('0.11');
	});

	test('shows the danger of asphyxiation on every step that lets inert gas flow or opens what holds it', () => {
		const inerting = ['1.13', '2.9', '2.12', '2.13', '2.18', '2.21', '2.24', '6.5'];
		const silent = inerting.filter((id) => byId.get(id)?.cautions?.includes('asphyxiation') !== true);
		expect(silent).toEqual([]);
	});

	test('lapses everything from Gate 1 on when an explosion vent or the suppression has operated', () => {
		const left = procedure.steps.filter(({ gate, lapsedBy }) => gate >= 1 && !lapsedBy.includes('protection-operated'));
		expect(left.map(({ id }) => id)).toEqual([]);
	});

	test.each([
		['fan-stop', ['2.15', '2.20', '2.21', '2.25', '2.26', '2.27', '3.6', '4.3', '4.11', '5.2', '5.5', '6.6']],
		['burner-air', ['2.21', '2.25', '2.26', '4.6', '5.2', '6.6']],
		['burner-trip', ['4.1', '4.2', '4.3', '6.6']],
		['feed-stop', ['6.5', '6.6', '6.9', '6.10']],
		['trip-with-fuel', ['0.10', '0.11', '3.2', '3.4', '5.2']],
		['opened', ['0.1', '1.2', '1.3', '1.10', '2.20', '2.21', '2.25', '2.27', '4.9']],
		['inert-loss', ['2.9', '2.10', '2.12', '2.21', '2.25', '7.3']],
		['inerting-operated', ['1.13', '2.9', '2.11', '2.25', '3.6', '4.11', '7.3']],
		['power-dip', ['0.8', '1.10', '1.11', '1.14', '2.1', '2.5', '5.5']],
		['unburnt-gas', ['2.25', '2.26', '4.1', '4.4', '5.2', '6.6']],
		['fuel-changed', ['0.5', '4.9', '5.2', '5.4', '6.7']],
	])('%s lapses at least %j', (event, ids) => {
		const lapsed = procedure.steps
			.filter(({ lapsedBy }) => lapsedBy.some((by) => (typeof by === 'string' ? by : by.event) === event))
			.map(({ id }) => id);
		expect(lapsed).toEqual(expect.arrayContaining(ids));
	});

	test('asks for 20 to 30 steps again after a fan stop with its burner trip in front of the feed', () => {
		const lapsed = closure(['fan-stop', 'burner-trip']).filter((id) => (byId.get(id)?.gate ?? 9) <= 5);
		expect(lapsed.length).toBeGreaterThanOrEqual(20);
		expect(lapsed.length).toBeLessThanOrEqual(30);
	});

	test('a fault of one analyser lapses its own check and no other', () => {
		const named = procedure.steps.filter(({ lapsedBy }) =>
			lapsedBy.some((by) => typeof by !== 'string' && by.event === 'fault' && by.item === 'AT-211'),
		);
		expect(named.map(({ id }) => id)).toEqual(['2.1']);
	});
});

/** The steps that these events lapse, with everything that has to be proved again inside them. */
function closure(events: readonly string[]): readonly string[] {
	const lapsed = new Set(
		procedure.steps
			.filter(({ lapsedBy }) => lapsedBy.some((by) => typeof by === 'string' && events.includes(by)))
			.map(({ id }) => id),
	);
	for (let size = 0; size < lapsed.size;) {
		size = lapsed.size;
		for (const { id, redo } of procedure.steps) if (redo.some((on) => lapsed.has(on))) lapsed.add(id);
	}
	return [...lapsed];
}

test('every step from the opening of the way out to the end of the purge says that the gas asphyxiates', () => {
	const steps = LIBRARY['inert-start-up']?.steps.filter(({ id }) => /^2\.(1[3-9]|2\d)$/.test(id)) ?? [];
	expect(steps).toHaveLength(15);
	expect(steps.filter(({ cautions }) => cautions?.includes('asphyxiation') !== true).map(({ id }) => id)).toEqual([]);
});

describe('a site that begins with the built-in procedure', () => {
	const plant = demoPlant();
	const own = copyOf(plant, { unit: 'OWN-1', site: 'our works', title: 'our mill', utcOffsetMinutes: 60 });
	const withTarget = (atMost: string, guard?: string): Plant => ({
		...own,
		limits: own.limits.map((limit) => {
			if (limit.id !== 'purge-oxygen') return limit;
			const { guard: _guard, ...rest } = limit;
			const kept = guard === undefined ? {} : { guard: { value: guard, unit: '%' } };
			return { ...rest, ...kept, atMost: { value: atMost, unit: '%' } };
		}),
	});

	test.each([
		['8.0', '0.3', '7.7'],
		['6,5', '0.2', '6.3'],
		['7.25', undefined, '7.25'],
	])('reads every place against its own purge target: %s less guard %s is %s', (atMost, guard, limit) => {
		const [procedure] = libraryFor(withTarget(atMost, guard));
		expect(procedure?.permissives?.map(({ condition }) => /o2 <= ([\d.]+)/.exec(condition)?.[1])).toEqual([
			limit,
			limit,
		]);
		expect(checkProcedure(procedure!, { plant: own, roles: ROLES }).map(({ kind }) => kind)).toEqual([]);
	});

	test('is no demonstration any more, and the demonstration keeps its own', () => {
		expect(libraryFor(own)[0]?.demonstration).toBeUndefined();
		expect(libraryFor(plant)).toEqual([procedure]);
	});
});
