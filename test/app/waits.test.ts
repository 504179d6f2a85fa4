import { beforeAll, describe, expect, test } from 'vitest';
import { logLines, runsOut, waitsFor } from '../../src/lib/app';
import { momentsAt, speaker } from '../../src/lib/wording';
import { toldNight, type At } from '../support/told-night';

const say = speaker('en');
const moments = momentsAt(60, say);
const PEOPLE = {
	TechA: { person: 'TechA', roles: ['technician'] },
	SupA: { person: 'SupA', roles: ['shift supervisor'] },
	SupB: { person: 'SupB', roles: ['shift supervisor'] },
	InstEng: { person: 'InstEng', roles: ['instrument engineer'] },
};

let at: At;
beforeAll(async () => {
	at = await toldNight();
}, 120_000);

const waiting = (moment: string, who: keyof typeof PEOPLE) =>
	waitsFor(at(moment), PEOPLE[who], say, moments).map(({ id }) => id);

describe('what waits for whoever holds the tablet', () => {
	test('a ready gate waits for a supervisor, and not for the technician who proved its steps', () => {
		expect(waiting('2026-03-14T21:42:00+01:00', 'SupA')).toContain('release 2');
		expect(waiting('2026-03-14T21:42:00+01:00', 'TechA')).not.toContain('release 2');
	});

	test('the next step waits for those who may do it', () => {
		expect(waiting('2026-03-14T16:30:00+01:00', 'TechA').some((id) => id.startsWith('step 0.'))).toBe(true);
	});

	test('a refusal waits for a releasing role until it is answered', () => {
		expect(waiting('2026-03-15T02:10:00+01:00', 'SupB')).toContain('refusal 5');
		expect(waiting('2026-03-15T02:10:00+01:00', 'InstEng')).not.toContain('refusal 5');
		expect(waiting('2026-03-15T07:10:00+01:00', 'SupB')).not.toContain('refusal 5');
	});

	test('after the fan stop everybody is told how many proofs are to be shown again', () => {
		expect(waiting('2026-03-15T02:30:00+01:00', 'TechA')).toContain('lapsed');
	});

	test('an open deviation waits for its owner alone', () => {
		expect(waiting('2026-03-14T19:00:00+01:00', 'InstEng')).toContain('D-2');
		expect(waiting('2026-03-14T19:00:00+01:00', 'TechA')).not.toContain('D-2');
	});

	test('nothing waits in a sealed start-up', () => {
		expect(waiting('2026-03-15T11:10:00+01:00', 'SupA')).toEqual([]);
		expect(runsOut(at('2026-03-15T11:10:00+01:00'), say, moments)).toEqual([]);
	});
});

test('what stands but not for ever comes in the order in which it runs out', () => {
	const ends = runsOut(at('2026-03-14T21:22:00+01:00'), say, moments).map(({ end }) => end);
	expect(ends.length).toBeGreaterThan(3);
	expect([...ends].sort((a, b) => a - b)).toEqual(ends);
});

describe('the log in words', () => {
	const lines = (moment: string) => logLines(at(moment), say, moments);

	test('holds every event of the start-up, the newest entered first', () => {
		const told = at('2026-03-15T11:10:00+01:00');
		const ids = new Set(logLines(told, say, moments).map(({ event }) => event));
		expect(told.events.filter(({ id }) => !ids.has(id))).toEqual([]);
	});

	test('says how late a fan stop was entered', () => {
		const stop = lines('2026-03-15T02:30:00+01:00').find(({ what }) => what.startsWith('Process-gas fan stopped'));
		// Seen 02:24, entered 02:24; it began at 02:11.
		expect(stop).toMatchObject({ group: 'plant events', isLate: true });
		expect(stop?.late).toContain('13\u00a0min late');
	});

	test('keeps what the rules did not allow: the release of Gate 1 by who performed its steps', () => {
		const refused = lines('2026-03-14T18:46:00+01:00').find(({ what }) => what.startsWith('Not allowed, release'));
		expect(refused).toMatchObject({ group: 'gate acts', gate: 1, tablet: 'T-1' });
	});
});
