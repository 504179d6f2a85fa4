import { expect, test } from 'vitest';
import { GERMAN, LIBRARY, type Procedure } from '../../src/lib/procedure';
import { shownIn, shownText, speaker } from '../../src/lib/wording';

const [english, german] = [speaker('en'), speaker('de')];
const procedure: Procedure = Object.values(LIBRARY)[0]!;

/** Every text of a procedure that people read, by walking its fields; identifiers and sources are none. */
const READ = new Set(
	'title holdPoint group does why text documents shows showsFirst withFeedOn otherwise inertedBy party required choices'.split(
		' ',
	),
);
function textsOf(value: unknown, name: string): readonly string[] {
	if (typeof value === 'string') return READ.has(name) ? [value] : [];
	if (Array.isArray(value)) return value.flatMap((item) => textsOf(item, name));
	if (typeof value !== 'object' || value === null) return [];
	return Object.entries(value).flatMap(([key, part]) => (key === 'source' ? [] : textsOf(part, key)));
}

const TEXTS = [...new Set(textsOf(procedure, ''))];

test('every text of the built-in procedure that people read has a German one, and no German is left over', () => {
	expect(TEXTS.length).toBeGreaterThan(500);
	expect(TEXTS.filter((text) => !Object.hasOwn(GERMAN, text))).toEqual([]);
	expect(Object.keys(GERMAN).filter((text) => !TEXTS.includes(text))).toEqual([]);
});

test('a German text keeps every tag, limit and time of the English one', () => {
	const facts = (text: string) =>
		(text.match(/[A-Z]{2}-\d+|\d+(?:[.,]\d+)?/g) ?? []).map((fact) => fact.replace(',', '.')).sort();
	expect(Object.entries(GERMAN).filter(([said, meant]) => facts(said).join() !== facts(meant).join())).toEqual([]);
});

test('a procedure is shown in German with its ids, groups, positions and documents as they are recorded', () => {
	const shown = shownIn(procedure, german);
	expect(shown.gates[2]).toMatchObject({
		number: 2,
		title: 'Gespült und analysiert',
		holdPoint: 'die erste Bewegung der Mühle',
	});
	const keep = ({ id, group, kind, gate }: Procedure['steps'][number]) => [id, group, kind, gate];
	expect(shown.steps.map(keep)).toEqual(procedure.steps.map(keep));
	const lineUp = (of: Procedure) =>
		of.steps.flatMap((step) =>
			step.kind === 'line-up' ? step.rows.map(({ required, choices }) => [required, choices]) : [],
		);
	expect(lineUp(shown)).toEqual(lineUp(procedure));
	expect(shownIn(procedure, english)).toBe(procedure);
});

test('words that nobody has translated are shown as they are written', () => {
	expect(shownText('shut and bolted', german)).toBe('zu und verschraubt');
	expect(shownText('shut, bolted', german)).toBe('shut, bolted');
	expect(shownText('shut and bolted', english)).toBe('shut and bolted');
});
