import { expect, test } from 'vitest';
import { barLimit, fieldVerdict } from '../../src/lib/ui/step/field-limit';
import { demoPlant } from '../support/demo-files';

const plant = demoPlant();
const oxygen = {
	id: 'AT-213',
	title: 'Oxygen, filter hopper',
	point: 'AT-213',
	quantity: 'oxygen-wet',
	unit: '%',
	limit: {
		atMost: { value: '8.0', unit: '%' },
		guard: { value: '0.3', unit: '%' },
		source: { kind: 'demonstration', text: 'invented' },
	},
} as const;

test('the bar shows limit and guard in the unit of the field', () => {
	expect(barLimit(oxygen.limit, 'oxygen-wet', '%', plant)).toEqual({ atMost: 8, guard: 0.3 });
});

test.each([
	['7.7', 'stands'],
	['7,7', 'stands'],
	['7.8', 'outside'],
	['', 'empty'],
	['7.7.1', 'unreadable'],
])('a reading of "%s" against 8.0 less 0.3: %s', (typed, kind) => {
	expect(fieldVerdict('2.22', oxygen, typed, plant).kind).toBe(kind);
});

test('a field without a limit keeps its value and judges nothing', () => {
	const { limit: _limit, ...free } = oxygen;
	expect(fieldVerdict('2.22', free, '21', plant)).toEqual({ kind: 'no limit' });
});
