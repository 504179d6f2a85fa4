import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { calibrationEnds, isInCalibration } from '../../src/lib/plant';

const berlin = { utcOffsetMinutes: 60 };
const due = { due: '2026-07-31' };

describe('a calibration that is due on a day is good until 24:00 plant time of that day', () => {
	// date -u -d '2026-08-01T00:00:00+01:00' +%FT%TZ
	const end = Date.parse('2026-07-31T23:00:00Z');

	test('the last second of the day is in, midnight is not', () => {
		expect(calibrationEnds('2026-07-31', berlin)).toBe(end);
		expect(isInCalibration(due, berlin, end - 1)).toBe(true);
		expect(isInCalibration(due, berlin, end)).toBe(false);
	});

	test('the day is that of the plant, east and west of Greenwich', () => {
		expect(calibrationEnds('2026-07-31', { utcOffsetMinutes: 330 })).toBe(Date.parse('2026-07-31T18:30:00Z'));
		expect(calibrationEnds('2026-07-31', { utcOffsetMinutes: -300 })).toBe(Date.parse('2026-08-01T05:00:00Z'));
	});

	test('the last day of February is a whole day, also in a leap year', () => {
		expect(calibrationEnds('2028-02-29', { utcOffsetMinutes: 0 })).toBe(Date.parse('2028-03-01T00:00:00Z'));
	});

	test('an instrument that was in calibration was so at every earlier instant', () => {
		fc.assert(
			fc.property(
				fc.integer({ min: 0, max: 4e12 }),
				fc.nat(1e12),
				fc.integer({ min: -720, max: 840 }),
				(at, before, offset) => {
					const plant = { utcOffsetMinutes: offset };
					return !isInCalibration(due, plant, at) || isInCalibration(due, plant, at - before);
				},
			),
		);
	});
});
