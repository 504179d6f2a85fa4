import type { Plot, PlotCurve } from '../../calc';
import { shownUnit } from '../../quantity';
import type { SeriesColumn, Trend } from '../../record';

/** The columns that will be kept, one picture for every unit: what is missing in the file breaks the line. */
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
			.map(({ point, values }): PlotCurve => {
				const samples = values.flatMap((value, i) => [
					[seconds[i] ?? 0, value ?? NaN] as const,
					...(ends.has(trend.times[i] ?? 0) ? [[seconds[i] ?? 0, NaN] as const] : []),
				]);
				return { id: point, label: point, kind: 'line', x: samples.map(([x]) => x), y: samples.map(([, y]) => y) };
			}),
		marks,
	}));
}
