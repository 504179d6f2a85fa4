import { drawPlot, shownPlot } from '../../drawing';
import type { CalcResult, Plot } from '../../calc';
import { millis } from '../../record';
import { capitalised, sayNote, type SeriesClock } from '../../wording';
import { measure } from '../fonts/faces';
import { AREA } from '../layout/sheet';
import { STYLES, type Flow } from '../layout/flow';
import { table } from '../layout/table';
import { calculationsOf, zeroOf, type ToldCalculation } from '../story/calculations';
import { coverageOf } from '../story/coverage';
import type { Story } from '../story/story';
import type { Anchors } from './anchors';
import { inputTable, resultTables, sources, wholeTable } from './calculation-tables';
import { verdict } from './verdict';

/**
 * Every calculation that was entered. The one that counted at the seal in full: verdict, picture, numbers with their
 * uncertainty, and what it was made from; what came before it and what was no proof with its verdict or its numbers.
 */
export function calculations(flow: Flow, story: Story, anchors: Anchors): void {
	const told = calculationsOf(story);
	for (const each of told.filter(({ counts }) => counts)) {
		const before = flow.sheets.length;
		calculation(flow, story, each);
		anchors.mark(`calculation ${each.entry.id}`, before + 1);
	}
	const others = told.filter(({ counts }) => !counts);
	if (others.length === 0) return;
	flow.newSheet(story.say('calc.others'));
	flow.head(story.say('calc.others caption'), story.say('calc.others'));
	for (const other of others) inShort(flow, story, other);
}

function inShort(flow: Flow, story: Story, { entry, result }: ToldCalculation): void {
	const { say, names, moments } = story;
	const { step, outcome } = entry.body;
	const facts = {
		step,
		title: names.stepTitle(step),
		at: moments.short(entry.observed ?? entry.entered),
		person: names.person(entry.person),
		outcome: say(`outcome.${outcome}`),
	};
	flow.heading(say('calc.in short', facts), { style: STYLES.subheading, with: 100 });
	verdict(flow, story, result);
	const [first] = result.plots ?? [];
	if (result.verdict !== undefined && first !== undefined) picture(flow, story, first, result);
	else wholeTable(flow, story, result);
}

function calculation(flow: Flow, story: Story, { entry, result }: ToldCalculation): void {
	const { say, names, moments } = story;
	const title = capitalised(names.stepTitle(entry.body.step));
	flow.newSheet(say('calc.sheet', { step: entry.body.step, title }));
	flow.head(
		say('calc.caption', {
			step: entry.body.step,
			calc: result.calc,
			at: moments.short(entry.observed ?? entry.entered),
			person: names.person(entry.person),
			place: say('calc.counted'),
		}),
		title,
	);
	verdict(flow, story, result);
	for (const plot of result.plots ?? []) picture(flow, story, plot, result);
	coverage(flow, story, entry);
	resultTables(flow, story, result);
	notes(flow, story, result);
	inputTable(flow, story, result);
	sources(flow, story, result);
}

function coverage(flow: Flow, story: Story, entry: ToldCalculation['entry']): void {
	const rows = coverageOf(entry, story);
	if (rows === undefined) return;
	const { say } = story;
	flow.heading(say('coverage.title'), { with: 60 });
	table(
		flow,
		[
			{ head: say('coverage.volume'), width: 170 },
			{ head: say('coverage.how') },
			{ head: say('coverage.seen'), width: 70 },
		],
		rows,
	);
	flow.write(say('coverage.note'), STYLES.note);
}

function picture(flow: Flow, story: Story, plot: Plot, result: CalcResult): void {
	const zero = zeroOf(result);
	const clock =
		zero === undefined || !CLOCK_UNITS.includes(plot.x.unit)
			? undefined
			: { zero: millis(zero), utcOffsetMinutes: story.input.plant.utcOffsetMinutes };
	const isStrip = plot.curves.every(({ kind }) => kind === 'steps');
	flow.heading(plot.title, { with: isStrip ? 140 : 290, style: STYLES.subheading });
	flow.figure(
		drawPlot(shownPlot(plot, { isClock: clock !== undefined }), {
			width: AREA.width,
			height: isStrip ? 118 : 276,
			lettering: 8.4,
			measure,
			...(clock === undefined ? {} : { x: { clock } }),
		}),
	);
}

function notes(flow: Flow, story: Story, result: CalcResult): void {
	if (result.notes.length === 0) return;
	const clock: SeriesClock = { zero: zeroOf(result), moments: story.moments };
	flow.heading(story.say('calc.notes'), { style: STYLES.subheading });
	for (const note of result.notes) flow.write(sayNote(note, story.say, clock), STYLES.note);
}

const CLOCK_UNITS = ['s', 'min', 'h'];
