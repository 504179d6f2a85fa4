import { toJsonSchema } from '@valibot/to-json-schema';
import { CATALOGUE, latest, runCalculator, type Calculator } from '../../lib/calc';
import { sayRefusal, speaker } from '../../lib/wording';
import { unusable, type Command, type Outcome, type Terminal } from '../command';
import { jsonIn } from '../files';
import { readOptions } from '../options';

const say = speaker('en');

/** One calculation from inputs as JSON; or what can be calculated, and what it needs. */
export const calc: Command = {
	usage: 'calc ID[@VERSION] < inputs.json   |   calc --list [--json]',
	does: 'calculates from inputs as JSON; lists the calculators with inputs, units, ranges and sources',
	run: async (args, terminal) => {
		const given = readOptions(args, { switches: ['list', 'json'] });
		if (!given.ok) return unusable(terminal, given.error);
		if (given.value.has('list')) return list(terminal, given.value.has('json'));
		const [id, ...more] = given.value.files;
		if (id === undefined || more.length > 0)
			return unusable(terminal, `One calculator is asked for. Known are ${Object.keys(CATALOGUE).join(', ')}.`);
		return calculate(terminal, id, await terminal.readInput());
	},
};

function calculate(terminal: Terminal, id: string, text: string): Outcome {
	const inputs = jsonIn(text, 'The input');
	if (!inputs.ok) return unusable(terminal, inputs.error);
	const newest = latest(id);
	const result = runCalculator(newest === undefined ? id : nameOf(newest), inputs.value);
	if (result.ok) {
		terminal.print(JSON.stringify(result.value, null, '\t'));
		return 'passed';
	}
	terminal.print(JSON.stringify({ refused: result.error }, null, '\t'));
	return unusable(
		terminal,
		[
			`${id} calculated nothing. Correct these inputs and run it again:`,
			...result.error.map((refusal) => `  ${sayRefusal(refusal, say)}`),
		].join('\n'),
	);
}

function list(terminal: Terminal, asJson: boolean): Outcome {
	const all = Object.values(CATALOGUE);
	terminal.print(asJson ? JSON.stringify(all.map(described), null, '\t') : all.map(told).join('\n\n'));
	return 'passed';
}

const described = (calculator: Calculator) => {
	const { id, version, title, answers, inputs, schema, outputs, sources } = calculator;
	return {
		id,
		version,
		calc: nameOf(calculator),
		title,
		answers,
		inputs,
		inputsSchema: toJsonSchema(schema, { errorMode: 'ignore' }),
		outputs,
		sources,
	};
};

function told(calculator: Calculator): string {
	const { title, answers, inputs, outputs, sources } = calculator;
	return [
		`${nameOf(calculator)}   ${title}`,
		`  ${answers}`,
		'  inputs',
		...inputs.map(
			({ name, means, quantity, unit, min, max, optional, default: standing, choices }) =>
				`    ${name.padEnd(24)} ${[
					means,
					`${quantity}${unit === undefined || unit === '1' ? '' : ` in ${unit}`}`,
					...rangeOf(min, max),
					...(choices === undefined ? [] : [choices.join(' | ')]),
					...(standing === undefined ? (optional ? ['optional'] : []) : [`${String(standing)} when left out`]),
				].join('; ')}`,
		),
		'  outputs',
		...outputs.map(({ name, means, unit }) => `    ${name.padEnd(24)} ${means}${unit === '1' ? '' : ` in ${unit}`}`),
		'  sources',
		...sources.map((source) => `    ${source}`),
	].join('\n');
}

const rangeOf = (min: number | undefined, max: number | undefined): readonly string[] => {
	if (min === undefined && max === undefined) return [];
	if (min === undefined) return [`at most ${String(max)}`];
	return [max === undefined ? `at least ${String(min)}` : `${String(min)} to ${String(max)}`];
};

const nameOf = ({ id, version }: Calculator): string => `${id}@${String(version)}`;
