import { allOf, type EventOf } from '../../record';
import type { Cell } from '../layout/table';
import type { Story } from './story';

type TableRow = { readonly cells: readonly Cell[] };

/** The coverage table that a purge was judged with: the newest one before it, from the step its calculation is bound to. */
export function coverageOf(entry: EventOf<'entry'>, story: Story): readonly TableRow[] | undefined {
	const step = story.names.step(entry.body.step);
	const bound =
		step?.kind === 'calculation' ? Object.values(step.bind).find((binding) => binding.from === 'coverage') : undefined;
	const source = bound?.from === 'coverage' ? bound.step : undefined;
	const rowsOf = (id: string) =>
		[...allOf(story.events, 'entry')]
			.filter(({ body, observedAt }) => body.step === id && body.rows !== undefined && observedAt <= entry.observedAt)
			.sort((a, b) => b.observedAt - a.observedAt)[0];
	const table = source === undefined ? (entry.body.rows === undefined ? undefined : entry) : rowsOf(source);
	if (table?.body.rows === undefined) return undefined;
	const asked = story.names.step(table.body.step);
	return table.body.rows.map((row) => {
		const id =
			(asked?.kind === 'coverage' ? asked.rows.find((each) => each.id === row.row)?.volume : undefined) ?? row.row;
		const volume = story.input.plant.volumes.find((each) => each.id === id);
		const how = [
			row.found,
			row.reading === undefined ? '' : `${row.reading.point ?? ''} ${row.reading.typed} ${row.reading.unit}`.trim(),
			row.note ?? '',
		]
			.filter((part) => part !== '')
			.join('; ');
		return {
			cells: [
				[id, volume?.title ?? ''].filter((part) => part !== '').join(' '),
				row.passes ? how : { text: how, tone: 'bad' as const },
				story.moments.short(row.observed ?? table.observed ?? table.entered),
			],
		};
	});
}
