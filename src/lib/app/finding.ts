import { impactOf, millis, standingWith, withErrorOff, type BodyOf, type Impact } from '../record';
import { shownUnit } from '../quantity';
import type { OpenStartUp } from './open-start-up.svelte';

/** What a finding would do, asked before it is signed. */
export type FindingImpact = {
	readonly impact: Impact;
	/** The last good check that the rules take from the record. */
	readonly lastGood: string | undefined;
	/** Of a step that falls: its values with the error taken off. */
	readonly values: ReadonlyMap<string, readonly JudgedAnew[]>;
};

export type JudgedAnew = {
	readonly typed: string;
	readonly corrected: string;
	readonly unit: string;
	readonly limit: string | undefined;
};

export function findingImpact(startUp: OpenStartUp, body: BodyOf<'instrument finding'>, at: number): FindingImpact {
	const { procedure, standing, events, siteLog } = startUp;
	const draft = startUp.draft('instrument finding', body);
	const after = draft.ok
		? standingWith(procedure, { ...draft.value, entered: startUp.instant(at) }, events, siteLog)
		: standing;
	const impact = impactOf(standing, after);
	const causes = after.steps
		.flatMap(({ why }) => why)
		.flatMap((cause) => (cause.kind === 'instrument finding' && cause.instrument === body.instrument ? [cause] : []));
	const lastGood = causes.flatMap(({ lastGood: good }) => good ?? []).sort((a, b) => millis(b) - millis(a))[0];
	const values = new Map(impact.steps.map(({ step, entry }) => [step, judgedAnew(startUp, entry, body)]));
	return { impact, lastGood, values };
}

function judgedAnew(
	{ events, plant, procedure }: OpenStartUp,
	id: string | undefined,
	{ instrument, asFound }: BodyOf<'instrument finding'>,
): readonly JudgedAnew[] {
	const entry = events.find((event) => event.id === id);
	if (entry?.kind !== 'entry' || asFound === undefined) return [];
	const step = procedure.steps.find((one) => one.id === entry.body.step);
	const fields = step !== undefined && 'fields' in step ? step.fields : [];
	return (entry.body.values ?? [])
		.filter(({ instrument: used, point }) => (used ?? point) === instrument)
		.flatMap(({ typed, unit, field, point }) => {
			const corrected = withErrorOff(typed, unit, asFound);
			if (corrected === undefined) return [];
			const use = fields.find((one) => (field === undefined ? one.point === point : one.id === field))?.limit;
			const limit = use !== undefined && 'limit' in use ? plant.limits.find((one) => one.id === use.limit) : use;
			const bound = limit?.atMost ?? limit?.atLeast;
			return [
				{ typed, corrected, unit: shownUnit(unit), limit: bound === undefined ? undefined : String(bound.value) },
			];
		});
}
