import { fromSi, parseNumber, quantitiesIn, shownUnit, toSi } from '../../quantity';
import { allOf, type Cause } from '../../record';
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
	const step = story.names.step(entry.body.step);
	const fields = step !== undefined && 'fields' in step ? (step.fields ?? []) : [];
	return (entry.body.values ?? [])
		.filter(({ instrument, point }) => (instrument ?? point) === finding.instrument)
		.flatMap(({ typed, unit, point, field }) => {
			const corrected = withErrorOff(typed, unit, found);
			if (corrected === undefined) return [];
			const bounds = boundsOf(
				fields.find((each) => (field === undefined ? each.point === point : each.id === field))?.limit,
				story.input,
			);
			const limit = bounds?.atMost ?? bounds?.atLeast;
			const said = { typed, corrected, unit: shownUnit(unit), instrument: finding.instrument };
			return [
				limit === undefined
					? story.say('gate.rejudged', said)
					: story.say('gate.rejudged against', { ...said, limit: String(limit.value) }),
			];
		});
}

function withErrorOff(
	typed: string,
	unit: string,
	{ error, unit: errorUnit }: { readonly error: string; readonly unit: string },
): string | undefined {
	const [value, off] = [parseNumber(typed), parseNumber(error)];
	if (!value.ok || !off.ok) return undefined;
	const same = unit === errorUnit ? off.value : inUnit(error, errorUnit, unit);
	if (same === undefined) return undefined;
	const decimals = Math.max(decimalsOf(typed), decimalsOf(error));
	return (value.value - same).toFixed(decimals).replace('-', '−');
}

/** An error in another unit of the same quantity. */
function inUnit(value: string, from: string, to: string): number | undefined {
	for (const quantity of quantitiesIn(from)) {
		const si = toSi({ value, unit: from }, quantity);
		const shown = si.ok ? fromSi(si.value.value, quantity, to) : si;
		if (shown.ok) return shown.value;
	}
	return undefined;
}

const decimalsOf = (typed: string): number => /[.,](\d+)/.exec(typed)?.[1]?.length ?? 0;
