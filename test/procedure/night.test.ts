import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { ROLES } from '../../src/lib/identity';
import { checkProcedure } from '../../src/lib/procedure';
import { demoPlant, nightProcedure } from '../support/demo-files';

/** A row of the table of steps that the night was planned with. */
type Row = {
	readonly id: string;
	readonly gate: number;
	readonly title: string;
	readonly minutes: number;
	readonly age: number | null;
	readonly spent: number | null;
	readonly names: readonly string[];
	readonly redo: readonly string[];
	readonly waits: readonly string[];
	readonly instr: readonly string[];
	readonly watch: boolean;
};
const { steps: rows } = JSON.parse(
	readFileSync(new URL('../vectors/record/start-up-night.json', import.meta.url), 'utf8'),
) as { readonly steps: readonly Row[] };

const procedure = nightProcedure();

describe('the test procedure of the start-up night', () => {
	test('has no mistake against the demonstration unit', () => {
		expect(checkProcedure(procedure, { roles: ROLES, plant: demoPlant() })).toEqual([]);
	});

	test('has the 41 steps of the table, in its order', () => {
		expect(procedure.steps.map(({ id }) => id)).toEqual(rows.map(({ id }) => id));
		expect(rows).toHaveLength(41);
	});

	test.each(rows.map((row) => [row.id, row] as const))('step %s is as the table says', (id, row) => {
		const step = procedure.steps.find((each) => each.id === id);
		expect(step).toMatchObject({
			gate: row.gate,
			title: row.title,
			minutes: row.minutes,
			redo: row.redo,
			waits: row.waits,
			instruments: row.instr,
			validity: validityOf(row),
		});
		const names = step?.lapsedBy.map((by) => (typeof by === 'string' ? by : `${by.event} ${by.item ?? ''}`));
		expect(names).toEqual(row.names);
	});

	test('each analyser check is the check of its own instrument', () => {
		const checks = procedure.steps.flatMap(({ id, checks: instrument }) =>
			instrument === undefined ? [] : [[id, instrument]],
		);
		expect(checks).toEqual([
			['C1a', 'AT-211'],
			['C1b', 'AT-212'],
			['C1c', 'AT-213'],
			['C1d', 'AT-214'],
		]);
	});
});

function validityOf({ age, spent, watch }: Row) {
	if (watch) return { kind: 'watch', everyMinutes: age, until: spent };
	return age === null ? { kind: 'once' } : { kind: 'once', ageMinutes: age, until: spent };
}
