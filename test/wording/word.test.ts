import { expect, test } from 'vitest';
import { momentsAt, sayObjection, sayWord, sayWords, speaker } from '../../src/lib/wording';

const german = speaker('de');

test('a role is said in the language chosen; one that only this site has, as it is written', () => {
	expect(sayWords(['shift supervisor', 'QA', 'mill whisperer'], german)).toBe('Schichtleiter, QS, mill whisperer');
	expect(sayWord('shift supervisor', speaker('en'))).toBe('shift supervisor');
});

test('what the rules object is kept in English and shown in the language chosen', () => {
	expect(sayObjection('TechA performed 2.14', german)).toBe('TechA hat 2.14 durchgeführt');
	expect(sayObjection('the gate was not ready', german)).toBe('die Stufe war: nicht bereit');
	expect(sayObjection("no missing signature of this gate is SupA's to give", german)).toBe(
		'keine fehlende Unterschrift dieser Stufe kann SupA geben',
	);
	expect(sayObjection('something that nobody foresaw', german)).toBe('something that nobody foresaw');
	expect(sayObjection('the gate was held', speaker('en'))).toBe('the gate was held');
});

test('a German date has its point', () => {
	const moments = momentsAt(60, german);
	expect(moments.full('2026-03-14T20:45:00Z')).toBe('14.\u00a0März 2026, 21:45 +01:00');
	expect(moments.short('2026-03-14T20:45:00Z')).toBe('14.\u00a0Mär\u00a021:45');
});
