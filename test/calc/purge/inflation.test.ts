import { expect, test } from 'vitest';
import { decayFit } from '../../../src/lib/calc/purge/decay-fit';
import { inflation } from '../../../src/lib/calc/purge/inflation';
import { decayVectors, samplesOf } from './decay-vectors';

// Source: numpy 2.4.6, sum(e[1:] e[:-1]) / sum(e e) of the residuals of scipy's fit (test/reference/purge/make-vectors.py).
test.each(decayVectors)('$name: its residuals count as numpy says', (vector) => {
	const fit = decayFit(samplesOf(vector));
	expect(fit.ok && inflation(fit.value.residuals)).toBeCloseTo(vector.expect.inflation, 4);
});

test('residuals that change sign each time never narrow a bound', () => {
	expect(inflation([1, -1, 1, -1, 1])).toBe(1);
});

test('no residuals at all are independent', () => {
	expect(inflation([0, 0, 0])).toBe(1);
});
