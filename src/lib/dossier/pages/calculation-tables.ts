import { CATALOGUE, type CalcResult } from '../../calc';
import { millis, printInstant } from '../../record';
import { STYLES, type Flow } from '../layout/flow';
import { AREA } from '../layout/sheet';
import { table, type Row } from '../layout/table';
import { zeroOf } from '../story/calculations';
import { inputLines } from '../story/shown-input';
import { inOrderOf, outputOf, shownSymbol, shownValue } from '../story/shown-value';
import type { Story } from '../story/story';

type Values = CalcResult['values'];

/** Results of the whole, one a row. */
export function wholeTable(flow: Flow, story: Story, result: CalcResult): void {
	const { say } = story;
	const names = Object.keys(result.values).filter((name) => !name.includes('.'));
	table(
		flow,
		[
			{ head: say('calc.name') },
			{ head: say('calc.symbol'), width: 44 },
			{ head: say('calc.value'), width: 150, align: 'end', voice: 'strong' },
		],
		inOrderOf(result.calc, names).map((name) => row(story, result, name, [name])),
	);
}

/** Results of the whole, then those of places side by side. */
export function resultTables(flow: Flow, story: Story, result: CalcResult): void {
	const { say } = story;
	const { of: places, names } = placesIn(result.values);
	flow.heading(say('calc.numbers'), { with: 60 });
	wholeTable(flow, story, result);
	if (places.length === 0) return;
	flow.heading(say('calc.places'), { with: 60 });
	const width = Math.min(78, (AREA.width - 190) / places.length);
	table(
		flow,
		[
			{ head: say('calc.name') },
			{ head: say('calc.symbol'), width: 34 },
			...places.map((tag) => ({ head: tag, width, align: 'end' as const, voice: 'strong' as const })),
		],
		inOrderOf(result.calc, names).map((name) =>
			row(
				story,
				result,
				name,
				places.map((tag) => `${tag}.${name}`),
			),
		),
	);
}

function placesIn(values: Values): { readonly of: readonly string[]; readonly names: readonly string[] } {
	const dotted = Object.keys(values).filter((name) => name.includes('.'));
	const split = dotted.map(
		(name) => [name.slice(0, name.lastIndexOf('.')), name.slice(name.lastIndexOf('.') + 1)] as const,
	);
	return { of: [...new Set(split.map(([tag]) => tag))], names: [...new Set(split.map(([, name]) => name))] };
}

function row(story: Story, result: CalcResult, name: string, columns: readonly string[]): Row {
	const output = outputOf(result.calc, columns[0] ?? name);
	const shown = columns.map((column) => {
		const value = result.values[column];
		if (value === undefined) return '–';
		return momentOf(name, value.value, result, story) ?? shownValue(value, output?.quantity ?? '', story.say);
	});
	return { cells: [output?.means ?? name, shownSymbol(output?.symbol ?? ''), ...shown] };
}

/** A moment of the series on the plant's clock: an output that says since when. */
function momentOf(name: string, value: number | null, result: CalcResult, { moments }: Story): string | undefined {
	const zero = zeroOf(result);
	if (!/since$/i.test(name) || value === null || zero === undefined) return undefined;
	return moments.clock(printInstant(millis(zero) + value * 1000, 0));
}

/** What it was calculated from, as it is stored. A series is told by its length: the record holds it whole. */
export function inputTable(flow: Flow, story: Story, { calc, constants, inputs }: CalcResult): void {
	const { say } = story;
	const known = new Map(
		(Object.hasOwn(CATALOGUE, calc) ? CATALOGUE[calc] : undefined)?.inputs.map((input) => [input.name, input]),
	);
	flow.heading(say('calc.made from'), { with: 60 });
	table(
		flow,
		[
			{ head: say('calc.input'), width: 92, voice: 'strong' },
			{ head: say('calc.name'), width: 130 },
			{ head: say('calc.given') },
		],
		inputLines(inputs, say).map(({ name, lines }) => ({
			cells: [name, known.get(name)?.means ?? '', lines.join('\n')],
		})),
	);
	flow.write(say('calc.inputs', { constants }), STYLES.note);
}

export function sources(flow: Flow, { say }: Story, { calc }: CalcResult): void {
	const calculator = Object.hasOwn(CATALOGUE, calc) ? CATALOGUE[calc] : undefined;
	if (calculator === undefined) return;
	flow.heading(say('calc.sources', { title: calculator.title }), { style: STYLES.subheading });
	for (const source of calculator.sources) flow.write(source, STYLES.note);
}
