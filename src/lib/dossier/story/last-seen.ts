import type { SketchElement, SketchReading } from '../../drawing';
import { shownUnit } from '../../quantity';
import { allOf } from '../../record';
import { isWithdrawn } from './withdrawn';
import type { Story } from './story';

export type LastSeen = {
	readonly readings: ReadonlyMap<string, SketchReading>;
	readonly positions: ReadonlyMap<string, SketchElement>;
};

/** The newest value of every measuring point and the position of every valve, each with when it was seen. */
export function seenAtEnd(story: Story): LastSeen {
	const { events, input, say, moments } = story;
	const readings = new Map<string, SketchReading>();
	const positions = new Map<string, SketchElement>();
	const steps = new Map(input.procedure.steps.map((step) => [step.id, step]));
	const kinds = new Map(input.plant.elements.map(({ tag, kind }) => [tag, kind]));
	const entries = [...allOf(events, 'entry')].sort((a, b) => a.observedAt - b.observedAt);
	for (const { id, body, observed, entered } of entries) {
		if (isWithdrawn(id, story)) continue;
		const step = steps.get(body.step);
		const fields = step !== undefined && 'fields' in step ? (step.fields ?? []) : [];
		for (const reading of body.values ?? []) {
			const point = reading.point ?? fields.find((field) => field.id === reading.field)?.point;
			if (point === undefined) continue;
			const basis = reading.basis === undefined ? '' : ` ${say(`basis.${reading.basis}`)}`;
			const seen = moments.clock(reading.observed ?? observed ?? entered);
			readings.set(point, { value: reading.typed, unit: `${shownUnit(reading.unit)}${basis}`, word: seen });
		}
		if (step?.kind !== 'line-up') continue;
		for (const row of body.rows ?? []) {
			const element = step.rows.find((each) => each.id === row.row)?.element;
			if (element === undefined) continue;
			// A door that is as it should be is told by its symbol; its words would only crowd the sheet.
			const isQuiet = row.passes && QUIET.has(kinds.get(element) ?? '');
			positions.set(element, {
				position: row.found,
				...(isQuiet ? { word: '' } : {}),
				...(row.passes ? {} : { mark: 'failed' as const }),
			});
		}
	}
	return { readings, positions };
}

const QUIET: ReadonlySet<string> = new Set(['door', 'explosion vent', 'blind']);
