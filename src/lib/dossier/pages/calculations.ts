import { lettering, MARK_TONES, markShapes, rectangle, stroke, drawPlot, type Mark } from '../../drawing';
import type { CalcNote, CalcResult, Plot } from '../../calc';
import { millis } from '../../record';
import { sayNote } from '../../wording';
import { measure } from '../fonts/faces';
import { AREA } from '../layout/sheet';
import { STYLES, type Flow } from '../layout/flow';
import { table } from '../layout/table';
import { wrap } from '../layout/wrap';
import { calculationsOf, type ToldCalculation } from '../story/calculations';
import { coverageOf } from '../story/coverage';
import { shownPlot } from '../story/shown-plot';
import { outputOf, shownValue } from '../story/shown-value';
import type { Story } from '../story/story';
import type { Anchors } from './anchors';

/** Every calculation that was entered: its verdict, its picture, its numbers with their uncertainty, and what it was made from. */
export function calculations(flow: Flow, story: Story, anchors: Anchors): void {
	const told = calculationsOf(story);
	for (const each of told.filter(({ counts, entry }) => counts || entry.body.outcome === 'pass')) {
		calculation(flow, story, each);
		anchors.mark(`calculation ${each.entry.id}`, flow.sheets.length);
	}
	const tries = told.filter(({ counts, entry }) => !counts && entry.body.outcome !== 'pass');
	if (tries.length === 0) return;
	flow.newSheet(story.say('calc.tries'));
	flow.head(story.say('calc.tries caption'), story.say('calc.tries'));
	for (const { entry, result } of tries) {
		flow.heading(
			story.say('calc.try', {
				step: entry.body.step,
				title: story.names.stepTitle(entry.body.step),
				at: story.moments.short(entry.observed ?? entry.entered),
			}),
			{ style: STYLES.subheading },
		);
		verdict(flow, story, result);
	}
}

function calculation(flow: Flow, story: Story, { entry, result, counts }: ToldCalculation): void {
	const { say, names, moments } = story;
	const title = names.stepTitle(entry.body.step);
	flow.newSheet(say('calc.sheet', { step: entry.body.step, title }));
	flow.head(
		say('calc.caption', {
			step: entry.body.step,
			calc: result.calc,
			at: moments.short(entry.observed ?? entry.entered),
			person: names.person(entry.person),
			place: say(counts ? 'calc.counted' : 'calc.earlier'),
		}),
		title,
	);
	verdict(flow, story, result);
	for (const plot of result.plots ?? []) picture(flow, story, plot, result);
	const coverage = coverageOf(entry, story);
	if (coverage !== undefined) {
		flow.heading(say('coverage.title'), { with: 60 });
		table(
			flow,
			[
				{ head: say('coverage.volume'), width: 150 },
				{ head: say('coverage.how') },
				{ head: say('coverage.seen'), width: 70 },
			],
			coverage,
		);
		flow.write(say('coverage.note'), STYLES.note);
	}
	numbers(flow, story, result);
	const notes = result.notes;
	if (notes.length > 0) {
		flow.heading(say('calc.notes'), { style: STYLES.subheading });
		for (const note of notes) flow.write(sayNote(note), STYLES.note);
	}
	flow.heading(say('calc.made from'), { style: STYLES.subheading });
	flow.write(say('calc.inputs', { constants: result.constants }), STYLES.note);
	flow.write(inputsText(result.inputs), STYLES.note);
}

const WORDS: { readonly [word in NonNullable<CalcResult['verdict']>['word']]: Mark } = {
	adequate: 'stands',
	'not yet': 'not yet',
	'cannot be shown': 'failed',
};

/** The verdict in a frame, with every reason; under an adequate one what it does not mean. */
function verdict(flow: Flow, { say }: Story, { verdict: judged, scope }: CalcResult): void {
	const outside = scope === 'outside scope' ? say('calc.outside scope') : undefined;
	if (judged === undefined) {
		if (outside !== undefined) flow.write(outside, { ...STYLES.body, tone: 'bad' });
		return;
	}
	const mark = WORDS[judged.word];
	const reasons = judged.reasons.map((reason: CalcNote) => sayNote(reason));
	const lines = [
		...(judged.word === 'adequate' ? [say('calc.adequate')] : reasons),
		...(outside === undefined ? [] : [outside]),
	];
	const left = 40;
	const set = lines.flatMap((line) => wrap(line, AREA.width - left - 14, STYLES.body));
	const height = 30 + set.length * STYLES.body.lead;
	flow.block(height, ({ x, y, width }) => [
		stroke(rectangle({ x, y, width, height: height - 6 }), { pen: 'line' }),
		...markShapes(mark, { x: x + 21, y: y + 17 }, 15),
		lettering(
			say(`verdict.${judged.word}`),
			{ x: x + left, y: y + 19 },
			{ size: 12, voice: 'title', tone: MARK_TONES[mark] === 'soft' ? 'ink' : MARK_TONES[mark] },
		),
		...set.map((line, i) =>
			lettering(line, { x: x + left, y: y + 32 + i * STYLES.body.lead }, { size: STYLES.body.size }),
		),
	]);
	flow.space(4);
}

function picture(flow: Flow, story: Story, plot: Plot, { inputs }: CalcResult): void {
	const zero =
		typeof inputs === 'object' && inputs !== null && 'zero' in inputs && typeof inputs.zero === 'string'
			? inputs.zero
			: undefined;
	const clock =
		zero === undefined || Number.isNaN(millis(zero)) || !['s', 'min', 'h'].includes(plot.x.unit)
			? undefined
			: { zero: millis(zero), utcOffsetMinutes: story.input.plant.utcOffsetMinutes };
	const steps = plot.curves.every(({ kind }) => kind === 'steps');
	flow.heading(plot.title, { with: steps ? 150 : 290, style: STYLES.subheading });
	flow.figure(
		drawPlot(shownPlot(plot), {
			width: AREA.width,
			height: steps ? 128 : 272,
			lettering: 8.4,
			measure,
			...(clock === undefined ? {} : { x: { clock } }),
		}),
	);
}

function numbers(flow: Flow, { say }: Story, { calc, values }: CalcResult): void {
	flow.heading(say('calc.numbers'), { with: 60 });
	table(
		flow,
		[
			{ head: say('calc.name'), width: 120 },
			{ head: say('calc.means') },
			{ head: say('calc.value'), width: 130, align: 'end', voice: 'strong' },
		],
		Object.entries(values).map(([name, value]) => {
			const output = outputOf(calc, name);
			return {
				cells: [
					name,
					[output?.symbol, output?.means].filter((part) => part !== undefined).join(', '),
					shownValue(value, output?.quantity ?? ''),
				],
			};
		}),
	);
}

/** Inputs as they are stored; a series is told by its length, since the record holds it whole. */
function inputsText(inputs: CalcResult['inputs']): string {
	return JSON.stringify(inputs, (_, value: unknown) =>
		Array.isArray(value) && value.length > 8 && value.every((item) => typeof item === 'number')
			? `${value.length} numbers`
			: value,
	)
		.replaceAll(/[{}"]/g, '')
		.replaceAll(',', ', ')
		.replaceAll(':', ': ');
}
