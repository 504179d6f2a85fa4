import { expect, test } from 'vitest';
import { allowedOxygen } from '../../../src/lib/calc/purge/allowed-oxygen';

// Source: NFPA 69, 7.7.2 (from memory, verify), percent.
test.each([
	{ LOC: 14, oxygen: 'monitored', allowed: '12' },
	{ LOC: 12, oxygen: 'monitored', allowed: '10' },
	{ LOC: 12, oxygen: 'not monitored', allowed: '7.2' },
	{ LOC: 14, oxygen: 'not monitored', allowed: '8.4' },
	{ LOC: 5, oxygen: 'monitored', allowed: '3.0' },
	{ LOC: 4.6, oxygen: 'monitored', allowed: '2.76' },
	{ LOC: 4.6, oxygen: 'not monitored', allowed: '1.84' },
] as const)('limit $LOC %, $oxygen: $allowed % allowed', ({ LOC, oxygen, allowed }) => {
	expect(allowedOxygen(LOC / 100, oxygen) * 100).toBeCloseTo(Number(allowed), 10);
});
