import { describe, expect, test } from 'vitest';
import { checkProcedureCommand } from '../../../src/cli/commands/check-procedure';
import { LIBRARY } from '../../../src/lib/procedure';
import { aFolder } from '../../support/files';
import { heard } from '../../support/heard';
import { SMALL_PROCEDURE } from '../../support/small-procedure';

const folder = aFolder();

async function run(...args: readonly string[]) {
	const { terminal, printed, complained } = heard();
	const outcome = await checkProcedureCommand.run(args, terminal);
	return { outcome, printed: printed.join('\n'), complained: complained.join('\n') };
}

const [l1, k1, ...others] = SMALL_PROCEDURE.steps;

describe('a procedure', () => {
	test('with a circle: each step of it is named, in order', async () => {
		const circle = { ...SMALL_PROCEDURE, steps: [{ ...l1!, redo: ['K1'] }, { ...k1!, redo: ['L1'] }, ...others] };
		const file = folder.put('circle.json', JSON.stringify(circle));
		const { outcome, printed, complained } = await run(file);
		expect(outcome).toBe('failed');
		expect(printed).toContain('a circle: L1 \u2192 K1 \u2192 L1. None of these steps could ever be proved first');
		expect(complained).toContain(`Correct the places above in ${file}`);
	});

	test('that names a step which is not there, in a field of the wrong shape: the path is said', async () => {
		const wrong = { ...SMALL_PROCEDURE, steps: [{ ...l1!, minutes: 'five' }, k1, ...others] };
		const { outcome, printed } = await run(folder.put('shape.json', JSON.stringify(wrong)));
		expect(outcome).toBe('failed');
		expect(printed).toMatch(/shape\.json: steps\[0\]\.minutes: number was expected, "five" stands there$/);
	});

	test('without a mistake', async () => {
		const { outcome, printed } = await run('static/demo/night/procedure.json');
		expect(outcome).toBe('passed');
		expect(printed).toMatch(/^GD-1 revision 3: 8 gates, 41 steps, no mistake found/);
	});

	test('against a plant: a measuring point that the plant does not have is named with its place', async () => {
		const text = JSON.stringify(Object.values(LIBRARY)[0]);
		const plant = ['--plant', 'static/demo/plant.json'];
		expect((await run(folder.put('main.json', text), ...plant)).printed).toMatch(
			/no mistake found \(for plant FM-1\)\.$/,
		);
		const { outcome, printed } = await run(folder.put('lost.json', text.replaceAll('AT-212', 'AT-999')), ...plant);
		expect(outcome).toBe('failed');
		expect(printed).toMatch(/lost\.json: steps\[\d+\].+: there is no point "AT-999"; known are /);
	});
});

describe('what is no procedure at all', () => {
	test.each([
		[
			'another document',
			() => 'static/demo/plant.json',
			'is no procedure: format: "gatehold-procedure/1" was expected',
		],
		[
			'no JSON',
			() => folder.put('broken.json', '{"format": '),
			'is no JSON: at character 11, a value was expected (line 1, column 12)',
		],
		['no file', () => `${folder.path}/gone.json`, 'cannot be read: there is no such file'],
		['a folder', () => folder.path, 'cannot be read: it is a folder'],
		['no text', () => folder.put('bytes.json', Uint8Array.of(0xff, 0xfe, 0x00)), 'is no text in UTF-8'],
	])('%s', async (_what, file, because) => {
		const { outcome, printed, complained } = await run(file());
		expect({ outcome, printed }).toEqual({ outcome: 'unusable-input', printed: '' });
		expect(complained).toContain(because);
	});

	test('a plant file that is none', async () => {
		const { outcome, complained } = await run('static/demo/night/procedure.json', '--plant', 'static/demo/people.json');
		expect(outcome).toBe('unusable-input');
		expect(complained).toContain('is no plant description');
	});
});
