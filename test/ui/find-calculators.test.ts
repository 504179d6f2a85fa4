import { expect, test } from 'vitest';
import { CATALOGUE } from '../../src/lib/calc';
import { findCalculators } from '../../src/lib/ui';

const all = Object.values(CATALOGUE);
const found = (question: string): readonly string[] => findCalculators(all, question).map(({ id }) => id);

test('a calculator is found by what one wants to know, in the words of the plant', () => {
	expect(found('how long must we purge')).toContain('sweep-purge');
	expect(found('nitrogen stock')).toContain('sweep-purge');
	expect(found('dew point')).toContain('dew-point-clearance');
	expect(found('is the filter wet')).toContain('dew-point-clearance');
	expect(found('Venturi')).toEqual(['venturi-flow']);
	expect(found('')).toEqual(all.map(({ id }) => id));
	expect(found('cooking recipe')).toEqual([]);
});
