import type { Step } from '../../procedure';
import { allOf, type BodyOf, type EventOf, type StepStanding } from '../../record';
import { capitalised } from '../../wording';
import { calculationOf } from './calculations';
import { boundsOf, printBounds, printReading } from './print';
import { outputOf, shownIn } from './shown-value';
import type { Story } from './story';

type Entry = EventOf<'entry'>;

/** One line of an entry: what was looked at, what was found, what it was held against, and with what. */
export type Found = {
	readonly what: string;
	readonly value: string;
	readonly limit: string;
	readonly instrument: string;
	readonly fails?: true;
};

export type ToldEntry = {
	readonly event: Entry;
	readonly found: readonly Found[];
	/** The entry that counts at the seal, or why another does. */
	readonly place: 'counts' | 'superseded' | 'withdrawn' | 'earlier';
	readonly lateMinutes: number | undefined;
};

export type ToldStep = {
	readonly step: Step;
	readonly standing: StepStanding | undefined;
	/** The one that counts first, then the newest. */
	readonly entries: readonly ToldEntry[];
};

/** Every entry of a gate, step by step; nothing is left out. */
export function entriesUnder(gate: number, story: Story): readonly ToldStep[] {
	const entries = allOf(story.events, 'entry');
	const superseded = new Set(entries.flatMap(({ body }) => body.supersedes ?? []));
	const withdrawn = new Set(allOf(story.events, 'entry withdrawn').map(({ body }) => body.entry));
	const late = new Map(story.end.late.map(({ event, minutes }) => [event, minutes]));
	return story.input.procedure.steps
		.filter((step) => step.gate === gate)
		.map((step) => {
			const standing = story.end.steps.find((each) => each.step === step.id);
			const told = entries
				.filter(({ body }) => body.step === step.id)
				.map((event): ToldEntry => {
					const counts = event.id === standing?.entry;
					const place = withdrawn.has(event.id)
						? 'withdrawn'
						: superseded.has(event.id)
							? 'superseded'
							: counts
								? 'counts'
								: 'earlier';
					return { event, place, found: foundIn(event, step, story), lateMinutes: late.get(event.id) };
				});
			const first = (entry: ToldEntry): number => (entry.place === 'counts' ? 1 : 0);
			return {
				step,
				standing,
				entries: told.sort((a, b) => first(b) - first(a) || b.event.observedAt - a.event.observedAt),
			};
		});
}

type Body = BodyOf<'entry'>;

function foundIn(event: Entry, step: Step, story: Story): readonly Found[] {
	const { body } = event;
	return [
		...calculated(event, step, story),
		...(body.values ?? []).map((reading) => valueFound(reading, step, story)),
		...(body.rows ?? []).map((row) => rowFound(row, step, story)),
		...chosen(body, step),
	];
}

function valueFound(reading: NonNullable<Body['values']>[number], step: Step, story: Story): Found {
	const fields = 'fields' in step ? (step.fields ?? []) : [];
	const field = fields.find(({ id, point }) =>
		reading.field === undefined ? point !== undefined && point === reading.point : id === reading.field,
	);
	const point = reading.point ?? field?.point;
	const bounds = boundsOf(field?.limit, story.input);
	return {
		what: field?.title ?? (point === undefined ? '' : story.names.point(point)),
		value: printReading(reading, story),
		limit: bounds === undefined ? '' : printBounds(bounds, story),
		instrument: reading.instrument ?? point ?? '',
	};
}

function rowFound(row: NonNullable<Body['rows']>[number], step: Step, story: Story): Found {
	const reading = row.reading === undefined ? '' : `, ${printReading(row.reading, story)}`;
	const found = {
		value: `${row.found}${reading}`,
		instrument: row.reading?.instrument ?? '',
		...(row.passes ? {} : { fails: true as const }),
	};
	if (step.kind === 'line-up') {
		const asked = step.rows.find(({ id }) => id === row.row);
		const title =
			asked === undefined ? row.row : [asked.element, asked.title].filter((part) => part !== undefined).join(' ');
		return {
			...found,
			what: title,
			limit: asked === undefined ? '' : story.say('entry.required', { position: asked.required }),
		};
	}
	if (step.kind === 'coverage') {
		const id = step.rows.find((each) => each.id === row.row)?.volume ?? row.row;
		return {
			...found,
			what: `${id} ${story.input.plant.volumes.find((volume) => volume.id === id)?.title ?? ''}`.trim(),
			limit: '',
		};
	}
	return { ...found, what: row.row, limit: '' };
}

/** What a calculation said: its verdict, or the one output that is held against a limit. */
function calculated(event: Entry, step: Step, story: Story): readonly Found[] {
	const result = calculationOf(event);
	if (result === undefined || step.kind !== 'calculation') return [];
	const line = (what: string, value: string, limit: string): Found => ({ what, value, limit, instrument: '' });
	if (step.proves === 'verdict') {
		return result.verdict === undefined ? [] : [line(result.calc, story.say(`verdict.${result.verdict.word}`), '')];
	}
	const { output, quantity, unit, limit } = step.proves;
	const value = result.values[output];
	const bounds = boundsOf(limit, story.input);
	const means = capitalised(outputOf(result.calc, output)?.means ?? output);
	return value === undefined
		? []
		: [line(means, shownIn(value, quantity, unit, story.say), bounds === undefined ? '' : printBounds(bounds, story))];
}

function chosen({ choice, confirmed }: Body, step: Step): readonly Found[] {
	const line = (what: string): Found => ({ what, value: '', limit: '', instrument: '' });
	const option = step.kind === 'choice' ? step.options.find(({ id }) => id === choice)?.title : undefined;
	const items = step.kind === 'confirm' ? step.confirms.filter(({ id }) => confirmed?.includes(id) === true) : [];
	return [...(choice === undefined ? [] : [line(option ?? choice)]), ...items.map(({ text }) => line(text))];
}
