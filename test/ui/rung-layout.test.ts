import { describe, expect, test } from 'vitest';
import { LIBRARY } from '../../src/lib/procedure';
import { openRung } from '../../src/lib/ui/ladder/rung-layout';
import type { ShownContact } from '../../src/lib/ui/ladder/shown-rungs';
import { shownText, speaker, type Language } from '../../src/lib/wording';

const procedure = Object.values(LIBRARY)[0]!;

function linesOf(gate: number, language: Language, width: number): readonly string[] {
	const groups = [...new Set(procedure.steps.filter((step) => step.gate === gate).map(({ group }) => group))];
	const contacts = groups.map((id): ShownContact => {
		const label = shownText(id, speaker(language));
		return { id, label, of: 'group', state: 'not yet', word: '0 von 3', powered: false };
	});
	const rung = {
		gate,
		title: '',
		holdPoint: '',
		contacts,
		coil: 'not ready',
		caption: '',
		arrives: false,
		reached: true,
	};
	return openRung(rung as never, [], width).rows.flatMap((row) => row.contacts.flatMap(({ lines }) => lines));
}

describe.each(['en', 'de'] as const)('names over the contacts of the opened rung, %s', (language) => {
	test.each(procedure.gates.map(({ number }) => number))('gate %d: none is cut off', (gate) => {
		expect(linesOf(gate, language, 700).filter((line) => line.endsWith('…'))).toEqual([]);
	});
});

test('a long German word is divided where it was built', () => {
	expect(linesOf(2, 'de', 700)).toEqual(expect.arrayContaining(['Sauerstoff-', 'überwachung']));
	expect(linesOf(2, 'de', 700).join()).not.toContain('\u00ad');
});
