import { allOf } from '../../record';
import type { Plant } from '../../plant';
import type { Story } from './story';

export type UsedInstrument = {
	readonly id: string;
	readonly instrument: Plant['instruments'][number] | undefined;
	readonly point: string | undefined;
	/** How many values were typed from it. */
	readonly values: number;
};

/** Every instrument that a value or a proof names, whether or not the plant description knows it. */
export function instrumentsUsed({ events, input }: Story): readonly UsedInstrument[] {
	const values = new Map<string, { count: number; point: string | undefined }>();
	const use = (id: string, point: string | undefined, count: number) => {
		const before = values.get(id);
		values.set(id, { count: (before?.count ?? 0) + count, point: before?.point ?? point });
	};
	const assigned = new Map(allOf(events, 'instrument assigned').map(({ body }) => [body.point, body.instrument]));
	const known = new Map(input.plant.points.map(({ tag, instrument }) => [tag, instrument]));
	for (const { body } of allOf(events, 'entry')) {
		const step = input.procedure.steps.find(({ id }) => id === body.step);
		const fields = step !== undefined && 'fields' in step ? (step.fields ?? []) : [];
		for (const reading of body.values ?? []) {
			const point = reading.point ?? fields.find(({ id }) => id === reading.field)?.point;
			const id =
				reading.instrument ?? (point === undefined ? undefined : (assigned.get(point) ?? known.get(point) ?? point));
			if (id !== undefined) use(id, point, 1);
		}
		for (const id of body.instruments ?? step?.instruments ?? []) use(id, undefined, 0);
	}
	const described = new Map(input.plant.instruments.map((instrument) => [instrument.id, instrument]));
	return [...values]
		.map(([id, { count, point }]) => {
			const instrument = described.get(id) ?? input.plant.instruments.find((each) => each.point === id);
			return { id, instrument, point: point ?? instrument?.point, values: count };
		})
		.sort((a, b) => (a.id < b.id ? -1 : 1));
}
