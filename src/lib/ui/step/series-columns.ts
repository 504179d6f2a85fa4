import type { Plant } from '../../plant';
import type { SeriesColumn, Trend } from '../../record';

/** One column of the file as the sheet shows it: what it is taken for, and what is wrong with that. */
export type ShownColumn = {
	readonly name: string;
	readonly said: string;
	readonly samples: number;
	readonly point: string | undefined;
	readonly unit: string;
	readonly fault?: 'basis' | 'twice' | 'samples';
};

type Series = {
	readonly points: readonly string[];
	readonly flows: readonly string[];
	readonly atLeastSamples: number;
};

export function shownColumns(
	trend: Trend,
	columns: readonly SeriesColumn[],
	{ plant, step }: { readonly plant: Plant; readonly step: Series },
): readonly ShownColumn[] {
	return trend.columns.map(({ name, unit, basis, values }) => {
		const use = columns.find(({ column }) => column === name);
		const own = plant.points.find(({ tag }) => tag === use?.point);
		const samples = values.filter((value) => value !== undefined).length;
		const fault =
			use === undefined
				? undefined
				: basis !== undefined && basis !== own?.basis
					? 'basis'
					: columns.filter(({ point }) => point === use.point).length > 1
						? 'twice'
						: step.points.includes(use.point) && samples < step.atLeastSamples
							? 'samples'
							: undefined;
		return {
			name,
			said: [unit, basis].filter((part) => part !== undefined).join(' '),
			samples,
			point: use?.point,
			unit: use?.unit ?? unit ?? own?.unit ?? '',
			...(fault === undefined ? {} : { fault }),
		};
	});
}

/** Points that the step needs and no column is taken for. */
export const pointsWithoutColumn = ({ points, flows }: Series, columns: readonly SeriesColumn[]): readonly string[] =>
	[...points, ...flows].filter((point) => !columns.some((column) => column.point === point));

/** A column is said to be a point, or left out. */
export const withColumn = (
	columns: readonly SeriesColumn[],
	column: string,
	point: string | undefined,
): readonly SeriesColumn[] => [
	...columns.filter((one) => one.column !== column),
	...(point === undefined ? [] : [{ column, point }]),
];

export const withUnit = (columns: readonly SeriesColumn[], column: string, unit: string): readonly SeriesColumn[] =>
	columns.map((one) => (one.column === column ? { ...one, unit } : one));
