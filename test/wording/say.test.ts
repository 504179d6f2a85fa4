import { describe, expect, test } from 'vitest';
import {
	capitalised,
	counted,
	duration,
	LANGUAGES,
	momentsAt,
	speaker,
	speakerOf,
	type Key,
	type Language,
} from '../../src/lib/wording';

const say = speaker('en');

describe('a message', () => {
	test('is said with its facts', () => {
		expect(say('cause.plant event', { what: 'Fan stop', begin: '02:11', end: '02:16' })).toBe(
			'Fan stop 02:11 to 02:16',
		);
	});

	test('that lacks a fact is a mistake of the program, not a sentence with a hole', () => {
		expect(() => say('cause.plant event', { what: 'Fan stop' })).toThrow('begin');
	});

	test('a fact that looks like a placeholder is left as it is', () => {
		expect(say('entries.reason', { reason: 'press {start} twice, pay $1' })).toBe(
			'reason: press {start} twice, pay $1',
		);
	});

	test('is said in the language that is chosen when it is said', () => {
		let chosen: Language = 'en';
		const spoken = speakerOf(() => chosen);
		const both = [spoken('ui.gate', { gate: 2 }), spoken.language];
		chosen = 'de';
		expect([...both, spoken('ui.gate', { gate: 2 }), spoken.language]).toEqual(['Gate 2', 'en', 'Stufe 2', 'de']);
	});

	test('says one and many apart', () => {
		expect(counted(say, 'count.deviation', 'count.deviations', 1)).toBe('1 deviation');
		expect(counted(say, 'count.deviation', 'count.deviations', 0)).toBe('0 deviations');
	});
});

describe('the catalogue', () => {
	const messages = Object.entries(LANGUAGES.en) as [Key, string][];

	test('never says passed alone, safe to enter, gas-tight, or that a plant is inert', () => {
		const forbidden = /(?<!TOTAL-)\bpassed\b|safe to enter|gas-tight|\b(?:is|are|now) inert\b/i;
		// A check of a file may pass; a plant, a purge or a gate does not.
		const ofThePlant = messages.filter(([key]) => !/^ui\.(?:verify|check)\b/.test(key));
		expect(ofThePlant.filter(([, text]) => forbidden.test(text))).toEqual([]);
	});
});

describe('a moment', () => {
	const moments = momentsAt(60, say);

	test('is told by the clock of the plant, whatever offset the tablet wrote', () => {
		expect(moments.full('2026-03-14T21:45:00Z')).toBe('14\u00a0March 2026, 22:45 +01:00');
		expect(moments.full('2026-03-14T23:45:00+02:00')).toBe('14\u00a0March 2026, 22:45 +01:00');
		expect([moments.clock('2026-12-31T23:30:00Z'), moments.day('2026-12-31T23:30:00Z')]).toEqual([
			'00:30',
			'1\u00a0Jan',
		]);
	});

	test.each([
		[5 * 60_000, '5\u00a0min'],
		[400_000, '6\u00a0min 40\u00a0s'],
		[7_500_000, '2\u00a0h 5\u00a0min'],
		[0, '0\u00a0s'],
		[3_600_000, '1\u00a0h'],
	])('%d ms last %s', (milliseconds, said) => {
		expect(duration(milliseconds)).toBe(said);
	});
});

test('a title begins with a capital letter and is otherwise left alone', () => {
	expect([capitalised('purge of FM-1'), capitalised('')]).toEqual(['Purge of FM-1', '']);
});
