import { describe, expect, test } from 'vitest';
import type { GateSheet } from '../../src/lib/record';
import { declarationOf, releaseStatement, restate, sealStatement, speaker } from '../../src/lib/wording';

const SHEET: GateSheet = {
	gate: 2,
	title: 'Purged and analysed',
	holdPoint: 'heating',
	state: 'ready',
	list: [],
	counts: { steps: 28, stand: 27, 'not applicable': 1 },
	openDeviations: ['D-1', 'D-2'],
	eventsSince: [
		{ event: '1', what: 'fan-stop', begin: '2026-03-14T21:10:00+01:00', end: '2026-03-14T21:16:00+01:00' },
		{ event: '2', what: 'opened', item: 'door D-3', begin: '2026-03-14T21:40:00+01:00', end: null },
	] as unknown as GateSheet['eventsSince'],
	findingsSince: [{ instrument: 'A-17', error: '-0.6 %' }, { instrument: 'A-18' }],
	late: [],
	refusal: { reason: 'AT-213 not trusted' },
	others: [
		{ device: 'T-2', number: 41, head: 'K7QM3F', lastHeard: '2026-03-14T22:01:00+01:00' },
		{ device: 'T-3', number: 0, head: null, lastHeard: null },
	],
	clock: 'not agreed',
	missing: [],
	newestMinutes: 6,
	oldestMinutes: 1325,
};

const TITLES: { readonly [what: string]: string } = { 'fan-stop': 'Process-gas fan stopped', opened: 'Opened' };
const words = { local: (instant: string) => instant.slice(11, 16), event: (what: string) => TITLES[what] ?? what };

// Records that are signed hold these sentences: they never change.
test('the English sentences of version 1 are those that records hold', () => {
	expect(releaseStatement(SHEET, 'released', { say: speaker('en'), ...words })).toBe(
		[
			'Gate 2, Purged and analysed: released. This lets heating happen.',
			'Of 28 steps under it 27 stand as listed, 1 agreed not applicable; the newest was observed 6 min before, the oldest 22 h 5 min.',
			'Plant events since the last act on this gate: Process-gas fan stopped 21:10 to 21:16; Opened (door D-3) 21:40 to not ended.',
			'A-17 was found bad (as found -0.6 %); what rested on it was proved again.',
			'A-18 was found bad; what rested on it was proved again.',
			'Refused before: "AT-213 not trusted". Answer: "none".',
			'Open deviations that do not block this gate: D-1, D-2.',
			'Tablet T-2 was last heard at 22:01 (number 41, head K7QM3F); its later entries are not covered.',
			'Tablet T-3 was last heard never (number 0, head unknown); its later entries are not covered.',
			'Clock not agreed: ages are judged by the last agreed time.',
			'This is a statement about what was recorded. It is no permission to enter, and replaces no permit, interlock or gas test.',
		].join(' '),
	);
	expect(declarationOf(speaker('en'))).toBe(
		'I know of no fan stop, opening, loss of inert gas, burner trip, feed stop or power dip other than those listed.',
	);
	expect(sealStatement('FM-2/1', speaker('en'))).toBe(
		'The record of FM-2/1 is closed. It takes no more entries, only addenda. Sealing says that the record is complete as far as this tablet knows; it does not say that readings, clocks or people were right.',
	);
});

test('the German sentences of version 1 are those that records hold', () => {
	expect(releaseStatement(SHEET, 'released', { say: speaker('de'), ...words })).toBe(
		[
			'Stufe 2, Purged and analysed: freigegeben. Das lässt geschehen: heating.',
			'Unter ihr stehen 28 Schritte, wie aufgeführt gelten 27, 1 entfallen mit Zustimmung; der neueste wurde 6 min zuvor gesehen, der älteste 22 h 5 min.',
			'Anlagenereignisse seit der letzten Handlung an dieser Stufe: Process-gas fan stopped 21:10 bis 21:16; Opened (door D-3) ab 21:40, nicht beendet.',
			'A-17 wurde schlecht vorgefunden (vor Justierung -0.6 %); was darauf beruhte, wurde neu nachgewiesen.',
			'A-18 wurde schlecht vorgefunden; was darauf beruhte, wurde neu nachgewiesen.',
			'Zuvor verweigert: „AT-213 not trusted“. Antwort: „keine“.',
			'Offene Abweichungen, die diese Stufe nicht sperren: D-1, D-2.',
			'Tablet T-2 wurde zuletzt um 22:01 gehört (Nummer 41, Stand K7QM3F); seine späteren Einträge sind nicht erfasst.',
			'Tablet T-3 wurde nie gehört (Nummer 0, Stand unbekannt); seine späteren Einträge sind nicht erfasst.',
			'Uhr nicht abgeglichen: Alter wird nach der letzten abgeglichenen Zeit beurteilt.',
			'Dies ist eine Aussage über das Aufgezeichnete. Sie ist keine Erlaubnis zum Einstieg und ersetzt weder Erlaubnisschein noch Verriegelung noch Gasmessung.',
		].join(' '),
	);
});

describe('a stored statement is said again', () => {
	test.each(['en', 'de'] as const)('in %s, its own language', (language) => {
		const said = { language, textVersion: `statement-${language}/1` };
		const again = restate(said, { sheet: SHEET, meaning: 'accepted', event: words.event });
		expect(again).toEqual({
			text: releaseStatement(SHEET, 'accepted', { say: speaker(language), ...words }),
			declaration: declarationOf(speaker(language)),
		});
		expect(restate(said, { startUp: 'FM-2/1' })?.text).toBe(sealStatement('FM-2/1', speaker(language)));
	});

	test('and not at all in a language or version that is not spoken here', () => {
		expect(restate({ language: 'fi', textVersion: 'statement-fi/1' }, { startUp: 'X' })).toBeUndefined();
		expect(restate({ language: 'de', textVersion: 'statement-en/1' }, { startUp: 'X' })).toBeUndefined();
	});
});
