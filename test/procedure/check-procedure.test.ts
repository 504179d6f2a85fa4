import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { ROLES } from '../../src/lib/identity';
import { parsePlant } from '../../src/lib/plant';
import { checkProcedure, parseProcedure, type Procedure, type ProcedureFinding } from '../../src/lib/procedure';
import { readDemo } from '../support/demo-files';
import { withSet } from '../support/json-pointer';

type Case = {
	readonly name: string;
	readonly desc: string;
	readonly set?: { readonly [pointer: string]: unknown };
	readonly plantSet?: { readonly [pointer: string]: unknown };
	readonly procedure?: unknown;
	readonly expect: readonly { readonly kind: ProcedureFinding['kind']; readonly path: string }[];
};

const FOLDER = join(import.meta.dirname, '../vectors/procedure');
const cases = readdirSync(FOLDER)
	.filter((file) => file.endsWith('.json'))
	.map((file): Case => {
		const read = JSON.parse(readFileSync(join(FOLDER, file), 'utf8')) as Omit<Case, 'name'>;
		return { ...read, name: file.replace('.json', '') };
	});
const happy = cases.find(({ name }) => name === 'happy')?.procedure;

function parsed(document: unknown): Procedure {
	const procedure = parseProcedure(document);
	if (!procedure.ok) throw new Error(JSON.stringify(procedure.error));
	return procedure.value;
}

const inOrder = <T extends { readonly path: string; readonly kind: string }>(findings: readonly T[]): readonly T[] =>
	[...findings].sort((a, b) => (`${a.path} ${a.kind}` < `${b.path} ${b.kind}` ? -1 : 1));

describe('[P1] a procedure is saved only when nothing is wrong with it', () => {
	test.each(cases)('$name: $desc', ({ set = {}, plantSet = {}, expect: expected }) => {
		const plant = parsePlant(withSet(readDemo('plant.json'), plantSet));
		if (!plant.ok) throw new Error(JSON.stringify(plant.error));
		const findings = checkProcedure(parsed(withSet(happy, set)), { roles: ROLES, plant: plant.value });
		expect(inOrder(findings)).toMatchObject(inOrder(expected));
		expect(findings).toHaveLength(expected.length);
	});

	test('every kind of finding has its vector', () => {
		const seen = new Set(cases.flatMap((each) => each.expect.map(({ kind }) => kind)));
		expect(Object.keys(KINDS).filter((kind) => !seen.has(kind as ProcedureFinding['kind']))).toEqual([]);
	});

	test('without a plant description its tags are not looked up, and everything else still is', () => {
		const procedure = parsed(withSet(happy, { '/steps/2/checks': 'AT-999', '/steps/2/redo': ['nowhere'] }));
		expect(checkProcedure(procedure, { roles: ROLES })).toMatchObject([{ kind: 'unknown-step', name: 'nowhere' }]);
	});
});

describe('[P2] a document of another shape is named place by place', () => {
	test('a step of a kind that does not exist', () => {
		const read = parseProcedure(withSet(happy, { '/steps/1/kind': 'guess' }));
		expect(read).toMatchObject({
			ok: false,
			error: [{ kind: 'wrong-shape', path: 'steps[1].kind', found: '"guess"' }],
		});
	});

	test('two wrong places are both named, a misspelt name among them', () => {
		const read = parseProcedure(withSet(happy, { '/gates/0/titel': 'Line-up', '/steps/0/minutes': '5' }));
		expect(read).toMatchObject({
			ok: false,
			error: [
				{ kind: 'wrong-shape', path: 'gates[0].titel', expected: 'no such name' },
				{ kind: 'wrong-shape', path: 'steps[0].minutes', expected: 'number', found: '"5"' },
			],
		});
	});

	test('a limit that is neither of the unit nor written with its source', () => {
		const read = parseProcedure(withSet(happy, { '/steps/2/fields/0/limit/source': null }));
		expect(read.ok ? [] : read.error).toContainEqual({
			kind: 'wrong-shape',
			path: 'steps[2].fields[0].limit.source',
			expected: 'a value',
			found: 'nothing',
		});
	});

	test('not a procedure at all', () => {
		expect(parseProcedure('a procedure')).toMatchObject({ ok: false, error: [{ path: '', expected: 'Object' }] });
	});
});

describe('[P8] nothing relies on itself', () => {
	/** Steps s0, s1, ... of one gate, each relying on the listed earlier ones: never a circle. */
	const withoutCircle = fc
		.array(fc.array(fc.nat(), { maxLength: 3 }), { minLength: 2, maxLength: 12 })
		.map((rows) => rows.map((row, i) => (i === 0 ? [] : [...new Set(row.map((n) => n % i))])));

	const procedureOf = (relies: readonly (readonly number[])[]): Procedure => {
		const base = parsed(happy);
		const step = base.steps[1]!;
		const steps = relies.map((on, i) => ({
			...step,
			id: `s${i}`,
			redo: on.filter((n) => n % 2 === 0).map((n) => `s${n}`),
			waits: on.filter((n) => n % 2 === 1).map((n) => `s${n}`),
		}));
		return { ...base, steps };
	};
	const circles = (procedure: Procedure) =>
		checkProcedure(procedure, { roles: ROLES }).filter((finding) => finding.kind === 'circle');

	test('steps that rely only on earlier ones make no circle', () => {
		fc.assert(fc.property(withoutCircle, (relies) => circles(procedureOf(relies)).length === 0));
	});

	test('a circle that is closed anywhere is found, and the list that is printed is a circle', () => {
		fc.assert(
			fc.property(withoutCircle, fc.nat(), fc.nat(), (relies, a, b) => {
				const from = Math.min(a % relies.length, b % relies.length);
				const to = Math.max(a % relies.length, b % relies.length);
				// A way from `to` down to `from`, and the reliance of `from` on `to` that closes it.
				const closed = relies.map((on, i) =>
					i === from ? [...on, to] : i > from && i <= to && !on.includes(i - 1) ? [...on, i - 1] : on,
				);
				const procedure = procedureOf(closed);
				const found = circles(procedure);
				expect(found.length).toBeGreaterThan(0);
				for (const finding of found) {
					const { through } = finding;
					expect(through.at(0)).toBe(through.at(-1));
					for (const [i, id] of through.slice(0, -1).entries()) {
						const step = procedure.steps.find((each) => each.id === id);
						expect([...(step?.redo ?? []), ...(step?.waits ?? [])]).toContain(through[i + 1]);
					}
				}
			}),
		);
	});
});

/** Every kind of finding: a new one does not compile until it stands here, and does not pass until it has a vector. */
const KINDS = {
	'age-without-until': true,
	'bad-value': true,
	'basis-disagrees': true,
	'binding-to-another-kind': true,
	'bound-to-higher-gate': true,
	circle: true,
	condition: true,
	'duplicate-id': true,
	'field-disagrees-with-point': true,
	'gate-out-of-order': true,
	'gate-without-steps': true,
	'input-not-bound': true,
	'limit-lacks-side': true,
	'limit-of-another-quantity': true,
	'limit-without-side': true,
	'limit-without-source': true,
	'no-option-passes': true,
	'output-of-another-quantity': true,
	'oxygen-limit-above-allowed': true,
	'reading-disagrees-with-point': true,
	'reads-nothing': true,
	'relies-on-higher-gate': true,
	'required-not-a-choice': true,
	'unknown-calculator': true,
	'unknown-element': true,
	'unknown-field': true,
	'unknown-gate': true,
	'unknown-input': true,
	'unknown-instrument': true,
	'unknown-limit': true,
	'unknown-output': true,
	'unknown-permissive': true,
	'unknown-place': true,
	'unknown-plant-event': true,
	'unknown-plant-path': true,
	'unknown-point': true,
	'unknown-quantity': true,
	'unknown-role': true,
	'unknown-step': true,
	'unknown-unit': true,
	'unknown-volume': true,
	'until-below-own-gate': true,
	'until-without-age': true,
	'volume-without-row': true,
	'watch-on-another-kind': true,
	'watch-step-without-watch': true,
} satisfies { readonly [kind in ProcedureFinding['kind']]: true };
