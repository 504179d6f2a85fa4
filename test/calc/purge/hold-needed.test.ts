import { expect, test } from 'vitest';
import { holdNeeded } from '../../../src/lib/calc/purge/hold-needed';

// By hand: the longest of least, 3 (lag + T90), cycle, 3 V/Q.
test.each([
	[{ least: 300, response: 55, cycle: 240, turn: 47 }, 300, 'least hold'],
	[{ least: 300, response: 120, cycle: 240, turn: 47 }, 360, 'response of the analysers'],
	[{ least: 300, response: 55, cycle: 480, turn: 47 }, 480, 'filter cleaning cycle'],
	[{ least: 300, response: 55, cycle: 240, turn: 200 }, 600, 'turns of the circuit gas'],
	[{ least: 300, response: 55, cycle: 240, turn: null }, 300, 'least hold'],
])('%o: %d s by %s', (rules, needed, rule) => {
	expect(holdNeeded(rules)).toEqual({ needed, rule });
});
