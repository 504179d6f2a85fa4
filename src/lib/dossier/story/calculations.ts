import * as v from 'valibot';
import type { CalcResult } from '../../calc';
import { isInstant } from '../../identity';
import { allOf, type EventOf } from '../../record';
import type { Story } from './story';

/** A calculation that somebody entered, as it was stored. */
export type ToldCalculation = {
	readonly entry: EventOf<'entry'>;
	readonly result: CalcResult;
	/** It is the proof that counted at the seal. */
	readonly counts: boolean;
};

/**
 * Stored results in the order of the procedure, the newest of each step first; what has not the shape of a result is left to
 * verify. Nothing is calculated again: another engine rounds the last bits of a logarithm otherwise, and would draw otherwise.
 */
export function calculationsOf(story: Story): readonly ToldCalculation[] {
	const entries = allOf(story.events, 'entry').filter(({ body }) => body.calculation !== undefined);
	return story.input.procedure.steps.flatMap(({ id }) =>
		entries
			.filter(({ body }) => body.step === id)
			.sort((a, b) => b.observedAt - a.observedAt)
			.flatMap((entry) => {
				const result = calculationOf(entry);
				if (result === undefined) return [];
				const counts = story.end.steps.some((step) => step.entry === entry.id);
				return [{ entry, counts, result }];
			}),
	);
}

/** The stored result of an entry, when it has the shape of one. */
export function calculationOf({ body }: EventOf<'entry'>): CalcResult | undefined {
	const stored = v.safeParse(StoredResult, body.calculation);
	return stored.success ? (stored.output as unknown as CalcResult) : undefined;
}

/** The instant of a series' zero, when the calculation was told. */
export function zeroOf({ inputs }: CalcResult): string | undefined {
	const zero = typeof inputs === 'object' && inputs !== null && 'zero' in inputs ? inputs.zero : undefined;
	return typeof zero === 'string' && isInstant(zero) ? zero : undefined;
}

/** Numbers of a plot may be absent where JSON could not carry them: such a point is not drawn. */
const Numbers = v.array(v.nullable(v.number()));
const Axis = v.looseObject({ label: v.string(), unit: v.string() });
const StoredPlot = v.looseObject({
	id: v.string(),
	title: v.string(),
	x: Axis,
	y: Axis,
	curves: v.array(
		v.looseObject({
			id: v.string(),
			label: v.string(),
			kind: v.picklist(['points', 'line', 'band', 'steps']),
			x: Numbers,
			y: Numbers,
			y2: v.optional(Numbers),
		}),
	),
	marks: v.array(
		v.looseObject({
			kind: v.picklist(['limit', 'guard', 'window', 'event']),
			label: v.string(),
			axis: v.picklist(['x', 'y']),
			at: v.number(),
			to: v.optional(v.number()),
		}),
	),
});
const Note = v.looseObject({ kind: v.string(), level: v.string() });
const StoredResult = v.looseObject({
	calc: v.string(),
	constants: v.string(),
	inputs: v.unknown(),
	values: v.record(
		v.string(),
		v.looseObject({
			value: v.nullable(v.number()),
			unit: v.string(),
			U: v.optional(v.number()),
			because: v.optional(v.string()),
		}),
	),
	verdict: v.optional(
		v.looseObject({ word: v.picklist(['adequate', 'not yet', 'cannot be shown']), reasons: v.array(Note) }),
	),
	scope: v.picklist(['in scope', 'outside scope']),
	notes: v.array(Note),
	plots: v.optional(v.array(StoredPlot)),
});
