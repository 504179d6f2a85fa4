import { describe, expect, test } from 'vitest';
import type { CalcNote } from '../../src/lib/calc';
import { LANGUAGES, momentsAt, purgeSentence, sayNote, sayNumber, speaker } from '../../src/lib/wording';
import { readTree } from '../architecture/tree';
import { purgeInputs, run } from '../calc/purge/purge-scene';

const say = speaker('en');
const clock = { zero: '2026-03-14T20:40:00+01:00', moments: momentsAt(60, say) };

describe('a note of a calculator', () => {
	test('is a sentence with its facts in the units of the plant', () => {
		const note: CalcNote = {
			kind: 'above-line',
			level: 'reason',
			criterion: 'b',
			place: 'AT-213',
			count: 7,
			accept: 0.077,
			oxygen: 0.0948,
			t: 2040,
			last: 0.0831,
		};
		expect(sayNote(note, say, clock)).toBe(
			'(b) AT-213: 7 readings of the hold above 7.7\u00a0%, the worst 9.48\u00a0% at 21:14, the last 8.31\u00a0%.',
		);
	});

	test('tells a moment in seconds where the clock of the series is not known', () => {
		const note: CalcNote = {
			kind: 'gap-in-readings',
			level: 'reason',
			place: 'AT-213',
			from: 600,
			to: 900,
			longest: 120,
		};
		expect(sayNote(note, say)).toBe('AT-213: no reading from 600\u00a0s to 900\u00a0s; at most 2\u00a0min is allowed.');
	});

	test('that the catalogue does not know is said by its name and facts: nothing is lost', () => {
		const note: CalcNote = { kind: 'throat-changed-twice', level: 'warning', byHowMuch: 0.002, parts: ['a', 'b'] };
		expect(sayNote(note, say, clock)).toBe('Throat changed twice: by how much 0.002, parts a, b.');
	});

	test('that lacks a fact of its sentence is said plainly', () => {
		expect(sayNote({ kind: 'slowest-place', level: 'remark' }, say, clock)).toBe('Slowest place.');
	});
});

/** Names of curves and marks of plots, of dew points, of fits that are said inside another note, of inverse formulas. */
const NO_NOTES = new Set(
	[
		'limit guard window event points band line steps dew none frost',
		'rate-of-the-analyser too-few-samples too-coarse no-curvature not-falling flow-beyond-meter no-throat-fits',
	].flatMap((names) => names.split(' ')),
);

test('everything a calculator notes or refuses has its sentence', () => {
	const kinds = [...readTree('src/lib/calc')].flatMap(([, text]) =>
		[...text.matchAll(/kind: '([a-z-]+)'/g)].map(([, kind = '']) => kind),
	);
	const known = (kind: string): boolean =>
		['note', 'refusal', 'quantity'].some((head) => Object.hasOwn(LANGUAGES.en, `${head}.${kind}`));
	expect([...new Set(kinds)].filter((kind) => !known(kind) && !NO_NOTES.has(kind))).toEqual([]);
	expect(kinds.length).toBeGreaterThan(50);
});

describe('the sentence of an adequate purge', () => {
	const result = run({ ...purgeInputs({}, 60), zero: clock.zero });

	test('says since when, at how many measured places, against which line, for how long, and that it is no permission', () => {
		const sentence = purgeSentence(result, say, clock)!;
		expect(sentence).toMatch(
			/^Readings adequate since \d\d:\d\d: at all 4 measured places at or below 7\.7\u00a0% moist \(limit 8\u00a0%, guard 0\.3\) for /,
		);
		expect(sentence).toContain('volumes without analyser: bypass, chute.');
		expect(sentence).toMatch(/Slowest: Filter hopper\. Not a permission\.$/);
	});

	test('is not said of a purge that is not adequate', () => {
		expect(purgeSentence(run(purgeInputs({ minutes: 40 }, 60)), say, clock)).toBeUndefined();
	});
});

test.each([
	[16050.4, '16\u00a0050'],
	[-3.14159, '−3.142'],
	[0.00012345, '1.234e−4'],
	[1234.5, '1235'],
	[0, '0'],
])('%d is shown as %s', (value, shown) => {
	expect(sayNumber(value, say)).toBe(shown);
});

test.each([
	[16050.4, '16\u00a0050'],
	[-3.14159, '−3,142'],
	[0.00012345, '1,234e−4'],
	[7.7, '7,7'],
])('in German %d is shown as %s', (value, shown) => {
	expect(sayNumber(value, speaker('de'))).toBe(shown);
});

test('a note in German has its words, its decimal commas and its moments', () => {
	const note: CalcNote = {
		kind: 'above-line',
		level: 'reason',
		place: 'AT-213',
		count: 7,
		accept: 0.077,
		oxygen: 0.0948,
		t: 2040,
		last: 0.0831,
	};
	const german = speaker('de');
	expect(sayNote(note, german, { zero: clock.zero, moments: momentsAt(60, german) })).toBe(
		'AT-213: 7 Messwerte der Haltezeit über 7,7\u00a0%, der schlechteste 9,48\u00a0% um 21:14, der letzte 8,31\u00a0%.',
	);
});

test('the sentence of an adequate purge in German has decimal commas throughout', () => {
	const german = speaker('de');
	const result = run({ ...purgeInputs({}, 60), zero: clock.zero });
	expect(purgeSentence(result, german, { zero: clock.zero, moments: momentsAt(60, german) })).toMatch(
		/an allen 4 gemessenen Stellen bei oder unter 7,7\u00a0% feucht \(Grenzwert 8\u00a0%, Schutzband 0,3\) über .+ Keine Erlaubnis\.$/,
	);
});
