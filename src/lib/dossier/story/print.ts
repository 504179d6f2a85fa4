import type { Measure } from '../../plant';
import type { LimitUse } from '../../procedure';
import { shownUnit } from '../../quantity';
import type { BodyOf } from '../../record';
import type { DossierInput } from '../input';
import type { Story } from './story';

type Reading = NonNullable<BodyOf<'entry'>['values']>[number];

/** A value as it was typed, with its unit and basis: nothing is rounded or converted. */
export function printReading({ typed, unit, basis }: Reading, { say }: Story): string {
	const words = [unbroken(typed), shownUnit(unit), ...(basis === undefined ? [] : [say(`basis.${basis}`)])];
	return words.filter((word) => word !== '').join(NO_BREAK_SPACE);
}

export const printMeasure = ({ value, unit }: Measure): string =>
	[unbroken(String(value)), shownUnit(unit)].filter((word) => word !== '').join(NO_BREAK_SPACE);

type Bounds = {
	readonly atMost?: Measure | undefined;
	readonly atLeast?: Measure | undefined;
	readonly guard?: Measure | undefined;
	readonly basis?: 'wet' | 'dry' | undefined;
};

/** "at most 8.0 % moist, guard 0.3 %" */
export function printBounds({ atMost, atLeast, guard, basis }: Bounds, { say }: Pick<Story, 'say'>): string {
	const bounds =
		atMost !== undefined && atLeast !== undefined
			? say('limit.between', { low: unbroken(String(atLeast.value)), high: printMeasure(atMost) })
			: atMost !== undefined
				? say('limit.at most', { value: printMeasure(atMost) })
				: atLeast !== undefined
					? say('limit.at least', { value: printMeasure(atLeast) })
					: '';
	const based = basis === undefined || bounds === '' ? bounds : `${bounds}${NO_BREAK_SPACE}${say(`basis.${basis}`)}`;
	return guard === undefined || based === ''
		? based
		: say('limit.with guard', { limit: based, guard: unbroken(String(guard.value)) });
}

/** The bounds that a step's field is held against: its own, or the unit's limit by name. */
export function boundsOf(limit: LimitUse | undefined, { plant }: DossierInput): Bounds | undefined {
	if (limit === undefined) return undefined;
	return 'limit' in limit ? plant.limits.find(({ id }) => id === limit.limit) : limit;
}

/** A value stays on one line, with the spaces it was typed with. */
const unbroken = (text: string): string => text.trim().replaceAll(' ', NO_BREAK_SPACE);

const NO_BREAK_SPACE = '\u00a0';
