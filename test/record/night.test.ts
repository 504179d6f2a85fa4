import { describe, expect, test } from 'vitest';
import { standing } from '../../src/lib/record';
import { clock, minutesOf, NIGHT, NIGHT_PROCEDURE, tellNight } from '../support/night';
import { statesOf } from '../support/states';

// Expected states: an independent simulator of rules ST1-ST11, whose answers are kept in
// test/vectors/record/start-up-night.json (see SOURCE.md there). Never our own output.
const night = tellNight();

describe('the start-up night, row by row', () => {
	test.each(NIGHT.expected.map((row) => [row.no, row.at, row.text, row] as const))(
		'row %s, %s: %s',
		(_no, _at, _text, row) => {
			const minutes = minutesOf(row.at);
			const { gates, lapsed, failed, waits, reproof, minutes: work } = row;
			const tablet = minutes >= 780 ? 'T-2' : 'T-1';
			const found = standing(NIGHT_PROCEDURE, night.events, night.site, clock(minutes), tablet);
			expect(statesOf(found)).toEqual({ gates, lapsed, failed, waits, reproof, minutes: work });
		},
	);
});
