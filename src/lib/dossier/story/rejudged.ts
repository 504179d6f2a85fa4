import * as v from 'valibot';
import type { CalcResult } from '../../calc';
import { MeasureSchema, type Measure } from '../../plant';
import { fromSi, shownUnit } from '../../quantity';
import { allOf, withErrorOff, type AsFoundError, type Cause, type EventOf } from '../../record';
import { calculationOf } from './calculations';
import { boundsOf } from './print';
import type { Story } from './story';

type Finding = Extract<Cause, { readonly kind: 'instrument finding' }>;

/**
 * What an instrument found bad means for a value that a proof rested on: the value with the error taken off. As found is
 * reading minus true, so a reading of 7.6 by an instrument that reads 0.6 low was 8.2.
 */
export function rejudged(entryId: string, finding: Finding, story: Story): readonly string[] {
	const found = allOf(story.site, 'instrument finding').find(({ id }) => id === finding.event)?.body.asFound;
	const entry = allOf(story.events, 'entry').find(({ id }) => id === entryId);
	if (found === undefined || entry === undefined) return [];
	return [...typedValues(entry, finding, found, story), ...calculatedValue(entry, finding, found, story)];
}

function typedValues(
	{ body }: EventOf<'entry'>,
	{ instrument }: Finding,
	found: AsFoundError,
	story: Story,
): readonly string[] {
	const step = story.names.step(body.step);
	const fields = step !== undefined && 'fields' in step ? (step.fields ?? []) : [];
	return (body.values ?? [])
		.filter((reading) => (reading.instrument ?? reading.point) === instrument)
		.flatMap(({ typed, unit, point, field }) => {
			const asked = fields.find((each) => (field === undefined ? each.point === point : each.id === field));
			const bounds = boundsOf(asked?.limit, story.input);
			return told({ typed, unit, limit: bounds?.atMost ?? bounds?.atLeast }, instrument, found, story);
		});
}

/** A calculation that judged a series: the last reading of the place, against the limit that it was given. */
function calculatedValue(
	entry: EventOf<'entry'>,
	{ instrument }: Finding,
	found: AsFoundError,
	story: Story,
): readonly string[] {
	const result = calculationOf(entry);
	const last = result?.values[`${instrument}.last`]?.value;
	if (result === undefined || last === undefined || last === null) return [];
	const shown = fromSi(last, 'fraction', found.unit);
	if (!shown.ok) return [];
	return told({ typed: shown.value.toFixed(1), unit: found.unit, limit: limitOf(result) }, instrument, found, story);
}

function limitOf({ inputs }: CalcResult): Measure | undefined {
	const given = v.safeParse(v.looseObject({ limit: v.looseObject({ oxygen: MeasureSchema }) }), inputs);
	return given.success ? given.output.limit.oxygen : undefined;
}

type Rested = { readonly typed: string; readonly unit: string; readonly limit: Measure | undefined };

function told(
	{ typed, unit, limit }: Rested,
	instrument: string,
	found: AsFoundError,
	{ say }: Story,
): readonly string[] {
	const corrected = withErrorOff(typed, unit, found);
	if (corrected === undefined) return [];
	const facts = { typed, corrected, unit: shownUnit(unit), instrument };
	return [
		limit === undefined
			? say('gate.rejudged', facts)
			: say('gate.rejudged against', { ...facts, limit: String(limit.value) }),
	];
}
