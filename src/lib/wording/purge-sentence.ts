import * as v from 'valibot';
import type { CalcResult } from '../calc';
import { fromSi, shownUnit, toSi } from '../quantity';
import { duration } from './moment';
import { sayNumber, withMark, type SeriesClock } from './note';
import { millis, printInstant } from '../record';
import type { Say } from './say';

/**
 * The verdict on a purge as a supervisor can sign it: scoped to what was measured, and never a permission.
 *
 * @returns undefined for what is not an adequate purge: then its reasons are the sentence
 */
export function purgeSentence(
	{ calc, verdict, inputs, values, notes }: CalcResult,
	say: Say,
	{ zero, moments }: SeriesClock,
): string | undefined {
	const given = v.safeParse(Inputs, inputs);
	const since = values.adequateSince?.value;
	const held = values.held?.value;
	if (!calc.startsWith('purge-adequacy@') || verdict?.word !== 'adequate' || !given.success) return undefined;
	if (since === undefined || since === null || held === undefined || held === null || zero === undefined)
		return undefined;
	const { limit, guard, places } = given.output;
	const swept = notes.flatMap(({ kind, volumes }) =>
		kind === 'covered-without-analyser' && Array.isArray(volumes) ? volumes.map(String) : [],
	);
	const slowest = notes.find(({ kind }) => kind === 'slowest-place')?.place;
	const title = places.find(({ tag }) => tag === slowest)?.title ?? slowest;
	const bound = `${withMark(String(limit.oxygen.value), say)}\u00a0${shownUnit(limit.oxygen.unit)}`;
	return [
		say('purge.adequate', {
			since: moments.clock(printInstant(millis(zero) + since * 1000, 0)),
			places: places.length,
			accept: acceptance(limit.oxygen, guard, say),
			basis: say(`basis.${limit.basis}`),
			limit: bound,
			guard: withMark(String(guard.value), say),
			held: duration(held * 1000),
		}),
		...(swept.length === 0 ? [] : [say('purge.swept', { n: swept.length, list: swept.join(', ') })]),
		...(typeof title === 'string' ? [say('purge.slowest', { place: title })] : []),
		say('purge.no permission'),
	].join(' ');
}

type Measure = { readonly value: string | number; readonly unit: string };

/** Limit less guard, in the unit of the limit. */
function acceptance(limit: Measure, guard: Measure, say: Say): string {
	const [most, kept] = [toSi(limit, 'fraction'), toSi(guard, 'fraction')];
	const shown = most.ok && kept.ok ? fromSi(most.value.value - kept.value.value, 'fraction', limit.unit) : undefined;
	return shown?.ok === true ? `${sayNumber(shown.value, say)}\u00a0${shownUnit(limit.unit)}` : '–';
}

const Measured = v.looseObject({ value: v.union([v.string(), v.number()]), unit: v.string() });
const Inputs = v.looseObject({
	limit: v.looseObject({ oxygen: Measured, basis: v.picklist(['wet', 'dry']) }),
	guard: Measured,
	places: v.array(v.looseObject({ tag: v.string(), title: v.string() })),
});
