import { expect, test } from 'vitest';
import { moistened, normalised, readComposition } from '../../../src/lib/calc/gas/composition';

test('fractions, percent and ppm are read as what they say, with their uncertainty', () => {
	const typed = { N2: 0.62, CO2: { value: '10', unit: '%', U: '0,2' }, O2: { value: 80_000, unit: 'ppm' }, H2O: 0.2 };
	expect(readComposition(typed, 'composition')).toEqual({
		ok: true,
		value: { N2: { value: 0.62 }, CO2: { value: 0.1, U: 0.002 }, O2: { value: 0.08 }, H2O: { value: 0.2 } },
	});
});

test('percent typed as bare numbers is refused as such, not scaled away', () => {
	expect(readComposition({ N2: 62, CO2: 10, O2: 8, H2O: 20 }, 'composition')).toEqual({
		ok: false,
		error: [{ kind: 'percent-for-fraction', input: 'composition', sum: 100 }],
	});
});

test('one value in percent among fractions is refused by its own name: oxygen "8" where 0.08 was meant', () => {
	expect(readComposition({ N2: 0.62, CO2: 0.1, O2: 8, H2O: 0.2 }, 'composition')).toMatchObject({
		ok: false,
		error: [{ kind: 'out-of-range', input: 'composition.O2', value: 8, max: 1 }],
	});
});

test('oxygen "0.08" typed as percent leaves a gap in the sum, and the sum is refused', () => {
	const typed = {
		N2: { value: 62, unit: '%' },
		CO2: { value: 10, unit: '%' },
		O2: { value: 0.08, unit: '%' },
		H2O: 0.2,
	};
	expect(readComposition(typed, 'composition')).toMatchObject({
		ok: false,
		error: [{ kind: 'fractions-do-not-add-up', input: 'composition', tolerance: 0.005 }],
	});
});

test('a sum of 0.994 is refused; a sum of 0.996 is closed in proportion, and the result says so', () => {
	expect(readComposition({ N2: 0.894, O2: 0.1 }, 'x').ok).toBe(false);
	expect(readComposition({ N2: 0.896, O2: 0.1 }, 'x').ok).toBe(true);
	const { x, notes } = normalised({ N2: 0.896, O2: 0.1 });
	expect((x.N2 ?? 0) + (x.O2 ?? 0)).toBeCloseTo(1, 15);
	expect(notes).toEqual([{ kind: 'composition-normalised', level: 'warning', sum: 0.996 }]);
	expect(normalised({ N2: 0.9, O2: 0.1 }).notes).toEqual([]);
});

test('a negative fraction and a NaN are refused', () => {
	expect(readComposition({ N2: 1.02, O2: -0.02 }, 'x')).toMatchObject({
		ok: false,
		error: [{ input: 'x.N2' }, { input: 'x.O2' }],
	});
	expect(readComposition({ N2: Number.NaN }, 'x').ok).toBe(false);
});

test('dry analysis and moisture together give the moist gas', () => {
	expect(moistened({ N2: 0.9, O2: 0.1 }, 0.2)).toEqual({ N2: 0.9 * 0.8, O2: 0.1 * 0.8, H2O: 0.2 });
});
