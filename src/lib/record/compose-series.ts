import { fail, ok, type Result } from '../base';
import type { Plant } from '../plant';
import type { BodyOf } from './event';
import { printInstant } from './instants';
import type { Trend } from './trend';

export type SeriesError =
	| { readonly kind: 'no-such-point'; readonly column: string }
	| { readonly kind: 'other-basis'; readonly column: string; readonly point: string; readonly found: string };

type Body = BodyOf<'series attached'>;

/** A trend whose columns become a series of the measuring points that they name; a column of another basis is refused. */
export function seriesBody(
	trend: Trend,
	attachment: Body['attachment'],
	plant: Plant,
	note?: string,
): Result<Body, SeriesError> {
	const points: Body['points'][number][] = [];
	for (const { name, unit, basis } of trend.columns) {
		const point = plant.points.find(({ tag }) => tag === name);
		if (point === undefined) return fail({ kind: 'no-such-point', column: name });
		if (basis !== undefined && basis !== point.basis)
			return fail({ kind: 'other-basis', column: name, point: point.basis ?? 'without basis', found: basis });
		const own = point.basis === undefined ? {} : { basis: point.basis };
		points.push({ point: name, column: name, unit: unit ?? point.unit, ...own });
	}
	const print = (at: number | undefined): string => printInstant(at ?? 0, plant.utcOffsetMinutes);
	return ok({
		points,
		from: print(trend.times[0]),
		to: print(trend.times.at(-1)),
		samples: trend.times.length,
		attachment,
		...(note === undefined ? {} : { note }),
	});
}
