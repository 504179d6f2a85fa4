import { expect, test } from 'vitest';
import { mixingFactor } from '../../../src/lib/calc/purge/mixing-factor';
import checks from '../../vectors/purge/engineering-checks.json';

// Source: engineering check value A5: V = 500 m³, Q = 100 m³/min, K = 0.7245 from the rate of scipy's fit.
test('the sixteen readings in 500 m³ at 100 m³/min have a mixing factor of 0.7245', () => {
	const { lam_per_min, K_for_V, Q_m3_min, K } = checks.A5_fit;
	expect(mixingFactor(lam_per_min, { V: K_for_V, Q_I: Q_m3_min, Q_L: 0 })).toBeCloseTo(K, 12);
	expect(K.toFixed(4)).toBe('0.7245');
});
