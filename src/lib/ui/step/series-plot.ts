import type { Plot, PlotCurve } from '../../calc';
import { shownUnit } from '../../quantity';
import type { SeriesColumn, Trend } from '../../record';

/** The columns that will be kept, one picture for every unit: what is missing in the file is missing in the picture. */
export function seriesPlots(trend: Trend, columns: readonly SeriesColumn[], gap: string): readonly Plot[] {
	const zero = trend.times[0] ?? 0;
	const seconds = trend.times.map((time) => (time - zero) / 1000);
	const used = columns.flatMap(({ column, point, unit }) => {
		const found = trend.columns.find(({ name }) => name === column);
		return found === undefined ? [] : [{ point, unit: unit ?? found.unit ?? '', values: found.values }];
	});
	const ends = new Set(trend.gaps.map(({ after }) => after));
	const marks = trend.gaps.map(({ after, minutes }) => {
		const at = (after - zero) / 1000;
		return { kind: 'window', label: gap, axis: 'x', at, to: at + minutes * 60 } as const;
	});
	return [...new Set(used.map(({ unit }) => unit))].map((unit) => ({
		id: unit,
		title: used
			.filter((one) => one.unit === unit)
			.map(({ point }) => point)
			.join(', '),
		x: { label: '', unit: 's' },
		y: { label: '', unit: shownUnit(unit) },
		curves: used
			.filter((one) => one.unit === unit)
			.flatMap(({ point, values }) =>
				pieces(values, trend.times, ends).map((piece): PlotCurve => ({
					id: point,
					label: point,
					kind: 'line',
					x: piece.map((i) => seconds[i] ?? 0),
					y: piece.map((i) => values[i] ?? 0),
				})),
			),
		marks,
	}));
}

/** Runs of samples without an empty cell or a gap in time between them. */
function pieces(
	values: readonly (number | undefined)[],
	times: readonly number[],
	ends: ReadonlySet<number>,
): readonly (readonly number[])[] {
	const found: number[][] = [];
	let run: number[] = [];
	for (const [i, value] of values.entries()) {
		if (value !== undefined) run.push(i);
		if (value === undefined || ends.has(times[i] ?? 0)) {
			found.push(run);
			run = [];
		}
	}
	return [...found, run].filter(({ length }) => length > 0);
}
