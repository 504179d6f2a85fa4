import { describe, expect, test } from 'vitest';
import { judgeValue, type Field } from '../../src/lib/record/judge-value';

describe('a value against its limit', () => {
	const source = { kind: 'demonstration', text: 'invented' } as const;
	const temperature: Field = {
		id: 'outlet',
		title: 'mill outlet',
		quantity: 'temperature',
		unit: 'degC',
		limit: { atLeast: { value: '75', unit: 'degC' }, guard: { value: '2', unit: 'K' }, source },
	};

	test.each([
		['77', 'degC', 'inside'],
		['76,9', 'degC', 'outside'],
		['170.6', 'degF', 'inside'],
		['170.5', 'degF', 'outside'],
		['77', 'mbar', 'cannot tell'],
	])('%s %s at least 75 °C with a guard of 2 K: %s', (typed, unit, kind) => {
		expect(judgeValue({ typed, unit }, temperature, undefined).kind).toBe(kind);
	});

	test('a wet reading does not answer a dry limit; a dry one answers a wet maximum, on the safe side', () => {
		const field = (basis: 'wet' | 'dry'): Field => ({
			id: 'o2',
			title: 'oxygen',
			quantity: `oxygen-${basis}`,
			unit: '%',
			limit: { limit: 'L-O2' },
		});
		const limit = (basis: 'wet' | 'dry') => ({
			id: 'L-O2',
			title: 'O2',
			quantity: `oxygen-${basis}`,
			basis,
			atMost: { value: '8', unit: '%' },
			source,
		});
		const plant = (basis: 'wet' | 'dry') =>
			({ points: [], limits: [limit(basis)] }) as unknown as Parameters<typeof judgeValue>[2];
		const reading = { typed: '7', unit: '%' };
		expect(judgeValue({ ...reading, basis: 'wet' }, field('dry'), plant('dry')).kind).toBe('cannot tell');
		expect(judgeValue({ ...reading, basis: 'dry' }, field('wet'), plant('wet')).kind).toBe('inside');
		expect(judgeValue({ ...reading, typed: '8.1', basis: 'dry' }, field('wet'), plant('wet')).kind).toBe('outside');
	});

	test('a computed value keeps its own uncertainty from the limit where that is larger than the guard', () => {
		const computed = { typed: '350.65', unit: 'K' }; // 77.5 degC
		const uncertain = (U: string) => judgeValue(computed, temperature, undefined, { value: U, unit: 'K' }).kind;
		expect([uncertain('1'), uncertain('2.5'), uncertain('2.6')]).toEqual(['inside', 'inside', 'outside']);
	});

	test('a limit that the plant description does not hold', () => {
		expect(judgeValue({ typed: '1', unit: '%' }, { ...temperature, limit: { limit: 'gone' } }, undefined).kind).toBe(
			'cannot tell',
		);
	});
});
