import { describe, expect, test } from 'vitest';
import { standing, type Standing } from '../../src/lib/record';
import { clock, minutesOf, NIGHT, NIGHT_PROCEDURE, tellNight } from '../support/night';

// Expected states: an independent simulator of rules ST1-ST11, whose answers are kept in
// test/vectors/record/start-up-night.json (see SOURCE.md there). Never our own output.
const night = tellNight();

export const statesOf = (standing: Standing): object => ({
	gates: standing.gates.map(({ state }) => state),
	lapsed: standing.steps.filter(({ state }) => state === 'lapsed').map(({ step }) => step),
	failed: standing.steps.filter(({ state }) => state === 'failed').map(({ step }) => step),
	waits: standing.steps.filter(({ state }) => state === 'waits').map(({ step }) => step),
	reproof: standing.reproof.steps,
	minutes: standing.reproof.minutes,
});

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
