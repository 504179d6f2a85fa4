import { readFileSync } from 'node:fs';
import * as v from 'valibot';
import { describe, expect, test } from 'vitest';
import { changedPoints, checkPlant, copyOf, itemsWithValues, replacedBy, type Plant } from '../../src/lib/plant';
import { ProcedureSchema } from '../../src/lib/procedure';
import { standing, type Standing } from '../../src/lib/record';
import { clock, Teller } from '../support/night';
import { MINI_PLANT } from '../support/mini-plant';

const procedure = v.parse(
	ProcedureSchema,
	JSON.parse(readFileSync(new URL('../vectors/record/mini-procedure.json', import.meta.url), 'utf8')),
);

const COPY = copyOf(MINI_PLANT, { unit: 'OWN-1', site: 'our works', title: 'our vessel', utcOffsetMinutes: 60 });
const OURS = replacedBy(COPY, itemsWithValues(COPY), 'Lead', '2026-03-14T08:00:00+01:00');

/** Both steps of gate 0 proved, and its release tried. */
function afterGate0(plant: Plant): Standing {
	const teller = new Teller();
	const people = [
		{ person: 'Tech', roles: ['technician'] },
		{ person: 'Sup', roles: ['shift supervisor'] },
	];
	const opened = { procedure: { id: 'MINI', revision: 1 }, people, documents: { plant } };
	teller.say('start-up opened', opened, { person: 'Sup', device: 'T-1', entered: 0 });
	for (const step of ['P1', 'P2'])
		teller.say('entry', { step, outcome: 'pass' }, { person: 'Tech', device: 'T-1', entered: 1 });
	teller.say('gate released', { gate: 0 }, { person: 'Sup', device: 'T-1', entered: 3 });
	return standing(procedure, teller.events, teller.site, clock(4));
}

describe('[ST15] a start-up on a plant description that was begun as a copy', () => {
	test('does not pass its lowest gate while values of the unit copied are left, and names them', () => {
		const found = afterGate0(COPY);
		expect(found.gates.map(({ state }) => state)).toEqual(['not ready', 'not ready', 'not ready']);
		expect(found.gates[0]?.why).toEqual([
			{ kind: 'values to replace', from: 'MINI, nowhere, revision 1', items: ['fuel', 'volumes/V-1', 'points/AT-1'] },
		]);
		expect(found.acts).toMatchObject([{ act: 'released', counted: false }]);
	});

	test('is held by one item that is left', () => {
		const found = afterGate0(replacedBy(COPY, ['fuel', 'volumes/V-1'], 'Lead', '2026-03-14T08:00:00+01:00'));
		expect(found.gates[0]).toMatchObject({ state: 'not ready', why: [{ items: ['points/AT-1'] }] });
	});

	test('passes it when every item was replaced, as a description that never was a copy does', () => {
		expect(afterGate0(OURS).gates[0]?.state).toBe('released');
		expect(afterGate0(MINI_PLANT).gates[0]?.state).toBe('released');
	});
});

test('a copied description keeps who replaced which item, and when', () => {
	expect(OURS.copied).toEqual({
		from: 'MINI, nowhere, revision 1',
		toReplace: [],
		replaced: ['fuel', 'volumes/V-1', 'points/AT-1'].map((item) => ({
			item,
			by: 'Lead',
			at: '2026-03-14T08:00:00+01:00',
		})),
	});
	expect([COPY.unit, COPY.revision, COPY.demonstration]).toEqual(['OWN-1', 1, false]);
});

test('an item that a copied description names and does not have is found', () => {
	const { copied } = COPY;
	if (copied === undefined) throw new Error('a copy says what it was copied from');
	const plant = { ...COPY, copied: { ...copied, toReplace: ['volumes/V-9'] } };
	expect(checkPlant(plant)).toContainEqual({ kind: 'unknown-place', path: 'copied.toReplace[0]', id: 'volumes/V-9' });
});

describe('[ST7] points that a new revision describes anew', () => {
	const limit = {
		id: 'o2',
		title: 'oxygen',
		quantity: 'oxygen-wet',
		basis: 'wet' as const,
		atMost: { value: '8', unit: '%' },
		appliesTo: ['AT-1'],
		source: { kind: 'site' as const, text: 'site' },
	};
	const withLimit = { ...OURS, limits: [limit] };

	test.each<[string, Plant, readonly string[]]>([
		['nothing changed', OURS, []],
		['a volume changed', { ...OURS, volumes: [] }, []],
		[
			'its range changed',
			{ ...OURS, points: OURS.points.map((p) => ({ ...p, range: { from: 0, to: 10 } })) },
			['AT-1'],
		],
		['a limit for it came', withLimit, ['AT-1']],
		['it is gone', { ...OURS, points: [] }, ['AT-1']],
	])('%s', (_, after, changed) => {
		expect(changedPoints(OURS, after)).toEqual(changed);
	});
});
