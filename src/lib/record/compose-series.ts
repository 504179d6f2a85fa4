import { canonicalJson, fail, ok, type Result } from '../base';
import type { Plant } from '../plant';
import { isQuantityName, unitsFor } from '../quantity';
import type { BodyOf } from './event';
import { printInstant } from './instants';
import type { Trend, TrendReading } from './trend';

export type SeriesError =
	| { readonly kind: 'no-such-point'; readonly column: string }
	| { readonly kind: 'no-such-column'; readonly column: string }
	| { readonly kind: 'point-twice'; readonly point: string }
	| { readonly kind: 'other-unit'; readonly column: string; readonly point: string; readonly found: string }
	| { readonly kind: 'other-basis'; readonly column: string; readonly point: string; readonly found: string };

type Body = BodyOf<'series attached'>;
type SeriesPoint = Body['points'][number];
type TrendColumn = Trend['columns'][number];

/** Which measuring point a column is, as a person said it; columns that are not named are left out. */
export type SeriesColumn = { readonly column: string; readonly point: string; readonly unit?: string };

/**
 * A trend whose columns become a series of measuring points; a column of another basis is refused, for nobody can turn it
 * into the point's own without the moisture of the moment.
 *
 * @param said.columns absent: every column names its measuring point itself
 */
export function seriesBody(
	trend: Trend,
	attachment: Body['attachment'],
	plant: Plant,
	said: {
		readonly note?: string | undefined;
		readonly reading?: TrendReading | undefined;
		readonly columns?: readonly SeriesColumn[] | undefined;
	} = {},
): Result<Body, SeriesError> {
	const points: SeriesPoint[] = [];
	for (const use of said.columns ?? trend.columns.map(({ name }) => ({ column: name, point: name }))) {
		const column = trend.columns.find(({ name }) => name === use.column);
		if (column === undefined) return fail({ kind: 'no-such-column', column: use.column });
		const point = seriesPoint(column, use, plant);
		if (!point.ok) return point;
		if (points.some((other) => other.point === use.point)) return fail({ kind: 'point-twice', point: use.point });
		points.push(point.value);
	}
	const { note, reading = {} } = said;
	const print = (at: number | undefined): string => printInstant(at ?? 0, plant.utcOffsetMinutes);
	return ok({
		points,
		from: print(trend.times[0]),
		to: print(trend.times.at(-1)),
		samples: trend.times.length,
		attachment,
		...(Object.keys(reading).length === 0 ? {} : { reading }),
		...(note === undefined ? {} : { note }),
	});
}

function seriesPoint(
	{ name, unit, basis }: TrendColumn,
	use: SeriesColumn,
	plant: Plant,
): Result<SeriesPoint, SeriesError> {
	const point = plant.points.find(({ tag }) => tag === use.point);
	if (point === undefined) return fail({ kind: 'no-such-point', column: use.point });
	if (basis !== undefined && basis !== point.basis)
		return fail({ kind: 'other-basis', column: name, point: point.basis ?? 'without basis', found: basis });
	if (use.unit !== undefined && !(isQuantityName(point.quantity) && unitsFor(point.quantity).includes(use.unit)))
		return fail({ kind: 'other-unit', column: name, point: use.point, found: use.unit });
	const own = point.basis === undefined ? {} : { basis: point.basis };
	return ok({ point: use.point, column: name, unit: use.unit ?? unit ?? point.unit, ...own });
}

/** The columns whose heading holds the tag of a measuring point, however it is written: "at 211 O2" is AT-211. */
export function guessedColumns(trend: Trend, plant: Plant): readonly SeriesColumn[] {
	const bare = (text: string): string => text.toUpperCase().replace(/[^A-Z0-9]/g, '');
	const taken = new Set<string>();
	return trend.columns.flatMap(({ name }) => {
		const free = plant.points.filter(({ tag }) => !taken.has(tag));
		const point = free.find(({ tag }) => tag === name) ?? free.find(({ tag }) => bare(name).startsWith(bare(tag)));
		if (point === undefined) return [];
		taken.add(point.tag);
		return [{ column: name, point: point.tag }];
	});
}

/** Under what a trend is kept once it is read: its file, and how a person said that it is to be read. */
export const trendKey = ({ attachment, reading }: Pick<Body, 'attachment' | 'reading'>): string =>
	reading === undefined ? attachment.hash : `${attachment.hash} ${canonicalJson(reading)}`;
