import { describe, expect, test } from 'vitest';
import { calc } from '../../../src/cli/commands/calc';
import { CATALOGUE, runCalculator } from '../../../src/lib/calc';
import { heard } from '../../support/heard';
import { PURGE_INPUTS } from '../../support/small-procedure';

async function run(args: readonly string[], input?: unknown) {
	const { terminal, printed, complained } = heard(typeof input === 'string' ? input : JSON.stringify(input));
	const outcome = await calc.run(args, terminal);
	return { outcome, printed: printed.join('\n'), complained: complained.join('\n') };
}

describe('one calculation', () => {
	test.each(['sweep-purge', 'sweep-purge@1'])('%s: the stored result, whole, on standard output', async (id) => {
		const { outcome, printed, complained } = await run([id], PURGE_INPUTS);
		const result = runCalculator('sweep-purge@1', PURGE_INPUTS);
		expect({ outcome, complained }).toEqual({ outcome: 'passed', complained: '' });
		expect(JSON.parse(printed)).toEqual(result.ok ? JSON.parse(JSON.stringify(result.value)) : undefined);
	});

	test('a negative absolute pressure is refused by name: as data and as a sentence, and nothing is calculated', async () => {
		const inputs = { ...PURGE_INPUTS, pressure: { value: '-5', unit: 'mbar(a)' } };
		const { outcome, printed, complained } = await run(['sweep-purge'], inputs);
		expect(outcome).toBe('unusable-input');
		expect(JSON.parse(printed)).toEqual({
			refused: [{ input: 'pressure', kind: 'below-vacuum', value: -5, unit: 'mbar(a)' }],
		});
		expect(complained).toBe(
			'sweep-purge calculated nothing. Correct these inputs and run it again:\n  pressure: -5 mbar(a) is below a perfect vacuum',
		);
	});

	test('every wrong input is named, not only the first', async () => {
		const inputs = { ...PURGE_INPUTS, temperature: '20', outlett: 'stack' };
		const { complained } = await run(['sweep-purge'], inputs);
		expect(complained).toContain('temperature: ');
		expect(complained).toContain('outlett: there is no such input');
	});

	test('input that is no JSON is refused with its place', async () => {
		const { outcome, printed, complained } = await run(['sweep-purge'], '{\n  "mixing": 1,\n  mixing: 2\n}');
		expect({ outcome, printed }).toEqual({ outcome: 'unusable-input', printed: '' });
		expect(complained).toBe(
			'The input is no JSON: at character 19, a name in double quotes was expected (line 3, column 3).',
		);
	});

	test('a calculator that does not exist: the known ones are named', async () => {
		const { outcome, complained } = await run(['crystal-ball'], {});
		expect(outcome).toBe('unusable-input');
		expect(complained).toContain('there is no calculator crystal-ball; known are ');
		expect(complained).toContain('sweep-purge@1');
	});

	test('none, or two at once', async () => {
		expect((await run([])).outcome).toBe('unusable-input');
		expect((await run(['sweep-purge', 'venturi-flow'], {})).outcome).toBe('unusable-input');
		expect((await run(['sweep-purge', '--fast'], {})).complained).toContain('--fast');
	});
});

describe('the list', () => {
	test('as JSON: every calculator of the catalogue with inputs, schema, outputs and sources', async () => {
		const { outcome, printed } = await run(['--list', '--json']);
		const list = JSON.parse(printed) as {
			calc: string;
			inputs: object[];
			inputsSchema: { properties: object };
			sources: string[];
		}[];
		expect(outcome).toBe('passed');
		expect(list.map(({ calc: name }) => name)).toEqual(Object.keys(CATALOGUE));
		for (const { inputs, inputsSchema, sources } of list) {
			expect(sources.length).toBeGreaterThan(0);
			expect(Object.keys(inputsSchema.properties)).toEqual(inputs.map((input) => (input as { name: string }).name));
		}
	});

	test('for people: what each answers, and each input with unit and range', async () => {
		const { printed } = await run(['--list']);
		for (const { title, answers } of Object.values(CATALOGUE)) {
			expect(printed).toContain(title);
			expect(printed).toContain(answers);
		}
		expect(printed).toMatch(/^ {4}temperature +.*in K/m);
	});
});
