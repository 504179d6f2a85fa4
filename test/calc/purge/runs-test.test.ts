import { expect, test } from 'vitest';
import { decayFit } from '../../../src/lib/calc/purge/decay-fit';
import { runsTest } from '../../../src/lib/calc/purge/runs-test';
import { decayVectors, samplesOf } from './decay-vectors';

// Source: statsmodels 0.15.0, runstest_1samp(residuals, cutoff=0, correction=False).
test.each(decayVectors)('$name: its residuals make as many runs as statsmodels says', (vector) => {
	const fit = decayFit(samplesOf(vector));
	expect(fit.ok && runsTest(fit.value.residuals).z).toBeCloseTo(vector.expect['runs z'], 6);
});

test('residuals of one sign say nothing', () => {
	expect(runsTest([0.1, 0.2, 0.3])).toEqual({ runs: 1, z: null });
});
