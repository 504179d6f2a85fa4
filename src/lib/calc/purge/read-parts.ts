import { fail, ok, type Result } from '../../base';
import type { QuantityName } from '../../quantity';
import type { Refusal } from '../calculator';
import { readMeasure, type Typed } from '../read-inputs';

export type Part = {
	readonly typed: Typed | undefined;
	readonly quantity: QuantityName;
	readonly min?: number;
	readonly max?: number;
};
type Parts = { readonly [name: string]: Part };
type Numbers<P extends Parts> = {
	readonly [Name in keyof P]: P[Name]['typed'] extends Typed ? number : number | undefined;
};

/** The measured values inside one row of a table, in SI units, or every refusal with its place: "places[2].lag". */
export function readParts<const P extends Parts>(at: string, parts: P): Result<Numbers<P>, readonly Refusal[]> {
	const refusals: Refusal[] = [];
	const numbers = Object.entries<Part>(parts).map(([name, { typed, ...about }]) => {
		if (typed === undefined) return [name, undefined] as const;
		const read = readMeasure(typed, about, `${at}.${name}`);
		if (!read.ok) refusals.push(...read.error);
		return [name, read.ok ? read.value.value : undefined] as const;
	});
	return refusals.length > 0 ? fail(refusals) : ok(Object.fromEntries(numbers) as Numbers<P>);
}
